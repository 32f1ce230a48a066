import type { Calculator, Values } from './calculator'
import { gravelCautions, gravelSources } from './gravelSources'
import { gravelSlips } from './gravelSlips'
import { gravelSteps } from './gravelSteps'
import { numberOf } from './values'

const volumeUnit = { metric: 'm³', imperial: 'yd³' }

function compute(values: Values): Values {
  const side = (name: string) => numberOf(values, name) + 2 * numberOf(values, 'overhang')
  const compacted = side('length') * side('width') * numberOf(values, 'depth')
  const looseVolume = compacted * numberOf(values, 'compaction')
  return { looseVolume, mass: looseVolume * numberOf(values, 'density') }
}

/**
 * Stone for a compacted base: (length + 2 × overhang) × (width + 2 × overhang) × depth is what lies there tamped, in m³;
 * loose = tamped × compaction; mass = loose × density. 2600 × 1100 mm, 100 deep, 100 over on every side, 1.2, 1600 kg/m³: 0.437 m³, 699 kg.
 */
export const gravel: Calculator = {
  id: 'gravel',
  version: 1,
  title: 'Gravel: the base under it',
  question: 'How much stone to order, before tamping?',
  help: 'A slab stands as well as what it lies on. Crushed stone drains, and tamped hard it does not settle. It shrinks under the tamper, so order it loose: more than the hole seems to hold. Let it reach past the pad, so that the edges are carried too.',
  inputs: [
    {
      name: 'length',
      label: 'Length of the pad',
      quantity: 'length',
      initial: { metric: '2600', imperial: `8' 6"` },
      min: 0.1,
      max: 30,
    },
    {
      name: 'width',
      label: 'Width of the pad',
      quantity: 'length',
      initial: { metric: '1100', imperial: `3' 6"` },
      min: 0.1,
      max: 30,
    },
    {
      name: 'depth',
      label: 'Depth, tamped',
      quantity: 'length',
      help: 'What is there when you have finished tamping.',
      initial: { metric: '100', imperial: '4"' },
      min: 0.02,
      max: 0.61,
    },
    {
      name: 'overhang',
      label: 'Past the pad, on every side',
      quantity: 'length',
      initial: { metric: '100', imperial: '4"' },
      min: 0,
      max: 1,
    },
    {
      name: 'compaction',
      label: 'Loose for one tamped',
      quantity: 'ratio',
      help: '1.2: twelve barrows tamp down to ten. Ask the yard for your stone.',
      assumed: true,
      initial: { metric: '1.2', imperial: '1.2' },
      min: 1,
      max: 1.6,
    },
    {
      name: 'density',
      label: 'Loose stone weighs',
      quantity: 'massDensity',
      help: 'Wet stone weighs more. Ask the yard.',
      assumed: true,
      initial: { metric: '1600', imperial: '100' },
      min: 1000,
      max: 2400,
    },
  ],
  outputs: [
    { name: 'looseVolume', label: 'Stone to order, loose', quantity: 'volume', unit: volumeUnit },
    { name: 'mass', label: 'It weighs', quantity: 'mass' },
  ],
  compute,
  steps: gravelSteps,
  slips: gravelSlips,
  cautions: gravelCautions,
  sources: gravelSources,
  example: {
    inputs: { length: '2600 mm', width: '1100 mm', depth: '100 mm', overhang: '100 mm' },
    outputs: { looseVolume: 0.4368, mass: 698.88 },
  },
}
