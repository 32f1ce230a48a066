import type { ErrorRequestHandler, RequestHandler, Response } from 'express'
import type { Problem } from '../../shared/contracts/errors'
import { AppError } from '../errors'
import { logger } from '../logger'

function sendProblem(response: Response, error: AppError) {
  const problem: Problem = {
    type: 'about:blank',
    title: error.code,
    status: error.status,
    code: error.code,
    detail: error.message,
    ...(error.errors ? { errors: error.errors } : {}),
    ...(error.current === undefined ? {} : { current: error.current }),
  }
  response.status(error.status).type('application/problem+json').send(JSON.stringify(problem))
}

/** What body-parser and Express throw, said in our own sentences. */
function fromHttpError(error: unknown): AppError | null {
  const { status, type } = error as { status?: unknown; type?: unknown }
  if (typeof status !== 'number' || status < 400 || status > 499) return null
  if (type === 'entity.too.large') {
    return new AppError(413, 'too-large', 'This is too large to send.', {
      errors: [{ field: '', message: 'Send less at once.' }],
    })
  }
  if (type === 'entity.parse.failed') {
    return new AppError(400, 'not-json', 'The request is not JSON that can be read.', {
      errors: [{ field: '', message: 'Send JSON.' }],
    })
  }
  return new AppError(status, 'bad-request', 'The request cannot be read.')
}

/** Unknown paths under /api. */
export const apiNotFound: RequestHandler = (request) => {
  throw new AppError(
    404,
    'no-such-route',
    `Nothing answers ${request.method} ${request.path} here.`,
  )
}

/** Turns every thrown thing into problem+json; what was not foreseen is logged and says nothing of itself. */
export const errorHandler: ErrorRequestHandler = (error, request, response, next) => {
  if (response.headersSent) return next(error)
  if (error instanceof AppError) return sendProblem(response, error)
  const known = fromHttpError(error)
  if (known) return sendProblem(response, known)
  if ((error as { code?: unknown }).code === 'ECONNABORTED') return response.end()
  logger.error({ err: error, path: request.path }, 'unexpected')
  sendProblem(
    response,
    new AppError(
      500,
      'unexpected',
      'Something went wrong here. Nothing you sent was lost on your side; try again.',
    ),
  )
}
