import type { Calculator, Slip, Value, Values } from '../calculators/calculator'
import type { CalculatorDefinition, UnitSystem } from '../contracts/exercises'
import { isWithin } from './tolerance'

/** Whether a value counts as this one: numbers within the tolerance of the stop, words as they are. */
export function matches(value: Value, right: Value, { tolerance }: CalculatorDefinition): boolean {
  if (typeof value === 'number' && typeof right === 'number') {
    return isWithin(value, right, tolerance)
  }
  return value === right
}

/** The named slip whose wrong value is nearest to the answer and within the tolerance; never one that gives the right value. */
export function findSlip(
  calculator: Calculator,
  definition: CalculatorDefinition,
  run: { values: Values; outputs: Values },
  value: number | string,
  system: UnitSystem,
): Slip | undefined {
  const right = run.outputs[definition.asked]
  const found = namedSlips(calculator, definition).flatMap((slip) => {
    const wrong = slip.wrong(run.values, run.outputs, system)
    if (wrong === undefined || right === undefined) return []
    if (matches(wrong, right, definition) || !matches(value, wrong, definition)) return []
    const distance = typeof wrong === 'number' ? Math.abs(Number(value) - wrong) : 0
    return [{ slip, distance }]
  })
  return found.sort((a, b) => a.distance - b.distance)[0]?.slip
}

/** The slips of the asked output that this stop names. */
export const namedSlips = (
  calculator: Calculator,
  { slips, asked }: CalculatorDefinition,
): Slip[] => calculator.slips.filter(({ id, output }) => output === asked && slips.includes(id))
