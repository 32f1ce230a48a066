import { computed, onScopeDispose, shallowRef, watchEffect } from 'vue'
import type { Exercise } from '../../shared/contracts/exercises'
import { findBuiltInProblems } from '../../shared/grading/builtInProblems'
import type { ExerciseProblem } from '../../shared/grading/grader'
import { judgeAside } from './ownCalculatorAside'

/** Typing pauses this long before an exercise made of an own calculator is tried out. */
const pauseMs = 300

/**
 * What keeps an exercise from being used, live. One made of an own calculator is tried out beside the page; until
 * that is done what was found before stands.
 */
export function useExerciseProblems(exercise: () => Exercise | null) {
  const foundAside = shallowRef<ExerciseProblem[]>([])
  const isOwn = (one: Exercise | null) =>
    one?.kind === 'calculator' && one.definition.own !== undefined
  let last = 0
  let pause: ReturnType<typeof setTimeout> | undefined

  watchEffect(() => {
    const one = exercise()
    const number = ++last
    clearTimeout(pause)
    if (!one || !isOwn(one)) {
      foundAside.value = []
      return
    }
    const copy = JSON.parse(JSON.stringify(one)) as Exercise
    pause = setTimeout(() => {
      void judgeAside(copy).then((found) => {
        if (number === last) foundAside.value = found
      })
    }, pauseMs)
  })
  onScopeDispose(() => {
    last++
    clearTimeout(pause)
  })

  return computed(() => {
    const one = exercise()
    if (!one) return []
    return isOwn(one) ? foundAside.value : findBuiltInProblems(one)
  })
}
