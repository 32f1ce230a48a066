import fc from 'fast-check'
import loadHighs, { type Highs } from 'highs'
import { beforeAll, describe, expect, it } from 'vitest'
import { generateColumns, openMaster } from '../../../shared/cutlist/columnGeneration'
import { highsSolver } from '../../../shared/cutlist/highsSolver'
import { openSearch } from '../../../shared/cutlist/search'
import type { PackingProblem } from '../../../shared/cutlist/sectionProblem'

let highs: Highs
beforeAll(async () => {
  highs = await loadHighs()
})
const deadline = { millisecondsLeft: () => 60_000 }

function findBound(problem: PackingProblem) {
  const goal = { costs: problem.offers.map(({ cost }) => cost), cap: null }
  const solver = highsSolver(highs, deadline)
  const search = openSearch(problem, goal, null, { solver, deadline, onChange: () => undefined })
  const master = openMaster(search)
  generateColumns(search, master, null)
  master.program.close()
  return search
}

/** The fewest bars of one length, over every way to put piece after piece into a bar. */
function fewestBars(pieces: number[], capacity: number): number {
  let best = pieces.length
  const place = (index: number, left: number[]) => {
    if (left.length >= best) return
    const piece = pieces[index]
    if (piece === undefined) {
      best = left.length
      return
    }
    left.forEach((room, bar) => {
      if (room >= piece)
        place(
          index + 1,
          left.map((one, other) => (other === bar ? one - piece : one)),
        )
    })
    place(index + 1, [...left, capacity - piece])
  }
  place(0, [])
  return best
}

describe('generateColumns', () => {
  it('proves a bound that no way of cutting goes under', () => {
    const pieces = fc.array(fc.integer({ min: 2, max: 20 }), { minLength: 1, maxLength: 8 })
    fc.assert(
      fc.property(pieces, (widths) => {
        const sizes = [...new Set(widths)]
          .sort((one, other) => other - one)
          .map((width) => ({ width, demand: widths.filter((one) => one === width).length }))
        const offers = [{ capacity: 20, cost: 1, length: 20, available: null }]
        const { bound } = findBound({ sizes, offers })
        const sum = widths.reduce((total, width) => total + width, 0)
        expect(bound).toBeLessThanOrEqual(fewestBars(widths, 20))
        expect(bound).toBeGreaterThanOrEqual(Math.ceil(sum / 20))
      }),
    )
  })

  it('sees more than the lengths added up: three pieces over half a bar need three bars', () => {
    const offers = [{ capacity: 100, cost: 1, length: 100, available: null }]
    expect(findBound({ sizes: [{ width: 51, demand: 3 }], offers }).bound).toBe(3)
  })

  it('proves its bound by prices that no pattern beats, in whole numbers', () => {
    const sizes = [44, 37, 29, 21].map((width, index) => ({ width, demand: 3 + index }))
    const offers = [
      { capacity: 100, cost: 7, length: 100, available: null },
      { capacity: 130, cost: 8, length: 130, available: 2 },
    ]
    const { dual } = findBound({ sizes, offers })
    const { prices, scaledBound } = dual!
    expect([...prices.pieces, ...prices.bars, scaledBound].every(Number.isSafeInteger)).toBe(true)
    const visit = (size: number, left: number, worth: number, most: number): boolean =>
      size === sizes.length
        ? worth <= most
        : Array.from(
            { length: Math.floor(left / sizes[size]!.width) + 1 },
            (_, count) => count,
          ).every(
            (count) =>
              count > sizes[size]!.demand ||
              visit(
                size + 1,
                left - count * sizes[size]!.width,
                worth + count * prices.pieces[size]!,
                most,
              ),
          )
    offers.forEach(({ capacity, cost }, offer) => {
      expect(visit(0, capacity, 0, cost * prices.scale + prices.bars[offer]!)).toBe(true)
    })
    const worth = sizes.reduce((sum, { demand }, size) => sum + demand * prices.pieces[size]!, 0)
    expect(scaledBound).toBe(worth - 2 * prices.bars[1]!)
  })
})
