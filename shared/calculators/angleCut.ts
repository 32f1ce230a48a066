import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { angleCutSlips } from './angleCutSlips'
import { angleCutSteps } from './angleCutSteps'
import { numberOf } from './values'
import type { UnitSystem } from '../contracts/exercises'
import { formatQuantity } from '../units/format'

const DEGREE = Math.PI / 180
/** Less than this is no short point at all: a thousandth of a millimetre. */
const NOTHING = 1e-6

function compute(values: Values, system: UnitSystem): Values {
  const longPoint = numberOf(values, 'longPoint')
  const offset = numberOf(values, 'boardWidth') * Math.tan(numberOf(values, 'angle'))
  if (offset > longPoint - NOTHING) {
    throw new CalculatorInputError(
      'longPoint',
      `The cut takes ${formatQuantity(offset, 'length', system)} of the length and runs out at the other end. Make the piece longer, or check the angle: it is measured from square across.`,
    )
  }
  return { offset, shortPoint: longPoint - offset }
}

/**
 * Long and short point of a cut at an angle: offset = board width × tan(angle off square), short point = long point − offset.
 * Metres and radians; trigonometry of the right triangle. 140 mm at 30°: 80.8 mm, so 895 mm long is 814.2 mm short.
 */
export const angleCut: Calculator = {
  id: 'angle-cut',
  version: 1,
  title: 'Angle cut: long and short point',
  question: 'Where does the short point fall?',
  help: 'A piece with a slanting end has two lengths: to its long point and to its short one. Mix them up and it is too short by the whole slant. Work out the difference once, set the saw once, and stop every piece against the same block.',
  inputs: [
    {
      name: 'boardWidth',
      label: 'Board width, measured',
      quantity: 'length',
      help: 'Across the face that shows the slant.',
      initial: { metric: '140', imperial: '5-1/2"' },
      min: 0.01,
      max: 1.3,
    },
    {
      name: 'angle',
      label: 'Angle, off square',
      quantity: 'angle',
      help: 'As the saw is set: 0° is straight across.',
      initial: { metric: '30', imperial: '30' },
      min: 0.1 * DEGREE,
      max: 80 * DEGREE,
    },
    {
      name: 'longPoint',
      label: 'Length to the long point',
      quantity: 'length',
      help: 'From the square end.',
      initial: { metric: '895', imperial: `3'` },
      min: 0.02,
      max: 12,
    },
  ],
  outputs: [
    { name: 'offset', label: 'Long point to short point, along the board', quantity: 'length' },
    { name: 'shortPoint', label: 'Length to the short point', quantity: 'length' },
  ],
  compute,
  steps: angleCutSteps,
  slips: angleCutSlips,
  cautions: [
    {
      title: 'At the saw',
      text: 'Clamp the piece, keep hands well away from the blade, and let it stop before you lift the piece or the offcut. Eye and ear protection, and a dust mask. Hold no short piece by hand: cut it from a longer one.',
    },
    {
      title: 'Try it first',
      text: 'Cut one from scrap and hold it in place: the scale of a saw is seldom true to half a degree.',
    },
  ],
  sources: [
    { title: 'Right triangle', detail: 'tangent: slant along ÷ width across', kind: 'from memory' },
    { title: 'Angle measured from a square cut', kind: 'common practice, no source' },
  ],
  example: {
    inputs: { boardWidth: '140 mm', angle: '30 deg', longPoint: '895 mm' },
    outputs: { offset: 0.080829, shortPoint: 0.814171 },
  },
}
