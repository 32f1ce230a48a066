import type { Server, Socket } from 'socket.io'
import {
  clientEvents,
  joinRoomSchema,
  roomSchema,
  serverEvents,
  writingSchema,
  type Joined,
  type JoinRoom,
  type Room,
  type RoomChanged,
  type Writing,
} from '../../shared/contracts/socketEvents'
import type { Action } from '../../shared/contracts/policies'
import { AppError } from '../errors'
import { assertCan } from '../middleware/authorize'
import type { SocketData } from '../socket'
import { answerMessages } from './messages.socket'
import { createPresenceTeller, readPresence, roomName } from './presence.socket'
import { onRoomChanged } from './roomChanges.service'
import { accessRoom, catchUpRoom } from './rooms.service'
import { createWritingTeller } from './writing.socket'

type Reader = SocketData['actor']

/** One line reads so many rooms at once. */
const roomsLimit = 6

async function accessFor(reader: Reader, { courseSlug, lessonKey }: Room, action: Action) {
  const access = await accessRoom({ slug: courseSlug, lessonKey }, reader)
  assertCan(reader, action, access.thing)
  return access
}

/** Rooms over the fence: joining, presence, who is writing, and what changed. */
export function registerFence(io: Server) {
  const tellPresence = createPresenceTeller(io)

  onRoomChanged(({ courseSlug, lessonKey, event }) => {
    const changed: RoomChanged = { courseSlug, lessonKey, event }
    io.to(roomName(changed)).emit(serverEvents.roomChanged, changed)
  })
  io.on('connection', (socket) => serveLine(io, socket, tellPresence))
}

function serveLine(io: Server, socket: Socket, tellPresence: (room: Room) => void) {
  const on = answerMessages(socket)
  const writing = createWritingTeller(socket)
  const joined = new Map<string, Room>()

  async function join({ courseSlug, lessonKey, after }: JoinRoom, reader: Reader): Promise<Joined> {
    const room = { courseSlug, lessonKey }
    const name = roomName(room)
    if (!joined.has(name) && joined.size >= roomsLimit) {
      throw new AppError(409, 'too-many-rooms', 'Leave another lesson first.')
    }
    const access = await accessFor(reader, room, 'fence:read')
    if (!socket.connected) throw new AppError(409, 'line-cut', 'The line was cut.')
    await socket.join(name)
    if (!joined.has(name)) tellPresence(room)
    joined.set(name, room)
    return { catchUp: await catchUpRoom(access, after), presence: await readPresence(io, room) }
  }

  async function leave({ courseSlug, lessonKey }: Room) {
    const room = { courseSlug, lessonKey }
    writing.stop(room)
    if (!joined.delete(roomName(room))) return {}
    await socket.leave(roomName(room))
    tellPresence(room)
    return {}
  }

  async function write(said: Writing, reader: Reader) {
    if (!joined.has(roomName(said))) throw new AppError(409, 'not-here', 'Open the lesson first.')
    await accessFor(reader, said, 'fence:write')
    if (reader) writing.say(said, { id: reader.id, name: reader.displayName })
    return {}
  }

  on(clientEvents.joinRoom, joinRoomSchema, join)
  on(clientEvents.leaveRoom, roomSchema, leave)
  on(clientEvents.writing, writingSchema, write)
  socket.on('disconnecting', () => writing.stopAll())
  socket.on('disconnect', () => {
    for (const room of joined.values()) tellPresence(room)
    joined.clear()
  })
}
