import { describe, expect, it } from 'vitest'
import {
  nameDimension,
  quantityDimensions,
  type Dimension,
} from '../../../shared/ownCalculators/dimensions'
import { readFormula } from '../../../shared/ownCalculators/formula'
import { FormulaError } from '../../../shared/ownCalculators/formulaError'
import { measureFormula } from '../../../shared/ownCalculators/measure'

const names: Record<string, Dimension> = {
  side: quantityDimensions.length,
  rise: quantityDimensions.length,
  pad: quantityDimensions.volume,
  load: quantityDimensions.mass,
  slope: quantityDimensions.angle,
  price: quantityDimensions.money,
  n: quantityDimensions.count,
}
const measure = (expression: string) =>
  measureFormula(readFormula(expression).root, (name) => names[name] ?? quantityDimensions.count)
function refusalOf(expression: string): [column: number, message: string, wayOut: string] | string {
  try {
    return nameDimension(measure(expression))
  } catch (error) {
    if (!(error instanceof FormulaError)) throw error
    return [error.column, error.message, error.wayOut]
  }
}

describe('measureFormula', () => {
  it.each([
    ['side * rise', 'an area'],
    ['side^3 + pad', 'a volume'],
    ['pad / side^2', 'a length'],
    ['load / pad', 'a density'],
    ['load * 9.81 m/s^2', 'a force'],
    ['load * 9.81 m/s^2 / side^2', 'a pressure'],
    ['sqrt(side * rise)', 'a length'],
    ['cbrt(pad)', 'a length'],
    ['hypot(side, rise)', 'a length'],
    ['max(side, 2 m, 4 ft)', 'a length'],
    ['abs(-side)', 'a length'],
    ['ceil(side / rise)', 'a plain number'],
    ['tan(slope) * side', 'a length'],
    ['sin(0.5)', 'a plain number'],
    ['atan(rise / side)', 'an angle'],
    ['atan2(rise, side) + 2 deg', 'an angle'],
    ['side * slope / 1 rad', 'a length'],
    ['price * n', 'an amount of money'],
    ['price / pad', 'something in money/m³'],
    ['side > rise ? side : rise', 'a length'],
    ['side > 2 m ? 1 : 2', 'a plain number'],
    ['3', 'a plain number'],
    ['40 L', 'a volume'],
  ])('%s is %s', (expression, words) => {
    expect(refusalOf(expression)).toBe(words)
  })

  it.each([
    [
      'load + pad',
      6,
      'A mass and a volume cannot be added.',
      'Left of the + is kg, right of it m³.',
    ],
    [
      'side - 3',
      6,
      'A length and a plain number cannot be taken off each other.',
      'Left of the - is m, right of it a plain number.',
    ],
    ['n + 3 deg', 3, 'A plain number and an angle cannot be added.', ''],
    ['price + 5', 7, 'An amount of money and a plain number cannot be added.', ''],
    ['max(side, load)', 1, 'A length and a mass cannot stand together in max.', ''],
    ['n * atan2(side, n)', 5, 'A length and a plain number cannot stand together in atan2.', ''],
    ['sin(side)', 1, 'sin takes an angle, not a length.', ''],
    ['n + asin(side)', 5, 'asin takes a plain number, not a length.', ''],
    ['asin(slope)', 1, 'asin takes a plain number, not an angle.', ''],
    ['round(side)', 1, 'round takes a plain number, not a length.', ''],
    ['ceil(pad / side)', 1, 'ceil takes a plain number, not an area.', ''],
    ['2 ^ side', 3, 'A power is a plain number.', ''],
    ['side ^ n', 6, 'A power is a number from −6 to 6, written out.', ''],
    ['side ^ 7', 6, 'A power is a number from −6 to 6, written out.', ''],
    ['side ^ (1/0)', 6, 'A power is a number from −6 to 6, written out.', ''],
    ['side^6 * side^6 * side', 17, 'Nothing that is built is measured like this.', ''],
    ['side > load ? 1 : 2', 6, 'A length and a mass cannot be compared.', ''],
    ['n > 1 ? side : load', 7, 'The two sides of a choice must measure the same.', ''],
    ['n ? 1 : 2', 3, 'A choice begins with a comparison.', ''],
    ['1 + (n > 1)', 8, 'A comparison gives no number.', ''],
  ])('refuses %s at character %i', (expression, column, message, wayOut) => {
    const refusal = refusalOf(expression)
    expect(refusal.slice(0, 2)).toEqual([column, message])
    expect(refusal[2]).toContain(wayOut)
  })
})
