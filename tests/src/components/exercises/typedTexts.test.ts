import { describe, expect, it } from 'vitest'
import { findCalculator } from '../../../../shared/calculators'
import {
  convertAnswer,
  convertInputs,
  withoutUnit,
} from '../../../../src/components/exercises/typedTexts'

const square = findCalculator('square')
if (!square) throw new Error('the calculator is not there')
const tapeReads = square.outputs.find(({ name }) => name === 'diagonal')

describe('typed texts', () => {
  it('leave out the unit that stands beside the field', () => {
    expect(withoutUnit('2600 mm', 'mm')).toBe('2600')
    expect(withoutUnit('2.6 m', 'mm')).toBe('2.6 m')
    expect(withoutUnit(`8' 6-3/8"`, 'in')).toBe(`8' 6-3/8"`)
  })
  it('stay as they were typed in their own units', () => {
    const typed = { sideA: '2.6 m', sideB: '1100', unit: '' }
    expect(convertInputs(square, typed, 'metric', 'metric')).toEqual(typed)
  })
  it('are read in the other units, to a sixteenth of an inch', () => {
    const typed = { sideA: '2600', sideB: '1100', unit: '300' }
    expect(convertInputs(square, typed, 'metric', 'imperial')).toEqual({
      sideA: `8' 6-3/8"`,
      sideB: `3' 7-5/16"`,
      unit: '11-13/16"',
    })
  })
  it('keep an answer that cannot be read', () => {
    if (!tapeReads) throw new Error('the output is not there')
    expect(convertAnswer(tapeReads, 'about so', 'metric', 'imperial')).toBe('about so')
    expect(convertAnswer(tapeReads, '1500', 'metric', 'imperial')).toBe(`4' 11-1/16"`)
  })
})
