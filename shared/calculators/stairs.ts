import type { Calculator, Values } from './calculator'
import { stairsSlips } from './stairsSlips'
import { stairsSteps } from './stairsSteps'
import { numberOf } from './values'
import { roundUp } from '../units/number'

const INCH = 0.0254
/** The highest riser and the shortest tread of the 2018 IRC: 7 3/4 in and 10 in (it prints 196 and 254 mm). */
const LIMITS = { rise: 7.75 * INCH, tread: 10 * INCH } as const
/** What binary arithmetic may add. */
const DUST = 1e-9

function compute(values: Values): Values {
  const totalRise = numberOf(values, 'totalRise')
  const tread = numberOf(values, 'tread')
  const risers = Math.max(1, roundUp(totalRise / numberOf(values, 'maxRise')))
  const rise = totalRise / risers
  const isWithin = rise <= LIMITS.rise + DUST && tread >= LIMITS.tread - DUST
  return {
    risers,
    rise,
    totalRun: (risers - 1) * tread,
    comfort: 2 * rise + tread,
    withinLimits: isWithin ? 'yes' : 'no',
  }
}

/**
 * Steps of equal rise, metres: risers = total rise ÷ highest rise, up; rise = total rise ÷ risers;
 * total run = (risers − 1) × tread, because the upper floor is the last tread; comfort = 2 × rise + tread.
 * 94 in at most 7 1/4 in: 13 risers of 7.23 in (US Army EN5156).
 */
export const stairs: Calculator = {
  id: 'stairs',
  version: 1,
  title: 'Steps of equal rise',
  question: 'How many steps, and how high is each?',
  help: 'Feet learn the height of the first step and expect it of all others: one that differs by a finger trips people. Measure from the finished ground to the finished top, divide, and make every step the same.',
  inputs: [
    {
      name: 'totalRise',
      label: 'Height in all',
      quantity: 'length',
      help: 'Finished ground to finished top.',
      initial: { metric: '520', imperial: `1' 9"` },
      min: 0.05,
      max: 6,
    },
    {
      name: 'maxRise',
      label: 'A step no higher than',
      quantity: 'length',
      help: 'What your local code allows, or less.',
      initial: { metric: '180', imperial: '7-1/2"' },
      min: 0.08,
      max: 0.3,
    },
    {
      name: 'tread',
      label: 'Tread, front to back',
      quantity: 'length',
      help: 'From the face of one riser to the face of the next.',
      initial: { metric: '300', imperial: '11"' },
      min: 0.15,
      max: 1.5,
    },
  ],
  outputs: [
    { name: 'risers', label: 'Risers', quantity: 'count' },
    { name: 'rise', label: 'Each rises', quantity: 'length' },
    { name: 'totalRun', label: 'First riser to last, level', quantity: 'length' },
    {
      name: 'comfort',
      label: 'Two rises and a tread (about 635 mm or 25 in is easy)',
      quantity: 'length',
    },
    {
      name: 'withinLimits',
      label: 'Within 7 3/4 in rise and 10 in tread',
      quantity: 'choice',
      choices: [
        { value: 'yes', label: 'Yes' },
        { value: 'no', label: 'No' },
      ],
    },
  ],
  compute,
  steps: stairsSteps,
  slips: stairsSlips,
  cautions: [
    {
      title: 'Your code comes first',
      text: 'The limits here are those of one model code for houses. Yours may ask for less rise, longer treads, a handrail, a guard, a landing or light. Ask the building department before you build.',
    },
    {
      title: 'All the same',
      text: 'The highest and the lowest riser may differ by 3/8 in (10 mm) at most; less is better. Count the thickness of what goes on top of each tread.',
    },
    {
      title: 'What carries people',
      text: 'Stringers, fixings and footings carry people: have them looked at by the building department and, where it is required, a licensed engineer. Never notch a stringer beyond its saw line.',
    },
  ],
  sources: [
    {
      title: '2018 IRC, R311.7.5.1 and R311.7.5.2',
      detail: 'riser at most 7 3/4 in, tread at least 10 in, as a building division prints them',
      kind: 'published',
    },
    {
      title: 'US Army subcourse EN5156, Carpentry II (1995)',
      detail: 'equal risers; two rises and a tread make 25 in',
      kind: 'published',
    },
    {
      title: 'Miller, The Carpenters’ Guide',
      detail: 'one tread fewer than risers',
      kind: 'published',
    },
    { title: 'Town of Kennebunk code page', detail: '3/8 in between risers', kind: 'published' },
  ],
  example: {
    inputs: { totalRise: '520 mm', maxRise: '180 mm', tread: '300 mm' },
    outputs: {
      risers: 3,
      rise: 0.173333,
      totalRun: 0.6,
      comfort: 0.646667,
      withinLimits: 'yes',
    },
  },
}
