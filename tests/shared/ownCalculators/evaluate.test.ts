import fc from 'fast-check'
import { evaluate as evaluateByMathjs, unit, type Unit } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { evaluateFormula } from '../../../shared/ownCalculators/evaluate'
import { readFormula } from '../../../shared/ownCalculators/formula'
import { FormulaError } from '../../../shared/ownCalculators/formulaError'
import { measureFormula } from '../../../shared/ownCalculators/measure'
import { isSame, quantityDimensions } from '../../../shared/ownCalculators/dimensions'

type Kind = 'count' | 'length' | 'area' | 'volume' | 'mass' | 'angle'
/** A formula as ours reads it, and as mathjs does: there an inverse function gives a plain number of radians. */
interface Written {
  ours: string
  theirs: string
}

const names = { side: 2.37, rise: 0.412, n: 7, share: 0.35, load: 81.6, slope: 0.41 }
const unitOf: Record<Kind, string> = {
  count: '',
  length: 'm',
  area: 'm^2',
  volume: 'm^3',
  mass: 'kg',
  angle: 'rad',
}
const same = (text: string): Written => ({ ours: text, theirs: text })
const join = (write: (parts: string[]) => string, ...parts: Written[]): Written => ({
  ours: write(parts.map(({ ours }) => ours)),
  theirs: write(parts.map(({ theirs }) => theirs)),
})

const atoms: Record<Kind, string[]> = {
  count: ['n', 'share', '3', '0.25', 'pi', '1.5e1'],
  length: ['side', 'rise', '140 mm', '5 ft', '3 inch', '2 yd', '0.4 m'],
  area: ['(2 m^2)', '(40 cm^2)', '(3 ft^2)'],
  volume: ['60 L', '(0.2 m^3)', '3 gal', '(1 yd^3)', '2 qt'],
  mass: ['load', '25 kg', '80 lb', '3 oz', '300 g'],
  angle: ['slope', '20 deg', '0.3 rad'],
}
const atom = (kind: Kind) => fc.constantFrom(...atoms[kind]).map(same)

/** Ways to make a kind out of others; what divides is an atom, so that it never is 0. */
function composites(kind: Kind, depth: number): fc.Arbitrary<Written>[] {
  const deep = (other: Kind) => written(other, depth - 1)
  const pair = (a: fc.Arbitrary<Written>, b: fc.Arbitrary<Written>, by: (p: string[]) => string) =>
    fc.tuple(a, b).map((parts) => join(by, ...parts))
  const [times, over] = [
    (p: string[]) => `${p[0]} * (${p[1]})`,
    (p: string[]) => `(${p[0]}) / (${p[1]})`,
  ]
  const general = [
    pair(deep(kind), deep(kind), (p) => `(${p[0]} + ${p[1]})`),
    pair(deep(kind), deep(kind), (p) => `(${p[0]} - (${p[1]}))`),
    pair(deep(kind), deep(kind), (p) => `max(${p[0]}, ${p[1]})`),
    pair(deep(kind), deep(kind), (p) => `min(${p[0]}, ${p[1]})`),
    deep(kind).map((one) => join((p) => `abs(${p[0]})`, one)),
    deep(kind).map((one) => join((p) => `(-(${p[0]}))`, one)),
    pair(deep(kind), atom('count'), times),
    pair(deep(kind), atom('count'), over),
    fc
      .tuple(deep('length'), deep('length'), deep(kind), deep(kind))
      .map((parts) => join((p) => `(${p[0]} > ${p[1]} ? ${p[2]} : ${p[3]})`, ...parts)),
  ]
  const special: Record<Kind, fc.Arbitrary<Written>[]> = {
    count: [
      pair(deep('length'), atom('length'), over),
      pair(deep('mass'), atom('mass'), over),
      deep('angle').map((one) => join((p) => `sin(${p[0]})`, one)),
      deep('angle').map((one) => join((p) => `cos(${p[0]})`, one)),
      deep('count').map((one) => join((p) => `floor(${p[0]})`, one)),
      deep('count').map((one) => join((p) => `ceil(${p[0]})`, one)),
      deep('count').map((one) => join((p) => `(${p[0]})^2`, one)),
    ],
    length: [
      pair(deep('area'), atom('length'), over),
      deep('area').map((one) => join((p) => `sqrt(abs(${p[0]}))`, one)),
      pair(deep('count'), atom('length'), times),
    ],
    area: [pair(deep('length'), deep('length'), times), pair(deep('volume'), atom('length'), over)],
    volume: [
      pair(deep('area'), deep('length'), times),
      pair(atom('mass'), fc.constant(same('1600 kg/m^3')), over),
    ],
    mass: [pair(deep('volume'), fc.constant(same('2400 kg/m^3')), (p) => `${p[0]} * ${p[1]}`)],
    angle: [
      deep('count').map(({ ours, theirs }) => ({
        ours: `atan(${ours})`,
        theirs: `(atan(${theirs}) * 1 rad)`,
      })),
      fc.tuple(atom('length'), deep('length')).map(([a, b]) => ({
        ours: `atan2(${a.ours}, ${b.ours})`,
        theirs: `(atan2((${a.theirs}) / (1 m), (${b.theirs}) / (1 m)) * 1 rad)`,
      })),
    ],
  }
  return [...general, ...special[kind]]
}

