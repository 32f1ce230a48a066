import type { Calculator, Values } from './calculator'
import { batchCautions, batchSources } from './batchSources'
import { batchSlips } from './batchSlips'
import { batchSteps } from './batchSteps'
import {
  CEMENT_DENSITY,
  estimateStrength,
  LOOSE_FOR_ONE,
  proportionChoices,
  readParts,
  readTable,
} from './batchTables'
import { numberOf, wordOf } from './values'
import { wasteInput } from './concreteInputs'

const looseUnit = { metric: 'L', imperial: 'ft³' }

function compute(values: Values): Values {
  const isEntrained = wordOf(values, 'airEntrained') === 'yes'
  const parts = readParts(wordOf(values, 'proportions'))
  const volume = numberOf(values, 'volume') * (1 + numberOf(values, 'waste') / 100)
  const table = readTable(numberOf(values, 'maxAggregate'), numberOf(values, 'slump'), isEntrained)
  const part = (LOOSE_FOR_ONE * volume) / parts.all
  const cement = part * parts.cement * CEMENT_DENSITY
  const waterCementRatio = (table.waterContent * volume) / cement
  return {
    waterContent: table.waterContent,
    water: (table.waterContent * volume) / 1000,
    cement,
    sand: part * parts.sand,
    stone: part * parts.stone,
    waterCementRatio,
    airTarget: table.airTarget,
    strengthEstimate: estimateStrength(waterCementRatio, isEntrained),
  }
}

/**
 * Concrete from cement, sand and stone by volume: one part = 1.5 × concrete ÷ all parts (m³), cement = its part × 1500 kg/m³,
 * water = water content of ACI 211.1 (kg/m³) × concrete, strength from water ÷ cement.
 * 0.1 m³ of 1:2:3, 10 % waste, 12.5 mm stone, 75 mm slump, no air: 41.3 kg cement, 55 L sand, 82.5 L stone, 23.8 L water.
 */
export const batch: Calculator = {
  id: 'batch',
  version: 1,
  title: 'Batch: cement, sand and stone',
  question: 'How much cement, sand, stone and water?',
  help: 'Without bags you measure for yourself. Use one box or bucket for everything, strike it off level, and keep to the count: a shovel more of sand in every batch makes weak concrete. Water comes last, and less of it when the sand is wet.',
  inputs: [
    {
      name: 'volume',
      label: 'Concrete',
      quantity: 'volume',
      unit: { metric: 'm³', imperial: 'ft³' },
      initial: { metric: '0.1', imperial: '4' },
      min: 0.005,
      max: 3,
    },
    {
      name: 'proportions',
      label: 'Cement, sand, stone by volume',
      quantity: 'choice',
      initial: { metric: '1:2:3', imperial: '1:2:3' },
      choices: proportionChoices,
    },
    {
      name: 'maxAggregate',
      label: 'Largest stone',
      quantity: 'length',
      help: 'The name of the stone at the yard: 10, 20 mm, 3/4 in.',
      initial: { metric: '20', imperial: '3/4"' },
      min: 0.0095,
      max: 0.051,
    },
    {
      name: 'slump',
      label: 'Slump wanted',
      quantity: 'length',
      help: 'How far a cone of it drops: 75 mm (3 in) for a pad placed by hand.',
      initial: { metric: '75', imperial: '3"' },
      min: 0.025,
      max: 0.178,
    },
    {
      name: 'airEntrained',
      label: 'Air-entraining admixture',
      quantity: 'choice',
      help: 'Against frost; it is measured in drops and needs a mixer.',
      initial: { metric: 'no', imperial: 'no' },
      choices: [
        { value: 'no', label: 'no' },
        { value: 'yes', label: 'yes' },
      ],
    },
    wasteInput(),
  ],
  outputs: [
    { name: 'cement', label: 'Cement', quantity: 'mass' },
    { name: 'sand', label: 'Sand, loose', quantity: 'volume', unit: looseUnit },
    { name: 'stone', label: 'Stone, loose', quantity: 'volume', unit: looseUnit },
    {
      name: 'water',
      label: 'Water, at most about',
      quantity: 'volume',
      unit: { metric: 'L', imperial: 'qt' },
    },
    {
      name: 'waterContent',
      label: 'Water in the concrete',
      quantity: 'massDensity',
      unit: { metric: 'kg/m³', imperial: 'lb/yd³' },
    },
    { name: 'waterCementRatio', label: 'Water to cement, about', quantity: 'ratio' },
    { name: 'airTarget', label: 'Air in it, about', quantity: 'percent' },
    {
      name: 'strengthEstimate',
      label: 'Strength in a laboratory, no promise',
      quantity: 'pressure',
      unit: { metric: 'MPa', imperial: 'psi' },
    },
  ],
  compute,
  steps: batchSteps,
  slips: batchSlips,
  cautions: batchCautions,
  sources: batchSources,
  example: {
    inputs: {
      volume: '0.1 m³',
      proportions: '1:2:3',
      maxAggregate: '12.5 mm',
      slump: '75 mm',
      airEntrained: 'no',
    },
    outputs: {
      waterContent: 216,
      water: 0.02376,
      cement: 41.25,
      sand: 0.055,
      stone: 0.0825,
      waterCementRatio: 0.576,
      airTarget: 2.5,
      strengthEstimate: 27428600,
    },
  },
}
