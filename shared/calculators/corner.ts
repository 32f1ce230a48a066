import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { cornerSlips } from './cornerSlips'
import { cornerMoves, cornerSteps } from './cornerSteps'
import { numberOf } from './values'

const SQUARE = Math.PI / 2
/** Nearer to square than any tape can tell: a thousandth of a millimetre. */
const NOTHING = 1e-6

/** Legs that lie on each other, but for binary dust, are no corner. */
const FLAT = 1e-12

/** The cosine of the corner, refused where three such lengths never close a triangle. */
function cosineOf(legA: number, legB: number, diagonal: number): number {
  const cosine = (legA ** 2 + legB ** 2 - diagonal ** 2) / (2 * legA * legB)
  if (Math.abs(cosine) < 1 - FLAT) return cosine
  const reason =
    cosine > 0 ? 'too short to reach from one leg to the other' : 'longer than both legs'
  const hint = cosine > 0 ? '' : ' laid end to end'
  throw new CalculatorInputError(
    'diagonal',
    `The diagonal is ${reason}${hint}. Measure all three again: both legs from the same corner, the diagonal from mark to mark.`,
  )
}

function compute(values: Values): Values {
  const legB = numberOf(values, 'legB')
  const angle = Math.acos(cosineOf(numberOf(values, 'legA'), legB, numberOf(values, 'diagonal')))
  const error = angle - SQUARE
  const offsetAtLegB = legB * Math.abs(Math.sin(error))
  const move = offsetAtLegB < NOTHING ? 'none' : error > 0 ? 'in' : 'out'
  const isSquare = offsetAtLegB <= numberOf(values, 'tolerance') + 1e-9
  return { angle, error, offsetAtLegB, move, square: isSquare ? 'yes' : 'no' }
}

/**
 * How far out of square a corner is: angle = arccos((a² + b² − d²) ÷ 2ab), error = angle − 90°, offset = b·|sin error|.
 * Metres and radians. Law of cosines. 2400 and 1800 mm, diagonal 3010 mm: 90.40°, 0.40° too wide, the end of B 12.5 mm out.
 */
export const corner: Calculator = {
  id: 'corner',
  version: 1,
  title: 'Corner: how far out of square',
  question: 'How far out of square is this corner?',
  help: 'Mark a length on each side of the corner and measure straight across between the marks. Three tapes tell how many degrees the corner is out, and how far the end of one side must swing. Long sides tell more: an error on the tape counts for less.',
  inputs: [
    {
      name: 'legA',
      label: 'Leg A, the side that stays',
      quantity: 'length',
      help: 'Corner to mark, along the inside face.',
      initial: { metric: '2400', imperial: `8'` },
      min: 0.2,
      max: 30,
    },
    {
      name: 'legB',
      label: 'Leg B, the side that swings',
      quantity: 'length',
      help: 'Corner to the end that will move.',
      initial: { metric: '1800', imperial: `6'` },
      min: 0.2,
      max: 30,
    },
    {
      name: 'diagonal',
      label: 'Diagonal, mark to mark',
      quantity: 'length',
      help: 'Straight across, the tape pulled tight.',
      initial: { metric: '3010', imperial: `10' 3/8"` },
      min: 0.01,
      max: 60,
    },
    {
      name: 'tolerance',
      label: 'Square within',
      quantity: 'length',
      help: 'How far the end of leg B may be off.',
      assumed: true,
      initial: { metric: '5', imperial: '3/16"' },
      min: 0,
      max: 0.05,
    },
  ],
  outputs: [
    { name: 'angle', label: 'The corner is', quantity: 'angle' },
    { name: 'error', label: 'Out of square (minus: too narrow)', quantity: 'angle' },
    { name: 'offsetAtLegB', label: 'Swing the end of leg B by', quantity: 'length' },
    { name: 'move', label: 'Which way', quantity: 'choice', choices: cornerMoves },
    {
      name: 'square',
      label: 'Square',
      quantity: 'choice',
      choices: [
        { value: 'yes', label: 'Yes' },
        { value: 'no', label: 'No' },
      ],
    },
  ],
  compute,
  steps: cornerSteps,
  slips: cornerSlips,
  cautions: [
    {
      title: 'Before you move a peg',
      text: 'Have buried cables and pipes located before you drive it again somewhere else, and wait for the answer.',
    },
    {
      title: 'A braced side can spring',
      text: 'Loosen braces with a helper holding the end, and keep hands from between board and peg.',
    },
    {
      title: 'Where the corner stands',
      text: 'Distances to the boundary and permits follow the local code. Ask before you fix it.',
    },
  ],
  sources: [
    {
      title: 'Law of cosines (Euclid, Elements)',
      detail: 'Book II, propositions 12 and 13',
      kind: 'from memory',
    },
    { title: 'US Army subcourse EN0069, Carpentry', detail: '3-4-5 is square', kind: 'published' },
    {
      title: 'An end 5 mm or 3/16 in off counts as square for a small form',
      kind: 'common practice, no source',
    },
    { title: 'The end swings about the corner, leg A stays', kind: 'common practice, no source' },
  ],
  example: {
    inputs: { legA: '2400 mm', legB: '1800 mm', diagonal: '3010 mm' },
    outputs: {
      angle: 1.57775,
      error: 0.00695607,
      offsetAtLegB: 0.0125208,
      move: 'in',
      square: 'no',
    },
  },
}
