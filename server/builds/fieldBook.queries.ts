import { and, desc, eq, lt } from 'drizzle-orm'
import { db, type Transaction } from '../db/client'
import { fieldBookEntries, lessons, stops } from '../db/schema'

export type EntryRow = typeof fieldBookEntries.$inferSelect

/** True when a revision has a lesson with this key. */
export async function hasLesson(revisionId: number, lessonKey: string): Promise<boolean> {
  const rows = await db
    .select({ id: lessons.id })
    .from(lessons)
    .where(and(eq(lessons.revisionId, revisionId), eq(lessons.key, lessonKey)))
  return rows.length > 0
}

/** True when a lesson of a revision has a stop with this key. */
export async function hasStop(
  revisionId: number,
  lessonKey: string,
  stopKey: string,
): Promise<boolean> {
  const rows = await db
    .select({ id: stops.id })
    .from(stops)
    .innerJoin(lessons, eq(lessons.id, stops.lessonId))
    .where(
      and(eq(lessons.revisionId, revisionId), eq(lessons.key, lessonKey), eq(stops.key, stopKey)),
    )
  return rows.length > 0
}

/** A page of the field book, the newest entry first. */
export async function listEntries(buildId: number, beforeId: number | null, limit: number) {
  return db
    .select()
    .from(fieldBookEntries)
    .where(
      and(
        eq(fieldBookEntries.buildId, buildId),
        beforeId === null ? undefined : lt(fieldBookEntries.id, beforeId),
      ),
    )
    .orderBy(desc(fieldBookEntries.id))
    .limit(limit)
}

/** Adds an entry to the field book and returns it as it stands. */
export async function insertEntry(values: typeof fieldBookEntries.$inferInsert, tx: Transaction) {
  const [made] = await tx.insert(fieldBookEntries).values(values).$returningId()
  const [row] = await tx
    .select()
    .from(fieldBookEntries)
    .where(eq(fieldBookEntries.id, made?.id ?? 0))
  if (!row) throw new Error('an entry of the field book was not kept')
  return row
}
