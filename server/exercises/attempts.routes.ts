import { Router, type Request } from 'express'
import { z } from 'zod'
import { answerSchema, unitSystemSchema } from '../../shared/contracts/exercises'
import { authorizeLesson, lessonOf } from '../middleware/courseAccess'
import { limitRate, limitVisitors } from '../middleware/rateLimit'
import { readBody, readParams, readQuery } from '../middleware/validate'
import { answerStop, describeStop } from './attempts.service'

const stopPath = '/courses/:slug/lessons/:lessonKey/stops/:stopKey'
const stopParamsSchema = z.object({ stopKey: z.string().max(40) })
const stopQuerySchema = z.object({ units: unitSystemSchema.optional() })

const readStop = (request: Request) => ({
  access: lessonOf(request),
  stopKey: readParams(request, stopParamsSchema).stopKey,
  actor: request.actor,
  units: readQuery(request, stopQuerySchema).units,
  remembered: (request.session.samples ??= {}),
})

export const attemptsRouter = Router()

attemptsRouter.get(
  stopPath,
  authorizeLesson('stop:answer'),
  limitVisitors,
  async (request, response) => {
    response.json(await describeStop(readStop(request)))
  },
)

attemptsRouter.post(
  `${stopPath}/attempts`,
  authorizeLesson('stop:answer'),
  limitRate('attempts', 30, 1),
  async (request, response) => {
    const answer = readBody(request, answerSchema)
    const key = request.get('Idempotency-Key')
    response.status(201).json(await answerStop(readStop(request), answer, key))
  },
)
