import type { Calculator, QuantityInput, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { readLidSnow } from './lidSnow'
import { lidSlips } from './lidSlips'
import { lidSteps } from './lidSteps'
import { densityHelp, GRAVITY, snowSources } from './snowCover'
import { numberOf, optionalNumber } from './values'
import { formatQuantity } from '../units/format'
import type { UnitSystem } from '../contracts/exercises'

/** A handle may stand out this far past the front edge, in metres. */
const HANDLE_PAST_EDGE = 0.15
/** What the lifting guide of NIOSH gives one person as the most, held close, in kg. */
export const MOST_TO_LIFT = 23

function compute(values: Values, system: UnitSystem): Values {
  const depth = numberOf(values, 'depth')
  const handle = numberOf(values, 'handleDistance')
  if (handle > depth + HANDLE_PAST_EDGE + 1e-9) {
    throw new CalculatorInputError(
      'handleDistance',
      `The handle stands ${formatQuantity(handle - depth, 'length', system)} past the front edge. Measure depth and handle from the hinge.`,
    )
  }
  const snow = readLidSnow(values)
  const width = optionalNumber(values, 'width')
  if (snow && width === undefined) {
    throw new CalculatorInputError('width', 'Width is empty: snow is weighed by width times depth.')
  }
  const snowWeight = snow ? (snow.load * depth * (width ?? 0)) / GRAVITY : 0
  const weight = numberOf(values, 'weight')
  const liftOf = (mass: number) => (mass * GRAVITY * (depth / 2)) / handle
  return {
    liftForce: liftOf(weight),
    snowWeight,
    liftForceWithSnow: liftOf(weight + snowWeight),
  }
}

const inputs: QuantityInput[] = [
  {
    name: 'weight',
    label: 'Weight of the lid',
    quantity: 'mass',
    help: 'With its sheet, battens and handle; weigh it, or weigh an offcut.',
    initial: { metric: '14', imperial: '30' },
    min: 0.2,
    max: 200,
  },
  {
    name: 'depth',
    label: 'Depth',
    quantity: 'length',
    help: 'From the hinge to the front edge.',
    initial: { metric: '800', imperial: '32' },
    min: 0.1,
    max: 3,
  },
  {
    name: 'handleDistance',
    label: 'From the hinge to the handle',
    quantity: 'length',
    initial: { metric: '750', imperial: '30' },
    min: 0.05,
    max: 3.15,
  },
  {
    name: 'width',
    label: 'Width',
    quantity: 'length',
    help: 'Along the hinge; only the snow needs it.',
    optional: true,
    initial: { metric: '1200', imperial: '48' },
    min: 0.1,
    max: 6,
  },
  {
    name: 'snowDepth',
    label: 'Depth of snow on it',
    quantity: 'length',
    help: 'Empty: no snow, or what the ground snow load gives.',
    optional: true,
    initial: { metric: '200', imperial: '8' },
    min: 0.01,
    max: 3,
  },
  {
    name: 'snowDensity',
    label: 'How dense the snow is',
    quantity: 'massDensity',
    help: densityHelp,
    optional: true,
    initial: { metric: '200', imperial: '12' },
    min: 20,
    max: 950,
  },
  {
    name: 'groundSnowLoad',
    label: 'Or the ground snow load',
    quantity: 'pressure',
    help: 'From your local code or building department.',
    optional: true,
    initial: { metric: '', imperial: '' },
    min: 50,
    max: 20_000,
  },
]

/**
 * Force to lift a hinged lid that lies level, in N: weight × 9.80665 × half the depth ÷ handle's distance, both from the hinge,
 * the force at right angles to the lid. Snow: load × depth × width, its middle over the lid's.
 * 14 kg, 800 mm deep, handle at 750 mm: 73.2 N; under 200 mm of snow at 200 kg/m³, 1200 mm wide, 38.4 kg more: 274 N.
 */
export const lid: Calculator = {
  id: 'lid',
  version: 1,
  title: 'Lid: what it takes to lift it',
  question: 'How hard must you pull to lift this lid, and how hard under snow?',
  help: 'A lid that is easy in summer can be too heavy with snow on it, and a hand that tires lets it fall. A hinge carries a part of it: with the handle at the front edge you lift half. The nearer the handle is to the hinge, the harder it gets.',
  inputs,
  outputs: [
    { name: 'liftForce', label: 'Pull to lift it', quantity: 'force' },
    { name: 'snowWeight', label: 'Weight of the snow on it', quantity: 'mass' },
    { name: 'liftForceWithSnow', label: 'Pull to lift it under snow', quantity: 'force' },
  ],
  compute,
  steps: lidSteps,
  slips: lidSlips,
  cautions: [
    {
      title: 'The local code comes first',
      text: 'The ground snow load of your place stands in the local code; ask the building department. Hinges, stays and a roof that carries snow or people need, where it is required, a licensed engineer.',
    },
    {
      title: 'A lid that falls',
      text: 'It crushes fingers and worse. Fit a stay that holds it open by itself, on both sides where it is heavy, and try it before anybody reaches in. Keep children away from a lid that can shut on them.',
    },
    {
      title: 'Lift within your strength',
      text: `${String(MOST_TO_LIFT)} kg (51 lb), held close, is the most that the lifting guide of NIOSH gives one person. At arm’s length, bent or cold it is much less. Sweep the snow off first; a heavy lid takes two people or a counterweight.`,
    },
  ],
  sources: [
    { title: 'Law of the lever', detail: 'weight at half the depth', kind: 'from memory' },
    ...snowSources,
    {
      title: 'NIOSH lifting equation, as given by CCOHS and OSHA',
      detail: 'load constant 23 kg, 51 lb',
      kind: 'published',
    },
  ],
  example: {
    inputs: {
      weight: '14 kg',
      depth: '800 mm',
      handleDistance: '750 mm',
      width: '1200 mm',
      snowDepth: '200 mm',
      snowDensity: '200 kg/m³',
    },
    outputs: { liftForce: 73.223, snowWeight: 38.4, liftForceWithSnow: 274.063 },
  },
}
