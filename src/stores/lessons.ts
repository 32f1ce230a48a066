import { defineStore } from 'pinia'
import { computed, ref, shallowRef } from 'vue'
import type { WatchedLesson } from '../../shared/contracts/lessons'
import type { LessonProgress } from '../../shared/contracts/progress'
import { fetchLesson, type LessonPlace } from '../api/courses'
import { tickKit as sendTicks } from '../api/progress'

export type { LessonPlace } from '../api/courses'

/** The lesson that is open, as the server last described it. */
export const useLessonsStore = defineStore('lessons', () => {
  const place = ref<LessonPlace>({ slug: '', lessonKey: '', isDraft: false })
  const lesson = shallowRef<WatchedLesson | null>(null)
  const needsKitCheck = computed(() => lesson.value !== null && !lesson.value.kitState.isComplete)

  async function load(from: LessonPlace) {
    place.value = from
    lesson.value = await fetchLesson(from)
    return lesson.value
  }
  /** Keeps the ticks; once all are ticked the lesson comes again, with its video. */
  async function tickKit(ticked: string[]) {
    const kitState = await sendTicks(place.value, ticked)
    if (kitState.isComplete) lesson.value = await fetchLesson(place.value)
    else if (lesson.value) lesson.value = { ...lesson.value, kitState }
  }
  /** Takes how far the lesson is, also along the story pole. */
  function takeProgress(progress: LessonProgress) {
    const open = lesson.value
    if (!open) return
    const stages = open.stages.map((stage) => ({
      ...stage,
      lessons: stage.lessons.map((other) =>
        other.key === open.key ? { ...other, state: progress.state } : other,
      ),
    }))
    lesson.value = { ...open, progress, stages }
  }
  /** A stop that is solved; the last one may have been what the lesson lacked. */
  async function markSolved(stopKey: string) {
    const open = lesson.value
    if (!open) return
    const stops = open.stops.map((stop) =>
      stop.key === stopKey ? { ...stop, isSolved: true } : stop,
    )
    lesson.value = { ...open, stops }
    const isAllSolved = stops.every((stop) => stop.isSolved || !stop.isRequired)
    if (!isAllSolved || !open.can.keepProgress || open.progress.state === 'done') return
    const { key, progress } = await fetchLesson(place.value)
    if (key === lesson.value.key)
      takeProgress({ ...progress, positionMs: open.progress.positionMs })
  }
  return { place, lesson, needsKitCheck, load, tickKit, takeProgress, markSolved }
})
