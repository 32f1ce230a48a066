import type { SingleQuestion } from '../contracts/exercises'
import type { ExerciseProblem } from './grader'
import { shuffle } from './seededRandom'

type Choice = SingleQuestion['choices'][number]

/** Choices as a learner sees them: no right marks, no feedback, in an order of the seed's unless theirs is kept. */
export const showChoices = ({ choices, keepsOrder }: SingleQuestion, seed: number) =>
  (keepsOrder ? choices : shuffle(choices, seed)).map(({ id, text, drawing }) => ({
    id,
    text,
    ...(drawing ? { drawing } : {}),
  }))

/** What any set of choices must have: ids of their own, texts of their own, and feedback worth writing. */
export function findChoiceProblems(choices: Choice[]): ExerciseProblem[] {
  const problems: ExerciseProblem[] = []
  if (new Set(choices.map(({ id }) => id)).size < choices.length) {
    problems.push({ path: 'choices', message: 'Two choices have the same id.', blocking: true })
  }
  const texts = choices.map(({ text }) => text.trim().toLowerCase())
  texts.forEach((text, index) => {
    const path = `choices.${String(index)}`
    if (text === '') problems.push({ path, message: 'This choice is empty.', blocking: true })
    else if (texts.indexOf(text) < index) {
      problems.push({ path, message: 'This choice says the same as another.', blocking: true })
    }
  })
  if (choices.some(({ right, feedback }) => !right && feedback.trim() === '')) {
    const message = 'A wrong choice does not say what it would do on site.'
    problems.push({ path: 'choices', message, blocking: false })
  }
  return problems
}
