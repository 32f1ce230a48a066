import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Quantity } from '../../../shared/calculators/calculator'
import { displayUnit, formatQuantity, type FormatOptions } from '../../../shared/units/format'
import { formatNumber, roundDownTo, roundUp, roundUpTo } from '../../../shared/units/number'
import { parseQuantity } from '../../../shared/units/parse'

const plain = (text: string) => text.replaceAll('\u00a0', ' ')
const show = (
  value: number,
  quantity: Quantity,
  system: 'metric' | 'imperial',
  options?: FormatOptions,
) => plain(formatQuantity(value, quantity, system, options))
const INCH = 0.0254

describe('formatQuantity', () => {
  it.each([
    [2.6, 'length', '2600 mm', `8' 6-3/8"`],
    [0.0064, 'length', '6.4 mm', '1/4"'],
    [0.003, 'length', '3 mm', '1/8"'],
    [0, 'length', '0 mm', '0"'],
    [-0.3048, 'length', '−305 mm', `−1'`],
    [12.3456, 'length', '12\u202f346 mm', `40' 6-1/16"`],
    [0.00001, 'length', '0 mm', '0"'],
    [2.86, 'area', '2.86 m²', '30.78 ft²'],
    [0.286, 'volume', '0.286 m³', '0.374 yd³'],
    [0.0115, 'volume', '11.5 L', '12.2 qt'],
    [0.32, 'angle', '18.33°', '18.33°'],
    [0.65882, 'ratio', '0.6588', '0.6588'],
    [4, 'risePer12', '4 in 12', '4 in 12'],
    [100 / 3, 'percent', '33.33 %', '33.33 %'],
    [700, 'mass', '700 kg', '1543 lb'],
    [2400, 'massDensity', '2400 kg/m³', '149.83 lb/ft³'],
    [28, 'count', '28', '28'],
    [1250, 'money', '12.50', '12.50'],
    [1200, 'time', '20 min', '20 min'],
  ] as const)('%d of %s is %s or %s', (value, quantity, metric, imperial) => {
    expect([show(value, quantity, 'metric'), show(value, quantity, 'imperial')]).toEqual([
      metric,
      imperial,
    ])
  })

  it('shows runs in metres and what a field asks for in its unit', () => {
    expect(show(2.6, 'length', 'metric', { scale: 'run' })).toBe('2.60 m')
    expect(show(1.125, 'length', 'metric', { scale: 'run' })).toBe('1.125 m')
    expect(show(0.0115, 'volume', 'metric', { unit: 'L' })).toBe('11.5 L')
    expect(show(0.3146, 'volume', 'metric', { unit: 'L' })).toBe('315 L')
    expect(show(1 / 48, 'ratio', 'imperial', { unit: 'in/ft' })).toBe('1/4 in/ft')
    expect(show(1 / 48, 'ratio', 'metric', { unit: '1:n' })).toBe('1:48')
    expect(show(0.02, 'ratio', 'metric', { unit: 'mm/m' })).toBe('20 mm/m')
  })

  it('never breaks a number from its unit and parts thousands by a thin space', () => {
    expect(formatQuantity(2250, 'length', 'metric')).toBe('2\u202f250\u202f000\u00a0mm')
  })

  it('shows no number for what is none', () => {
    expect(formatQuantity(NaN, 'length', 'metric')).toBe('–')
    expect(formatQuantity(Infinity, 'mass', 'imperial')).toBe('–')
  })

  it.each([
    [11.99 * INCH, `1'`],
    [11.96 * INCH, `11-15/16"`],
    [0.03 * INCH, '0"'],
    [0.04 * INCH, '1/16"'],
    [23.99 * INCH, `2'`],
  ])('carries %d m over to %s', (metres, text) => {
    expect(formatQuantity(metres, 'length', 'imperial')).toBe(text)
  })
})

