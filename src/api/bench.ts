import {
  benchCourseRowSchema,
  benchCourseSchema,
  benchLessonSchema,
  benchStopSchema,
  type ChangeCourse,
  type ChangeLesson,
  type ChangeStage,
  type ChangeStop,
  type CreateCourse,
  type CreateLesson,
  type CreateStage,
  type CreateStop,
  type IssueCourse,
  type OrderCourse,
} from '../../shared/contracts/benchCourses'
import { pageOf } from '../../shared/contracts/pagination'
import { queryString, request, requestNothing } from './client'

const benchPageSchema = pageOf(benchCourseRowSchema)
const course = (courseId: number, rest = '') => `/bench/courses/${courseId}${rest}`
const lesson = (lessonId: number, rest = '') => `/bench/lessons/${lessonId}${rest}`

export const fetchBench = (cursor: string | null = null) =>
  request(benchPageSchema, `/bench/courses${queryString({ cursor })}`)
export const createCourse = (body: CreateCourse, idempotencyKey: string) =>
  request(benchCourseSchema, '/bench/courses', { method: 'POST', body, idempotencyKey })
export const fetchBenchCourse = (courseId: number) => request(benchCourseSchema, course(courseId))
export const changeCourse = (courseId: number, body: ChangeCourse) =>
  request(benchCourseSchema, course(courseId), { method: 'PATCH', body })
export const deleteCourse = (courseId: number) =>
  requestNothing(course(courseId), { method: 'DELETE' })
export const orderCourse = (courseId: number, body: OrderCourse) =>
  request(benchCourseSchema, course(courseId, '/order'), { method: 'PUT', body })
export const issueCourse = (courseId: number, body: IssueCourse) =>
  request(benchCourseSchema, course(courseId, '/issue'), { method: 'POST', body })
export const createStage = (courseId: number, body: CreateStage) =>
  request(benchCourseSchema, course(courseId, '/stages'), { method: 'POST', body })
export const changeStage = (stageId: number, body: ChangeStage) =>
  request(benchCourseSchema, `/bench/stages/${stageId}`, { method: 'PATCH', body })
export const deleteStage = (stageId: number) =>
  request(benchCourseSchema, `/bench/stages/${stageId}`, { method: 'DELETE' })
export const createLesson = (stageId: number, body: CreateLesson) =>
  request(benchCourseSchema, `/bench/stages/${stageId}/lessons`, { method: 'POST', body })

export const fetchBenchLesson = (lessonId: number) => request(benchLessonSchema, lesson(lessonId))
export const changeLesson = (lessonId: number, body: ChangeLesson) =>
  request(benchLessonSchema, lesson(lessonId), { method: 'PATCH', body })
export const deleteLesson = (lessonId: number) =>
  request(benchCourseSchema, lesson(lessonId), { method: 'DELETE' })
export const createStop = (lessonId: number, body: CreateStop) =>
  request(benchStopSchema, lesson(lessonId, '/stops'), { method: 'POST', body })
export const changeStop = (stopId: number, body: ChangeStop) =>
  request(benchStopSchema, `/bench/stops/${stopId}`, { method: 'PATCH', body })
export const deleteStop = (stopId: number) =>
  requestNothing(`/bench/stops/${stopId}`, { method: 'DELETE' })
