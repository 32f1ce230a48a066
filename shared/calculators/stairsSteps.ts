import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter, wordOf } from './values'

/** The worked solution of `stairs`. */
export function stairsSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const plain = (name: string) => writer.plain(numberOf(values, name))
  const risers = writer.number(numberOf(outputs, 'risers'))
  const rise = numberOf(outputs, 'rise')
  const length = (name: string) => writer.length(numberOf(outputs, name))
  return [
    {
      label: 'Risers',
      formula: 'height ÷ highest step, up to a whole one',
      numbers: `${plain('totalRise')} ÷ ${plain('maxRise')}`,
      result: risers,
      output: 'risers',
    },
    {
      label: 'Each rises',
      formula: 'height ÷ risers',
      numbers: `${plain('totalRise')} ÷ ${risers}`,
      result: length('rise'),
      output: 'rise',
    },
    {
      label: 'First riser to last, level',
      formula: '(risers − 1) × tread',
      numbers: `(${risers} − 1) × ${plain('tread')}`,
      result: length('totalRun'),
      output: 'totalRun',
    },
    {
      label: 'Two rises and a tread',
      formula: '2 × rise + tread',
      numbers: `2 × ${writer.plain(rise)} + ${plain('tread')}`,
      result: length('comfort'),
      output: 'comfort',
    },
    {
      label: 'Within 7 3/4 in rise and 10 in tread',
      formula: 'rise at most 7 3/4 in (197 mm), tread at least 10 in (254 mm)',
      numbers: `${length('rise')} and ${writer.length(numberOf(values, 'tread'))}`,
      result: wordOf(outputs, 'withinLimits') === 'yes' ? 'Yes' : 'No',
      output: 'withinLimits',
    },
  ]
}
