import type { NumberQuestion, UnitSystem } from '../contracts/exercises'
import { formatQuantity } from '../units/format'
import { parseQuantity } from '../units/parse'
import { findUnit, siteUnit, unitIn } from '../units/unit'
import { notRight, unread, type QuestionGrader } from './grader'
import { isWithin } from './tolerance'

const readRight = ({ answer, quantity }: NumberQuestion) =>
  parseQuantity(answer, quantity, { system: 'metric' })

/** The unit a bare number takes: the one of the right answer, or its counterpart in the other system. */
function answerUnit(definition: NumberQuestion, system: UnitSystem): string {
  const right = readRight(definition)
  const site = siteUnit(definition.quantity, system)
  if (!right.ok || site === '') return site
  const unit = unitIn(right.unit, system)
  return unit === 'ft in' || findUnit(definition.quantity, unit) === undefined ? site : unit
}

/** A number with its unit, right within a tolerance; either system's units will do. */
export const numberEntry: QuestionGrader<NumberQuestion> = {
  kind: 'number',
  gradeAnswer(definition, answer) {
    if (!('value' in answer)) return unread('Write a number.')
    const { units: system } = answer
    const defaultUnit = answerUnit(definition, system)
    const read = parseQuantity(answer.value, definition.quantity, { system, defaultUnit })
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
  toLearner: (definition) => ({
    quantity: definition.quantity,
    unit: {
      metric: answerUnit(definition, 'metric'),
      imperial: answerUnit(definition, 'imperial'),
    },
  }),
  showAnswer: (definition, system: UnitSystem) => {
    const right = readRight(definition)
    const unit = answerUnit(definition, system)
    return right.ok ? formatQuantity(right.value, definition.quantity, system, { unit }) : ''
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
