import type { IncomingMessage } from 'node:http'
import type { RequestHandler } from 'express'
import { config } from '../config'
import { AppError } from '../errors'

const reading = new Set(['GET', 'HEAD', 'OPTIONS'])

function ownOrigins(request: IncomingMessage): Set<string> {
  const host = request.headers.host ?? ''
  const own = config.isBehindTls ? [] : [`http://${host}`]
  return new Set(config.publicOrigin ? [...own, config.publicOrigin] : own)
}

/** True when the browser says that the request comes from our own pages. */
export function comesFromOwnPages(request: IncomingMessage): boolean {
  const site = request.headers['sec-fetch-site']
  if (site !== undefined && site !== 'same-origin') return false
  const origin = request.headers.origin
  if (origin === undefined) return site === 'same-origin'
  return ownOrigins(request).has(origin)
}

/** Refuses every write that does not come from our own pages. */
export const sameOrigin: RequestHandler = (request, _response, next) => {
  if (reading.has(request.method) || comesFromOwnPages(request)) return next()
  throw new AppError(
    403,
    'other-origin',
    'This was sent from another site, so nothing was changed.',
  )
}
