import type { Slip, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, wordOf } from './values'
import { roundUp } from '../units/number'

/** What a board has lost between its name and its measure: half an inch, or 5 mm planed off. An assumption. */
const LOST: Record<UnitSystem, number> = { metric: 0.005, imperial: 0.0127 }

const given = (values: Values, name: string) => numberOf(values, name)
const isFixed = (values: Values) => wordOf(values, 'mode') === 'fixed-gap'
const stepOf = (values: Values) => given(values, 'boardWidth') + given(values, 'gap')
const countOf = (outputs: Values) => numberOf(outputs, 'count')
/** What whole boards leave of the opening. */
const restOf = (values: Values, outputs: Values) =>
  given(values, 'opening') - countOf(outputs) * given(values, 'boardWidth')
/** How many gaps there are. */
const gapsOf = (values: Values, outputs: Values) =>
  countOf(outputs) + (wordOf(values, 'ends') === 'gap' ? 1 : -1)

const countSlips: Slip[] = [
  {
    id: 'gap-forgotten',
    title: 'Gap forgotten',
    output: 'count',
    wrong: (values) => roundUp(given(values, 'opening') / given(values, 'boardWidth')),
    sentence: 'That lays the boards tight.',
    wayBack: 'Each board takes its own width and a gap: divide by both together.',
  },
  {
    id: 'rounded-down',
    title: 'Rounded down',
    output: 'count',
    wrong: (values, outputs) => (isFixed(values) ? countOf(outputs) - 1 : undefined),
    sentence: 'That leaves the last opening without a board.',
    wayBack: 'A part of a board is cut from a whole one: it counts.',
  },
  {
    id: 'nominal-for-actual',
    title: 'Name for measure',
    output: 'count',
    wrong: (values, _outputs, system) =>
      roundUp(given(values, 'opening') / (stepOf(values) + LOST[system])),
    sentence: 'That takes the width the board is sold by.',
    wayBack: 'Measure a real board: planing and drying took some of it.',
  },
]

const gapSlips: Slip[] = [
  {
    id: 'gaps-as-many-as-boards',
    title: 'As many gaps as boards',
    output: 'gap',
    wrong: (values, outputs) =>
      isFixed(values) ? undefined : restOf(values, outputs) / countOf(outputs),
    sentence: 'That counts as many gaps as boards.',
    wayBack: 'Boards at both ends leave one gap fewer than boards; gaps at both ends, one more.',
  },
  {
    id: 'other-ends',
    title: 'Other kind of ends',
    output: 'gap',
    wrong: (values, outputs) => {
      const gaps = 2 * countOf(outputs) - gapsOf(values, outputs)
      return isFixed(values) || gaps < 1 ? undefined : restOf(values, outputs) / gaps
    },
    sentence: 'That counts the ends the other way: board for gap, or gap for board.',
    wayBack: 'Look at what lies against the stops, then count the gaps again.',
  },
  {
    id: 'wanted-gap',
    title: 'Wanted gap kept',
    output: 'gap',
    wrong: (values) => (isFixed(values) ? undefined : given(values, 'gap')),
    sentence: 'That is the gap you wanted.',
    wayBack: 'Whole boards seldom leave just that: share what is left among the gaps.',
  },
]

const ripSlips: Slip[] = [
  {
    id: 'gaps-left-out',
    title: 'Gaps left out',
    output: 'lastRip',
    wrong: (values, outputs) => {
      const rest = restOf(values, outputs) + given(values, 'boardWidth')
      return isFixed(values) && rest > 0 ? rest : undefined
    },
    sentence: 'That leaves the gaps out.',
    wayBack: 'Take off a board and a gap for each board before the last.',
  },
  {
    id: 'gap-at-the-stop',
    title: 'One gap too many',
    output: 'lastRip',
    wrong: (values, outputs) =>
      isFixed(values) ? numberOf(outputs, 'lastRip') - given(values, 'gap') : undefined,
    sentence: 'That leaves a gap at the stop as well.',
    wayBack: 'There is one gap fewer than boards: between them only.',
  },
  {
    id: 'waste-for-rip',
    title: 'What comes off',
    output: 'lastRip',
    wrong: (values, outputs) => given(values, 'boardWidth') - numberOf(outputs, 'lastRip'),
    sentence: 'That is the strip that comes off.',
    wayBack: 'The last board keeps what is left of the opening.',
  },
]

/** The known ways to get `boards` wrong. */
export const boardsSlips: Slip[] = [...countSlips, ...gapSlips, ...ripSlips]
