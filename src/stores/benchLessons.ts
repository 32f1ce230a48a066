import { defineStore } from 'pinia'
import { shallowRef } from 'vue'
import type {
  BenchLesson,
  ChangeLesson,
  ChangeStop,
  CreateStop,
} from '../../shared/contracts/benchCourses'
import * as api from '../api/bench'

/** The lesson that lies open on the bench, with its stops. */
export const useBenchLessonsStore = defineStore('benchLessons', () => {
  const lesson = shallowRef<BenchLesson | null>(null)

  async function load(lessonId: number) {
    lesson.value = await api.fetchBenchLesson(lessonId)
    return lesson.value
  }
  /** Looks again at the lesson that is open: its snags, video and captions; another one is left alone. */
  async function refresh() {
    const id = lesson.value?.id
    if (id === undefined) return
    const fresh = await api.fetchBenchLesson(id)
    if (lesson.value?.id === id) lesson.value = fresh
  }
  async function change(lessonId: number, changes: ChangeLesson) {
    lesson.value = await api.changeLesson(lessonId, changes)
    return lesson.value
  }
  async function addStop(lessonId: number, input: CreateStop) {
    const stop = await api.createStop(lessonId, input)
    await refresh()
    return stop
  }
  async function changeStop(stopId: number, changes: ChangeStop) {
    const stop = await api.changeStop(stopId, changes)
    await refresh().catch(() => undefined)
    return stop
  }
  async function removeStop(stopId: number) {
    await api.deleteStop(stopId)
    await refresh()
  }
  return { lesson, load, refresh, change, addStop, changeStop, removeStop }
})
