import type {
  OwnCalculatorSheet,
  OwnOutput,
  OwnQuantity,
  OwnSlip,
} from '../contracts/ownCalculators'
import { isSame, nameDimension, nameUnit, quantityDimensions, type Dimension } from './dimensions'
import { evaluateFormula, type Scope } from './evaluate'
import { readFormula, type Formula } from './formula'
import { FormulaError } from './formulaError'
import { measureFormula } from './measure'
import { explainUnknown } from './unknownNames'

/** A formula that was read and measured, or what is wrong with it. */
export type ReadFormula = { ok: true; formula: Formula } | { ok: false; error: FormulaError }

/** Per cent enter a formula as a part of one; everything else in SI. */
export const scaleOf = (quantity: OwnQuantity): number => (quantity === 'percent' ? 0.01 : 1)

type Worked = Pick<OwnCalculatorSheet, 'inputs' | 'outputs'>

/** Reads and measures the formulas of all outputs; each may use the inputs and the outputs above it. */
export const readOutputs = (definition: Worked): ReadFormula[] =>
  definition.outputs.map((output, index) => readOwn(output, definition, index))

/** Reads and measures the formula of a slip; it may use all inputs and outputs, and must fit its output. */
export function readSlip(slip: OwnSlip, definition: Worked): ReadFormula {
  const output = definition.outputs.find(({ name }) => name === slip.output)
  const quantity = output?.quantity ?? 'count'
  return readOwn({ ...slip, quantity }, definition, definition.outputs.length)
}

function readOwn(
  { expression, quantity }: Pick<OwnOutput, 'expression' | 'quantity'>,
  definition: Worked,
  index: number,
): ReadFormula {
  const known = new Map<string, Dimension>(
    [...definition.inputs, ...definition.outputs.slice(0, index)].map((one) => [
      one.name,
      quantityDimensions[one.quantity],
    ]),
  )
  try {
    const formula = readFormula(expression)
    const dimension = measureFormula(formula.root, (name, column, length) => {
      const found = known.get(name)
      if (found) return found
      throw new FormulaError(column, length, ...explainUnknown(name, definition, index))
    })
    checkFit(formula, dimension, quantity)
    return { ok: true, formula }
  } catch (error) {
    if (!(error instanceof FormulaError)) throw error
    return { ok: false, error }
  }
}

function checkFit({ tokens }: Formula, dimension: Dimension, quantity: OwnQuantity) {
  const wanted = quantityDimensions[quantity]
  if (isSame(dimension, wanted)) return
  const first = tokens[0] ?? { column: 1 }
  const last = tokens.at(-1) ?? { column: 1, length: 1 }
  const unit = nameUnit(wanted)
  throw new FormulaError(
    first.column,
    last.column + last.length - first.column,
    `This gives ${nameDimension(dimension)}, and ${nameDimension(wanted)} is asked for.`,
    unit === ''
      ? 'Divide by what you count in, such as 1 m, or ask for something else.'
      : `Look at the units: the answer must come out in ${unit}.`,
  )
}

/** An output that has no value with these numbers, or whose formula is wrong. */
export interface Unworked {
  index: number
  error: FormulaError
}

/**
 * Works out one output after another into `scope`, and returns those that cannot be. What is worked out
 * from one of them waits for it and is not among them.
 */
export function workOut(
  { outputs }: Worked,
  formulas: ReadFormula[],
  scope: Map<string, number>,
): Unworked[] {
  const missing = new Set<string>()
  return outputs.flatMap(({ name }, index) => {
    const read = formulas[index]
    const waits = read?.ok && read.formula.tokens.some(({ text }) => missing.has(text))
    const value = read?.ok && !waits ? tryFormula(read.formula, scope) : undefined
    if (typeof value === 'number') {
      scope.set(name, value)
      return []
    }
    missing.add(name)
    const error = read?.ok ? value : read?.error
    return error ? [{ index, error }] : []
  })
}

/** The value of a formula, or the error it ends in with these numbers. */
export function tryFormula(formula: Formula, scope: Scope): number | FormulaError {
  try {
    const value = evaluateFormula(formula.root, scope)
    return value === 0 ? 0 : value
  } catch (error) {
    if (error instanceof FormulaError) return error
    throw error
  }
}
