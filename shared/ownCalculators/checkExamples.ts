import { fieldUnit, showOutput } from '../calculators/fields'
import { readInputs } from '../calculators/readInputs'
import type {
  OwnCalculatorDefinition,
  OwnCheck,
  OwnExample,
  OwnOutput,
  OwnProblem,
} from '../contracts/ownCalculators'
import { parseQuantity } from '../units/parse'
import { buildOwnCalculator, toScope } from './build'
import { scaleOf, workOut, type ReadFormula } from './formulas'
import { ownCalculatorLimits } from './limits'
import { formulaProblem, problemAt } from './problems'

/** A worked example is written to three or four figures: what it says agrees within half a per cent. */
const AGREEMENT = 0.005

type Given = OwnCheck['examples'][number]
type Tried = { problems: OwnProblem[]; examples: Given[] }

/** Works every example out and compares it with what its writer says; what cannot be worked out yet is null. */
export function checkExamples(
  definition: OwnCalculatorDefinition,
  formulas: ReadFormula[],
  areFieldsSound: boolean,
): Tried {
  const nothing = Object.fromEntries(definition.outputs.map(({ name }) => [name, null]))
  const tried = definition.examples.map((example, index) =>
    areFieldsSound
      ? tryExample(definition, formulas, example, index)
      : { given: nothing, problems: [] },
  )
  return {
    examples: tried.map(({ given }) => given),
    problems: [...checkEnough(definition), ...tried.flatMap(({ problems }) => problems)],
  }
}

function checkEnough({ examples, outputs }: OwnCalculatorDefinition): OwnProblem[] {
  const problems: OwnProblem[] = []
  const different = new Set(
    examples.map(({ inputs }) => JSON.stringify(Object.entries(inputs).sort())),
  )
  const fewest = ownCalculatorLimits.fewestExamples
  if (examples.length < fewest) {
    const message = `It needs ${fewest} worked examples and has ${examples.length}.`
    problems.push(
      problemAt('examples', message, 'Work them out by hand, and write what comes out.'),
    )
  } else if (different.size < fewest) {
    const message = 'The worked examples have the same inputs.'
    problems.push(problemAt('examples', message, 'Take other numbers for one of them.'))
  }
  for (const { name, label } of outputs) {
    if (examples.some(({ expected }) => (expected[name] ?? '').trim() !== '')) continue
    const message = `No worked example says what ${label || name} must be.`
    problems.push(problemAt('examples', message, 'Write it into one of them.'))
  }
  examples.forEach(({ expected }, index) => {
    if (Object.values(expected).some((text) => text.trim() !== '')) return
    const message = `Example ${index + 1} does not say what must come out.`
    problems.push(problemAt(`examples.${index}.expected`, message, 'Work it out by hand.'))
  })
  return problems
}

function tryExample(
  definition: OwnCalculatorDefinition,
  formulas: ReadFormula[],
  example: OwnExample,
  index: number,
): { given: Given; problems: OwnProblem[] } {
  const path = `examples.${index}`
  const calculator = buildOwnCalculator(definition, { key: 'example', version: 1 })
  const read = readInputs(calculator, example.inputs, 'metric')
  const problems = [
    ...findStrangers(definition, example, path),
    ...Object.entries(read.errors).map(([name, message]) =>
      problemAt(`${path}.inputs.${name}`, message, 'Write it with its unit.'),
    ),
  ]
  const scope = toScope(definition.inputs, read.values)
  const known = new Set(scope.keys())
  for (const { index: at, error } of read.ok ? workOut(definition, formulas, scope) : []) {
    const output = definition.outputs[at]
    if (!output || !formulas[at]?.ok) continue
    const found = formulaProblem(`outputs.${at}.expression`, output.name, error)
    problems.push({ ...found, message: `In example ${index + 1}: ${found.message}` })
  }
  const given: Given = {}
  for (const output of definition.outputs) {
    const value = read.ok && !known.has(output.name) ? scope.get(output.name) : undefined
    const compared = compare(output, value, example.expected[output.name] ?? '')
    given[output.name] = compared.given
    if (compared.message === null) continue
    const wayOut = 'Find out which is wrong, the example or the formula.'
    problems.push(problemAt(`${path}.expected.${output.name}`, compared.message, wayOut))
  }
  return { given, problems }
}

/** Names in an example that the calculator does not have. */
function findStrangers(
  { inputs, outputs }: OwnCalculatorDefinition,
  example: OwnExample,
  path: string,
) {
  const has = (fields: { name: string }[], name: string) => fields.some((one) => one.name === name)
  const strange = [
    ...Object.keys(example.inputs).map((name) => [`inputs.${name}`, has(inputs, name)] as const),
    ...Object.keys(example.expected).map(
      (name) => [`expected.${name}`, has(outputs, name)] as const,
    ),
  ]
  return strange.flatMap(([place, isKnown]) =>
    isKnown
      ? []
      : [problemAt(`${path}.${place}`, 'There is nothing of this name.', 'Take it out.')],
  )
}

function compare(output: OwnOutput, scoped: number | undefined, said: string) {
  const value = scoped === undefined ? undefined : scoped / scaleOf(output.quantity)
  const shown = {
    metric: showOutput(output, value, 'metric'),
    imperial: showOutput(output, value, 'imperial'),
  }
  const give = (agrees: boolean | null) => (value === undefined ? null : { shown, agrees })
  if (said.trim() === '') return { given: give(null), message: null }
  const options = { system: 'metric', defaultUnit: fieldUnit(output, 'metric') } as const
  const read = parseQuantity(said, output.quantity, options)
  if (!read.ok) return { given: give(null), message: `${output.label}: ${read.message}` }
  if (value === undefined) return { given: null, message: null }
  const agrees = Math.abs(value - read.value) <= AGREEMENT * Math.abs(read.value) + 1e-12
  return {
    given: give(agrees),
    message: agrees ? null : `${output.label}: you say ${said.trim()}, it gives ${shown.metric}.`,
  }
}
