import type { CalculatorInput } from '../calculators/calculator'
import { convertText, fieldUnit, showInput } from '../calculators/fields'
import type { CalculatorDefinition, ExerciseInput, UnitSystem } from '../contracts/exercises'
import { clean } from '../units/number'
import { parseQuantity } from '../units/parse'
import { unitIn } from '../units/unit'
import { createRandom, seedFor } from './seededRandom'

type Ranged = Extract<ExerciseInput, { mode: 'ranged' }>

/**
 * Every input's text as this learner sees it in this system; the same for the same seed on every device.
 * A ranged number lies on its step grid; what was typed in units of the other system is shown in this one.
 * Grading reads these texts too, so nobody is graded on digits that were not shown.
 */
export function drawInputs(
  definition: CalculatorDefinition,
  calculator: { inputs: CalculatorInput[] },
  seed: number,
  system: UnitSystem = 'metric',
): Record<string, string> {
  const texts: Record<string, string> = {}
  for (const input of calculator.inputs) {
    const given = definition.inputs[input.name]
    if (given === undefined) {
      if (!input.optional) texts[input.name] = textIn(input, input.initial.metric, system)
    } else if (given.mode === 'ranged') {
      const value = drawValue(given, seedFor(seed, input.name))
      texts[input.name] = showInput(input, value, system)
    } else {
      texts[input.name] = textIn(input, given.value, system)
    }
  }
  return texts
}

/** A number on the grid of a range, both ends included. */
export function drawValue({ min, max, step }: Ranged, seed: number): number {
  const places = Math.max(0, Math.floor((max - min) / step + 1e-9)) + 1
  return clean(min + Math.floor(createRandom(seed)() * places) * step)
}

/** A text as typed where its unit belongs to the system, else said in the system; a bare number is metric. */
function textIn(input: CalculatorInput, text: string, system: UnitSystem): string {
  if (input.quantity === 'choice' || text.trim() === '') return text
  if (input.isList) return convertText(input, text, 'metric', system)
  const unit = fieldUnit(input, 'metric')
  const read = parseQuantity(text, input.quantity, { system: 'metric', defaultUnit: unit })
  if (!read.ok) return text
  const isOfSystem = unitIn(read.unit, system) === read.unit
  return isOfSystem && !read.bare ? text : showInput(input, read.value, system)
}
