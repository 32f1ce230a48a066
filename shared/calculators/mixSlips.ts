import type { Slip, Values } from './calculator'
import { findBag } from './bags'
import { judgeSlump, judgeWater } from './slump'
import { numberOf, optionalNumber, wordOf } from './values'

const readingOf = (values: Values, outputs: Values) => ({
  waterAdded: numberOf(values, 'waterAdded'),
  waterMin: numberOf(outputs, 'waterMin'),
  waterMax: numberOf(outputs, 'waterMax'),
  slump: optionalNumber(values, 'slump'),
})

/** Pints taken for quarts, or the figure of a litre jug read in decilitres. */
const doubledPints = (outputs: Values, name: string, system: string) =>
  system === 'imperial' ? 2 * numberOf(outputs, name) : undefined

/** The known ways to get `mix` wrong. */
export const mixSlips: Slip[] = [
  {
    id: 'whole-bag',
    title: 'Whole bag taken for cement',
    output: 'waterCementRatio',
    wrong: (values) =>
      (numberOf(values, 'waterAdded') * 1000) / findBag(wordOf(values, 'bag')).mass,
    sentence: 'That divides by the whole bag, sand and stone and all.',
    wayBack: 'Only a part of the bag is cement: divide by that part.',
  },
  {
    id: 'upside-down',
    title: 'Cement to water',
    output: 'waterCementRatio',
    wrong: (_values, outputs) => 1 / numberOf(outputs, 'waterCementRatio'),
    sentence: 'That is cement to water.',
    wayBack: 'Turn it round: water comes first.',
  },
  {
    id: 'pints-least',
    title: 'Pints given as quarts',
    output: 'waterMin',
    wrong: (_values, outputs, system) => doubledPints(outputs, 'waterMin', system),
    sentence: 'That is pints.',
    wayBack: 'A quart is two pints: divide by 2.',
  },
  {
    id: 'pints-most',
    title: 'Pints given as quarts',
    output: 'waterMax',
    wrong: (_values, outputs, system) => doubledPints(outputs, 'waterMax', system),
    sentence: 'That is pints.',
    wayBack: 'A quart is two pints: divide by 2.',
  },
  {
    id: 'most-for-least',
    title: 'Most for least',
    output: 'waterMin',
    wrong: (_values, outputs) => numberOf(outputs, 'waterMax'),
    sentence: 'That is the most the bag may have.',
    wayBack: 'Begin with the least and add by the cup: water goes in, never out.',
  },
  {
    id: 'least-for-most',
    title: 'Least for most',
    output: 'waterMax',
    wrong: (_values, outputs) => numberOf(outputs, 'waterMin'),
    sentence: 'That is the least, the amount to begin with.',
    wayBack: 'The other figure on the bag is the limit.',
  },
  {
    id: 'judged-by-the-cone',
    title: 'Judged by the cone alone',
    output: 'verdict',
    wrong: (values) => {
      const slump = optionalNumber(values, 'slump')
      return slump === undefined ? undefined : judgeSlump(slump)
    },
    sentence: 'That goes by the cone alone.',
    wayBack: 'Look at the water too: over the limit of the bag is too much, however it stands.',
  },
  {
    id: 'judged-by-the-jug',
    title: 'Judged by the jug alone',
    output: 'verdict',
    wrong: (values, outputs) => judgeWater(readingOf(values, outputs)),
    sentence: 'That goes by the jug alone.',
    wayBack: 'Damp sand brings water of its own: within the limit of the bag, believe the cone.',
  },
]
