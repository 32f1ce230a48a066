import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { bagSources, findBag } from './bags'
import { slabSlips } from './slabSlips'
import { slabSteps } from './slabSteps'
import { numberOf, optionalNumber, wordOf } from './values'
import { roundUp, roundUpTo } from '../units/number'
import { bagInput, bagYieldInput, wasteInput } from './concreteInputs'

const YARD3 = 0.9144 ** 3
const volumeUnit = { metric: 'm³', imperial: 'yd³' }
const waterUnit = { metric: 'L', imperial: 'qt' }

function compute(values: Values, system: 'metric' | 'imperial'): Values {
  const length = numberOf(values, 'length')
  const width = numberOf(values, 'width')
  const fall = optionalNumber(values, 'fall')
  const isFlat = wordOf(values, 'flatBase') === 'yes'
  if (isFlat && fall === undefined) {
    throw new CalculatorInputError(
      'fall',
      'Fall is empty: with a level base the thickness grows by it. Write 10 mm/m or 1/8 in/ft.',
    )
  }
  const bag = findBag(wordOf(values, 'bag'))
  const drop = (fall ?? 0) * width
  const meanThickness = numberOf(values, 'thickness') + (isFlat ? drop / 2 : 0)
  const volume = length * width * meanThickness
  const volumeWithWaste = volume * (1 + numberOf(values, 'waste') / 100)
  const bags = roundUp(volumeWithWaste / (optionalNumber(values, 'bagYield') ?? bag.yield))
  return {
    bags,
    volume,
    volumeWithWaste,
    readyMix: roundUpTo(volumeWithWaste, system === 'metric' ? 0.1 : YARD3 / 4),
    mass: bags * bag.mass,
    waterMin: bags * bag.waterMin,
    waterMax: bags * bag.waterMax,
    meanThickness,
    drop,
  }
}

/**
 * Concrete for a flat pad: length × width × thickness, in m; bags = volume with waste ÷ yield, rounded up.
 * 2.6 × 1.1 × 0.1 m is 0.286 m³; with 10 % waste 0.3146 m³ or 28 bags of 25 kg.
 */
export const slab: Calculator = {
  id: 'slab',
  version: 1,
  title: 'Slab: concrete and bags',
  question: 'How much concrete, and how many bags, does this pad take?',
  help: 'Short by one bag, you stop in the middle of a pour and get a cold joint, the first place to crack. Far too many, and damp bags set hard in the shed. Work the volume out from the inside of the form, add a little for a base that is never flat, and always round bags up.',
  inputs: [
    {
      name: 'length',
      label: 'Length',
      quantity: 'length',
      help: 'Inside face to inside face of the form.',
      initial: { metric: '2600', imperial: `8' 6"` },
      min: 0.1,
      max: 30,
    },
    {
      name: 'width',
      label: 'Width',
      quantity: 'length',
      help: 'Back to front, the way the water runs.',
      initial: { metric: '1100', imperial: `3' 6"` },
      min: 0.1,
      max: 30,
    },
    {
      name: 'thickness',
      label: 'Thickness',
      quantity: 'length',
      help: 'At the thinnest place.',
      initial: { metric: '100', imperial: '4"' },
      min: 0.02,
      max: 1,
    },
    {
      name: 'fall',
      label: 'Fall to the front',
      quantity: 'ratio',
      help: 'So that water runs off.',
      optional: true,
      unit: { metric: 'mm/m', imperial: 'in/ft' },
      initial: { metric: '10', imperial: '1/8' },
      min: 0,
      max: 0.1,
    },
    {
      name: 'flatBase',
      label: 'The base under it',
      quantity: 'choice',
      initial: { metric: 'no', imperial: 'no' },
      choices: [
        { value: 'no', label: 'falls with the top' },
        { value: 'yes', label: 'is level' },
      ],
    },
    wasteInput('What the ground, the barrow and the form keep.'),
    bagInput,
    bagYieldInput,
  ],
  outputs: [
    { name: 'bags', label: 'Bags', quantity: 'count' },
    { name: 'volume', label: 'Concrete', quantity: 'volume', unit: volumeUnit },
    {
      name: 'volumeWithWaste',
      label: 'Concrete, with waste',
      quantity: 'volume',
      unit: volumeUnit,
    },
    { name: 'readyMix', label: 'Ready-mixed, to order', quantity: 'volume', unit: volumeUnit },
    { name: 'mass', label: 'Dry weight to carry', quantity: 'mass' },
    { name: 'waterMin', label: 'Water in all, at least', quantity: 'volume', unit: waterUnit },
    { name: 'waterMax', label: 'Water in all, at most', quantity: 'volume', unit: waterUnit },
    { name: 'meanThickness', label: 'Mean thickness', quantity: 'length' },
    { name: 'drop', label: 'Front edge lower by', quantity: 'length' },
  ],
  compute,
  steps: slabSteps,
  slips: slabSlips,
  cautions: [
    {
      title: 'Wet cement burns',
      text: 'Waterproof gloves, long sleeves, boots and eye protection. Rinse splashes at once with clean water. The dust harms lungs: wear a respirator rated for silica when you open and mix bags.',
    },
    {
      title: 'Before you dig',
      text: 'Have buried cables and pipes located, and wait for the answer.',
    },
    {
      title: 'Lift less',
      text: 'Two people to a bag, a barrow on a firm plank, and more than one day for many bags.',
    },
    {
      title: 'Not for every slab',
      text: 'A slab that carries a building, a vehicle or a retaining wall needs a design by a licensed engineer. Your local code sets depth, frost cover, reinforcement and permits, and comes before any figure here.',
    },
  ],
  sources: [
    {
      title: 'NAVEDTRA 14070, Engineering Aid',
      detail: 'volume of a slab, 10 % waste',
      kind: 'published',
    },
    ...bagSources,
    {
      title: 'Ready-mixed concrete ordered in steps of 0.1 m³ or 1/4 yd³',
      kind: 'common practice, no source',
    },
  ],
  example: {
    inputs: {
      length: '2600 mm',
      width: '1100 mm',
      thickness: '100 mm',
      waste: '10 %',
      bag: '25 kg',
    },
    outputs: {
      volume: 0.286,
      volumeWithWaste: 0.3146,
      bags: 28,
      readyMix: 0.4,
      mass: 700,
      waterMin: 0.07,
      waterMax: 0.084,
      meanThickness: 0.1,
      drop: 0,
    },
  },
}
