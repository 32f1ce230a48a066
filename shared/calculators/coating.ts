import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { coverageOf, LITRE } from './coatingTin'
import { coatingSlips } from './coatingSlips'
import { coatingSteps } from './coatingSteps'
import { numberOf } from './values'

/** What one litre covers is neither less nor more than this, m²; beyond it a litre was taken for a gallon. */
const COVERAGE_OF_A_LITRE = { least: 0.5, most: 25 } as const

function compute(values: Values): Values {
  const coats = numberOf(values, 'coats')
  if (!Number.isInteger(coats)) {
    throw new CalculatorInputError('coats', 'Coats are whole: give 1, 2 or 3.')
  }
  const coverage = coverageOf(values)
  const ofLitre = coverage * LITRE
  if (ofLitre < COVERAGE_OF_A_LITRE.least || ofLitre > COVERAGE_OF_A_LITRE.most) {
    throw new CalculatorInputError(
      'coverage',
      'No coat goes that far, or so short a way. Is the figure on the tin for a litre or for a gallon?',
    )
  }
  const roughArea = numberOf(values, 'area') * (1 + numberOf(values, 'roughness') / 100)
  const volumePerCoat = roughArea / coverage
  return { volume: volumePerCoat * coats, volumePerCoat }
}

const tinUnit = { metric: 'L', imperial: 'gal' }

/**
 * Oil, stain or paint in m³: area × (1 + roughness ÷ 100) ÷ coverage for one coat, times the coats; coverage in m² for each m³.
 * 20 m² of rough boards (20 %), 6 m² a litre: 4 L a coat, 8 L for two.
 */
export const coating: Calculator = {
  id: 'coating',
  version: 1,
  title: 'Oil, stain or paint',
  question: 'How much oil, stain or paint for all the coats?',
  help: 'Two tins from two batches rarely match, and a half-done wall dries with a line in it. Work out every face, edges and ends too. Rough wood drinks far more than the tin says, and the end of a board the most of all.',
  inputs: [
    {
      name: 'area',
      label: 'Area to coat',
      quantity: 'area',
      help: 'Every face that gets it, both sides of a fence.',
      initial: { metric: '20', imperial: '200' },
      min: 0.1,
      max: 1000,
    },
    {
      name: 'coats',
      label: 'Coats',
      quantity: 'count',
      initial: { metric: '2', imperial: '2' },
      min: 1,
      max: 6,
    },
    {
      name: 'coverage',
      label: 'One litre or gallon covers',
      quantity: 'area',
      help: 'One coat; the tin says it, take its lower figure. Stain on a deck: 4 to 7 m² a litre, 150 to 300 ft² a gallon.',
      initial: { metric: '6', imperial: '250' },
      min: 0.5,
      max: 100,
    },
    {
      name: 'coverageFor',
      label: 'That is for',
      quantity: 'choice',
      initial: { metric: 'L', imperial: 'gal' },
      choices: [
        { value: 'L', label: 'one litre' },
        { value: 'gal', label: 'one US gallon' },
      ],
    },
    {
      name: 'roughness',
      label: 'Extra for a rough face',
      quantity: 'percent',
      help: 'Planed 0, narrow lapped boards 10, rough or thirsty 20, corrugated 33.',
      assumed: true,
      initial: { metric: '20', imperial: '20' },
      min: 0,
      max: 150,
    },
  ],
  outputs: [
    { name: 'volume', label: 'For all coats', quantity: 'volume', unit: tinUnit },
    { name: 'volumePerCoat', label: 'For one coat', quantity: 'volume', unit: tinUnit },
  ],
  compute,
  steps: coatingSteps,
  slips: coatingSlips,
  cautions: [
    {
      title: 'Oily rags catch fire by themselves',
      text: 'Never leave them in a heap or a bin. Spread each one flat outdoors until it is dry and stiff, or put it in water in a closed metal can.',
    },
    {
      title: 'Fumes and dust',
      text: 'Read the tin and do what it says: air, gloves, eye protection, no flame near it. Sand treated wood only with a dust mask and goggles, and never burn it. Paint from before 1980 may hold lead: ask before you sand.',
    },
    {
      title: 'Off the ground',
      text: 'Tie the ladder, one foot out for every four up, and keep one hand for yourself.',
    },
  ],
  sources: [
    {
      title: 'Painting trade article (2017)',
      detail: '400 ft² a gallon; 20 % more rough, 10 % narrow laps, 33 % corrugated',
      kind: 'published',
    },
    {
      title: 'Magazine example of estimating paint',
      detail: '1800 ft² at 450 ft² a gallon is 4 gallons',
      kind: 'published',
    },
    {
      title: 'Deck stain, 150 to 300 ft² a gallon',
      detail: 'a page of little weight: your tin comes first',
      kind: 'published',
    },
  ],
  example: {
    inputs: {
      area: '20 m²',
      coats: '2',
      coverage: '6 m²',
      coverageFor: 'L',
      roughness: '20 %',
    },
    outputs: { volume: 0.008, volumePerCoat: 0.004 },
  },
}
