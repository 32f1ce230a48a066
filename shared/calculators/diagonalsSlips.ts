import type { Slip, Values } from './calculator'
import { numberOf, wordOf } from './values'

const sidesOf = (values: Values) => [numberOf(values, 'length'), numberOf(values, 'width')] as const
const difference = (outputs: Values) => numberOf(outputs, 'difference')

/** Judged against the drawn size instead of against each other. */
function judgeAgainstExpected(values: Values, outputs: Values): string {
  const expected = numberOf(outputs, 'expected')
  const off = ['diagonal1', 'diagonal2'].map((name) => Math.abs(numberOf(values, name) - expected))
  return Math.max(...off) <= numberOf(values, 'tolerance') ? 'yes' : 'no'
}

/** The known ways to get `diagonals` wrong. */
export const diagonalsSlips: Slip[] = [
  {
    id: 'round-the-corner',
    title: 'Went round the corner',
    output: 'expected',
    wrong: (values) => sidesOf(values)[0] + sidesOf(values)[1],
    sentence: 'That is the way round the corner, one side after the other.',
    wayBack: 'The tape goes straight across: square both sides, add, take the square root.',
  },
  {
    id: 'no-root',
    title: 'Forgot the root',
    output: 'expected',
    wrong: (_values, outputs, system) =>
      numberOf(outputs, 'expected') ** 2 / (system === 'metric' ? 0.001 : 0.0254),
    sentence: 'That is the sum of the squares.',
    wayBack: 'One step is left: take the square root.',
  },
  {
    id: 'mean-taken',
    title: 'Mean of the two readings',
    output: 'expected',
    wrong: (values) => (numberOf(values, 'diagonal1') + numberOf(values, 'diagonal2')) / 2,
    sentence: 'That is the mean of what you measured.',
    wayBack: 'What it should read comes from the two sides alone.',
  },
  {
    id: 'half-difference',
    title: 'Half of it',
    output: 'difference',
    wrong: (_values, outputs) => difference(outputs) / 2,
    sentence: 'That is half of what they are apart.',
    wayBack: 'Take the shorter reading from the longer one, and leave it whole.',
  },
  {
    id: 'off-the-drawn-size',
    title: 'Measured against the drawn size',
    output: 'difference',
    wrong: (values, outputs) =>
      Math.abs(numberOf(values, 'diagonal1') - numberOf(outputs, 'expected')),
    sentence: 'That compares the first diagonal with the drawn size.',
    wayBack: 'Compare the two diagonals with each other.',
  },
  {
    id: 'moved-by-the-difference',
    title: 'Moved by the whole difference',
    output: 'moveBy',
    wrong: (_values, outputs) => difference(outputs),
    sentence: 'That moves it by the whole difference: it comes out of square the other way.',
    wayBack: 'One diagonal grows while the other shrinks: work out the slide from both squares.',
  },
  {
    id: 'two-for-four',
    title: 'Divided by 2 instead of 4',
    output: 'moveBy',
    wrong: (_values, outputs) => 2 * numberOf(outputs, 'moveBy'),
    sentence: 'That is twice the slide.',
    wayBack: 'Divide by four times the long side, not by two.',
  },
  {
    id: 'difference-over-side',
    title: 'Difference over the long side',
    output: 'cornerError',
    wrong: (values, outputs) => Math.atan(difference(outputs) / sidesOf(values)[0]),
    sentence: 'That sets the difference of the diagonals against one side.',
    wayBack: 'Set the slide against the short side: the corner turns about its end.',
  },
  {
    id: 'judged-by-the-drawn-size',
    title: 'Judged by the drawn size',
    output: 'square',
    wrong: judgeAgainstExpected,
    sentence: 'That compares the diagonals with the drawn size.',
    wayBack: 'Square means both read the same; how long they are is a matter of the sides.',
  },
  {
    id: 'limit-turned-round',
    title: 'Limit turned round',
    output: 'square',
    wrong: (_values, outputs) => (wordOf(outputs, 'square') === 'yes' ? 'no' : 'yes'),
    sentence: 'Look again at how far the diagonals are apart, and at the limit.',
    wayBack: 'Apart by no more than the limit is square; more is not.',
  },
]
