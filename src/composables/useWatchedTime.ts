import { useEventListener, useIntervalFn, useLocalStorage } from '@vueuse/core'
import { computed, onScopeDispose, ref } from 'vue'
import type { Interval, LessonProgress, ReportProgress } from '../../shared/contracts/progress'
import { mergeIntervals } from '../../shared/progress/intervals'
import { beaconProgress, reportProgress } from '../api/progress'
import type { LessonPlace } from '../api/courses'
import { keptWatchingName, sendKeptWatching } from './keptWatching'

const reportEveryMs = 10_000
/** A longer step between two readings of the clock is no watching; a page in the background reads once a second. */
const longestStepMs = 4000
/** Between two jumps a few frames pass; nobody has watched them. */
const leastMs = 250

interface Watching {
  place: LessonPlace
  known: LessonProgress
  /** Whose time it is; null for those whose progress is not kept. */
  personId: number | null
  take: (progress: LessonProgress) => void
}

/**
 * Keeps the stretches that were really watched and hands them in at most every ten seconds and on
 * leaving. What could not be sent stays on the device and goes with the next report.
 */
export function useWatchedTime({ place, known, personId, take }: Watching) {
  const isKept = personId !== null
  const name = keptWatchingName(personId, place)
  const unsent = useLocalStorage<Interval[]>(name, [])
  const sent = ref<Interval[]>(known.intervals)
  let positionMs = known.positionMs
  let from: number | null = null
  let isSending = false
  let reportedMs: number | null = known.positionMs

  const watched = computed(() => mergeIntervals(sent.value, unsent.value))

  function close(leastMs = 0) {
    if (from !== null && positionMs - from > leastMs) {
      unsent.value = mergeIntervals(unsent.value, [[Math.round(from), Math.round(positionMs)]])
    }
    from = null
  }
  /** A reading of the video's clock; a jump ends the stretch at hand where the clock stood before. */
  function read(atMs: number, isPlaying: boolean, hasJumped: boolean) {
    const step = atMs - positionMs
    const isJump = hasJumped || step < 0 || step > longestStepMs
    if (isJump) close(leastMs)
    positionMs = atMs
    if (!isPlaying) close()
    else from ??= atMs
  }
  /** Closes the stretch at hand so that the tape shows it. */
  function show() {
    const isOpen = from !== null
    close()
    if (isOpen) from = positionMs
  }
  const report = (): ReportProgress => ({
    intervals: unsent.value.slice(0, 500),
    positionMs: Math.round(positionMs),
  })
  const hasNews = () =>
    unsent.value.length > 0 || reportedMs === null || Math.abs(reportedMs - positionMs) > 1000

  async function send() {
    show()
    if (!isKept || isSending || !hasNews()) return
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
  async function sendAll() {
    await send()
    if (personId !== null) await sendKeptWatching(personId, name)
  }
  /** The page may be gone before an answer comes, so what is sent here also stays on the device. */
  function leave() {
    show()
    if (!isKept || !hasNews()) return
    if (beaconProgress(place, report())) reportedMs = Math.round(positionMs)
  }

  useIntervalFn(show, 1000)
  useIntervalFn(() => void send(), reportEveryMs)
  useEventListener(window, 'online', () => void sendAll())
  useEventListener(window, 'pagehide', leave)
  useEventListener(document, 'visibilitychange', () => {
    if (document.visibilityState === 'hidden') leave()
  })
  onScopeDispose(() => void send())
  void sendAll()

  return { watched, read, send }
}
