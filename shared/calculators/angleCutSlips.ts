import type { Slip, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf } from './values'

/** What a board has lost between its name and its measure: half an inch, or 5 mm planed off. An assumption. */
const LOST: Record<UnitSystem, number> = { metric: 0.005, imperial: 0.0127 }

const widthOf = (values: Values) => numberOf(values, 'boardWidth')
const angleOf = (values: Values) => numberOf(values, 'angle')
const longOf = (values: Values) => numberOf(values, 'longPoint')
const offsetOf = (outputs: Values) => numberOf(outputs, 'offset')

/** The known ways to get `angle-cut` wrong. */
export const angleCutSlips: Slip[] = [
  {
    id: 'sine-for-tangent',
    title: 'Sine for tangent',
    output: 'offset',
    wrong: (values) => widthOf(values) * Math.sin(angleOf(values)),
    sentence: 'That takes the width as if it lay along the cut.',
    wayBack: 'The width is square across the board: use the tangent.',
  },
  {
    id: 'from-the-edge',
    title: 'Angle from the edge',
    output: 'offset',
    wrong: (values) => widthOf(values) / Math.tan(angleOf(values)),
    sentence: 'That measures the angle from the edge of the board.',
    wayBack: 'The saw counts from square across: multiply by the tangent, do not divide.',
  },
  {
    id: 'nominal-for-actual',
    title: 'Name for measure',
    output: 'offset',
    wrong: (values, _outputs, system) =>
      (widthOf(values) + LOST[system]) * Math.tan(angleOf(values)),
    sentence: 'That takes the width the board is sold by.',
    wayBack: 'Measure a real board: planing and drying took some of it.',
  },
  {
    id: 'half-the-angle',
    title: 'Half the angle',
    output: 'offset',
    wrong: (values) => widthOf(values) * Math.tan(angleOf(values) / 2),
    sentence: 'That is half the angle, as for a mitre shared by two pieces.',
    wayBack: 'Here the whole angle is on this piece.',
  },
  {
    id: 'length-of-the-cut',
    title: 'Length of the cut',
    output: 'offset',
    wrong: (values) => widthOf(values) / Math.cos(angleOf(values)),
    sentence: 'That is how long the cut itself is.',
    wayBack: 'What is asked runs along the board, from one point to the other.',
  },
  {
    id: 'offset-added',
    title: 'Offset added',
    output: 'shortPoint',
    wrong: (values, outputs) => longOf(values) + offsetOf(outputs),
    sentence: 'That makes the short point longer than the long one.',
    wayBack: 'Take the slant off the long point.',
  },
  {
    id: 'long-for-short',
    title: 'Long point for short point',
    output: 'shortPoint',
    wrong: (values) => longOf(values),
    sentence: 'That is the long point.',
    wayBack: 'The other edge is shorter by the slant.',
  },
  {
    id: 'offset-for-short',
    title: 'Only the slant',
    output: 'shortPoint',
    wrong: (_values, outputs) => offsetOf(outputs),
    sentence: 'That is only how far the points are apart.',
    wayBack: 'Take it off the long point.',
  },
  {
    id: 'half-the-offset',
    title: 'Half the slant',
    output: 'shortPoint',
    wrong: (values, outputs) => longOf(values) - offsetOf(outputs) / 2,
    sentence: 'That is the length along the middle of the board.',
    wayBack: 'From edge to edge the whole slant comes off.',
  },
]
