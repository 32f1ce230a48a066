import { describe, expect, it } from 'vitest'
import { cutListAtOnce } from '../../../../shared/cutlist/solveCutList'
import {
  cutListHelp,
  gatherPurchases,
  proofWords,
  searchWords,
} from '../../../../src/components/exercises/cutListWords'

describe('words of a cut list', () => {
  it.each([
    ['optimal', true, 'Proved: nothing cheaper is possible.'],
    ['optimal', false, 'Proved: it cannot be done with less.'],
    [{ gapPercent: 2.1 }, true, 'Within 3 % of the best possible.'],
    [{ gapPercent: 3 }, true, 'Within 3 % of the best possible.'],
    [{ gapPercent: 0.04 }, true, 'Within 0.1 % of the best possible.'],
    [{ gapPercent: Infinity }, true, 'How far it is from the best possible is not known.'],
  ] as const)('says what is proved: %s', (proof, isPriced, words) => {
    expect(proofWords(proof, isPriced)).toBe(words)
  })

  it('promises nothing where cost is settled and waste is not', () => {
    expect(proofWords({ gapPercent: 0 }, true)).toMatch(/Nothing is cheaper; .* not proved/)
  })

  it('says how long a search may take, and how it ended', () => {
    expect(searchWords('searching', 20, true)).toContain('up to 20 seconds')
    expect(searchWords('searching', 20, false)).toContain('scarce')
    for (const state of ['gap', 'stopped', 'failed'] as const) {
      expect(searchWords(state, 20, true)).not.toBe('')
    }
    expect(searchWords('proved', 20, true)).toBe('')
  })

  it('helps in at most five lines of a phone', () => {
    expect(cutListHelp.length).toBeLessThanOrEqual(320)
  })
})

describe('bars to buy', () => {
  it('counts alike ones together, by section and length, with their price', () => {
    const section = '38×89'
    const list = cutListAtOnce({
      parts: [
        { label: 'Rail', lengthMm: 2390, count: 2, section },
        { label: 'Slat', lengthMm: 2390, count: 1, section: '19×140' },
      ],
      stock: [
        { lengthMm: 2400, section, price: 1000 },
        { lengthMm: 2400, section: '19×140', price: 700 },
      ],
      ...{ kerfMm: 3, endTrimMm: 10 },
    })
    expect(list && gatherPurchases(list)).toEqual([
      { section: '19×140', lengthMm: 2400, count: 1, price: 700 },
      { section, lengthMm: 2400, count: 2, price: 1000 },
    ])
    expect(list?.cost).toBe(2700)
  })
})
