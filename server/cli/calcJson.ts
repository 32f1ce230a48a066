import type {
  Calculator,
  CalculatorInput,
  CalculatorOutput,
  Quantity,
  Value,
  Values,
} from '../../shared/calculators/calculator'
import { fieldUnit, findCalculator, calculators, showOutput } from '../../shared/calculators/index'
import { checkBounds, readInputs } from '../../shared/calculators/readInputs'
import { computeValues } from '../../shared/calculators/runCalculator'
import type { UnitSystem } from '../../shared/contracts/exercises'

/** The unit of a plain number in JSON: SI, but degrees, per cent and rise in 12 as people say them. */
const jsonUnits: Record<Quantity, string> = {
  length: 'm',
  area: 'm²',
  volume: 'm³',
  angle: 'deg',
  ratio: '1',
  risePer12: 'in 12',
  mass: 'kg',
  massDensity: 'kg/m³',
  pressure: 'Pa',
  force: 'N',
  count: '1',
  money: 'hundredths',
  percent: '%',
  time: 's',
}
const RADIANS_PER_DEGREE = Math.PI / 180

export interface CalcFailure {
  error: { input: string; message: string }
}
export interface CalcOutput {
  value: Value
  unit: string
  shown: Record<UnitSystem, string>
}
export interface CalcSuccess {
  id: string
  outputs: Record<string, CalcOutput>
  steps: unknown[]
  cautions: unknown[]
}

/** A refusal: which input, and a sentence. */
export const failure = (input: string, message: string): CalcFailure => ({
  error: { input, message },
})

/** The unit of a field's plain number in JSON; none for a choice. */
export const jsonUnit = ({ quantity }: CalculatorInput | CalculatorOutput): string =>
  quantity === 'choice' ? 'choice' : jsonUnits[quantity]

/** A number in JSON as the calculators hold it, and back: only degrees differ. */
const fromJson = (value: number, field: CalculatorInput) =>
  field.quantity === 'angle' ? value * RADIANS_PER_DEGREE : value
function toJson(value: Value, field: CalculatorOutput): Value {
  if (Array.isArray(value))
    return (value as readonly number[]).map((one) => Number(toJson(one, field)))
  return field.quantity === 'angle' && typeof value === 'number'
    ? value / RADIANS_PER_DEGREE
    : value
}

/** Computes a calculator from a JSON object of inputs. */
export function computeJson(id: string, json: string): CalcSuccess | CalcFailure {
  const calculator = findCalculator(id)
  if (!calculator) {
    const known = calculators.map((one) => one.id).join(', ')
    return failure('id', `There is no calculator “${id}”. There are: ${known}.`)
  }
  let given: unknown
  try {
    given = JSON.parse(json)
  } catch {
    return failure(
      'inputs',
      'The inputs are not JSON. Write them like {"length": "3.2 m", "width": 2}.',
    )
  }
  if (typeof given !== 'object' || given === null || Array.isArray(given)) {
    return failure('inputs', 'The inputs must be one JSON object, like {"length": "3.2 m"}.')
  }
  return computeInputs(calculator, given as Record<string, unknown>)
}

/** Computes a calculator from inputs as JSON holds them: numbers in JSON units, texts with a unit. */
export function computeInputs(
  calculator: Calculator,
  given: Record<string, unknown>,
): CalcSuccess | CalcFailure {
  const read = readJson(calculator, given)
  if ('error' in read) return read
  const metric = computeValues(calculator, read.values, 'metric')
  const imperial = computeValues(calculator, read.values, 'imperial')
  const failed = metric.ok ? imperial : metric
  if (!metric.ok || !imperial.ok) {
    const [input = '', message = ''] = failed.ok ? [] : (Object.entries(failed.errors)[0] ?? [])
    return failure(input, message)
  }
  const outputs: Record<string, CalcOutput> = {}
  for (const output of calculator.outputs) {
    const value = metric.outputs[output.name]
    if (value === undefined) continue
    outputs[output.name] = {
      value: toJson(value, output),
      unit: jsonUnit(output),
      shown: {
        metric: showOutput(output, value, 'metric'),
        imperial: showOutput(output, imperial.outputs[output.name], 'imperial'),
      },
    }
  }
  const { id, cautions } = calculator
  return { id, outputs, steps: metric.steps, cautions }
}

/** One of a row: a plain number in JSON units gets its unit, so that it is read as any text. */
const writeJson = (value: unknown, input: CalculatorInput): string =>
  typeof value === 'number'
    ? `${String(value)} ${jsonUnit(input).replace(/^1$/, '')}`
    : String(value)

/** Texts go the way of the browser's fields, plain numbers are in JSON units and meet the same bounds. */
function readJson(
  calculator: Calculator,
  given: Record<string, unknown>,
): { values: Values } | CalcFailure {
  const texts: Record<string, string> = {}
  const numbers: Values = {}
  for (const [name, value] of Object.entries(given)) {
    const input = calculator.inputs.find((candidate) => candidate.name === name)
    if (!input) {
      const known = calculator.inputs.map((candidate) => candidate.name).join(', ')
      return failure(name, `${calculator.title} has no input “${name}”. It takes: ${known}.`)
    }
    if (value === null) continue
    if (typeof value === 'string') texts[name] = value
    else if (typeof value === 'boolean') texts[name] = value ? 'yes' : 'no'
    else if (Array.isArray(value) && input.quantity !== 'choice' && input.isList)
      texts[name] = value.map((one) => writeJson(one, input)).join('; ')
    else if (typeof value !== 'number')
      return failure(name, `${input.label} must be a number or a text with a unit.`)
    else if (input.quantity === 'choice') texts[name] = String(value)
    else {
      const bounds = checkBounds(input, fromJson(value, input), 'metric')
      if (!bounds.ok) return failure(name, bounds.message)
      numbers[name] = bounds.value
    }
  }
  const { values, errors } = readInputs(calculator, texts, 'metric')
  const error = Object.entries(errors).find(([name]) => numbers[name] === undefined)
  return error ? failure(error[0], error[1]) : { values: { ...values, ...numbers } }
}

/** What `list` prints of a calculator: its inputs and outputs with the units of plain numbers and the bounds. */
export function describeCalculator(calculator: Calculator) {
  const { id, title, question } = calculator
  const inputs = calculator.inputs.map((input) => {
    const { name, label, quantity } = input
    const base = { name, label, quantity, unit: jsonUnit(input), optional: input.optional ?? false }
    if (input.quantity === 'choice')
      return { ...base, choices: input.choices.map(({ value }) => value) }
    const scale = input.quantity === 'angle' ? RADIANS_PER_DEGREE : 1
    const bareText = fieldUnit(input, 'metric')
    return { ...base, bareText, min: input.min / scale, max: input.max / scale }
  })
  const outputs = calculator.outputs.map((output) => {
    const { name, label, quantity } = output
    return { name, label, quantity, unit: jsonUnit(output) }
  })
  return { id, title, question, inputs, outputs }
}
