import { findCalculator } from '../calculators/index'
import type { Exercise } from '../contracts/exercises'
import { findCalculatorProblems } from './calculatorProblems'
import type { ExerciseProblem } from './grader'
import { findQuizProblems } from './quizExercise'

/** A prompt that is empty, before all else. */
export function withPrompt({ prompt }: Exercise, found: ExerciseProblem[]): ExerciseProblem[] {
  if (prompt.trim() !== '') return found
  const message = 'Nothing is asked: the prompt is empty.'
  return [{ path: 'prompt', message, blocking: true }, ...found]
}

/** What keeps an exercise from being used that is a quiz or made of a built-in calculator; needs no reader of formulas. */
export const findBuiltInProblems = (exercise: Exercise): ExerciseProblem[] =>
  withPrompt(
    exercise,
    exercise.kind === 'quiz'
      ? findQuizProblems(exercise)
      : findCalculatorProblems(exercise, findCalculator(exercise.definition.calculator)),
  )
