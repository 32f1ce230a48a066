import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter } from './values'

/** The worked solution of `angle-cut`. */
export function angleCutSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const plain = (name: string) => writer.plain(numberOf(values, name))
  const angle = numberOf(values, 'angle')
  const offset = numberOf(outputs, 'offset')
  const tangent = writer.number(Math.tan(angle), 4)
  return [
    {
      label: 'Along for each 1 across',
      formula: 'tan(angle)',
      numbers: `tan(${writer.show(angle, 'angle')})`,
      result: tangent,
    },
    {
      label: 'Long point to short point, along the board',
      formula: 'board width × that',
      numbers: `${plain('boardWidth')} × ${tangent}`,
      result: writer.length(offset),
      output: 'offset',
    },
    {
      label: 'Length to the short point',
      formula: 'long point − that',
      numbers: `${plain('longPoint')} − ${writer.plain(offset)}`,
      result: writer.length(numberOf(outputs, 'shortPoint')),
      output: 'shortPoint',
    },
  ]
}
