import type {
  CalculatorInput,
  CalculatorOutput,
  Quantity,
} from '../../../shared/calculators/calculator'
import { fieldUnit, showInput, showOutput } from '../../../shared/calculators/fields'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
import { parseQuantity } from '../../../shared/units/parse'

/** A field that holds a number in SI and shows it in a person's unit. */
export interface NumberField {
  unit: string
  show: (value: number) => string
  read: (text: string) => { ok: true; value: number } | { ok: false; message: string }
}

/** The unit stands beside the field already. */
const withoutUnit = (text: string, unit: string) =>
  unit !== '' && text.endsWith(unit) ? text.slice(0, -unit.length).trim() : text

/** A value of a calculator's input, such as an end of its range. */
export function inputField(input: CalculatorInput, system: UnitSystem): NumberField {
  const unit = fieldUnit(input, system)
  const quantity = input.quantity === 'choice' ? 'count' : input.quantity
  return {
    unit,
    show: (value) => withoutUnit(showInput(input, value, system), unit),
    read: (text) => parseQuantity(text, quantity, { system, defaultUnit: unit }),
  }
}

/** How far off an output may be, in its own unit. */
export function outputField(output: CalculatorOutput, system: UnitSystem): NumberField {
  const unit = fieldUnit(output, system)
  const quantity = output.quantity === 'choice' ? 'count' : output.quantity
  return {
    unit,
    show: (value) => withoutUnit(showOutput(output, value, system), unit),
    read: (text) => parseQuantity(text, quantity, { system, defaultUnit: unit }),
  }
}

/** How far off a quantity may be, in this unit. */
export const quantityField = (
  quantity: Quantity,
  unit: string,
  system: UnitSystem,
): NumberField => ({
  unit,
  show: (value) =>
    withoutUnit(formatQuantity(value, quantity, system, unit === '' ? {} : { unit }), unit),
  read: (text) => parseQuantity(text, quantity, { system, defaultUnit: unit }),
})

/** A plain number between two bounds. */
export const plainField = (
  unit: string,
  { min, max, isWhole = false }: { min: number; max: number; isWhole?: boolean },
): NumberField => ({
  unit,
  show: (value) => String(value),
  read: (text) => {
    const value = Number(text.trim().replace(',', '.'))
    const isUsable =
      text.trim() !== '' && value >= min && value <= max && (!isWhole || Number.isInteger(value))
    if (isUsable) return { ok: true, value }
    return {
      ok: false,
      message: `Write ${isWhole ? 'a whole' : 'a'} number from ${min} to ${max}.`,
    }
  },
})

export const percentField = plainField('%', { min: 0, max: 100 })
export const triesField = plainField('', { min: 1, max: 20, isWhole: true })
export const passMarkField = plainField('%', { min: 1, max: 100, isWhole: true })

/** What was typed with the unit it was taken in, so that it means the same to everybody: 300 is `300 mm`. */
export function withUnit(text: string, input: CalculatorInput, system: UnitSystem): string {
  const unit = fieldUnit(input, system)
  if (input.quantity === 'choice' || unit === '') return text
  const read = parseQuantity(text, input.quantity, { system, defaultUnit: unit })
  return read.ok && read.bare ? `${text.trim()} ${unit}` : text
}

/** The same without it, for a field that has the unit beside it. */
export const inField = (text: string, input: CalculatorInput, system: UnitSystem): string =>
  withoutUnit(text, fieldUnit(input, system))
