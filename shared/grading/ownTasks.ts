import type { Answer, Exercise, UnitSystem, Verdict } from '../contracts/exercises'
import { OWN_PREFIX } from '../contracts/ownCalculators'
import { performFormulaTask, warmUpDefinition, type FormulaTasks } from '../ownCalculators/tasks'
import type { ExerciseProblem } from './grader'
import { findExerciseProblems, gradeExercise, shownAnswer } from './index'

/** What the server's worker does with own calculators; each a question and its answer. */
export interface OwnTasks extends FormulaTasks {
  /** Looks for what keeps an exercise from being used. */
  problems: { given: { exercise: Exercise }; found: ExerciseProblem[] }
  grade: { given: { exercise: Exercise; answer: Answer; seed: number }; found: Verdict }
  show: {
    given: { exercise: Exercise; seed: number; answer: Answer | null }
    found: Record<UnitSystem, string>
  }
}
export type OwnTaskName = keyof OwnTasks
/** A task as it is sent to the worker. */
export type OwnTask = {
  [Name in OwnTaskName]: { name: Name; given: OwnTasks[Name]['given'] }
}[OwnTaskName]

/** Does one task; a worker does nothing else. */
export function performOwnTask(task: OwnTask): OwnTasks[OwnTaskName]['found'] {
  switch (task.name) {
    case 'problems':
      return findExerciseProblems(task.given.exercise)
    case 'grade':
      return gradeExercise(task.given.exercise, task.given.answer, task.given.seed)
    case 'show':
      return shownAnswer(task.given.exercise, task.given.seed, task.given.answer)
    default:
      return performFormulaTask(task)
  }
}

const warmUpRounds = 8

/** Does every task with a small calculator until it goes fast; gives what is wrong with it: nothing. */
export function warmUpOwnTasks(): ExerciseProblem[] {
  const exercise: Exercise = {
    kind: 'calculator',
    prompt: 'How long is it across?',
    tries: 1,
    definition: {
      calculator: `${OWN_PREFIX}across`,
      own: { key: 'across', version: 1, definition: warmUpDefinition },
      inputs: { side: { mode: 'ranged', min: 1, max: 9, step: 0.1 } },
      asked: 'across',
      tolerance: { kind: 'percent', value: 1 },
      hints: [],
      slips: [],
    },
  }
  const answer: Answer = { kind: 'calculator', inputs: {}, answer: '3 m', units: 'imperial' }
  const problems: ExerciseProblem[] = []
  for (let seed = 0; seed < warmUpRounds; seed++) {
    performOwnTask({ name: 'grade', given: { exercise, answer, seed } })
    performOwnTask({ name: 'show', given: { exercise, seed, answer: null } })
    performOwnTask({ name: 'check', given: { definition: warmUpDefinition } })
    problems.push(...findExerciseProblems(exercise))
  }
  return problems
}
