import type { Quantity } from '../calculators/calculator'
import type { UnitSystem } from '../contracts/exercises'
import { readFeetInches } from './length'
import { AMOUNT, normaliseText, readAmount } from './number'
import { readSlope } from './slope'
import { findUnit, quantitiesOfUnit, siteUnit } from './unit'

/** What was read: the value in SI (radians for angles), its unit, and whether the unit was only assumed. */
export type ParsedQuantity =
  { ok: true; value: number; unit: string; bare: boolean } | { ok: false; message: string }

export interface ParseOptions {
  system: UnitSystem
  /** The unit of a bare number, as the field shows it; default the site unit of the system (mm, in). */
  defaultUnit?: string
}

/** Longer than any number with a unit; what is longer was pasted by mistake. */
const LONGEST = 80
/** In SI; no answer of a garden job comes near it, not even a forgotten root in mm. */
const LARGEST = 1e15
const SIMPLE = new RegExp(String.raw`^(${AMOUNT}) ?(\D.*)?$`, 'i')
const SLOPES: Quantity[] = ['angle', 'ratio', 'risePer12']
/** A fraction of a ruler, as in 1/4 in a field of in/ft; 4/12 is a pitch. */
const RULER_FRACTION = /^(?:\d+[ -])?\d+\/(?:2|4|8|16|32)$/

const names: Record<Quantity, string> = {
  length: 'a length',
  area: 'an area',
  volume: 'a volume',
  angle: 'an angle',
  ratio: 'a ratio',
  risePer12: 'a rise in 12',
  mass: 'a mass',
  massDensity: 'a density',
  pressure: 'a pressure',
  force: 'a force',
  count: 'a count',
  money: 'an amount of money',
  percent: 'a percentage',
  time: 'a time',
}
const accepted: Record<Quantity, string> = {
  length: `140 mm, 3.2 m, 12' 6-1/2" or 5/8"`,
  area: '2.5 m² or 27 ft²',
  volume: '0.3 m³, 12 L, 1.5 yd³, 8 ft³, 3 qt or 2 gal',
  angle: '20 deg, 1:48 or 4/12',
  ratio: '0.02, 1:48, 1/4 in/ft, 20 mm/m, 4/12 or 2 %',
  risePer12: '4, 4/12, 1:3 or 18 deg',
  mass: '25 kg or 80 lb',
  massDensity: '2400 kg/m³ or 150 lb/ft³',
  pressure: '1.5 kPa or 30 psf',
  force: '120 N or 27 lbf',
  count: 'a number such as 28',
  money: '12.50',
  percent: '10 or 10 %',
  time: '20 min, 45 s, 2 h or 3 d',
}

/**
 * Reads a number with its unit as a person types it on site, with decimal comma or point.
 * A bare number takes `defaultUnit`; anything else is refused by a sentence that names what was read and what is accepted.
 */
export function parseQuantity(
  text: string,
  quantity: Quantity,
  options: ParseOptions,
): ParsedQuantity {
  if (text.length > LONGEST) {
    return refuse(
      text,
      quantity,
      `is ${String(text.length)} characters long; ${names[quantity]} is shorter`,
    )
  }
  const normal = normaliseText(text)
  if (normal === '')
    return { ok: false, message: `Nothing was written. Write it like ${accepted[quantity]}.` }
  const signed = /^([+-]?) ?(.*)$/.exec(normal)
  const sign = signed?.[1] === '-' ? -1 : 1
  const read = readUnsigned(signed?.[2] ?? '', quantity, options)
  if (typeof read === 'string') return refuse(text, quantity, read)
  if (!(Math.abs(read.value) < LARGEST)) return refuse(text, quantity, 'is not a size anything has')
  return {
    ok: true,
    value: read.value === 0 ? 0 : sign * read.value,
    unit: read.unit,
    bare: read.bare,
  }
}

type Read = { value: number; unit: string; bare: boolean } | string

function readUnsigned(text: string, quantity: Quantity, options: ParseOptions): Read {
  const assumed = options.defaultUnit ?? siteUnit(quantity, options.system)
  if (quantity === 'length') {
    const metres = readFeetInches(text)
    if (metres !== undefined) return { value: metres, unit: 'ft in', bare: false }
  }
  if (SLOPES.includes(quantity) && !(assumed === 'in/ft' && RULER_FRACTION.test(text))) {
    const slope = readSlope(text)
    if (slope) return convertSlope(slope, quantity)
  }
  const match = SIMPLE.exec(text)
  const amount = readAmount(match?.[1] ?? '')
  if (amount === undefined) return `cannot be read as ${names[quantity]}`
  const written = match?.[2]?.trim() ?? ''
  const unit = findUnit(quantity, written === '' ? assumed : written)
  if (unit === undefined) return explainUnit(written, quantity)
  if (quantity === 'money' && !Number.isInteger(Number((amount * 100).toFixed(6)))) {
    return 'has more than two decimals'
  }
  return { value: amount * unit.factor, unit: unit.name, bare: written === '' }
}

function convertSlope(slope: NonNullable<ReturnType<typeof readSlope>>, quantity: Quantity): Read {
  const { unit } = slope
  if (quantity === 'angle') {
    const value = 'radians' in slope ? slope.radians : Math.atan(slope.ratio)
    return { value, unit, bare: false }
  }
  if ('radians' in slope && slope.radians >= Math.PI / 2) return 'is upright or more, not a slope'
  const ratio = 'radians' in slope ? Math.tan(slope.radians) : slope.ratio
  return { value: quantity === 'risePer12' ? ratio * 12 : ratio, unit, bare: false }
}

function explainUnit(written: string, quantity: Quantity): string {
  const other = quantitiesOfUnit(written)[0]
  if (other) return `is ${names[other]}; ${names[quantity]} is asked for`
  return `cannot be read as ${names[quantity]}`
}

function refuse(text: string, quantity: Quantity, reason: string): ParsedQuantity {
  const shown = text.trim().length > 40 ? `${text.trim().slice(0, 40)}…` : text.trim()
  return { ok: false, message: `“${shown}” ${reason}. Write it like ${accepted[quantity]}.` }
}
