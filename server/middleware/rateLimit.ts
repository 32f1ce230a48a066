import { ipKeyGenerator, rateLimit, type Store } from 'express-rate-limit'
import { countRequest, forgetRequests } from '../accounts/rateLimits.service'
import { config } from '../config'
import { AppError } from '../errors'

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

/** At most `limit` requests a person (or address, for visitors) in `minutes`. */
export function limitRate(name: string, limit: number, minutes: number) {
  return rateLimit({
    windowMs: minutes * 60_000,
    limit: Math.ceil(limit * config.rateLimitFactor),
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    store: new DatabaseStore(name),
    keyGenerator: (request) =>
      request.actor ? `user-${request.actor.id}` : ipKeyGenerator(request.ip ?? 'unknown'),
    handler: () => {
      throw new AppError(
        429,
        'too-often',
        `That was too often. Wait ${minutes === 1 ? 'a minute' : `up to ${minutes} minutes`} and try again.`,
      )
    },
  })
}
