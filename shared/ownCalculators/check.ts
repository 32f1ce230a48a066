import type { OwnCalculatorDefinition, OwnCheck, OwnProblem } from '../contracts/ownCalculators'
import { checkExamples } from './checkExamples'
import { checkFields } from './checkFields'
import { readOutputs, readSlip, type ReadFormula } from './formulas'
import { formulaProblem } from './problems'

/**
 * Checks a definition as a whole: its words and fields, every formula before anything is worked out, then
 * the worked examples. It can be attached when there are no problems.
 */
export function checkOwnCalculator(definition: OwnCalculatorDefinition): OwnCheck {
  const fields = checkFields(definition)
  const formulas = readOutputs(definition)
  const wrong = findWrongFormulas(definition, formulas)
  const areNamesSound = !fields.some(({ path }) => /^(inputs|outputs)\./.test(path))
  const tried = checkExamples(definition, formulas, areNamesSound)
  return {
    problems: [...fields, ...wrong, ...tried.problems],
    examples: tried.examples,
  }
}

function findWrongFormulas(
  definition: OwnCalculatorDefinition,
  formulas: ReadFormula[],
): OwnProblem[] {
  const inOutputs = definition.outputs.flatMap(({ name }, index) => {
    const read = formulas[index]
    if (!read || read.ok) return []
    return [formulaProblem(`outputs.${index}.expression`, name, read.error)]
  })
  const inSlips = definition.slips.flatMap((slip, index) => {
    if (!definition.outputs.some(({ name }) => name === slip.output)) return []
    const read = readSlip(slip, definition)
    return read.ok ? [] : [formulaProblem(`slips.${index}.expression`, slip.id, read.error)]
  })
  return [...inOutputs, ...inSlips]
}
