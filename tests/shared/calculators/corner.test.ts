import fc from 'fast-check'
import { acos, cos, evaluate, sqrt } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { corner } from '../../../shared/calculators/corner'
import { findSlip } from '../../../shared/grading/slips'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const DEGREE = Math.PI / 180
const mm = (value: number) => `${String(value)} mm`
const texts = (legA: number, legB: number, diagonal: number) => ({
  legA: mm(legA),
  legB: mm(legB),
  diagonal: mm(diagonal),
})

describe('corner against printed right triangles', () => {
  it.each(findCases('squaring', /^(345|6810|91215)$/))(
    '$id ft is square ($source)',
    ({ inputs, expected }) => {
      const outputs = compute('corner', {
        legA: `${String(inputs['bFt'])} ft`,
        legB: `${String(inputs['aFt'])} ft`,
        diagonal: `${String(expected)} ft`,
      })
      expect(Number(outputs['error'])).toBeCloseTo(0, 9)
      expect(outputs['move']).toBe('none')
    },
  )

  it.each(findCases('squaring', /^(cmhc-|triple-)/))('$id is square ($source)', (one) => {
    const [a, b] = Object.values(one.inputs).map(Number)
    const scale = one.id.startsWith('cmhc') ? 1 : 100
    const outputs = compute(
      'corner',
      texts((b ?? 0) * scale, (a ?? 0) * scale, Number(one.expected) * scale),
    )
    expect(Number(outputs['error'])).toBeCloseTo(0, 9)
    expect(Number(outputs['offsetAtLegB'])).toBeCloseTo(0, 9)
  })
})

// The diagonals of a parallelogram belong to two corners that are out by the same, one wide and one narrow.
describe('corner against the parallelogram law', () => {
  it.each(findCases('squaring', /^corner-error/))('$id: $expected° ($source)', (one) => {
    const [a, b] = [given(one, 'a'), given(one, 'b')]
    const printed = /d1=([\d.]+), d2=([\d.]+); offset over side b = ([\d.]+)/.exec(one.note)
    const [first = 0, second = 0, offset = 0] = (printed ?? []).slice(1).map(Number)
    expect(first - second).toBeCloseTo(given(one, 'diagonalDifference'), 6)
    for (const [diagonal, sign] of [
      [first, 1],
      [second, -1],
    ] as const) {
      // The longer side is made 3 m, whatever unit the case has.
      const scale = 3000 / Math.max(a, b)
      const outputs = compute('corner', texts(a * scale, b * scale, diagonal * scale))
      const degrees = (sign * Number(outputs['error'])) / DEGREE
      expect(distance(one, degrees)).toBeLessThanOrEqual(allowed(one))
      // The note gives four decimals of the case's unit, and its diagonals as many.
      expect((Number(outputs['offsetAtLegB']) * 1000) / scale).toBeCloseTo(offset, 3)
      expect(outputs['move']).toBe(sign > 0 ? 'in' : 'out')
    }
  })
})

describe('corner by the law of cosines', () => {
  it.each([
    ['a true corner', 4000, 3000, 5000, 90],
    ['three equal sides', 1000, 1000, 1000, 60],
    ['a corner laid open', 1000, 1000, Math.sqrt(3) * 1000, 120],
    ['half a square', 1000, Math.SQRT2 * 1000, 1000, 45],
  ])('%s', (_name, legA, legB, diagonal, degrees) => {
    expect(computeNumber('corner', 'angle', texts(legA, legB, diagonal))).toBeCloseTo(
      evaluate(`${String(degrees)} * pi / 180`) as number,
      6,
    )
  })

  it('closes the triangle again for every corner, as mathjs reckons it', () => {
    const leg = fc.integer({ min: 200, max: 30_000 })
    const angle = fc.double({ min: 5 * DEGREE, max: 175 * DEGREE, noNaN: true })
    fc.assert(
      fc.property(leg, leg, angle, (a, b, wanted) => {
        const diagonal = Number(sqrt(a * a + b * b - 2 * a * b * cos(wanted)))
        const outputs = compute('corner', texts(a, b, diagonal))
        const reckoned = Number(acos((a * a + b * b - diagonal * diagonal) / (2 * a * b)))
        expect(Number(outputs['angle'])).toBeCloseTo(reckoned, 9)
        expect(Number(outputs['error'])).toBeCloseTo(wanted - Math.PI / 2, 6)
      }),
    )
  })

  it('lands the end of leg B on the square line when it swings as said', () => {
    const error = fc.oneof(
      fc.double({ min: -0.5, max: 0.5, noNaN: true }),
      fc.integer({ min: -5000, max: 5000 }).map((steps) => steps / 10_000),
    )
    fc.assert(
      fc.property(error, (out) => {
        const [a, b] = [3000, 2000]
        const diagonal = Number(sqrt(a * a + b * b - 2 * a * b * cos(Math.PI / 2 + out)))
        const outputs = compute('corner', texts(a, b, diagonal))
        const along = b * Math.cos(Number(outputs['angle']))
        const swing = Number(outputs['offsetAtLegB']) * 1000
        // Less than a thousandth of a millimetre is called square already.
        if (outputs['move'] === 'none') expect(Math.abs(along)).toBeLessThan(0.001)
        else expect(along + (outputs['move'] === 'in' ? swing : -swing)).toBeCloseTo(0, 5)
      }),
    )
  })
})

