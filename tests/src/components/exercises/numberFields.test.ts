import { describe, expect, it } from 'vitest'
import { slab } from '../../../../shared/calculators/slab'
import {
  inField,
  inputField,
  plainField,
  withUnit,
} from '../../../../src/components/exercises/numberFields'

const input = (name: string) => slab.inputs.find((candidate) => candidate.name === name)!

describe('inputField', () => {
  it.each([
    ['metric', '1800', 1.8],
    ['metric', '1.8 m', 1.8],
    ['imperial', `6'`, 1.8288],
    ['imperial', '12', 0.3048],
  ] as const)('reads %s %s in SI', (system, text, value) => {
    const read = inputField(input('length'), system).read(text)
    expect(read.ok && read.value).toBeCloseTo(value, 9)
  })
  it('shows the number without the unit that stands beside it', () => {
    expect(inputField(input('length'), 'metric').show(1.8)).toBe('1800')
  })
})

describe('withUnit', () => {
  it.each([
    ['metric', '300', '300 mm'],
    ['imperial', '8', '8 in'],
    ['metric', `8' 6"`, `8' 6"`],
    ['metric', 'abc', 'abc'],
  ] as const)('in %s makes %s into %s', (system, text, stored) => {
    expect(withUnit(text, input('length'), system)).toBe(stored)
  })
  it('is undone for a field that has the unit beside it', () => {
    expect(inField('300 mm', input('length'), 'metric')).toBe('300')
    expect(inField('300 mm', input('length'), 'imperial')).toBe('300 mm')
  })
})

describe('plainField', () => {
  const tries = plainField('', { min: 1, max: 20, isWhole: true })
  it.each(['', '0', '21', '2.5', 'two'])('refuses %j with the bounds', (text) => {
    const read = tries.read(text)
    expect(read.ok ? '' : read.message).toBe('Write a whole number from 1 to 20.')
  })
  it('takes both bounds', () => {
    expect([tries.read('1'), tries.read('20')].every(({ ok }) => ok)).toBe(true)
  })
})
