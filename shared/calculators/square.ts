import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { squareSlips } from './squareSlips'
import { EASY_STEP, squareSteps } from './squareSteps'
import { numberOf, optionalNumber } from './values'
import { roundDownTo } from '../units/number'
import { formatQuantity } from '../units/format'

function compute(values: Values, system: UnitSystem): Values {
  const sideA = numberOf(values, 'sideA')
  const sideB = numberOf(values, 'sideB')
  const largestUnit = Math.min(Math.min(sideA, sideB) / 3, Math.max(sideA, sideB) / 4)
  const unit = optionalNumber(values, 'unit') ?? roundDownTo(largestUnit, EASY_STEP[system])
  if (unit > largestUnit * (1 + 1e-9)) {
    throw new CalculatorInputError(
      'unit',
      `One unit of ${formatQuantity(unit, 'length', system)} does not fit these sides: three go along the short one, four along the long one. The most that fits is ${formatQuantity(largestUnit, 'length', system)}.`,
    )
  }
  return { unit, legShort: 3 * unit, legLong: 4 * unit, diagonal: 5 * unit, largestUnit }
}

/**
 * The 3-4-5 triangle: legs of 3 and 4 units make a right angle when the tape across reads 5.
 * Unit: the largest that fits both sides, down to 50 mm or 1 in. 2600 × 1100 mm: 350, so 1050, 1400 and 1750 mm.
 */
export const square: Calculator = {
  id: 'square',
  version: 1,
  title: 'Straight across a corner (3-4-5)',
  question: 'What must the tape read across the corner?',
  help: 'A form that is out of square is found again at every board, at the roof and at the door. Three, four and five units make a true corner with nothing but a tape. The bigger the triangle, the less a small error on the tape counts.',
  inputs: [
    {
      name: 'sideA',
      label: 'Long side',
      quantity: 'length',
      help: 'Inside face of the board.',
      initial: { metric: '2600', imperial: `8' 6"` },
      min: 0.3,
      max: 30,
    },
    {
      name: 'sideB',
      label: 'Short side',
      quantity: 'length',
      help: 'Inside face of the board.',
      initial: { metric: '1100', imperial: `3' 6"` },
      min: 0.3,
      max: 30,
    },
    {
      name: 'unit',
      label: 'One unit of the 3-4-5',
      quantity: 'length',
      help: 'Empty: the biggest that fits and is easy to mark.',
      optional: true,
      initial: { metric: '', imperial: '' },
      min: 0.05,
      max: 7.5,
    },
  ],
  outputs: [
    { name: 'diagonal', label: 'Diagonal: tape reads, mark to mark', quantity: 'length' },
    { name: 'legShort', label: 'Mark on the short side (3)', quantity: 'length' },
    { name: 'legLong', label: 'Mark on the long side (4)', quantity: 'length' },
    { name: 'unit', label: 'One unit', quantity: 'length' },
    { name: 'largestUnit', label: 'Biggest unit that fits', quantity: 'length' },
  ],
  compute,
  steps: squareSteps,
  slips: squareSlips,
  cautions: [
    {
      title: 'Before you drive a peg',
      text: 'Have buried cables and pipes located, and wait for the answer.',
    },
    {
      title: 'Where the corner stands',
      text: 'Distances to the boundary and permits follow the local code. Ask before you set out.',
    },
  ],
  sources: [
    { title: 'US Army subcourse EN0069, Carpentry', detail: '3-4-5, 6-8-10', kind: 'published' },
    {
      title: 'CMHC, Canadian Wood-Frame House Construction',
      detail: '300, 400 and 500 mm',
      kind: 'published',
    },
    { title: 'Unit rounded down to 50 mm or 1 in', kind: 'common practice, no source' },
  ],
  example: {
    inputs: { sideA: '2600 mm', sideB: '1100 mm', unit: '300 mm' },
    outputs: { unit: 0.3, legShort: 0.9, legLong: 1.2, diagonal: 1.5, largestUnit: 0.366667 },
  },
}
