import type { Component } from 'vue'
import type { QuestionKind } from '../../../shared/contracts/exercises'
import BenchQuestionNumber from './BenchQuestionNumber.vue'
import BenchQuestionOrder from './BenchQuestionOrder.vue'
import BenchQuestionSeveral from './BenchQuestionSeveral.vue'
import BenchQuestionSingle from './BenchQuestionSingle.vue'

interface BenchQuestionKind {
  editor: Component
  label: string
}

/** The editor and name of each question kind; a new kind is its component and one line here. */
export const benchQuestionKinds: Record<QuestionKind, BenchQuestionKind> = {
  single: { editor: BenchQuestionSingle, label: 'One choice is right' },
  several: { editor: BenchQuestionSeveral, label: 'Several choices are right' },
  number: { editor: BenchQuestionNumber, label: 'A number with its unit' },
  order: { editor: BenchQuestionOrder, label: 'Put in order' },
}
