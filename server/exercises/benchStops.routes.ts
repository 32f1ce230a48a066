import { Router, type Request } from 'express'
import { z } from 'zod'
import { changeStopSchema, createStopSchema } from '../../shared/contracts/benchCourses'
import { authorize } from '../middleware/authorize'
import { limitRate } from '../middleware/rateLimit'
import { readBody, readParams } from '../middleware/validate'
import { accessStops, addStop, changeStop, removeStop } from './benchStops.service'

export const benchStopsRouter = Router()

const writes = limitRate('bench-writes', 900, 15)
const id = z.coerce.number().int().positive()
const lessonParams = z.object({ lessonId: id })
const stopParams = z.object({ stopId: id })

const accessLesson = (request: Request) =>
  accessStops({ lessonId: readParams(request, lessonParams).lessonId }, request.actor)
const accessStop = (request: Request) =>
  accessStops({ stopId: readParams(request, stopParams).stopId }, request.actor)

const mayEditLesson = authorize(
  'course:edit',
  async (request) => (await accessLesson(request)).thing,
)
const mayEditStop = authorize('course:edit', async (request) => (await accessStop(request)).thing)

benchStopsRouter.post(
  '/bench/lessons/:lessonId/stops',
  writes,
  mayEditLesson,
  async (request, response) => {
    const { lessonId } = readParams(request, lessonParams)
    const { revisionId } = await accessLesson(request)
    const stop = await addStop(lessonId, revisionId, readBody(request, createStopSchema))
    response.status(201).json(stop)
  },
)

benchStopsRouter.patch('/bench/stops/:stopId', writes, mayEditStop, async (request, response) => {
  const { stopId } = readParams(request, stopParams)
  const { revisionId } = await accessStop(request)
  const stop = await changeStop(stopId, revisionId, readBody(request, changeStopSchema))
  response.json({ ...stop, savedAt: new Date().toISOString() })
})

benchStopsRouter.delete('/bench/stops/:stopId', writes, mayEditStop, async (request, response) => {
  const { stopId } = readParams(request, stopParams)
  const { revisionId } = await accessStop(request)
  await removeStop(stopId, revisionId)
  response.status(204).end()
})
