import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope, ref } from 'vue'
import type { Exercise, LearnerExercise, StopState } from '../../../shared/contracts/exercises'
import { toLearnerExercise } from '../../../shared/grading'
import { barrows } from '../../shared/ownCalculators/definitions'
import { FakeWorker } from './fakeWorker'
import { patience } from '../../support/patience'

type Worked = Extract<LearnerExercise, { kind: 'calculator' }>

const exercise: Exercise = {
  kind: 'calculator',
  prompt: 'How much loose stone?',
  tries: 3,
  definition: {
    calculator: 'own:barrows',
    own: { key: 'barrows', version: 1, definition: barrows() },
    inputs: {
      length: { mode: 'fixed', value: '12 m' },
      width: { mode: 'fixed', value: '400 mm' },
      depth: { mode: 'own', value: '150 mm' },
    },
    asked: 'loose',
    tolerance: { kind: 'percent', value: 1 },
    hints: [],
    slips: [],
  },
}

beforeEach(() => {
  FakeWorker.reset()
  vi.stubGlobal('Worker', FakeWorker)
  vi.resetModules()
  localStorage.clear()
  setActivePinia(createPinia())
})

async function setUp() {
  const { useWorkedExercise } = await import('../../../src/composables/useWorkedExercise')
  const learner = toLearnerExercise(exercise, 1, 0, false) as Worked
  const state = ref<StopState>({
    stopKey: 'stone',
    solved: false,
    triesUsed: 0,
    exercise: learner,
    lastAnswer: null,
    lastVerdict: null,
    shownAnswer: null,
  })
  const worked = effectScope().run(() => useWorkedExercise(state, ref(learner)))
  const { useExercisesStore: useFreshStore } = await import('../../../src/stores/exercises')
  return { ...worked!, state, exercises: useFreshStore() }
}

describe('useWorkedExercise with an own calculator', () => {
  it('shows its fields at once and its steps when the worker has them, up to what is asked', async () => {
    const { calculator, asked, given, texts, exercises } = await setUp()
    expect(calculator.value?.title).toBe('Barrows of stone')
    expect(asked.value?.label).toBe('Loose stone')
    expect(given.value).toContain('length')
    expect(texts.value['depth']).toBe('150')
    await vi.waitFor(() => expect(exercises.worked).not.toBeNull(), patience)
    expect(exercises.worked).toMatchObject({ calculator: 'own:barrows', asked: 'loose' })
    expect(exercises.worked?.steps.map(({ output, result }) => [output, result])).toEqual([
      ['trench', '0.72\u00a0m³'],
      ['loose', '?'],
    ])
  })

  it('says at the field what is wrong with a number of one’s own', async () => {
    const { texts, errors } = await setUp()
    texts.value = { ...texts.value, depth: '9 m' }
    await vi.waitFor(() => expect(errors.value['depth']).toContain('out of range'), patience)
    texts.value = { ...texts.value, depth: '200' }
    await vi.waitFor(() => expect(errors.value).toEqual({}), patience)
  })
})
