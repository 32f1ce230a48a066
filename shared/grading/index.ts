import type { Answer, Exercise, LearnerExercise, UnitSystem, Verdict } from '../contracts/exercises'
import type {
  OwnCalculatorDefinition,
  OwnCalculatorSheet,
  OwnSnapshot,
} from '../contracts/ownCalculators'
import { checkOwnCalculator } from '../ownCalculators'
import { findBuiltInProblems, withPrompt } from './builtInProblems'
import { calculatorOf, faceOf } from './calculatorOf'
import { gradeCalculator, showCalculatorAnswer } from './calculatorExercise'
import { findCalculatorProblems } from './calculatorProblems'
import { drawInputs } from './drawInputs'
import type { ExerciseProblem } from './grader'
import { toLearnerQuestion } from './questions'
import { gradeQuiz, showQuizAnswer } from './quizExercise'
import { unreadVerdict } from './verdict'

export type { ExerciseProblem } from './grader'
export { calculatorOf, drawInputs, faceOf }

/**
 * An exercise as one learner sees it: own numbers of their seed, the hints they have earned, no right answer.
 * Numbers are in units of `system`; a client that changes units converts them with `convertText`.
 */
export function toLearnerExercise(
  exercise: Exercise,
  seed: number,
  triesUsed: number,
  solved: boolean,
  system: UnitSystem = 'metric',
): LearnerExercise {
  const { prompt, tries } = exercise
  if (exercise.kind === 'quiz') {
    const { kind, passMark, questions } = exercise
    const shown = questions.map((question) => toLearnerQuestion(question, seed))
    return { kind, prompt, tries, passMark, questions: shown }
  }
  const { calculator: id, own, asked, hints, inputs } = exercise.definition
  const calculator = faceOf(exercise.definition)
  const texts = calculator ? drawInputs(exercise.definition, calculator, seed, system) : {}
  const given = Object.entries(texts).map(([name, value]) => {
    const mode = inputs[name]?.mode === 'own' ? ('own' as const) : ('given' as const)
    return [name, { mode, value }]
  })
  return {
    kind: exercise.kind,
    prompt,
    tries,
    calculator: id,
    ...(own ? { own: { ...own, definition: withoutAnswers(own.definition) } } : {}),
    asked,
    inputs: Object.fromEntries(given) as Record<string, { mode: 'given' | 'own'; value: string }>,
    hints: solved ? hints : hints.slice(0, triesUsed),
  }
}

/** Examples would give the answer away, and slips name what nobody did. */
const withoutAnswers = ({
  examples: _examples,
  slips: _slips,
  ...sheet
}: OwnCalculatorDefinition): OwnCalculatorSheet => sheet

/**
 * The verdict on an answer; its text never holds the right number. `unread` (with its field) costs no try.
 */
export function gradeExercise(exercise: Exercise, answer: Answer, seed: number): Verdict {
  if (exercise.kind === 'calculator' && answer.kind === 'calculator') {
    return gradeCalculator(exercise, answer, seed)
  }
  if (exercise.kind === 'quiz' && answer.kind === 'quiz') return gradeQuiz(exercise, answer)
  return unreadVerdict(
    'This answer belongs to another kind of stop. Load the lesson again.',
    'answer',
  )
}

/**
 * The right answer as text in both systems, for a stop that is solved or out of tries.
 * `answer` is the learner's last one: its own inputs decide the numbers.
 */
export function shownAnswer(
  exercise: Exercise,
  seed: number,
  answer: Answer | null,
): Record<UnitSystem, string> {
  if (exercise.kind === 'quiz') {
    return {
      metric: showQuizAnswer(exercise, 'metric'),
      imperial: showQuizAnswer(exercise, 'imperial'),
    }
  }
  const own = answer?.kind === 'calculator' ? answer.inputs : {}
  const typedIn = answer?.kind === 'calculator' ? answer.units : 'metric'
  const show = (system: UnitSystem) =>
    showCalculatorAnswer(exercise, seed, { texts: own, system: typedIn }, system)
  return { metric: show('metric'), imperial: show('imperial') }
}

/** What keeps an exercise from being issued (`blocking`), and what is worth mending; `path` says where. */
export function findExerciseProblems(exercise: Exercise): ExerciseProblem[] {
  if (exercise.kind === 'quiz' || !exercise.definition.own) return findBuiltInProblems(exercise)
  const calculator = calculatorOf(exercise.definition)
  const wrong = calculator ? findOwnProblems(exercise.definition.own) : []
  const found = wrong.length > 0 ? wrong : findCalculatorProblems(exercise, calculator)
  return withPrompt(exercise, found)
}

/** An own calculator with anything left to mend cannot be used at all. */
const findOwnProblems = ({ definition }: OwnSnapshot): ExerciseProblem[] =>
  checkOwnCalculator(definition).problems.map(({ path, message }) => ({
    path: `definition.own.definition.${path}`,
    message: `${definition.title}: ${message}`,
    blocking: true,
  }))
