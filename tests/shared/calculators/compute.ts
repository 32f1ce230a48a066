import { findCalculator, runCalculator } from '../../../shared/calculators/index'
import type { Value } from '../../../shared/calculators/calculator'
import type { UnitSystem } from '../../../shared/contracts/exercises'

/** The outputs of a calculator for these texts; throws where an input is refused. */
export function compute(
  id: string,
  texts: Record<string, string>,
  system: UnitSystem = 'metric',
): Record<string, Value | undefined> {
  const calculator = findCalculator(id)
  if (!calculator) throw new Error(`No calculator ${id}`)
  const run = runCalculator(calculator, texts, system)
  if (!run.ok) throw new Error(JSON.stringify(run.errors))
  return run.outputs
}

/** One output as a number. */
export function computeNumber(id: string, output: string, texts: Record<string, string>): number {
  const value = compute(id, texts)[output]
  if (typeof value !== 'number') throw new Error(`${output} is no number`)
  return value
}

/** The sentence that refuses these texts, under its input's name. */
export function refuse(
  id: string,
  texts: Record<string, string>,
  system: UnitSystem = 'metric',
): Record<string, string> {
  const calculator = findCalculator(id)
  if (!calculator) throw new Error(`No calculator ${id}`)
  const run = runCalculator(calculator, texts, system)
  return run.ok ? {} : run.errors
}
