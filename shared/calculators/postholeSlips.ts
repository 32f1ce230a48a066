import type { Slip, Values } from './calculator'
import { findBag } from './bags'
import { numberOf, optionalNumber, wordOf } from './values'
import { roundDownTo } from '../units/number'

const yieldOf = (values: Values) =>
  optionalNumber(values, 'bagYield') ?? findBag(wordOf(values, 'bag')).yield
const wasteFactor = (values: Values) => 1 + numberOf(values, 'waste') / 100
const bagsFor = (values: Values, volume: number) => Math.ceil(volume / yieldOf(values) - 1e-9)
const postOf = (values: Values) =>
  numberOf(values, 'postWidth') * numberOf(values, 'postDepth') * numberOf(values, 'depth')
const squareOf = (values: Values) => numberOf(values, 'diameter') ** 2 * numberOf(values, 'depth')
const holeOf = (values: Values) => (Math.PI / 4) * squareOf(values)
const INCH = 0.0254
/** What posts measure and what they are called, in inches. */
const CALLED = [
  [3.5, 4],
  [5.5, 6],
] as const

/** The size a side is called by; undefined where it has no such name. */
function calledSize(metres: number): number | undefined {
  const found = CALLED.find(([actual]) => Math.abs(actual * INCH - metres) < 0.0006)
  return found && found[1] * INCH
}

/** One hole with the post taken off as it is called. */
function nominalEach(values: Values): number | undefined {
  const wide = calledSize(numberOf(values, 'postWidth'))
  const thick = calledSize(numberOf(values, 'postDepth'))
  if (wide === undefined || thick === undefined) return undefined
  return holeOf(values) - wide * thick * numberOf(values, 'depth')
}

const eachSlips: Slip[] = [
  {
    id: 'post-not-taken-off',
    title: 'Post not taken off',
    output: 'volumeEach',
    wrong: (values) => holeOf(values),
    sentence: 'That fills the hole as if no post stood in it.',
    wayBack: 'Take off the post: wide × thick × deep.',
  },
  {
    id: 'diameter-for-radius',
    title: 'Diameter taken for the radius',
    output: 'volumeEach',
    wrong: (values) => 4 * holeOf(values) - postOf(values),
    sentence: 'That puts the whole width where half of it belongs: four times the hole.',
    wayBack: 'Halve the width before you square it, or use π ÷ 4 × width².',
  },
  {
    id: 'square-hole',
    title: 'A square hole',
    output: 'volumeEach',
    wrong: (values) => squareOf(values) - postOf(values),
    sentence: 'That is a square hole.',
    wayBack: 'A round one holds less: multiply the square by π ÷ 4.',
  },
  {
    id: 'nominal-post',
    title: 'The post as it is called, not as it measures',
    output: 'volumeEach',
    wrong: nominalEach,
    sentence: 'That takes off the size the post is called by.',
    wayBack: 'A post is thinner than its name: measure it.',
  },
  {
    id: 'post-taken-off-round',
    title: 'A round post',
    output: 'volumeEach',
    wrong: (values) => holeOf(values) - (Math.PI / 4) * postOf(values),
    sentence: 'That takes off a round post.',
    wayBack: 'A sawn post is square: wide × thick × deep, without π.',
  },
]

/** The known ways to get `posthole` wrong. */
export const postholeSlips: Slip[] = [
  ...eachSlips,
  {
    id: 'one-hole-only',
    title: 'One hole only',
    output: 'volume',
    wrong: (_values, outputs) => numberOf(outputs, 'volumeEach'),
    sentence: 'That is one hole.',
    wayBack: 'Multiply by the number of holes.',
  },
  {
    id: 'waste-given-too-early',
    title: 'Waste already added',
    output: 'volume',
    wrong: (_values, outputs) => numberOf(outputs, 'volumeWithWaste'),
    sentence: 'That has the waste in it already.',
    wayBack: 'This line asks for what fills the holes; waste comes in the next one.',
  },
  {
    id: 'posts-left-in',
    title: 'Posts not taken off',
    output: 'volume',
    wrong: (values) => holeOf(values) * numberOf(values, 'count'),
    sentence: 'That fills the holes as if no posts stood in them.',
    wayBack: 'Take off the post in every hole.',
  },
  {
    id: 'waste-left-out',
    title: 'Waste left out',
    output: 'volumeWithWaste',
    wrong: (_values, outputs) => numberOf(outputs, 'volume'),
    sentence: 'That leaves nothing for waste.',
    wayBack: 'Holes are never as round as the sum: add the waste.',
  },
  {
    id: 'bags-rounded-down',
    title: 'Bags rounded down',
    output: 'bags',
    wrong: (values, outputs) =>
      roundDownTo(numberOf(outputs, 'volumeWithWaste') / yieldOf(values), 1),
    sentence: 'That is rounded down: the last hole stays short.',
    wayBack: 'Bags are bought whole: round up, however small the part.',
  },
  {
    id: 'bags-a-hole',
    title: 'Rounded up in every hole',
    output: 'bags',
    wrong: (values, outputs) =>
      numberOf(values, 'count') *
      bagsFor(values, numberOf(outputs, 'volumeEach') * wasteFactor(values)),
    sentence: 'That rounds up in every hole; an open bag goes on in the next one.',
    wayBack: 'Add the holes up first, then round up once.',
  },
  {
    id: 'bags-without-waste',
    title: 'Bags without waste',
    output: 'bags',
    wrong: (values, outputs) => bagsFor(values, numberOf(outputs, 'volume')),
    sentence: 'Those bags leave nothing for waste.',
    wayBack: 'Divide the volume with waste by what one bag makes.',
  },
  {
    id: 'bags-post-left-in',
    title: 'Bags with the posts left in',
    output: 'bags',
    wrong: (values) =>
      bagsFor(values, holeOf(values) * numberOf(values, 'count') * wasteFactor(values)),
    sentence: 'Those bags fill the holes as if no posts stood in them.',
    wayBack: 'Take off the post in every hole before you count bags.',
  },
]
