import fc from 'fast-check'
import { ceil, evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { boards } from '../../../shared/calculators/boards'
import { compute, refuse } from './compute'

// Common practice without a published table; counts are checked against mathjs and by adding the boards up again.
const mm = (value: number) => `${String(value)} mm`
const lay = (opening: number, boardWidth: number, gap: number, more: Record<string, string> = {}) =>
  compute('boards', {
    opening: mm(opening),
    boardWidth: mm(boardWidth),
    gap: mm(gap),
    mode: 'fixed-gap',
    ...more,
  })
const millimetres = (value: unknown) => Number(value) * 1000
const marksOf = (outputs: ReturnType<typeof lay>) => outputs['marks'] as readonly number[]

describe('boards with a fixed gap', () => {
  it.each([
    [2450, 145, 5, 17, 50],
    [2400, 145, 5, 16, 145],
    [2395, 145, 5, 16, 145],
    [2394, 145, 5, 16, 144],
    [2401, 145, 5, 17, 1],
    [145, 145, 5, 1, 145],
    [100, 145, 5, 1, 100],
    [1000, 100, 0, 10, 100],
  ])('%d mm, boards of %d, gap %d: %d boards, the last %d', (opening, board, gap, count, last) => {
    const outputs = lay(opening, board, gap)
    expect(outputs['count']).toBe(count)
    expect(millimetres(outputs['lastRip'])).toBeCloseTo(last, 9)
    expect(millimetres(outputs['gap'])).toBeCloseTo(gap, 9)
  })

  it('takes two gaps off where it starts and ends with a gap', () => {
    const outputs = lay(1010, 100, 5, { ends: 'gap' })
    expect(outputs['count']).toBe(10)
    expect(millimetres(outputs['lastRip'])).toBeCloseTo(55, 9)
    expect(marksOf(outputs).slice(0, 3)).toEqual([0.005, 0.11, 0.215])
  })

  it('fills the opening for any boards: what is added up reaches the stop, or less than a gap before it', () => {
    const opening = fc.integer({ min: 200, max: 12_000 })
    const board = fc.integer({ min: 110, max: 400 })
    const gap = fc.integer({ min: 0, max: 60 })
    fc.assert(
      fc.property(opening, board, gap, (room, width, between) => {
        const outputs = lay(room, width, between)
        const count = Number(outputs['count'])
        expect(count).toBe(ceil(room / (width + between)))
        const reached = (count - 1) * (width + between) + millimetres(outputs['lastRip'])
        expect(reached).toBeLessThanOrEqual(room + 1e-6)
        expect(room - reached).toBeLessThanOrEqual(between + 1e-6)
        expect(millimetres(outputs['lastRip'])).toBeGreaterThan(0)
        expect(marksOf(outputs)).toHaveLength(count)
      }),
    )
  })
})

describe('boards with an even gap', () => {
  it.each([
    [800, 95, 60, 'board', 6, '(800 - 6 * 95) / 5'],
    [2600, 145, 5, 'board', 17, '(2600 - 17 * 145) / 16'],
    [2630, 145, 5, 'board', 18, '(2630 - 18 * 145) / 17'],
    [1800, 70, 60, 'gap', 13, '(1800 - 13 * 70) / 14'],
    [400, 100, 300, 'gap', 1, '(400 - 100) / 2'],
    [290, 145, 5, 'board', 2, '0'],
  ])(
    '%d mm, boards of %d, %d wanted, a %s at the ends: %d',
    (opening, board, gap, ends, count, formula) => {
      const outputs = lay(opening, board, gap, { mode: 'even-gap', ends })
      expect(outputs['count']).toBe(count)
      expect(millimetres(outputs['gap'])).toBeCloseTo(evaluate(formula) as number, 9)
      expect(millimetres(outputs['lastRip'])).toBeCloseTo(board, 9)
    },
  )

  it('ends at the stop, and no other count comes nearer to the gap', () => {
    const opening = fc.integer({ min: 400, max: 9000 })
    const ends = fc.constantFrom<'board' | 'gap'>('board', 'gap')
    fc.assert(
      fc.property(
        opening,
        fc.integer({ min: 80, max: 190 }),
        fc.integer({ min: 0, max: 120 }),
        ends,
        (room, width, wanted, end) => {
          const outputs = lay(room, width, wanted, { mode: 'even-gap', ends: end })
          const count = Number(outputs['count'])
          const gap = millimetres(outputs['gap'])
          const gaps = end === 'gap' ? count + 1 : count - 1
          expect(count * width + gaps * gap).toBeCloseTo(room, 5)
          for (const other of [count - 1, count + 1]) {
            const others = end === 'gap' ? other + 1 : other - 1
            const otherGap = (room - other * width) / others
            if (others < 1 || otherGap < 0) continue
            expect(Math.abs(gap - wanted)).toBeLessThanOrEqual(Math.abs(otherGap - wanted) + 1e-6)
          }
        },
      ),
    )
  })
})

describe('boards refuses', () => {
  it.each([
    [
      'one board where a gap is to be shared',
      { opening: '280 mm', mode: 'even-gap' },
      'Fewer than two',
    ],
    [
      'no board at all',
      { opening: '140 mm', mode: 'even-gap', ends: 'gap' },
      'Not one whole board',
    ],
    [
      'gaps that fill the opening',
      { opening: '100 mm', gap: '50 mm', ends: 'gap' },
      'fill the opening',
    ],
    ['more boards than anyone lays', { opening: '20 m', gap: '5 mm' }, 'more than 120'],
    ['an opening beyond any garden', { opening: '31 m' }, 'out of range'],
  ])('%s', (_name, changed, words) => {
    const usual = { opening: '2450 mm', boardWidth: '145 mm', gap: '5 mm' }
    const texts = { ...usual, ...(changed as Record<string, string>) }
    expect(refuse('boards', texts)['opening']).toContain(words)
  })
})

describe('the slips of boards', () => {
  const values = {
    opening: 2.45,
    boardWidth: 0.145,
    gap: 0.005,
    mode: 'fixed-gap',
    ends: 'board',
  }
  const wrong = (id: string, more: Record<string, string> = {}) => {
    const { mode, ends } = { ...values, ...more }
    const outputs = lay(2450, 145, 5, { mode, ends })
    return boards.slips
      .find((one) => one.id === id)
      ?.wrong({ ...values, ...more }, outputs, 'metric')
  }

  it('count tight boards, nominal boards, and one too few', () => {
    expect(wrong('gap-forgotten')).toBe(17)
    expect(wrong('nominal-for-actual')).toBe(16)
    expect(wrong('rounded-down')).toBe(16)
  })

  it('share the rest among the wrong number of gaps', () => {
    const even = { mode: 'even-gap' }
    // 16 boards leave 130 mm: 15 gaps between them, 17 with one at both ends.
    expect(wrong('gaps-as-many-as-boards', even)).toBeCloseTo(0.13 / 16, 9)
    expect(wrong('other-ends', even)).toBeCloseTo(0.13 / 17, 9)
    expect(wrong('other-ends')).toBeUndefined()
  })

  it('rip the last board too narrow, or mark what comes off', () => {
    expect(wrong('gap-at-the-stop')).toBeCloseTo(0.045, 9)
    expect(wrong('waste-for-rip')).toBeCloseTo(0.095, 9)
  })
})
