import type { Component } from 'vue'
import type { QuestionAnswer, QuestionKind } from '../../../shared/contracts/exercises'
import QuestionNumber from './QuestionNumber.vue'
import QuestionOrder from './QuestionOrder.vue'
import QuestionSeveral from './QuestionSeveral.vue'
import QuestionSingle from './QuestionSingle.vue'

/** The component of each question kind; a new kind is its component and one line here. */
export const questionComponents: Record<QuestionKind, Component> = {
  single: QuestionSingle,
  several: QuestionSeveral,
  number: QuestionNumber,
  order: QuestionOrder,
}

/** True when something was answered, so that it can be checked. */
export function isAnswered(answer: QuestionAnswer | undefined): boolean {
  if (!answer) return false
  if ('choice' in answer) return answer.choice !== ''
  if ('choices' in answer) return answer.choices.length > 0
  if ('value' in answer) return answer.value.trim() !== ''
  return answer.order.length > 0
}
