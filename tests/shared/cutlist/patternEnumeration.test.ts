import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { listUsefulPatterns } from '../../../shared/cutlist/patternEnumeration'

const anySizes = fc
  .uniqueArray(fc.integer({ min: 2, max: 20 }), { minLength: 1, maxLength: 4 })
  .chain((widths) =>
    fc.tuple(
      ...widths
        .sort((one, other) => other - one)
        .map((width) =>
          fc.record({
            width: fc.constant(width),
            demand: fc.integer({ min: 1, max: 4 }),
            price: fc.integer({ min: 0, max: 40 }),
          }),
        ),
    ),
  )

describe('listUsefulPatterns', () => {
  const capacity = 30
  const scale = 10

  it('lists every full pattern that is worth enough, and no other', () => {
    fc.assert(
      fc.property(
        anySizes,
        fc.integer({ min: 0, max: 12 }),
        fc.integer({ min: 1, max: 3 }),
        (sizes, slack, by) => {
          const full: string[] = []
          const visit = (counts: number[]) => {
            const size = sizes[counts.length]
            const used = counts.reduce((sum, count, index) => sum + count * sizes[index]!.width, 0)
            if (size) {
              for (let count = 0; count <= size.demand; count++) visit([...counts, count])
              return
            }
            const isFull = sizes.every(
              ({ width, demand }, index) => counts[index] === demand || used + width > capacity,
            )
            const worth = counts.reduce((sum, count, index) => sum + count * sizes[index]!.price, 0)
            if (used <= capacity && isFull && worth >= 10 - slack) full.push(counts.join())
          }
          visit([])
          const problem = {
            sizes: sizes.map(({ width, demand }) => ({ width: width * by, demand })),
            offers: [{ capacity: capacity * by, cost: 1, length: 1, available: null }],
          }
          const prices = { scale, pieces: sizes.map(({ price }) => price), bars: [0], cap: 0 }
          const dual = { prices, scaledBound: 20 * scale - slack }
          const listed = listUsefulPatterns(problem, { costs: [1], cap: null }, dual, 20, 1000)
          expect(listed!.map(({ counts }) => counts.join()).sort()).toEqual(full.sort())
        },
      ),
    )
  })

  it('gives up where there are more than asked for', () => {
    const sizes = [5, 4, 3].map((width) => ({ width, demand: 9 }))
    const problem = { sizes, offers: [{ capacity: 30, cost: 1, length: 1, available: null }] }
    const dual = { prices: { scale, pieces: [0, 0, 0], bars: [0], cap: 0 }, scaledBound: 0 }
    expect(listUsefulPatterns(problem, { costs: [1], cap: null }, dual, 9, 5)).toBeNull()
  })
})
