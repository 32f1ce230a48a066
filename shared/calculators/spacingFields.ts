import type { CalculatorInput, CalculatorOutput } from './calculator'

/** The inputs of `spacing`. */
export const spacingInputs: CalculatorInput[] = [
  {
    name: 'run',
    label: 'Run',
    quantity: 'length',
    help: 'Outside to outside of the end ones.',
    initial: { metric: '3600', imperial: `12'` },
    min: 0.1,
    max: 60,
  },
  {
    name: 'maxCentres',
    label: 'Centres, at most',
    quantity: 'length',
    help: 'From the code, the span table or the maker of the boards.',
    initial: { metric: '500', imperial: '16"' },
    min: 0.02,
    max: 6,
  },
  {
    name: 'memberWidth',
    label: 'Width of each',
    quantity: 'length',
    help: 'Post, joist or picket, measured.',
    initial: { metric: '45', imperial: '1-1/2"' },
    min: 0.005,
    max: 0.5,
  },
]

/** The outputs of `spacing`. */
export const spacingOutputs: CalculatorOutput[] = [
  { name: 'count', label: 'How many', quantity: 'count' },
  { name: 'centres', label: 'Centre to centre', quantity: 'length' },
  { name: 'clear', label: 'Clear between two', quantity: 'length' },
  { name: 'marks', label: 'Marks, near edge of each', quantity: 'length', isList: true },
]
