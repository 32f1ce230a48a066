import type { CalculatorInput, CalculatorOutput, Value } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { displayUnit, formatQuantity } from '../units/format'
import { parseQuantity } from '../units/parse'
import { siteUnit } from '../units/unit'

type Field = CalculatorInput | CalculatorOutput

/** The unit a bare number takes in this field, and which the field shows beside it: mm, in, %, L. Empty for a choice. */
export function fieldUnit(field: Field, system: UnitSystem): string {
  if (field.quantity === 'choice') return ''
  const unit = 'unit' in field ? field.unit?.[system] : undefined
  if (unit !== undefined) return unit === '1:n' ? '' : unit
  if ('scale' in field && field.scale === 'run') return system === 'metric' ? 'm' : 'ft'
  return siteUnit(field.quantity, system)
}

/** A value of a field (SI) as text in a person's system; the label of a choice. */
function showValue(field: Field, value: Value | undefined, system: UnitSystem): string {
  if (value === undefined) return ''
  if (field.quantity === 'choice') {
    return field.choices?.find((choice) => choice.value === value)?.label ?? String(value)
  }
  if (Array.isArray(value)) {
    return (value as readonly number[]).map((one) => showValue(field, one, system)).join('; ')
  }
  if (typeof value !== 'number') return String(value)
  const scale = 'scale' in field ? field.scale : undefined
  const unit = 'unit' in field ? field.unit?.[system] : undefined
  return formatQuantity(value, field.quantity, system, {
    unit: unit ?? displayUnit(field.quantity, system, scale),
  })
}

/** An output as text in a person's system: 1750 mm, 28, Too wet; empty where it was not computed. */
export const showOutput = (
  output: CalculatorOutput,
  value: Value | undefined,
  system: UnitSystem,
): string => showValue(output, value, system)

/** An input as text in a person's system; a choice keeps its value, so that the text can be read again. */
export const showInput = (
  input: CalculatorInput,
  value: Value | undefined,
  system: UnitSystem,
): string => (input.quantity === 'choice' ? String(value ?? '') : showValue(input, value, system))

/** The parts of a row of numbers as it is typed: `0; 1.2 m; 2.4 m`; a semicolon at its end is forgiven. */
export const splitList = (text: string): string[] =>
  text
    .replace(/;\s*$/, '')
    .split(';')
    .map((part) => part.trim())

/**
 * What a person typed in one system as it reads in the other: 300 mm as 11-13/16".
 * Text that cannot be read, or is a choice, stays as it is.
 */
export function convertText(
  input: CalculatorInput,
  text: string,
  from: UnitSystem,
  to: UnitSystem,
): string {
  if (from === to || input.quantity === 'choice') return text
  if (input.isList && text.includes(';')) {
    return splitList(text)
      .map((part) => convertText(input, part, from, to))
      .join('; ')
  }
  const read = parseQuantity(text, input.quantity, {
    system: from,
    defaultUnit: fieldUnit(input, from),
  })
  return read.ok ? showInput(input, read.value, to) : text
}
