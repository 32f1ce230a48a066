import { describe, expect, it } from 'vitest'
import {
  convertText,
  fieldUnit,
  findCalculator,
  showInput,
} from '../../../shared/calculators/index'
import type { CalculatorInput } from '../../../shared/calculators/calculator'

function inputOf(id: string, name: string): CalculatorInput {
  const input = findCalculator(id)?.inputs.find((one) => one.name === name)
  if (!input) throw new Error(`No ${name}`)
  return input
}

describe('fieldUnit', () => {
  it.each([
    ['slab', 'length', 'mm', 'in'],
    ['slab', 'fall', 'mm/m', 'in/ft'],
    ['slab', 'waste', '%', '%'],
    ['slab', 'bagYield', 'L', 'ft³'],
    ['slab', 'bag', '', ''],
    ['mix', 'waterAdded', 'L', 'qt'],
    ['pitch', 'degrees', '°', '°'],
  ])('%s %s: %s or %s', (id, name, metric, imperial) => {
    expect([
      fieldUnit(inputOf(id, name), 'metric'),
      fieldUnit(inputOf(id, name), 'imperial'),
    ]).toEqual([metric, imperial])
  })
})

describe('convertText', () => {
  it.each([
    ['slab', 'length', '2600', 'metric', `8' 6-3/8"`],
    ['slab', 'length', '2.6 m', 'metric', `8' 6-3/8"`],
    ['slab', 'thickness', '4', 'imperial', '102 mm'],
    ['slab', 'fall', '1/8', 'imperial', '10 mm/m'],
    ['slab', 'bag', '25 kg', 'metric', '25 kg'],
    ['slab', 'length', 'long', 'metric', 'long'],
    ['slab', 'length', '', 'metric', ''],
  ] as const)('%s %s: %s of %s is %s', (id, name, text, from, expected) => {
    const to = from === 'metric' ? 'imperial' : 'metric'
    expect(convertText(inputOf(id, name), text, from, to).replaceAll(/\s/g, ' ')).toBe(expected)
  })

  it('leaves what was typed alone where nothing changes', () => {
    expect(convertText(inputOf('slab', 'length'), ' 2,60 m ', 'metric', 'metric')).toBe(' 2,60 m ')
  })

  it('shows a choice by the value that reads back', () => {
    expect(showInput(inputOf('slab', 'flatBase'), 'no', 'metric')).toBe('no')
  })
})
