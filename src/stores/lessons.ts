import { defineStore } from 'pinia'
import { computed, ref, shallowRef } from 'vue'
import type { WatchedLesson } from '../../shared/contracts/lessons'
import type { LessonProgress } from '../../shared/contracts/progress'
import { fetchLesson, type LessonPlace } from '../api/courses'
import { tickKit as sendTicks } from '../api/progress'

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
  function takeProgress(progress: LessonProgress) {
    if (lesson.value) lesson.value = { ...lesson.value, progress }
  }
  function markSolved(stopKey: string) {
    if (!lesson.value) return
    const stops = lesson.value.stops.map((stop) =>
      stop.key === stopKey ? { ...stop, isSolved: true } : stop,
    )
    lesson.value = { ...lesson.value, stops }
  }
  return { place, lesson, needsKitCheck, load, tickKit, takeProgress, markSolved }
})
