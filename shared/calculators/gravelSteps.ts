import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter } from './values'

/** The worked solution of `gravel`. */
export function gravelSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const value = (name: string) => numberOf(values, name)
  const loose = numberOf(outputs, 'looseVolume')
  const volume = (cubic: number, unit: string) => writer.show(cubic, 'volume', { unit })
  const ordered = system === 'metric' ? 'm³' : 'yd³'
  const weighed = system === 'metric' ? 'm³' : 'ft³'
  const side = (name: string): number => value(name) + 2 * value('overhang')
  const reach = (name: 'length' | 'width', label: string): Step => ({
    label,
    formula: `${name} + 2 × past the pad`,
    numbers: `${writer.length(value(name))} + 2 × ${writer.length(value('overhang'))}`,
    result: writer.length(side(name)),
  })
  const sides = [side('length'), side('width'), value('depth')].map(writer.large).join(' × ')
  return [
    reach('length', 'Base is long'),
    reach('width', 'Base is wide'),
    {
      label: 'Tamped stone',
      formula: system === 'metric' ? 'long × wide × depth' : 'long × wide × depth in feet, ÷ 27',
      numbers: `${sides}${system === 'metric' ? '' : ' ÷ 27'}`,
      result: volume(loose / value('compaction'), ordered),
    },
    {
      label: 'Stone to order, loose',
      formula: 'tamped × loose for one tamped',
      numbers: `${volume(loose / value('compaction'), ordered)} × ${writer.number(value('compaction'))}`,
      result: volume(loose, ordered),
      output: 'looseVolume',
    },
    {
      label: 'It weighs',
      formula: 'loose × what loose stone weighs',
      numbers: `${volume(loose, weighed)} × ${writer.show(value('density'), 'massDensity')}`,
      result: writer.show(numberOf(outputs, 'mass'), 'mass'),
      output: 'mass',
    },
  ]
}
