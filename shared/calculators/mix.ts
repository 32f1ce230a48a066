import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { bagSources, findBag } from './bags'
import { mixSlips } from './mixSlips'
import { mixSteps } from './mixSteps'
import { CEMENT_SHARE, classifySlump, judgeMix, slumpClasses } from './slump'
import { numberOf, optionalNumber, wordOf } from './values'
import { bagInput } from './concreteInputs'

const waterUnit = { metric: 'L', imperial: 'qt' }
/** Kilograms of water in a cubic metre. */
const WATER_DENSITY = 1000

function compute(values: Values): Values {
  const bag = findBag(wordOf(values, 'bag'))
  const waterMin = optionalNumber(values, 'bagWaterMin') ?? bag.waterMin
  const waterMax = optionalNumber(values, 'bagWaterMax') ?? bag.waterMax
  const waterAdded = numberOf(values, 'waterAdded')
  if (waterMin > waterMax) {
    const input = values['bagWaterMax'] === undefined ? 'bagWaterMin' : 'bagWaterMax'
    throw new CalculatorInputError(
      input,
      'The least water is more than the most. Read both figures from the bag again.',
    )
  }
  const slump = optionalNumber(values, 'slump')
  return {
    waterMin,
    waterMax,
    waterCementRatio: (waterAdded * WATER_DENSITY) / (bag.mass * CEMENT_SHARE),
    slumpClass: slump === undefined ? undefined : classifySlump(slump),
    verdict: judgeMix({ waterAdded, waterMin, waterMax, slump }),
  }
}

/** The least a bag can ask for; what was added may be nothing yet. */
const LEAST_OF_A_BAG = 0.0005
const water = (name: string, label: string, help: string, min = LEAST_OF_A_BAG) =>
  ({ name, label, help, quantity: 'volume', unit: waterUnit, min, max: 0.02 }) as const

/**
 * Too stiff, right or too wet: water a bag against what the bag takes, and the slump where it was measured.
 * 25 kg with 2.8 L: within 2.5 to 3 L, water to cement 0.66 if 17 % of the bag is cement.
 */
export const mix: Calculator = {
  id: 'mix',
  version: 1,
  title: 'Mix: stiff, right or wet',
  question: 'Is it too stiff, right or too wet?',
  help: 'Water makes a mix easy to work and the concrete weak. A splash too much in every bag costs strength, and the top dusts and cracks. Measure the water, look at how the heap slumps, and stop at what the bag says.',
  inputs: [
    bagInput,
    {
      ...water(
        'waterAdded',
        'Water added to a bag',
        'All of it, with what went in to loosen it.',
        0,
      ),
      initial: { metric: '2.8', imperial: '3.5' },
    },
    {
      ...water(
        'bagWaterMin',
        'The bag says, at least',
        'From your own bag; it overrides the figure here.',
      ),
      optional: true,
      initial: { metric: '', imperial: '' },
    },
    {
      ...water(
        'bagWaterMax',
        'The bag says, at most',
        'From your own bag; it overrides the figure here.',
      ),
      optional: true,
      initial: { metric: '', imperial: '' },
    },
    {
      name: 'slump',
      label: 'Slump',
      quantity: 'length',
      help: 'How far a cone of it drops, if you measured.',
      optional: true,
      initial: { metric: '', imperial: '' },
      min: 0,
      max: 0.305,
    },
  ],
  outputs: [
    {
      name: 'verdict',
      label: 'The mix is',
      quantity: 'choice',
      choices: [
        { value: 'stiff', label: 'Too stiff' },
        { value: 'right', label: 'Right' },
        { value: 'wet', label: 'Too wet' },
      ],
    },
    { name: 'waterMin', label: 'Water a bag, at least', quantity: 'volume', unit: waterUnit },
    { name: 'waterMax', label: 'Water a bag, at most', quantity: 'volume', unit: waterUnit },
    { name: 'waterCementRatio', label: 'Water to cement, about', quantity: 'ratio' },
    {
      name: 'slumpClass',
      label: 'Slump class',
      quantity: 'choice',
      choices: slumpClasses.map(({ value, label }) => ({ value, label })),
    },
  ],
  compute,
  steps: mixSteps,
  slips: mixSlips,
  cautions: [
    {
      title: 'Wet cement burns',
      text: 'Waterproof gloves, long sleeves, boots and eye protection. Rinse splashes at once with clean water. The dust harms lungs: wear a respirator rated for silica when you open and mix bags.',
    },
    {
      title: 'Water is not a cure',
      text: 'Water above what the bag allows takes strength for good. Too wet: add dry mix, never sand alone.',
    },
    {
      title: 'A mixer turns',
      text: 'No loose sleeves, no shovel in a turning drum, the lead on a residual current device or ground-fault outlet.',
    },
  ],
  sources: [
    {
      title: 'EN 206, slump classes S1 to S5',
      detail: 'gaps between classes closed by rounding to 10 mm, as a slump is reported',
      kind: 'published',
    },
    {
      title: 'ACI 211.1, Table 6.3.1: slabs 1 to 3 in, 1 in more where no vibrator is used',
      detail: 'the upper limit of “right”, 100 mm',
      kind: 'published',
    },
    {
      title: 'Data sheets of packaged concrete to ASTM C387: 2 to 3 in',
      detail: 'the lower limit of “right”, 50 mm',
      kind: 'published',
    },
    ...bagSources,
    {
      title: 'Assumption: 17 % of the bag is cement, about 1 : 2 : 3 by weight',
      detail: 'ask the maker for the true share',
      kind: 'from memory',
    },
  ],
  example: {
    inputs: { bag: '25 kg', waterAdded: '2.8 L', slump: '70 mm' },
    outputs: {
      waterMin: 0.0025,
      waterMax: 0.003,
      waterCementRatio: 0.658824,
      slumpClass: 'S2',
      verdict: 'right',
    },
  },
}
