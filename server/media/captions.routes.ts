import express, { Router, type Request } from 'express'
import { z } from 'zod'
import {
  maxCaptionBytes,
  saveCuesSchema,
  uploadCaptionsQuerySchema,
} from '../../shared/contracts/media'
import { pageQuerySchema } from '../../shared/contracts/pagination'
import { authorize } from '../middleware/authorize'
import { limitRate } from '../middleware/rateLimit'
import { readBody, readParams, readQuery } from '../middleware/validate'
import {
  accessCaptions,
  listCuePage,
  removeTrack,
  renderCaptions,
  saveCues,
  uploadCaptions,
} from './captions.service'

/** Stands before the JSON reader: a caption file comes as it is, and a list of cues may be long. */
export const captionsRouter = Router()

const writes = limitRate('bench-writes', 900, 15)
const id = z.coerce.number().int().positive()
const lessonParams = z.object({ lessonId: id })
const trackParams = z.object({ trackId: id })
const cueQuerySchema = pageQuerySchema.extend({
  limit: z.coerce.number().int().min(1).max(500).default(200),
})

const trackIdOf = (request: Request) => readParams(request, trackParams).trackId
const ofLesson = async (request: Request) =>
  (await accessCaptions(readParams(request, lessonParams), request.actor)).thing
const ofTrack = async (request: Request) =>
  (await accessCaptions({ trackId: trackIdOf(request) }, request.actor)).thing

captionsRouter.post(
  '/bench/lessons/:lessonId/captions',
  limitRate('captions', 120, 15),
  authorize('course:edit', ofLesson),
  express.raw({ type: () => true, limit: maxCaptionBytes }),
  async (request, response) => {
    const { lessonId } = readParams(request, lessonParams)
    const query = readQuery(request, uploadCaptionsQuerySchema)
    const bytes = request.body instanceof Uint8Array ? request.body : new Uint8Array()
    const result = await uploadCaptions(lessonId, query, bytes)
    response.status(result.stored ? 201 : 200).json(result)
  },
)

captionsRouter.get(
  '/bench/captions/:trackId/cues',
  authorize('course:see-bench', ofTrack),
  async (request, response) => {
    response.json(await listCuePage(trackIdOf(request), readQuery(request, cueQuerySchema)))
  },
)

captionsRouter.put(
  '/bench/captions/:trackId/cues',
  writes,
  authorize('course:edit', ofTrack),
  express.json({ limit: 3 * maxCaptionBytes }),
  async (request, response) => {
    response.json(await saveCues(trackIdOf(request), readBody(request, saveCuesSchema)))
  },
)

captionsRouter.delete(
  '/bench/captions/:trackId',
  writes,
  authorize('course:edit', ofTrack),
  async (request, response) => {
    await removeTrack(trackIdOf(request))
    response.status(204).end()
  },
)

captionsRouter.get('/media/captions/:trackId.vtt', async (request, response) => {
  const viewer = { actor: request.actor, kit: request.session.kit ?? {} }
  const text = await renderCaptions(trackIdOf(request), viewer)
  response.setHeader('Cache-Control', 'private, no-cache')
  response.type('text/vtt').send(text)
})
