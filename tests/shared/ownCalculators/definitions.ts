import type { OwnCalculatorDefinition } from '../../../shared/contracts/ownCalculators'

/**
 * Stone for a trench, in barrows. The examples are worked by hand: 12 × 0.4 × 0.15 m is 0.72 m³, a quarter
 * more is 0.9 m³, 15 barrows of 60 L; 3 m of the same give 0.225 m³, 3.75 barrows and so 4.
 */
export const barrows = (): OwnCalculatorDefinition => ({
  title: 'Barrows of stone',
  question: 'How many barrows fill the trench?',
  help: 'Loose stone settles when it is tamped.',
  inputs: [
    {
      name: 'length',
      label: 'Length',
      quantity: 'length',
      help: '',
      min: 0.3,
      max: 30,
      initial: { metric: '12 m', imperial: `40'` },
    },
    {
      name: 'width',
      label: 'Width',
      quantity: 'length',
      help: '',
      min: 0.1,
      max: 3,
      initial: { metric: '400', imperial: '16' },
    },
    {
      name: 'depth',
      label: 'Depth',
      quantity: 'length',
      help: '',
      min: 0.05,
      max: 0.6,
      initial: { metric: '150', imperial: '6' },
    },
    {
      name: 'extra',
      label: 'Extra for settling',
      quantity: 'percent',
      help: '',
      min: 0,
      max: 50,
      initial: { metric: '25', imperial: '25' },
    },
    {
      name: 'barrow',
      label: 'One barrow',
      quantity: 'volume',
      help: '',
      unit: { metric: 'L', imperial: 'ft³' },
      min: 0.04,
      max: 0.12,
      initial: { metric: '60', imperial: '2' },
    },
  ],
  outputs: [
    { name: 'trench', label: 'Trench', quantity: 'volume', expression: 'length * width * depth' },
    { name: 'loose', label: 'Loose stone', quantity: 'volume', expression: 'trench * (1 + extra)' },
    { name: 'barrows', label: 'Barrows', quantity: 'count', expression: 'ceil(loose / barrow)' },
    { name: 'weight', label: 'Weight', quantity: 'mass', expression: 'loose * 1600 kg/m^3' },
  ],
  cautions: [{ title: 'Lifting', text: 'Half a barrow is a barrow.' }],
  sources: [{ title: 'Stone at 1600 kg/m³', kind: 'common practice, no source' }],
  examples: [
    {
      inputs: { length: '12 m', width: '0.4 m', depth: '150 mm', extra: '25 %', barrow: '60 L' },
      expected: { trench: '0.72 m³', loose: '0.9 m³', barrows: '15', weight: '1440 kg' },
    },
    {
      inputs: { length: '3 m', width: '0.4 m', depth: '150 mm', extra: '25 %', barrow: '60 L' },
      expected: { barrows: '4' },
    },
  ],
  slips: [
    {
      id: 'no-extra',
      title: 'Forgot the extra',
      output: 'loose',
      expression: 'trench',
      sentence: 'That is the trench without the extra.',
      wayBack: 'Stone settles: add the extra.',
    },
  ],
})

/** The same with some parts changed. */
export const barrowsWith = (
  changed: Partial<OwnCalculatorDefinition>,
): OwnCalculatorDefinition => ({
  ...barrows(),
  ...changed,
})

/** The same with another formula for one output. */
export function barrowsWithFormula(name: string, expression: string): OwnCalculatorDefinition {
  const definition = barrows()
  const outputs = definition.outputs.map((output) =>
    output.name === name ? { ...output, expression } : output,
  )
  return { ...definition, outputs }
}
