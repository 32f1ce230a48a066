import type { Slip, Values } from './calculator'
import { dressedSize, INCH, readNominal } from './lumberSizeTables'
import { numberOf, optionalNumber, wordOf } from './values'

const nominalOf = (values: Values) => readNominal(wordOf(values, 'nominal'))
const isGreen = (values: Values) => wordOf(values, 'moisture') === 'green'
/** The size by the other column of the table. */
const otherSize = (values: Values) => dressedSize(nominalOf(values), !isGreen(values))
const lengthOf = (values: Values) => optionalNumber(values, 'length')

/** The known ways to get `lumber-size` wrong. */
export const lumberSizeSlips: Slip[] = [
  {
    id: 'nominal-thickness',
    title: 'Named thickness',
    output: 'thickness',
    wrong: (values) => nominalOf(values).thickness * INCH,
    sentence: 'That is the named size.',
    wayBack: 'Drying and planing took some of it: look the size up, or measure a board.',
  },
  {
    id: 'other-column-thickness',
    title: 'Dry for green',
    output: 'thickness',
    wrong: (values) => otherSize(values).thickness * INCH,
    sentence: 'That is the size of the other kind, dry for green or green for dry.',
    wayBack: 'Look at the stamp: S-GRN is green.',
  },
  {
    id: 'width-for-thickness',
    title: 'Width for thickness',
    output: 'thickness',
    wrong: (_values, outputs) => numberOf(outputs, 'width'),
    sentence: 'That is the width.',
    wayBack: 'The first of the two figures is the thickness.',
  },
  {
    id: 'nominal-width',
    title: 'Named width',
    output: 'width',
    wrong: (values) => nominalOf(values).width * INCH,
    sentence: 'That is the named size.',
    wayBack: 'Drying and planing took some of it: look the size up, or measure a board.',
  },
  {
    id: 'half-an-inch-off-all',
    title: 'Half an inch off every width',
    output: 'width',
    wrong: (values) => (nominalOf(values).width - 0.5) * INCH,
    sentence: 'That takes half an inch off, as for narrow boards.',
    wayBack: 'From 8 inches on a dry board has lost three quarters.',
  },
  {
    id: 'other-column-width',
    title: 'Dry for green',
    output: 'width',
    wrong: (values) => otherSize(values).width * INCH,
    sentence: 'That is the size of the other kind, dry for green or green for dry.',
    wayBack: 'Look at the stamp: S-GRN is green.',
  },
  {
    id: 'dressed-board-feet',
    title: 'Measured sizes',
    output: 'boardFeet',
    wrong: (values, outputs) => {
      const length = lengthOf(values)
      const section = numberOf(outputs, 'thickness') * numberOf(outputs, 'width')
      return length === undefined ? undefined : (section * length) / (INCH ** 3 * 144)
    },
    sentence: 'That counts what the piece measures.',
    wayBack: 'Board feet are sold by the named size.',
  },
  {
    id: 'not-by-12',
    title: 'Not divided by 12',
    output: 'boardFeet',
    wrong: (_values, outputs) => {
      const feet = optionalNumber(outputs, 'boardFeet')
      return feet === undefined ? undefined : feet * 12
    },
    sentence: 'That mixes inches and feet without dividing.',
    wayBack: 'A board foot is 1 in × 12 in × 1 ft: divide by 12.',
  },
  {
    id: 'running-feet',
    title: 'Running feet',
    output: 'boardFeet',
    wrong: (values) => {
      const length = lengthOf(values)
      return length === undefined ? undefined : length / (12 * INCH)
    },
    sentence: 'That is its length in feet.',
    wayBack: 'Multiply by named thickness and width, then divide by 12.',
  },
  {
    id: 'against-the-name',
    title: 'Against the name',
    output: 'shortfall',
    wrong: (values) => {
      const measured = optionalNumber(values, 'measuredWidth')
      return measured === undefined ? undefined : nominalOf(values).width * INCH - measured
    },
    sentence: 'That compares your board with the named size.',
    wayBack: 'Compare it with what such a board should measure.',
  },
  {
    id: 'turned-round',
    title: 'Turned round',
    output: 'shortfall',
    wrong: (_values, outputs) => {
      const short = optionalNumber(outputs, 'shortfall')
      return short === undefined ? undefined : -short
    },
    sentence: 'That takes the table off the board.',
    wayBack: 'Take your board off the table: plus means that it is narrower.',
  },
]
