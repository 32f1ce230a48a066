import { beforeEach, describe, expect, it, vi } from 'vitest'
import { reactive } from 'vue'
import type * as thread from '../../../src/composables/formulaThread'
import { barrows, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { FakeWorker } from './fakeWorker'

let performAside: typeof thread.performAside
beforeEach(async () => {
  FakeWorker.reset()
  vi.stubGlobal('Worker', FakeWorker)
  vi.resetModules()
  ;({ performAside } = await import('../../../src/composables/formulaThread'))
})

const [{ inputs: texts } = { inputs: {} }] = barrows().examples
const run = () => performAside('run', { definition: barrows(), texts, system: 'metric' })

describe('performAside', () => {
  it('does one task after another in one worker', async () => {
    const found = await Promise.all([run(), run(), run()])
    expect(found).toMatchObject(found.map(() => ({ ok: true, outputs: { barrows: 15 } })))
    const check = await performAside('check', {
      definition: barrowsWithFormula('loose', 'trench *'),
    })
    expect(check.problems).toMatchObject([{ path: 'outputs.1.expression', column: 9 }])
    expect(FakeWorker.opened).toHaveLength(1)
  })

  it('takes what is reactive', async () => {
    const definition = reactive(barrows())
    expect((await performAside('run', { definition, texts, system: 'metric' })).ok).toBe(true)
  })

  it('ends a worker that spins, refuses its task and gives the next to a new one', async () => {
    await run()
    FakeWorker.behaviour = 'spins'
    const spun = run().catch((error: unknown) => error)
    await vi.waitFor(() => expect(FakeWorker.opened[0]?.isEnded).toBe(true))
    FakeWorker.behaviour = 'works'
    expect(await spun).toMatchObject({ message: 'the task took too long' })
    expect((await run()).ok).toBe(true)
    expect(FakeWorker.opened).toHaveLength(2)
  })

  it('refuses all that waits when there can be no worker', async () => {
    FakeWorker.behaviour = 'breaks'
    const ends = await Promise.allSettled([run(), run()])
    expect(ends.map(({ status }) => status)).toEqual(['rejected', 'rejected'])
    FakeWorker.behaviour = 'works'
    expect((await run()).ok).toBe(true)
  })
})
