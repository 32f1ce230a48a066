import type { Request, RequestHandler } from 'express'
import { logger } from '../logger'

/** Writes down how signing in, up or out ended, for whom and from where; nothing that was typed. */
export const audit =
  (event: string): RequestHandler =>
  (request, response, next) => {
    const before = request.actor?.id ?? null
    response.on('finish', () => {
      const { session } = request as Partial<Request>
      const userId = session?.userId ?? before
      const outcome = { event, userId, status: response.statusCode, address: request.ip }
      if (response.statusCode < 400) logger.info(outcome)
      else logger.warn(outcome)
    })
    next()
  }
