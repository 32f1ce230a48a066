import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { listOf, numberOf, stepWriter } from './values'

/** The worked solution of `spacing`. */
export function spacingSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const plain = (name: string) => writer.plain(numberOf(values, name))
  const run = numberOf(values, 'run') - numberOf(values, 'memberWidth')
  const spaces = writer.number(numberOf(outputs, 'count') - 1)
  const centres = writer.length(numberOf(outputs, 'centres'))
  const marks = listOf(outputs, 'marks').map((mark) => writer.length(mark))
  return [
    {
      label: 'First to last, centre to centre',
      formula: 'run − one width',
      numbers: `${plain('run')} − ${plain('memberWidth')}`,
      result: writer.length(run),
    },
    {
      label: 'How many',
      formula: 'that ÷ widest centres, up to a whole space, and one more',
      numbers: `${writer.plain(run)} ÷ ${plain('maxCentres')}, up, + 1`,
      result: writer.number(numberOf(outputs, 'count')),
      output: 'count',
    },
    {
      label: 'Centre to centre',
      formula: '(run − one width) ÷ spaces',
      numbers: `${writer.plain(run)} ÷ ${spaces}`,
      result: centres,
      output: 'centres',
    },
    {
      label: 'Clear between two',
      formula: 'centres − one width',
      numbers: `${centres} − ${plain('memberWidth')}`,
      result: writer.length(numberOf(outputs, 'clear')),
      output: 'clear',
    },
    {
      label: 'Marks, near edge of each',
      formula: 'from the outside of the first, the centres each time',
      numbers: `0, then ${writer.plain(numberOf(outputs, 'centres'))} each, all from the same end`,
      result: marks.join('; '),
      output: 'marks',
    },
  ]
}
