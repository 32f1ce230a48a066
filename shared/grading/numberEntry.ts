import type { NumberQuestion, UnitSystem } from '../contracts/exercises'
import { formatQuantity } from '../units/format'
import { parseQuantity } from '../units/parse'
import { siteUnit } from '../units/unit'
import { notRight, unread, type QuestionGrader } from './grader'
import { isWithin } from './tolerance'

const readRight = ({ answer, quantity }: NumberQuestion) =>
  parseQuantity(answer, quantity, { system: 'metric' })

/** A number with its unit, right within a tolerance; either system's units will do. */
export const numberEntry: QuestionGrader<NumberQuestion> = {
  kind: 'number',
  gradeAnswer(definition, answer) {
    if (!('value' in answer)) return unread('Write a number.')
    const read = parseQuantity(answer.value, definition.quantity, { system: answer.units })
    if (!read.ok) return unread(read.message)
    const right = readRight(definition)
    if (right.ok && isWithin(read.value, right.value, definition.tolerance)) {
      return { right: true, message: 'That holds.', feedback: {}, rightIds: ['value'] }
    }
    const verdict = notRight('That does not fit.')
    return definition.feedback === ''
      ? verdict
      : { ...verdict, feedback: { value: definition.feedback } }
  },
  toLearner: ({ quantity }) => ({ quantity }),
  showAnswer: (definition, system: UnitSystem) => {
    const right = readRight(definition)
    return right.ok ? formatQuantity(right.value, definition.quantity, system) : ''
  },
  findProblems(definition) {
    const right = readRight(definition)
    if (!right.ok) return [{ path: 'answer', message: right.message, blocking: true }]
    const unit = siteUnit(definition.quantity, 'metric')
    if (right.bare && unit !== '' && unit !== '%') {
      const message = `“${definition.answer}” has no unit and is taken for ${unit}: write the unit.`
      return [{ path: 'answer', message, blocking: true }]
    }
    return []
  },
}
