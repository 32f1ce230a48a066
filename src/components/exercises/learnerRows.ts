import type { Calculator } from '../../../shared/calculators/calculator'
import { showOutput } from '../../../shared/calculators/fields'
import { runCalculator, type CalculatorRun } from '../../../shared/calculators/runCalculator'
import type { CalculatorDefinition, UnitSystem } from '../../../shared/contracts/exercises'
import { drawInputs } from '../../../shared/grading/drawInputs'
import { findNearTie } from '../../../shared/grading/nearTie'
import { matches, namedSlips } from '../../../shared/grading/slips'

/** What one learner gets at a stop, the right answer, and what the named slips would give. */
export interface LearnerRow {
  number: number
  texts: Record<string, string>
  /** What is drawn; null where nothing could be worked out. */
  worked: Pick<Extract<CalculatorRun, { ok: true }>, 'values' | 'outputs'> | null
  right: string
  /** The input that decides the answer by a hair, or empty. */
  tie: string
  slips: { id: string; title: string; text: string }[]
  error: string
}
/** Which learners of which stop. */
export interface LearnersAsked {
  definition: CalculatorDefinition
  first: number
  count: number
  system: UnitSystem
}

function workRow(calculator: Calculator, asked: LearnersAsked, number: number): LearnerRow {
  const { definition, system } = asked
  const texts = drawInputs(definition, calculator, number, system)
  const run = runCalculator(calculator, texts, system)
  const nothing = { number, texts, worked: null, right: '', tie: '', slips: [], error: '' }
  const output = calculator.outputs.find(({ name }) => name === definition.asked)
  if (!output) return nothing
  if (!run.ok) return { ...nothing, error: Object.values(run.errors)[0] ?? '' }
  const { values, outputs } = run
  const right = outputs[output.name]
  const slips = namedSlips(calculator, definition).flatMap(({ id, title, wrong }) => {
    const value = wrong(values, outputs, system)
    if (value === undefined || right === undefined) return []
    if (matches(value, right, definition)) return []
    return [{ id, title, text: showOutput(output, value, system) }]
  })
  const edge = findNearTie(calculator, values, output.name, system)
  return {
    ...nothing,
    worked: { values, outputs },
    right: showOutput(output, right, system),
    tie: calculator.inputs.find(({ name }) => name === edge)?.label ?? '',
    slips,
  }
}

/** Some learners of a stop, one after the other. */
export const workLearners = (calculator: Calculator, asked: LearnersAsked): LearnerRow[] =>
  Array.from({ length: asked.count }, (_, index) => workRow(calculator, asked, asked.first + index))
