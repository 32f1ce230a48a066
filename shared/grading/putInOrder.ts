import type { OrderQuestion } from '../contracts/exercises'
import { unread, type ExerciseProblem, type QuestionGrader } from './grader'
import { shuffle } from './seededRandom'

/** Items to be put in the order of the definition. */
export const putInOrder: QuestionGrader<OrderQuestion> = {
  kind: 'order',
  gradeAnswer({ items }, answer) {
    const order = 'order' in answer ? answer.order : []
    const isComplete = order.length === items.length && items.every(({ id }) => order.includes(id))
    if (!isComplete) return unread('Put every line in the order, each once.')
    const placed = items.filter(({ id }, index) => order[index] === id)
    const misplaced = items.filter((item) => !placed.includes(item) && item.feedback !== '')
    const right = placed.length === items.length
    return {
      right,
      message: right
        ? 'All in their place.'
        : `${String(placed.length)} of ${String(items.length)} hold so far.`,
      feedback: Object.fromEntries(misplaced.map(({ id, feedback }) => [id, feedback])),
      rightIds: placed.map(({ id }) => id),
    }
  },
  toLearner: ({ items }, seed) => ({ items: mixUp(items, seed) }),
  showAnswer: ({ items }) => items.map(({ text }) => text).join('; '),
  findProblems({ items }) {
    const problems: ExerciseProblem[] = []
    if (new Set(items.map(({ id }) => id)).size < items.length) {
      problems.push({ path: 'items', message: 'Two lines have the same id.', blocking: true })
    }
    items.forEach(({ text }, index) => {
      const path = `items.${String(index)}`
      const twin = items.findIndex((other) => other.text.trim() === text.trim())
      if (text.trim() === '')
        problems.push({ path, message: 'This line is empty.', blocking: true })
      else if (twin < index) {
        problems.push({ path, message: 'This line says the same as another.', blocking: true })
      }
    })
    return problems
  },
}

/** An order of the seed's; where it happens to be the right one, the first line goes to the end. */
function mixUp(items: OrderQuestion['items'], seed: number) {
  const shown = shuffle(items, seed).map(({ id, text }) => ({ id, text }))
  const isRight = shown.every(({ id }, index) => items[index]?.id === id)
  return isRight ? [...shown.slice(1), ...shown.slice(0, 1)] : shown
}
