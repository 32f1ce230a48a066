import fc from 'fast-check'
import { evaluate } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const metres = (value: number) => `${String(value)} m`
const DEGREE = Math.PI / 180

/** The diagonals of a parallelogram with these sides whose corner is off by this angle, by the law of cosines. */
function diagonalsOf(a: number, b: number, error: number): [number, number] {
  const turned = 2 * a * b * Math.sin(error)
  return [Math.sqrt(a * a + b * b + turned), Math.sqrt(a * a + b * b - turned)]
}

describe('diagonals against printed diagonals', () => {
  it.each(findCases('squaring', /^(triple|diag)-/))('$id: $expected ($source)', (one) => {
    const a = given(one, one.inputs['a'] === undefined ? 'lengthA' : 'a')
    const b = given(one, one.inputs['b'] === undefined ? 'lengthB' : 'b')
    const across = metres(Math.hypot(a, b))
    const texts = { length: metres(a), width: metres(b), diagonal1: across, diagonal2: across }
    expect(distance(one, computeNumber('diagonals', 'expected', texts))).toBeLessThanOrEqual(
      allowed(one),
    )
  })

  // The sources give only how far the diagonals are apart; the diagonals follow from the sides, the mean kept.
  it.each([
    {
      id: 'corner-error-144x120-0.5',
      unit: 'in',
      metres: 0.0254,
      first: 187.6958,
      second: 187.1958,
      offset: 0.3254,
    },
    {
      id: 'corner-error-3000x2400-10',
      unit: 'mm',
      metres: 0.001,
      first: 3846.8713,
      second: 3836.8713,
      offset: 6.4031,
    },
  ])(
    '$id: the corner and the offset over the side',
    ({ id, unit, metres: size, first, second, offset }) => {
      const [one] = findCases('squaring', new RegExp(`^${id}$`))
      if (!one) throw new Error('case is missing')
      const texts = {
        length: `${String(given(one, 'a'))} ${unit}`,
        width: `${String(given(one, 'b'))} ${unit}`,
        diagonal1: `${String(first)} ${unit}`,
        diagonal2: `${String(second)} ${unit}`,
      }
      expect(
        distance(one, computeNumber('diagonals', 'cornerError', texts) / DEGREE),
      ).toBeLessThanOrEqual(allowed(one))
      expect(computeNumber('diagonals', 'moveBy', texts) / size).toBeCloseTo(offset, 3)
    },
  )
})

describe('diagonals', () => {
  const sides = { length: '2600 mm', width: '1100 mm' }

  it('finds the angle a parallelogram was built with', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 20, noNaN: true }),
        fc.double({ min: 0.5, max: 20, noNaN: true }),
        fc.double({ min: 0, max: 5, noNaN: true }),
        (a, b, degrees) => {
          const [first, second] = diagonalsOf(a, b, degrees * DEGREE)
          const text = (value: number) => `${value.toFixed(12)} m`
          const outputs = compute('diagonals', {
            length: text(a),
            width: text(b),
            diagonal1: text(first),
            diagonal2: text(second),
          })
          expect(Number(outputs['cornerError'])).toBeCloseTo(degrees * DEGREE, 8)
          expect(Number(outputs['moveBy'])).toBeCloseTo(b * Math.sin(degrees * DEGREE), 8)
        },
      ),
    )
  })

  it('agrees with mathjs on what both should read', () => {
    const texts = { ...sides, diagonal1: '2823 mm', diagonal2: '2823 mm' }
    expect(computeNumber('diagonals', 'expected', texts)).toBeCloseTo(
      evaluate('hypot(2.6, 1.1)') as number,
      12,
    )
  })

  it.each([
    ['2826 mm', '2821 mm', 'yes', 'first'],
    ['2821 mm', '2826 mm', 'yes', 'second'],
    ['2826.1 mm', '2821 mm', 'no', 'first'],
    ['2823 mm', '2823 mm', 'yes', 'same'],
  ])('%s and %s: square %s, longer %s, within 5 mm', (diagonal1, diagonal2, square, longer) => {
    const outputs = compute('diagonals', { ...sides, diagonal1, diagonal2 })
    expect([outputs['square'], outputs['longer']]).toEqual([square, longer])
  })

  it('judges by its own limit where one is given', () => {
    const texts = { ...sides, diagonal1: '2826 mm', diagonal2: '2821 mm', tolerance: '4 mm' }
    expect(compute('diagonals', texts)['square']).toBe('no')
  })

  it.each([
    ['a diagonal that was misread', { diagonal1: '3823 mm', diagonal2: '2823 mm' }, 'diagonal1'],
    ['the other one', { diagonal1: '2823 mm', diagonal2: '1823 mm' }, 'diagonal2'],
    ['a diagonal of no form', { diagonal1: '46 m', diagonal2: '2823 mm' }, 'diagonal1'],
    ['a diagonal that is missing', { diagonal1: '2823 mm' }, 'diagonal2'],
  ])('refuses %s', (_case, texts, input) => {
    expect(refuse('diagonals', { ...sides, ...(texts as Record<string, string>) })).toHaveProperty(
      input,
    )
  })
})
