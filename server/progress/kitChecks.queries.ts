import { and, asc, eq } from 'drizzle-orm'
import { db } from '../db/client'
import { kitItems, kitTicks } from '../db/schema'

/** The rows of a lesson's kit check in order. */
export async function listKitItems(lessonId: number) {
  return db
    .select({
      id: kitItems.id,
      key: kitItems.key,
      kind: kitItems.kind,
      icon: kitItems.icon,
      title: kitItems.title,
      detail: kitItems.detail,
    })
    .from(kitItems)
    .where(eq(kitItems.lessonId, lessonId))
    .orderBy(asc(kitItems.position))
}

/** The keys of the rows that a person has ticked. */
export async function listTickedKeys(userId: number, lessonId: number): Promise<string[]> {
  const rows = await db
    .select({ key: kitItems.key })
    .from(kitTicks)
    .innerJoin(kitItems, eq(kitItems.id, kitTicks.kitItemId))
    .where(and(eq(kitTicks.userId, userId), eq(kitItems.lessonId, lessonId)))
  return rows.map((row) => row.key)
}

/** Keeps ticks; those that are there already stay as they are. */
export async function insertTicks(userId: number, kitItemIds: number[]) {
  if (kitItemIds.length === 0) return
  await db
    .insert(kitTicks)
    .ignore()
    .values(kitItemIds.map((kitItemId) => ({ userId, kitItemId })))
}
