import fc from 'fast-check'
import { atan, evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { taper } from '../../../shared/calculators/taper'
import { compute, refuse } from './compute'

// There is no published table for the last board; the rule is common practice, the angle is checked against mathjs.
const usual = {
  openingStart: '118 mm',
  openingEnd: '103 mm',
  gap: '5 mm',
  boardWidth: '140 mm',
  length: '2400 mm',
}
const outputsOf = (changed: Record<string, string> = {}) =>
  compute('taper', { ...usual, ...changed })
const mm = (value: unknown) => Number(value) * 1000

describe('taper takes the gap off each end', () => {
  it.each([
    [{}, 113, 98, 27],
    [{ gap: '0 mm' }, 118, 103, 22],
    [{ gapAtStop: 'yes' }, 108, 93, 32],
    [{ openingStart: '103 mm', openingEnd: '118 mm' }, 98, 113, 42],
    [{ openingStart: '145 mm', openingEnd: '145 mm' }, 140, 140, 0],
    [{ openingStart: '160 mm' }, 155, 98, -15],
  ])('%o: %d at the start, %d at the end, %d comes off', (changed, start, end, waste) => {
    const outputs = outputsOf(changed)
    expect(mm(outputs['cutStart'])).toBeCloseTo(start, 9)
    expect(mm(outputs['cutEnd'])).toBeCloseTo(end, 9)
    expect(mm(outputs['wasteStart'])).toBeCloseTo(waste, 9)
  })

  it('reads feet and inches', () => {
    const outputs = compute(
      'taper',
      {
        openingStart: '4-5/8"',
        openingEnd: '4"',
        gap: '3/16"',
        boardWidth: '5-1/2"',
        length: `8'`,
      },
      'imperial',
    )
    expect(Number(outputs['cutStart']) / 0.0254).toBeCloseTo(4.4375, 9)
    expect(Number(outputs['cutEnd']) / 0.0254).toBeCloseTo(3.8125, 9)
    expect(Number(outputs['wasteStart']) / 0.0254).toBeCloseTo(1.0625, 9)
    expect(outputs['angle']).toBeCloseTo(evaluate('atan(0.625 / 96)') as number, 12)
  })

  it('gives a parallel opening no angle', () => {
    expect(outputsOf({ openingEnd: '118 mm' })['angle']).toBe(0)
  })
})

describe('taper looks whether the board is wide enough', () => {
  it.each([
    ['113 mm', 'yes'],
    ['112.9 mm', 'no'],
    ['97 mm', 'no'],
    ['1 m', 'yes'],
  ])('a board of %s: %s', (boardWidth, fits) => {
    expect(outputsOf({ boardWidth })['fits']).toBe(fits)
  })

  it('looks at the wider end, whichever it is', () => {
    const turned = { openingStart: '103 mm', openingEnd: '118 mm', boardWidth: '100 mm' }
    expect(outputsOf(turned)['fits']).toBe('no')
  })
})

describe('taper for every opening', () => {
  const opening = fc.integer({ min: 120, max: 900 })

  it('fills what the gap leaves, and turns round with the ends', () => {
    fc.assert(
      fc.property(opening, opening, fc.integer({ min: 0, max: 20 }), (start, end, gap) => {
        const texts = { gap: `${String(gap)} mm`, boardWidth: '1 m', length: '3 m' }
        const [a, b] = [`${String(start)} mm`, `${String(end)} mm`]
        const there = outputsOf({ ...texts, openingStart: a, openingEnd: b })
        const back = outputsOf({ ...texts, openingStart: b, openingEnd: a })
        expect(mm(there['cutStart']) + gap).toBeCloseTo(start, 6)
        expect(mm(there['cutStart']) + mm(there['wasteStart'])).toBeCloseTo(1000, 6)
        expect(back['cutEnd']).toBe(there['cutStart'])
        expect(back['angle']).toBe(there['angle'])
        expect(Number(there['angle'])).toBeCloseTo(atan(Math.abs(start - end) / 3000), 12)
      }),
    )
  })
})

describe('taper refuses', () => {
  it.each([
    ['an opening that the gap fills', { openingEnd: '5 mm' }, 'openingEnd', 'no room for a board'],
    [
      'two gaps that fill it',
      { openingStart: '10 mm', gapAtStop: 'yes' },
      'openingStart',
      'gap of 10',
    ],
    ['an opening beyond any board', { openingStart: '1.1 m' }, 'openingStart', 'out of range'],
    ['a gap below nothing', { gap: '-1 mm' }, 'gap', 'out of range'],
    ['a board of no length', { length: '0' }, 'length', 'out of range'],
  ])('%s', (_name, changed, input, words) => {
    const message = refuse('taper', { ...usual, ...(changed as Record<string, string>) })[input]
    expect(message?.replaceAll(/\s/g, ' ')).toContain(words)
  })

  it('takes a sliver', () => {
    expect(refuse('taper', { ...usual, openingEnd: '6 mm' })).toEqual({})
  })
})

describe('the slips of taper', () => {
  const wrong = (id: string, gapAtStop: 'yes' | 'no') => {
    const values = { openingStart: 0.118, gap: 0.005, boardWidth: 0.14, length: 2.4, gapAtStop }
    const slip = taper.slips.find((one) => one.id === id)
    return slip?.wrong({ ...values, openingEnd: 0.103 }, outputsOf({ gapAtStop }), 'metric')
  }

  it('know one gap from two', () => {
    expect(wrong('gap-once-start', 'yes')).toBeCloseTo(0.113, 9)
    expect(wrong('gap-once-start', 'no')).toBeUndefined()
    expect(wrong('gap-twice-start', 'no')).toBeCloseTo(0.108, 9)
    expect(wrong('gap-twice-start', 'yes')).toBeUndefined()
  })

  it('take the other end, the mean and the waste for the width', () => {
    expect(wrong('other-end-start', 'no')).toBeCloseTo(0.098, 9)
    expect(wrong('mean-width-end', 'no')).toBeCloseTo(0.1055, 9)
    expect(wrong('waste-for-width-end', 'no')).toBeCloseTo(0.042, 9)
  })
})
