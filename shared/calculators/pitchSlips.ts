import type { Slip, Values } from './calculator'
import { numberOf } from './values'

const ratioOf = (outputs: Values) => numberOf(outputs, 'ratio')
const degreesOf = (outputs: Values) => (numberOf(outputs, 'degrees') * 180) / Math.PI
const radians = (degrees: number) => (degrees * Math.PI) / 180
/** The angle whose sine is the slope: undefined for slopes steeper than 1 in 1. */
const arcSine = (outputs: Values) =>
  ratioOf(outputs) <= 1 ? Math.asin(ratioOf(outputs)) : undefined

/** The known ways to get `pitch` wrong. */
export const pitchSlips: Slip[] = [
  {
    id: 'percent-as-degrees',
    title: 'Per cent given as degrees',
    output: 'degrees',
    wrong: (_values, outputs) => radians(numberOf(outputs, 'percent')),
    sentence: 'That is the slope in per cent.',
    wayBack: 'Degrees come from the arctangent of rise over run; 100 per cent is 45 degrees.',
  },
  {
    id: 'sine-for-tangent',
    title: 'Sine for tangent',
    output: 'degrees',
    wrong: (_values, outputs) => arcSine(outputs),
    sentence: 'That sets the rise against the slope length.',
    wayBack: 'Pitch is rise over level run: take the arctangent, not the arcsine.',
  },
  {
    id: 'from-the-plumb-line',
    title: 'Measured from upright',
    output: 'degrees',
    wrong: (_values, outputs) => Math.PI / 2 - numberOf(outputs, 'degrees'),
    sentence: 'That is the angle from upright.',
    wayBack: 'Pitch is measured from level: put the rise over the run, not the run over the rise.',
  },
  {
    id: 'degrees-as-percent',
    title: 'Degrees given as per cent',
    output: 'percent',
    wrong: (_values, outputs) => degreesOf(outputs),
    sentence: 'That is the slope in degrees.',
    wayBack: 'Per cent is rise over run, times 100.',
  },
  {
    id: 'rise-over-slope',
    title: 'Rise over slope length',
    output: 'percent',
    wrong: (_values, outputs) => 100 * Math.sin(numberOf(outputs, 'degrees')),
    sentence: 'That sets the rise against the slope length.',
    wayBack: 'Divide by the level run: use the tangent, not the sine.',
  },
  {
    id: 'ratio-for-percent',
    title: 'Not times 100',
    output: 'percent',
    wrong: (_values, outputs) => ratioOf(outputs),
    sentence: 'That is the plain ratio.',
    wayBack: 'Per cent is out of 100: multiply by 100.',
  },
  {
    id: 'rise-in-10',
    title: 'Rise in 10',
    output: 'risePer12',
    wrong: (_values, outputs) => 10 * ratioOf(outputs),
    sentence: 'That is the rise in 10.',
    wayBack: 'The square counts in twelves: multiply the ratio by 12.',
  },
  {
    id: 'sine-in-12',
    title: 'Twelve along the slope',
    output: 'risePer12',
    wrong: (_values, outputs) => 12 * Math.sin(numberOf(outputs, 'degrees')),
    sentence: 'That lays the 12 along the slope.',
    wayBack: 'The 12 is level; only the rafter goes along the slope.',
  },
  {
    id: 'ratio-upside-down',
    title: 'Run over rise',
    output: 'ratio',
    wrong: (_values, outputs) => 1 / ratioOf(outputs),
    sentence: 'That is run over rise.',
    wayBack: 'Turn it round: rise comes first.',
  },
  {
    id: 'span-for-run',
    title: 'Span for run',
    output: 'ratio',
    wrong: (_values, outputs) => ratioOf(outputs) / 2,
    sentence: 'That divides by the whole span.',
    wayBack: 'The run is half the span of a roof with two slopes.',
  },
  {
    id: 'rise-and-run-added',
    title: 'Rise and run added',
    output: 'lengthPerRun',
    wrong: (_values, outputs) => 1 + ratioOf(outputs),
    sentence: 'That goes along and then up.',
    wayBack: 'The rafter goes straight: square both, add, take the square root.',
  },
  {
    id: 'no-root',
    title: 'Forgot the root',
    output: 'lengthPerRun',
    wrong: (_values, outputs) => 1 + ratioOf(outputs) ** 2,
    sentence: 'That is the sum of the squares.',
    wayBack: 'One step is left: take the square root.',
  },
  {
    id: 'common-for-hip',
    title: 'Common rafter for hip',
    output: 'hipPerRun',
    wrong: (_values, outputs) => numberOf(outputs, 'lengthPerRun'),
    sentence: 'That is the common rafter.',
    wayBack: 'A hip runs across the corner: its run squared is 1 + 1.',
  },
  {
    id: 'root-two-times-common',
    title: 'Common rafter times √2',
    output: 'hipPerRun',
    wrong: (_values, outputs) => Math.SQRT2 * numberOf(outputs, 'lengthPerRun'),
    sentence: 'That makes the hip rise more than the roof does.',
    wayBack: 'Only the run grows by √2; the rise stays: √(1 + 1 + ratio²).',
  },
]
