import type { FenceEvent, FenceEventKind } from '../../shared/contracts/fence'
import type { Transaction } from '../db/client'
import { insertRoomEvent, lockRoom } from './rooms.queries'
import { readThreadAsItStands } from './threads.service'

/** A change that is in the database, and the room it belongs to. */
export interface RoomChange {
  courseId: number
  courseSlug: string
  lessonKey: string
  event: FenceEvent
}

type ChangeListener = (change: RoomChange) => void
const listeners = new Set<ChangeListener>()

/** Calls `listener` after every change that this process made; returns what ends that. */
export function onRoomChanged(listener: ChangeListener): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}

/** Tells the listeners of a change; call it after the commit, by the request that did the work. */
export function tellRoomChanged(change: RoomChange) {
  for (const listener of listeners) listener(change)
}

/**
 * Makes one visible change in a room under its lock: `work` returns the id of the question it
 * touched, and the change takes the room's next number, which `work` is told, in the same transaction.
 */
export async function changeRoom(
  roomId: number,
  kind: FenceEventKind,
  tx: Transaction,
  work: (number: number) => Promise<number>,
): Promise<FenceEvent> {
  const number = (await lockRoom(roomId, tx)) + 1
  const questionId = await work(number)
  await insertRoomEvent({ roomId, number, kind, questionId }, tx)
  return { number, kind, thread: await readThreadAsItStands(questionId, number, tx) }
}
