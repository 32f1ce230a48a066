import { computed, ref, shallowRef } from 'vue'
import type { CatchUp, FenceEvent, Thread } from '../../shared/contracts/fence'

const byMoment = (a: Thread, b: Thread) =>
  (a.atMs ?? Infinity) - (b.atMs ?? Infinity) || a.id - b.id

/** Of two states of a thread the newer one; equal numbers are two readings of the same state. */
const isNewer = (thread: Thread, known: Thread | undefined) => !known || thread.asOf >= known.asOf

/**
 * The threads of one room by id, and the last number seen of it. A number that was seen is passed
 * over, a number too far ahead shows a gap, and an older state never replaces a newer one.
 */
export function useFenceThreads() {
  const byId = shallowRef<ReadonlyMap<number, Thread>>(new Map())
  const lastNumber = ref(0)
  const threads = computed(() =>
    [...byId.value.values()].filter((thread) => !thread.isDeleted).sort(byMoment),
  )

  /** Puts in states of threads, each unless a newer one is there. */
  function take(states: Thread[]) {
    const next = new Map(byId.value)
    for (const thread of states) {
      if (isNewer(thread, next.get(thread.id))) next.set(thread.id, thread)
    }
    byId.value = next
  }

  /** Starts from a whole reading that stands for everything up to `number`. */
  function startFrom(states: Thread[], number: number) {
    byId.value = new Map(states.map((thread) => [thread.id, thread]))
    lastNumber.value = number
  }

  /** Takes one change: 'new', 'seen' before, or a 'gap' stands before it and nothing was taken. */
  function takeEvent({ number, thread }: FenceEvent): 'new' | 'seen' | 'gap' {
    if (number <= lastNumber.value) return 'seen'
    if (number > lastNumber.value + 1) return 'gap'
    take([thread])
    lastNumber.value = number
    return 'new'
  }

  /** Takes what was missed and returns what of it is new; null when the threads have to be read anew. */
  function takeCatchUp(missed: CatchUp): FenceEvent[] | null {
    if (!missed.isComplete) return missed.lastNumber === lastNumber.value ? [] : null
    const fresh = missed.events.filter((event) => event.number > lastNumber.value)
    take(fresh.map((event) => event.thread))
    lastNumber.value = Math.max(lastNumber.value, missed.lastNumber)
    return fresh
  }

  const threadOf = (id: number) => byId.value.get(id) ?? null

  return { threads, lastNumber, threadOf, take, startFrom, takeEvent, takeCatchUp }
}
