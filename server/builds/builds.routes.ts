import { Router } from 'express'
import { putInFieldBookSchema } from '../../shared/contracts/builds'
import { pageQuerySchema } from '../../shared/contracts/pagination'
import { requireActor } from '../middleware/authenticate'
import { authorizeCourse, courseOf } from '../middleware/courseAccess'
import { limitRate } from '../middleware/rateLimit'
import { readBody, readQuery } from '../middleware/validate'
import { describeBuild, listOwnBuilds } from './builds.service'
import { listFieldBook, putInFieldBook } from './fieldBook.service'

export const buildsRouter = Router()

buildsRouter.get('/builds', async (request, response) => {
  const { id } = requireActor(request)
  response.json(await listOwnBuilds(id, readQuery(request, pageQuerySchema)))
})

buildsRouter.get(
  '/courses/:slug/build',
  authorizeCourse('build:see'),
  async (request, response) => {
    response.json(await describeBuild(courseOf(request), requireActor(request).id))
  },
)

buildsRouter.get(
  '/courses/:slug/field-book-entries',
  authorizeCourse('build:see'),
  async (request, response) => {
    response.json(await listFieldBook(courseOf(request), readQuery(request, pageQuerySchema)))
  },
)

buildsRouter.post(
  '/courses/:slug/field-book-entries',
  authorizeCourse('field-book:write'),
  limitRate('field-book', 60, 1),
  async (request, response) => {
    const entry = readBody(request, putInFieldBookSchema)
    const { id } = requireActor(request)
    const key = request.get('Idempotency-Key')
    response.status(201).json(await putInFieldBook(courseOf(request), id, entry, key))
  },
)
