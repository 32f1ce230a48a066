import type { Calculator, Values } from '../calculators/calculator'
import { computeValues } from '../calculators/runCalculator'
import type { UnitSystem } from '../contracts/exercises'

/** What a bag or a level base is off by anyhow, and what a tape is: 0.5 and 0.05 %. Common practice, no source. */
const NUDGES = [0.995, 0.9995, 1.0005, 1.005]

/**
 * The input that decides a rounded or worded answer by a hair: nudged by half a per cent, another whole number
 * or word comes out. Undefined where the answer is a plain number or holds.
 */
export function findNearTie(
  calculator: Calculator,
  values: Values,
  asked: string,
  system: UnitSystem,
): string | undefined {
  const output = calculator.outputs.find(({ name }) => name === asked)
  if (output?.quantity !== 'count' && output?.quantity !== 'choice') return undefined
  const answerTo = (given: Values) => {
    const run = computeValues(calculator, given, system)
    return run.ok ? run.outputs[asked] : undefined
  }
  const right = answerTo(values)
  if (right === undefined) return undefined
  return calculator.inputs.find(({ name, quantity }) => {
    const value = values[name]
    if (typeof value !== 'number' || quantity === 'count') return false
    return NUDGES.some((factor) => {
      const other = answerTo({ ...values, [name]: value * factor })
      return other !== undefined && other !== right
    })
  })?.name
}
