import type { Slip, Values } from './calculator'
import { LEAST_BESIDE_BUILDING, LEAST_IN_THE_OPEN, leastFall } from './fallSaid'
import { numberOf, wordOf } from './values'

const FOOT = 0.3048

const dropOf = (outputs: Values) => numberOf(outputs, 'drop')
const ratioOf = (outputs: Values) => numberOf(outputs, 'percent') / 100
const isSaid = (values: Values, name: string) => values[name] !== undefined
/** Between what is enough in the open and what is enough beside a building. */
const isBetween = (outputs: Values) =>
  ratioOf(outputs) >= LEAST_IN_THE_OPEN && ratioOf(outputs) < LEAST_BESIDE_BUILDING - 1e-9
const isBeside = (values: Values) => wordOf(values, 'besideBuilding') === 'yes'

const dropSlips: Slip[] = [
  {
    id: 'per-foot-as-per-metre',
    title: 'Per foot taken as per metre',
    output: 'drop',
    wrong: (values, outputs) => (isSaid(values, 'perFoot') ? dropOf(outputs) * FOOT : undefined),
    sentence: 'That counts the run in metres, but the fall is for each foot.',
    wayBack: 'Turn the run into feet first, then multiply by the fall for one foot.',
  },
  {
    id: 'per-metre-as-per-foot',
    title: 'Per metre taken as per foot',
    output: 'drop',
    wrong: (values, outputs) => (isSaid(values, 'perMetre') ? dropOf(outputs) / FOOT : undefined),
    sentence: 'That counts the run in feet, but the fall is for each metre.',
    wayBack: 'Turn the run into metres first, then multiply by the fall for one metre.',
  },
  {
    id: 'run-left-out',
    title: 'Run left out',
    output: 'drop',
    wrong: (values, outputs) => {
      if (isSaid(values, 'perMetre')) return ratioOf(outputs)
      return isSaid(values, 'perFoot') ? ratioOf(outputs) * FOOT : undefined
    },
    sentence: 'That is the fall of one metre or one foot, not of the whole run.',
    wayBack: 'Multiply it by the run.',
  },
  {
    id: 'run-in-inches',
    title: 'Run left in inches',
    output: 'drop',
    wrong: (values, outputs) => (isSaid(values, 'perFoot') ? dropOf(outputs) * 12 : undefined),
    sentence: 'That lets every inch of the run fall as much as a foot should.',
    wayBack: 'Divide the run in inches by 12, then multiply by the fall for one foot.',
  },
  {
    id: 'percent-not-divided',
    title: 'Per cent not divided by 100',
    output: 'drop',
    wrong: (values, outputs) => (isSaid(values, 'percent') ? dropOf(outputs) * 100 : undefined),
    sentence: 'That takes the per cent as a whole number.',
    wayBack: 'Per cent is out of 100: divide by 100 before you multiply.',
  },
  {
    id: 'degrees-as-percent',
    title: 'Degrees taken as per cent',
    output: 'drop',
    wrong: (values) =>
      isSaid(values, 'angle')
        ? (numberOf(values, 'run') * numberOf(values, 'angle') * 180) / Math.PI / 100
        : undefined,
    sentence: 'That takes the degrees for per cent.',
    wayBack: 'One degree is about 1.75 per cent: use the tangent of the angle.',
  },
  {
    id: 'centimetres',
    title: 'Answered in centimetres',
    output: 'drop',
    wrong: (_values, outputs, system) => (system === 'metric' ? dropOf(outputs) / 10 : undefined),
    sentence: 'That looks like centimetres.',
    wayBack: 'The field asks for millimetres: multiply by 10.',
  },
]

const slopeSlips: Slip[] = [
  {
    id: 'ratio-for-percent',
    title: 'Not times 100',
    output: 'percent',
    wrong: (_values, outputs) => ratioOf(outputs),
    sentence: 'That is drop over run as it stands.',
    wayBack: 'Per cent is out of 100: multiply by 100.',
  },
  {
    id: 'millimetres-as-percent',
    title: 'Millimetres for each metre given as per cent',
    output: 'percent',
    wrong: (_values, outputs) => ratioOf(outputs) * 1000,
    sentence: 'That is millimetres for each metre.',
    wayBack: 'A metre has 1000 of them: divide by 10.',
  },
  {
    id: 'inches-as-percent',
    title: 'Inches for each foot given as per cent',
    output: 'percent',
    wrong: (_values, outputs) => ratioOf(outputs) * 12,
    sentence: 'That is inches for each foot.',
    wayBack: 'A foot has 12 inches: divide by 12, then multiply by 100.',
  },
  {
    id: 'ten-inches',
    title: 'A foot of ten inches',
    output: 'percent',
    wrong: (values, outputs) => (isSaid(values, 'perFoot') ? ratioOf(outputs) * 120 : undefined),
    sentence: 'That counts ten inches in a foot.',
    wayBack: 'A foot has 12 inches: divide by 12, not by 10.',
  },
  {
    id: 'degrees-for-percent',
    title: 'Degrees given as per cent',
    output: 'percent',
    wrong: (_values, outputs) => (numberOf(outputs, 'angle') * 180) / Math.PI,
    sentence: 'That is the angle in degrees.',
    wayBack: 'Per cent is drop over run, times 100.',
  },
  {
    id: 'percent-as-degrees',
    title: 'Per cent given as degrees',
    output: 'angle',
    wrong: (_values, outputs) => (numberOf(outputs, 'percent') * Math.PI) / 180,
    sentence: 'That is the fall in per cent.',
    wayBack: 'Degrees come from the arctangent of drop over run.',
  },
  {
    id: 'radians',
    title: 'Calculator set to radians',
    output: 'angle',
    wrong: (_values, outputs) => (numberOf(outputs, 'angle') * Math.PI) / 180,
    sentence: 'That is the angle in radians.',
    wayBack: 'Set the calculator to degrees, or multiply by 180 and divide by π.',
  },
  {
    id: 'from-the-plumb-line',
    title: 'Measured from upright',
    output: 'angle',
    wrong: (_values, outputs) => Math.PI / 2 - numberOf(outputs, 'angle'),
    sentence: 'That is the angle from upright.',
    wayBack: 'The fall is measured from level: put the drop over the run.',
  },
]

const drainSlips: Slip[] = [
  {
    id: 'judged-in-the-open',
    title: 'The building forgotten',
    output: 'enoughToDrain',
    wrong: (values, outputs) => (isBeside(values) && isBetween(outputs) ? 'yes' : undefined),
    sentence: 'That would do in the open, but not beside a building.',
    wayBack: 'Beside a building a hard surface must fall twice as fast.',
  },
  {
    id: 'judged-beside-a-building',
    title: 'Asked more than needed',
    output: 'enoughToDrain',
    wrong: (values, outputs) => (!isBeside(values) && isBetween(outputs) ? 'no' : undefined),
    sentence: 'That asks for what a surface beside a building needs.',
    wayBack: 'In the open half of it is the least; more does no harm.',
  },
  {
    id: 'judged-by-the-drop',
    title: 'Judged by the drop alone',
    output: 'enoughToDrain',
    wrong: (values, outputs) =>
      ratioOf(outputs) < leastFall(wordOf(values, 'besideBuilding')) - 1e-9 ? 'yes' : undefined,
    sentence: 'That looks at the drop and not at the run it is spread over.',
    wayBack: 'Water feels the slope, not the drop: divide the drop by the run.',
  },
]

/** The known ways to get `fall` wrong. */
export const fallSlips: Slip[] = [...dropSlips, ...slopeSlips, ...drainSlips]
