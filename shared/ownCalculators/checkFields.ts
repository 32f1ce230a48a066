import { checkBounds } from '../calculators/readInputs'
import { fieldUnit } from '../calculators/fields'
import type {
  OwnCalculatorDefinition,
  OwnInput,
  OwnOutput,
  OwnProblem,
} from '../contracts/ownCalculators'
import { parseQuantity } from '../units/parse'
import { findUnit } from '../units/unit'
import { problemAt } from './problems'
import { refuseName } from './vocabulary'

const systems = ['metric', 'imperial'] as const

/** What is wrong with the words, names, units and bounds of a definition. */
export function checkFields(definition: OwnCalculatorDefinition): OwnProblem[] {
  const { inputs, outputs, sources } = definition
  return [
    ...checkWords(definition, '', { title: 'a title', question: 'the question it answers' }),
    ...(inputs.length > 0
      ? []
      : [problemAt('inputs', 'It has no input.', 'Add what a person measures.')]),
    ...(outputs.length > 0
      ? []
      : [problemAt('outputs', 'It gives no answer.', 'Add an output with its formula.')]),
    ...(sources.length > 0
      ? []
      : [
          problemAt(
            'sources',
            'It names no source.',
            'Name one, or say “common practice, no source”.',
          ),
        ]),
    ...inputs.flatMap((input, index) => checkInput(input, `inputs.${index}.`)),
    ...outputs.flatMap((output, index) => checkField(output, `outputs.${index}.`)),
    ...checkTwice(definition),
    ...checkSlips(definition),
    ...definition.cautions.flatMap((caution, index) =>
      checkWords(caution, `cautions.${index}.`, { title: 'a title', text: 'its words' }),
    ),
    ...sources.flatMap((source, index) =>
      checkWords(source, `sources.${index}.`, { title: 'a title' }),
    ),
  ]
}

/** A problem for each of these texts that is empty. */
function checkWords<T extends object>(
  thing: T,
  path: string,
  words: Partial<Record<keyof T, string>>,
): OwnProblem[] {
  return Object.entries(words).flatMap(([name, what]) =>
    String(thing[name as keyof T]).trim() === ''
      ? [problemAt(`${path}${name}`, `It lacks ${String(what)}.`, 'Write it in plain words.')]
      : [],
  )
}

function checkField(field: OwnInput | OwnOutput, path: string): OwnProblem[] {
  const problems = checkWords(field, path, { label: 'a label' })
  const refused = refuseName(field.name)
  if (refused !== undefined) {
    problems.push(problemAt(`${path}name`, refused, 'Take another name, such as stack_height.'))
  }
  for (const system of systems) {
    const unit = field.unit?.[system]
    if (unit === undefined || findUnit(field.quantity, unit)) continue
    const message = `“${unit}” is no unit for this.`
    problems.push(problemAt(`${path}unit.${system}`, message, 'Take one that measures the same.'))
  }
  return problems
}

function checkInput(input: OwnInput, path: string): OwnProblem[] {
  const problems = checkField(input, path)
  if (problems.some((problem) => problem.path.includes('.unit'))) return problems
  if (input.min >= input.max) {
    const message = 'The least is not below the most.'
    return [...problems, problemAt(`${path}min`, message, 'Give the room it may move in.')]
  }
  for (const system of systems) {
    const text = input.initial[system].trim()
    if (text === '') continue
    const options = { system, defaultUnit: fieldUnit(input, system) }
    const read = parseQuantity(text, input.quantity, options)
    const sound = read.ok ? checkBounds(input, read.value, system) : read
    if (sound.ok) continue
    problems.push(problemAt(`${path}initial.${system}`, sound.message, 'Or leave it empty.'))
  }
  return problems
}

/** Names that two things have. */
function checkTwice({ inputs, outputs }: OwnCalculatorDefinition): OwnProblem[] {
  const all = [
    ...inputs.map(({ name }, index) => ({ name, path: `inputs.${index}.name` })),
    ...outputs.map(({ name }, index) => ({ name, path: `outputs.${index}.name` })),
  ]
  return all.flatMap(({ name, path }, index) =>
    name !== '' && all.findIndex((one) => one.name === name) < index
      ? [problemAt(path, `Two things are called ${name}.`, 'Give each a name of its own.')]
      : [],
  )
}

function checkSlips({ slips, outputs }: OwnCalculatorDefinition): OwnProblem[] {
  const words = {
    title: 'a title',
    sentence: 'the sentence that names it',
    wayBack: 'the way back',
  }
  return slips.flatMap((slip, index) => {
    const path = `slips.${index}.`
    const problems = checkWords(slip, path, words)
    if (!outputs.some(({ name }) => name === slip.output)) {
      const message = 'It belongs to no output.'
      problems.push(problemAt(`${path}output`, message, 'Choose which answer it spoils.'))
    }
    if (slips.findIndex(({ id }) => id === slip.id) < index) {
      problems.push(problemAt(`${path}id`, 'Another slip has this id.', 'Give it one of its own.'))
    }
    return problems
  })
}
