import { Router, type Request } from 'express'
import { z } from 'zod'
import {
  changeCourseSchema,
  createCourseSchema,
  issueCourseSchema,
  orderCourseSchema,
} from '../../shared/contracts/benchCourses'
import { pageQuerySchema } from '../../shared/contracts/pagination'
import { requireActor } from '../middleware/authenticate'
import { authorize } from '../middleware/authorize'
import { limitRate } from '../middleware/rateLimit'
import { readBody, readParams, readQuery } from '../middleware/validate'
import { accessCourse } from './access.service'
import {
  changeCourse,
  createCourse,
  describeBenchCourse,
  listBenchCourses,
  removeCourse,
} from './benchCourses.service'
import { issueCourse } from './issue.service'
import { orderCourse } from './stages.service'

export const benchCoursesRouter = Router()

const writes = limitRate('bench-writes', 900, 15)
const courseParams = z.object({ courseId: z.coerce.number().int().positive() })
const courseIdOf = (request: Request) => readParams(request, courseParams).courseId
const locate = async (request: Request) =>
  (await accessCourse({ id: courseIdOf(request) }, request.actor)).thing
const maySee = authorize('course:see-bench', locate)
const mayEdit = authorize('course:edit', locate)

benchCoursesRouter.get('/bench/courses', async (request, response) => {
  const actor = requireActor(request)
  response.json(await listBenchCourses(actor, readQuery(request, pageQuerySchema)))
})

benchCoursesRouter.post(
  '/bench/courses',
  writes,
  authorize('course:create'),
  async (request, response) => {
    const input = readBody(request, createCourseSchema)
    const key = request.get('Idempotency-Key')
    response.status(201).json(await createCourse(requireActor(request), input, key))
  },
)

benchCoursesRouter.get('/bench/courses/:courseId', maySee, async (request, response) => {
  response.json(await describeBenchCourse(courseIdOf(request), requireActor(request)))
})

benchCoursesRouter.patch('/bench/courses/:courseId', writes, mayEdit, async (request, response) => {
  const input = readBody(request, changeCourseSchema)
  response.json(await changeCourse(courseIdOf(request), requireActor(request), input))
})

benchCoursesRouter.delete(
  '/bench/courses/:courseId',
  writes,
  mayEdit,
  async (request, response) => {
    await removeCourse(courseIdOf(request))
    response.status(204).end()
  },
)

benchCoursesRouter.put(
  '/bench/courses/:courseId/order',
  writes,
  mayEdit,
  async (request, response) => {
    const courseId = courseIdOf(request)
    await orderCourse(courseId, readBody(request, orderCourseSchema))
    response.json(await describeBenchCourse(courseId, requireActor(request)))
  },
)

benchCoursesRouter.post(
  '/bench/courses/:courseId/issue',
  writes,
  authorize('course:issue', locate),
  async (request, response) => {
    const input = readBody(request, issueCourseSchema)
    response.json(await issueCourse(courseIdOf(request), requireActor(request), input))
  },
)