/** Half of the last digit shown, in SI, for a value of this size. */
const precision: [
  Quantity,
  FormatOptions,
  (value: number, system: 'metric' | 'imperial') => number,
][] = [
  ['length', {}, (_value, system) => (system === 'metric' ? 0.0005 : INCH / 32)],
  ['length', { scale: 'run' }, (_value, system) => (system === 'metric' ? 0.0005 : INCH / 32)],
  ['area', {}, () => 0.005],
  ['volume', {}, () => 0.0005],
  ['volume', { unit: 'L' }, (value) => Math.max(5e-6, value < 0.1 ? 5e-5 : 5e-4)],
  ['volume', { unit: 'qt' }, (value) => (value < 0.1 ? 5e-5 : 5e-4)],
  ['angle', {}, () => (0.005 * Math.PI) / 180],
  ['ratio', {}, () => 0.00005],
  ['ratio', { unit: 'mm/m' }, () => 0.0005],
  ['ratio', { unit: 'in/ft' }, () => 1 / 384],
  ['risePer12', {}, () => 0.005],
  ['percent', {}, () => 0.005],
  ['mass', {}, (value) => (value < 4 ? 0.005 : value < 40 ? 0.05 : 0.5)],
  ['massDensity', {}, () => 0.5],
  ['pressure', {}, () => 5],
  ['force', {}, (value) => (value < 10 ? 0.025 : value < 100 ? 0.25 : 2.5)],
  ['count', {}, () => 0.005],
  ['money', {}, () => 0.5],
  ['time', {}, () => 0.3],
]

describe('what is shown reads back', () => {
  it.each(precision)(
    '%s %o to the precision of the display, in both systems',
    (quantity, options, half) => {
      const most = quantity === 'angle' ? 1.5 : quantity === 'massDensity' ? 5000 : 200
      fc.assert(
        fc.property(
          fc.double({ min: 0, max: most, noNaN: true }),
          fc.constantFrom('metric' as const, 'imperial' as const),
          (value, system) => {
            const text = formatQuantity(value, quantity, system, options)
            const parsed = parseQuantity(text, quantity, { system })
            if (!parsed.ok) throw new Error(`${text}: ${parsed.message}`)
            expect(Math.abs(parsed.value - value)).toBeLessThanOrEqual(
              half(value, system) * (1 + 1e-6) + 1e-12,
            )
          },
        ),
      )
    },
  )

  it('and shown again it is the same text', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -50, max: 50, noNaN: true }),
        fc.constantFrom('metric' as const, 'imperial' as const),
        (value, system) => {
          const text = formatQuantity(value, 'length', system)
          const parsed = parseQuantity(text, 'length', { system })
          expect(parsed.ok && formatQuantity(parsed.value, 'length', system)).toBe(text)
        },
      ),
    )
  })
})

describe('rounding', () => {
  it.each([
    [27.000000000001, 27],
    [27.0001, 28],
    [27, 27],
    [0.1 + 0.2, 1],
  ])('%d up to %i', (value, whole) => {
    expect(roundUp(value)).toBe(whole)
  })

  it('up and down to steps, without dust of binary arithmetic', () => {
    expect(roundUpTo(0.3, 0.1)).toBe(0.3)
    expect(roundUpTo(0.301, 0.1)).toBe(0.4)
    expect(roundDownTo(0.35, 0.05)).toBe(0.35)
    expect(roundDownTo(1.1 / 3, 0.05)).toBe(0.35)
    expect(roundDownTo(0.3, 0.1)).toBe(0.3)
  })

  it('trims zeros only behind the point', () => {
    expect([formatNumber(100, 2), formatNumber(1.5, 2, 2), formatNumber(-0.001, 2)]).toEqual([
      '100',
      '1.50',
      '0',
    ])
  })

  it('knows the display unit of a scale', () => {
    expect([
      displayUnit('length', 'metric', 'run'),
      displayUnit('length', 'imperial'),
      displayUnit('mass', 'imperial'),
    ]).toEqual(['m', 'ft in', 'lb'])
  })
})
