import { beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope, nextTick, ref } from 'vue'
import { checkOwnCalculator } from '../../../shared/ownCalculators'
import { barrows, barrowsWith, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { FakeWorker } from './fakeWorker'
import { patience } from '../../support/patience'

beforeEach(() => {
  FakeWorker.reset()
  vi.stubGlobal('Worker', FakeWorker)
  vi.resetModules()
})

const opened = { definition: barrows(), check: checkOwnCalculator(barrows()) }
async function setUp(typed = barrows()) {
  const { useOwnCheck } = await import('../../../src/composables/useOwnCheck')
  const definition = ref(typed)
  const checked = effectScope().run(() => useOwnCheck(() => definition.value, opened))!
  const paths = () => checked.check.value.problems.map(({ path }) => path)
  return { definition, paths, ...checked }
}

describe('useOwnCheck', () => {
  it('stands on what the server found, and opens no worker for it', async () => {
    const { paths, sound, isPending } = await setUp()
    expect(paths()).toEqual([])
    expect(sound.value).toEqual(barrows())
    expect(isPending.value).toBe(false)
    expect(FakeWorker.opened).toHaveLength(0)
  })

  it('finds a wrong formula, and what stood before stays to be tried out', async () => {
    const { definition, paths, sound, isPending } = await setUp()
    definition.value = barrowsWithFormula('loose', 'trench * lenght')
    await nextTick()
    expect(isPending.value).toBe(true)
    await vi.waitFor(() => expect(paths()).toEqual(['outputs.1.expression']), patience)
    expect(sound.value).toEqual(barrows())
    definition.value = barrowsWithFormula('loose', 'trench * 1.3')
    await vi.waitFor(
      () => expect(sound.value?.outputs[1]?.expression).toBe('trench * 1.3'),
      patience,
    )
    expect(isPending.value).toBe(false)
  })

  it('tries out what is sound though an example does not agree', async () => {
    const { definition, paths, sound } = await setUp()
    definition.value = barrowsWith({ examples: [] })
    await vi.waitFor(() => expect(paths()).toContain('examples'), patience)
    expect(sound.value?.examples).toEqual([])
  })

  it('looks at once at what was typed before a reload', async () => {
    const { paths, sound } = await setUp(barrowsWithFormula('loose', 'trench * lenght'))
    expect(sound.value).toEqual(barrows())
    await vi.waitFor(() => expect(paths()).toEqual(['outputs.1.expression']), patience)
  })

  it('says that a formula took too long', async () => {
    FakeWorker.behaviour = 'spins'
    const { definition, check } = await setUp()
    definition.value = barrowsWithFormula('loose', 'trench * 1.3')
    await vi.waitFor(() => expect(check.value.problems[0]?.message).toContain('too long'), patience)
  })
})
