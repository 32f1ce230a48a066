import type { CalculatorRun } from '../calculators/index'
import { runCalculator } from '../calculators/index'
import type { Answer, Exercise, UnitSystem, Verdict } from '../contracts/exercises'
import type { OwnCalculatorDefinition, OwnCheck } from '../contracts/ownCalculators'
import { buildOwnCalculator, checkOwnCalculator, type BuildableCalculator } from '../ownCalculators'
import type { ExerciseProblem } from './grader'
import { findExerciseProblems, gradeExercise, shownAnswer } from './index'

/** What is done with own calculators aside, in a worker of the server or of the browser; each a question and its answer. */
export interface OwnTasks {
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
  /** Looks for what keeps an exercise from being used. */
  problems: { given: { exercise: Exercise }; found: ExerciseProblem[] }
  grade: { given: { exercise: Exercise; answer: Answer; seed: number }; found: Verdict }
  show: {
    given: { exercise: Exercise; seed: number; answer: Answer | null }
    found: Record<UnitSystem, string>
  }
}
export type OwnTaskName = keyof OwnTasks
/** A task as it is sent to a worker. */
export type OwnTask = {
  [Name in OwnTaskName]: { name: Name; given: OwnTasks[Name]['given'] }
}[OwnTaskName]

/** Does one task; a worker does nothing else. */
export function performOwnTask(task: OwnTask): OwnTasks[OwnTaskName]['found'] {
  switch (task.name) {
    case 'run': {
      const { definition, texts, system } = task.given
      return runCalculator(buildOwnCalculator(definition, anySource), texts, system)
    }
    case 'check':
      return checkOwnCalculator(task.given.definition)
    case 'problems':
      return findExerciseProblems(task.given.exercise)
    case 'grade':
      return gradeExercise(task.given.exercise, task.given.answer, task.given.seed)
    case 'show':
      return shownAnswer(task.given.exercise, task.given.seed, task.given.answer)
  }
}

const anySource = { key: 'own', version: 1 }
