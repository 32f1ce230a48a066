import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, optionalNumber, stepWriter } from './values'

/** A nail is at least this many times as long as the board it holds is thick. */
export const THICKNESSES_OF_A_NAIL = 3

/** The worked solution of `fixings`. */
export function fixingsSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const value = (name: string) => writer.number(numberOf(values, name))
  const output = (name: string) => writer.number(numberOf(outputs, name))
  const withSpare = numberOf(outputs, 'driven') * (1 + numberOf(values, 'spare') / 100)
  return [
    {
      label: 'Crossings',
      formula: 'boards × supports',
      numbers: `${value('boards')} × ${value('supports')}`,
      result: writer.number(numberOf(values, 'boards') * numberOf(values, 'supports')),
    },
    {
      label: 'Go in',
      formula: 'crossings × at each crossing',
      numbers: `${writer.number(numberOf(values, 'boards') * numberOf(values, 'supports'))} × ${value('perCrossing')}`,
      result: output('driven'),
      output: 'driven',
    },
    {
      label: 'To buy, up to whole ones',
      formula: 'those that go in × (1 + spare ÷ 100)',
      numbers: `${output('driven')} × ${writer.number(1 + numberOf(values, 'spare') / 100, 3)} = ${writer.number(withSpare)}`,
      result: output('fixings'),
      output: 'fixings',
    },
    {
      label: 'Boxes, up to whole ones',
      formula: 'to buy ÷ in a box',
      numbers: `${output('fixings')} ÷ ${value('boxSize')} = ${writer.number(numberOf(outputs, 'fixings') / numberOf(values, 'boxSize'))}`,
      result: output('boxes'),
      output: 'boxes',
    },
    ...nailStep(values, outputs, system),
  ]
}

function nailStep(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const thickness = optionalNumber(values, 'thickness')
  if (thickness === undefined) return []
  const writer = stepWriter(system)
  return [
    {
      label: 'A nail at least',
      formula: `${String(THICKNESSES_OF_A_NAIL)} × thickness, two thirds of it in the support`,
      numbers: `${String(THICKNESSES_OF_A_NAIL)} × ${writer.length(thickness)}`,
      result: writer.length(numberOf(outputs, 'nailLength')),
      output: 'nailLength',
    },
  ]
}
