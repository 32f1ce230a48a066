import type { Slip, Values } from './calculator'
import { numberOf, wordOf } from './values'

const sidesOf = (values: Values) =>
  [numberOf(values, 'legA'), numberOf(values, 'legB'), numberOf(values, 'diagonal')] as const
const errorOf = (outputs: Values) => numberOf(outputs, 'error')
/** What the tape would read across a square corner. */
const squareDiagonal = (values: Values) => Math.hypot(sidesOf(values)[0], sidesOf(values)[1])

/** The angle where 2 was left out under the line; undefined where that is no cosine. */
function withoutTwo(values: Values): number | undefined {
  const [a, b, d] = sidesOf(values)
  const cosine = (a ** 2 + b ** 2 - d ** 2) / (a * b)
  return Math.abs(cosine) <= 1 ? Math.acos(cosine) : undefined
}

/** The known ways to get `corner` wrong. */
export const cornerSlips: Slip[] = [
  {
    id: 'sign-lost',
    title: 'Minus lost',
    output: 'angle',
    wrong: (_values, outputs) => Math.PI - numberOf(outputs, 'angle'),
    sentence: 'That takes the legs from the diagonal instead of the diagonal from the legs.',
    wayBack:
      'Add the squares of both legs first, take the square of the diagonal off, keep the sign.',
  },
  {
    id: 'two-left-out',
    title: 'Forgot the 2',
    output: 'angle',
    wrong: (values) => withoutTwo(values),
    sentence: 'That divides by the legs once.',
    wayBack: 'Divide by two times leg A times leg B.',
  },
  {
    id: 'angle-at-the-mark',
    title: 'Angle at the mark',
    output: 'angle',
    wrong: (values) => Math.atan2(sidesOf(values)[1], sidesOf(values)[0]),
    sentence: 'That is the angle at the end of leg A, between leg and tape.',
    wayBack: 'The corner lies where the two legs meet, across from the diagonal.',
  },
  {
    id: 'whole-angle',
    title: 'Gave the whole corner',
    output: 'error',
    wrong: (_values, outputs) => numberOf(outputs, 'angle'),
    sentence: 'That is the whole corner.',
    wayBack: 'Take 90° off: only what is left over is out of square.',
  },
  {
    id: 'wide-for-narrow',
    title: 'Wide taken for narrow',
    output: 'error',
    wrong: (_values, outputs) => -errorOf(outputs),
    sentence: 'That has the right size and the wrong sign.',
    wayBack: 'A long diagonal means a wide corner, which is plus; a short one means minus.',
  },
  {
    id: 'radians',
    title: 'Left in radians',
    output: 'error',
    wrong: (_values, outputs) => (errorOf(outputs) * Math.PI) / 180,
    sentence: 'That is what the calculator shows when it is set to radians.',
    wayBack: 'Set it to degrees, or multiply by 180 and divide by π.',
  },
  {
    id: 'diagonal-difference',
    title: 'Moved by what the tape is off',
    output: 'offsetAtLegB',
    wrong: (values) => Math.abs(sidesOf(values)[2] - squareDiagonal(values)),
    sentence: 'That is how far the tape is off its square reading, which is less than the swing.',
    wayBack: 'The tape runs at a slant, so the end must go further than it reads: leg B × sine.',
  },
  {
    id: 'half-the-difference',
    title: 'Half of what the tape is off',
    output: 'offsetAtLegB',
    wrong: (values) => Math.abs(sidesOf(values)[2] - squareDiagonal(values)) / 2,
    sentence: 'Halving is for two diagonals of a whole rectangle.',
    wayBack: 'Here one leg stays and the other swings alone: leg B × sine of what it is out.',
  },
  {
    id: 'wrong-leg',
    title: 'Swing of the other leg',
    output: 'offsetAtLegB',
    wrong: (values, outputs) => sidesOf(values)[0] * Math.abs(Math.sin(errorOf(outputs))),
    sentence: 'That is how far the end of leg A would swing.',
    wayBack: 'Leg B is the one that moves: multiply its length by the sine.',
  },
  {
    id: 'degrees-as-length',
    title: 'Degrees times length',
    output: 'offsetAtLegB',
    wrong: (values, outputs) => sidesOf(values)[1] * Math.abs((errorOf(outputs) * 180) / Math.PI),
    sentence: 'That multiplies by the degrees themselves.',
    wayBack: 'Take the sine of the degrees first.',
  },
  {
    id: 'turned-round',
    title: 'Wrong way',
    output: 'move',
    wrong: (_values, outputs) => ({ in: 'out', out: 'in' })[wordOf(outputs, 'move')] ?? undefined,
    sentence: 'That would make it worse.',
    wayBack:
      'A diagonal that is too long gets shorter when the end comes in, and the other way round.',
  },
  {
    id: 'judged-by-the-tape',
    title: 'Judged by the tape',
    output: 'square',
    wrong: (values) => {
      const off = Math.abs(sidesOf(values)[2] - squareDiagonal(values))
      return off <= numberOf(values, 'tolerance') ? 'yes' : 'no'
    },
    sentence: 'That sets the limit against what the tape is off.',
    wayBack: 'The limit is for the end of leg B, which is always further off than the tape.',
  },
]
