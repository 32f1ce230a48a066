import type { OwnCalculatorDefinition } from '../../../../shared/contracts/ownCalculators'

/**
 * What a gate weighs and how hard it pulls at its upper hinge. Worked by hand: 7 pickets of 75 × 20 × 960 mm
 * and 3.1 m of 95 × 45 mm are 0.02333 m³, 12.83 kg at 550 kg/m³, and pull 12.83 × 9.81 × 0.475 / 0.6 = 99.7 N;
 * 8 of 3-1/2 × 3/4 × 36 in and 12 ft of 3-1/2 × 1-1/2 in are 1512 in³, 30.6 lb at 35 lb/ft³, and pull 23 lbf.
 */
export const gateWeight: OwnCalculatorDefinition = {
  title: 'Weight of the gate on its hinges',
  question: 'What does the gate weigh, and how hard does it pull at the upper hinge?',
  help: 'A gate hangs out sideways: it pulls the upper hinge away from the post and pushes the lower one into it. Hinges further apart pull less, a wider gate pulls more.',
  inputs: [
    {
      name: 'gate_width',
      label: 'Width of the gate',
      quantity: 'length',
      help: '',
      min: 0.4,
      max: 1.5,
      initial: { metric: '950', imperial: '36' },
    },
    {
      name: 'hinge_distance',
      label: 'From hinge to hinge',
      quantity: 'length',
      help: 'Middle to middle, up and down.',
      min: 0.2,
      max: 1.5,
      initial: { metric: '600', imperial: '24' },
    },
    {
      name: 'pickets',
      label: 'Pickets',
      quantity: 'count',
      help: '',
      min: 1,
      max: 40,
      initial: { metric: '7', imperial: '8' },
    },
    {
      name: 'picket_width',
      label: 'Picket, width',
      quantity: 'length',
      help: 'Measured, not as it is sold.',
      min: 0.02,
      max: 0.3,
      initial: { metric: '75', imperial: '3-1/2' },
    },
    {
      name: 'picket_thickness',
      label: 'Picket, thickness',
      quantity: 'length',
      help: '',
      min: 0.01,
      max: 0.06,
      initial: { metric: '20', imperial: '3/4' },
    },
    {
      name: 'picket_length',
      label: 'Picket, length',
      quantity: 'length',
      help: '',
      min: 0.3,
      max: 1.2,
      initial: { metric: '960', imperial: '36' },
    },
    {
      name: 'frame_length',
      label: 'Rails and brace together',
      quantity: 'length',
      help: 'Both rails and the brace, end to end.',
      unit: { metric: 'm', imperial: 'ft' },
      min: 0.5,
      max: 12,
      initial: { metric: '3.1', imperial: '12' },
    },
    {
      name: 'rail_width',
      label: 'Rail, width',
      quantity: 'length',
      help: '',
      min: 0.03,
      max: 0.2,
      initial: { metric: '95', imperial: '3-1/2' },
    },
    {
      name: 'rail_thickness',
      label: 'Rail, thickness',
      quantity: 'length',
      help: '',
      min: 0.02,
      max: 0.1,
      initial: { metric: '45', imperial: '1-1/2' },
    },
    {
      name: 'density',
      label: 'Density of the timber',
      quantity: 'massDensity',
      help: 'Dry softwood about 550 kg/m³; wet from treatment up to 800, oak 750.',
      min: 350,
      max: 1100,
      initial: { metric: '550', imperial: '35' },
    },
  ],
  outputs: [
    {
      name: 'timber',
      label: 'Timber in the gate',
      quantity: 'volume',
      expression:
        'pickets * picket_width * picket_thickness * picket_length + frame_length * rail_width * rail_thickness',
    },
    {
      name: 'weight',
      label: 'Weight of the gate',
      quantity: 'mass',
      expression: 'timber * density',
    },
    {
      name: 'pull',
      label: 'Pull at the upper hinge',
      quantity: 'force',
      expression: 'weight * 9.81 m/s^2 * (gate_width / 2) / hinge_distance',
    },
  ],
  cautions: [
    {
      title: 'Two people hang a gate',
      text: 'It stands on packers while the hinges are screwed on, never on a foot.',
    },
    {
      title: 'It is the gate at rest',
      text: 'A child who swings on it or wind that slams it pulls many times as hard. The maker’s limit for the hinges and the post comes first.',
    },
  ],
  sources: [
    {
      title: 'Turning about the lower hinge',
      detail: 'weight × half the width = pull × distance of the hinges',
      kind: 'common practice, no source',
    },
    { title: 'Densities of timber', detail: 'dry softwood, oak', kind: 'from memory' },
  ],
  examples: [
    {
      inputs: {
        gate_width: '950 mm',
        hinge_distance: '600 mm',
        pickets: '7',
        picket_width: '75 mm',
        picket_thickness: '20 mm',
        picket_length: '960 mm',
        frame_length: '3.1 m',
        rail_width: '95 mm',
        rail_thickness: '45 mm',
        density: '550 kg/m³',
      },
      expected: { timber: '0.02333 m³', weight: '12.83 kg', pull: '99.7 N' },
    },
    {
      inputs: {
        gate_width: '36 in',
        hinge_distance: '24 in',
        pickets: '8',
        picket_width: '3-1/2 in',
        picket_thickness: '3/4 in',
        picket_length: '36 in',
        frame_length: '12 ft',
        rail_width: '3-1/2 in',
        rail_thickness: '1-1/2 in',
        density: '35 lb/ft³',
      },
      expected: { timber: '0.875 ft³', weight: '30.6 lb', pull: '23 lbf' },
    },
  ],
  slips: [
    {
      id: 'whole-width',
      title: 'Took the whole width',
      output: 'pull',
      expression: 'weight * 9.81 m/s^2 * gate_width / hinge_distance',
      sentence: 'That lets the whole weight hang at the latch.',
      wayBack: 'The weight sits in the middle: take half the width.',
    },
    {
      id: 'weight-alone',
      title: 'Gave the weight as the pull',
      output: 'pull',
      expression: 'weight * 9.81 m/s^2',
      sentence: 'That is what the gate weighs, not how it pulls sideways.',
      wayBack: 'Go on: times half the width, divided by the distance of the hinges.',
    },
  ],
}
