import type { Slip, Values } from './calculator'
import { numberOf } from './values'

/** A common form board; what a mark on the wrong face is off by. An assumption. */
const BOARD = 0.038

const unitOf = (outputs: Values) => numberOf(outputs, 'unit')
const shortOf = (values: Values) => Math.min(numberOf(values, 'sideA'), numberOf(values, 'sideB'))
const longOf = (values: Values) => Math.max(numberOf(values, 'sideA'), numberOf(values, 'sideB'))

/** The known ways to get `square` wrong. */
export const squareSlips: Slip[] = [
  {
    id: 'round-the-corner',
    title: 'Went round the corner',
    output: 'diagonal',
    wrong: (_values, outputs) => 7 * unitOf(outputs),
    sentence: 'That is the way round the corner, one leg after the other.',
    wayBack:
      'The tape goes straight across. Square each leg first, add the squares, then take the square root.',
  },
  {
    id: 'no-root',
    title: 'Forgot the root',
    output: 'diagonal',
    wrong: (_values, outputs, system) =>
      (25 * unitOf(outputs) ** 2) / (system === 'metric' ? 0.001 : 0.0254),
    sentence: 'That is the sum of the squares.',
    wayBack: 'One step is left: take the square root.',
  },
  {
    id: 'centimetres',
    title: 'Answered in centimetres',
    output: 'diagonal',
    wrong: (_values, outputs, system) => (system === 'metric' ? unitOf(outputs) / 2 : undefined),
    sentence: 'That looks like centimetres.',
    wayBack: 'The field asks for millimetres: multiply by 10.',
  },
  {
    id: 'feet-for-inches',
    title: 'Answered in feet',
    output: 'diagonal',
    wrong: (_values, outputs, system) =>
      system === 'imperial' ? (5 * unitOf(outputs)) / 12 : undefined,
    sentence: 'That looks like feet without the foot mark.',
    wayBack: 'A bare number is inches here: write the foot mark, or multiply by 12.',
  },
  {
    id: 'outside-inside',
    title: 'Outside of one form, inside of the other',
    output: 'diagonal',
    wrong: (_values, outputs) => Math.hypot(3 * unitOf(outputs) + BOARD, 4 * unitOf(outputs)),
    sentence: 'That is off by one board: one leg is measured to the outside.',
    wayBack: 'Measure both legs from the inside corner, along the inside faces.',
  },
  {
    id: 'squares-subtracted',
    title: 'Squares taken off each other',
    output: 'diagonal',
    wrong: (_values, outputs) => Math.sqrt(7) * unitOf(outputs),
    sentence: 'That takes one square off the other.',
    wayBack: 'The line across is the longest of the three: add the squares.',
  },
  {
    id: 'legs-swapped-short',
    title: 'Legs swapped',
    output: 'legShort',
    wrong: (_values, outputs) => 4 * unitOf(outputs),
    sentence: 'That is the mark for the long board.',
    wayBack: 'Three units go on the short board, four on the long one.',
  },
  {
    id: 'legs-swapped-long',
    title: 'Legs swapped',
    output: 'legLong',
    wrong: (_values, outputs) => 3 * unitOf(outputs),
    sentence: 'That is the mark for the short board.',
    wayBack: 'Three units go on the short board, four on the long one.',
  },
  {
    id: 'short-by-four',
    title: 'Short side divided by 4',
    output: 'largestUnit',
    wrong: (values) => shortOf(values) / 4,
    sentence: 'That wants four units on the short side.',
    wayBack: 'Three units go on the short side: divide it by 3, and the long one by 4.',
  },
  {
    id: 'long-side-only',
    title: 'Only the long side looked at',
    output: 'largestUnit',
    wrong: (values) => longOf(values) / 4,
    sentence: 'That unit fits the long side only.',
    wayBack: 'Three of it must fit the short side as well: take the smaller of the two.',
  },
]
