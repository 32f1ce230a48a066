import type { OwnCalculatorDefinition } from '../../../../shared/contracts/ownCalculators'

/**
 * How much wood a store holds. Worked by hand: 2.4 × 0.9 × 1.0 m is 2.16 m³ stacked, 65 % of it wood
 * (1.404 m³), 0.596 of a cord of 128 ft³; 8 × 4 × 4 ft is one cord, 89.6 ft³ of wood at 30 % air.
 */
export const firewood: OwnCalculatorDefinition = {
  title: 'Firewood it holds',
  question: 'How much wood fits, and how much of the stack is air?',
  help: 'Wood is sold by the stack, by the solid cubic metre or by the cord. Ask which: a stack is a third air, and the price of one is not the price of the other.',
  inputs: [
    {
      name: 'inside_length',
      label: 'Inside length',
      quantity: 'length',
      help: 'Between the end posts.',
      min: 0.3,
      max: 12,
      initial: { metric: '2400', imperial: `7' 10-1/2"` },
    },
    {
      name: 'depth',
      label: 'Depth',
      quantity: 'length',
      help: 'Two rows of 400 mm logs and the gap between them want 900 mm.',
      min: 0.2,
      max: 3,
      initial: { metric: '900', imperial: `2' 11-1/2"` },
    },
    {
      name: 'stack_height',
      label: 'Height of the stack',
      quantity: 'length',
      help: 'No higher than your chest.',
      min: 0.2,
      max: 1.5,
      initial: { metric: '1000', imperial: `3' 3"` },
    },
    {
      name: 'air',
      label: 'Share of air',
      quantity: 'percent',
      help: 'Split and stacked: about 35 %. Tipped in a heap: about half.',
      min: 20,
      max: 60,
      initial: { metric: '35', imperial: '35' },
    },
  ],
  outputs: [
    {
      name: 'stacked',
      label: 'Stacked wood',
      quantity: 'volume',
      unit: { metric: 'm³', imperial: 'ft³' },
      expression: 'inside_length * depth * stack_height',
    },
    {
      name: 'solid',
      label: 'Wood without the air',
      quantity: 'volume',
      unit: { metric: 'm³', imperial: 'ft³' },
      expression: 'stacked * (1 - air)',
    },
    {
      name: 'cords',
      label: 'Cords of 128 ft³, stacked',
      quantity: 'ratio',
      expression: 'stacked / (128 ft^3)',
    },
  ],
  cautions: [
    {
      title: 'Stack no higher than your chest',
      text: 'End pieces crosswise, and nobody climbs it. A stack that leans is taken down, not pushed.',
    },
  ],
  sources: [
    { title: 'Length × depth × height', kind: 'common practice, no source' },
    {
      title: 'A third of a split stack is air',
      detail: 'it differs with the logs; measure yours if money hangs on it',
      kind: 'common practice, no source',
    },
    { title: 'A cord: 4 × 4 × 8 ft', kind: 'common practice, no source' },
  ],
  examples: [
    {
      inputs: { inside_length: '2.4 m', depth: '900 mm', stack_height: '1 m', air: '35 %' },
      expected: { stacked: '2.16 m³', solid: '1.404 m³', cords: '0.596' },
    },
    {
      inputs: { inside_length: '8 ft', depth: '4 ft', stack_height: '4 ft', air: '30 %' },
      expected: { stacked: '128 ft³', solid: '89.6 ft³', cords: '1' },
    },
  ],
  slips: [
    {
      id: 'air-kept',
      title: 'Counted the air as wood',
      output: 'solid',
      expression: 'stacked',
      sentence: 'That is the whole stack, air and all.',
      wayBack: 'Take the share of air off: what is left of a whole after it is wood.',
    },
    {
      id: 'only-the-air',
      title: 'Gave the air instead of the wood',
      output: 'solid',
      expression: 'stacked * air',
      sentence: 'That is the air in the stack.',
      wayBack: 'The rest of it is the wood: take this off the stack.',
    },
    {
      id: 'air-added',
      title: 'Added the air',
      output: 'solid',
      expression: 'stacked * (1 + air)',
      sentence: 'That is more than the stack: the air was put on top.',
      wayBack: 'The air is inside the stack already: take it off.',
    },
  ],
}
