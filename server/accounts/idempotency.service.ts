import { createHash } from 'node:crypto'
import type { Transaction } from '../db/client'
import { inTransaction } from '../db/transaction'
import { AppError, invalid } from '../errors'
import {
  findIdempotencyKey,
  insertIdempotencyKey,
  updateIdempotencyKey,
} from './idempotency.queries'

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

/**
 * Does `work` once for a key, and gives its stored answer to every repetition. The key, the work and
 * the answer share one transaction; a repetition that comes meanwhile waits for it.
 * 400 without a key, 422 when the key was used for something else.
 */
export async function answerOnce<T>(
  { userId, route, key, payload }: Repeatable,
  work: (tx: Transaction) => Promise<{ status: number; response: T }>,
): Promise<Given<T>> {
  if (!key || !/^[\w-]{8,64}$/.test(key)) {
    throw invalid([
      { field: 'Idempotency-Key', message: 'Send a key of 8 to 64 letters, digits or dashes.' },
    ])
  }
  const which = { userId, route, key }
  const fingerprint = createHash('sha256').update(JSON.stringify(payload)).digest('hex')
  return inTransaction(async (tx) => {
    if (await insertIdempotencyKey(which, fingerprint, tx)) {
      const answer = await work(tx)
      await updateIdempotencyKey(which, answer, tx)
      return { ...answer, isFirst: true }
    }
    const earlier = await findIdempotencyKey(which, tx)
    if (earlier?.fingerprint !== fingerprint || earlier.status === null) {
      throw new AppError(422, 'key-used', 'This key was used for something else already.')
    }
    return { status: earlier.status, response: earlier.response as T, isFirst: false }
  })
}
