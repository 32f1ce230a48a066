import { beforeEach, describe, expect, it, vi } from 'vitest'
import { reactive } from 'vue'
import type * as aside from '../../../src/composables/ownCalculatorAside'
import type { Exercise } from '../../../shared/contracts/exercises'
import { barrows, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { FakeWorker } from './fakeWorker'
import { patience } from '../../support/patience'

let performAside: typeof aside.performAside
let judgeAside: typeof aside.judgeAside
beforeEach(async () => {
  FakeWorker.reset()
  vi.stubGlobal('Worker', FakeWorker)
  vi.resetModules()
  ;({ performAside, judgeAside } = await import('../../../src/composables/ownCalculatorAside'))
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
    await vi.waitFor(() => expect(FakeWorker.opened[0]?.isEnded).toBe(true), patience)
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

describe('judgeAside', () => {
  const exercise: Exercise = {
    kind: 'calculator',
    prompt: 'How much?',
    tries: null,
    definition: {
      calculator: 'own:barrows',
      own: {
        key: 'barrows',
        version: 1,
        definition: barrowsWithFormula('loose', 'trench * lenght'),
      },
      inputs: {},
      asked: 'loose',
      tolerance: { kind: 'percent', value: 1 },
      hints: [],
      slips: [],
    },
  }

  it('finds what is wrong with an exercise in a worker of its own', async () => {
    await run()
    const found = await judgeAside(exercise)
    expect(found[0]).toMatchObject({ path: 'definition.own.definition.outputs.1.expression' })
    expect(FakeWorker.opened).toHaveLength(2)
  })

  it('takes being too slow for one of the reasons', async () => {
    FakeWorker.behaviour = 'spins'
    expect(await judgeAside(exercise)).toMatchObject([
      { blocking: true, message: expect.stringContaining('took too long') as string },
    ])
  })
})
