import { defineStore } from 'pinia'
import { ref, shallowRef } from 'vue'
import type {
  BenchCourse,
  BenchCourseRow,
  ChangeCourse,
  ChangeStage,
  CreateCourse,
  CreateStage,
  OrderCourse,
} from '../../shared/contracts/benchCourses'
import * as api from '../api/bench'

/** The instructor's courses, and the one that lies open on the bench. */
export const useBenchStore = defineStore('bench', () => {
  const rows = ref<BenchCourseRow[]>([])
  const nextCursor = ref<string | null>(null)
  const course = shallowRef<BenchCourse | null>(null)
  /** The same for a repeated create, so that a lost line makes no second course. */
  let createKey: { body: string; key: string } | null = null

  async function loadRows() {
    const page = await api.fetchBench()
    rows.value = page.items
    nextCursor.value = page.nextCursor
    return page.items
  }
  async function loadMoreRows() {
    const page = await api.fetchBench(nextCursor.value)
    rows.value = [...rows.value, ...page.items]
    nextCursor.value = page.nextCursor
  }
  async function create(input: CreateCourse) {
    const body = JSON.stringify(input)
    if (createKey?.body !== body) createKey = { body, key: crypto.randomUUID() }
    course.value = await api.createCourse(input, createKey.key)
    createKey = null
    return course.value
  }
  async function load(courseId: number) {
    course.value = await api.fetchBenchCourse(courseId)
    return course.value
  }
  async function change(courseId: number, changes: ChangeCourse) {
    course.value = await api.changeCourse(courseId, changes)
    return course.value
  }
  async function remove(courseId: number) {
    await api.deleteCourse(courseId)
    course.value = null
  }
  async function order(courseId: number, input: OrderCourse) {
    course.value = await api.orderCourse(courseId, input)
  }
  async function issue(courseId: number, changeNote: string) {
    course.value = await api.issueCourse(courseId, { changeNote })
  }
  async function addStage(courseId: number, input: CreateStage) {
    course.value = await api.createStage(courseId, input)
  }
  async function changeStage(stageId: number, input: ChangeStage) {
    course.value = await api.changeStage(stageId, input)
  }
  async function removeStage(stageId: number) {
    course.value = await api.deleteStage(stageId)
  }
  async function addLesson(stageId: number, title: string) {
    course.value = await api.createLesson(stageId, { title })
  }
  async function removeLesson(lessonId: number) {
    course.value = await api.deleteLesson(lessonId)
  }
  return {
    rows,
    nextCursor,
    course,
    loadRows,
    loadMoreRows,
    create,
    load,
    change,
    remove,
    order,
    issue,
    addStage,
    changeStage,
    removeStage,
    addLesson,
    removeLesson,
  }
})
