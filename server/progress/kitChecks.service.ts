import type { KitItem } from '../../shared/contracts/lessons'
import type { KitState } from '../../shared/contracts/progress'
import { invalid } from '../errors'
import { insertTicks, listKitItems, listTickedKeys } from './kitChecks.queries'

function stateOf(kit: { key: string }[], ticked: Iterable<string>): KitState {
  const set = new Set(ticked)
  const keys = kit.map(({ key }) => key).filter((key) => set.has(key))
  return { ticked: keys, isComplete: keys.length === kit.length }
}

/** A lesson's kit check and what of it is ticked; `remembered` counts where no rows are kept. */
export async function describeKit(
  lessonId: number,
  userId: number | null,
  remembered: string[],
): Promise<{ kit: KitItem[]; kitState: KitState }> {
  const [rows, ticked] = await Promise.all([
    listKitItems(lessonId),
    userId === null ? remembered : listTickedKeys(userId, lessonId),
  ])
  return { kit: rows.map(({ id: _id, ...item }) => item), kitState: stateOf(rows, ticked) }
}

/**
 * Keeps the ticks of a kit check beside those kept before; 400 for a row it does not have.
 * Without a person nothing is stored: the answer is for the session to remember.
 */
export async function tickKit(
  lessonId: number,
  userId: number | null,
  remembered: string[],
  ticked: string[],
): Promise<KitState> {
  const rows = await listKitItems(lessonId)
  const ids = new Map(rows.map(({ key, id }) => [key, id]))
  const errors = ticked.flatMap((key, index) =>
    ids.has(key)
      ? []
      : [{ field: `ticked.${index}`, message: 'This kit check has no such row. Load it again.' }],
  )
  if (errors.length) throw invalid(errors)
  if (userId === null) return stateOf(rows, [...remembered, ...ticked])
  await insertTicks(
    userId,
    ticked.flatMap((key) => ids.get(key) ?? []),
  )
  return stateOf(rows, await listTickedKeys(userId, lessonId))
}
