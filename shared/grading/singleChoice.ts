import type { SingleQuestion } from '../contracts/exercises'
import { findChoiceProblems, showChoices } from './choices'
import { unread, type QuestionGrader } from './grader'

/** One choice is right; the tried one alone is answered. */
export const singleChoice: QuestionGrader<SingleQuestion> = {
  kind: 'single',
  gradeAnswer({ choices }, answer) {
    if (!('choice' in answer)) return unread('Pick one of the choices.')
    const tried = choices.find(({ id }) => id === answer.choice)
    if (tried === undefined) return unread('Pick one of the choices.')
    return {
      right: tried.right,
      message: tried.right ? 'That is the one.' : 'Not that one.',
      feedback: tried.feedback === '' ? {} : { [tried.id]: tried.feedback },
      rightIds: tried.right ? [tried.id] : [],
    }
  },
  toLearner: (definition, seed) => ({ choices: showChoices(definition, seed) }),
  showAnswer: ({ choices }) => choices.find(({ right }) => right)?.text ?? '',
  findProblems({ choices }) {
    const rights = choices.filter(({ right }) => right).length
    const problems = findChoiceProblems(choices)
    if (rights === 1) return problems
    const message =
      rights === 0
        ? 'No choice is marked right.'
        : 'More than one choice is marked right; keep one.'
    return [{ path: 'choices', message, blocking: true }, ...problems]
  },
}
