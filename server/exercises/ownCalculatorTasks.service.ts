import { runCalculator, type CalculatorRun } from '../../shared/calculators'
import type { Calculator } from '../../shared/calculators/calculator'
import type { Answer, Exercise, UnitSystem, Verdict } from '../../shared/contracts/exercises'
import type {
  OwnCalculatorDefinition,
  OwnCheck,
  OwnSnapshot,
} from '../../shared/contracts/ownCalculators'
import {
  findExerciseProblems,
  gradeExercise,
  shownAnswer,
  type ExerciseProblem,
} from '../../shared/grading'
import type { OwnTaskName, OwnTasks } from '../../shared/grading/ownTasks'
import { endedCheck, endedRun, tookTooLong } from '../../shared/ownCalculators/ended'
import { unreadVerdict } from '../../shared/grading/verdict'
import { logger } from '../logger'
import { TaskEnded, TaskThread } from '../taskThread'
import { startThread } from '../workerThreads'

const memoryMb = 32

/** Formulas of instructors are worked out here and nowhere else in the process. */
const thread = new TaskThread(
  () =>
    startThread('exercises', 'ownCalculator', {
      resourceLimits: { maxOldGenerationSizeMb: memoryMb, maxYoungGenerationSizeMb: memoryMb / 4 },
    }),
  { computeMs: 50, clockMs: 1000 },
)

/** What the task gives, or `instead` when it was ended. */
async function perform<Name extends OwnTaskName>(
  name: Name,
  given: OwnTasks[Name]['given'],
  instead: (sentence: string) => OwnTasks[Name]['found'],
): Promise<OwnTasks[Name]['found']> {
  try {
    return (await thread.perform({ name, given })) as OwnTasks[Name]['found']
  } catch (error) {
    if (!(error instanceof TaskEnded)) throw error
    logger.warn({ event: 'own-calculator-ended', task: name, reason: error.reason })
    return instead(error.reason === 'time' ? tookTooLong : 'The formula took too much memory.')
  }
}

const isOwn = (exercise: Exercise) =>
  exercise.kind === 'calculator' && exercise.definition.own !== undefined

/** The verdict on an answer; own calculators are worked out aside, and one that is ended costs no try. */
export async function gradeAnswer(
  exercise: Exercise,
  answer: Answer,
  seed: number,
): Promise<Verdict> {
  if (!isOwn(exercise)) return gradeExercise(exercise, answer, seed)
  return perform('grade', { exercise, answer, seed }, (sentence) =>
    unreadVerdict(`${sentence} Tell whoever drew the lesson.`, 'answer'),
  )
}

/** The right answer in both systems, for a stop that is solved or out of tries. */
export async function showAnswer(
  exercise: Exercise,
  seed: number,
  answer: Answer | null,
): Promise<Record<UnitSystem, string>> {
  if (!isOwn(exercise)) return shownAnswer(exercise, seed, answer)
  return perform('show', { exercise, seed, answer }, () => ({ metric: '', imperial: '' }))
}

/** What keeps an exercise from being issued and what is worth mending. */
export async function judgeExercise(exercise: Exercise): Promise<ExerciseProblem[]> {
  if (!isOwn(exercise)) return findExerciseProblems(exercise)
  const path = 'definition.calculator'
  return perform('problems', { exercise }, (sentence) => [
    { path, message: `${sentence} Give fewer inputs as ranges, or shorten it.`, blocking: true },
  ])
}

/** What is wrong with a definition; it can be attached when nothing is. */
export const checkDefinition = (definition: OwnCalculatorDefinition): Promise<OwnCheck> =>
  perform('check', { definition }, endedCheck)

/** Works a calculator out for what a person typed: a built-in one here, an own one aside. */
export async function workCalculator(
  which: Calculator | OwnSnapshot,
  texts: Record<string, string>,
  system: UnitSystem,
): Promise<CalculatorRun> {
  if ('compute' in which) return runCalculator(which, texts, system)
  const { definition } = which
  return perform('run', { definition, texts, system }, (sentence) => endedRun(definition, sentence))
}
