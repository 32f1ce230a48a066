import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { densityHelp, GRAVITY, readSnow, snowSources } from './snowCover'
import { snowSlips } from './snowSlips'
import { snowSteps } from './snowSteps'
import { numberOf, optionalNumber } from './values'

const empty = { metric: '', imperial: '' }

function compute(values: Values): Values {
  const said = {
    groundSnowLoad: optionalNumber(values, 'groundSnowLoad'),
    depth: optionalNumber(values, 'depth'),
    density: optionalNumber(values, 'density'),
  }
  const snow = readSnow(said, { depth: 'depth', density: 'density' })
  if (!snow) {
    throw new CalculatorInputError(
      'groundSnowLoad',
      'Give the ground snow load of your place, or the depth of the snow and how dense it is.',
    )
  }
  return { weight: (snow.load * numberOf(values, 'area')) / GRAVITY, ...snow }
}

/**
 * Snow on a small roof, in Pa, m, kg/m³ and kg: load = depth × density × 9.80665, weight = load × area ÷ 9.80665.
 * From a ground snow load: density = 0.13 × psf + 14 ≤ 30 lb/ft³ (ASCE 7), and the load is the ground's, nothing taken off.
 * 25 psf (1.197 kPa) on 40 ft² (3.716 m²): 17.25 lb/ft³, 17.4 in deep, 1000 lb (454 kg).
 */
export const snow: Calculator = {
  id: 'snow',
  version: 1,
  title: 'Snow: what lies on a small roof',
  question: 'What does the snow on this roof weigh?',
  help: 'Knee-deep wet snow weighs as much as two or three people on every square metre. How deep it looks says little: wet snow weighs ten times what fresh snow does. Your building department knows the load that your place must be built for.',
  inputs: [
    {
      name: 'groundSnowLoad',
      label: 'Ground snow load',
      quantity: 'pressure',
      help: 'From your local code or building department.',
      optional: true,
      initial: { metric: '1.2', imperial: '25' },
      min: 50,
      max: 20_000,
    },
    {
      name: 'depth',
      label: 'Depth of the snow',
      quantity: 'length',
      help: 'Of snow that lies there now, instead of the ground snow load.',
      optional: true,
      initial: empty,
      min: 0.01,
      max: 6,
    },
    {
      name: 'density',
      label: 'How dense it is',
      quantity: 'massDensity',
      help: densityHelp,
      optional: true,
      initial: empty,
      min: 20,
      max: 950,
    },
    {
      name: 'area',
      label: 'Area of the roof',
      quantity: 'area',
      help: 'As seen from above, overhangs with it.',
      initial: { metric: '4', imperial: '40' },
      min: 0.05,
      max: 200,
    },
  ],
  outputs: [
    { name: 'weight', label: 'Weight of the snow', quantity: 'mass' },
    { name: 'load', label: 'Load on the roof', quantity: 'pressure' },
    { name: 'depth', label: 'Depth of the snow', quantity: 'length' },
    { name: 'density', label: 'How dense it is', quantity: 'massDensity' },
  ],
  compute,
  steps: snowSteps,
  slips: snowSlips,
  cautions: [
    {
      title: 'The local code comes first',
      text: 'The ground snow load of your place, and what a roof must carry, stand in the local code. Ask the building department; anything people stand under needs, where it is required, a licensed engineer. This weighs snow; it does not say that a roof holds it.',
    },
    {
      title: 'Not spread evenly',
      text: 'Snow drifts deeper beside a wall, slides from a roof above, and rain soaks into it. All of that can double the load, and none of it is counted here.',
    },
    {
      title: 'Clearing a roof',
      text: 'Never climb on a roof in snow. Pull it off from the ground with a rake, standing to the side. A roof that sags or creaks: stay out from under it and call for help.',
    },
  ],
  sources: [
    ...snowSources,
    {
      title: 'University of Arkansas Extension, water in snow',
      detail: 'from 3 per cent when dry to 33 when wet and heavy; as quoted',
      kind: 'published',
    },
  ],
  example: {
    inputs: { groundSnowLoad: '25 psf', area: '40 ft²' },
    outputs: { weight: 453.592, load: 1197.01, depth: 0.441739, density: 276.318 },
  },
}
