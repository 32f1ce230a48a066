import { Router } from 'express'
import { registerQuerySchema } from '../../shared/contracts/courses'
import { authorizeCourse, courseOf } from '../middleware/courseAccess'
import { readQuery } from '../middleware/validate'
import { listRegister } from './register.service'
import { describeSheet } from './sheets.service'

export const registerRouter = Router()

registerRouter.get('/courses', async (request, response) => {
  response.json(await listRegister(readQuery(request, registerQuerySchema), request.actor))
})

registerRouter.get(
  '/courses/:slug',
  authorizeCourse('course:see-sheet'),
  async (request, response) => {
    response.json(await describeSheet(courseOf(request), request.actor))
  },
)
