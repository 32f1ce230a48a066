import { and, eq, isNull, sql } from 'drizzle-orm'
import type { Transaction } from '../db/client'
import { courseRevisions, courses } from '../db/schema'

/** One revision, locked until the transaction ends; null when it is gone. */
export async function lockRevision(id: number, tx: Transaction) {
  const [row] = await tx
    .select()
    .from(courseRevisions)
    .where(eq(courseRevisions.id, id))
    .for('update')
  return row ?? null
}

/** One course, locked until the transaction ends; null when it is gone. */
export async function lockCourse(id: number, tx: Transaction) {
  const [row] = await tx.select().from(courses).where(eq(courses.id, id)).for('update')
  return row ?? null
}

/** Sets the moment a draft was last saved to now; a revision that has just been issued stays as it is. */
export async function touchRevision(id: number, tx: Transaction) {
  await tx
    .update(courseRevisions)
    .set({ savedAt: sql`utc_timestamp(3)` })
    .where(and(eq(courseRevisions.id, id), isNull(courseRevisions.issuedAt)))
}
