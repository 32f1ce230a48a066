import {
  CalculatorInputError,
  type Calculator,
  type Slip,
  type Value,
  type Values,
} from '../calculators/calculator'
import type { OwnCalculatorSheet, OwnSlip } from '../contracts/ownCalculators'
import { describeOwnCalculator } from './face'
import { FormulaError } from './formulaError'
import { readOutputs, readSlip, scaleOf, tryFormula, workOut, type ReadFormula } from './formulas'
import { writeSteps } from './steps'

/** A definition with its slips where they are known; a learner's has none. */
export type BuildableCalculator = OwnCalculatorSheet & { slips?: OwnSlip[] }

/**
 * Makes a calculator like any other out of an instructor's definition. Its formulas are read when it is
 * first computed; one that is wrong makes every run fail with a sentence at the first input.
 */
export function buildOwnCalculator(
  definition: BuildableCalculator,
  source: { key: string; version: number },
): Calculator {
  let read: ReadFormula[] | undefined
  const formulas = () => (read ??= readOutputs(definition))
  return {
    ...describeOwnCalculator(definition, source),
    compute: (values) => compute(definition, formulas(), values),
    steps: (values, outputs, system) =>
      writeSteps(definition, formulas(), { values, outputs, system }),
    slips: (definition.slips ?? []).map((slip) => buildSlip(slip, definition)),
    example: { inputs: {}, outputs: {} },
  }
}

/** The values of inputs or outputs as formulas take them; what was left empty counts as 0. */
export function toScope(
  fields: Pick<OwnCalculatorSheet['inputs'][number], 'name' | 'quantity'>[],
  values: Values,
): Map<string, number> {
  return new Map(
    fields.map(({ name, quantity }) => {
      const value = values[name]
      return [name, typeof value === 'number' ? value * scaleOf(quantity) : 0]
    }),
  )
}

function compute(definition: OwnCalculatorSheet, formulas: ReadFormula[], values: Values): Values {
  const scope = toScope(definition.inputs, values)
  const [stopped] = workOut(definition, formulas, scope)
  if (stopped) {
    const output = definition.outputs[stopped.index]
    throw new CalculatorInputError(
      definition.inputs[0]?.name ?? 'answer',
      `${output?.label ?? ''}: ${stopped.error.message} ${stopped.error.wayOut}`,
    )
  }
  return Object.fromEntries(
    definition.outputs.map(({ name, quantity }): [string, Value | undefined] => {
      const value = scope.get(name)
      return [name, value === undefined ? undefined : value / scaleOf(quantity)]
    }),
  )
}

function buildSlip(slip: OwnSlip, definition: OwnCalculatorSheet): Slip {
  const { id, title, output: asked, sentence, wayBack } = slip
  const quantity = definition.outputs.find(({ name }) => name === asked)?.quantity ?? 'count'
  let read: ReadFormula | undefined
  const wrong = (values: Values, outputs: Values) => {
    read ??= readSlip(slip, definition)
    if (!read.ok) return undefined
    const scope = new Map([
      ...toScope(definition.inputs, values),
      ...toScope(definition.outputs, outputs),
    ])
    const value = tryFormula(read.formula, scope)
    return value instanceof FormulaError ? undefined : value / scaleOf(quantity)
  }
  return { id, title, output: asked, wrong, sentence, wayBack }
}
