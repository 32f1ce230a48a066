import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { commonDivisor, stepsDown, stepsToMm, stepsUp } from '../../../shared/cutlist/lengthSteps'

describe('steps', () => {
  it('are whole for tenths of a millimetre and thirty-seconds of an inch, typed or computed', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 300_000 }), (tenths) => {
        expect(stepsUp(tenths / 10)).toBe(16 * tenths)
        expect(stepsDown((tenths / 10_000) * 1000)).toBe(16 * tenths)
      }),
    )
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 38_000 }), (parts) => {
        expect(stepsUp((parts / 32) * 25.4)).toBe(127 * parts)
        expect(stepsDown((parts / 32) * 0.0254 * 1000)).toBe(127 * parts)
      }),
    )
  })

  it('promise no room that is not there', () => {
    expect(stepsUp(0.001)).toBe(1)
    expect(stepsDown(0.006)).toBe(0)
    expect(stepsToMm(stepsUp(1000 / 3))).toBeGreaterThan(1000 / 3)
    expect(stepsToMm(stepsDown(1000 / 3))).toBeLessThan(1000 / 3)
  })
})

describe('commonDivisor', () => {
  it.each([
    [[12, 18, 30], 6],
    [[7], 7],
    [[0, 5], 5],
    [[], 0],
  ])('of %j is %d', (numbers, divisor) => {
    expect(commonDivisor(numbers)).toBe(divisor)
  })
})
