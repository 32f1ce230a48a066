import fc from 'fast-check'
import { atan, evaluate, tan } from 'mathjs/number'
import { describe, expect, it } from 'vitest'
import { angleCut } from '../../../shared/calculators/angleCut'
import { compute, computeNumber, refuse } from './compute'
import { allowed, distance, findCases, given } from '../../reference/referenceCases'

const cut = (boardWidth: string, angle: string, longPoint: string) =>
  compute('angle-cut', { boardWidth, angle, longPoint })
const millimetres = (value: unknown) => Number(value) * 1000

// A framing square gives the same triangle: over 12 in of width a pitch of so many in 12 runs so many inches along.
describe('angle-cut against the pitches of a framing square', () => {
  it.each(findCases('pitchRafter', /^pitch-deg/))(
    '$id: $expected° is $inputs.risePer12 in 12 ($source)',
    (one) => {
      const texts = { boardWidth: '12 in', angle: `${String(one.expected)} deg`, longPoint: '12 m' }
      const along = computeNumber('angle-cut', 'offset', texts) / 0.0254
      const degrees = (atan(along / 12) * 180) / Math.PI
      expect(distance(one, degrees)).toBeLessThanOrEqual(allowed(one))
      // The printed degree has two decimals; at 20 in 12 half of the last one is 0.004 in.
      expect(along).toBeCloseTo(given(one, 'risePer12'), 1)
    },
  )
})

describe('angle-cut takes the slant off the long point', () => {
  it.each([
    ['140 mm', '30 deg', '895 mm', '140 * tan(30 * pi / 180)'],
    ['140 mm', '45 deg', '895 mm', '140'],
    ['100 mm', '60 deg', '1 m', '100 * sqrt(3)'],
    ['100 mm', '4/12', '1 m', '100 / 3'],
    ['90 mm', '0.1 deg', '500 mm', '90 * tan(0.1 * pi / 180)'],
    ['20 mm', '80 deg', '200 mm', '20 * tan(80 * pi / 180)'],
  ])('%s at %s, %s long: %s', (width, angle, long, formula) => {
    const outputs = cut(width, angle, long)
    const offset = evaluate(formula) as number
    expect(millimetres(outputs['offset'])).toBeCloseTo(offset, 9)
    expect(millimetres(outputs['shortPoint']) + offset).toBeCloseTo(
      long.endsWith('mm') ? Number.parseFloat(long) : 1000,
      9,
    )
  })

  it('agrees with mathjs for any board and angle', () => {
    const degrees = fc.integer({ min: 1, max: 800 })
    fc.assert(
      fc.property(fc.integer({ min: 10, max: 400 }), degrees, (width, tenths) => {
        const angle = `${String(tenths / 10)} deg`
        const outputs = cut(`${String(width)} mm`, angle, '12 m')
        const offset = width * tan((tenths / 1800) * Math.PI)
        expect(millimetres(outputs['offset'])).toBeCloseTo(offset, 6)
        expect(millimetres(outputs['shortPoint'])).toBeCloseTo(12_000 - offset, 6)
      }),
    )
  })
})

describe('angle-cut refuses', () => {
  it.each([
    [
      'a cut that runs out at the other end',
      ['140 mm', '45 deg', '140 mm'],
      'longPoint',
      'runs out',
    ],
    ['a cut along the board', ['140 mm', '81 deg', '5 m'], 'angle', 'out of range'],
    ['a square cut', ['140 mm', '0 deg', '5 m'], 'angle', 'out of range'],
    ['no board', ['0 mm', '45 deg', '1 m'], 'boardWidth', 'out of range'],
  ] as const)('%s', (_name, [boardWidth, angle, longPoint], input, words) => {
    expect(refuse('angle-cut', { boardWidth, angle, longPoint })[input]).toContain(words)
  })

  it('takes a point that is left by a hair', () => {
    expect(
      refuse('angle-cut', { boardWidth: '140 mm', angle: '45 deg', longPoint: '140.1 mm' }),
    ).toEqual({})
  })
})

describe('the slips of angle-cut', () => {
  const values = { boardWidth: 0.14, angle: Math.PI / 6, longPoint: 0.895 }
  const outputs = cut('140 mm', '30 deg', '895 mm')
  it.each([
    ['sine-for-tangent', '70'],
    ['from-the-edge', '140 * sqrt(3)'],
    ['length-of-the-cut', '280 / sqrt(3)'],
    ['offset-added', '895 + 140 / sqrt(3)'],
    ['half-the-offset', '895 - 70 / sqrt(3)'],
  ])('%s', (id, formula) => {
    const slip = angleCut.slips.find((one) => one.id === id)
    const wrong = slip?.wrong(values, outputs, 'metric')
    expect(millimetres(wrong)).toBeCloseTo(evaluate(formula) as number, 6)
  })
})
