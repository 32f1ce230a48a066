import type { Quantity } from '../calculators/calculator'
import type { UnitSystem } from '../contracts/exercises'
import { formatFeetInches, formatSixteenths } from './length'
import { formatNumber } from './number'
import { findUnit, siteUnit } from './unit'

export interface FormatOptions {
  /** Lengths read on site in mm, or along a run in m; default `site`. Imperial lengths are feet and inches on both. */
  scale?: 'site' | 'run'
  /** The unit to show, where the system's own does not fit (L and qt for water); `1:n` shows a ratio as 1:48. */
  unit?: string
}

/**
 * A value in SI as text in a person's system: mm, m, L, kg, m³, or feet-inches to the nearest 1/16 in, yd³, lb.
 * Rounded for reading only; never compute with it.
 */
export function formatQuantity(
  value: number,
  quantity: Quantity,
  system: UnitSystem,
  options: FormatOptions = {},
): string {
  const name = options.unit ?? unitForSize(value, quantity, system, options.scale)
  if (!Number.isFinite(value)) return '–'
  if (quantity === 'length' && FEET_INCHES.has(name)) return formatFeetInches(value)
  if (quantity === 'ratio' && name === '1:n') {
    return value > 0 ? `1:${formatNumber(1 / value, 2)}` : formatNumber(value, 4)
  }
  if (quantity === 'ratio' && name === 'in/ft') {
    const sign = value < 0 ? '−' : ''
    return `${sign}${formatSixteenths(Math.round(Math.abs(value) * 192))} in/ft`
  }
  return formatInUnit(value, quantity, name)
}

/** Units of length that are shown as feet and inches together. */
const FEET_INCHES = new Set(['ft in', 'in', 'ft', 'yd'])
/** Below 100 L, or a cubic foot, a volume is said in litres or quarts. */
const SMALL_VOLUME: Record<UnitSystem, number> = { metric: 0.1, imperial: 0.0283168 }

function unitForSize(
  value: number,
  quantity: Quantity,
  system: UnitSystem,
  scale: FormatOptions['scale'],
): string {
  if (quantity === 'volume' && Math.abs(value) < SMALL_VOLUME[system]) {
    return system === 'metric' ? 'L' : 'qt'
  }
  return displayUnit(quantity, system, scale)
}

function formatInUnit(value: number, quantity: Quantity, name: string): string {
  const unit = findUnit(quantity, name)
  if (unit === undefined) throw new Error(`No unit “${name}” for ${quantity}`)
  const amount = value / unit.factor
  const least = name === 'm' ? 2 : quantity === 'money' ? 2 : 0
  const number = formatNumber(amount, unit.decimals(Math.abs(amount)), least)
  if (unit.name === '') return number
  return unit.closeUp ? `${number}${unit.name}` : `${number}\u00a0${unit.name}`
}

/** The unit a quantity is shown in on this scale; imperial lengths are shown as feet and inches (`ft in`). */
export function displayUnit(
  quantity: Quantity,
  system: UnitSystem,
  scale: 'site' | 'run' = 'site',
): string {
  if (quantity === 'length' && system === 'imperial') return 'ft in'
  if (quantity === 'length' && scale === 'run') return 'm'
  return siteUnit(quantity, system)
}
