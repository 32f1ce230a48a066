import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { useFewerCuts } from '../../../shared/cutlist/fewerCuts'
import { countBars, countPieces, gatherPlan, isPlanSound } from '../../../shared/cutlist/patterns'

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

describe('useFewerCuts', () => {
  it('cuts two bars alike where their pieces share out evenly', () => {
    const plan = [line(0, [2, 0, 0], 1), line(0, [0, 2, 2], 1)]
    expect(useFewerCuts(problem, plan)).toEqual([line(0, [1, 1, 1], 2)])
  })

  it('makes two patterns of three', () => {
    const plan = [line(0, [2, 1, 0], 1), line(0, [0, 1, 4], 1), line(0, [1, 1, 1], 1)]
    expect(useFewerCuts(problem, plan)).toHaveLength(2)
  })

  it('leaves bars of different stock apart', () => {
    const plan = [line(0, [1, 1, 0], 1), line(1, [1, 1, 0], 1)]
    expect(useFewerCuts(problem, plan)).toEqual(plan)
  })

  it('cuts the same pieces from no other bars, and never adds a pattern', () => {
    const anyLine = fc
      .tuple(
        fc.nat({ max: 1 }),
        fc.array(fc.nat({ max: 4 }), { minLength: 3, maxLength: 3 }),
        fc.integer({ min: 1, max: 5 }),
      )
      .map(([offer, counts, bars]) => line(offer, counts, bars))
      .filter((one) => isPlanSound(problem, [one]) && one.pattern.counts.some((count) => count > 0))
    fc.assert(
      fc.property(fc.array(anyLine, { minLength: 1, maxLength: 6 }), (lines) => {
        const plan = gatherPlan(lines)
        const fewer = useFewerCuts(problem, plan)
        expect(fewer.length).toBeLessThanOrEqual(plan.length)
        expect(countPieces(problem, fewer)).toEqual(countPieces(problem, plan))
        const [bars, before] = [countBars(problem, fewer), countBars(problem, plan)]
        expect(bars.every((count, offer) => count <= before[offer]!)).toBe(true)
        expect(isPlanSound(problem, fewer)).toBe(true)
      }),
    )
  })
})
