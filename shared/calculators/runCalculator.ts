import type { Calculator, Step, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { readInputs, type InputErrors } from './readInputs'

/** A worked calculator, or what must be put right first; `values` holds what could be read. */
export type CalculatorRun =
  | { ok: true; values: Values; outputs: Values; steps: Step[] }
  | { ok: false; values: Values; errors: InputErrors }

/** Reads the texts, computes and writes the steps; never throws for what a person typed. */
export function runCalculator(
  calculator: Calculator,
  texts: Record<string, string | undefined>,
  system: UnitSystem,
): CalculatorRun {
  const read = readInputs(calculator, texts, system)
  if (!read.ok) return { ok: false, values: read.values, errors: read.errors }
  return computeValues(calculator, read.values, system)
}

/** Computes and writes the steps for values that are read already. */
export function computeValues(
  calculator: Calculator,
  values: Values,
  system: UnitSystem,
): CalculatorRun {
  try {
    const outputs = calculator.compute(values, system)
    return { ok: true, values, outputs, steps: calculator.steps(values, outputs, system) }
  } catch (error) {
    if (!(error instanceof CalculatorInputError)) throw error
    return { ok: false, values, errors: { [error.input]: error.message } }
  }
}

/**
 * The steps up to the one that gives the asked output; its result is a question mark and its numbers stop
 * before what they come to. What follows would tell the answer.
 */
export function hideAnswer(steps: Step[], asked: string): Step[] {
  const index = steps.findIndex((step) => step.output === asked)
  if (index < 0) return steps
  return steps
    .slice(0, index + 1)
    .map((step, at) =>
      at === index ? { ...step, numbers: step.numbers.split(' = ')[0] ?? '', result: '?' } : step,
    )
}
