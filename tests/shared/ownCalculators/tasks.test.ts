import { describe, expect, it } from 'vitest'
import { ownCheckSchema } from '../../../shared/contracts/ownCalculators'
import { endedCheck, endedRun } from '../../../shared/ownCalculators/ended'
import { performFormulaTask, warmUpDefinition } from '../../../shared/ownCalculators/tasks'
import { barrows } from './definitions'

describe('performFormulaTask', () => {
  it('checks and works the calculator that warms a worker up, which has no problems', () => {
    expect(
      performFormulaTask({ name: 'check', given: { definition: warmUpDefinition } }),
    ).toMatchObject({ problems: [] })
    const given = {
      definition: warmUpDefinition,
      texts: { side: '3 m' },
      system: 'metric' as const,
    }
    expect(performFormulaTask({ name: 'run', given })).toMatchObject({ outputs: { boards: 31 } })
  })
})

describe('a task that was ended', () => {
  it('says so where a person looks: at the first input, or in the check', () => {
    expect(endedRun(barrows(), 'Too long.')).toEqual({
      ok: false,
      values: {},
      errors: { length: 'Too long.' },
    })
    expect(endedRun({ inputs: [] }, 'Too long.')).toMatchObject({ errors: { answer: 'Too long.' } })
    expect(ownCheckSchema.parse(endedCheck('Too long.')).problems).toMatchObject([
      { message: 'Too long.' },
    ])
  })
})
