import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fillBest, type KnapsackItems } from '../../../shared/cutlist/knapsack'

/** The best value over every filling. */
function bruteForce({ widths, values, limits }: KnapsackItems, capacity: number): number {
  const visit = (item: number, left: number): number => {
    const width = widths[item]
    if (width === undefined) return 0
    let best = 0
    for (let count = 0; count <= limits[item]! && count * width <= left; count++) {
      best = Math.max(best, count * values[item]! + visit(item + 1, left - count * width))
    }
    return best
  }
  return visit(0, capacity)
}

const anyItems = (widest: number) =>
  fc
    .array(
      fc.tuple(
        fc.integer({ min: 1, max: widest }),
        fc.integer({ min: 0, max: 50 }),
        fc.integer({ min: 0, max: 5 }),
      ),
      { minLength: 1, maxLength: 5 },
    )
    .map((rows) => ({
      widths: rows.map(([width]) => width),
      values: rows.map(([, value]) => value),
      limits: rows.map(([, , limit]) => limit),
    }))

/** Widths of bars this long are too many for a small table, so that the tree is searched. */
const scales = [
  { name: 'a short bar', by: 1 },
  { name: 'a finely divided bar', by: 9973 },
]

describe('fillBest', () => {
  it.each(scales)('finds the most valuable filling of $name', ({ by }) => {
    const capacities = fc.array(fc.integer({ min: -3, max: 60 }), { minLength: 1, maxLength: 3 })
    fc.assert(
      fc.property(anyItems(30), capacities, (plain, rooms) => {
        const items = { ...plain, widths: plain.widths.map((width) => width * by) }
        const fillings = fillBest(
          items,
          rooms.map((room) => room * by),
        )
        rooms.forEach((room, index) => {
          const { counts, value, bound } = fillings[index]!
          const width = counts.reduce((sum, count, item) => sum + count * plain.widths[item]!, 0)
          const worth = counts.reduce((sum, count, item) => sum + count * plain.values[item]!, 0)
          expect(value).toBe(room < 0 ? 0 : bruteForce(plain, room))
          expect({ worth, bound }).toEqual({ worth: value, bound: value })
          expect(width).toBeLessThanOrEqual(Math.max(0, room))
          expect(counts.every((count, item) => count <= plain.limits[item]!)).toBe(true)
        })
      }),
    )
  })

  it('never names a bound below the best value where the search was cut short', () => {
    // 40 sizes of nearly one density and a bar too finely divided for a table.
    const widths = Array.from({ length: 40 }, (_, item) => 400_001 + 7919 * item)
    const items = {
      widths,
      values: widths.map((width) => width - 400_000 + 399_000),
      limits: widths.map(() => 9),
    }
    const [filling] = fillBest(items, [9_000_000])
    expect(filling!.bound).toBeGreaterThanOrEqual(filling!.value)
    const width = filling!.counts.reduce((sum, count, item) => sum + count * widths[item]!, 0)
    expect(width).toBeLessThanOrEqual(9_000_000)
    // Each piece is worth 1001 less than it is wide, and 22 of the narrowest fill the bar almost.
    expect(filling!.bound).toBeLessThanOrEqual(9_000_000)
    expect(filling!.value).toBeGreaterThan(8_700_000)
  })
})
