import { describe, expect, it } from 'vitest'
import { calculators } from '../../../shared/calculators/index'
import { calculatorLoaders } from '../../../shared/calculators/loaders'

describe('calculatorLoaders', () => {
  it('fetches each calculator of the registry, and no other', async () => {
    const ids = Object.keys(calculatorLoaders)
    expect([...ids].sort()).toEqual(calculators.map(({ id }) => id).sort())
    for (const calculator of calculators) {
      expect(await calculatorLoaders[calculator.id]?.()).toBe(calculator)
    }
  })
})
