import type { Slip, Values } from './calculator'
import { numberOf, wordOf } from './values'

const given = (values: Values, name: string) => numberOf(values, name)
const isTwice = (values: Values) => wordOf(values, 'gapAtStop') === 'yes'

/** What goes wrong with the width at one end. */
const widthSlips = (output: 'cutStart' | 'cutEnd', opening: string): Slip[] => {
  const isStart = output === 'cutStart'
  const end = isStart ? 'start' : 'end'
  return [
    {
      id: `gap-forgotten-${end}`,
      title: 'Gap forgotten',
      output,
      wrong: (values) => given(values, opening),
      sentence: 'That is the whole opening: the board would touch the one before.',
      wayBack: 'Take the gap off first.',
    },
    {
      id: `gap-once-${end}`,
      title: 'Gap taken off once for two edges',
      output,
      wrong: (values) =>
        isTwice(values) ? given(values, opening) - given(values, 'gap') : undefined,
      sentence: 'That takes the gap off once, and there are two edges with a gap.',
      wayBack: 'One gap lies beside the board before, one at the stop: take off both.',
    },
    {
      id: `gap-twice-${end}`,
      title: 'Gap taken off twice for one edge',
      output,
      wrong: (values) =>
        isTwice(values) ? undefined : given(values, opening) - 2 * given(values, 'gap'),
      sentence: 'That takes the gap off twice, and the board lies against the stop.',
      wayBack: 'Only the edge beside the board before has a gap: take it off once.',
    },
    {
      id: `gap-added-${end}`,
      title: 'Gap added',
      output,
      wrong: (values) => given(values, opening) + given(values, 'gap'),
      sentence: 'That makes the board wider than its opening.',
      wayBack: 'The gap is room that stays empty: take it off.',
    },
    {
      id: `other-end-${end}`,
      title: 'Ends mixed up',
      output,
      wrong: (_values, outputs) => numberOf(outputs, isStart ? 'cutEnd' : 'cutStart'),
      sentence: 'That is the width for the other end.',
      wayBack: 'Write start and end on the board before you carry it to the saw.',
    },
    {
      id: `mean-width-${end}`,
      title: 'Both ends the same',
      output,
      wrong: (_values, outputs) =>
        (numberOf(outputs, 'cutStart') + numberOf(outputs, 'cutEnd')) / 2,
      sentence: 'That is the mean of both ends: it is right in the middle of the board only.',
      wayBack: 'Each end has a width of its own; the line between the two marks is the cut.',
    },
    {
      id: `waste-for-width-${end}`,
      title: 'Marked what comes off',
      output,
      wrong: (values, outputs) => given(values, 'boardWidth') - numberOf(outputs, output),
      sentence: 'That is the strip that comes off.',
      wayBack: 'The board keeps what the opening leaves after the gap.',
    },
  ]
}

/** The known ways to get `taper` wrong. */
export const taperSlips: Slip[] = [
  ...widthSlips('cutStart', 'openingStart'),
  ...widthSlips('cutEnd', 'openingEnd'),
  {
    id: 'waste-without-gap',
    title: 'Opening taken off the board',
    output: 'wasteStart',
    wrong: (values) => given(values, 'boardWidth') - given(values, 'openingStart'),
    sentence: 'That leaves no gap.',
    wayBack: 'First the width that stays, opening less the gap; the rest of the board comes off.',
  },
  {
    id: 'waste-at-the-end',
    title: 'Waste of the other end',
    output: 'wasteStart',
    wrong: (values, outputs) => given(values, 'boardWidth') - numberOf(outputs, 'cutEnd'),
    sentence: 'That comes off at the far end.',
    wayBack: 'Take the width at the start off the board.',
  },
  {
    id: 'width-for-waste',
    title: 'Width for waste',
    output: 'wasteStart',
    wrong: (_values, outputs) => numberOf(outputs, 'cutStart'),
    sentence: 'That is what stays of the board.',
    wayBack: 'Take it off the width of the board: the rest is what comes off.',
  },
  {
    id: 'one-end-over-length',
    title: 'One end over the length',
    output: 'angle',
    wrong: (values, outputs) => Math.atan(numberOf(outputs, 'cutStart') / given(values, 'length')),
    sentence: 'That sets one whole end against the length.',
    wayBack: 'Only the difference between the two ends is the slant.',
  },
  {
    id: 'ratio-for-angle',
    title: 'Ratio for degrees',
    output: 'angle',
    wrong: (_values, outputs) => (Math.tan(numberOf(outputs, 'angle')) * Math.PI) / 180,
    sentence: 'That is the plain ratio of difference to length.',
    wayBack: 'Take the arctangent of it, with the calculator set to degrees.',
  },
  {
    id: 'fits-by-the-narrow-end',
    title: 'Judged by the narrow end',
    output: 'fits',
    wrong: (values, outputs) => {
      const narrow = Math.min(numberOf(outputs, 'cutStart'), numberOf(outputs, 'cutEnd'))
      return narrow <= given(values, 'boardWidth') ? 'yes' : 'no'
    },
    sentence: 'That looks at the narrow end.',
    wayBack: 'The board must be wide enough for the wider end.',
  },
  {
    id: 'fits-by-the-opening',
    title: 'Judged by the opening',
    output: 'fits',
    wrong: (values) => {
      const wide = Math.max(given(values, 'openingStart'), given(values, 'openingEnd'))
      return wide <= given(values, 'boardWidth') ? 'yes' : 'no'
    },
    sentence: 'That sets the whole opening against the board.',
    wayBack: 'The gap stays empty: take it off before you compare.',
  },
]
