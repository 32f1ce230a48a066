import { and, eq, lt, sql } from 'drizzle-orm'
import { db, type Transaction } from '../db/client'
import { idempotencyKeys } from '../db/schema'

interface Which {
  userId: number
  route: string
  key: string
}

/**
 * Takes the key for this transaction, or waits for the one that has it; a key of old stays as it is.
 * Unlike `insert ignore` this asks for the whole lock at once, so that two who wait do not block each other.
 */
export async function holdIdempotencyKey(which: Which, fingerprint: string, tx: Transaction) {
  await tx
    .insert(idempotencyKeys)
    .values({ ...which, fingerprint })
    .onDuplicateKeyUpdate({ set: { id: sql`${idempotencyKeys.id}` } })
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
  if (!row) throw new Error('the key was not kept')
  return row
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
