import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { tinOf, tinWords } from './coatingTin'
import { numberOf, stepWriter, wordOf } from './values'

/** The worked solution of `coating`. */
export function coatingSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const unit = { unit: system === 'metric' ? 'L' : 'gal' }
  const volume = (name: string) => writer.show(numberOf(outputs, name), 'volume', unit)
  const area = numberOf(values, 'area')
  const roughArea = writer.show(area * (1 + numberOf(values, 'roughness') / 100), 'area')
  const covers = `${writer.show(numberOf(values, 'coverage'), 'area')} ${tinWords(values)}`
  // A coverage said for the other system's tin is divided in its own unit first.
  const own = wordOf(values, 'coverageFor')
  const turned =
    own === unit.unit ? '' : `, 1 ${own} is ${writer.show(tinOf(values), 'volume', unit)}`
  return [
    {
      label: 'Area with its roughness',
      formula: 'area × (1 + extra ÷ 100)',
      numbers: `${writer.show(area, 'area')} × ${writer.number(1 + numberOf(values, 'roughness') / 100, 3)}`,
      result: roughArea,
    },
    {
      label: 'For one coat',
      formula: 'area with its roughness ÷ what a litre or gallon covers',
      numbers: `${roughArea} ÷ ${covers}${turned}`,
      result: volume('volumePerCoat'),
      output: 'volumePerCoat',
    },
    {
      label: 'For all coats',
      formula: 'one coat × coats',
      numbers: `${volume('volumePerCoat')} × ${writer.number(numberOf(values, 'coats'))}`,
      result: volume('volume'),
      output: 'volume',
    },
  ]
}
