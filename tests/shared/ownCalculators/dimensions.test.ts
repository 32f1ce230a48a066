import { describe, expect, it } from 'vitest'
import {
  PLAIN,
  divided,
  isSame,
  multiplied,
  nameDimension,
  nameUnit,
  quantityDimensions as of,
  raised,
} from '../../../shared/ownCalculators/dimensions'

describe('dimensions', () => {
  it('multiply, divide and take roots', () => {
    expect(isSame(multiplied(of.length, of.area), of.volume)).toBe(true)
    expect(isSame(divided(of.mass, of.volume), of.massDensity)).toBe(true)
    expect(isSame(divided(of.force, of.area), of.pressure)).toBe(true)
    expect(isSame(raised(of.area, 1 / 2), of.length)).toBe(true)
    expect(isSame(raised(raised(of.length, 1 / 3), 3), of.length)).toBe(true)
    expect(isSame(of.length, of.area)).toBe(false)
  })

  it.each([
    [of.volume, 'm³', 'a volume'],
    [of.massDensity, 'kg/m³', 'a density'],
    [of.force, 'm·kg/s²', 'a force'],
    [PLAIN, '', 'a plain number'],
    [of.angle, 'rad', 'an angle'],
    [divided(PLAIN, of.length), '1/m', 'something in 1/m'],
    [raised(of.length, 1 / 2), 'm^0.5', 'something in m^0.5'],
    [divided(of.money, multiplied(of.length, of.time)), 'money/(m·s)', 'something in money/(m·s)'],
  ])('are named: %j is %s', (dimension, unit, words) => {
    expect([nameUnit(dimension), nameDimension(dimension)]).toEqual([unit, words])
  })
})
