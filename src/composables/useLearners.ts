import { computed, onScopeDispose, shallowRef, watchEffect } from 'vue'
import { findCalculator } from '../../shared/calculators'
import { tookTooLong } from '../../shared/ownCalculators/ended'
import {
  workLearners,
  type LearnerRow,
  type LearnersAsked,
} from '../components/exercises/learnerRows'
import { AsideThread } from './asideThread'

const thread = new AsideThread<LearnersAsked>(
  () => new Worker(new URL('./ownLearners.worker.ts', import.meta.url), { type: 'module' }),
)

/** What stands for learners whose numbers took too long to work out. */
const ended = ({ first, count }: LearnersAsked): LearnerRow[] =>
  Array.from({ length: count }, (_, index) => ({
    number: first + index,
    texts: {},
    worked: null,
    right: '',
    tie: '',
    slips: [],
    error: tookTooLong,
  }))

/** Some learners of a stop; those of an own calculator are worked beside the page. */
export function useLearners(asked: () => LearnersAsked) {
  const aside = shallowRef<LearnerRow[]>([])
  let last = 0
  watchEffect(() => {
    const now = asked()
    const number = ++last
    if (!now.definition.own) {
      aside.value = []
      return
    }
    void thread
      .perform(now)
      .then((found) => found as LearnerRow[])
      .catch(() => ended(now))
      .then((rows) => {
        if (number === last) aside.value = rows
      })
  })
  onScopeDispose(() => last++)

  return computed(() => {
    const now = asked()
    if (now.definition.own) return aside.value
    const calculator = findCalculator(now.definition.calculator)
    return calculator ? workLearners(calculator, now) : []
  })
}
