import type { Slip, Values } from './calculator'
import { findEnds, lengthAt, lengthsOf, topFall, type Counted } from './postsOnFallLengths'
import { numberOf } from './values'

const NO_ROOF: Counted = { surface: 1, roof: 0 }
const NO_FALL: Counted = { surface: 0, roof: 1 }
const UPHILL: Counted = { surface: -1, roof: 1 }
const ROOF_TURNED: Counted = { surface: 1, roof: -1 }

const hasRoof = (values: Values) => topFall(values) !== 0
const spread = (values: Values, counted: Counted) => {
  const lengths = lengthsOf(values, counted)
  return Math.max(...lengths) - Math.min(...lengths)
}

/** What goes wrong with the longest and with the shortest post alike. */
function postSlips(output: 'longest' | 'shortest'): Slip[] {
  const at = (values: Values, counted: Counted) =>
    lengthAt(values, findEnds(values)[output], counted)
  return [
    {
      id: `${output}-fall-forgotten`,
      title: 'The fall of the surface forgotten',
      output,
      wrong: (values) => at(values, NO_FALL),
      sentence: 'That stands on a level surface.',
      wayBack:
        'The surface sinks away from the high edge: add what it has sunk where the post stands.',
    },
    {
      id: `${output}-fall-taken-off`,
      title: 'The fall taken off',
      output,
      wrong: (values) => at(values, UPHILL),
      sentence: 'That shortens the post where the surface is lower.',
      wayBack: 'Lower ground needs a longer post: add the fall.',
    },
    {
      id: `${output}-whole-run`,
      title: 'The fall of the whole run',
      output,
      wrong: (values) => at(values, NO_FALL) + numberOf(values, 'run') * numberOf(values, 'fall'),
      sentence: 'That counts the fall of the whole run.',
      wayBack: 'Only the part up to the post counts: multiply its own distance by the fall.',
    },
    {
      id: `${output}-roof-forgotten`,
      title: 'The pitch of the top forgotten',
      output,
      wrong: (values) => (hasRoof(values) ? at(values, NO_ROOF) : undefined),
      sentence: 'That is under a level top.',
      wayBack: 'The top falls too: reckon with what it has fallen or risen above the post.',
    },
    {
      id: `${output}-roof-turned`,
      title: 'The top falls the other way',
      output,
      wrong: (values) => (hasRoof(values) ? at(values, ROOF_TURNED) : undefined),
      sentence: 'That lets the top fall the other way.',
      wayBack: 'Look which edge the top is lower at, and take off or add accordingly.',
    },
  ]
}

/** The known ways to get `posts-on-fall` wrong. */
export const postsOnFallSlips: Slip[] = [
  ...postSlips('longest'),
  ...postSlips('shortest'),
  {
    id: 'difference-whole-run',
    title: 'The fall of the whole run',
    output: 'difference',
    wrong: (values) => numberOf(values, 'run') * numberOf(values, 'fall'),
    sentence: 'That is the fall from edge to edge.',
    wayBack:
      'Only the part between the first post and the last counts, and the pitch of the top with it.',
  },
  {
    id: 'difference-roof-forgotten',
    title: 'The pitch of the top forgotten',
    output: 'difference',
    wrong: (values) => (hasRoof(values) ? spread(values, NO_ROOF) : undefined),
    sentence: 'That is under a level top.',
    wayBack: 'The pitch changes every post as well.',
  },
  {
    id: 'difference-fall-forgotten',
    title: 'The fall of the surface forgotten',
    output: 'difference',
    wrong: (values) => (hasRoof(values) ? spread(values, NO_FALL) : undefined),
    sentence: 'That stands on a level surface.',
    wayBack: 'The surface falls as well: count both.',
  },
]
