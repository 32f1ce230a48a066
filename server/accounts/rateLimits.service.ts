import { addRateLimitHit, deleteRateLimit } from './rateLimits.queries'

/** Counts one request under `key` and says how many there were in the running window. */
export const countRequest = (key: string, windowMs: number) => addRateLimitHit(key, windowMs)

/** Begins a key's window anew. */
export const forgetRequests = (key: string) => deleteRateLimit(key)
