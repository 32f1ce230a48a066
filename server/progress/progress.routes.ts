import { Router } from 'express'
import { reportProgressSchema, tickKitSchema } from '../../shared/contracts/progress'
import { requireActor } from '../middleware/authenticate'
import { authorizeCourse, authorizeLesson, courseOf, lessonOf } from '../middleware/courseAccess'
import { limitVisitors } from '../middleware/rateLimit'
import { readBody } from '../middleware/validate'
import { enrol } from './enrolments.service'
import { reportLesson, tickLessonKit } from './watching.service'

export const progressRouter = Router()

progressRouter.post(
  '/courses/:slug/enrolments',
  authorizeCourse('course:see-sheet'),
  async (request, response) => {
    const { isNew, build } = await enrol(courseOf(request), requireActor(request))
    response.status(isNew ? 201 : 200).json(build)
  },
)

progressRouter.put(
  '/courses/:slug/lessons/:lessonKey/kit-ticks',
  authorizeLesson('lesson:watch'),
  limitVisitors,
  async (request, response) => {
    const { ticked } = readBody(request, tickKitSchema)
    const remembered = (request.session.kit ??= {})
    response.json(await tickLessonKit(lessonOf(request), request.actor, ticked, remembered))
  },
)

progressRouter.post(
  '/courses/:slug/lessons/:lessonKey/progress',
  authorizeLesson('lesson:keep-progress'),
  async (request, response) => {
    const report = readBody(request, reportProgressSchema)
    response.json(await reportLesson(lessonOf(request), requireActor(request), report))
  },
)
