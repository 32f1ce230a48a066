import { asc, eq, inArray } from 'drizzle-orm'
import type { KitItem } from '../../shared/contracts/lessons'
import { db, type Executor, type Transaction } from '../db/client'
import { kitItems } from '../db/schema'

/** The kit check of each of these lessons, in order. */
export async function listKits(
  lessonIds: number[],
  on: Executor = db,
): Promise<Map<number, KitItem[]>> {
  const kits = new Map<number, KitItem[]>(lessonIds.map((id) => [id, []]))
  if (lessonIds.length === 0) return kits
  const rows = await on
    .select()
    .from(kitItems)
    .where(inArray(kitItems.lessonId, lessonIds))
    .orderBy(asc(kitItems.position))
  for (const { lessonId, key, kind, icon, title, detail } of rows) {
    kits.get(lessonId)?.push({ key, kind, icon, title, detail })
  }
  return kits
}

/** Puts another kit check in the place of a lesson's. */
export async function replaceKit(lessonId: number, items: KitItem[], tx: Transaction) {
  await tx.delete(kitItems).where(eq(kitItems.lessonId, lessonId))
  if (items.length === 0) return
  await tx
    .insert(kitItems)
    .values(items.map((item, index) => ({ ...item, lessonId, position: index + 1 })))
}
