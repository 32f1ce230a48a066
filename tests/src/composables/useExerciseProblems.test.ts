import { beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope, ref } from 'vue'
import type { Exercise } from '../../../shared/contracts/exercises'
import type { OwnSnapshot } from '../../../shared/contracts/ownCalculators'
import { barrows, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { FakeWorker } from './fakeWorker'
import { patience } from '../../support/patience'

beforeEach(() => {
  FakeWorker.reset()
  vi.stubGlobal('Worker', FakeWorker)
  vi.resetModules()
})

const build = (own: OwnSnapshot | undefined, asked: string): Exercise => ({
  kind: 'calculator',
  prompt: 'How much?',
  tries: null,
  definition: {
    calculator: own ? 'own:barrows' : 'slab',
    ...(own ? { own } : {}),
    inputs: {},
    asked,
    tolerance: { kind: 'percent', value: 1 },
    hints: [],
    slips: [],
  },
})
const ownOf = (definition = barrows()): OwnSnapshot => ({ key: 'barrows', version: 1, definition })

async function setUp(first: Exercise | null) {
  const { useExerciseProblems } = await import('../../../src/composables/useExerciseProblems')
  const exercise = ref(first)
  const problems = effectScope().run(() => useExerciseProblems(() => exercise.value))!
  const blocking = () => problems.value.filter((one) => one.blocking).map(({ path }) => path)
  return { exercise, blocking }
}

describe('useExerciseProblems', () => {
  it('judges built-in calculators at once, without a worker', async () => {
    const { exercise, blocking } = await setUp(build(undefined, 'colour'))
    expect(blocking()).toEqual(['definition.asked'])
    exercise.value = build(undefined, 'volume')
    expect(blocking()).toEqual([])
    expect(FakeWorker.opened).toHaveLength(0)
  })

  it('judges own calculators aside, and what is written now only', async () => {
    const wrong = ownOf(barrowsWithFormula('loose', 'trench * lenght'))
    const { exercise, blocking } = await setUp(build(wrong, 'loose'))
    expect(blocking()).toEqual([])
    await vi.waitFor(
      () => expect(blocking()).toEqual(['definition.own.definition.outputs.1.expression']),
      patience,
    )
    exercise.value = build(ownOf(), 'colour')
    await vi.waitFor(() => expect(blocking()).toEqual(['definition.asked']), patience)
    exercise.value = build(ownOf(), 'loose')
    await vi.waitFor(() => expect(blocking()).toEqual([]), patience)
    exercise.value = null
    expect(blocking()).toEqual([])
  })
})
