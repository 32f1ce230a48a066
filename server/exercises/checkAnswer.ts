import type { Answer, Exercise } from '../../shared/contracts/exercises'
import { faceOf } from '../../shared/grading'
import { invalid } from '../errors'

const namesIn = (exercise: Exercise): string[] =>
  exercise.kind === 'quiz'
    ? exercise.questions.map(({ key }) => key)
    : (faceOf(exercise.definition)?.inputs ?? []).map(({ name }) => name)

/** 400 for an answer of the other kind of exercise, or to something that the exercise does not ask. */
export function checkAnswer(exercise: Exercise, answer: Answer) {
  if (answer.kind !== exercise.kind) {
    throw invalid([{ field: 'kind', message: `This stop takes an answer to a ${exercise.kind}.` }])
  }
  const known = new Set(namesIn(exercise))
  const [place, given] =
    answer.kind === 'quiz' ? ['answers', answer.answers] : ['inputs', answer.inputs]
  const unknown = Object.keys(given).filter((name) => !known.has(name))
  if (unknown.length === 0) return
  throw invalid(
    unknown.slice(0, known.size + 1).map((name) => ({
      field: `${place}.${name}`,
      message: 'This stop asks for nothing of this name. Load it again.',
    })),
  )
}
