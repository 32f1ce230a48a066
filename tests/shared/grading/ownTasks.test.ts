import { describe, expect, it } from 'vitest'
import { performOwnTask, warmUpOwnTasks } from '../../../shared/grading/ownTasks'
import { barrows, barrowsWithFormula } from '../ownCalculators/definitions'

describe('performOwnTask', () => {
  it('works a calculator out for what was typed', () => {
    const [{ inputs } = { inputs: {} }] = barrows().examples
    const given = { definition: barrows(), texts: inputs, system: 'metric' as const }
    expect(performOwnTask({ name: 'run', given })).toMatchObject({
      ok: true,
      outputs: { barrows: 15 },
    })
  })

  it('checks a definition', () => {
    const definition = barrowsWithFormula('weight', 'loose')
    expect(performOwnTask({ name: 'check', given: { definition } })).toMatchObject({
      problems: [{ path: 'outputs.3.expression' }],
    })
  })

  it('can be warmed up, with a calculator that has no problems itself', () => {
    expect(warmUpOwnTasks().filter(({ blocking }) => blocking)).toEqual([])
  })

  it('gives only what can be sent from a worker', () => {
    const [{ inputs } = { inputs: {} }] = barrows().examples
    const given = { definition: barrows(), texts: inputs, system: 'imperial' as const }
    const found = performOwnTask({ name: 'run', given })
    expect(structuredClone(found)).toEqual(found)
  })
})
