import fc from 'fast-check'
import loadHighs, { type Highs } from 'highs'
import { beforeAll, describe, expect, it } from 'vitest'
import { CalculatorInputError } from '../../../shared/calculators/calculator'
import type { CutList } from '../../../shared/cutlist/cutList'
import type { CutRequest, CutStock } from '../../../shared/cutlist/cutRequest'
import { highsSolver } from '../../../shared/cutlist/highsSolver'
import { cutListAtOnce, solveCutList, type CutTools } from '../../../shared/cutlist/solveCutList'

let highs: Highs
beforeAll(async () => {
  highs = await loadHighs()
})

const solve = (request: CutRequest, tools: Partial<CutTools> = {}) =>
  solveCutList(request, {
    openSolver: (deadline) => highsSolver(highs, deadline),
    millisecondsLimit: 60_000,
    ...tools,
  })
const section = '47 × 100'
const part = (lengthMm: number, count = 1, of = section) => ({
  label: `${lengthMm}`,
  lengthMm,
  count,
  section: of,
})
const stock = (lengthMm: number, more: Partial<CutStock> = {}): CutStock => ({
  lengthMm,
  section,
  ...more,
})
const request = (
  parts: CutRequest['parts'],
  stocks: CutRequest['stock'],
  saw: Partial<CutRequest> = {},
): CutRequest => ({ parts, stock: stocks, kerfMm: 0, endTrimMm: 0, ...saw })

const cutsOf = ({ bars }: CutList) =>
  bars.map(({ cuts }) => cuts.map(({ lengthMm }) => lengthMm).join('+'))
/** Room a bar needs, told another way than in the code: pieces and a cut between each two of them. */
const lengthUsed = (lengths: readonly number[], { kerfMm, endTrimMm }: CutRequest) =>
  endTrimMm + lengths.reduce((sum, one) => sum + one, 0) + (lengths.length - 1) * kerfMm

/** Every piece once, no bar over its length, no more bars than there are. */
function expectSound(asked: CutRequest, list: CutList) {
  const wanted = asked.parts.flatMap(({ label, count }) => Array<string>(count).fill(label))
  const cut = list.bars.flatMap(({ cuts }) => cuts.map(({ label }) => label))
  expect(cut.sort()).toEqual(wanted.sort())
  for (const bar of list.bars) {
    const lengths = bar.cuts.map(({ lengthMm }) => lengthMm)
    expect(lengthUsed(lengths, asked)).toBeLessThanOrEqual(bar.stock.lengthMm + 1e-6)
    expect(bar.stock.section).toBe(bar.section)
  }
  for (const one of asked.stock) {
    const taken = list.bars.filter((bar) => bar.stock === one).length
    expect(taken).toBeLessThanOrEqual(one.available ?? Infinity)
  }
  const bought = list.bars.reduce((sum, bar) => sum + bar.stock.lengthMm, 0)
  expect(list.count).toBe(list.bars.length)
  expect(list.boughtMm).toBeCloseTo(bought, 6)
}

interface Best {
  cost: number
  length: number
}
const isLess = (one: Best, other: Best | null) =>
  !other || one.cost < other.cost || (one.cost === other.cost && one.length < other.length)

/** The least cost, then the least length, over every way to share the pieces out among bars. */
function bruteForce(asked: CutRequest): Best | null {
  const pieces = asked.parts.flatMap(({ lengthMm, count }) => Array<number>(count).fill(lengthMm))
  let best: Best | null = null
  const buy = (groups: number[][], index: number, left: number[], so: Best) => {
    const group = groups[index]
    if (!group) {
      if (isLess(so, best)) best = so
      return
    }
    asked.stock.forEach((one, offer) => {
      if (left[offer] === 0 || lengthUsed(group, asked) > one.lengthMm) return
      const rest = left.map((count, other) => (other === offer ? count - 1 : count))
      const cost = so.cost + (one.price ?? one.lengthMm)
      buy(groups, index + 1, rest, { cost, length: so.length + one.lengthMm })
    })
  }
  const share = (index: number, groups: number[][]) => {
    const piece = pieces[index]
    if (piece === undefined) {
      const left = asked.stock.map(({ available }) => available ?? Infinity)
      return buy(groups, 0, left, { cost: 0, length: 0 })
    }
    groups.forEach((group, at) => {
      share(
        index + 1,
        groups.map((one, other) => (other === at ? [...group, piece] : one)),
      )
    })
    share(index + 1, [...groups, [piece]])
  }
  share(0, [])
  return best
}

