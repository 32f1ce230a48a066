import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter, wordOf } from './values'

/** The ways the far end of leg B can go. */
export const cornerMoves = [
  { value: 'in', label: 'Toward leg A' },
  { value: 'out', label: 'Away from leg A' },
  { value: 'none', label: 'Nowhere: it is square' },
]

/** The worked solution of `corner`. */
export function cornerSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const [a, b, d] = ['legA', 'legB', 'diagonal'].map((name) => numberOf(values, name)) as [
    number,
    number,
    number,
  ]
  const square = (metres: number) => writer.plainSquare(metres ** 2)
  const over = a ** 2 + b ** 2 - d ** 2
  const cosine = writer.number(over / (2 * a * b), 6)
  const angle = numberOf(outputs, 'angle')
  const error = numberOf(outputs, 'error')
  const fine = (radians: number) => `${writer.number((radians * 180) / Math.PI, 4)}°`
  const move = wordOf(outputs, 'move')
  return [
    {
      label: 'Both legs squared, less the diagonal squared',
      formula: 'A² + B² − diagonal²',
      numbers: `${square(a)} + ${square(b)} − ${square(d)}`,
      result: writer.plainSquare(over),
    },
    {
      label: 'Set against both legs',
      formula: 'that ÷ (2 × A × B); nought is square, minus is wider than square',
      numbers: `${writer.plainSquare(over)} ÷ (2 × ${writer.plain(a)} × ${writer.plain(b)})`,
      result: cosine,
    },
    {
      label: 'The corner is',
      formula: 'arccos(that)',
      numbers: `arccos(${cosine})`,
      result: writer.show(angle, 'angle'),
      output: 'angle',
    },
    {
      label: 'Out of square',
      formula: 'corner − 90°',
      numbers: `${fine(angle)} − 90°`,
      result: writer.show(error, 'angle'),
      output: 'error',
    },
    {
      label: 'Swing the end of leg B by',
      formula: 'B × sin(out of square)',
      numbers: `${writer.plain(b)} × sin(${fine(Math.abs(error))})`,
      result: writer.length(numberOf(outputs, 'offsetAtLegB')),
      output: 'offsetAtLegB',
    },
    {
      label: 'Which way',
      formula: 'a wide corner closes, a narrow one opens',
      numbers: `out of square by ${fine(error)}`,
      result: cornerMoves.find(({ value }) => value === move)?.label ?? '',
      output: 'move',
    },
    {
      label: 'Square',
      formula: 'the swing is no more than the limit',
      numbers: `limit ${writer.length(numberOf(values, 'tolerance'))}`,
      result: wordOf(outputs, 'square') === 'yes' ? 'Yes' : 'No',
      output: 'square',
    },
  ]
}
