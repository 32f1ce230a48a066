import { useEventListener, useIntervalFn, useLocalStorage } from '@vueuse/core'
import { computed, onScopeDispose, ref } from 'vue'
import type { Interval, LessonProgress } from '../../shared/contracts/progress'
import { mergeIntervals } from '../../shared/progress/intervals'
import { beaconProgress, reportProgress } from '../api/progress'
import type { LessonPlace } from '../api/courses'

const reportEveryMs = 10_000
/** A longer step between two readings of the clock is a jump, not watching. */
const longestStepMs = 1500

/**
 * Keeps the stretches that were really watched and hands them in at most every ten seconds and on
 * leaving. What could not be sent stays on the device and goes with the next report.
 */
export function useWatchedTime(
  place: LessonPlace,
  known: LessonProgress,
  isKept: boolean,
  take: (progress: LessonProgress) => void,
) {
  const name = `gf-watched:${place.slug}/${place.lessonKey}`
  const unsent = useLocalStorage<Interval[]>(name, [])
  const sent = ref<Interval[]>(known.intervals)
  let positionMs = known.positionMs
  let lastPositionMs = known.positionMs
  let from: number | null = null
  let isSending = false

  const watched = computed(() => mergeIntervals(sent.value, unsent.value))

  function close() {
    if (from !== null && positionMs > from) {
      unsent.value = mergeIntervals(unsent.value, [[Math.round(from), Math.round(positionMs)]])
    }
    from = null
  }
  /** A reading of the video's clock. */
  function read(atMs: number, isPlaying: boolean) {
    const step = atMs - lastPositionMs
    if (!isPlaying || step < 0 || step > longestStepMs) {
      positionMs = step >= 0 && step <= longestStepMs ? atMs : positionMs
      close()
      from = isPlaying ? atMs : null
    }
    positionMs = lastPositionMs = atMs
    if (isPlaying) from ??= atMs
  }
  /** Closes the stretch at hand so that the tape shows it. */
  function show() {
    const at = from
    close()
    if (at !== null) from = positionMs
  }
  const report = () => ({ intervals: unsent.value, positionMs: Math.round(positionMs) })

  async function send() {
    show()
    if (!isKept || isSending || (unsent.value.length === 0 && !hasMoved())) return
    isSending = true
    const body = report()
    try {
      const progress = await reportProgress(place, body)
      sent.value = mergeIntervals(progress.intervals)
      unsent.value = unsent.value.filter(
        ([start, end]) => !body.intervals.some(([a, b]) => a <= start && end <= b),
      )
      reportedMs = body.positionMs
      take({ ...progress, positionMs: body.positionMs })
    } catch {
      reportedMs = null
    } finally {
      isSending = false
    }
  }
  let reportedMs: number | null = known.positionMs
  const hasMoved = () => reportedMs === null || Math.abs(reportedMs - positionMs) > 1000

  function leave() {
    show()
    if (!isKept || (unsent.value.length === 0 && !hasMoved())) return
    if (beaconProgress(place, report())) reportedMs = Math.round(positionMs)
  }

  useIntervalFn(show, 1000)
  useIntervalFn(() => void send(), reportEveryMs)
  useEventListener(window, 'online', () => void send())
  useEventListener(window, 'pagehide', leave)
  useEventListener(document, 'visibilitychange', () => {
    if (document.visibilityState === 'hidden') leave()
  })
  onScopeDispose(leave)
  if (isKept && unsent.value.length > 0) void send()

  return { watched, read, send }
}
