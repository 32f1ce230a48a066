import type { Calculator, Values } from './calculator'
import { lumberSizeSlips } from './lumberSizeSlips'
import { lumberSizeSteps } from './lumberSizeSteps'
import {
  countedThickness,
  dressedSize,
  INCH,
  nominalChoices,
  readNominal,
} from './lumberSizeTables'
import { optionalNumber, wordOf } from './values'
import { clean } from '../units/number'

const FOOT = 12 * INCH

function compute(values: Values): Values {
  const nominal = readNominal(wordOf(values, 'nominal'))
  const { thickness, width } = dressedSize(nominal, wordOf(values, 'moisture') === 'green')
  const length = optionalNumber(values, 'length')
  const measured = optionalNumber(values, 'measuredWidth')
  return {
    thickness: thickness * INCH,
    width: width * INCH,
    boardFeet:
      length === undefined
        ? undefined
        : clean((countedThickness(nominal) * nominal.width * (length / FOOT)) / 12),
    shortfall: measured === undefined ? undefined : width * INCH - measured,
  }
}

/**
 * What a named size of North American softwood measures, metres: tables of PS 20 for boards, dimension lumber and timbers.
 * Board feet = named thickness (in, at least 1) × named width (in) × length (ft) ÷ 12. Shortfall = width − measured width.
 * A dry 2x4 is 1 1/2 × 3 1/2 in, 38 × 89 mm; 14 ft of it are 9 1/3 board feet.
 */
export const lumberSize: Calculator = {
  id: 'lumber-size',
  version: 1,
  title: 'Lumber size',
  question: 'What does a 2 × 4 really measure?',
  help: 'A 2 × 4 is named by its rough size, before drying and planing took some of it. Draw and count with what it measures, or the last joist has no room. Timber that is sold in millimetres is named by its true size: measure it all the same.',
  inputs: [
    {
      name: 'nominal',
      label: 'Named size',
      quantity: 'choice',
      help: 'As the yard calls it, in inches.',
      initial: { metric: '2x4', imperial: '2x4' },
      choices: nominalChoices,
    },
    {
      name: 'moisture',
      label: 'Sold',
      quantity: 'choice',
      help: 'The stamp says S-DRY, KD or MC 15 where it is dry, S-GRN where it is not.',
      initial: { metric: 'dry', imperial: 'dry' },
      choices: [
        { value: 'dry', label: 'Dry' },
        { value: 'green', label: 'Green, not dried' },
      ],
    },
    {
      name: 'length',
      label: 'Length',
      quantity: 'length',
      help: 'For board feet. Empty: none are worked out.',
      optional: true,
      initial: { metric: '3600', imperial: `12'` },
      min: 0.1,
      max: 12,
    },
    {
      name: 'measuredWidth',
      label: 'Width of your own board',
      quantity: 'length',
      help: 'As you measure it. Empty: not compared.',
      optional: true,
      initial: { metric: '', imperial: '' },
      min: 0.02,
      max: 0.45,
    },
  ],
  outputs: [
    { name: 'thickness', label: 'Thickness', quantity: 'length' },
    { name: 'width', label: 'Width', quantity: 'length' },
    { name: 'boardFeet', label: 'Board feet', quantity: 'count' },
    {
      name: 'shortfall',
      label: 'Your board is narrower by (minus: wider)',
      quantity: 'length',
    },
  ],
  compute,
  steps: lumberSizeSteps,
  slips: lumberSizeSlips,
  cautions: [
    {
      title: 'Size is not strength',
      text: 'What a joist, rafter or post may carry depends on species, grade and span as well. Use the span tables of your local code; ask the building department and, where it is required, a licensed engineer.',
    },
    {
      title: 'Wood moves',
      text: 'Green wood shrinks as it dries, treated wood swells and shrinks again. Measure the boards you have bought before you cut.',
    },
  ],
  sources: [
    {
      title: 'PS 20, American Softwood Lumber Standard',
      detail: 'boards, dimension, timbers, as tabulated by Engineering ToolBox',
      kind: 'published',
    },
    {
      title: 'Green sizes of boards, and 2 1/2 to 4 1/2 in thicknesses that no table above prints',
      detail: 'PS 20',
      kind: 'from memory',
    },
    {
      title: 'NAVEDTRA Engineering Aid Basic',
      detail: 'section 6: board feet by named sizes, under 1 in counts as 1 in',
      kind: 'published',
    },
    {
      title: 'CMHC, Canadian Wood-Frame House Construction',
      detail: '38 × 89 mm',
      kind: 'published',
    },
  ],
  example: {
    inputs: { nominal: '2x4', moisture: 'dry', length: '14 ft', measuredWidth: '88 mm' },
    outputs: { thickness: 0.0381, width: 0.0889, boardFeet: 9.33333, shortfall: 0.0009 },
  },
}
