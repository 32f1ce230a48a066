import type { Slip, Values } from './calculator'
import { numberOf, optionalNumber } from './values'
import { roundDownTo } from '../units/number'

const boards = (values: Values) => numberOf(values, 'boards')
const supports = (values: Values) => numberOf(values, 'supports')
const each = (values: Values) => numberOf(values, 'perCrossing')
const driven = (outputs: Values) => numberOf(outputs, 'driven')

/** The known ways to get `fixings` wrong. */
export const fixingsSlips: Slip[] = [
  {
    id: 'one-at-a-crossing',
    title: 'One at each crossing',
    output: 'driven',
    wrong: (values) => (each(values) > 1 ? boards(values) * supports(values) : undefined),
    sentence: 'That puts one at each crossing: a board held by one turns and cups.',
    wayBack: 'Multiply by how many go in at each crossing.',
  },
  {
    id: 'gaps-for-supports',
    title: 'Gaps counted for supports',
    output: 'driven',
    wrong: (values) => boards(values) * (supports(values) - 1) * each(values),
    sentence: 'That counts the gaps between the supports, one fewer than there are.',
    wayBack: 'A board is held at both ends too: count the supports themselves.',
  },
  {
    id: 'one-board',
    title: 'One board only',
    output: 'driven',
    wrong: (values) => (boards(values) > 1 ? supports(values) * each(values) : undefined),
    sentence: 'That holds one board.',
    wayBack: 'Multiply by the boards.',
  },
  {
    id: 'spare-forgotten',
    title: 'Spare left out',
    output: 'fixings',
    wrong: (_values, outputs) => driven(outputs),
    sentence: 'That is what goes in, with none to lose.',
    wayBack: 'Add the spare, then round up.',
  },
  {
    id: 'spare-rounded-down',
    title: 'Rounded down',
    output: 'fixings',
    wrong: (values, outputs) =>
      roundDownTo(driven(outputs) * (1 + numberOf(values, 'spare') / 100), 1),
    sentence: 'That is rounded down.',
    wayBack: 'There is no part of a screw: round up.',
  },
  {
    id: 'spare-as-a-count',
    title: 'Per cent taken for pieces',
    output: 'fixings',
    wrong: (values, outputs) => driven(outputs) + numberOf(values, 'spare'),
    sentence: 'That adds the per cent as if they were pieces.',
    wayBack: 'Per cent is for every hundred: multiply by 1 and the hundredths.',
  },
  {
    id: 'boxes-rounded-down',
    title: 'Boxes rounded down',
    output: 'boxes',
    wrong: (values, outputs) =>
      Math.floor(numberOf(outputs, 'fixings') / numberOf(values, 'boxSize')),
    sentence: 'That is rounded down: the last boards stay loose.',
    wayBack: 'Boxes are bought whole: round up.',
  },
  {
    id: 'boxes-without-spare',
    title: 'Boxes without spare',
    output: 'boxes',
    wrong: (values, outputs) => Math.ceil(driven(outputs) / numberOf(values, 'boxSize')),
    sentence: 'Those boxes leave none to bend or lose.',
    wayBack: 'Divide what you buy, spare counted, by what is in a box.',
  },
  {
    id: 'twice-as-long',
    title: 'Twice the thickness',
    output: 'nailLength',
    wrong: (values) => {
      const thickness = optionalNumber(values, 'thickness')
      return thickness === undefined ? undefined : 2 * thickness
    },
    sentence: 'That holds no deeper in the support than the board is thick.',
    wayBack: 'Two thirds of the nail belong in the support: take three times the thickness.',
  },
]
