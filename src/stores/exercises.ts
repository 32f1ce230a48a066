import { defineStore } from 'pinia'
import { ref, shallowRef } from 'vue'
import type { Step, Values } from '../../shared/calculators/calculator'
import type { Answer, StopState, UnitSystem } from '../../shared/contracts/exercises'
import { fetchStop, sendAttempt } from '../api/exercises'
import { useAccountsStore } from './accounts'
import { useBuildsStore } from './builds'
import { useLessonsStore } from './lessons'

/** A calculator as far as it was worked, for the drawing and the steps beside the workbench. */
export interface WorkedCalculator {
  calculator: string
  values: Values
  outputs: Values
  steps: Step[]
  /** The output that still is a question mark. */
  asked: string | undefined
}

/** The stop at which the video waits: its exercise, the answer being typed, and the verdict. */
export const useExercisesStore = defineStore('exercises', () => {
  const accounts = useAccountsStore()
  const lessons = useLessonsStore()
  const builds = useBuildsStore()
  const state = shallowRef<StopState | null>(null)
  const worked = shallowRef<WorkedCalculator | null>(null)
  const isInFieldBook = ref(false)
  /** One key for one answer, kept until the server has taken it, so that a repeat counts once. */
  let unsent: { body: string; key: string } | null = null

  async function open(stopKey: string) {
    close()
    state.value = await fetchStop(lessons.place, stopKey, accounts.units)
    return state.value
  }

  async function answer(answer: Answer) {
    const stop = state.value
    if (!stop) return
    const body = JSON.stringify([stop.stopKey, answer])
    if (unsent?.body !== body) unsent = { body, key: crypto.randomUUID() }
    const graded = await sendAttempt(
      lessons.place,
      { stopKey: stop.stopKey, units: accounts.units },
      answer,
      unsent.key,
    )
    unsent = null
    state.value = graded.state
    if (graded.state.solved) await lessons.markSolved(stop.stopKey)
  }

  /** Puts the solved calculator's numbers into the field book of the build, as typed. */
  async function keep(calculator: string, inputs: Record<string, string>, units: UnitSystem) {
    const stop = state.value
    const atMs = lessons.lesson?.stops.find(({ key }) => key === stop?.stopKey)?.atMs ?? null
    const entry = {
      lessonKey: lessons.place.lessonKey,
      stopKey: stop?.stopKey ?? null,
      atMs,
      calculator,
      inputs,
      units,
    }
    await builds.keepEntry(lessons.place.slug, entry)
    isInFieldBook.value = true
  }
  /** The same exercise in other words, after the person changed their units. */
  async function refresh() {
    const stopKey = state.value?.stopKey
    if (stopKey) state.value = await fetchStop(lessons.place, stopKey, accounts.units)
  }
  function close() {
    state.value = null
    worked.value = null
    isInFieldBook.value = false
  }
  return { state, worked, isInFieldBook, refresh, open, answer, keep, close }
})
