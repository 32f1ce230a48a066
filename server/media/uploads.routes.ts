import { Router, type Request, type RequestHandler, type Response } from 'express'
import { requireActor } from '../middleware/authenticate'
import { authorize } from '../middleware/authorize'
import { limitRate } from '../middleware/rateLimit'
import { findSignedInBehind } from '../middleware/session'
import { readUploadPlan } from './uploadPlan'
import { refusals, toRefusal } from './uploadRefusals'
import { accessTarget, accessUpload, createUploads, type Uploads } from './uploads.service'

const version = '1.0.0'

const identify: RequestHandler = async (request, response, next) => {
  response.setHeader('Tus-Resumable', version)
  request.actor = await findSignedInBehind(request)
  requireActor(request)
  next()
}

const checkVersion: RequestHandler = (request, response, next) => {
  if (request.method !== 'OPTIONS' && request.get('Tus-Resumable') !== version) {
    response.setHeader('Tus-Version', version)
    throw refusals.otherVersion()
  }
  if (request.method === 'PATCH') {
    if (request.get('Content-Type') !== 'application/offset+octet-stream') throw refusals.notBytes()
    if (!/^\d{1,16}$/.test(request.get('Upload-Offset') ?? '')) throw refusals.noOffset()
  }
  next()
}

const uploadIdOf = (request: Request) => String(request.params['uploadId'])

/** Passes an answer of the tus library on; its refusals become ours, and nothing is opened to other sites. */
async function pass(answer: globalThis.Response, response: Response) {
  if (response.destroyed) return
  if (answer.status >= 400) {
    response.setHeader('Connection', 'close')
    throw toRefusal(answer.status)
  }
  answer.headers.forEach((value, name) => {
    const isInner = name.startsWith('access-control-') || name === 'upload-metadata'
    if (!isInner) response.setHeader(name, value)
  })
  response.status(answer.status).end(await answer.text())
}

/** Videos on their way in, by the tus protocol 1.0.0 with creation, termination and expiration. */
export function createUploadsRouter(uploads: Uploads): Router {
  const router = Router()
  const passOn = async (request: Request, response: Response) => {
    await pass(await uploads.handle(request, request.originalUrl), response)
  }
  const maySend = authorize('media:upload', async (request) => {
    const { thing } = await accessUpload(uploadIdOf(request), requireActor(request))
    return thing
  })
  const parts = limitRate('upload-parts', 3000, 15)

  router.use('/uploads', identify, checkVersion)
  router.options('/uploads{/:uploadId}', passOn)
  router.post(
    '/uploads',
    limitRate('uploads', 60, 60),
    authorize('media:upload', (request) =>
      accessTarget(readUploadPlan(request.headers).lessonId, request.actor),
    ),
    async (request, response) => {
      const who = { actor: requireActor(request), plan: readUploadPlan(request.headers) }
      await pass(await uploads.begin(request, request.originalUrl, who), response)
    },
  )
  router.head('/uploads/:uploadId', parts, maySend, async (request, response) => {
    const { finishedBytes } = await accessUpload(uploadIdOf(request), requireActor(request))
    if (finishedBytes === null) {
      await passOn(request, response)
      return
    }
    response.setHeader('Upload-Offset', finishedBytes)
    response.setHeader('Upload-Length', finishedBytes)
    response.status(200).end()
  })
  router.patch('/uploads/:uploadId', parts, maySend, passOn)
  router.delete('/uploads/:uploadId', parts, maySend, passOn)
  return router
}

/** Stands before express-session: tus takes the response over. */
export const uploadsRouter = createUploadsRouter(createUploads())
