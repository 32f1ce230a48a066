import type { Slip, Values } from './calculator'
import { readLidSnow } from './lidSnow'
import { GRAVITY, WATER } from './snowCover'
import { numberOf } from './values'

const half = (values: Values) => numberOf(values, 'depth') / 2
const handle = (values: Values) => numberOf(values, 'handleDistance')
const lidForce = (values: Values) => numberOf(values, 'weight') * GRAVITY
const snowForce = (outputs: Values) => numberOf(outputs, 'snowWeight') * GRAVITY
const snowOrNone = (outputs: Values, force: number) =>
  numberOf(outputs, 'snowWeight') > 0 ? force : undefined

const liftSlips: Slip[] = [
  {
    id: 'whole-weight',
    title: 'Whole weight lifted',
    output: 'liftForce',
    wrong: (values) => lidForce(values),
    sentence: 'That is the weight of the whole lid, as if there were no hinge.',
    wayBack: 'Multiply by half the depth, then divide by the distance from hinge to handle.',
  },
  {
    id: 'always-half',
    title: 'Half, wherever the handle is',
    output: 'liftForce',
    wrong: (values) => lidForce(values) / 2,
    sentence: 'Half the weight is right only for a handle at the very edge.',
    wayBack: 'Divide by the distance from the hinge to the handle, as it is.',
  },
  {
    id: 'weight-at-the-edge',
    title: 'Weight put at the front edge',
    output: 'liftForce',
    wrong: (values) => (lidForce(values) * 2 * half(values)) / handle(values),
    sentence: 'That hangs all the weight on the front edge.',
    wayBack: 'An even lid pulls at its middle: take half the depth.',
  },
  {
    id: 'lever-upside-down',
    title: 'Lever upside down',
    output: 'liftForce',
    wrong: (values) => (lidForce(values) * handle(values)) / half(values),
    sentence: 'That makes a longer handle harder to lift.',
    wayBack: 'Multiply by half the depth and divide by the distance to the handle.',
  },
  {
    id: 'kilograms-as-newtons',
    title: 'Kilograms given as newtons',
    output: 'liftForce',
    wrong: (_values, outputs, system) =>
      system === 'metric' ? numberOf(outputs, 'liftForce') / GRAVITY : undefined,
    sentence: 'That is kilograms.',
    wayBack: 'A kilogram pulls with 9.81 newtons: multiply.',
  },
]

/** The known ways to get `lid` wrong. */
export const lidSlips: Slip[] = [
  ...liftSlips,
  {
    id: 'snow-as-water',
    title: 'Snow taken for water',
    output: 'snowWeight',
    wrong: (values) => {
      const snow = readLidSnow(values)
      if (!snow || values['snowDepth'] === undefined) return undefined
      return snow.depth * WATER * numberOf(values, 'depth') * numberOf(values, 'width')
    },
    sentence: 'That weighs the snow as if it were water.',
    wayBack: 'Snow is mostly air: multiply by its own density.',
  },
  {
    id: 'snow-a-square',
    title: 'Area left out',
    output: 'snowWeight',
    wrong: (values, _outputs, system) => {
      const load = readLidSnow(values)?.load
      if (load === undefined) return undefined
      return (load / GRAVITY) * (system === 'metric' ? 1 : 0.3048 ** 2)
    },
    sentence: 'That is the snow on one square, a metre or a foot each way.',
    wayBack: 'Multiply by the depth and the width of the lid.',
  },
  {
    id: 'snow-forgotten',
    title: 'Snow left out',
    output: 'liftForceWithSnow',
    wrong: (_values, outputs) => snowOrNone(outputs, numberOf(outputs, 'liftForce')),
    sentence: 'That is the bare lid.',
    wayBack: 'Add the weight of the snow before you use the lever.',
  },
  {
    id: 'snow-alone',
    title: 'Lid left out',
    output: 'liftForceWithSnow',
    wrong: (values, outputs) =>
      snowOrNone(outputs, (snowForce(outputs) * half(values)) / handle(values)),
    sentence: 'That lifts the snow without the lid.',
    wayBack: 'Add lid and snow, then use the lever.',
  },
  {
    id: 'snow-without-the-lever',
    title: 'Snow added after the lever',
    output: 'liftForceWithSnow',
    wrong: (_values, outputs) =>
      snowOrNone(outputs, numberOf(outputs, 'liftForce') + snowForce(outputs)),
    sentence: 'That adds the whole weight of the snow, as if there were no hinge.',
    wayBack: 'The snow lies on the middle like the lid’s own weight: use the same lever.',
  },
]
