import type { Slip, Values } from './calculator'
import { numberOf } from './values'

const given = (values: Values, name: string) => numberOf(values, name)
const risersOf = (outputs: Values) => numberOf(outputs, 'risers')
const riseOf = (outputs: Values) => numberOf(outputs, 'rise')
const TALLEST = 7.75 * 0.0254
const SHORTEST = 10 * 0.0254

/** The known ways to get `stairs` wrong. */
export const stairsSlips: Slip[] = [
  {
    id: 'treads-for-risers',
    title: 'Counted the treads',
    output: 'risers',
    wrong: (_values, outputs) => risersOf(outputs) - 1,
    sentence: 'That makes each step higher than you allowed.',
    wayBack: 'Round up, and count risers: the last one leads up to the top.',
  },
  {
    id: 'one-riser-more',
    title: 'One too many',
    output: 'risers',
    wrong: (_values, outputs) => risersOf(outputs) + 1,
    sentence: 'That is one riser more than it needs.',
    wayBack: 'Divide the height by the highest step, round up, and add none.',
  },
  {
    id: 'highest-kept',
    title: 'Highest step kept',
    output: 'rise',
    wrong: (values) => given(values, 'maxRise'),
    sentence: 'That is the highest it may be: the last step would come out lower.',
    wayBack: 'Divide the height by the number of risers, so that all are the same.',
  },
  {
    id: 'by-treads',
    title: 'Divided by treads',
    output: 'rise',
    wrong: (values, outputs) =>
      risersOf(outputs) > 1 ? given(values, 'totalRise') / (risersOf(outputs) - 1) : undefined,
    sentence: 'That divides by the treads.',
    wayBack: 'There is one riser more than treads: divide by the risers.',
  },
  {
    id: 'tread-for-each-riser',
    title: 'A tread for each riser',
    output: 'totalRun',
    wrong: (values, outputs) => risersOf(outputs) * given(values, 'tread'),
    sentence: 'That has one tread too many.',
    wayBack: 'The top itself is the last tread: count one fewer than risers.',
  },
  {
    id: 'along-the-slope',
    title: 'Along the slope',
    output: 'totalRun',
    wrong: (values, outputs) =>
      (risersOf(outputs) - 1) * Math.hypot(given(values, 'tread'), riseOf(outputs)),
    sentence: 'That runs along the slope.',
    wayBack: 'The run is level: treads only.',
  },
  {
    id: 'one-rise',
    title: 'One rise and a tread',
    output: 'comfort',
    wrong: (values, outputs) => riseOf(outputs) + given(values, 'tread'),
    sentence: 'That counts the rise once.',
    wayBack: 'Climbing costs more than walking: the rise counts twice.',
  },
  {
    id: 'two-treads',
    title: 'Two treads and a rise',
    output: 'comfort',
    wrong: (values, outputs) => riseOf(outputs) + 2 * given(values, 'tread'),
    sentence: 'That counts the tread twice.',
    wayBack: 'The rise counts twice, the tread once.',
  },
  {
    id: 'rise-only',
    title: 'Only the rise looked at',
    output: 'withinLimits',
    wrong: (_values, outputs) => (riseOf(outputs) <= TALLEST ? 'yes' : 'no'),
    sentence: 'That looks at the rise alone.',
    wayBack: 'The tread has a limit as well: both must hold.',
  },
  {
    id: 'tread-only',
    title: 'Only the tread looked at',
    output: 'withinLimits',
    wrong: (values) => (given(values, 'tread') >= SHORTEST ? 'yes' : 'no'),
    sentence: 'That looks at the tread alone.',
    wayBack: 'The rise has a limit as well: both must hold.',
  },
]
