import type { Slip, Values } from './calculator'
import { numberOf, optionalNumber } from './values'

const runOf = (values: Values) => numberOf(values, 'run')
const ratioOf = (values: Values) => numberOf(values, 'pitch') / 12
const slopeOf = (values: Values) => Math.hypot(1, ratioOf(values))
const overhangOf = (values: Values) => optionalNumber(values, 'overhang') ?? 0
const angleOf = (outputs: Values) => numberOf(outputs, 'plumbCut')

const lengthSlips: Slip[] = [
  {
    id: 'span-for-run',
    title: 'Span for run',
    output: 'lineLength',
    wrong: (_values, outputs) => 2 * numberOf(outputs, 'lineLength'),
    sentence: 'That takes the whole span.',
    wayBack: 'The run is half the span of a roof with two slopes: one rafter covers one half.',
  },
  {
    id: 'run-for-length',
    title: 'Level run for length',
    output: 'lineLength',
    wrong: (values) => runOf(values),
    sentence: 'That is the level run.',
    wayBack: 'The rafter goes along the slope: multiply by √(1 + ratio²).',
  },
  {
    id: 'run-and-rise-added',
    title: 'Run and rise added',
    output: 'lineLength',
    wrong: (values, outputs) => runOf(values) + numberOf(outputs, 'rise'),
    sentence: 'That goes along and then up.',
    wayBack: 'The rafter goes straight: square both, add, take the square root.',
  },
  {
    id: 'overhang-in-line',
    title: 'Overhang counted',
    output: 'lineLength',
    wrong: (values) => (runOf(values) + overhangOf(values)) * slopeOf(values),
    sentence: 'That has the overhang in it.',
    wayBack: 'This length stops at the outside of the plate.',
  },
  {
    id: 'overhang-forgotten',
    title: 'Overhang forgotten',
    output: 'totalLength',
    wrong: (values) => (runOf(values) - numberOf(values, 'ridge') / 2) * slopeOf(values),
    sentence: 'That rafter ends at the plate: it has no tail.',
    wayBack: 'Add the overhang to the run before you multiply.',
  },
  {
    id: 'overhang-level',
    title: 'Overhang added level',
    output: 'totalLength',
    wrong: (values) =>
      (runOf(values) - numberOf(values, 'ridge') / 2) * slopeOf(values) + overhangOf(values),
    sentence: 'That adds the overhang as it lies on the level.',
    wayBack: 'The tail lies on the slope too: add the overhang to the run first, then multiply.',
  },
  {
    id: 'ridge-forgotten',
    title: 'Ridge forgotten',
    output: 'totalLength',
    wrong: (values) => (runOf(values) + overhangOf(values)) * slopeOf(values),
    sentence: 'That goes to the middle of the ridge board.',
    wayBack: 'Each rafter stops at its face: take half the thickness off the run.',
  },
  {
    id: 'ridge-whole',
    title: 'Whole ridge taken off',
    output: 'totalLength',
    wrong: (values) =>
      (runOf(values) - numberOf(values, 'ridge') + overhangOf(values)) * slopeOf(values),
    sentence: 'That takes the whole ridge board off one rafter.',
    wayBack: 'The two rafters share it: half comes off each.',
  },
  {
    id: 'rise-by-sine',
    title: 'Rise by sine',
    output: 'rise',
    wrong: (values, outputs) => runOf(values) * Math.sin(angleOf(outputs)),
    sentence: 'That treats the run as if it lay along the slope.',
    wayBack: 'The run is level: multiply it by the ratio, which is the tangent.',
  },
  {
    id: 'rise-by-pitch',
    title: 'Not divided by 12',
    output: 'rise',
    wrong: (values) => runOf(values) * numberOf(values, 'pitch'),
    sentence: 'That multiplies by the rise in 12 itself.',
    wayBack: 'It is so much in every 12: divide by 12 first.',
  },
]

const cutSlips: Slip[] = [
  {
    id: 'level-for-plumb',
    title: 'Level cut for plumb cut',
    output: 'plumbCut',
    wrong: (_values, outputs) => numberOf(outputs, 'levelCut'),
    sentence: 'That is the level cut.',
    wayBack: 'The plumb cut leans off a square cut by the pitch of the roof.',
  },
  {
    id: 'percent-as-degrees',
    title: 'Per cent given as degrees',
    output: 'plumbCut',
    wrong: (values) => (100 * ratioOf(values) * Math.PI) / 180,
    sentence: 'That is the slope in per cent.',
    wayBack: 'Degrees come from the arctangent of rise over run.',
  },
  {
    id: 'plumb-for-level',
    title: 'Plumb cut for level cut',
    output: 'levelCut',
    wrong: (_values, outputs) => angleOf(outputs),
    sentence: 'That is the plumb cut.',
    wayBack: 'Plumb and level are square to each other: together they make 90°.',
  },
  {
    id: 'notch-for-heel',
    title: 'Notch for heel',
    output: 'heelCut',
    wrong: (_values, outputs) => numberOf(outputs, 'birdsmouthDepth'),
    sentence: 'That is measured square into the rafter.',
    wayBack: 'The heel stands plumb: seat times rise over run.',
  },
  {
    id: 'heel-upside-down',
    title: 'Ratio upside down',
    output: 'heelCut',
    wrong: (values) => numberOf(values, 'seat') / ratioOf(values),
    sentence: 'That divides by the pitch.',
    wayBack: 'The heel rises with the roof: multiply the seat by rise over run.',
  },
  {
    id: 'heel-for-notch',
    title: 'Heel for notch',
    output: 'birdsmouthDepth',
    wrong: (_values, outputs) => numberOf(outputs, 'heelCut'),
    sentence: 'That is the heel, measured straight up.',
    wayBack: 'The notch is measured square to the edge: seat times sine of the plumb cut.',
  },
  {
    id: 'seat-for-notch',
    title: 'Seat for notch',
    output: 'birdsmouthDepth',
    wrong: (values) => numberOf(values, 'seat'),
    sentence: 'That is how long the seat is.',
    wayBack: 'How deep it goes depends on the pitch: seat times sine of the plumb cut.',
  },
  {
    id: 'judged-by-the-heel',
    title: 'Judged by the heel',
    output: 'notchFits',
    wrong: (values, outputs) =>
      numberOf(outputs, 'heelCut') <= numberOf(values, 'depth') / 3 ? 'yes' : 'no',
    sentence: 'That sets the heel, measured straight up, against the depth.',
    wayBack: 'Depth is measured square to the edge, so the notch is too.',
  },
  {
    id: 'judged-by-half',
    title: 'Half allowed',
    output: 'notchFits',
    wrong: (values, outputs) =>
      numberOf(outputs, 'birdsmouthDepth') <= numberOf(values, 'depth') / 2 ? 'yes' : 'no',
    sentence: 'That lets the notch take half.',
    wayBack: 'Two thirds of the rafter must stay whole.',
  },
]

/** The known ways to get `rafter` wrong. */
export const rafterSlips: Slip[] = [...lengthSlips, ...cutSlips]
