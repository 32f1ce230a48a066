import { setTimeout as wait } from 'node:timers/promises'
import { db, type Transaction } from './client'

/** Deadlock, lock wait timeout, record changed since the snapshot. */
const passing = new Set([1213, 1205, 1020])
const tries = 5

/** MariaDB's error number behind a failed query, if that is what it was. */
export function errorNumber(error: unknown): number | null {
  const cause = error instanceof Error && error.cause ? error.cause : error
  const errno = (cause as { errno?: unknown } | null)?.errno
  return typeof errno === 'number' ? errno : null
}

/** True when a unique constraint refused the row. */
export const isDuplicate = (error: unknown) => errorNumber(error) === 1062

/**
 * Runs `work` in one transaction and runs the whole of it again, at most five times with doubling
 * pauses from 50 ms, when the database gave way to another transaction.
 */
export async function inTransaction<T>(work: (tx: Transaction) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await db.transaction(work)
    } catch (error) {
      const errno = errorNumber(error)
      if (attempt >= tries || errno === null || !passing.has(errno)) throw error
      await wait(50 * 2 ** (attempt - 1))
    }
  }
}
