import fc from 'fast-check'
import { sqrt } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

describe('square against printed triangles', () => {
  it.each(findCases('squaring', /^(345|6810|91215)$/))('$id: $expected ft ($source)', (one) => {
    const short = given(one, 'aFt')
    const texts = {
      sideA: `${String(given(one, 'bFt'))} ft`,
      sideB: `${String(short)} ft`,
      unit: `${String(short / 3)} ft`,
    }
    expect(distance(one, computeNumber('square', 'diagonal', texts) / 0.3048)).toBeLessThanOrEqual(
      allowed(one),
    )
    expect(computeNumber('square', 'legLong', texts) / 0.3048).toBeCloseTo(given(one, 'bFt'), 9)
  })

  it.each(findCases('squaring', /^cmhc-/))('$id: $expected mm ($source)', (one) => {
    const short = given(one, 'aMm')
    const texts = {
      sideA: `${String(given(one, 'bMm'))} mm`,
      sideB: `${String(short)} mm`,
      unit: `${String(short / 3)} mm`,
    }
    expect(distance(one, computeNumber('square', 'diagonal', texts) * 1000)).toBeLessThanOrEqual(
      allowed(one),
    )
  })
})

describe('square chooses a unit that is easy to mark', () => {
  it.each([
    ['2600 mm', '1100 mm', 350],
    ['1100 mm', '2600 mm', 350],
    ['4 m', '3 m', 1000],
    ['4 m', '2.999 m', 950],
    ['3.999 m', '3 m', 950],
    ['300 mm', '300 mm', 50],
  ])('%s × %s: %i mm', (sideA, sideB, millimetres) => {
    expect(computeNumber('square', 'unit', { sideA, sideB }) * 1000).toBeCloseTo(millimetres, 9)
  })

  it('rounds down to whole inches for who works in feet', () => {
    const unit = compute('square', { sideA: `8' 6"`, sideB: `3' 7"` }, 'imperial')['unit']
    expect(Number(unit) / 0.0254).toBeCloseTo(14, 9)
  })

  it('always fits, and the tape closes the triangle', () => {
    const side = fc.integer({ min: 300, max: 30_000 })
    fc.assert(
      fc.property(side, side, (a, b) => {
        const outputs = compute('square', { sideA: `${String(a)} mm`, sideB: `${String(b)} mm` })
        const [short, long, across] = ['legShort', 'legLong', 'diagonal'].map((name) =>
          Number(outputs[name]),
        )
        expect(short).toBeLessThanOrEqual(Math.min(a, b) / 1000 + 1e-9)
        expect(long).toBeLessThanOrEqual(Math.max(a, b) / 1000 + 1e-9)
        expect(across).toBeCloseTo(Number(sqrt((short ?? 0) ** 2 + (long ?? 0) ** 2)), 9)
      }),
    )
  })
})

describe('square refuses what does not fit', () => {
  it('a unit that is too big, naming the biggest', () => {
    const message = refuse('square', { sideA: '2600 mm', sideB: '1100 mm', unit: '400 mm' })['unit']
    expect(message?.replaceAll(/\s/g, ' ')).toContain('The most that fits is 367 mm.')
  })

  it('takes the biggest itself', () => {
    expect(refuse('square', { sideA: '4 m', sideB: '3 m', unit: '1 m' })).toEqual({})
  })

  it.each([
    ['sideA', '299 mm'],
    ['sideB', '31 m'],
    ['unit', '0 mm'],
  ])('%s of %s', (name, text) => {
    expect(refuse('square', { sideA: '4 m', sideB: '3 m', [name]: text })).toHaveProperty(name)
  })
})
