import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { findBag } from './bags'
import { numberOf, optionalNumber, stepWriter, wordOf } from './values'

/** The worked solution of `slab`. */
export function slabSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const output = (name: string) => numberOf(outputs, name)
  const liquid = { unit: system === 'metric' ? 'L' : 'qt' }
  const bag = findBag(wordOf(values, 'bag'))
  const bagYield = optionalNumber(values, 'bagYield') ?? bag.yield
  const yieldUnit = { unit: system === 'metric' ? 'L' : 'ft³' }
  const fall = optionalNumber(values, 'fall') ?? 0
  const slopeUnit = { unit: system === 'metric' ? 'mm/m' : 'in/ft' }
  const volumeUnit = { unit: system === 'metric' ? 'm³' : 'yd³' }
  const volumeText = (name: string) => writer.show(output(name), 'volume', volumeUnit)
  const sides = ['length', 'width'].map((name) => writer.large(numberOf(values, name))).join(' × ')
  const bagsText = writer.number(output('bags'))
  const mean: Step[] =
    wordOf(values, 'flatBase') === 'yes'
      ? [
          {
            label: 'Mean thickness',
            formula: 'thickness + fall × width ÷ 2',
            numbers: `${writer.length(numberOf(values, 'thickness'))} + ${writer.length(output('drop'))} ÷ 2`,
            result: writer.length(output('meanThickness')),
            output: 'meanThickness',
          },
        ]
      : []
  const water = (label: string, name: 'waterMin' | 'waterMax'): Step => ({
    label,
    formula: 'bags × water a bag',
    numbers: `${bagsText} × ${writer.show(bag[name], 'volume', liquid)}`,
    result: writer.show(output(name), 'volume', liquid),
    output: name,
  })
  return [
    {
      label: 'Front edge lower by',
      formula: 'width × fall',
      numbers: `${writer.length(numberOf(values, 'width'))} × ${writer.show(fall, 'ratio', slopeUnit)}`,
      result: writer.length(output('drop')),
      output: 'drop',
    },
    ...mean,
    {
      label: 'Concrete',
      formula:
        system === 'metric'
          ? 'length × width × thickness'
          : 'length × width × thickness in feet, ÷ 27',
      numbers: `${sides} × ${writer.large(output('meanThickness'))}${system === 'metric' ? '' : ' ÷ 27'}`,
      result: volumeText('volume'),
      output: 'volume',
    },
    {
      label: 'With waste',
      formula: 'concrete × (1 + waste ÷ 100)',
      numbers: `${volumeText('volume')} × ${writer.number(1 + numberOf(values, 'waste') / 100, 3)}`,
      result: volumeText('volumeWithWaste'),
      output: 'volumeWithWaste',
    },
    {
      label: 'Bags, up to whole ones',
      formula: 'with waste ÷ what one bag makes',
      numbers: `${writer.show(output('volumeWithWaste'), 'volume', yieldUnit)} ÷ ${writer.show(bagYield, 'volume', yieldUnit)} = ${writer.number(output('volumeWithWaste') / bagYield)}`,
      result: bagsText,
      output: 'bags',
    },
    {
      label: 'Ready-mixed instead, up to the next step',
      formula: system === 'metric' ? 'next 0.1 m³' : 'next 1/4 yd³',
      numbers: volumeText('volumeWithWaste'),
      result: volumeText('readyMix'),
      output: 'readyMix',
    },
    {
      label: 'Dry weight to carry',
      formula: 'bags × weight of one',
      numbers: `${bagsText} × ${bag.value}`,
      result: writer.show(output('mass'), 'mass'),
      output: 'mass',
    },
    water('Water, at least', 'waterMin'),
    water('Water, at most', 'waterMax'),
  ]
}
