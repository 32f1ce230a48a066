import type { CalculatorRun } from '../calculators/index'
import { runCalculator } from '../calculators/index'
import type { Answer, Exercise, UnitSystem, Verdict } from '../contracts/exercises'
import {
  OWN_PREFIX,
  type OwnCalculatorDefinition,
  type OwnCheck,
} from '../contracts/ownCalculators'
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

const warmUpRounds = 8

/** Does every task with a small calculator until it goes fast, so that the first real one is not held up; gives what is wrong with it: nothing. */
export function warmUpOwnTasks(): ExerciseProblem[] {
  const own = { key: 'across', version: 1, definition: warmUpDefinition }
  const exercise: Exercise = {
    kind: 'calculator',
    prompt: 'How long is it across?',
    tries: 1,
    definition: {
      calculator: `${OWN_PREFIX}across`,
      own,
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

const warmUpDefinition: OwnCalculatorDefinition = {
  title: 'Across',
  question: 'How long is it across?',
  help: '',
  inputs: [
    {
      name: 'side',
      label: 'Side',
      quantity: 'length',
      help: '',
      min: 0.1,
      max: 100,
      initial: { metric: '', imperial: '' },
    },
  ],
  outputs: [
    { name: 'across', label: 'Across', quantity: 'length', expression: 'sqrt(2 * side^2) + 0 m' },
    { name: 'boards', label: 'Boards', quantity: 'count', expression: 'ceil(across / (140 mm))' },
  ],
  cautions: [],
  sources: [{ title: 'Geometry', kind: 'published' }],
  examples: [
    { inputs: { side: '3 m' }, expected: { across: '4.243 m', boards: '31' } },
    { inputs: { side: '1 m' }, expected: { across: '1.414 m', boards: '11' } },
  ],
  slips: [],
}

const anySource = { key: 'own', version: 1 }
