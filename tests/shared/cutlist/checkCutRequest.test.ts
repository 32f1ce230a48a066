import { describe, expect, it } from 'vitest'
import { CalculatorInputError } from '../../../shared/calculators/calculator'
import { checkCutRequest } from '../../../shared/cutlist/checkCutRequest'
import type { CutPart, CutRequest, CutStock } from '../../../shared/cutlist/cutRequest'

const part: CutPart = { label: 'rail', lengthMm: 1800, count: 4, section: '47 × 100' }
const bar: CutStock = { lengthMm: 3600, section: '47 × 100' }
const fine: CutRequest = { parts: [part], stock: [bar], kerfMm: 3, endTrimMm: 0 }

const times = <Item>(count: number, item: Item) => Array.from({ length: count }, () => item)

describe('checkCutRequest', () => {
  it.each<[string, Partial<CutRequest>]>([
    ['400 pieces', { parts: [{ ...part, count: 400 }] }],
    ['40 parts', { parts: times(40, part) }],
    ['12 stock lengths', { stock: times(12, bar) }],
    ['a part as long as the bar', { parts: [{ ...part, lengthMm: 3600 }] }],
    ['a part as long as the trimmed bar', { parts: [{ ...part, lengthMm: 3590 }], endTrimMm: 10 }],
    ['just enough bars', { stock: [{ ...bar, lengthMm: 3603, available: 2 }] }],
    ['a price of nothing', { stock: [{ ...bar, price: 0 }] }],
  ])('takes %s', (_, change) => {
    expect(() => checkCutRequest({ ...fine, ...change })).not.toThrow()
  })

  it.each<[string, Partial<CutRequest>, string, RegExp]>([
    ['no part', { parts: [] }, 'parts', /at least one part/],
    [
      '401 pieces',
      {
        parts: [
          { ...part, count: 200 },
          { ...part, count: 201 },
        ],
      },
      'parts',
      /401 pieces.*up to 400/,
    ],
    ['41 parts', { parts: times(41, part) }, 'parts', /41 different parts.*up to 40/],
    ['half a piece', { parts: [{ ...part, count: 0.5 }] }, 'parts', /“rail” is wanted 0.5 times/],
    ['no length', { parts: [{ ...part, lengthMm: NaN }] }, 'parts', /“rail” is NaN mm long/],
    [
      'a part shorter than a saw holds',
      { parts: [{ ...part, lengthMm: 4.9 }] },
      'parts',
      /from 5 mm to 30000 mm/,
    ],
    ['no stock', { stock: [] }, 'stock', /at least one length/],
    ['13 stock lengths', { stock: times(13, bar) }, 'stock', /13 stock lengths.*up to 12/],
    ['an endless bar', { stock: [{ ...bar, lengthMm: 30_001 }] }, 'stock', /30001 mm/],
    ['a price with a fraction', { stock: [{ ...bar, price: 8.99 }] }, 'stock', /costs 8.99/],
    [
      'less than no bars',
      { stock: [{ ...bar, available: -1 }] },
      'stock',
      /-1 of the 3600 mm bars/,
    ],
    ['a wide saw', { kerfMm: 26 }, 'kerf', /26 mm wide.*from 0 to 25 mm/],
    ['a trim below zero', { endTrimMm: -1 }, 'endTrim', /-1 mm/],
    [
      'a section without stock',
      { stock: [{ ...bar, section: '22 × 145' }] },
      'stock',
      /no stock of section 47 × 100/,
    ],
    ['prices for some', { stock: [bar, { ...bar, price: 5 }] }, 'stock', /all or none/],
    [
      'a part longer than every bar',
      { parts: [{ ...part, lengthMm: 3600.1 }] },
      'parts',
      /“rail” is 3600.1 mm long, longer than every 47 × 100 bar;/,
    ],
    [
      'a part longer than a trimmed bar',
      { parts: [{ ...part, lengthMm: 3591 }], endTrimMm: 10 },
      'parts',
      /once its end is trimmed/,
    ],
    [
      'a part longer than every bar there is',
      {
        stock: [
          { ...bar, available: 0 },
          { ...bar, lengthMm: 1700 },
        ],
      },
      'parts',
      /longer than every/,
    ],
    ['too few bars', { stock: [{ ...bar, available: 1 }] }, 'stock', /not enough/],
  ])('refuses %s with a sentence', (_, change, input, sentence) => {
    const check = () => checkCutRequest({ ...fine, ...change })
    expect(check).toThrow(CalculatorInputError)
    expect(check).toThrow(
      expect.objectContaining({ input, message: expect.stringMatching(sentence) }),
    )
  })

  it('names lengths in feet and inches to whoever gave them so', () => {
    const parts = [{ ...part, lengthMm: 97 * 25.4 }]
    const stock = [{ ...bar, lengthMm: 96 * 25.4 }]
    const check = () => checkCutRequest({ ...fine, parts, stock, units: 'imperial' })
    expect(check).toThrow(/“rail” is 8' 1" long, longer than every/)
  })
})
