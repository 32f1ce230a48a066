import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter, wordOf } from './values'

/** The worked solution of `diagonals`. */
export function diagonalsSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const input = (name: string) => numberOf(values, name)
  const output = (name: string) => numberOf(outputs, name)
  const ordered = [input('diagonal1'), input('diagonal2')].sort((a, b) => b - a)
  const [longer = 0, shorter = 0] = ordered
  const tolerance = writer.length(input('tolerance'))
  const within = wordOf(outputs, 'square') === 'yes'
  return [
    {
      label: 'Both should read',
      formula: '√(long² + short²)',
      numbers: `√(${writer.plain(input('length'))}² + ${writer.plain(input('width'))}²)`,
      result: writer.length(output('expected')),
      output: 'expected',
    },
    {
      label: 'They are apart by',
      formula: 'longer − shorter',
      numbers: `${writer.length(longer)} − ${writer.length(shorter)}`,
      result: writer.length(output('difference')),
      output: 'difference',
    },
    {
      label: 'Square',
      formula: 'apart by no more than the limit',
      numbers: `limit ${tolerance}`,
      result: within ? 'Yes' : 'No',
      output: 'square',
    },
    {
      label: 'Longer one',
      formula: 'the one that reads more',
      numbers: `${writer.length(input('diagonal1'))}, ${writer.length(input('diagonal2'))}`,
      result:
        { first: 'The first', second: 'The second', same: 'Neither' }[wordOf(outputs, 'longer')] ??
        '',
      output: 'longer',
    },
    {
      label: 'Slide the long side by',
      formula: '(longer² − shorter²) ÷ (4 × long side)',
      numbers: `(${writer.plain(longer)}² − ${writer.plain(shorter)}²) ÷ (4 × ${writer.plain(input('length'))})`,
      result: writer.length(output('moveBy')),
      output: 'moveBy',
    },
    {
      label: 'Corner out by',
      formula: 'arcsin(slide ÷ short side)',
      numbers: `arcsin((${writer.plain(longer)}² − ${writer.plain(shorter)}²) ÷ (4 × ${writer.plain(input('length'))} × ${writer.plain(input('width'))}))`,
      result: writer.show(output('cornerError'), 'angle'),
      output: 'cornerError',
    },
  ]
}
