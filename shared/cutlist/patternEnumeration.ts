import { barWorth, type DualBound } from './dualBound'
import type { Goal } from './master'
import { at, type Pattern } from './patterns'
import type { PackingProblem, Size } from './sectionProblem'

const mostNodes = 4_000_000
const largestTable = 3_000_000

/**
 * Every full pattern that a plan of at most `cost` can use: by the proved prices any other makes it dearer.
 * Full is enough, since a plan may cut more than is asked. Null where there are more than `most`.
 */
export function listUsefulPatterns(
  problem: PackingProblem,
  goal: Goal,
  { prices, scaledBound }: DualBound,
  cost: number,
  most: number,
): Pattern[] | null {
  const slack = cost * prices.scale - scaledBound
  const patterns: Pattern[] = []
  const counter = { nodes: 0 }
  for (const [offer, { capacity }] of problem.offers.entries()) {
    if (capacity < 0) continue
    const worth = barWorth(goal, prices, offer) + at(prices.bars, offer) - slack
    const found = listFrom(
      problem.sizes,
      prices.pieces,
      capacity,
      worth,
      most - patterns.length,
      counter,
    )
    if (!found) return null
    for (const counts of found) patterns.push({ offer, counts })
  }
  return patterns
}

/** The full fillings of a bar that are worth at least so much. */
function listFrom(
  sizes: readonly Size[],
  values: readonly number[],
  capacity: number,
  least: number,
  most: number,
  counter: { nodes: number },
): number[][] | null {
  const bring =
    sizes.length * capacity <= largestTable
      ? tableOfRest(sizes, values, capacity)
      : densityOfRest(sizes, values)
  const counts = sizes.map(() => 0)
  const found: number[][] = []
  const isFull = (left: number) =>
    sizes.every(({ width, demand }, size) => width > left || at(counts, size) >= demand)
  const visit = (size: number, left: number, value: number): boolean => {
    if (value + bring(size, left) < least) return true
    const next = sizes[size]
    if (!next) {
      if (isFull(left)) found.push([...counts])
      return found.length <= most
    }
    if (++counter.nodes > mostNodes) return false
    for (let count = Math.min(next.demand, Math.floor(left / next.width)); count >= 0; count--) {
      counts[size] = count
      if (!visit(size + 1, left - count * next.width, value + count * at(values, size)))
        return false
    }
    return true
  }
  return visit(0, capacity, 0) ? found : null
}

type Bring = (size: number, left: number) => number

/** The most that sizes from `size` on can be worth in the room left, exactly. */
function tableOfRest(sizes: readonly Size[], values: readonly number[], capacity: number): Bring {
  const tables: Float64Array[] = []
  let table = new Float64Array(capacity + 1)
  tables[sizes.length] = table
  for (let size = sizes.length - 1; size >= 0; size--) {
    table = Float64Array.from(table)
    const { width, demand } = sizes[size] ?? { width: 1, demand: 0 }
    for (
      let left = Math.min(demand, Math.floor(capacity / width)), bundle = 1;
      left > 0;
      bundle *= 2
    ) {
      const taken = Math.min(bundle, left)
      left -= taken
      for (let room = capacity; room >= taken * width; room--) {
        const sum = (table[room - taken * width] ?? 0) + taken * at(values, size)
        if (sum > (table[room] ?? 0)) table[room] = sum
      }
    }
    tables[size] = table
  }
  return (size, left) => tables[size]?.[left] ?? 0
}

/** A bound on the same from the densest size, for bars too finely divided for a table. */
function densityOfRest(sizes: readonly Size[], values: readonly number[]): Bring {
  const densities = sizes.map(({ width }, size) => at(values, size) / width)
  const densest = densities.map((_, size) => Math.max(...densities.slice(size)))
  return (size, left) => Math.floor(left * (densest[size] ?? 0) * (1 + 1e-12))
}
