import type { SeveralQuestion } from '../contracts/exercises'
import { findChoiceProblems, showChoices } from './choices'
import { unread, type QuestionGrader } from './grader'

/** Any number of choices are right; all of them and no other must be picked. */
export const severalChoices: QuestionGrader<SeveralQuestion> = {
  kind: 'several',
  gradeAnswer({ choices }, answer) {
    if (!('choices' in answer)) return unread('Tick every choice that holds.')
    const picked = choices.filter(({ id }) => answer.choices.includes(id))
    if (picked.length === 0) return unread('Tick every choice that holds.')
    const rightIds = picked.filter(({ right }) => right).map(({ id }) => id)
    const strays = picked.length - rightIds.length
    const isComplete = rightIds.length === choices.filter(({ right }) => right).length
    const spoken = picked.filter(({ feedback }) => feedback !== '')
    return {
      right: isComplete && strays === 0,
      message: describePicks(strays, isComplete),
      feedback: Object.fromEntries(spoken.map(({ id, feedback }) => [id, feedback])),
      rightIds,
    }
  },
  toLearner: (definition, seed) => ({ choices: showChoices(definition, seed) }),
  showAnswer: ({ choices }) =>
    choices
      .filter(({ right }) => right)
      .map(({ text }) => text)
      .join('; '),
  findProblems({ choices }) {
    const problems = findChoiceProblems(choices)
    if (choices.some(({ right }) => right)) return problems
    return [{ path: 'choices', message: 'No choice is marked right.', blocking: true }, ...problems]
  },
}

function describePicks(strays: number, isComplete: boolean): string {
  if (strays === 0)
    return isComplete ? 'Those are all.' : 'What you ticked holds; something is missing.'
  return isComplete
    ? 'Something you ticked does not hold.'
    : 'Not all you ticked holds, and something is missing.'
}
