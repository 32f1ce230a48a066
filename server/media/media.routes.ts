import { Router, type NextFunction, type Request, type Response } from 'express'
import { z } from 'zod'
import { authorizeLesson, lessonOf } from '../middleware/courseAccess'
import { readParams } from '../middleware/validate'
import { findLessonPoster, findPosterFile, findVideoFile, type StoredFile } from './media.service'

export const mediaRouter = Router()

const videoParams = z.object({ videoId: z.coerce.number().int().positive() })
const viewerOf = ({ actor, session }: Request) => ({ actor, kit: session.kit ?? {} })

/** The last bytes of a file that has fewer are all of it (RFC 9110, 14.1.2); the library refuses them. */
function clampSuffix(request: Request, bytes: number) {
  const suffix = /^bytes=-(\d+)$/.exec(request.headers.range ?? '')?.[1]
  if (suffix !== undefined && Number(suffix) > bytes) request.headers.range = 'bytes=0-'
}

/** Sends a file or the part that is asked for; what was aborted by the browser is no error. */
function sendStored(
  file: StoredFile,
  request: Request,
  response: Response,
  next: NextFunction,
  caching = 'private, max-age=3600',
) {
  clampSuffix(request, file.bytes)
  response.setHeader('Content-Type', file.contentType)
  response.setHeader('Cache-Control', caching)
  response.setHeader('ETag', `"${file.tag}"`)
  response.setHeader('Content-Disposition', 'inline')
  response.sendFile(
    file.name,
    { root: file.root, dotfiles: 'allow', lastModified: false },
    (error?: NodeJS.ErrnoException) => {
      if (!error || error.code === 'ECONNABORTED' || error.code === 'EPIPE') return
      if (!response.headersSent) response.setHeader('Cache-Control', 'no-store')
      next(error)
    },
  )
}

mediaRouter.get('/media/videos/:videoId/file', async (request, response, next) => {
  const { videoId } = readParams(request, videoParams)
  sendStored(await findVideoFile(videoId, viewerOf(request)), request, response, next)
})

mediaRouter.get('/media/videos/:videoId/poster', async (request, response, next) => {
  const { videoId } = readParams(request, videoParams)
  sendStored(await findPosterFile(videoId, viewerOf(request)), request, response, next)
})

/** An address that can be known before the lesson is; it shows another picture when the lesson gets another video. */
mediaRouter.get(
  '/courses/:slug/lessons/:lessonKey/poster',
  authorizeLesson('lesson:watch'),
  async (request, response, next) => {
    const file = await findLessonPoster(lessonOf(request).lesson.videoId)
    sendStored(file, request, response, next, 'private, no-cache')
  },
)
