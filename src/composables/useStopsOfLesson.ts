import { computed, ref, watch, type Ref } from 'vue'
import type { TapeStop } from '../../shared/contracts/lessons'

interface Playing {
  positionMs: Ref<number>
  isPlaying: Ref<boolean>
  stops: () => TapeStop[]
  durationMs: () => number
  /** Holds the video at a moment. */
  hold: (atMs: number) => void
}

/** Two readings of the clock further apart are a jump over the tape, which passes no stop. */
const longestStepMs = 1500

/**
 * Holds the video where a required stop is unsolved, and at the end where one by the way was left
 * open. `open` is the stop at which it waits.
 */
export function useStopsOfLesson(playing: Playing) {
  const openKey = ref<string | null>(null)
  const inOrder = computed(() => [...playing.stops()].sort((a, b) => a.atMs - b.atMs))
  const open = computed(() => inOrder.value.find((stop) => stop.key === openKey.value) ?? null)
  const numberOf = (key: string) => inOrder.value.findIndex((stop) => stop.key === key) + 1

  function openStop(key: string) {
    const stop = inOrder.value.find((candidate) => candidate.key === key)
    if (!stop) return
    playing.hold(stop.atMs)
    openKey.value = key
  }
  function close() {
    openKey.value = null
  }

  watch(playing.positionMs, (now, before) => {
    if (!playing.isPlaying.value) return
    const step = now - before
    if (step < 0 || step > longestStepMs) return
    const reached = inOrder.value.find(
      (stop) => stop.isRequired && !stop.isSolved && before < stop.atMs && now >= stop.atMs,
    )
    if (reached) openStop(reached.key)
  })
  watch(playing.isPlaying, (isPlaying) => {
    if (isPlaying) {
      close()
      return
    }
    const isAtEnd = playing.positionMs.value >= playing.durationMs() - 300
    const left = inOrder.value.find((stop) => !stop.isSolved)
    if (isAtEnd && !openKey.value && left) openKey.value = left.key
  })

  const next = computed(() =>
    inOrder.value.find((stop) => stop.atMs > playing.positionMs.value + 50),
  )
  const before = computed(() =>
    inOrder.value.findLast((stop) => stop.atMs < playing.positionMs.value - 50),
  )
  return { open, inOrder, numberOf, openStop, close, next, before }
}
