import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter, wordOf } from './values'

/** The worked solution of `taper`. */
export function taperSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const input = (name: string) => writer.length(numberOf(values, name))
  const [start, end] = [numberOf(outputs, 'cutStart'), numberOf(outputs, 'cutEnd')]
  const isTwice = wordOf(values, 'gapAtStop') === 'yes'
  const formula = isTwice ? 'opening − 2 × gap' : 'opening − gap'
  const gap = isTwice ? `2 × ${input('gap')}` : input('gap')
  return [
    {
      label: 'Board at the start',
      formula,
      numbers: `${input('openingStart')} − ${gap}`,
      result: writer.length(start),
      output: 'cutStart',
    },
    {
      label: 'Board at the far end',
      formula,
      numbers: `${input('openingEnd')} − ${gap}`,
      result: writer.length(end),
      output: 'cutEnd',
    },
    {
      label: 'Comes off at the start, saw cut included',
      formula: 'board − width at the start',
      numbers: `${input('boardWidth')} − ${writer.length(start)}`,
      result: writer.length(numberOf(outputs, 'wasteStart')),
      output: 'wasteStart',
    },
    {
      label: 'Angle of the rip',
      formula: 'arctan(difference of both ends ÷ length)',
      numbers: `arctan(${writer.plain(Math.abs(start - end))} ÷ ${writer.plain(numberOf(values, 'length'))})`,
      result: writer.show(numberOf(outputs, 'angle'), 'angle'),
      output: 'angle',
    },
    {
      label: 'The board is wide enough',
      formula: 'the wider end is no wider than the board',
      numbers: `${writer.length(Math.max(start, end))} of ${input('boardWidth')}`,
      result: wordOf(outputs, 'fits') === 'yes' ? 'Yes' : 'No',
      output: 'fits',
    },
  ]
}
