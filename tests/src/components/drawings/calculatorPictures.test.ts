import { describe, expect, it } from 'vitest'
import { calculators } from '../../../../shared/calculators'
import { drawCalculatorPicture } from '../../../../src/components/drawings/calculatorPictures'
import { drawPostFoot } from '../../../../src/components/drawings/postFoot'
import { createRoundFigure } from '../../../../src/components/drawings/figures'
import { CALCULATOR_SHEETS } from '../../../../src/components/drawings/registry'
import { findFaults } from './labelFaults'

const systems = ['metric', 'imperial'] as const

describe('small pictures', () => {
  it.each(calculators.map(({ id }) => id))('shows what %s is asked for, in both systems', (id) => {
    expect(CALCULATOR_SHEETS).toHaveProperty(id)
    for (const system of systems) {
      const drawing = drawCalculatorPicture(id, system)
      expect(drawing && findFaults(drawing)).toEqual([])
      expect(drawing?.labels.some(({ text }) => text.includes('?'))).toBe(true)
    }
  })

  it('has none for a calculator that it does not know', () => {
    expect(drawCalculatorPicture('toString', 'metric')).toBeUndefined()
  })

  it.each(systems)('keeps the labels of the post foot apart, %s', (system) => {
    for (const size of ['wide', 'narrow'] as const) {
      const drawing = drawPostFoot(size, createRoundFigure(system))
      expect(findFaults(drawing)).toEqual([])
    }
  })
})
