import { asc, eq, inArray, max, sql } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { lessons, stages } from '../db/schema'

/** Added to every position while rows change places, so that no two ever stand at the same one. */
const aside = 10_000

export type StageRow = typeof stages.$inferSelect
type NewStage = Omit<typeof stages.$inferInsert, 'id'>

/** The stages of a revision in order. */
export const listStages = (revisionId: number, on: Executor = db): Promise<StageRow[]> =>
  on.select().from(stages).where(eq(stages.revisionId, revisionId)).orderBy(asc(stages.position))

/** One stage, or null. */
export async function findStage(id: number, on: Executor = db): Promise<StageRow | null> {
  const [row] = await on.select().from(stages).where(eq(stages.id, id))
  return row ?? null
}

/** The position after the last stage of a revision. */
export async function findNextStagePosition(revisionId: number, tx: Transaction): Promise<number> {
  const [row] = await tx
    .select({ last: max(stages.position) })
    .from(stages)
    .where(eq(stages.revisionId, revisionId))
  return (row?.last ?? 0) + 1
}

/** Adds stages and returns the id of the first. */
export async function insertStages(rows: NewStage[], tx: Transaction): Promise<number> {
  const [row] = await tx.insert(stages).values(rows).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Changes a stage's kind or title. */
export async function updateStage(
  id: number,
  values: Partial<Pick<StageRow, 'kind' | 'title'>>,
  tx: Transaction,
) {
  if (Object.keys(values).length) await tx.update(stages).set(values).where(eq(stages.id, id))
}

/** Removes a stage with its lessons. */
export async function deleteStage(id: number, tx: Transaction) {
  await tx.delete(lessons).where(eq(lessons.stageId, id))
  await tx.delete(stages).where(eq(stages.id, id))
}

/** Gives every stage and lesson of a revision its place; both lists must be complete. */
export async function updatePositions(
  revisionId: number,
  order: { id: number; lessonIds: number[] }[],
  tx: Transaction,
) {
  await tx
    .update(stages)
    .set({ position: sql`${stages.position} + ${aside}` })
    .where(eq(stages.revisionId, revisionId))
  await tx
    .update(lessons)
    .set({ position: sql`${lessons.position} + ${aside}` })
    .where(eq(lessons.revisionId, revisionId))
  for (const [index, stage] of order.entries()) {
    await tx
      .update(stages)
      .set({ position: index + 1 })
      .where(eq(stages.id, stage.id))
    if (stage.lessonIds.length === 0) continue
    const places = stage.lessonIds.map((id, place) => sql`when ${id} then ${place + 1}`)
    await tx
      .update(lessons)
      .set({
        stageId: stage.id,
        position: sql`case ${lessons.id} ${sql.join(places, sql` `)} end`,
      })
      .where(inArray(lessons.id, stage.lessonIds))
  }
}
