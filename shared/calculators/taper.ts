import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { taperSlips } from './taperSlips'
import { taperSteps } from './taperSteps'
import { numberOf, wordOf } from './values'
import { formatQuantity } from '../units/format'
import type { UnitSystem } from '../contracts/exercises'

/** How many gaps come off the opening: one beside the board before, two where the stop keeps one as well. */
const gapsOf = (values: Values): number => (wordOf(values, 'gapAtStop') === 'yes' ? 2 : 1)

/** What is left of an opening for the board, refused where the gap alone fills it. */
function cutOf(values: Values, name: string, system: UnitSystem): number {
  const opening = numberOf(values, name)
  const gaps = gapsOf(values) * numberOf(values, 'gap')
  if (opening > gaps + 1e-9) return opening - gaps
  const length = (metres: number) => formatQuantity(metres, 'length', system)
  throw new CalculatorInputError(
    name,
    `The gap of ${length(gaps)} fills this end of ${length(opening)}: there is no room for a board. Leave the board out, or take off the board before and rip two.`,
  )
}

function compute(values: Values, system: UnitSystem): Values {
  const boardWidth = numberOf(values, 'boardWidth')
  const cutStart = cutOf(values, 'openingStart', system)
  const cutEnd = cutOf(values, 'openingEnd', system)
  return {
    cutStart,
    cutEnd,
    wasteStart: boardWidth - cutStart,
    angle: Math.atan(Math.abs(cutStart - cutEnd) / numberOf(values, 'length')),
    fits: Math.max(cutStart, cutEnd) <= boardWidth + 1e-9 ? 'yes' : 'no',
  }
}

const length = { quantity: 'length' } as const

/**
 * The last board ripped to a taper: cut = opening − gap at each end, waste = board − cut, angle = arctan(|start − end| ÷ length).
 * Metres and radians; common practice. Opening 118 to 103 mm, gap 5, board 140, 2400 long: 113 and 98 mm, 0.36°.
 */
export const taper: Calculator = {
  id: 'taper',
  version: 1,
  title: 'Taper: the last board',
  question: 'How wide is the last board at each end?',
  help: 'The last opening is hardly ever the same at both ends. Measure it at both, from the board before to the stop, take the gap off each, mark both widths and rip along the line between them. Then the gap stays even from end to end.',
  inputs: [
    {
      ...length,
      name: 'openingStart',
      label: 'Opening at the start',
      help: 'Board to stop, square across.',
      initial: { metric: '118', imperial: '4-5/8"' },
      min: 0.005,
      max: 1,
    },
    {
      ...length,
      name: 'openingEnd',
      label: 'Opening at the far end',
      help: 'Board to stop, square across.',
      initial: { metric: '103', imperial: '4"' },
      min: 0.005,
      max: 1,
    },
    {
      ...length,
      name: 'gap',
      label: 'Gap to keep',
      help: 'As between the boards before.',
      initial: { metric: '5', imperial: '3/16"' },
      min: 0,
      max: 0.1,
    },
    {
      name: 'gapAtStop',
      label: 'A gap at the stop as well',
      quantity: 'choice',
      initial: { metric: 'no', imperial: 'no' },
      choices: [
        { value: 'no', label: 'No, against the stop' },
        { value: 'yes', label: 'Yes, the same gap' },
      ],
    },
    {
      ...length,
      name: 'boardWidth',
      label: 'Board width, measured',
      help: 'The real board, not its name.',
      initial: { metric: '140', imperial: '5-1/2"' },
      min: 0.02,
      max: 1.3,
    },
    {
      ...length,
      name: 'length',
      label: 'Length of the board',
      help: 'Between the two ends measured.',
      initial: { metric: '2400', imperial: `8'` },
      min: 0.1,
      max: 12,
    },
  ],
  outputs: [
    { ...length, name: 'cutStart', label: 'Board at the start' },
    { ...length, name: 'cutEnd', label: 'Board at the far end' },
    { ...length, name: 'wasteStart', label: 'Comes off at the start, saw cut included' },
    { name: 'angle', label: 'Angle of the rip', quantity: 'angle' },
    {
      name: 'fits',
      label: 'The board is wide enough',
      quantity: 'choice',
      choices: [
        { value: 'yes', label: 'Yes' },
        { value: 'no', label: 'No' },
      ],
    },
  ],
  compute,
  steps: taperSteps,
  slips: taperSlips,
  cautions: [
    {
      title: 'Ripping a board',
      text: 'Clamp it down and guide the saw along a straight edge; eye and ear protection, a dust mask, both hands away from the line. A board must never be ripped freehand on a table saw: it jams and is thrown back.',
    },
    {
      title: 'Narrow ends',
      text: 'A strip narrower than about a third of the board splits at its screws. Share the taper over the last few boards instead.',
    },
    {
      title: 'What you saw and cut into',
      text: 'Treated wood makes harmful dust: saw outdoors, never burn offcuts. Look for screws and cables along the line first.',
    },
  ],
  sources: [
    { title: 'Measure both ends, take the gap off each', kind: 'common practice, no source' },
    { title: 'A third of the board as the least width', kind: 'common practice, no source' },
  ],
  example: {
    inputs: {
      openingStart: '118 mm',
      openingEnd: '103 mm',
      gap: '5 mm',
      boardWidth: '140 mm',
      length: '2400 mm',
    },
    outputs: { cutStart: 0.113, cutEnd: 0.098, wasteStart: 0.027, angle: 0.00624992, fits: 'yes' },
  },
}
