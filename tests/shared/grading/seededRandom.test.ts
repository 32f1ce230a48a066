import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { createRandom, seedFor, shuffle } from '../../../shared/grading/seededRandom'

describe('createRandom', () => {
  it('gives the same numbers for ever', () => {
    const random = createRandom(42)
    // mulberry32 with seed 42 as widely published; from memory.
    expect([random(), random()].map((value) => value.toFixed(6))).toEqual(['0.601104', '0.448291'])
  })

  it('is spread evenly', () => {
    const random = createRandom(7)
    const bins = Array.from({ length: 10 }, () => 0)
    for (let draw = 0; draw < 10_000; draw += 1) {
      const bin = Math.floor(random() * 10)
      bins[bin] = (bins[bin] ?? 0) + 1
    }
    for (const count of bins) expect(Math.abs(count - 1000)).toBeLessThan(150)
  })
})

describe('seedFor', () => {
  it('is a 32-bit number that depends on seed and name', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2 ** 32 - 1 }), fc.string(), (seed, name) => {
        const own = seedFor(seed, name)
        expect(Number.isInteger(own) && own >= 0 && own < 2 ** 32).toBe(true)
      }),
    )
    expect(new Set(['a', 'b', 'ab', 'ba'].map((name) => seedFor(1, name))).size).toBe(4)
    expect(seedFor(1, 'a')).not.toBe(seedFor(2, 'a'))
  })
})

describe('shuffle', () => {
  it('keeps every item and leaves the list alone', () => {
    const list = [1, 2, 3, 4, 5]
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2 ** 32 - 1 }), (seed) => {
        expect([...shuffle(list, seed)].sort()).toEqual([1, 2, 3, 4, 5])
      }),
    )
    expect(list).toEqual([1, 2, 3, 4, 5])
  })
})
