import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { diagonalsSlips } from './diagonalsSlips'
import { diagonalsSteps } from './diagonalsSteps'
import { numberOf } from './values'

/** How far the diagonals may contradict the sides before one of the four was misread: 5 %. */
const MISREAD = 0.05

function compute(values: Values): Values {
  const length = numberOf(values, 'length')
  const width = numberOf(values, 'width')
  const first = numberOf(values, 'diagonal1')
  const second = numberOf(values, 'diagonal2')
  const expected = Math.hypot(length, width)
  const mean = Math.sqrt((first ** 2 + second ** 2) / 2)
  const sine = Math.abs(first ** 2 - second ** 2) / (4 * length * width)
  if (Math.abs(mean / expected - 1) > MISREAD || sine >= 1) {
    const input =
      Math.abs(first - expected) > Math.abs(second - expected) ? 'diagonal1' : 'diagonal2'
    throw new CalculatorInputError(
      input,
      'No form with these sides has these two diagonals. Measure all four again, inside face to inside face.',
    )
  }
  const difference = Math.abs(first - second)
  return {
    expected,
    difference,
    cornerError: Math.asin(sine),
    moveBy: width * sine,
    square: difference <= numberOf(values, 'tolerance') + 1e-9 ? 'yes' : 'no',
    longer: difference < 1e-9 ? 'same' : first > second ? 'first' : 'second',
  }
}

const diagonalInput = (name: string, label: string, help: string) =>
  ({
    name,
    label,
    quantity: 'length',
    help,
    initial: {
      metric: name === 'diagonal1' ? '2826' : '2821',
      imperial: name === 'diagonal1' ? `9' 2-1/2"` : `9' 2-1/8"`,
    },
    min: 0.3,
    max: 45,
  }) as const

/**
 * Is a rectangle square: equal diagonals, else a parallelogram of the same sides (d1² − d2² = 4·a·b·cos angle).
 * 3000 × 2400 mm, diagonals 10 mm apart: a corner 0.153° out, 6.4 mm over the width.
 */
export const diagonals: Calculator = {
  id: 'diagonals',
  version: 1,
  title: 'Both diagonals',
  question: 'Is it square, and which end moves?',
  help: 'When opposite sides are equal and both diagonals read the same, all four corners are square. The difference tells at once how far to push, and which way. Check it before the pour: afterwards it is concrete.',
  inputs: [
    {
      name: 'length',
      label: 'Long side',
      quantity: 'length',
      help: 'Inside face to inside face.',
      initial: { metric: '2600', imperial: `8' 6"` },
      min: 0.3,
      max: 30,
    },
    {
      name: 'width',
      label: 'Short side',
      quantity: 'length',
      help: 'Inside face to inside face.',
      initial: { metric: '1100', imperial: `3' 6"` },
      min: 0.3,
      max: 30,
    },
    diagonalInput('diagonal1', 'First diagonal', 'Back left corner to front right.'),
    diagonalInput(
      'diagonal2',
      'Second diagonal',
      'Back right corner to front left, the tape pulled the same.',
    ),
    {
      name: 'tolerance',
      label: 'Square within',
      quantity: 'length',
      help: 'How far apart the diagonals may be.',
      assumed: true,
      initial: { metric: '5', imperial: '3/16"' },
      min: 0,
      max: 0.05,
    },
  ],
  outputs: [
    {
      name: 'square',
      label: 'Square',
      quantity: 'choice',
      choices: [
        { value: 'yes', label: 'Yes' },
        { value: 'no', label: 'No' },
      ],
    },
    { name: 'expected', label: 'Both should read', quantity: 'length' },
    { name: 'difference', label: 'They are apart by', quantity: 'length' },
    { name: 'moveBy', label: 'Slide the long side by', quantity: 'length' },
    { name: 'cornerError', label: 'Corner out by', quantity: 'angle' },
    {
      name: 'longer',
      label: 'Longer one',
      quantity: 'choice',
      choices: [
        { value: 'first', label: 'The first' },
        { value: 'second', label: 'The second' },
        { value: 'same', label: 'Neither' },
      ],
    },
  ],
  compute,
  steps: diagonalsSteps,
  slips: diagonalsSlips,
  cautions: [
    {
      title: 'A braced form can spring',
      text: 'Slide boards with pegs half driven and keep hands from between board and peg. Brace before you backfill.',
    },
    {
      title: 'Where it stands',
      text: 'Distances to the boundary and permits follow the local code. Ask before you fix the form.',
    },
  ],
  sources: [
    {
      title: 'US Army subcourse EN0069, Carpentry',
      detail: 'equal diagonals, square corners',
      kind: 'published',
    },
    { title: 'Parallelogram law', detail: 'd1² − d2² = 4·a·b·cos(angle)', kind: 'published' },
    {
      title: '5 mm or 3/16 in apart counts as square for a small form',
      kind: 'common practice, no source',
    },
  ],
  example: {
    inputs: {
      length: '2600 mm',
      width: '1100 mm',
      diagonal1: '2826 mm',
      diagonal2: '2820 mm',
      tolerance: '5 mm',
    },
    outputs: {
      expected: 2.82312,
      difference: 0.006,
      cornerError: 0.00296119,
      moveBy: 0.00325731,
      square: 'no',
      longer: 'first',
    },
  },
}
