import { Router, type Request } from 'express'
import { z } from 'zod'
import {
  changeLessonSchema,
  changeStageSchema,
  createLessonSchema,
  createStageSchema,
} from '../../shared/contracts/benchCourses'
import { requireActor } from '../middleware/authenticate'
import { authorize } from '../middleware/authorize'
import { limitRate } from '../middleware/rateLimit'
import { readBody, readParams } from '../middleware/validate'
import { accessBenchRow, accessCourse } from './access.service'
import { describeBenchCourse } from './benchCourses.service'
import { addLesson, changeLesson, describeBenchLesson, removeLesson } from './benchLessons.service'
import { addStage, changeStage, removeStage } from './stages.service'

/** Stages and lessons; a write that changes the outline answers the whole of it. */
export const benchLessonsRouter = Router()

const writes = limitRate('bench-writes', 900, 15)
const id = z.coerce.number().int().positive()
const courseParams = z.object({ courseId: id })
const stageParams = z.object({ stageId: id })
const lessonParams = z.object({ lessonId: id })

const accessStage = (request: Request) =>
  accessBenchRow(readParams(request, stageParams), request.actor)
const accessLesson = (request: Request) =>
  accessBenchRow(readParams(request, lessonParams), request.actor)

const mayEditCourse = authorize('course:edit', async (request) => {
  const { courseId } = readParams(request, courseParams)
  return (await accessCourse({ id: courseId }, request.actor)).thing
})
const mayEditStage = authorize('course:edit', async (request) => (await accessStage(request)).thing)
const mayEditLesson = authorize(
  'course:edit',
  async (request) => (await accessLesson(request)).thing,
)
const maySeeLesson = authorize(
  'course:see-bench',
  async (request) => (await accessLesson(request)).thing,
)

benchLessonsRouter.post(
  '/bench/courses/:courseId/stages',
  writes,
  mayEditCourse,
  async (request, response) => {
    const { courseId } = readParams(request, courseParams)
    const createdId = await addStage(courseId, readBody(request, createStageSchema))
    const outline = await describeBenchCourse(courseId, requireActor(request))
    response.status(201).json({ ...outline, createdId })
  },
)

benchLessonsRouter.patch(
  '/bench/stages/:stageId',
  writes,
  mayEditStage,
  async (request, response) => {
    const { course, revisionId } = await accessStage(request)
    const { stageId } = readParams(request, stageParams)
    await changeStage(stageId, revisionId, readBody(request, changeStageSchema))
    response.json(await describeBenchCourse(course.id, requireActor(request)))
  },
)

benchLessonsRouter.delete(
  '/bench/stages/:stageId',
  writes,
  mayEditStage,
  async (request, response) => {
    const { course, revisionId } = await accessStage(request)
    await removeStage(readParams(request, stageParams).stageId, revisionId)
    response.json(await describeBenchCourse(course.id, requireActor(request)))
  },
)

benchLessonsRouter.post(
  '/bench/stages/:stageId/lessons',
  writes,
  mayEditStage,
  async (request, response) => {
    const { course, revisionId } = await accessStage(request)
    const { stageId } = readParams(request, stageParams)
    const createdId = await addLesson(stageId, revisionId, readBody(request, createLessonSchema))
    const outline = await describeBenchCourse(course.id, requireActor(request))
    response.status(201).json({ ...outline, createdId })
  },
)

benchLessonsRouter.get('/bench/lessons/:lessonId', maySeeLesson, async (request, response) => {
  const { lessonId } = readParams(request, lessonParams)
  response.json(await describeBenchLesson(lessonId, requireActor(request)))
})

benchLessonsRouter.patch(
  '/bench/lessons/:lessonId',
  writes,
  mayEditLesson,
  async (request, response) => {
    const { revisionId } = await accessLesson(request)
    const { lessonId } = readParams(request, lessonParams)
    const input = readBody(request, changeLessonSchema)
    response.json(await changeLesson(lessonId, revisionId, requireActor(request), input))
  },
)

benchLessonsRouter.delete(
  '/bench/lessons/:lessonId',
  writes,
  mayEditLesson,
  async (request, response) => {
    const { course, revisionId } = await accessLesson(request)
    await removeLesson(readParams(request, lessonParams).lessonId, revisionId)
    response.json(await describeBenchCourse(course.id, requireActor(request)))
  },
)
