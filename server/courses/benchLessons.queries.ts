import { asc, count, eq, max } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { lessons, stages } from '../db/schema'
import type { LessonRow } from './access.queries'

type NewLesson = Omit<typeof lessons.$inferInsert, 'id'>

/** The lessons of a revision in the order of its stages. */
export async function listLessons(revisionId: number, on: Executor = db): Promise<LessonRow[]> {
  const rows = await on
    .select({ lesson: lessons })
    .from(lessons)
    .innerJoin(stages, eq(stages.id, lessons.stageId))
    .where(eq(lessons.revisionId, revisionId))
    .orderBy(asc(stages.position), asc(lessons.position))
  return rows.map(({ lesson }) => lesson)
}

/** One lesson, or null. */
export async function findLesson(id: number, on: Executor = db): Promise<LessonRow | null> {
  const [row] = await on.select().from(lessons).where(eq(lessons.id, id))
  return row ?? null
}

/** How many lessons a revision has, and the position after the last of one stage. */
export async function measureLessons(revisionId: number, stageId: number, tx: Transaction) {
  const [all] = await tx
    .select({ n: count() })
    .from(lessons)
    .where(eq(lessons.revisionId, revisionId))
  const [last] = await tx
    .select({ position: max(lessons.position) })
    .from(lessons)
    .where(eq(lessons.stageId, stageId))
  return { inAll: all?.n ?? 0, nextPosition: (last?.position ?? 0) + 1 }
}

/** Adds a lesson and returns its id. */
export async function insertLesson(values: NewLesson, tx: Transaction): Promise<number> {
  const [row] = await tx.insert(lessons).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Changes some columns of a lesson. */
export async function updateLesson(id: number, values: Partial<NewLesson>, tx: Transaction) {
  await tx.update(lessons).set(values).where(eq(lessons.id, id))
}

/** Removes a lesson with its kit check and stops. */
export async function deleteLesson(id: number, tx: Transaction) {
  await tx.delete(lessons).where(eq(lessons.id, id))
}
