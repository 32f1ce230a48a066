import { beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope, nextTick, ref } from 'vue'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import { barrows, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import type * as composable from '../../../src/composables/useCalculatorRun'
import { FakeWorker } from './fakeWorker'
import { patience } from '../../support/patience'

let useCalculatorRun: typeof composable.useCalculatorRun
beforeEach(async () => {
  FakeWorker.reset()
  vi.stubGlobal('Worker', FakeWorker)
  vi.resetModules()
  ;({ useCalculatorRun } = await import('../../../src/composables/useCalculatorRun'))
  const { fetchCalculator } = await import('../../../src/composables/fetchedCalculators')
  for (const id of ['slab', 'square', 'no-such']) await fetchCalculator(id)
})

const slabTexts = { length: '2.6 m', width: '1.1 m', thickness: '100 mm' }
const ownTexts = { length: '12 m', width: '0.4 m', depth: '150 mm', extra: '25 %', barrow: '60 L' }
const own: composable.WhichCalculator = {
  calculator: 'own:barrows',
  own: { key: 'barrows', version: 1, definition: barrows() },
}

function setUp(given: composable.WhichCalculator, typed: Record<string, string>) {
  const which = ref(given)
  const texts = ref(typed)
  const system = ref<UnitSystem>('metric')
  const scope = effectScope()
  const worked = scope.run(() =>
    useCalculatorRun(
      () => which.value,
      () => texts.value,
      () => system.value,
    ),
  )
  return { which, texts, system, scope, ...worked! }
}

describe('useCalculatorRun', () => {
  it('works a built-in calculator at once, and opens no worker', () => {
    const { run, isPending, face, texts } = setUp({ calculator: 'slab' }, slabTexts)
    expect(face.value?.title).toBe('Slab: concrete and bags')
    expect(run.value).toMatchObject({ ok: true, values: { length: 2.6 } })
    texts.value = { ...slabTexts, length: 'wide' }
    expect(run.value).toMatchObject({ ok: false, errors: { length: expect.any(String) } })
    expect(isPending.value).toBe(false)
    expect(FakeWorker.opened).toHaveLength(0)
  })

  it('works an own calculator aside, and keeps the last run until the next is there', async () => {
    const { run, isPending, face, texts, system } = setUp(own, ownTexts)
    expect(face.value?.inputs.map(({ name }) => name)).toEqual(
      barrows().inputs.map(({ name }) => name),
    )
    expect([run.value, isPending.value]).toEqual([null, true])
    await vi.waitFor(
      () => expect(run.value).toMatchObject({ ok: true, outputs: { barrows: 15 } }),
      patience,
    )
    expect(isPending.value).toBe(false)

    texts.value = { ...ownTexts, length: '3 m' }
    await nextTick()
    expect(isPending.value).toBe(true)
    expect(run.value).toMatchObject({ outputs: { barrows: 15 } })
    await vi.waitFor(() => expect(run.value).toMatchObject({ outputs: { barrows: 4 } }), patience)

    system.value = 'imperial'
    await vi.waitFor(
      () => expect(run.value?.ok && run.value.steps.at(-1)?.result).toBe('794\u00a0lb'),
      patience,
    )
  })

  it('shows only what belongs to the last texts', async () => {
    const { run, texts, isPending } = setUp(own, ownTexts)
    for (const length of ['6 m', '9 m', '3 m']) {
      texts.value = { ...ownTexts, length }
      await Promise.resolve()
    }
    await vi.waitFor(() => expect(isPending.value).toBe(false), patience)
    expect(run.value).toMatchObject({ ok: true, outputs: { barrows: 4 } })
  })

  it('says so when a formula takes too long', async () => {
    FakeWorker.behaviour = 'spins'
    const { run } = setUp(own, ownTexts)
    await vi.waitFor(
      () =>
        expect(run.value).toMatchObject({
          ok: false,
          errors: { length: 'The formula took too long to work out.' },
        }),
      patience,
    )
  })

  it('follows a change of calculator, and has nothing for one that is not there', async () => {
    const { run, which, face } = setUp(own, { ...slabTexts, ...ownTexts })
    await vi.waitFor(() => expect(run.value?.ok).toBe(true), patience)
    which.value = { calculator: 'slab' }
    expect(run.value?.ok).toBe(true)
    which.value = { calculator: 'own:barrows' }
    expect([run.value, face.value]).toEqual([null, undefined])
    const definition = barrowsWithFormula('loose', 'trench +')
    which.value = { calculator: 'own:barrows', own: { key: 'barrows', version: 2, definition } }
    await vi.waitFor(() => expect(run.value).toMatchObject({ ok: false }), patience)
  })
})
