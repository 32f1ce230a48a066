import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { searchFewerCuts } from '../../../shared/cutlist/fewestCuts'
import {
  countBars,
  countPieces,
  gatherPlan,
  isPlanSound,
  type Plan,
} from '../../../shared/cutlist/patterns'

const problem = {
  sizes: [
    { width: 7, demand: 0 },
    { width: 5, demand: 0 },
    { width: 3, demand: 0 },
  ],
  offers: [
    { capacity: 20, cost: 1, length: 20, available: null },
    { capacity: 15, cost: 1, length: 15, available: null },
  ],
}
const line = (offer: number, counts: number[], bars: number) => ({
  pattern: { offer, counts },
  bars,
})

/** The fewest patterns over every way to give each bar in turn any of the pieces that are left. */
function fewestPatterns(plan: Plan): number {
  const bars = countBars(problem, plan).flatMap((count, offer) => Array<number>(count).fill(offer))
  let best = plan.length
  const visit = (bar: number, left: readonly number[], used: ReadonlySet<string>) => {
    const offer = bars[bar]
    if (used.size >= best) return
    if (offer === undefined) {
      if (left.every((count) => count === 0)) best = used.size
      return
    }
    const [a = 0, b = 0, c = 0] = left
    for (let x = 0; x <= a; x++)
      for (let y = 0; y <= b; y++)
        for (let z = 0; z <= c; z++) {
          if (7 * x + 5 * y + 3 * z > problem.offers[offer]!.capacity) continue
          const isUsed = x + y + z > 0
          const next = isUsed ? new Set([...used, `${offer}:${x},${y},${z}`]) : used
          visit(bar + 1, [a - x, b - y, c - z], next)
        }
  }
  visit(0, countPieces(problem, plan), new Set())
  return best
}

const anyPlan = (bars: number) =>
  fc
    .array(
      fc
        .tuple(fc.nat({ max: 1 }), fc.array(fc.nat({ max: 4 }), { minLength: 3, maxLength: 3 }))
        .map(([offer, counts]) => line(offer, counts, 1))
        .filter(
          (one) => isPlanSound(problem, [one]) && one.pattern.counts.some((count) => count > 0),
        ),
      { minLength: 1, maxLength: bars },
    )
    .map(gatherPlan)

describe('searchFewerCuts', () => {
  it('finds the fewest patterns there are for a few bars', () => {
    fc.assert(
      fc.property(anyPlan(4), (plan) => {
        expect(searchFewerCuts(problem, plan)).toHaveLength(fewestPatterns(plan))
      }),
    )
  })

  it('cuts the same pieces from no other bars', () => {
    fc.assert(
      fc.property(anyPlan(9), (plan) => {
        const fewer = searchFewerCuts(problem, plan)
        expect(fewer.length).toBeLessThanOrEqual(plan.length)
        expect(isPlanSound(problem, fewer)).toBe(true)
        expect(countPieces(problem, fewer)).toEqual(countPieces(problem, plan))
        const [bars, before] = [countBars(problem, fewer), countBars(problem, plan)]
        expect(bars.every((count, offer) => count <= before[offer]!)).toBe(true)
      }),
    )
  })
})
