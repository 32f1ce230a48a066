import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { pitchSlips } from './pitchSlips'
import { pitchSteps } from './pitchSteps'
import { numberOf, optionalNumber } from './values'

const STEEPEST = (80 * Math.PI) / 180
const SAID = ['risePer12', 'degrees', 'percent', 'ratio'] as const
const empty = { metric: '', imperial: '' }

/** Rise over run from a slope said as this input says it. */
function ratioSaid(name: string, value: number): number {
  if (name === 'risePer12') return value / 12
  if (name === 'degrees') return Math.tan(value)
  return name === 'percent' ? value / 100 : value
}

/** Rise over run from the one input that was given. */
function readRatio(values: Values): number {
  const given = SAID.filter((name) => values[name] !== undefined)
  const hasRun = values['rise'] !== undefined || values['run'] !== undefined
  const [name, second] = hasRun ? [...given, 'rise'] : given
  if (name === undefined) {
    throw new CalculatorInputError(
      'risePer12',
      'Say the slope in one way: rise in 12, degrees, per cent, a ratio, or rise and run.',
    )
  }
  if (second !== undefined) {
    throw new CalculatorInputError(
      second,
      'The slope is said in two ways. Keep one and empty the others.',
    )
  }
  if (!hasRun) return ratioSaid(name, numberOf(values, name))
  const rise = optionalNumber(values, 'rise')
  const run = optionalNumber(values, 'run')
  if (rise === undefined)
    throw new CalculatorInputError('rise', 'Rise is empty: with a run it takes both.')
  if (run === undefined)
    throw new CalculatorInputError('run', 'Run is empty: with a rise it takes both.')
  return rise / run
}

function compute(values: Values): Values {
  const ratio = readRatio(values)
  const degrees = Math.atan(ratio)
  if (degrees > STEEPEST) {
    throw new CalculatorInputError(
      'rise',
      'That is steeper than 80°: a wall, not a roof. Check rise and run.',
    )
  }
  return {
    degrees,
    percent: ratio * 100,
    risePer12: ratio * 12,
    ratio,
    lengthPerRun: Math.hypot(1, ratio),
    hipPerRun: Math.sqrt(2 + ratio ** 2),
  }
}

/**
 * One slope said in every way; ratio = rise ÷ run, common rafter √(1 + ratio²), hip or valley √(2 + ratio²) a unit of common run.
 * 4 in 12 is 18.43°, 33.33 %, 1:3, 1.0541 and 1.4530.
 */
export const pitch: Calculator = {
  id: 'pitch',
  version: 1,
  title: 'Pitch: one slope, said in every way',
  question: 'What is this slope in degrees, per cent and rise in 12?',
  help: 'Roofing makers say the least pitch in degrees, carpenters say it in 12, builders of paths in per cent. Mixing them up gives a roof that leaks. This turns one into the others and tells how long the slope is for each step along.',
  inputs: [
    {
      name: 'risePer12',
      label: 'Rise in 12',
      quantity: 'risePer12',
      help: 'Inches up in 12 along, the same number in any unit.',
      optional: true,
      initial: { metric: '4', imperial: '4' },
      min: 0.01,
      max: 68,
    },
    {
      name: 'degrees',
      label: 'Degrees',
      quantity: 'angle',
      optional: true,
      initial: empty,
      min: 0.0008,
      max: STEEPEST,
    },
    {
      name: 'percent',
      label: 'Per cent',
      quantity: 'percent',
      optional: true,
      initial: empty,
      min: 0.08,
      max: 567,
    },
    {
      name: 'ratio',
      label: 'Ratio, rise to run',
      quantity: 'ratio',
      help: '1:3, or 1 in 3.',
      optional: true,
      initial: empty,
      min: 0.0008,
      max: 5.67,
    },
    {
      name: 'rise',
      label: 'Rise',
      quantity: 'length',
      help: 'Straight up.',
      optional: true,
      initial: empty,
      min: 0.001,
      max: 30,
    },
    {
      name: 'run',
      label: 'Run',
      quantity: 'length',
      help: 'Level, not along the slope.',
      optional: true,
      initial: empty,
      min: 0.05,
      max: 30,
    },
  ],
  outputs: [
    { name: 'degrees', label: 'Degrees', quantity: 'angle' },
    { name: 'percent', label: 'Per cent', quantity: 'percent' },
    { name: 'risePer12', label: 'Rise in 12', quantity: 'risePer12' },
    {
      name: 'ratio',
      label: 'Ratio, rise to run',
      quantity: 'ratio',
      unit: { metric: '1:n', imperial: '1:n' },
    },
    { name: 'lengthPerRun', label: 'Rafter for each unit of run', quantity: 'ratio' },
    { name: 'hipPerRun', label: 'Hip or valley for each unit of common run', quantity: 'ratio' },
  ],
  compute,
  steps: pitchSteps,
  slips: pitchSlips,
  cautions: [
    {
      title: 'Snow, wind and the roofing itself',
      text: 'The least pitch a roofing may have stands in its maker’s sheet; snow and wind loads follow the local code. Ask the building department and, where it is required, a licensed engineer.',
    },
    {
      title: 'Working on a slope',
      text: 'A wet or steep roof throws people off. Work from a ladder that is tied or a platform, never alone.',
    },
  ],
  sources: [
    {
      title: 'NAVEDTRA 14044, Builder 3 & 2, Vol. 2',
      detail: 'framing square tables: rafter lengths a foot of run',
      kind: 'published',
    },
    {
      title: 'Griffith, Ira S., Carpentry (1916)',
      detail: 'hip and valley lengths',
      kind: 'published',
    },
  ],
  example: {
    inputs: { risePer12: '4/12' },
    outputs: {
      degrees: 0.321751,
      percent: 33.3333,
      risePer12: 4,
      ratio: 0.333333,
      lengthPerRun: 1.05409,
      hipPerRun: 1.45297,
    },
  },
}
