import { describe, expect, it } from 'vitest'
import { findCalculator } from '../../../../shared/calculators'
import {
  readCalculatorLink,
  writeCalculatorLink,
} from '../../../../src/components/exercises/calculatorLink'

const square = findCalculator('square')
if (!square) throw new Error('the calculator is not there')

describe('the link of a calculator', () => {
  it('carries the inputs as they were typed, with their units', () => {
    const typed = { system: 'imperial' as const, texts: { sideA: `8' 6"`, sideB: '42', unit: '' } }
    expect(readCalculatorLink(square, writeCalculatorLink(typed))).toEqual(typed)
  })

  it('is bare while nothing was typed', () => {
    expect(writeCalculatorLink(null)).toEqual({})
    expect(readCalculatorLink(square, {})).toBeNull()
  })

  it('starts what it does not name from the usual number, and leaves out what is none of it', () => {
    const query = { units: 'imperial', sideA: '9 ft', wall: '3', sideB: ['1', '2'] }
    expect(readCalculatorLink(square, query)).toEqual({
      system: 'imperial',
      texts: { sideA: '9 ft', sideB: `3' 6"`, unit: '' },
    })
    expect(readCalculatorLink(square, { sideA: '9'.repeat(81) })).toBeNull()
  })
})
