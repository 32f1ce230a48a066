import type { Server } from 'socket.io'
import {
  serverEvents,
  type Person,
  type Presence,
  type Room,
} from '../../shared/contracts/socketEvents'
import { logger } from '../logger'
import type { SocketData } from '../socket'

/** The name under which the lines of a lesson's room are gathered. */
export const roomName = ({ courseSlug, lessonKey }: Room) => `fence:${courseSlug}:${lessonKey}`

/** Several who come at once are told of together. */
const gatherMs = 120
const namesLimit = 50

/** Who is in a room, asked of all processes: people by name, each once, and visitors in the count only. */
export async function readPresence(io: Server, room: Room): Promise<Presence> {
  const lines = await io.in(roomName(room)).fetchSockets()
  const people = new Map<number, Person>()
  let visitors = 0
  for (const line of lines) {
    const { actor } = line.data as SocketData
    if (actor) people.set(actor.id, { id: actor.id, name: actor.displayName })
    else visitors++
  }
  return {
    ...{ courseSlug: room.courseSlug, lessonKey: room.lessonKey },
    here: [...people.values()].slice(0, namesLimit),
    count: people.size + visitors,
  }
}

/** Returns a function that tells a room who is in it, shortly after somebody came or went. */
export function createPresenceTeller(io: Server) {
  const due = new Set<string>()

  async function tell(room: Room) {
    due.delete(roomName(room))
    io.to(roomName(room)).emit(serverEvents.presence, await readPresence(io, room))
  }
  return (room: Room) => {
    if (due.has(roomName(room))) return
    due.add(roomName(room))
    setTimeout(() => {
      tell(room).catch((error: unknown) => logger.error({ err: error }, 'presence'))
    }, gatherMs)
  }
}
