import type { Quantity, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { formatQuantity, type FormatOptions } from '../units/format'
import { formatNumber } from '../units/number'

/** The number under this name; a calculator that asks for one it did not declare is a defect. */
export function numberOf(values: Values, name: string): number {
  const value = values[name]
  if (typeof value !== 'number') throw new Error(`“${name}” is not a number`)
  return value
}

/** The number under this name, or undefined where an optional input stayed empty. */
export const optionalNumber = (values: Values, name: string): number | undefined =>
  values[name] === undefined ? undefined : numberOf(values, name)

/** The row of numbers under this name. */
export function listOf(values: Values, name: string): readonly number[] {
  const value = values[name]
  if (!Array.isArray(value)) throw new Error(`“${name}” is not a row of numbers`)
  return value as readonly number[]
}

/** The word under this name. */
export function wordOf(values: Values, name: string): string {
  const value = values[name]
  if (typeof value !== 'string') throw new Error(`“${name}” is not a word`)
  return value
}

const INCH = 0.0254

/** Writes the numbers of worked steps in a person's units. */
export function stepWriter(system: UnitSystem) {
  const metric = system === 'metric'
  return {
    show: (value: number, quantity: Quantity, options?: FormatOptions) =>
      formatQuantity(value, quantity, system, options),
    length: (metres: number) => formatQuantity(metres, 'length', system),
    /** Millimetres or decimal inches without the unit, for sums of squares. */
    plain: (metres: number) =>
      metric ? formatNumber(metres * 1000, 1) : formatNumber(metres / INCH, 3),
    /** Square millimetres or square inches without the unit. */
    plainSquare: (squareMetres: number) =>
      metric ? formatNumber(squareMetres * 1e6, 0) : formatNumber(squareMetres / INCH ** 2, 2),
    /** Metres or decimal feet without the unit, for volumes. */
    large: (metres: number) =>
      metric ? formatNumber(metres, 4, 2) : formatNumber(metres / (12 * INCH), 3, 2),
    number: (value: number, decimals = 2) => formatNumber(value, decimals),
  }
}
