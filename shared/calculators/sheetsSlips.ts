import type { Slip, Values } from './calculator'
import { numberOf } from './values'
import { roundDownTo, roundUp } from '../units/number'

/** A 27 in sheet that covers 24 in gives this much to its neighbour: what a whole sheet is wider than its cover. */
const SIDE_LAP = 3 * 0.0254

const widthToCover = (values: Values) =>
  numberOf(values, 'width') + 2 * numberOf(values, 'sideOverhang')
const slopeToCover = (values: Values) =>
  numberOf(values, 'slopeLength') + numberOf(values, 'eaveOverhang')
const cover = (values: Values) => numberOf(values, 'coverWidth')
const sheet = (values: Values) => numberOf(values, 'sheetLength')
const lap = (values: Values) => numberOf(values, 'endLap')

const acrossSlips: Slip[] = [
  {
    id: 'whole-width-of-a-sheet',
    title: 'Whole width of a sheet used',
    output: 'across',
    wrong: (values) => roundUp(widthToCover(values) / (cover(values) + SIDE_LAP)),
    sentence: 'That lays the sheets edge to edge, with no lap at the side.',
    wayBack: 'Each sheet lies over its neighbour: divide by what it covers, not by how wide it is.',
  },
  {
    id: 'side-overhang-forgotten',
    title: 'Overhang at the sides forgotten',
    output: 'across',
    wrong: (values) => roundUp(numberOf(values, 'width') / cover(values)),
    sentence: 'That ends at the wall on both sides.',
    wayBack: 'Add the overhang twice, left and right, then divide.',
  },
  {
    id: 'across-rounded-down',
    title: 'Rounded down',
    output: 'across',
    wrong: (values) => roundDownTo(widthToCover(values) / cover(values), 1),
    sentence: 'That is rounded down: a strip at the side stays open.',
    wayBack: 'Sheets are bought whole: round up, however small the part.',
  },
  {
    id: 'width-of-the-roof',
    title: 'Width of the roof given',
    output: 'coveredWidth',
    wrong: (values) => widthToCover(values),
    sentence: 'That is the width you want covered, not what whole sheets cover.',
    wayBack: 'Multiply the whole sheets by what one covers; the last one may reach too far.',
  },
]

const rowSlips: Slip[] = [
  {
    id: 'end-lap-forgotten',
    title: 'End lap forgotten',
    output: 'rows',
    wrong: (values) => roundUp(slopeToCover(values) / sheet(values)),
    sentence: 'That lets the sheets meet end to end: the rain goes in at the joint.',
    wayBack: 'Each row lies over the one below: take the lap off the sheet before you divide.',
  },
  {
    id: 'rows-rounded-down',
    title: 'Rounded down',
    output: 'rows',
    wrong: (values) =>
      roundDownTo((slopeToCover(values) - lap(values)) / (sheet(values) - lap(values)), 1),
    sentence: 'That is rounded down: the top of the roof stays open.',
    wayBack: 'A part of a row is a row: round up.',
  },
  {
    id: 'eave-forgotten',
    title: 'Overhang at the eave forgotten',
    output: 'cutLength',
    wrong: (values, outputs) =>
      numberOf(outputs, 'cutLength') - numberOf(values, 'eaveOverhang') || undefined,
    sentence: 'That ends at the edge of the wood, and the drips run down it.',
    wayBack: 'Add what hangs over the eave before you cut.',
  },
  {
    id: 'cut-without-laps',
    title: 'Laps left out of the cut',
    output: 'cutLength',
    wrong: (values, outputs) =>
      numberOf(outputs, 'cutLength') - (numberOf(outputs, 'rows') - 1) * lap(values),
    sentence: 'That is cut without its lap: the top row does not reach the one below.',
    wayBack: 'A whole sheet below gains only its length less the lap: take that off the slope.',
  },
]

/** The known ways to get `sheets` wrong. */
export const sheetsSlips: Slip[] = [
  ...acrossSlips,
  ...rowSlips,
  {
    id: 'by-area',
    title: 'Divided areas',
    output: 'sheets',
    wrong: (values) =>
      roundUp((widthToCover(values) * slopeToCover(values)) / (cover(values) * sheet(values))),
    sentence:
      'That divides one area by the other, as if offcuts grew together and laps cost nothing.',
    wayBack: 'Count whole sheets across, count whole rows, then multiply.',
  },
  {
    id: 'added',
    title: 'Added instead of multiplied',
    output: 'sheets',
    wrong: (_values, outputs) => numberOf(outputs, 'across') + numberOf(outputs, 'rows'),
    sentence: 'That adds the rows to the sheets across.',
    wayBack: 'Every row takes as many sheets as there are across: multiply.',
  },
  {
    id: 'lap-by-habit',
    title: 'Slope not looked at',
    output: 'lapsHold',
    wrong: () => 'yes',
    sentence: 'At this slope wind and rain creep up such a lap.',
    wayBack:
      'Hold the lap against the slope: the flatter, the longer, and below 3 in 12 with sealant.',
  },
]
