import fc from 'fast-check'
import { unit as mathUnit } from 'mathjs'
import { describe, expect, it } from 'vitest'
import type { Quantity } from '../../../shared/calculators/calculator'
import { parseQuantity, type ParseOptions } from '../../../shared/units/parse'
import { findUnit, quantitiesOfUnit, units } from '../../../shared/units/unit'

const metric: ParseOptions = { system: 'metric' }
const imperial: ParseOptions = { system: 'imperial' }
const quantities = Object.keys(units) as Quantity[]

function read(text: string, quantity: Quantity, options = metric): number {
  const parsed = parseQuantity(text, quantity, options)
  if (!parsed.ok) throw new Error(parsed.message)
  return parsed.value
}
function refusal(text: string, quantity: Quantity, options = metric): string {
  const parsed = parseQuantity(text, quantity, options)
  if (parsed.ok) throw new Error(`“${text}” was read as ${String(parsed.value)}`)
  return parsed.message
}

describe('parseQuantity reads lengths as builders write them', () => {
  it.each([
    ['3.2 m', 3.2],
    ['3,2 m', 3.2],
    ["12'", 12 * 0.3048],
    ['12 ft 6 1/2 in', 150.5 * 0.0254],
    [`12' 6-1/2"`, 150.5 * 0.0254],
    [`12'6-1/2"`, 150.5 * 0.0254],
    [`12'-6 1/2"`, 150.5 * 0.0254],
    ['12′ 6½″', 150.5 * 0.0254],
    ['12’ 6 1/2”', 150.5 * 0.0254],
    ["12' 6", 150 * 0.0254],
    ['12 feet 6 inches', 150 * 0.0254],
    ['5/8"', 0.625 * 0.0254],
    ['1 5/8 in', 1.625 * 0.0254],
    ['140 mm', 0.14],
    ['140MM', 0.14],
    ['14 cm', 0.14],
    ['.5 m', 0.5],
    ['12.5 ft', 12.5 * 0.3048],
    ['4 yards', 3.6576],
    ['-5 mm', -0.005],
    ['−5 mm', -0.005],
    ['2 250 000 mm', 2250],
    ['2\u202f250\u202f000', 2250],
    ['0', 0],
  ])('%s', (text, metres) => {
    expect(read(text, 'length')).toBeCloseTo(metres, 12)
  })

  it('gives a bare number the unit of the field, else of the site', () => {
    expect(read('140', 'length')).toBeCloseTo(0.14, 12)
    expect(read('5 1/2', 'length', imperial)).toBeCloseTo(5.5 * 0.0254, 12)
    expect(read('3.2', 'length', { system: 'metric', defaultUnit: 'm' })).toBe(3.2)
    expect(parseQuantity('140', 'length', metric)).toMatchObject({ unit: 'mm', bare: true })
    expect(parseQuantity('140 mm', 'length', imperial)).toMatchObject({ unit: 'mm', bare: false })
  })
})

describe('parseQuantity reads slopes in every spelling', () => {
  it.each([
    ['1:48', 'ratio', 1 / 48],
    ['1 in 48', 'ratio', 1 / 48],
    ['1/4 in/ft', 'ratio', 1 / 48],
    [`1/4" per ft`, 'ratio', 1 / 48],
    ['20 mm/m', 'ratio', 0.02],
    ['20 mm per m', 'ratio', 0.02],
    ['2 %', 'ratio', 0.02],
    ['4/12', 'ratio', 1 / 3],
    ['0,02', 'ratio', 0.02],
    ['45 deg', 'ratio', 1],
    ['20 deg', 'angle', (20 * Math.PI) / 180],
    ['20°', 'angle', (20 * Math.PI) / 180],
    ['20', 'angle', (20 * Math.PI) / 180],
    ['0.5 rad', 'angle', 0.5],
    ['12/12', 'angle', Math.PI / 4],
    ['100 %', 'angle', Math.PI / 4],
    ['4', 'risePer12', 4],
    ['4/12', 'risePer12', 4],
    ['4 in 12', 'risePer12', 4],
    ['1:3', 'risePer12', 4],
    ['45°', 'risePer12', 12],
    ['2 %', 'percent', 2],
    ['2', 'percent', 2],
    ['1/2 %', 'percent', 0.5],
  ] as const)('%s as %s', (text, quantity, value) => {
    expect(read(text, quantity)).toBeCloseTo(value, 12)
  })

  it('takes a fraction of a ruler for the unit of the field, a pitch for a pitch', () => {
    const field: ParseOptions = { system: 'imperial', defaultUnit: 'in/ft' }
    expect(read('1/4', 'ratio', field)).toBeCloseTo(1 / 48, 12)
    expect(read('4/12', 'ratio', field)).toBeCloseTo(1 / 3, 12)
    expect(read('10', 'ratio', { system: 'metric', defaultUnit: 'mm/m' })).toBeCloseTo(0.01, 12)
  })
})

