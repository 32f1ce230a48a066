import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter } from './values'

/** Steps that are easy to find on a tape: 50 mm, 1 in. */
export const EASY_STEP: Record<UnitSystem, number> = { metric: 0.05, imperial: 0.0254 }
/** The worked solution of `square`. */
export function squareSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const output = (name: string) => numberOf(outputs, name)
  const short = Math.min(numberOf(values, 'sideA'), numberOf(values, 'sideB'))
  const long = Math.max(numberOf(values, 'sideA'), numberOf(values, 'sideB'))
  const legs = [output('legShort'), output('legLong')] as const
  const squares = legs.map((leg) => writer.plainSquare(leg ** 2)).join(' + ')
  const sum = writer.plainSquare(legs[0] ** 2 + legs[1] ** 2)
  return [
    {
      label: 'Biggest unit that fits',
      formula: 'the smaller of short side ÷ 3 and long side ÷ 4',
      numbers: `${writer.length(short)} ÷ 3, ${writer.length(long)} ÷ 4`,
      result: writer.length(output('largestUnit')),
      output: 'largestUnit',
    },
    {
      label: 'One unit',
      formula: 'down to what is easy to mark',
      numbers: values['unit'] === undefined ? writer.length(EASY_STEP[system]) : 'as you chose',
      result: writer.length(output('unit')),
      output: 'unit',
    },
    {
      label: 'Short board',
      formula: '3 × unit',
      numbers: `3 × ${writer.length(output('unit'))}`,
      result: writer.length(legs[0]),
      output: 'legShort',
    },
    {
      label: 'Long board',
      formula: '4 × unit',
      numbers: `4 × ${writer.length(output('unit'))}`,
      result: writer.length(legs[1]),
      output: 'legLong',
    },
    {
      label: 'Square both and add',
      formula: 'short² + long²',
      numbers: `${writer.plain(legs[0])}² + ${writer.plain(legs[1])}² = ${squares}`,
      result: sum,
    },
    {
      label: 'Straight across',
      formula: '√(short² + long²)',
      numbers: `√${sum}`,
      result: writer.length(output('diagonal')),
      output: 'diagonal',
    },
  ]
}
