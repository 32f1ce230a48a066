import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { findBag } from './bags'
import { postholeCautions, postholeSources } from './postholeSources'
import { postholeSlips } from './postholeSlips'
import { postholeSteps } from './postholeSteps'
import { numberOf, optionalNumber, wordOf } from './values'
import { formatQuantity } from '../units/format'
import { roundUp } from '../units/number'
import { bagInput, bagYieldInput, wasteInput } from './concreteInputs'

const volumeUnit = { metric: 'L', imperial: 'ft³' }

function checkPost(values: Values, system: UnitSystem): void {
  if (!Number.isInteger(numberOf(values, 'count'))) {
    throw new CalculatorInputError('count', 'Holes are counted whole: 1, 2, 3 and so on.')
  }
  const across = Math.hypot(numberOf(values, 'postWidth'), numberOf(values, 'postDepth'))
  if (across > numberOf(values, 'diameter')) {
    throw new CalculatorInputError(
      'diameter',
      `The post does not fit the hole: corner to corner it measures ${formatQuantity(across, 'length', system)}. Make the hole wider, about three times the post.`,
    )
  }
}

function compute(values: Values, system: UnitSystem): Values {
  checkPost(values, system)
  const hole = (Math.PI / 4) * numberOf(values, 'diameter') ** 2
  const post = numberOf(values, 'postWidth') * numberOf(values, 'postDepth')
  const volumeEach = (hole - post) * numberOf(values, 'depth')
  const volume = volumeEach * numberOf(values, 'count')
  const volumeWithWaste = volume * (1 + numberOf(values, 'waste') / 100)
  const bagYield = optionalNumber(values, 'bagYield') ?? findBag(wordOf(values, 'bag')).yield
  return { volumeEach, volume, volumeWithWaste, bags: roundUp(volumeWithWaste / bagYield) }
}

const section = (name: string, label: string) =>
  ({ name, label, quantity: 'length', min: 0.02, max: 0.4 }) as const

/**
 * Concrete round posts, the post taken off: one hole = (π ÷ 4 × diameter² − post width × post depth) × depth, in m³;
 * all = one × count; bags = all with waste ÷ yield, rounded up.
 * 4 holes of 300 mm, 600 deep, posts of 90 × 90: 37.6 L each, 150 L in all; with 10 % waste 15 bags of 25 kg.
 */
export const posthole: Calculator = {
  id: 'posthole',
  version: 1,
  title: 'Post hole: bags for each',
  question: 'How many bags, the post taken off?',
  help: 'The post takes up room that you need not fill, and a round hole holds less than a square one. Guess, and you carry bags home or stop with a post half set. Brace every post plumb before you pour, and count the bags for all holes together.',
  inputs: [
    {
      name: 'count',
      label: 'Holes',
      quantity: 'count',
      initial: { metric: '4', imperial: '4' },
      min: 1,
      max: 200,
    },
    {
      name: 'diameter',
      label: 'Hole, across',
      quantity: 'length',
      help: 'About three times the post.',
      initial: { metric: '300', imperial: '12"' },
      min: 0.08,
      max: 1.2,
    },
    {
      name: 'depth',
      label: 'Concrete, deep',
      quantity: 'length',
      help: 'Stone under the post not counted. How deep it must go follows the frost and the local code.',
      initial: { metric: '600', imperial: '24"' },
      min: 0.1,
      max: 2.5,
    },
    {
      ...section('postWidth', 'Post, wide'),
      help: 'Measure it: a 4 × 4 is 3 1/2" in truth.',
      initial: { metric: '90', imperial: '3-1/2"' },
    },
    { ...section('postDepth', 'Post, thick'), initial: { metric: '90', imperial: '3-1/2"' } },
    wasteInput('No hole is as round as the sum.'),
    bagInput,
    bagYieldInput,
  ],
  outputs: [
    { name: 'bags', label: 'Bags', quantity: 'count' },
    { name: 'volumeEach', label: 'Concrete, one hole', quantity: 'volume', unit: volumeUnit },
    { name: 'volume', label: 'Concrete, all holes', quantity: 'volume', unit: volumeUnit },
    {
      name: 'volumeWithWaste',
      label: 'Concrete, with waste',
      quantity: 'volume',
      unit: volumeUnit,
    },
  ],
  compute,
  steps: postholeSteps,
  slips: postholeSlips,
  cautions: postholeCautions,
  sources: postholeSources,
  example: {
    inputs: {
      count: '4',
      diameter: '300 mm',
      depth: '600 mm',
      postWidth: '90 mm',
      postDepth: '90 mm',
      bag: '25 kg',
    },
    outputs: { volumeEach: 0.0375515, volume: 0.150206, volumeWithWaste: 0.165227, bags: 15 },
  },
}