/** First-fit decreasing, written out anew. */
function firstFitBars(asked: CutRequest, length: number): number {
  const bars: number[][] = []
  const pieces = asked.parts.flatMap(({ lengthMm, count }) => Array<number>(count).fill(lengthMm))
  for (const piece of pieces.sort((one, other) => other - one)) {
    const bar = bars.find((lengths) => lengthUsed([...lengths, piece], asked) <= length)
    if (bar) bar.push(piece)
    else bars.push([piece])
  }
  return bars.length
}

const anySaw = fc.record({
  kerfMm: fc.constantFrom(0, 2, 3, 3.2, 4),
  endTrimMm: fc.constantFrom(0, 5, 12),
})
const partsOf = (most: number, longest: number) =>
  fc
    .array(
      fc.record({
        lengthMm: fc.integer({ min: 40, max: longest }),
        count: fc.integer({ min: 1, max: 4 }),
      }),
      {
        minLength: 1,
        maxLength: most,
      },
    )
    .map((rows) => rows.map(({ lengthMm, count }) => part(lengthMm, count)))

describe('solveCutList', () => {
  it('cuts every piece once, within every bar, in no more bars than first-fit and no fewer than fit', () => {
    fc.assert(
      fc.property(partsOf(12, 1100), anySaw, (parts, saw) => {
        const asked = request(parts, [stock(1200)], saw)
        const list = solve(asked)
        expectSound(asked, list)
        expect(list.proof).toBe('optimal')
        expect(list.count).toBeLessThanOrEqual(firstFitBars(asked, 1200))
        const needed = parts.reduce(
          (sum, { lengthMm, count }) => sum + (lengthMm + saw.kerfMm) * count,
          0,
        )
        const room = 1200 - saw.endTrimMm + saw.kerfMm
        expect(list.count).toBeGreaterThanOrEqual(Math.ceil(needed / room - 1e-9))
      }),
      { numRuns: 60 },
    )
  })

  it('agrees with every way to share out a few pieces, with prices, limits, kerf and trim', () => {
    const anyStock = fc.uniqueArray(
      fc.record({
        lengthMm: fc.integer({ min: 500, max: 1200 }),
        price: fc.integer({ min: 0, max: 30 }),
        available: fc.option(fc.integer({ min: 0, max: 3 }), { nil: undefined }),
      }),
      { minLength: 1, maxLength: 3, selector: ({ lengthMm }) => lengthMm },
    )
    const fewParts = partsOf(3, 800).filter(
      (parts) => parts.reduce((sum, { count }) => sum + count, 0) <= 6,
    )
    fc.assert(
      fc.property(fewParts, anyStock, fc.boolean(), anySaw, (parts, stocks, isPriced, saw) => {
        const offers = stocks.map(({ price, available, lengthMm }) =>
          stock(lengthMm, {
            ...(isPriced ? { price } : {}),
            ...(available === undefined ? {} : { available }),
          }),
        )
        const asked = request(parts, offers, saw)
        const best = bruteForce(asked)
        if (!best) {
          expect(() => solve(asked)).toThrow(CalculatorInputError)
          return
        }
        const list = solve(asked)
        expectSound(asked, list)
        expect({ cost: list.cost ?? list.boughtMm, length: list.boughtMm }).toEqual(best)
        expect(list.proof).toBe('optimal')
      }),
      { numRuns: 150 },
    )
  })

  it('gives the same list for the same request', () => {
    const parts = [part(870, 7), part(640, 9), part(455, 11), part(310, 8), part(1290, 3)]
    const asked = request(parts, [stock(2400, { price: 899 }), stock(3600, { price: 1325 })], {
      kerfMm: 3.2,
    })
    expect(solve(asked)).toEqual(solve(asked))
  })

  it('needs no cut after a piece that ends with the bar, and a kerf between two', () => {
    const exact = request([part(1000, 2)], [stock(2003)], { kerfMm: 3 })
    expect(solve(exact).bars).toMatchObject([{ offcutMm: 0 }])
    expect(solve(request([part(1000, 2)], [stock(2002.9)], { kerfMm: 3 })).count).toBe(2)
    const tail = solve(request([part(1000, 2)], [stock(2100)], { kerfMm: 3 }))
    expect(tail.bars[0]?.offcutMm).toBe(94)
    expect(tail.wasteMm).toBe(100)
    expect(solve(request([part(1000, 2)], [stock(2004)], { kerfMm: 3 })).bars[0]?.offcutMm).toBe(0)
  })

  it('takes the end trim off every bar first', () => {
    const parts = [part(1000, 4)]
    expect(solve(request(parts, [stock(2010)], { endTrimMm: 10 })).count).toBe(2)
    expect(solve(request(parts, [stock(2010)], { endTrimMm: 10.1 })).count).toBe(4)
  })

  it('fits inches exactly: four of 23 7/8 in and three cuts of 1/8 in are 95 7/8 in', () => {
    const inch = 25.4
    const asked = (bar: number) =>
      request([part(23.875 * inch, 4)], [stock(bar * inch)], { kerfMm: inch / 8 })
    expect(solve(asked(95.875)).count).toBe(1)
    expect(solve(asked(95.84375)).count).toBe(2)
  })

  it('buys the length that wastes least where there are no prices', () => {
    const list = solve(request([part(1150, 6)], [stock(2400), stock(3000), stock(3600)]))
    expect(list).toMatchObject({ boughtMm: 7200, cost: null, proof: 'optimal' })
  })

  it('buys what costs least where there are prices, and of equal cost what wastes least', () => {
    const parts = [part(1200, 4)]
    const dear = [stock(2400, { price: 900 }), stock(4800, { price: 2000 })]
    expect(solve(request(parts, dear))).toMatchObject({ count: 2, cost: 1800 })
    const equal = [stock(5400, { price: 1800 }), stock(2400, { price: 900 })]
    expect(solve(request(parts, equal))).toMatchObject({ cost: 1800, boughtMm: 4800 })
  })

  it('uses up what is at hand before it buys', () => {
    const atHand = stock(1300, { price: 0, available: 2 })
    const asked = request([part(600, 8)], [stock(2400, { price: 899 }), atHand])
    const list = solve(asked)
    expect(list.cost).toBe(899)
    expect(list.bars.filter((bar) => bar.stock === atHand)).toHaveLength(2)
  })

  it('cuts each section from its own stock', () => {
    const asked = request(
      [part(1000, 3), part(900, 2, '22 × 145')],
      [stock(2000), stock(1900, { section: '22 × 145', price: 700 })],
    )
    const list = solve(asked)
    expectSound(asked, list)
    expect(list.sections).toMatchObject([
      { section, count: 2, cost: null },
      { section: '22 × 145', count: 1, cost: 700 },
    ])
    expect(list.cost).toBeNull()
  })

  it('names each piece by its own label, parts of one length among them', () => {
    const parts = [
      { label: 'post', lengthMm: 900, count: 2, section },
      { label: 'brace', lengthMm: 900, count: 1, section },
    ]
    const list = solve(request(parts, [stock(2800)]))
    expect(list.bars[0]?.cuts.map(({ label }) => label)).toEqual(['post', 'post', 'brace'])
  })

  it('sets the saw as seldom as it can see: one cut for four equal bars', () => {
    const list = solve(request([part(1000, 4), part(700, 4), part(300, 8)], [stock(2300)]))
    expect(list).toMatchObject({ count: 4, differentCuts: 1 })
    expect(new Set(cutsOf(list))).toEqual(new Set(['1000+700+300+300']))
  })

  it('says that limited stock is not enough, though its total length would be', () => {
    const asked = request([part(700, 3)], [stock(1300, { available: 2 })])
    expect(() => solve(asked)).toThrow(/^The 47 × 100 stock you have is not enough/)
    expect(cutListAtOnce(asked)).toBeNull()
  })

  it('tells each better list and ends with the one it returns', () => {
    const told: (CutList | null)[] = []
    const parts = [part(870, 7), part(640, 9), part(455, 11), part(310, 8), part(1290, 3)]
    const asked = request(parts, [stock(2400, { price: 899 }), stock(3600, { price: 1325 })])
    const list = solve(asked, { onProgress: ({ list: one }) => told.push(one) })
    const costs = told.map((one) => one?.cost ?? Infinity)
    expect(costs).toEqual([...costs].sort((one, other) => other - one))
    expect(told.at(-1)).toEqual(list)
    expect(told[0]).toEqual(cutListAtOnce(asked))
  })

  it('answers with the best so far and its gap when it is cancelled', () => {
    const parts = [
      part(600, 2),
      part(500),
      part(400, 2),
      part(300),
      part(200),
      part(351, 9),
      part(249, 7),
    ]
    const asked = request(parts, [stock(1000)])
    const list = solve(asked, { isCancelled: () => true })
    expectSound(asked, list)
    expect(list).toEqual(cutListAtOnce(asked))
    const gap = list.proof === 'optimal' ? 0 : list.proof.gapPercent
    const best = solve(asked)
    expect(gap).toBeGreaterThan(0)
    expect(best.count).toBeGreaterThanOrEqual(Math.floor(list.count * (1 - gap / 100)))
    expect(best.proof).toBe('optimal')
  })
})
