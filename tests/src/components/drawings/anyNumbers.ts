import fc from 'fast-check'
import { expect } from 'vitest'
import { findCalculator, runCalculator, showInput } from '../../../../shared/calculators'
import type { CalculatorInput } from '../../../../shared/calculators/calculator'
import type { UnitSystem } from '../../../../shared/contracts/exercises'
import type {
  CalculatorSheetSize,
  DrawCalculatorSheet,
} from '../../../../src/components/drawings/calculatorSheet'
import { findFaults } from './labelFaults'

const sizes: CalculatorSheetSize[] = ['wide', 'narrow']
const systems: UnitSystem[] = ['metric', 'imperial']
/** Steps of a scale on which ten times as much is always as far. */
const STEPS = 1000

function textOf(input: CalculatorInput, step: number, system: UnitSystem): string {
  if (input.quantity === 'choice')
    return input.choices[step % input.choices.length]?.value ?? input.initial[system]
  if (input.optional && step % 3 === 0) return ''
  const least = Math.max(input.min, input.max / 100_000)
  const value = step < 20 ? input.min : least * (input.max / least) ** (step / STEPS)
  return showInput(input, value, system)
}

/**
 * Draws a calculator for numbers spread evenly over everything that its inputs take, with every output asked in turn, and
 * expects that no label touches another or leaves the sheet. Returns how many sheets were drawn.
 */
export function expectLabelsApart(id: string, draw: DrawCalculatorSheet, runs = 400): number {
  const calculator = findCalculator(id)
  if (!calculator) throw new Error(`No calculator ${id}`)
  const names = [undefined, ...calculator.outputs.map(({ name }) => name)]
  const step = fc.integer({ min: 0, max: STEPS })
  let drawn = 0
  fc.assert(
    fc.property(
      fc.array(step, { minLength: calculator.inputs.length, maxLength: calculator.inputs.length }),
      fc.constantFrom(...sizes),
      fc.constantFrom(...systems),
      fc.constantFrom(...names),
      (steps, size, system, asked) => {
        const texts = Object.fromEntries(
          calculator.inputs.map((input, at) => [input.name, textOf(input, steps[at] ?? 0, system)]),
        )
        const run = runCalculator(calculator, texts, system)
        if (!run.ok) return
        const sheet = draw({ size, system, values: run.values, outputs: run.outputs, asked })
        drawn += 1
        expect(sheet && findFaults(sheet.drawing)).toEqual([])
        expect(JSON.stringify([sheet?.drawing.marks, sheet?.words])).not.toMatch(
          /NaN|Infinity|undefined|null/,
        )
      },
    ),
    { numRuns: runs },
  )
  return drawn
}
