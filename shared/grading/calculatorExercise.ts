import type { Calculator, CalculatorOutput, Slip } from '../calculators/calculator'
import { convertText, fieldUnit, runCalculator, showOutput } from '../calculators/index'
import type {
  Answer,
  CalculatorDefinition,
  Exercise,
  UnitSystem,
  Verdict,
} from '../contracts/exercises'
import { parseQuantity } from '../units/parse'
import { calculatorOf } from './calculatorOf'
import { drawInputs } from './drawInputs'
import { findSlip, matches } from './slips'
import { unreadVerdict } from './verdict'

export type CalculatorExercise = Extract<Exercise, { kind: 'calculator' }>
type CalculatorAnswer = Extract<Answer, { kind: 'calculator' }>

/** The texts a learner works with: given ones drawn from the seed, own ones as they typed them. */
export function learnerTexts(
  definition: CalculatorDefinition,
  calculator: Calculator,
  seed: number,
  own: Record<string, string>,
  system: UnitSystem,
): Record<string, string> {
  const texts = drawInputs(definition, calculator, seed, system)
  for (const [name, given] of Object.entries(definition.inputs)) {
    const typed = own[name]
    if (given.mode === 'own' && typed !== undefined) texts[name] = typed
  }
  return texts
}

/** Grades an answer by the calculator itself; a wrong one is compared with the slips this stop names. */
export function gradeCalculator(
  exercise: CalculatorExercise,
  answer: CalculatorAnswer,
  seed: number,
): Verdict {
  const { definition } = exercise
  const calculator = calculatorOf(definition)
  const output = calculator?.outputs.find(({ name }) => name === definition.asked)
  if (!calculator || !output)
    return unreadVerdict('This stop asks for something that does not exist.', 'answer')
  const texts = learnerTexts(definition, calculator, seed, answer.inputs, answer.units)
  const run = runCalculator(calculator, texts, answer.units)
  if (!run.ok) {
    const [field = 'answer', message = ''] = Object.entries(run.errors)[0] ?? []
    return unreadVerdict(message, field)
  }
  const right = run.outputs[output.name]
  if (right === undefined) {
    return unreadVerdict(
      `With these inputs there is no ${output.label.toLowerCase()} to work out.`,
      'answer',
    )
  }
  const read = readAnswer(output, answer.answer, answer.units)
  if (!read.ok) return unreadVerdict(read.message, 'answer')
  const refused = refuseUnit(answer.answer, read, definition)
  if (refused) return unreadVerdict(refused, 'answer')
  const said = withUnit(answer.answer, output, answer.units)
  if (matches(read.value, right, definition)) return rightVerdict(said)
  const slip = findSlip(calculator, definition, run, read.value, answer.units)
  return slip ? slipVerdict(slip) : wrongVerdict(said)
}

type ReadAnswer =
  | { ok: true; value: number | string; unit?: string; bare?: boolean }
  | { ok: false; message: string }

/** Why an answer's unit is not taken here; undefined where it is. */
function refuseUnit(
  typed: string,
  read: { unit?: string; bare?: boolean },
  { acceptedUnits = [] }: CalculatorDefinition,
): string | undefined {
  const { unit, bare } = read
  if (acceptedUnits.length === 0 || unit === undefined || bare === true) return undefined
  // Feet and inches in one are inches, or feet.
  const forms = unit === 'ft in' ? [unit, 'in', 'ft'] : [unit]
  if (forms.some((form) => acceptedUnits.includes(form))) return undefined
  return `“${typed.trim()}” is in ${unit}. Here the answer is taken in ${acceptedUnits.join(', ')}.`
}

/** An answer as a value of the asked output; a bare number takes the unit its field shows. */
export function readAnswer(output: CalculatorOutput, text: string, system: UnitSystem): ReadAnswer {
  if (output.quantity !== 'choice') {
    return parseQuantity(text, output.quantity, { system, defaultUnit: fieldUnit(output, system) })
  }
  const wanted = text.trim().toLowerCase()
  const choice = output.choices?.find(
    ({ value, label }) => value.toLowerCase() === wanted || label.toLowerCase() === wanted,
  )
  if (choice) return { ok: true, value: choice.value }
  return { ok: false, message: 'Pick one of the choices.' }
}

/** What was typed, a bare number with the unit it was taken in: 1500 is 1500 mm. */
function withUnit(typed: string, output: CalculatorOutput, system: UnitSystem): string {
  const unit = fieldUnit(output, system)
  const isBare = unit !== '' && /^[\d\s.,+−-]+$/.test(typed)
  return isBare ? `${typed.trim()}${unit === '°' ? '' : ' '}${unit}` : typed.trim()
}

const verdict = (outcome: Verdict['outcome'], message: string, wayBack: string): Verdict => ({
  right: outcome === 'right',
  outcome,
  slip: null,
  message,
  wayBack,
  field: null,
  questions: {},
})
const rightVerdict = (said: string) =>
  verdict('right', `${said} is right.`, 'Put it in your field book, or carry on.')
const slipVerdict = (slip: Slip): Verdict => ({
  ...verdict('slip', slip.sentence, slip.wayBack),
  slip: { id: slip.id, title: slip.title },
})
const wrongVerdict = (said: string) =>
  verdict(
    'wrong',
    `${said} does not fit.`,
    'Go through the worked steps again with your own numbers.',
  )

/** The learner's own inputs, and the system whose units a bare number of theirs has. */
export interface OwnTexts {
  texts: Record<string, string>
  system: UnitSystem
}

/** The right answer as text in a person's system; empty where the inputs cannot be computed. */
export function showCalculatorAnswer(
  { definition }: CalculatorExercise,
  seed: number,
  own: OwnTexts,
  system: UnitSystem,
): string {
  const calculator = calculatorOf(definition)
  const output = calculator?.outputs.find(({ name }) => name === definition.asked)
  if (!calculator || !output) return ''
  const converted = calculator.inputs.flatMap((input) => {
    const typed = own.texts[input.name]
    return typed === undefined ? [] : [[input.name, convertText(input, typed, own.system, system)]]
  })
  const ownTexts = Object.fromEntries(converted) as Record<string, string>
  const texts = learnerTexts(definition, calculator, seed, ownTexts, system)
  const run = runCalculator(calculator, texts, system)
  return run.ok ? showOutput(output, run.outputs[output.name], system) : ''
}
