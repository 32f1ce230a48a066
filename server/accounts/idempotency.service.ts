import { createHash } from 'node:crypto'
import type { Transaction } from '../db/client'
import { inTransaction } from '../db/transaction'
import { AppError, invalid } from '../errors'
import { holdIdempotencyKey, updateIdempotencyKey } from './idempotency.queries'

interface Repeatable {
  userId: number
  /** Names the route and what it writes to, e.g. `POST questions/17/answers`. */
  route: string
  /** The Idempotency-Key header. */
  key: string | undefined
  payload: unknown
}
interface Given<T> {
  status: number
  response: T
  /** True when this request did the work, false when an earlier one's answer is given again. */
  isFirst: boolean
}

/** Bytes that the column for a route holds. */
const longestRoute = 80

/** A route's name as the table holds it: what is too long is told apart by its digest. */
function nameRoute(route: string): string {
  if (route.length <= longestRoute) return route
  const digest = createHash('sha256').update(route).digest('base64url')
  return `${route.slice(0, longestRoute - digest.length - 1)} ${digest}`
}

/** The key as it came, once it has the shape of one; 400 otherwise. */
export function checkKey(key: string | undefined): string {
  if (key && /^[\w-]{8,64}$/.test(key)) return key
  throw invalid([
    { field: 'Idempotency-Key', message: 'Send a key of 8 to 64 letters, digits or dashes.' },
  ])
}

/**
 * Does `work` once for a key, and gives its stored answer to every repetition. The key, the work and
 * the answer share one transaction; a repetition that comes meanwhile waits for it.
 * 400 without a key, 422 when the key was used for something else.
 */
export async function answerOnce<T>(
  { userId, route, key, payload }: Repeatable,
  work: (tx: Transaction) => Promise<{ status: number; response: T }>,
): Promise<Given<T>> {
  const which = { userId, route: nameRoute(route), key: checkKey(key) }
  const fingerprint = createHash('sha256').update(JSON.stringify(payload)).digest('hex')
  return inTransaction(async (tx) => {
    const held = await holdIdempotencyKey(which, fingerprint, tx)
    if (held.fingerprint !== fingerprint) {
      throw new AppError(422, 'key-used', 'This key was used for something else already.')
    }
    // An answer is stored in the transaction that took the key: without one, that is this transaction.
    if (held.status === null) {
      const answer = await work(tx)
      await updateIdempotencyKey(which, answer, tx)
      return { ...answer, isFirst: true }
    }
    return { status: held.status, response: held.response as T, isFirst: false }
  })
}
