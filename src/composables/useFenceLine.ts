import { useIntervalFn } from '@vueuse/core'
import { computed, ref, shallowRef } from 'vue'
import type { CatchUp, FenceEvent } from '../../shared/contracts/fence'
import {
  writingLastsMs,
  type Person,
  type Presence,
  type Room,
  type SomeoneWrites,
} from '../../shared/contracts/socketEvents'
import { fetchMissed } from '../api/fence'
import { joinRoom, type RoomLine } from '../socket/fence'

const pollEveryMs = 15_000
/** A word that somebody writes is dropped here when the line loses its end. */
const writingKeptMs = writingLastsMs + 1500

interface LineTarget {
  lastNumber: () => number
  takeEvent: (event: FenceEvent) => 'new' | 'seen' | 'gap'
  /** Takes what was missed, or reads the room anew. */
  takeCatchUp: (missed: CatchUp) => Promise<void> | void
}

/** A room heard live, and by asking every 15 seconds while the line is down; with who is here and who writes. */
export function useFenceLine(target: LineTarget) {
  const isLive = ref(false)
  const presence = shallowRef<Presence | null>(null)
  const writing = shallowRef<ReadonlyMap<string, SomeoneWrites>>(new Map())
  const timers = new Map<string, ReturnType<typeof setTimeout>>()
  let room: Room | null = null
  let line: RoomLine | null = null

  async function poll() {
    const asked = room
    if (!asked) return
    const missed = await fetchMissed(asked, target.lastNumber()).catch(() => null)
    if (missed && room === asked) await target.takeCatchUp(missed)
  }
  const polling = useIntervalFn(() => void poll(), pollEveryMs, { immediate: false })

  function hearWriting(said: SomeoneWrites) {
    const name = `${said.person.id}:${said.questionId ?? 'new'}`
    const next = new Map(writing.value)
    clearTimeout(timers.get(name))
    timers.delete(name)
    if (said.isWriting) {
      next.set(name, said)
      const forget = () => hearWriting({ ...said, isWriting: false })
      timers.set(name, setTimeout(forget, writingKeptMs))
    } else next.delete(name)
    writing.value = next
  }
  function hearNobody() {
    for (const timer of timers.values()) clearTimeout(timer)
    timers.clear()
    writing.value = new Map()
  }

  function open(opened: Room, personId: number | null) {
    close()
    room = { ...opened }
    line = joinRoom(room, personId, {
      lastNumber: target.lastNumber,
      onJoined(missed, here) {
        isLive.value = true
        presence.value = here
        polling.pause()
        void target.takeCatchUp(missed)
      },
      onChanged(event) {
        if (target.takeEvent(event) === 'gap') void poll()
      },
      onPresence: (here) => (presence.value = here),
      onWrites: hearWriting,
      onDown() {
        isLive.value = false
        presence.value = null
        hearNobody()
        polling.resume()
      },
    })
    polling.resume()
  }

  function close() {
    line?.leave()
    line = null
    room = null
    polling.pause()
    isLive.value = false
    presence.value = null
    hearNobody()
  }

  /** Who writes an answer to a question, or (null) a new question. */
  const writersAt = (questionId: number | null): Person[] =>
    [...writing.value.values()]
      .filter((said) => said.questionId === questionId)
      .map((said) => said.person)

  return {
    isLive: computed(() => isLive.value),
    presence: computed(() => presence.value),
    writersAt,
    sayWriting: (questionId: number | null, isWriting: boolean) =>
      line?.sayWriting(questionId, isWriting),
    open,
    close,
    poll,
  }
}