describe('corner judges against the limit', () => {
  // 10 mm on the tape is 12.52 mm at the end of leg B.
  it.each([
    ['12.4 mm', 'no'],
    ['12.6 mm', 'yes'],
    ['0 mm', 'no'],
  ])('12.52 mm off, limit %s: %s', (tolerance, square) => {
    expect(compute('corner', { ...texts(2400, 1800, 3010), tolerance })['square']).toBe(square)
  })

  it('calls a true corner square within nothing', () => {
    const outputs = compute('corner', { ...texts(2400, 1800, 3000), tolerance: '0 mm' })
    expect(outputs['square']).toBe('yes')
  })
})

describe('corner refuses what is no triangle', () => {
  it.each([
    ['a diagonal as long as both legs', texts(1000, 1000, 2000), 'diagonal', 'laid end to end'],
    ['a diagonal longer than both legs', texts(1000, 1000, 2500), 'diagonal', 'laid end to end'],
    ['a diagonal that does not reach', texts(3000, 1000, 2000), 'diagonal', 'too short to reach'],
    ['a leg of nothing', texts(0, 1000, 1000), 'legA', 'out of range'],
    ['a leg beyond any garden', texts(1000, 31_000, 31_000), 'legB', 'out of range'],
  ])('%s', (_name, given, input, words) => {
    expect(refuse('corner', given)[input]).toContain(words)
  })

  it('takes the last hair that still closes', () => {
    expect(refuse('corner', texts(1000, 1000, 1999))).toEqual({})
    expect(refuse('corner', texts(3000, 1000, 2001))).toEqual({})
  })
})

describe('corner names the slip', () => {
  const sound = texts(2400, 1800, 3010)
  const values = { legA: 2.4, legB: 1.8, diagonal: 3.01, tolerance: 0.005 }
  const outputs = compute('corner', sound)
  const slipOf = (asked: string, value: number | string, tolerance: number) =>
    findSlip(
      corner,
      {
        asked,
        slips: corner.slips.map(({ id }) => id),
        tolerance: { kind: 'absolute', value: tolerance },
      } as Parameters<typeof findSlip>[1],
      { values, outputs },
      value,
      'metric',
    )?.id

  it.each([
    ['offsetAtLegB', 0.01, 0.001, 'diagonal-difference'],
    ['offsetAtLegB', 0.005, 0.001, 'half-the-difference'],
    ['offsetAtLegB', 0.0167, 0.001, 'wrong-leg'],
    ['error', 90.4 * DEGREE, 0.05 * DEGREE, 'whole-angle'],
    ['error', -0.4 * DEGREE, 0.02 * DEGREE, 'wide-for-narrow'],
    ['angle', 89.6 * DEGREE, 0.05 * DEGREE, 'sign-lost'],
    ['move', 'out', 0, 'turned-round'],
  ])('%s of %d: %s', (asked, value, tolerance, id) => {
    expect(slipOf(asked, value, tolerance)).toBe(id)
  })
})
