import { createHash } from 'node:crypto'
import type { Request, RequestHandler } from 'express'
import { ipKeyGenerator, rateLimit, type Store } from 'express-rate-limit'
import { countRequest, forgetRequests } from '../accounts/rateLimits.service'
import { config } from '../config'
import { AppError } from '../errors'
import { logger } from '../logger'

/** Counts in MariaDB, so that several processes share one limit. */
class DatabaseStore implements Store {
  localKeys = false
  private windowMs = 60_000

  constructor(readonly prefix: string) {}

  init(options: { windowMs: number }) {
    this.windowMs = options.windowMs
  }
  increment(key: string) {
    return countRequest(`${this.prefix}:${key}`.slice(0, 190), this.windowMs)
  }
  async decrement() {}
  async resetKey(key: string) {
    await forgetRequests(`${this.prefix}:${key}`.slice(0, 190))
  }
}

/** The machine a request comes from, whoever is signed in there. */
export const byAddress = (request: Request) => ipKeyGenerator(request.ip ?? 'unknown')

/** The signed-in person, or a visitor's machine. */
const byPerson = (request: Request) =>
  request.actor ? `user-${request.actor.id}` : byAddress(request)

/** The account that a sign-in is meant for, from whatever machine; its address is not written down. */
export function byAccount(request: Request): string {
  const { email } = (request.body ?? {}) as { email?: unknown }
  if (typeof email !== 'string') return byAddress(request)
  return createHash('sha256').update(email.trim().toLowerCase()).digest('hex')
}

/** At most `limit` requests in `minutes`: of a person (or address, for visitors) unless `keyOf` says otherwise. */
export function limitRate(name: string, limit: number, minutes: number, keyOf = byPerson) {
  return rateLimit({
    windowMs: minutes * 60_000,
    limit: Math.ceil(limit * config.rateLimitFactor),
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    store: new DatabaseStore(name),
    keyGenerator: (request) => keyOf(request),
    handler: (request) => {
      logger.warn({ event: 'too-often', limit: name, userId: request.actor?.id ?? null })
      throw new AppError(
        429,
        'too-often',
        `That was too often. Wait ${minutes === 1 ? 'a minute' : `up to ${minutes} minutes`} and try again.`,
      )
    },
  })
}

const visits = limitRate('visits', 240, 5, byAddress)

/** Before what makes the server remember a visitor: each time without a cookie is a session of its own. */
export const limitVisitors: RequestHandler = (request, response, next) => {
  if (request.actor) next()
  else void visits(request, response, next)
}
