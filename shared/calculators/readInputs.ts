import type { Calculator, CalculatorInput, QuantityInput, Value, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { fieldUnit, showInput, splitList } from './fields'
import { parseQuantity } from '../units/parse'

/** One sentence for each input that cannot be used, under its name. */
export type InputErrors = Record<string, string>

type Refused = { ok: false; message: string }
type ReadValue = { ok: true; value: Value | undefined } | Refused
type ReadNumber = { ok: true; value: number } | Refused

/** More posts or marks than any garden job has. */
const MOST_IN_LIST = 60

/**
 * Reads what a person typed into a calculator's fields; a missing text of an assumed input or a choice takes its initial value.
 * Values are SI; each error names the input, what was read and what is permitted, in the person's units.
 */
export function readInputs(
  calculator: Calculator,
  texts: Record<string, string | undefined>,
  system: UnitSystem,
): { ok: boolean; values: Values; errors: InputErrors } {
  const values: Values = {}
  const errors: InputErrors = {}
  for (const input of calculator.inputs) {
    const text = texts[input.name]
    const read = readInput(input, text, system)
    if (read.ok) values[input.name] = read.value
    else errors[input.name] = read.message
  }
  return { ok: Object.keys(errors).length === 0, values, errors }
}

/** Reads what was typed into one input. */
export function readInput(
  input: CalculatorInput,
  typed: string | undefined,
  system: UnitSystem,
): ReadValue {
  const falls = typed === undefined && (input.assumed || input.quantity === 'choice')
  const text = (falls ? input.initial[system] : (typed ?? '')).trim()
  if (text === '' && input.optional) return { ok: true, value: undefined }
  if (text === '') {
    const state = typed === undefined ? 'missing' : 'empty'
    return { ok: false, message: `${input.label} is ${state}. Give ${permitted(input, system)}.` }
  }
  if (input.quantity === 'choice') return readChoice(input, text, system)
  return input.isList ? readList(input, text, system) : readQuantity(input, text, system)
}

function readQuantity(input: QuantityInput, text: string, system: UnitSystem): ReadNumber {
  const read = parseQuantity(text, input.quantity, {
    system,
    defaultUnit: fieldUnit(input, system),
  })
  if (!read.ok) return { ok: false, message: `${input.label}: ${read.message}` }
  return checkBounds(input, read.value, system)
}

function readList(input: QuantityInput, text: string, system: UnitSystem): ReadValue {
  const parts = splitList(text)
  if (parts.length > MOST_IN_LIST) {
    const message = `${input.label}: ${String(parts.length)} numbers are too many. Give up to ${String(MOST_IN_LIST)}, with semicolons between them.`
    return { ok: false, message }
  }
  const read = parts.map((part) => readQuantity(input, part, system))
  const refused = read.find((one) => !one.ok)
  return refused ?? { ok: true, value: read.flatMap((one) => (one.ok ? [one.value] : [])) }
}

function readChoice(
  input: Extract<CalculatorInput, { quantity: 'choice' }>,
  text: string,
  system: UnitSystem,
): ReadValue {
  const wanted = plain(text)
  const found = input.choices.find(
    (choice) => plain(choice.value) === wanted || plain(choice.label) === wanted,
  )
  if (found) return { ok: true, value: found.value }
  const shown = text.length > 40 ? `${text.slice(0, 40)}…` : text
  return {
    ok: false,
    message: `${input.label}: “${shown}” is not one of them. Give ${permitted(input, system)}.`,
  }
}

const plain = (text: string) => text.toLowerCase().replace(/\s+/g, '')

/** A value in SI against the bounds of its input; binary dust at a bound is forgiven. */
export function checkBounds(input: CalculatorInput, value: number, system: UnitSystem): ReadNumber {
  if (input.quantity === 'choice') return { ok: true, value }
  const dust = 1e-9 * Math.max(1, Math.abs(input.max))
  if (value >= input.min - dust && value <= input.max + dust) return { ok: true, value }
  return {
    ok: false,
    message: `${input.label}: ${showInput(input, value, system)} is out of range. Give ${permitted(input, system)}.`,
  }
}

/** What an input takes, in a person's units. */
function permitted(input: CalculatorInput, system: UnitSystem): string {
  if (input.quantity === 'choice') return input.choices.map(({ value }) => value).join(', ')
  return `${showInput(input, input.min, system)} to ${showInput(input, input.max, system)}`
}
