import type { Slip, Values } from './calculator'
import { GRAVITY, PCF, PSF, WATER } from './snowCover'
import { numberOf, optionalNumber } from './values'

/** The ground snow load, where the density follows from it. */
const groundOf = (values: Values) =>
  values['density'] === undefined ? optionalNumber(values, 'groundSnowLoad') : undefined
/** The depth, where the load follows from it. */
const depthOf = (values: Values) => optionalNumber(values, 'depth')

const densitySlips: Slip[] = [
  {
    id: 'fourteen-forgotten',
    title: 'Forgot the 14',
    output: 'density',
    wrong: (values) => {
      const ground = groundOf(values)
      return ground === undefined ? undefined : 0.13 * (ground / PSF) * PCF
    },
    sentence: 'That leaves the 14 out: even a light snow cover packs down.',
    wayBack: 'Multiply the ground snow load by 0.13, then add 14.',
  },
  {
    id: 'kilopascals-in-the-formula',
    title: 'Kilopascals put in for psf',
    output: 'density',
    wrong: (values, _outputs, system) => {
      const ground = system === 'metric' ? groundOf(values) : undefined
      return ground === undefined ? undefined : (0.13 * (ground / 1000) + 14) * PCF
    },
    sentence: 'That puts kilopascals where the rule takes psf.',
    wayBack: 'One kPa is 20.89 psf: turn the load first, then use the rule.',
  },
  {
    id: 'over-the-most',
    title: 'Went over the most',
    output: 'density',
    wrong: (values) => {
      const ground = groundOf(values)
      const loose = ground === undefined ? 0 : 0.13 * (ground / PSF) + 14
      return loose > 30 ? loose * PCF : undefined
    },
    sentence: 'That is denser than the rule lets settled snow become.',
    wayBack: 'However much it snows, stop at the most that the rule gives.',
  },
]

const loadSlips: Slip[] = [
  {
    id: 'taken-for-water',
    title: 'Snow taken for water',
    output: 'load',
    wrong: (values) => {
      const depth = depthOf(values)
      return depth === undefined ? undefined : depth * WATER * GRAVITY
    },
    sentence: 'That weighs the depth as if it were water.',
    wayBack: 'Snow is mostly air: multiply the depth by the snow’s own density.',
  },
  {
    id: 'inches-as-feet',
    title: 'Inches taken for feet',
    output: 'load',
    wrong: (values, outputs, system) =>
      system === 'imperial' && depthOf(values) !== undefined
        ? numberOf(outputs, 'load') * 12
        : undefined,
    sentence: 'That takes the inches of the depth for feet: twelve times too much.',
    wayBack: 'Density is for a cubic foot: divide the depth by 12 first.',
  },
  {
    id: 'pull-forgotten',
    title: 'Kilograms given as newtons',
    output: 'load',
    wrong: (values, outputs, system) =>
      system === 'metric' && depthOf(values) !== undefined
        ? numberOf(outputs, 'load') / GRAVITY
        : undefined,
    sentence: 'That is kilograms on a square metre, not newtons.',
    wayBack: 'A kilogram presses with 9.81 newtons: multiply, then divide by 1000 for kPa.',
  },
  {
    id: 'reduced',
    title: 'Took something off for the roof',
    output: 'load',
    wrong: (values, outputs) =>
      depthOf(values) === undefined ? 0.7 * numberOf(outputs, 'load') : undefined,
    sentence: 'That takes off what an engineer may take off for an open, warm or steep roof.',
    wayBack: 'Here the whole ground snow load lies on the roof.',
  },
]

/** The known ways to get `snow` wrong. */
export const snowSlips: Slip[] = [
  ...densitySlips,
  ...loadSlips,
  {
    id: 'depth-of-water',
    title: 'Depth of the water in it',
    output: 'depth',
    wrong: (_values, outputs) => numberOf(outputs, 'load') / (WATER * GRAVITY),
    sentence: 'That is how deep the water stands when the snow has melted.',
    wayBack: 'Divide by the density of the snow.',
  },
  {
    id: 'one-square',
    title: 'Area left out',
    output: 'weight',
    wrong: (_values, outputs, system) =>
      (numberOf(outputs, 'load') / GRAVITY) * (system === 'metric' ? 1 : 0.3048 ** 2),
    sentence: 'That is what lies on one square of the roof, a metre or a foot each way.',
    wayBack: 'Multiply by the area.',
  },
  {
    id: 'newtons-as-kilograms',
    title: 'Newtons given as kilograms',
    output: 'weight',
    wrong: (_values, outputs, system) =>
      system === 'metric' ? numberOf(outputs, 'weight') * GRAVITY : undefined,
    sentence: 'That is newtons.',
    wayBack: 'A kilogram presses with 9.81 newtons: divide.',
  },
  {
    id: 'kilonewtons-as-kilograms',
    title: 'Kilonewtons given as kilograms',
    output: 'weight',
    wrong: (_values, outputs, system) =>
      system === 'metric' ? (numberOf(outputs, 'weight') * GRAVITY) / 1000 : undefined,
    sentence: 'That is kilonewtons: kPa times square metres.',
    wayBack: 'A kilonewton is the weight of 102 kg: multiply by 1000, then divide by 9.81.',
  },
]
