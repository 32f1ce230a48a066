import type { Calculator, Step, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, optionalNumber, stepWriter } from './values'
import { roundDownTo } from '../units/number'
import { formatQuantity } from '../units/format'

/** Steps that are easy to find on a tape: 50 mm, 1 in. */
const EASY_STEP: Record<UnitSystem, number> = { metric: 0.05, imperial: 0.0254 }
/** A common form board; what a mark on the wrong face is off by. An assumption. */
const BOARD = 0.038

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

function steps(values: Values, outputs: Values, system: UnitSystem): Step[] {
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

const unitOf = (outputs: Values) => numberOf(outputs, 'unit')
const shortOf = (values: Values) => Math.min(numberOf(values, 'sideA'), numberOf(values, 'sideB'))
const longOf = (values: Values) => Math.max(numberOf(values, 'sideA'), numberOf(values, 'sideB'))

/**
 * The 3-4-5 triangle: legs of 3 and 4 units make a right angle when the tape across reads 5.
 * Unit: the largest that fits both sides, down to 50 mm or 1 in. 2600 × 1100 mm: 350, so 1050, 1400 and 1750 mm.
 */
export const square: Calculator = {
  id: 'square',
  version: 1,
  title: 'Straight across a corner (3-4-5)',
  question: 'What must the tape read across the corner?',
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
  steps,
  slips: [
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
  ],
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
