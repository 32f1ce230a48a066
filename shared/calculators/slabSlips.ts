import type { Slip, Values } from './calculator'
import { findBag } from './bags'
import { numberOf, optionalNumber, wordOf } from './values'
import { roundDownTo } from '../units/number'

const yieldOf = (values: Values) =>
  optionalNumber(values, 'bagYield') ?? findBag(wordOf(values, 'bag')).yield
const volume = (outputs: Values) => numberOf(outputs, 'volume')
const withWaste = (outputs: Values) => numberOf(outputs, 'volumeWithWaste')
const isFlat = (values: Values) => wordOf(values, 'flatBase') === 'yes'
const thinVolume = (values: Values) =>
  numberOf(values, 'length') * numberOf(values, 'width') * numberOf(values, 'thickness')
const wasteShare = (values: Values) => numberOf(values, 'waste') / 100

/** The known ways to get `slab` wrong. */
export const slabSlips: Slip[] = [
  {
    id: 'inches-as-feet',
    title: 'Thickness left in inches',
    output: 'volume',
    wrong: (_values, outputs, system) => (system === 'imperial' ? volume(outputs) * 12 : undefined),
    sentence: 'That takes the inches of the thickness for feet: twelve times too much.',
    wayBack: 'Divide the thickness by 12 before you multiply.',
  },
  {
    id: 'cubic-feet',
    title: 'Cubic feet given as cubic yards',
    output: 'volume',
    wrong: (_values, outputs, system) => (system === 'imperial' ? volume(outputs) * 27 : undefined),
    sentence: 'That is cubic feet.',
    wayBack: 'A cubic yard is 27 cubic feet: divide by 27.',
  },
  {
    id: 'litres',
    title: 'Litres given as cubic metres',
    output: 'volume',
    wrong: (_values, outputs, system) => (system === 'metric' ? volume(outputs) * 1000 : undefined),
    sentence: 'That is litres.',
    wayBack: 'A cubic metre is 1000 litres: divide by 1000.',
  },
  {
    id: 'thickness-in-centimetres',
    title: 'Millimetres of thickness taken for centimetres',
    output: 'volume',
    wrong: (_values, outputs, system) => (system === 'metric' ? volume(outputs) * 10 : undefined),
    sentence: 'That makes the pad ten times as thick as it is.',
    wayBack: '100 mm is 0.1 m: write all three sides in metres, then multiply.',
  },
  {
    id: 'fall-forgotten',
    title: 'Level base: the thicker back forgotten',
    output: 'volume',
    wrong: (values) => (isFlat(values) ? thinVolume(values) : undefined),
    sentence: 'That takes the thin front edge for the whole pad.',
    wayBack: 'On a level base the pad grows towards the back: use the mean of front and back.',
  },
  {
    id: 'waste-given-too-early',
    title: 'Waste already added',
    output: 'volume',
    wrong: (_values, outputs) => withWaste(outputs),
    sentence: 'That has the waste in it already.',
    wayBack: 'This line asks for what fills the form; waste comes in the next one.',
  },
  {
    id: 'waste-left-out',
    title: 'Waste left out',
    output: 'volumeWithWaste',
    wrong: (_values, outputs) => volume(outputs),
    sentence: 'That fills the form and leaves nothing for waste.',
    wayBack: 'Add the waste: the ground, the barrow and an uneven base keep their share.',
  },
  {
    id: 'waste-taken-off',
    title: 'Waste taken off',
    output: 'volumeWithWaste',
    wrong: (values, outputs) => volume(outputs) * (1 - wasteShare(values)),
    sentence: 'That takes the waste off instead of adding it.',
    wayBack: 'Waste is concrete you buy and do not see again: add it.',
  },
  {
    id: 'bags-rounded-down',
    title: 'Bags rounded down',
    output: 'bags',
    wrong: (values, outputs) => roundDownTo(withWaste(outputs) / yieldOf(values), 1),
    sentence: 'That is rounded down: the last corner stays empty.',
    wayBack: 'Bags are bought whole: round up, however small the part.',
  },
  {
    id: 'bags-without-waste',
    title: 'Bags without waste',
    output: 'bags',
    wrong: (values, outputs) => Math.ceil(volume(outputs) / yieldOf(values) - 1e-9),
    sentence: 'Those bags fill the form and leave nothing for waste.',
    wayBack: 'Divide the volume with waste by what one bag makes.',
  },
  {
    id: 'bags-by-weight',
    title: 'Bag taken for water',
    output: 'bags',
    wrong: (values, outputs) =>
      Math.ceil((withWaste(outputs) * 1000) / findBag(wordOf(values, 'bag')).mass - 1e-9),
    sentence: 'That lets a kilogram of dry mix fill a litre, as water would.',
    wayBack: 'A bag makes far less than its weight in litres: divide by its yield.',
  },
  {
    id: 'ready-mix-nearest',
    title: 'Order not rounded up',
    output: 'readyMix',
    wrong: (_values, outputs) => withWaste(outputs),
    sentence: 'A lorry does not sell that: it comes in whole steps.',
    wayBack: 'Round up to the next step that the plant sells.',
  },
  {
    id: 'mass-without-bags',
    title: 'Weight of the part bags',
    output: 'mass',
    wrong: (values, outputs) =>
      (withWaste(outputs) / yieldOf(values)) * findBag(wordOf(values, 'bag')).mass,
    sentence: 'That weighs a part of the last bag only.',
    wayBack: 'You carry whole bags: multiply the bags you buy.',
  },
  {
    id: 'whole-fall-added',
    title: 'The whole fall added',
    output: 'meanThickness',
    wrong: (values, outputs) =>
      isFlat(values) ? numberOf(values, 'thickness') + numberOf(outputs, 'drop') : undefined,
    sentence: 'That is the thick back edge, not the mean.',
    wayBack: 'Front and back differ by the fall: add half of it.',
  },
  {
    id: 'fall-along-the-length',
    title: 'Fall taken along the length',
    output: 'drop',
    wrong: (values) => {
      const fall = optionalNumber(values, 'fall')
      return fall === undefined ? undefined : fall * numberOf(values, 'length')
    },
    sentence: 'That lets the water run along the length.',
    wayBack: 'This pad falls from back to front: multiply the width by the fall.',
  },
]
