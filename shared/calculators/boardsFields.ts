import type { CalculatorInput, CalculatorOutput } from './calculator'

/** The inputs of `boards`. */
export const boardsInputs: CalculatorInput[] = [
  {
    name: 'opening',
    label: 'Opening',
    quantity: 'length',
    help: 'Clear, from stop to stop.',
    initial: { metric: '2450', imperial: `8'` },
    min: 0.05,
    max: 30,
  },
  {
    name: 'boardWidth',
    label: 'Board width, measured',
    quantity: 'length',
    help: 'The real board, not its name.',
    initial: { metric: '145', imperial: '5-1/2"' },
    min: 0.01,
    max: 1.3,
  },
  {
    name: 'gap',
    label: 'Gap you want',
    quantity: 'length',
    help: 'Between two boards.',
    initial: { metric: '5', imperial: '3/16"' },
    min: 0,
    max: 0.5,
  },
  {
    name: 'mode',
    label: 'What gives way',
    quantity: 'choice',
    initial: { metric: 'fixed-gap', imperial: 'fixed-gap' },
    choices: [
      { value: 'fixed-gap', label: 'The last board: it is ripped' },
      { value: 'even-gap', label: 'The gap: all boards stay whole' },
    ],
  },
  {
    name: 'ends',
    label: 'Against the stops',
    quantity: 'choice',
    initial: { metric: 'board', imperial: 'board' },
    choices: [
      { value: 'board', label: 'A board at both ends' },
      { value: 'gap', label: 'A gap at both ends' },
    ],
  },
]

/** The outputs of `boards`. */
export const boardsOutputs: CalculatorOutput[] = [
  { name: 'count', label: 'Boards', quantity: 'count' },
  { name: 'gap', label: 'Gap', quantity: 'length' },
  { name: 'lastRip', label: 'Last board, ripped to', quantity: 'length' },
  {
    name: 'marks',
    label: 'Marks on the stick, near edge of each board',
    quantity: 'length',
    isList: true,
  },
]
