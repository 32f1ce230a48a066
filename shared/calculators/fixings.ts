import type { Calculator, QuantityInput, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { fixingsSlips } from './fixingsSlips'
import { fixingsSteps, THICKNESSES_OF_A_NAIL } from './fixingsSteps'
import { numberOf, optionalNumber } from './values'
import { roundUp } from '../units/number'

const WHOLE = ['boards', 'supports', 'perCrossing', 'boxSize'] as const

function compute(values: Values): Values {
  const broken = WHOLE.find((name) => !Number.isInteger(numberOf(values, name)))
  if (broken) throw new CalculatorInputError(broken, 'Count whole ones: 4, not 4.5.')
  const driven =
    numberOf(values, 'boards') * numberOf(values, 'supports') * numberOf(values, 'perCrossing')
  const fixings = roundUp(driven * (1 + numberOf(values, 'spare') / 100))
  const thickness = optionalNumber(values, 'thickness')
  return {
    fixings,
    boxes: roundUp(fixings / numberOf(values, 'boxSize')),
    driven,
    nailLength: thickness === undefined ? undefined : thickness * THICKNESSES_OF_A_NAIL,
  }
}

const count = (
  name: string,
  [label, help]: [string, string],
  [metric, imperial]: [string, string],
  max: number,
): QuantityInput => ({
  name,
  label,
  quantity: 'count',
  help,
  initial: { metric, imperial },
  min: 1,
  max,
})

/**
 * Screws or nails to buy: boards × supports × fixings at each crossing, with spare, up to whole ones, then up to whole boxes.
 * A nail is at least three times as long as what it holds is thick.
 * 22 boards on 7 supports, 2 at each crossing: 308 go in, 339 with 10 % spare, 4 boxes of 100; through 20 mm, nails of 60 mm.
 */
export const fixings: Calculator = {
  id: 'fixings',
  version: 1,
  title: 'Screws or nails to buy',
  question: 'How many screws or nails, and how many boxes?',
  help: 'Two at every crossing hold a board flat; with one it cups and turns. Count every support, the two at the ends too. A few bend, strip or vanish in the grass, so buy some spare: the last box from another batch never matches.',
  inputs: [
    count('boards', ['Boards', 'That go over the supports.'], ['22', '22'], 1000),
    count('supports', ['Supports', 'Each board crosses, ends counted.'], ['7', '7'], 100),
    count('perCrossing', ['At each crossing', 'Two for most boards.'], ['2', '2'], 12),
    count('boxSize', ['In a box', 'As the box says.'], ['100', '100'], 10_000),
    {
      name: 'spare',
      label: 'Spare',
      quantity: 'percent',
      help: 'For those that bend, strip or are lost.',
      assumed: true,
      initial: { metric: '10', imperial: '10' },
      min: 0,
      max: 50,
    },
    {
      name: 'thickness',
      label: 'Thickness of a board',
      quantity: 'length',
      help: 'For the length of a nail; empty where you use screws.',
      optional: true,
      initial: { metric: '20', imperial: '3/4"' },
      min: 0.003,
      max: 0.1,
    },
  ],
  outputs: [
    { name: 'fixings', label: 'To buy, spare counted', quantity: 'count' },
    { name: 'boxes', label: 'Boxes', quantity: 'count' },
    { name: 'driven', label: 'Go in', quantity: 'count' },
    { name: 'nailLength', label: 'A nail at least', quantity: 'length' },
  ],
  compute,
  steps: fixingsSteps,
  slips: fixingsSlips,
  cautions: [
    {
      title: 'What carries people or weight',
      text: 'Joist hangers, brackets, guards and stairs take the kind, size and number of fixings that their maker and the local code say, not a count from here. Ask the building department and, where it is required, a licensed engineer.',
    },
    {
      title: 'Eyes and hands',
      text: 'Eye protection whenever you drive or pull a nail. Keep your fingers out of the line of the bit and the nail gun, and drill first near the end of a board.',
    },
    {
      title: 'The right metal',
      text: 'Outdoors and in treated wood plain steel rusts away: use what the maker of the wood allows, stainless or hot-dip galvanised.',
    },
  ],
  sources: [
    {
      title: 'US Navy training manual 14119',
      detail: 'a nail at least three times the thickness of what it holds',
      kind: 'published',
    },
    { title: 'Two at each crossing, 10 % spare', kind: 'common practice, no source' },
  ],
  example: {
    inputs: {
      boards: '22',
      supports: '7',
      perCrossing: '2',
      boxSize: '100',
      spare: '10 %',
      thickness: '20 mm',
    },
    outputs: { fixings: 339, boxes: 4, driven: 308, nailLength: 0.06 },
  },
}
