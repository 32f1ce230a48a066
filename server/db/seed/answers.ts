import { runCalculator, showOutput } from '../../../shared/calculators'
import type {
  Answer,
  Exercise,
  QuestionAnswer,
  QuizQuestion,
  UnitSystem,
} from '../../../shared/contracts/exercises'
import { calculatorOf as findCalculatorOf, drawInputs, shownAnswer } from '../../../shared/grading'
import type { WrongSeed } from './shapes'

type CalculatorExercise = Extract<Exercise, { kind: 'calculator' }>

/** Numbers of one's own at a stop: the same at every seeding. */
export function seedOf(...words: string[]): number {
  let hash = 2_166_136_261
  for (const sign of words.join('/')) hash = Math.imul(hash ^ sign.charCodeAt(0), 16_777_619) >>> 0
  return hash
}

function calculatorOf({ definition }: CalculatorExercise) {
  const calculator = findCalculatorOf(definition)
  if (!calculator) throw new Error(`the demo names no calculator ${definition.calculator}`)
  return calculator
}

/** The inputs of a calculator stop as a learner finds them, in their units. */
export const textsOf = (exercise: CalculatorExercise, seed: number, units: UnitSystem) =>
  drawInputs(exercise.definition, calculatorOf(exercise), seed, units)

/** A calculator worked with the texts of a stop. */
export function workedOut(exercise: CalculatorExercise, seed: number, units: UnitSystem) {
  const calculator = calculatorOf(exercise)
  const run = runCalculator(calculator, textsOf(exercise, seed, units), units)
  if (!run.ok) throw new Error(`the demo asks for the impossible: ${JSON.stringify(run.errors)}`)
  return { calculator, ...run }
}

function ownTexts(exercise: CalculatorExercise, seed: number, units: UnitSystem) {
  const texts = textsOf(exercise, seed, units)
  return Object.fromEntries(
    Object.entries(texts).filter(([name]) => exercise.definition.inputs[name]?.mode === 'own'),
  )
}

const calculatorAnswer = (
  exercise: CalculatorExercise,
  seed: number,
  units: UnitSystem,
  answer: string,
): Answer => ({ kind: 'calculator', inputs: ownTexts(exercise, seed, units), answer, units })

function rightQuestion({ kind, definition }: QuizQuestion): QuestionAnswer {
  if (kind === 'number') return { value: definition.answer, units: 'metric' }
  if (kind === 'order') return { order: definition.items.map(({ id }) => id) }
  const ids = definition.choices.filter(({ right }) => right).map(({ id }) => id)
  return kind === 'single' ? { choice: ids[0] ?? '' } : { choices: ids }
}

/** What a learner hands in who gets it right. */
export function rightAnswer(exercise: Exercise, seed: number, units: UnitSystem): Answer {
  if (exercise.kind === 'quiz') {
    const answers = exercise.questions.map((question) => [question.key, rightQuestion(question)])
    return { kind: 'quiz', answers: Object.fromEntries(answers) as Record<string, QuestionAnswer> }
  }
  const open = calculatorAnswer(exercise, seed, units, '')
  return { ...open, answer: shownAnswer(exercise, seed, open)[units] } as Answer
}

function slipText(exercise: CalculatorExercise, seed: number, units: UnitSystem, slipId: string) {
  const { calculator, values, outputs } = workedOut(exercise, seed, units)
  const { asked } = exercise.definition
  const output = calculator.outputs.find(({ name }) => name === asked)
  const slip = calculator.slips.find(({ id }) => id === slipId)
  const wrong = slip?.wrong(values, outputs, units)
  if (!output || wrong === undefined) {
    throw new Error(`the slip ${slipId} of ${calculator.id} does not happen here`)
  }
  return showOutput(output, wrong, units)
}

/** What a learner hands in who gets it wrong in this way. */
export function wrongAnswer(
  exercise: Exercise,
  seed: number,
  units: UnitSystem,
  wrong: WrongSeed,
): Answer {
  if (exercise.kind === 'quiz') {
    return { kind: 'quiz', answers: wrong as Record<string, QuestionAnswer> }
  }
  const text =
    typeof wrong === 'string'
      ? wrong
      : slipText(exercise, seed, units, (wrong as { slip: string }).slip)
  return calculatorAnswer(exercise, seed, units, text)
}
