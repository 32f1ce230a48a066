import type { Slip, Values } from './calculator'
import { numberOf } from './values'

const looseOf = (outputs: Values) => numberOf(outputs, 'looseVolume')
const compactionOf = (values: Values) => numberOf(values, 'compaction')
/** Loose stone where the base reaches so many overhangs past the pad, in all. */
const looseWith = (values: Values, overhangs: number) =>
  (numberOf(values, 'length') + overhangs * numberOf(values, 'overhang')) *
  (numberOf(values, 'width') + overhangs * numberOf(values, 'overhang')) *
  numberOf(values, 'depth') *
  compactionOf(values)

/** The known ways to get `gravel` wrong. */
export const gravelSlips: Slip[] = [
  {
    id: 'tamped-for-loose',
    title: 'Tamping forgotten',
    output: 'looseVolume',
    wrong: (values, outputs) => looseOf(outputs) / compactionOf(values),
    sentence: 'That fills the hole loose: tamped, it sinks below your line.',
    wayBack: 'Multiply the tamped volume by how much loose stone makes one of it.',
  },
  {
    id: 'divided-by-compaction',
    title: 'Divided instead of multiplied',
    output: 'looseVolume',
    wrong: (values, outputs) => looseOf(outputs) / compactionOf(values) ** 2,
    sentence: 'That makes the heap smaller than the hole.',
    wayBack: 'Loose stone takes more room than tamped: multiply.',
  },
  {
    id: 'overhang-forgotten',
    title: 'Only as large as the pad',
    output: 'looseVolume',
    wrong: (values) => looseWith(values, 0),
    sentence: 'That base ends under the edge of the pad.',
    wayBack: 'It reaches past the pad on every side: add it at both ends, both ways.',
  },
  {
    id: 'overhang-once',
    title: 'Added on one side only',
    output: 'looseVolume',
    wrong: (values) => looseWith(values, 1),
    sentence: 'That reaches past the pad at one end only.',
    wayBack: 'A base has two ends: add it twice to the length and twice to the width.',
  },
  {
    id: 'inches-as-feet',
    title: 'Depth left in inches',
    output: 'looseVolume',
    wrong: (_values, outputs, system) =>
      system === 'imperial' ? looseOf(outputs) * 12 : undefined,
    sentence: 'That takes the inches of the depth for feet.',
    wayBack: 'Divide the depth by 12 before you multiply.',
  },
  {
    id: 'cubic-feet',
    title: 'Cubic feet given as cubic yards',
    output: 'looseVolume',
    wrong: (_values, outputs, system) =>
      system === 'imperial' ? looseOf(outputs) * 27 : undefined,
    sentence: 'That is cubic feet.',
    wayBack: 'A cubic yard is 27 cubic feet: divide by 27.',
  },
  {
    id: 'thickness-in-centimetres',
    title: 'Millimetres of depth taken for centimetres',
    output: 'looseVolume',
    wrong: (_values, outputs, system) => (system === 'metric' ? looseOf(outputs) * 10 : undefined),
    sentence: 'That makes the base ten times as deep as it is.',
    wayBack: '100 mm is 0.1 m: write all three sides in metres, then multiply.',
  },
  {
    id: 'tamped-weighed',
    title: 'Tamped volume times loose weight',
    output: 'mass',
    wrong: (values, outputs) => numberOf(outputs, 'mass') / compactionOf(values),
    sentence: 'That weighs the tamped volume as if it lay loose.',
    wayBack: 'Weigh what comes off the lorry: the loose volume times its density.',
  },
  {
    id: 'as-heavy-as-concrete',
    title: 'Weighed as concrete',
    output: 'mass',
    wrong: (_values, outputs) => looseOf(outputs) * 2400,
    sentence: 'That weighs it as solid as concrete.',
    wayBack: 'Loose stone is full of gaps: use what the yard says of it.',
  },
  {
    id: 'as-light-as-water',
    title: 'Weighed as water',
    output: 'mass',
    wrong: (_values, outputs) => looseOf(outputs) * 1000,
    sentence: 'That weighs it as water.',
    wayBack: 'Stone is heavier: multiply by what loose stone weighs.',
  },
]
