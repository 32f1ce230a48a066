import type { Quantity } from '../calculators/calculator'
import { findUnit } from '../units/unit'
import { quantityDimensions, type Dimension } from './dimensions'
import type { OwnQuantity } from '../contracts/ownCalculators'

/** A unit that may stand in a formula: what it measures, and how many SI units one of it is. */
export interface FormulaUnit {
  dimension: Dimension
  factor: number
}

/** Spellings of units in formulas, by the unit of ours that they mean; mathjs knows every one of them. */
const spellings: Partial<Record<OwnQuantity, Record<string, string>>> = {
  length: {
    mm: 'mm',
    cm: 'cm',
    m: 'm',
    meter: 'm',
    meters: 'm',
    inch: 'in',
    inches: 'in',
    ft: 'ft',
    foot: 'ft',
    feet: 'ft',
    yd: 'yd',
    yard: 'yd',
    yards: 'yd',
  },
  volume: {
    l: 'L',
    L: 'L',
    litre: 'L',
    litres: 'L',
    ml: 'ml',
    mL: 'ml',
    gal: 'gal',
    gallon: 'gal',
    gallons: 'gal',
    qt: 'qt',
    quart: 'qt',
    quarts: 'qt',
    pt: 'pt',
    pint: 'pt',
    pints: 'pt',
  },
  angle: { deg: '°', degree: '°', degrees: '°', rad: 'rad', radian: 'rad', radians: 'rad' },
  mass: {
    kg: 'kg',
    g: 'g',
    tonne: 't',
    tonnes: 't',
    lb: 'lb',
    lbs: 'lb',
    oz: 'oz',
    ounce: 'oz',
    ounces: 'oz',
  },
  pressure: { Pa: 'Pa', kPa: 'kPa', MPa: 'MPa', psi: 'psi' },
  force: { N: 'N', kN: 'kN', lbf: 'lbf' },
  time: {
    s: 's',
    sec: 's',
    second: 's',
    seconds: 's',
    min: 'min',
    minute: 'min',
    minutes: 'min',
    h: 'h',
    hr: 'h',
    hour: 'h',
    hours: 'h',
    day: 'd',
    days: 'd',
  },
}

function listUnits(): [string, FormulaUnit][] {
  return Object.entries(spellings).flatMap(([quantity, names]) =>
    Object.entries(names).map(([spelling, name]): [string, FormulaUnit] => {
      const unit = findUnit(quantity as Quantity, name)
      if (!unit) throw new Error(`No unit “${name}” for ${quantity}`)
      const dimension = quantityDimensions[quantity as OwnQuantity]
      return [spelling, { dimension, factor: unit.factor }]
    }),
  )
}

/** Every unit that may stand in a formula. `min` before a bracket is the function. */
export const formulaUnits: ReadonlyMap<string, FormulaUnit> = new Map(listUnits())

/** How many values a function takes, and what they must measure. */
export interface FormulaFunction {
  least: number
  most: number
  /**
   * `alike`: all measure the same, and so does the result; `plain`: plain numbers in and out;
   * `root`: the result measures the root of what goes in; `angle`: an angle or plain radians in, a plain number out;
   * `inverse`: plain numbers in, an angle out; `direction`: two that measure the same in, an angle out.
   */
  kind: 'alike' | 'plain' | 'root' | 'angle' | 'inverse' | 'direction'
}

const most = 8
/** Every function that may stand in a formula. */
export const formulaFunctions: ReadonlyMap<string, FormulaFunction> = new Map<
  string,
  FormulaFunction
>([
  ['sqrt', { least: 1, most: 1, kind: 'root' }],
  ['cbrt', { least: 1, most: 1, kind: 'root' }],
  ['abs', { least: 1, most: 1, kind: 'alike' }],
  ['min', { least: 2, most, kind: 'alike' }],
  ['max', { least: 2, most, kind: 'alike' }],
  ['hypot', { least: 2, most, kind: 'alike' }],
  ['round', { least: 1, most: 1, kind: 'plain' }],
  ['ceil', { least: 1, most: 1, kind: 'plain' }],
  ['floor', { least: 1, most: 1, kind: 'plain' }],
  ['sin', { least: 1, most: 1, kind: 'angle' }],
  ['cos', { least: 1, most: 1, kind: 'angle' }],
  ['tan', { least: 1, most: 1, kind: 'angle' }],
  ['asin', { least: 1, most: 1, kind: 'inverse' }],
  ['acos', { least: 1, most: 1, kind: 'inverse' }],
  ['atan', { least: 1, most: 1, kind: 'inverse' }],
  ['atan2', { least: 2, most: 2, kind: 'direction' }],
])

/** Words that mean something to the reader of formulas and are not offered here, with what to do instead. */
export const reservedWords: ReadonlyMap<string, string> = new Map([
  ['to', 'Units are turned into each other by themselves: leave it out.'],
  ['mod', 'Take the whole ones off: a - floor(a / b) * b.'],
  ['and', 'Ask one thing at a time: a > b ? (c > d ? 1 : 2) : 2.'],
  ['or', 'Ask one thing at a time: a > b ? 1 : (c > d ? 1 : 2).'],
  ['xor', 'Ask one thing at a time: a > b ? 1 : 2.'],
  ['not', 'Turn the comparison round.'],
  ['true', 'Write a comparison such as a > b.'],
  ['false', 'Write a comparison such as a > b.'],
  ['null', 'Write a number, or a name from above.'],
  ['undefined', 'Write a number, or a name from above.'],
  ['NaN', 'Write a number, or a name from above.'],
  ['Infinity', 'Write a number, or a name from above.'],
  ['end', 'Write a number, or a name from above.'],
])

const NAME = /^[A-Za-z][A-Za-z0-9_]*$/

/** Why this cannot name an input or an output, or undefined where it can. */
export function refuseName(name: string): string | undefined {
  if (name === '') return 'It needs a name for the formulas.'
  if (!NAME.test(name)) return `“${name}” is no name: plain letters, digits and _, a letter first.`
  if (name === 'pi') return '“pi” is the number 3.14159… here.'
  if (name === 'in' || formulaUnits.has(name)) return `“${name}” is a unit here.`
  if (formulaFunctions.has(name)) return `“${name}” is a function here.`
  if (reservedWords.has(name) || name in {}) return `“${name}” cannot be used as a name.`
  return undefined
}
