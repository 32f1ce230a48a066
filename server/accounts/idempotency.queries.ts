import { and, eq, lt, sql } from 'drizzle-orm'
import { db, type Transaction } from '../db/client'
import { idempotencyKeys } from '../db/schema'

interface Which {
  userId: number
  route: string
  key: string
}

/** Takes the key for this transaction; false when another request took it before. */
export async function insertIdempotencyKey(which: Which, fingerprint: string, tx: Transaction) {
  const [result] = await tx
    .insert(idempotencyKeys)
    .ignore()
    .values({ ...which, fingerprint })
  return result.affectedRows === 1
}

/** The key as the request that took it left it. */
export async function findIdempotencyKey(which: Which, tx: Transaction) {
  const [row] = await tx
    .select()
    .from(idempotencyKeys)
    .where(
      and(
        eq(idempotencyKeys.userId, which.userId),
        eq(idempotencyKeys.route, which.route),
        eq(idempotencyKeys.key, which.key),
      ),
    )
    .for('update')
  return row ?? null
}

/** Keeps the answer that was given under the key. */
export async function updateIdempotencyKey(
  which: Which,
  answer: { status: number; response: unknown },
  tx: Transaction,
) {
  await tx
    .update(idempotencyKeys)
    .set(answer)
    .where(
      and(
        eq(idempotencyKeys.userId, which.userId),
        eq(idempotencyKeys.route, which.route),
        eq(idempotencyKeys.key, which.key),
      ),
    )
}

/** Forgets keys older than a week. */
export async function deleteOldIdempotencyKeys() {
  await db
    .delete(idempotencyKeys)
    .where(lt(idempotencyKeys.createdAt, sql`utc_timestamp(3) - interval 7 day`))
}