describe('parseQuantity agrees with mathjs on every unit both know', () => {
  it.each([
    ['length', '7.25', 'in', 'inch', 'm'],
    ['length', '7.25', 'ft', 'foot', 'm'],
    ['length', '7.25', 'yd', 'yard', 'm'],
    ['area', '7.25', 'ft²', 'sqft', 'm2'],
    ['area', '7.25', 'in²', 'sqin', 'm2'],
    ['volume', '7.25', 'L', 'litre', 'm3'],
    ['volume', '7.25', 'ft³', 'cuft', 'm3'],
    ['volume', '7.25', 'yd3', 'yard^3', 'm3'],
    ['volume', '7.25', 'gal', 'gallon', 'm3'],
    ['volume', '7.25', 'qt', 'quart', 'm3'],
    ['volume', '7.25', 'pt', 'pint', 'm3'],
    ['mass', '7.25', 'lb', 'lbm', 'kg'],
    ['mass', '7.25', 'oz', 'oz', 'kg'],
    ['mass', '7.25', 't', 'tonne', 'kg'],
    ['massDensity', '7.25', 'lb/ft³', 'lbm/ft^3', 'kg/m^3'],
    ['pressure', '7.25', 'psi', 'psi', 'Pa'],
    ['pressure', '7.25', 'psf', 'lbf/ft^2', 'Pa'],
    ['force', '7.25', 'lbf', 'lbf', 'N'],
    ['angle', '7.25', 'deg', 'deg', 'rad'],
    ['time', '7.25', 'h', 'hour', 's'],
  ] as const)('%s: %s %s', (quantity, amount, written, theirs, si) => {
    const expected = mathUnit(Number(amount), theirs).toNumber(si)
    expect(Math.abs(read(`${amount} ${written}`, quantity) / expected - 1)).toBeLessThan(1e-6)
  })
})

describe('parseQuantity refuses', () => {
  it.each([
    'NaN',
    'Infinity',
    '-Infinity',
    '1e999',
    '1e3',
    '1,234.5',
    '1.234,5',
    '1,2,3',
    '5/0',
    '6-9/8"',
    `5' 14"`,
    `5.5' 3"`,
    '3 m 20 cm',
    '12 bananas',
    'm',
    '"',
    '--5 mm',
    '5 mm 5 mm',
    '0x10',
    '٣ m',
    '1 mm/m',
    '<b>5</b>',
  ])('%s as a length, in a sentence with what was read and what is accepted', (text) => {
    const message = refusal(text, 'length')
    expect(message).toContain(`“${text}”`)
    expect(message).toContain(`Write it like 140 mm, 3.2 m, 12' 6-1/2" or 5/8".`)
  })

  it('text of 10,000 characters, without repeating it', () => {
    const message = refusal('9'.repeat(10_000), 'length')
    expect(message).toContain('is 10000 characters long')
    expect(message.length).toBeLessThan(250)
  })

  it('a size that nothing has', () => {
    expect(read('999999999999 m', 'length')).toBe(999_999_999_999)
    expect(refusal(`${'9'.repeat(70)} m`, 'length')).toContain('is not a size anything has')
  })

  it('nothing at all', () => {
    expect(refusal('  ', 'mass')).toBe('Nothing was written. Write it like 25 kg or 80 lb.')
  })

  it.each([
    ['3 kg', 'length', 'is a mass; a length is asked for'],
    ['3 m', 'mass', 'is a length; a mass is asked for'],
    ['3 L', 'length', 'is a volume; a length is asked for'],
    ['3 m', 'angle', 'is a length; an angle is asked for'],
    ['3 mm', 'volume', 'is a length; a volume is asked for'],
    ['20 deg', 'percent', 'is an angle; a percentage is asked for'],
  ] as const)('%s as %s: it %s', (text, quantity, reason) => {
    expect(refusal(text, quantity)).toContain(reason)
  })

  it.each(['1:0', '4/0', '90 deg', '120°'])('the slope %s', (text) => {
    expect(refusal(text, 'ratio').length).toBeGreaterThan(0)
  })

  it('money with more than two decimals', () => {
    expect(read('12.50', 'money')).toBe(1250)
    expect(refusal('12.505', 'money')).toContain('more than two decimals')
  })

  it('random text: it is read as a finite number that holds a digit, or refused in a sentence', () => {
    fc.assert(
      fc.property(
        fc.string({ maxLength: 200 }),
        fc.constantFrom(...quantities),
        (text, quantity) => {
          const parsed = parseQuantity(text, quantity, metric)
          if (parsed.ok) {
            expect(Number.isFinite(parsed.value)).toBe(true)
            expect(text).toMatch(/[\d½¼¾⅓⅔⅛⅜⅝⅞]/)
          } else expect(parsed.message).toMatch(/\.$/)
        },
      ),
      { numRuns: 2000 },
    )
  })

  it('words, whatever they are', () => {
    const letters = fc.array(fc.constantFrom(...Array.from('abcdefghijklmnopqrstuvwxyzÅßçа')), {
      minLength: 1,
      maxLength: 40,
    })
    fc.assert(
      fc.property(letters, fc.constantFrom(...quantities), (signs, quantity) => {
        expect(parseQuantity(signs.join(''), quantity, metric).ok).toBe(false)
      }),
    )
  })

  it('a number with a word that is no unit of it', () => {
    const words = fc
      .array(fc.constantFrom(...Array.from('abcdefghijklmnopqrstuvwxyz')), {
        minLength: 1,
        maxLength: 12,
      })
      .map((signs) => signs.join(''))
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 1e6 }),
        words,
        fc.constantFrom(...quantities),
        (amount, word, quantity) => {
          fc.pre(findUnit(quantity, word) === undefined && quantitiesOfUnit(word).length === 0)
          expect(parseQuantity(`${String(amount)} ${word}`, quantity, metric).ok).toBe(false)
        },
      ),
    )
  })
})
