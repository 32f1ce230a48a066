import { describe, expect, it } from 'vitest'
import type { CalculatorDefinition } from '../../../../shared/contracts/exercises'
import { buildOwnCalculator } from '../../../../shared/ownCalculators'
import { workLearners } from '../../../../src/components/exercises/learnerRows'
import { barrows } from '../../../shared/ownCalculators/definitions'

const fixed = (value: string) => ({ mode: 'fixed' as const, value })
const definition: CalculatorDefinition = {
  calculator: 'own:barrows',
  own: { key: 'barrows', version: 1, definition: barrows() },
  inputs: {
    length: { mode: 'ranged', min: 3, max: 12, step: 9 },
    width: fixed('0.4 m'),
    depth: fixed('150 mm'),
    extra: fixed('25 %'),
    barrow: fixed('60 L'),
  },
  asked: 'loose',
  tolerance: { kind: 'percent', value: 1 },
  hints: [],
  slips: ['no-extra'],
}
const calculator = buildOwnCalculator(barrows(), { key: 'barrows', version: 1 })
const ask = (changed: Partial<CalculatorDefinition> = {}) =>
  workLearners(calculator, {
    definition: { ...definition, ...changed },
    first: 1,
    count: 20,
    system: 'metric',
  })

describe('learners of an own calculator', () => {
  // Worked by hand: 12 m of trench give 0.9 m³ of loose stone and 0.72 m³ without the extra; 3 m a quarter of it.
  it('each get a number of the range, the answer to it and what the slip gives', () => {
    const rows = ask()
    const long = rows.find(({ right }) => right === '0.9\u00a0m³')
    const short = rows.find(({ right }) => right === '0.225\u00a0m³')
    expect(long?.slips.map(({ text }) => text)).toEqual(['0.72\u00a0m³'])
    expect(short?.slips.map(({ text }) => text)).toEqual(['0.18\u00a0m³'])
    expect(rows.every(({ right }) => right === '0.9\u00a0m³' || right === '0.225\u00a0m³')).toBe(
      true,
    )
  })
  it('are told where a hair decides', () => {
    // Exactly 15 barrows for the long trench: half a per cent more and it is 16.
    const rows = ask({ asked: 'barrows', slips: [] })
    expect(rows.find(({ right }) => right === '15')?.tie).toBe('Length')
    expect(rows.find(({ right }) => right === '4')?.tie).toBe('')
  })
  it('say what cannot be worked out', () => {
    const [row] = ask({ inputs: { ...definition.inputs, depth: fixed('deep') } })
    expect(row).toMatchObject({ worked: null, right: '' })
    expect(row?.error).toContain('Depth')
  })
})
