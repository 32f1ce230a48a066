import type { Calculator } from '../calculators/calculator'
import type { OwnCalculatorSheet } from '../contracts/ownCalculators'
import { OWN_PREFIX } from './limits'

/** What is seen of a calculator, built in or own: its words and fields, not its computation. */
export type CalculatorFace = Omit<Calculator, 'compute' | 'steps' | 'slips' | 'example'>

/** The words and fields of an own calculator; needs no reader of formulas, and so costs a page nothing. */
export const describeOwnCalculator = (
  definition: OwnCalculatorSheet,
  { key, version }: { key: string; version: number },
): CalculatorFace => ({
  id: `${OWN_PREFIX}${key}`,
  version,
  title: definition.title,
  question: definition.question,
  help: definition.help,
  inputs: definition.inputs,
  outputs: definition.outputs.map(({ expression: _expression, ...output }) => output),
  cautions: definition.cautions,
  sources: definition.sources,
})
