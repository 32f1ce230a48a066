import { bagChoices } from './bags'
import type { ChoiceInput, QuantityInput } from './calculator'

/** What is lost on the way into the form, per cent; ten unless said. */
export const wasteInput = (help?: string): QuantityInput => ({
  name: 'waste',
  label: 'Waste',
  quantity: 'percent',
  ...(help === undefined ? {} : { help }),
  assumed: true,
  initial: { metric: '10', imperial: '10' },
  min: 0,
  max: 50,
})

/** Which bag of dry mix. */
export const bagInput: ChoiceInput = {
  name: 'bag',
  label: 'Bag',
  quantity: 'choice',
  initial: { metric: '25 kg', imperial: '80 lb' },
  choices: bagChoices,
}

/** What one bag makes, where the person’s own bag says so. */
export const bagYieldInput: QuantityInput = {
  name: 'bagYield',
  label: 'One bag makes',
  quantity: 'volume',
  help: 'What your own bag says; it overrides the figure here.',
  optional: true,
  unit: { metric: 'L', imperial: 'ft³' },
  initial: { metric: '', imperial: '' },
  min: 0.001,
  max: 0.05,
}
