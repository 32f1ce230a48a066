import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { findBag } from './bags'
import { numberOf, optionalNumber, stepWriter, wordOf } from './values'

/** The worked solution of `posthole`. */
export function postholeSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const value = (name: string) => numberOf(values, name)
  const output = (name: string) => numberOf(outputs, name)
  const volume = (cubic: number) =>
    writer.show(cubic, 'volume', { unit: system === 'metric' ? 'L' : 'ft³' })
  const large = (name: string) => writer.large(value(name))
  const inUnits = system === 'metric' ? 'in metres, × 1000' : 'in feet'
  const times = system === 'metric' ? ' × 1000' : ''
  const hole = (Math.PI / 4) * value('diameter') ** 2 * value('depth')
  const post = value('postWidth') * value('postDepth') * value('depth')
  const bagYield = optionalNumber(values, 'bagYield') ?? findBag(wordOf(values, 'bag')).yield
  return [
    {
      label: 'The hole',
      formula: `π ÷ 4 × across² × deep, ${inUnits}`,
      numbers: `π ÷ 4 × ${large('diameter')}² × ${large('depth')}${times}`,
      result: volume(hole),
    },
    {
      label: 'The post in it',
      formula: `wide × thick × deep, ${inUnits}`,
      numbers: `${large('postWidth')} × ${large('postDepth')} × ${large('depth')}${times}`,
      result: volume(post),
    },
    {
      label: 'Concrete, one hole',
      formula: 'hole − post',
      numbers: `${volume(hole)} − ${volume(post)}`,
      result: volume(output('volumeEach')),
      output: 'volumeEach',
    },
    {
      label: 'Concrete, all holes',
      formula: 'holes × one',
      numbers: `${writer.number(value('count'))} × ${volume(output('volumeEach'))}`,
      result: volume(output('volume')),
      output: 'volume',
    },
    {
      label: 'With waste',
      formula: 'concrete × (1 + waste ÷ 100)',
      numbers: `${volume(output('volume'))} × ${writer.number(1 + value('waste') / 100, 3)}`,
      result: volume(output('volumeWithWaste')),
      output: 'volumeWithWaste',
    },
    {
      label: 'Bags, up to whole ones',
      formula: 'with waste ÷ what one bag makes',
      numbers: `${volume(output('volumeWithWaste'))} ÷ ${volume(bagYield)} = ${writer.number(output('volumeWithWaste') / bagYield)}`,
      result: writer.number(output('bags')),
      output: 'bags',
    },
  ]
}
