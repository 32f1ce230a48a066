import { at } from './patterns'

/** What may be put into a bar: whole widths above zero, whole values from zero, and how many of each. */
export interface KnapsackItems {
  widths: readonly number[]
  values: readonly number[]
  limits: readonly number[]
}

/** The best filling found, its value, and a value that no filling exceeds (the same where it is proved). */
export interface Filling {
  counts: number[]
  value: number
  bound: number
}

/** Cells of a table that are filled faster than a tree is searched. */
const smallTable = 400_000
/** Cells beyond which a table takes too much memory. */
const largestTable = 60_000_000
const mostNodes = 40_000

/** For each capacity the most valuable filling. */
export function fillBest(items: KnapsackItems, capacities: readonly number[]): Filling[] {
  const bundles = bundleItems(items)
  const cells = bundles.length * Math.max(...capacities)
  if (cells <= smallTable) return fillByTable(items, bundles, capacities)
  const searched = fillWell(items, capacities)
  const isProved = searched.every(({ value, bound }) => value === bound)
  return isProved || cells > largestTable ? searched : fillByTable(items, bundles, capacities)
}

/** For each capacity a valuable filling, the best that a short search finds. */
export const fillWell = (items: KnapsackItems, capacities: readonly number[]): Filling[] =>
  capacities.map((capacity) => searchFilling(items, capacity))

interface Bundle {
  item: number
  count: number
  width: number
  value: number
}

/** Writes limits as bundles of 1, 2, 4 … so that each bundle is taken once or not at all. */
function bundleItems({ widths, values, limits }: KnapsackItems): Bundle[] {
  return widths.flatMap((width, item) => {
    const bundles: Bundle[] = []
    const value = at(values, item)
    for (let left = value > 0 ? at(limits, item) : 0, count = 1; left > 0; count *= 2) {
      const taken = Math.min(count, left)
      bundles.push({ item, count: taken, width: taken * width, value: taken * value })
      left -= taken
    }
    return bundles
  })
}

/** Dynamic programming over the room that is left. */
function fillByTable(
  { widths }: KnapsackItems,
  bundles: readonly Bundle[],
  capacities: readonly number[],
): Filling[] {
  const room = Math.max(0, ...capacities)
  const best = new Float64Array(room + 1)
  const isTaken = bundles.map(({ width, value }) => {
    const taken = new Uint8Array(room + 1)
    for (let filled = room; filled >= width; filled--) {
      const sum = (best[filled - width] ?? 0) + value
      if (sum > (best[filled] ?? 0)) {
        best[filled] = sum
        taken[filled] = 1
      }
    }
    return taken
  })
  return capacities.map((capacity) => {
    const counts = widths.map(() => 0)
    for (let index = bundles.length - 1, left = Math.max(0, capacity); index >= 0; index--) {
      const bundle = bundles[index]
      if (!bundle || isTaken[index]?.[left] !== 1) continue
      counts[bundle.item] = at(counts, bundle.item) + bundle.count
      left -= bundle.width
    }
    const value = at(best, Math.max(0, capacity))
    return { counts, value, bound: value }
  })
}

/** Depth first from the densest item, cut off by what the densest item left could still bring. */
function searchFilling({ widths, values, limits }: KnapsackItems, capacity: number): Filling {
  const order = widths
    .map((width, item) => ({ item, width, value: at(values, item), limit: at(limits, item) }))
    .filter(({ width, value, limit }) => value > 0 && limit > 0 && width <= capacity)
    .sort(
      (one, other) => other.value * one.width - one.value * other.width || one.item - other.item,
    )
  const counts = widths.map(() => 0)
  const best: Filling = { counts: [...counts], value: 0, bound: 0 }
  let nodes = 0
  let unseen = 0
  // Never below the true bound, a whole number: the quotient is lifted by more than its rounding error.
  const bring = (depth: number, left: number) => {
    const next = order[depth]
    return next ? Math.floor(left * (next.value / next.width) * (1 + 1e-12)) : 0
  }
  const visit = (depth: number, left: number, value: number) => {
    if (value > best.value) {
      best.value = value
      best.counts = [...counts]
    }
    const next = order[depth]
    if (!next || value + bring(depth, left) <= best.value) return
    if (++nodes > mostNodes) {
      unseen = Math.max(unseen, value + bring(depth, left))
      return
    }
    for (let count = Math.min(next.limit, Math.floor(left / next.width)); count >= 0; count--) {
      counts[next.item] = count
      visit(depth + 1, left - count * next.width, value + count * next.value)
    }
    counts[next.item] = 0
  }
  visit(0, Math.max(0, capacity), 0)
  return { ...best, bound: Math.max(best.value, unseen) }
}
