import type { Slip, Values } from './calculator'
import { estimateStrength, LOOSE_FOR_ONE, readParts, readTable } from './batchTables'
import { numberOf, wordOf } from './values'

const QUART = 57.75 * 0.0254 ** 3
const POUND = 0.45359237

const isEntrained = (values: Values) => wordOf(values, 'airEntrained') === 'yes'
const wasteFactor = (values: Values) => 1 + numberOf(values, 'waste') / 100
/** The other half of the table. */
const otherHalf = (values: Values) =>
  readTable(numberOf(values, 'maxAggregate'), numberOf(values, 'slump'), !isEntrained(values))

/** What goes wrong with every dry heap. */
const heapSlips = (output: 'cement' | 'sand' | 'stone'): Slip[] => [
  {
    id: `${output}-not-loose`,
    title: 'Loose heaps taken for concrete',
    output,
    wrong: (_values, outputs) => numberOf(outputs, output) / LOOSE_FOR_ONE,
    sentence: 'That lets the heaps fill as much as the concrete: the mix comes out short.',
    wayBack:
      'Sand and cement hide between the stones: start from one and a half times the concrete.',
  },
  {
    id: `${output}-waste-left-out`,
    title: 'Waste left out',
    output,
    wrong: (values, outputs) => numberOf(outputs, output) / wasteFactor(values),
    sentence: 'That leaves nothing for waste.',
    wayBack: 'Add the waste to the concrete before you share it out.',
  },
  {
    id: `${output}-cement-not-counted`,
    title: 'Cement not counted among the parts',
    output,
    wrong: (values, outputs) => {
      const { all, cement } = readParts(wordOf(values, 'proportions'))
      return (numberOf(outputs, output) * all) / (all - cement)
    },
    sentence: 'That divides by the parts of sand and stone alone.',
    wayBack: 'Cement is a part too: add up all three numbers.',
  },
]

const dryHeaps: Slip[] = [
  ...heapSlips('cement'),
  ...heapSlips('sand'),
  {
    id: 'sand-stone-swapped',
    title: 'Sand and stone swapped',
    output: 'sand',
    wrong: (_values, outputs) => numberOf(outputs, 'stone'),
    sentence: 'That is the stone.',
    wayBack: 'The parts are said in this order: cement, sand, stone.',
  },
  ...heapSlips('stone'),
  {
    id: 'stone-sand-swapped',
    title: 'Stone and sand swapped',
    output: 'stone',
    wrong: (_values, outputs) => numberOf(outputs, 'sand'),
    sentence: 'That is the sand.',
    wayBack: 'The parts are said in this order: cement, sand, stone.',
  },
]

/** The known ways to get `batch` wrong. */
export const batchSlips: Slip[] = [
  ...dryHeaps,
  {
    id: 'wrong-half',
    title: 'The wrong half of the table',
    output: 'waterContent',
    wrong: (values) => otherHalf(values).waterContent,
    sentence: 'That is from the other half of the table.',
    wayBack: 'One half is for concrete with an air-entraining admixture, one for concrete without.',
  },
  {
    id: 'water-of-a-cubic-metre',
    title: 'The water of a whole cubic metre',
    output: 'water',
    wrong: (_values, outputs) => numberOf(outputs, 'waterContent') / 1000,
    sentence: 'That is the water of a whole cubic metre.',
    wayBack: 'Multiply it by the concrete that you make.',
  },
  {
    id: 'water-waste-left-out',
    title: 'Waste left out',
    output: 'water',
    wrong: (values, outputs) => numberOf(outputs, 'water') / wasteFactor(values),
    sentence: 'That is the water without the waste.',
    wayBack: 'What is wasted was mixed with water too.',
  },
  {
    id: 'pounds-as-quarts',
    title: 'Pounds given as quarts',
    output: 'water',
    wrong: (_values, outputs, system) =>
      system === 'imperial' ? ((numberOf(outputs, 'water') * 1000) / POUND) * QUART : undefined,
    sentence: 'That is the weight of the water in pounds.',
    wayBack: 'A quart of water weighs a little over two pounds.',
  },
  {
    id: 'cement-to-water',
    title: 'Upside down',
    output: 'waterCementRatio',
    wrong: (_values, outputs) => 1 / numberOf(outputs, 'waterCementRatio'),
    sentence: 'That is cement to water.',
    wayBack: 'Water comes first: divide its weight by that of the cement.',
  },
  {
    id: 'by-volume',
    title: 'By volume',
    output: 'waterCementRatio',
    wrong: (_values, outputs) => numberOf(outputs, 'waterCementRatio') * 1.5,
    sentence: 'That compares litres with litres.',
    wayBack: 'The ratio is by weight: a litre of loose cement weighs more than one of water.',
  },
  {
    id: 'air-of-the-wrong-half',
    title: 'The wrong half of the table',
    output: 'airTarget',
    wrong: (values) => otherHalf(values).airTarget,
    sentence: 'That is from the other half of the table.',
    wayBack: 'Without the admixture there is only the little air that stirring traps.',
  },
  {
    id: 'strength-of-the-wrong-column',
    title: 'The wrong column',
    output: 'strengthEstimate',
    wrong: (values, outputs) =>
      estimateStrength(numberOf(outputs, 'waterCementRatio'), !isEntrained(values)),
    sentence: 'That is from the other column of the table.',
    wayBack:
      'Air costs strength: there is a column for concrete with the admixture and one without.',
  },
  {
    id: 'strength-not-between',
    title: 'The next row up',
    output: 'strengthEstimate',
    wrong: (_values, outputs) => {
      const strength = outputs['strengthEstimate']
      return typeof strength === 'number' ? Math.ceil(strength / 5e6 - 1e-9) * 5e6 : undefined
    },
    sentence: 'That takes the stronger row of the two.',
    wayBack: 'The ratio lies between two rows, and so does the strength.',
  },
]
