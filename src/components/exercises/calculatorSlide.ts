import type { CalculatorInput, QuantityInput } from '../../../shared/calculators/calculator'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import { fieldUnit } from '../../../shared/calculators/fields'
import { findUnit } from '../../../shared/units/unit'

/** Where a slider begins and ends, and how far one step of it goes, in SI. */
export interface Slide {
  min: number
  max: number
  step: number
}

/** About so many steps from end to end: fine enough to drag, coarse enough to read. */
const STEPS = 100

/** The inputs that can be slid: single numbers. */
export const slidingInputs = (inputs: readonly CalculatorInput[]): QuantityInput[] =>
  inputs.flatMap((input) => (input.quantity === 'choice' || input.isList ? [] : [input]))

/** A sixteenth, or a step of a ruler above it; elsewhere 1, 2 or 5 with noughts; the nearest below. */
function roundStep(step: number, unit: string): number {
  if (unit === 'in') return Math.max(1 / 16, 2 ** Math.floor(Math.log2(step)))
  const decade = 10 ** Math.floor(Math.log10(step))
  const figure = step / decade
  return (figure >= 5 ? 5 : figure >= 2 ? 2 : 1) * decade
}

/** A slider from half of a value to twice of it within the input's bounds, in round steps of the field's unit. */
export function slideAbout(input: QuantityInput, value: number, system: UnitSystem): Slide {
  const name = fieldUnit(input, system)
  const unit = findUnit(input.quantity, name)?.factor ?? 1
  const [from, to] = value > 0 ? [value / 2, value * 2] : [input.min, input.max]
  const [least, most] = [Math.max(input.min, from), Math.min(input.max, to)]
  const rough = roundStep(Math.max(most - least, unit / 1000) / unit / STEPS, name)
  const step = (input.quantity === 'count' ? Math.max(1, rough) : rough) * unit
  const min = Math.ceil(least / step - 1e-9) * step
  return { min, max: Math.max(min, Math.floor(most / step + 1e-9) * step), step }
}
