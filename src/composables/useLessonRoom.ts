import { computed, onMounted, watch, type Ref } from 'vue'
import type { WatchedLesson } from '../../shared/contracts/lessons'
import { useAccountsStore } from '../stores/accounts'
import { useExercisesStore } from '../stores/exercises'
import { useFenceStore } from '../stores/fence'
import { useLessonsStore } from '../stores/lessons'
import { useLessonKeys } from './useLessonKeys'
import { useStopsOfLesson } from './useStopsOfLesson'
import { useVideoPlayer } from './useVideoPlayer'
import { useWatchedTime } from './useWatchedTime'

interface LessonRoom {
  lesson: WatchedLesson
  startMs: number
  /** The moment somebody asked for in the address. */
  askedMs: number | null
}
const backMs = 10_000
/** Farther than this from its stop the workbench is left. */
const leaveStopMs = 500

/** The player, the stops, the watched time and the keys of an open lesson, tied together. */
export function useLessonRoom(room: LessonRoom, frame: Ref<HTMLElement | null>) {
  const lessons = useLessonsStore()
  const exercises = useExercisesStore()
  const accounts = useAccountsStore()
  const fence = useFenceStore()

  const player = useVideoPlayer(frame, () => room.lesson.video)
  const { positionMs, isPlaying, jumps, cues } = player
  const watching = useWatchedTime({
    place: { ...lessons.place },
    known: room.lesson.progress,
    personId: room.lesson.can.keepProgress ? (accounts.me?.id ?? null) : null,
    take: lessons.takeProgress,
  })
  watch([positionMs, isPlaying, jumps], ([atMs, plays, jump], [, , jumpBefore]) =>
    watching.read(atMs, plays, jump !== jumpBefore),
  )
  const stops = useStopsOfLesson({
    positionMs,
    isPlaying,
    jumps,
    stops: () => room.lesson.stops,
    durationMs: () => room.lesson.durationMs,
    hold: (atMs) => {
      player.pause()
      player.exitFullScreen()
      watching.read(atMs, false, false)
      player.seek(atMs)
      void watching.send()
    },
  })
  const { open } = stops
  const isHeld = computed(() => open.value?.isRequired === true && !open.value.isSolved)

  const tapeStops = computed(() =>
    room.lesson.stops.map(({ key, name, atMs, isSolved }) => {
      if (key === open.value?.key) return { key, name, atMs, state: 'here' as const }
      return { key, name, atMs, state: isSolved ? ('done' as const) : ('to-do' as const) }
    }),
  )
  const tapeQuestions = computed(() =>
    fence.threads.flatMap(({ atMs, state }) =>
      atMs === null
        ? []
        : [{ atMs, count: 1, state: state === 'settled' ? state : ('open' as const) }],
    ),
  )
  const settleAt = computed(() => cues.value.map((cue) => cue.endMs))

  /** The workbench takes the focus, unless somebody is writing; opened from below, it is scrolled to. */
  function focusWorkbench() {
    if (document.activeElement?.matches('input, textarea')) return
    const workbench = document.querySelector<HTMLElement>('#workbench')
    workbench?.focus({ preventScroll: true })
    if ((workbench?.getBoundingClientRect().top ?? 0) < 0) workbench?.scrollIntoView()
  }
  watch(
    () => open.value?.key,
    (key) => {
      if (!key) exercises.close()
    },
  )
  async function carryOn() {
    stops.close()
    if (!open.value) await player.play()
  }
  function toggle() {
    if (isPlaying.value) player.pause()
    else if (isHeld.value) focusWorkbench()
    else void carryOn()
  }
  /** Going elsewhere on the tape leaves the workbench; the stop stays open for later. */
  function seek(atMs: number) {
    if (open.value && Math.abs(atMs - open.value.atMs) > leaveStopMs) stops.leave()
    player.seek(atMs)
  }
  /** From a stop the video goes on at once, to say again what led to it. */
  function back() {
    const isWaiting = open.value !== null
    seek(Math.max(0, positionMs.value - backMs))
    if (isWaiting) void player.play()
  }
  const goTo = (key: string | undefined) => (key ? stops.openStop(key) : undefined)
  const nextStop = () => goTo(stops.next.value?.key)
  const stopBefore = () => goTo(stops.before.value?.key)
  useLessonKeys({ playOrPause: toggle, nextStop, stopBefore })

  function start() {
    if (room.lesson.video) void player.start(room.lesson.video, positionMs.value)
  }
  onMounted(() => {
    positionMs.value = room.startMs
    start()
    stops.openHere(room.startMs)
  })
  watch(
    () => room.askedMs,
    (atMs) => {
      if (atMs !== null) seek(atMs)
    },
  )

  return {
    ...{ player, watching, stops, open, tapeStops, tapeQuestions, settleAt },
    ...{ start, seek, back, toggle, carryOn, nextStop, stopBefore, focusWorkbench },
  }
}
