import type { CalculatorInput, CalculatorOutput } from './calculator'

/** The inputs of `rafter`. */
export const rafterInputs: CalculatorInput[] = [
  {
    name: 'run',
    label: 'Run',
    quantity: 'length',
    help: 'Level: outside of the plate to the middle of the ridge.',
    initial: { metric: '1500', imperial: `5'` },
    min: 0.2,
    max: 12,
  },
  {
    name: 'pitch',
    label: 'Pitch, rise in 12',
    quantity: 'risePer12',
    help: 'A bare number is the rise in 12; 18 deg or 1:3 will do too.',
    initial: { metric: '4', imperial: '4' },
    min: 0.05,
    max: 68,
  },
  {
    name: 'overhang',
    label: 'Overhang',
    quantity: 'length',
    help: 'Level, not along the slope. Empty: none.',
    optional: true,
    initial: { metric: '200', imperial: '8"' },
    min: 0,
    max: 2,
  },
  {
    name: 'ridge',
    label: 'Ridge board, thickness',
    quantity: 'length',
    help: 'Half of it comes off. 0: rafters meet, or lie on a wall.',
    assumed: true,
    initial: { metric: '0', imperial: '0' },
    min: 0,
    max: 0.2,
  },
  {
    name: 'depth',
    label: 'Rafter depth, measured',
    quantity: 'length',
    help: 'The real board, not its name.',
    assumed: true,
    initial: { metric: '140', imperial: '5-1/2"' },
    min: 0.04,
    max: 0.4,
  },
  {
    name: 'seat',
    label: 'Seat on the plate',
    quantity: 'length',
    help: 'The level cut of the notch.',
    assumed: true,
    initial: { metric: '75', imperial: '3"' },
    min: 0,
    max: 0.3,
  },
]

/** The outputs of `rafter`. */
export const rafterOutputs: CalculatorOutput[] = [
  { name: 'lineLength', label: 'Plate to middle of ridge, along the slope', quantity: 'length' },
  { name: 'totalLength', label: 'Rafter in all, tail to ridge', quantity: 'length' },
  { name: 'rise', label: 'Rise', quantity: 'length' },
  { name: 'plumbCut', label: 'Plumb cut, off square', quantity: 'angle' },
  { name: 'levelCut', label: 'Level cut, off square', quantity: 'angle' },
  { name: 'heelCut', label: 'Heel cut, straight up', quantity: 'length' },
  { name: 'birdsmouthDepth', label: 'Notch, square into the rafter', quantity: 'length' },
  {
    name: 'notchFits',
    label: 'Notch no deeper than a third',
    quantity: 'choice',
    choices: [
      { value: 'yes', label: 'Yes' },
      { value: 'no', label: 'No' },
    ],
  },
]
