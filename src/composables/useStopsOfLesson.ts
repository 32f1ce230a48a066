import { computed, ref, watch, type Ref } from 'vue'
import type { TapeStop } from '../../shared/contracts/lessons'

interface Playing {
  positionMs: Ref<number>
  isPlaying: Ref<boolean>
  /** Counts the jumps over the tape, which pass no stop. */
  jumps: Ref<number>
  stops: () => TapeStop[]
  durationMs: () => number
  /** Holds the video at a moment. */
  hold: (atMs: number) => void
}

/** A longer step between two readings is no playing, whatever made it. */
const longestStepMs = 4000
/** The clock stands this near to a stop at which it was held. */
const atStopMs = 150
const nearEndMs = 300

/**
 * Holds the video where a required stop is unsolved, and at the end where one was left open.
 * `open` is the stop at which it waits.
 */
export function useStopsOfLesson(playing: Playing) {
  const openKey = ref<string | null>(null)
  /** Stops that were passed over once more at the end. */
  const leftAtEnd = new Set<string>()
  const inOrder = computed(() => [...playing.stops()].sort((a, b) => a.atMs - b.atMs))
  const open = computed(() => inOrder.value.find((stop) => stop.key === openKey.value) ?? null)
  const numberOf = (key: string) => inOrder.value.findIndex((stop) => stop.key === key) + 1
  const holds = (stop: TapeStop) => stop.isRequired && !stop.isSolved
  const isAtEnd = computed(() => playing.positionMs.value >= playing.durationMs() - nearEndMs)

  function openStop(key: string) {
    const stop = inOrder.value.find((candidate) => candidate.key === key)
    if (!stop) return
    playing.hold(stop.atMs)
    openKey.value = key
  }
  function openLeft() {
    const left = inOrder.value.find((stop) => !stop.isSolved && !leftAtEnd.has(stop.key))
    openKey.value = left?.key ?? null
  }
  /** Leaves the open stop for somewhere else on the tape. */
  function leave() {
    openKey.value = null
  }
  /** Done with the open stop; at the end the next one that was left comes. */
  function close() {
    const key = openKey.value
    openKey.value = null
    if (!isAtEnd.value || !key) return
    leftAtEnd.add(key)
    openLeft()
  }
  /** The stop that still holds the video where it stands now, as after a reload. */
  function openHere(atMs: number) {
    const here = inOrder.value.find((stop) => holds(stop) && Math.abs(stop.atMs - atMs) <= atStopMs)
    openKey.value = here?.key ?? null
  }

  watch([playing.positionMs, playing.jumps], ([now, jumps], [before, jumpsBefore]) => {
    const step = now - before
    if (!playing.isPlaying.value || jumps !== jumpsBefore) return
    if (step <= 0 || step > longestStepMs) return
    const reached = inOrder.value.find(
      (stop) => holds(stop) && before <= stop.atMs + atStopMs && now >= stop.atMs,
    )
    if (reached) openStop(reached.key)
  })
  watch(playing.isPlaying, (isPlaying) => {
    if (isPlaying) openKey.value = null
    else if (isAtEnd.value && !openKey.value) openLeft()
  })

  const next = computed(() =>
    inOrder.value.find((stop) => stop.atMs > playing.positionMs.value + atStopMs),
  )
  const before = computed(() =>
    inOrder.value.findLast((stop) => stop.atMs < playing.positionMs.value - atStopMs),
  )
  return { open, inOrder, numberOf, openStop, openHere, leave, close, next, before, isAtEnd }
}
