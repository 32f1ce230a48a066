import { Router, type Request } from 'express'
import { z } from 'zod'
import {
  changeOwnCalculatorSchema,
  copyOwnCalculatorSchema,
  createOwnCalculatorSchema,
  ownCalculatorKeySchema,
} from '../../shared/contracts/ownCalculators'
import { pageQuerySchema } from '../../shared/contracts/pagination'
import { requireActor } from '../middleware/authenticate'
import { authorize } from '../middleware/authorize'
import { limitRate } from '../middleware/rateLimit'
import { readBody, readParams, readQuery } from '../middleware/validate'
import { copyOwnCalculator, listCopyableFor } from './ownCalculatorCopies.service'
import {
  accessOwnCalculators,
  changeOwnCalculator,
  createOwnCalculator,
  describeOwnCalculator,
  listOfCourse,
  removeOwnCalculator,
} from './ownCalculators.service'
import { listVersions } from './ownCalculatorVersions.service'

export const ownCalculatorsRouter = Router()

const writes = limitRate('bench-writes', 900, 15)
const courseParams = z.object({ courseId: z.coerce.number().int().positive() })
const ownParams = courseParams.extend({ ownKey: ownCalculatorKeySchema })
const courseIdOf = (request: Request) => readParams(request, courseParams).courseId
const locate = async (request: Request) =>
  (await accessOwnCalculators(courseIdOf(request), request.actor)).thing
const maySee = authorize('course:see-bench', locate)
const mayEdit = authorize('course:edit', locate)

const listPath = '/bench/courses/:courseId/own-calculators'
const onePath = `${listPath}/:ownKey`

ownCalculatorsRouter.get(listPath, maySee, async (request, response) => {
  response.json(await listOfCourse(courseIdOf(request), readQuery(request, pageQuerySchema)))
})

ownCalculatorsRouter.post(listPath, writes, mayEdit, async (request, response) => {
  const input = readBody(request, createOwnCalculatorSchema)
  const key = request.get('Idempotency-Key')
  const made = await createOwnCalculator(courseIdOf(request), requireActor(request), input, key)
  response.status(201).json(made)
})

ownCalculatorsRouter.get(onePath, maySee, async (request, response) => {
  const { courseId, ownKey } = readParams(request, ownParams)
  response.json(await describeOwnCalculator(courseId, ownKey, requireActor(request)))
})

ownCalculatorsRouter.patch(onePath, writes, mayEdit, async (request, response) => {
  const { courseId, ownKey } = readParams(request, ownParams)
  const input = readBody(request, changeOwnCalculatorSchema)
  response.json(await changeOwnCalculator(courseId, ownKey, requireActor(request), input))
})

ownCalculatorsRouter.delete(onePath, writes, mayEdit, async (request, response) => {
  const { courseId, ownKey } = readParams(request, ownParams)
  await removeOwnCalculator(courseId, ownKey)
  response.status(204).end()
})

ownCalculatorsRouter.get(`${onePath}/versions`, maySee, async (request, response) => {
  const { courseId, ownKey } = readParams(request, ownParams)
  response.json(await listVersions(courseId, ownKey, readQuery(request, pageQuerySchema)))
})

ownCalculatorsRouter.get(
  '/bench/courses/:courseId/copyable-own-calculators',
  maySee,
  async (request, response) => {
    const page = readQuery(request, pageQuerySchema)
    response.json(await listCopyableFor(courseIdOf(request), requireActor(request), page))
  },
)

ownCalculatorsRouter.post(
  '/bench/courses/:courseId/own-calculator-copies',
  writes,
  mayEdit,
  async (request, response) => {
    const input = readBody(request, copyOwnCalculatorSchema)
    const key = request.get('Idempotency-Key')
    const made = await copyOwnCalculator(courseIdOf(request), requireActor(request), input, key)
    response.status(201).json(made)
  },
)