function written(kind: Kind, depth: number): fc.Arbitrary<Written> {
  if (depth === 0) return atom(kind)
  return fc.oneof({ arbitrary: atom(kind), weight: 1 }, ...composites(kind, depth))
}

const anything = fc
  .constantFrom<Kind>('count', 'length', 'area', 'volume', 'mass', 'angle')
  .chain((kind) => written(kind, 3).map((formula) => ({ kind, ...formula })))

const dimensions: Record<string, keyof typeof quantityDimensions> = {
  side: 'length',
  rise: 'length',
  load: 'mass',
  slope: 'angle',
}
const units = {
  ...names,
  side: unit(names.side, 'm'),
  rise: unit(names.rise, 'm'),
  load: unit(names.load, 'kg'),
  slope: unit(names.slope, 'rad'),
}

function byMathjs(text: string, kind: Kind): number {
  const value = evaluateByMathjs(text, { ...units }) as number | Unit
  return typeof value === 'number' ? value : value.toNumber(unitOf[kind])
}

describe('evaluateFormula', () => {
  it('gives what mathjs with units gives, for random formulas', () => {
    fc.assert(
      fc.property(anything, ({ kind, ours, theirs }) => {
        const { root } = readFormula(ours)
        const dimension = measureFormula(
          root,
          (name) => quantityDimensions[dimensions[name] ?? 'count'],
        )
        expect(isSame(dimension, quantityDimensions[kind])).toBe(true)
        const value = evaluateFormula(root, new Map(Object.entries(names)))
        const expected = byMathjs(theirs, kind)
        expect(Math.abs(value - expected)).toBeLessThanOrEqual(
          1e-9 * Math.max(1, Math.abs(expected)),
        )
      }),
      { numRuns: 300 },
    )
  })

  const value = (expression: string) =>
    evaluateFormula(readFormula(expression).root, new Map(Object.entries({ ...names, zero: 0 })))
  const errorOf = (expression: string) => {
    try {
      return value(expression)
    } catch (error) {
      return error instanceof FormulaError ? [error.column, error.message] : error
    }
  }

  it.each([
    ['2 + 3 * 4', 14],
    ['-2^2', -4],
    ['2^-1', 0.5],
    ['8^(1/3)', 2],
    ['7 / 2 * 2', 7],
    ['ceil(0.1 + 0.2)', 1],
    ['ceil((0.1 + 0.2) * 10)', 3],
    ['floor((0.1 + 0.7) * 10)', 8],
    ['round(2.5)', 3],
    ['round(-2.4)', -2],
    ['0.1 + 0.2 == 0.3 ? 1 : 2', 1],
    ['n >= 7 ? (n != 7 ? 1 : 2) : 3', 2],
    ['hypot(3 m, 4 m)', 5],
    ['tan(45 deg)', 1],
    ['atan2(1, -1) / (1 deg)', 135],
    ['acos(0.5) / (1 deg)', 60],
    ['asin(0.5) / (1 deg)', 30],
    ['cbrt(27 m^3)', 3],
    ['n > 1 ? 5 : 1 / zero', 5],
  ])('%s is %d', (expression, expected) => {
    expect(value(expression)).toBeCloseTo(expected, 12)
  })

  it.each([
    ['3 + n / zero', 7, 'With these numbers this divides by 0.'],
    ['n / (side - side)', 3, 'With these numbers this divides by 0.'],
    ['zero ^ -2', 6, 'With these numbers this divides by 0.'],
    ['1 + sqrt(-n)', 5, 'With these numbers this is the root of a negative number.'],
    ['asin(n)', 1, 'With these numbers this has no value.'],
    ['(-8)^(1/3)', 5, 'With these numbers this has no value.'],
    ['tan(90 deg)', 1, 'With these numbers this has no value.'],
    ['1e15 * 1e15', 6, 'With these numbers this has no value.'],
    ['0 * (1e9^6)', 9, 'With these numbers this has no value.'],
    ['other + 1', 1, 'Nothing is called other.'],
  ])('stops %s at character %i', (expression, column, message) => {
    expect(errorOf(expression)).toEqual([column, message])
  })
})
