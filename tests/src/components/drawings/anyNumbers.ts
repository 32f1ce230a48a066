import fc from 'fast-check'
import { expect } from 'vitest'
import { findCalculator, runCalculator, showInput } from '../../../../shared/calculators'
import type { CalculatorInput, QuantityInput } from '../../../../shared/calculators/calculator'
import type { UnitSystem } from '../../../../shared/contracts/exercises'
import type {
  CalculatorSheetSize,
  DrawCalculatorSheet,
} from '../../../../src/components/drawings/calculatorSheet'
import { findFaults } from './labelFaults'

const sizes: CalculatorSheetSize[] = ['wide', 'narrow']
const systems: UnitSystem[] = ['metric', 'imperial']
/** Steps of a scale on which ten times as much is always as far. */
const STEPS = 10_000
/** Any step of that scale, every one as often as another. */
export const anyStep = fc.noBias(fc.integer({ min: 0, max: STEPS }))

/** The number at a step between the bounds of an input: a fiftieth of the steps is each of its ends; counts are whole. */
export function numberAt({ min, max, quantity }: QuantityInput, step: number): number {
  const least = Math.max(min, max / 100_000)
  if (step < STEPS * 0.02) return min
  if (step > STEPS * 0.98) return max
  const value = least * (max / least) ** (step / STEPS)
  return quantity === 'count' ? Math.round(value) : value
}

function textOf(input: CalculatorInput, step: number, system: UnitSystem): string {
  if (input.quantity === 'choice')
    return input.choices[step % input.choices.length]?.value ?? input.initial[system]
  if (input.optional && step % 3 === 0) return ''
  return showInput(input, numberAt(input, step), system)
}

/**
 * Draws a calculator for numbers spread evenly over everything that its inputs take, with every output asked in turn, and
 * expects that no label touches another or leaves the sheet. Returns how many sheets were drawn.
 */
export function expectLabelsApart(id: string, draw: DrawCalculatorSheet, runs = 400): number {
  const calculator = findCalculator(id)
  if (!calculator) throw new Error(`No calculator ${id}`)
  const names = [undefined, ...calculator.outputs.map(({ name }) => name)]
  let drawn = 0
  fc.assert(
    fc.property(
      fc.array(anyStep, {
        minLength: calculator.inputs.length,
        maxLength: calculator.inputs.length,
      }),
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
