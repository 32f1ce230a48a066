import type { Exercise } from '../../shared/contracts/exercises'
import type { ExerciseProblem } from '../../shared/grading'
import { tookTooLong } from '../../shared/ownCalculators/ended'
import type { FormulaTask, FormulaTaskName, FormulaTasks } from '../../shared/ownCalculators/tasks'
import { AsideThread } from './asideThread'

const formulas = new AsideThread<FormulaTask>(
  () => new Worker(new URL('./ownCalculator.worker.ts', import.meta.url), { type: 'module' }),
)
/** Apart from the other, because it brings all of the grading with it, which learners do not need. */
const exercises = new AsideThread<Exercise>(
  () => new Worker(new URL('./ownExercise.worker.ts', import.meta.url), { type: 'module' }),
)

/** Works with formulas beside the page; throws when it takes too long. */
export async function performAside<Name extends FormulaTaskName>(
  name: Name,
  given: FormulaTasks[Name]['given'],
): Promise<FormulaTasks[Name]['found']> {
  return (await formulas.perform({ name, given } as FormulaTask)) as FormulaTasks[Name]['found']
}

/** What keeps an exercise made of an own calculator from being used; taking too long is one of the reasons. */
export async function judgeAside(exercise: Exercise): Promise<ExerciseProblem[]> {
  try {
    return (await exercises.perform(exercise)) as ExerciseProblem[]
  } catch {
    const message = `${tookTooLong} Give fewer inputs as ranges, or shorten it.`
    return [{ path: 'definition.calculator', message, blocking: true }]
  }
}
