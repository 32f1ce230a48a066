import type { Slip, Values } from './calculator'
import { coverageOf, GALLON, LITRE, tinOf } from './coatingTin'
import { numberOf, wordOf } from './values'

const roughness = (values: Values) => numberOf(values, 'roughness') / 100
const coats = (values: Values) => numberOf(values, 'coats')
const smooth = (values: Values) => numberOf(values, 'area') / coverageOf(values)

/** The known ways to get `coating` wrong. */
export const coatingSlips: Slip[] = [
  {
    id: 'one-coat',
    title: 'One coat only',
    output: 'volume',
    wrong: (_values, outputs) => numberOf(outputs, 'volumePerCoat'),
    sentence: 'That does one coat.',
    wayBack: 'Every coat takes as much again: multiply by the coats.',
  },
  {
    id: 'all-coats',
    title: 'All coats given for one',
    output: 'volumePerCoat',
    wrong: (_values, outputs) => numberOf(outputs, 'volume'),
    sentence: 'That does all the coats.',
    wayBack: 'This line asks for one coat: divide by the coats.',
  },
  {
    id: 'roughness-forgotten',
    title: 'Rough face forgotten',
    output: 'volume',
    wrong: (values) => smooth(values) * coats(values),
    sentence: 'That is enough for planed boards.',
    wayBack: 'A rough face drinks more: add the extra to the area first.',
  },
  {
    id: 'roughness-forgotten-in-a-coat',
    title: 'Rough face forgotten',
    output: 'volumePerCoat',
    wrong: (values) => smooth(values),
    sentence: 'That is enough for planed boards.',
    wayBack: 'A rough face drinks more: add the extra to the area first.',
  },
  {
    id: 'roughness-taken-off',
    title: 'Extra taken off',
    output: 'volume',
    wrong: (values) => smooth(values) * (1 - roughness(values)) * coats(values),
    sentence: 'That takes the extra off instead of adding it.',
    wayBack: 'Rough wood needs more than the tin says: add.',
  },
  {
    id: 'multiplied',
    title: 'Multiplied by the coverage',
    output: 'volume',
    wrong: (values, _outputs, system) => {
      const tin = tinOf(values)
      const square = system === 'metric' ? 1 : 0.3048 ** 2
      const [area, covers] = ['area', 'coverage'].map((name) => numberOf(values, name) / square)
      return (area ?? 0) * (1 + roughness(values)) * coats(values) * (covers ?? 0) * tin
    },
    sentence: 'That multiplies by what a tin covers.',
    wayBack: 'The more a tin covers, the less of it you need: divide.',
  },
  {
    id: 'litre-for-gallon',
    title: 'Litre and gallon mixed up',
    output: 'volume',
    wrong: (values, outputs) => {
      const volume = numberOf(outputs, 'volume')
      const isGallon = wordOf(values, 'coverageFor') === 'gal'
      return isGallon ? (volume * LITRE) / GALLON : (volume * GALLON) / LITRE
    },
    sentence: 'That takes a litre for a gallon, or the other way round.',
    wayBack: 'Look at what the coverage is said for: a US gallon is 3.79 litres.',
  },
]
