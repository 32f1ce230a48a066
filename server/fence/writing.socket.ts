import type { Socket } from 'socket.io'
import {
  serverEvents,
  writingLastsMs,
  type Person,
  type Room,
  type SomeoneWrites,
  type Writing,
} from '../../shared/contracts/socketEvents'
import { roomName } from './presence.socket'

/** What one line says about writing; a word that is not renewed takes itself back. */
export function createWritingTeller(socket: Socket) {
  const running = new Map<string, { said: SomeoneWrites; timer: NodeJS.Timeout }>()

  function tell(said: SomeoneWrites) {
    socket.to(roomName(said)).emit(serverEvents.someoneWrites, said)
  }

  function stop(room: Room) {
    const entry = running.get(roomName(room))
    if (!entry) return
    clearTimeout(entry.timer)
    running.delete(roomName(room))
    tell({ ...entry.said, isWriting: false })
  }

  return {
    stop,
    stopAll() {
      for (const { said } of [...running.values()]) stop(said)
    },
    say(writing: Writing, person: Person) {
      if (!writing.isWriting) {
        stop(writing)
        return
      }
      const earlier = running.get(roomName(writing))
      if (earlier?.said.questionId === writing.questionId) clearTimeout(earlier.timer)
      else stop(writing)
      const said = { ...writing, person }
      const timer = setTimeout(() => stop(writing), writingLastsMs)
      running.set(roomName(writing), { said, timer })
      tell(said)
    },
  }
}
