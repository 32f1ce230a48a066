import { and, asc, eq, gt } from 'drizzle-orm'
import type { FenceEventKind } from '../../shared/contracts/fence'
import { db, type Executor, type Transaction } from '../db/client'
import { fenceEvents, fenceRooms, lessons, stages } from '../db/schema'

/** The room of a lesson, over all revisions of the course, or null before its first question. */
export async function findRoom(courseId: number, lessonKey: string, on: Executor = db) {
  const [row] = await on
    .select()
    .from(fenceRooms)
    .where(and(eq(fenceRooms.courseId, courseId), eq(fenceRooms.lessonKey, lessonKey)))
  return row ?? null
}

/** Opens a lesson's room, unless somebody else has meanwhile. */
export async function insertRoom(courseId: number, lessonKey: string) {
  await db.insert(fenceRooms).ignore().values({ courseId, lessonKey })
}

/** Takes a room for the rest of the transaction and returns its running number. */
export async function lockRoom(roomId: number, tx: Transaction): Promise<number> {
  const [row] = await tx
    .select({ lastNumber: fenceRooms.lastNumber })
    .from(fenceRooms)
    .where(eq(fenceRooms.id, roomId))
    .for('update')
  if (!row) throw new Error('the room is gone')
  return row.lastNumber
}

/** Writes down a change in a locked room and moves the room's number on. */
export async function insertRoomEvent(
  event: { roomId: number; number: number; kind: FenceEventKind; questionId: number },
  tx: Transaction,
) {
  await tx.insert(fenceEvents).values(event)
  await tx
    .update(fenceRooms)
    .set({ lastNumber: event.number })
    .where(eq(fenceRooms.id, event.roomId))
}

/** The changes of a room after a number, oldest first. */
export async function listRoomEvents(roomId: number, after: number, limit: number, on: Executor) {
  return on
    .select({
      number: fenceEvents.number,
      kind: fenceEvents.kind,
      questionId: fenceEvents.questionId,
    })
    .from(fenceEvents)
    .where(and(eq(fenceEvents.roomId, roomId), gt(fenceEvents.number, after)))
    .orderBy(asc(fenceEvents.number))
    .limit(limit)
}

/** The lessons of a revision in the order of the course. */
export async function listLessonsInOrder(revisionId: number) {
  return db
    .select({
      key: lessons.key,
      title: lessons.title,
      isSample: lessons.isSample,
      stageKey: stages.key,
    })
    .from(lessons)
    .innerJoin(stages, eq(stages.id, lessons.stageId))
    .where(eq(lessons.revisionId, revisionId))
    .orderBy(asc(stages.position), asc(lessons.position))
}
