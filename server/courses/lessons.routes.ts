import { Router } from 'express'
import { authorizeLesson, lessonOf } from '../middleware/courseAccess'
import { describeLesson } from './lessons.service'

export const lessonsRouter = Router()

lessonsRouter.get(
  '/courses/:slug/lessons/:lessonKey',
  authorizeLesson('lesson:watch'),
  async (request, response) => {
    const { kit = {}, samples = {} } = request.session
    response.json(await describeLesson(lessonOf(request), request.actor, { kit, samples }))
  },
)
