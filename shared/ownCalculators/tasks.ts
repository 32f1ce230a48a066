import { runCalculator, type CalculatorRun } from '../calculators/runCalculator'
import type { OwnCalculatorDefinition, OwnCheck } from '../contracts/ownCalculators'
import type { UnitSystem } from '../contracts/unitSystem'
import { buildOwnCalculator, type BuildableCalculator } from './build'
import { checkOwnCalculator } from './check'

/** What a worker does with formulas alone, in the browser as on the server; each a question and its answer. */
export interface FormulaTasks {
  /** Works a calculator out for what a person typed. */
  run: {
    given: {
      definition: BuildableCalculator
      texts: Record<string, string | undefined>
      system: UnitSystem
    }
    found: CalculatorRun
  }
  /** Checks a definition before it can be attached. */
  check: { given: { definition: OwnCalculatorDefinition }; found: OwnCheck }
}
export type FormulaTaskName = keyof FormulaTasks
/** A task as it is sent to a worker. */
export type FormulaTask = {
  [Name in FormulaTaskName]: { name: Name; given: FormulaTasks[Name]['given'] }
}[FormulaTaskName]

const anySource = { key: 'own', version: 1 }

/** Does one task. */
export function performFormulaTask(task: FormulaTask): FormulaTasks[FormulaTaskName]['found'] {
  if (task.name === 'check') return checkOwnCalculator(task.given.definition)
  const { definition, texts, system } = task.given
  return runCalculator(buildOwnCalculator(definition, anySource), texts, system)
}

/** A small sound calculator to warm a worker up with, so that the first real task is not held up. */
export const warmUpDefinition: OwnCalculatorDefinition = {
  title: 'Across',
  question: 'How long is it across?',
  help: '',
  inputs: [
    {
      name: 'side',
      label: 'Side',
      quantity: 'length',
      help: '',
      min: 0.1,
      max: 100,
      initial: { metric: '', imperial: '' },
    },
  ],
  outputs: [
    { name: 'across', label: 'Across', quantity: 'length', expression: 'sqrt(2 * side^2) + 0 m' },
    { name: 'boards', label: 'Boards', quantity: 'count', expression: 'ceil(across / (140 mm))' },
  ],
  cautions: [],
  sources: [{ title: 'Geometry', kind: 'published' }],
  examples: [
    { inputs: { side: '3 m' }, expected: { across: '4.243 m', boards: '31' } },
    { inputs: { side: '1 m' }, expected: { across: '1.414 m', boards: '11' } },
  ],
  slips: [],
}
