import type { Socket } from 'socket.io-client'
import type { CatchUp, FenceEvent } from '../../shared/contracts/fence'
import {
  clientEvents,
  joinedSchema,
  presenceSchema,
  roomChangedSchema,
  serverEvents,
  someoneWritesSchema,
  type Presence,
  type Room,
  type SomeoneWrites,
} from '../../shared/contracts/socketEvents'
import { openLine } from './client'

/** What a room's line reports. */
export interface RoomListener {
  /** The last number that was seen; what followed comes with each joining. */
  lastNumber: () => number
  onJoined: (catchUp: CatchUp, presence: Presence) => void
  onChanged: (event: FenceEvent) => void
  onPresence: (presence: Presence) => void
  onWrites: (said: SomeoneWrites) => void
  /** The line is down or the room may not be joined: read by HTTP until it is joined again. */
  onDown: () => void
}

export interface RoomLine {
  sayWriting: (questionId: number | null, isWriting: boolean) => void
  leave: () => void
}

const answerWithinMs = 8000
const retryAfterMs = 3000

interface Spoken {
  ok: boolean
  data?: unknown
}

function listen(socket: Socket, room: Room, listener: RoomListener): RoomLine {
  const isOurs = (other: Room) =>
    other.courseSlug === room.courseSlug && other.lessonKey === room.lessonKey
  let retry: ReturnType<typeof setTimeout> | undefined
  let isLeft = false

  async function join() {
    const payload = { ...room, after: listener.lastNumber() }
    try {
      const reply = (await socket
        .timeout(answerWithinMs)
        .emitWithAck(clientEvents.joinRoom, payload)) as Spoken
      if (isLeft) return
      const joined = reply.ok ? joinedSchema.safeParse(reply.data) : null
      if (joined?.success) listener.onJoined(joined.data.catchUp, joined.data.presence)
      else listener.onDown()
    } catch {
      if (!isLeft && socket.connected) retry = setTimeout(() => void join(), retryAfterMs)
    }
  }
  const onConnect = () => void join()
  const onDisconnect = (reason: unknown) => {
    listener.onDown()
    const isCutByServer = reason === 'io server disconnect'
    if (isCutByServer) retry = setTimeout(() => socket.connect(), retryAfterMs)
  }
  const onChanged = (payload: unknown) => {
    const { data } = roomChangedSchema.safeParse(payload)
    if (data && isOurs(data)) listener.onChanged(data.event)
  }
  const onPresence = (payload: unknown) => {
    const { data } = presenceSchema.safeParse(payload)
    if (data && isOurs(data)) listener.onPresence(data)
  }
  const onWrites = (payload: unknown) => {
    const { data } = someoneWritesSchema.safeParse(payload)
    if (data && isOurs(data)) listener.onWrites(data)
  }
  const handlers: [string, (payload: unknown) => void][] = [
    ['connect', onConnect],
    ['disconnect', onDisconnect],
    [serverEvents.roomChanged, onChanged],
    [serverEvents.presence, onPresence],
    [serverEvents.someoneWrites, onWrites],
  ]
  for (const [name, handler] of handlers) socket.on(name, handler)
  if (socket.connected) onConnect()
  else socket.connect()

  return {
    sayWriting(questionId, isWriting) {
      if (socket.connected) socket.emit(clientEvents.writing, { ...room, questionId, isWriting })
    },
    leave() {
      isLeft = true
      clearTimeout(retry)
      for (const [name, handler] of handlers) socket.off(name, handler)
      if (socket.connected) socket.emit(clientEvents.leaveRoom, room)
    },
  }
}

/** Joins a lesson's room, and joins it again after every lost line, from the last number seen. */
export function joinRoom(room: Room, personId: number | null, listener: RoomListener): RoomLine {
  let line: RoomLine | null = null
  let isLeft = false
  openLine(personId).then(
    (socket) => {
      if (!isLeft) line = listen(socket, { ...room }, listener)
    },
    () => listener.onDown(),
  )
  return {
    sayWriting: (questionId, isWriting) => line?.sayWriting(questionId, isWriting),
    leave() {
      isLeft = true
      line?.leave()
    },
  }
}
