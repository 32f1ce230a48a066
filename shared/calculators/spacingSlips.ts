import type { Slip, Values } from './calculator'
import { numberOf } from './values'
import { roundUp } from '../units/number'

const given = (values: Values, name: string) => numberOf(values, name)
const countOf = (outputs: Values) => numberOf(outputs, 'count')
/** First to last, centre to centre. */
const lengthOf = (values: Values) => given(values, 'run') - given(values, 'memberWidth')

/** The known ways to get `spacing` wrong. */
export const spacingSlips: Slip[] = [
  {
    id: 'spaces-for-members',
    title: 'Counted the spaces',
    output: 'count',
    wrong: (_values, outputs) => countOf(outputs) - 1,
    sentence: 'That is the number of spaces.',
    wayBack: 'There is one more of them than spaces: one stands at each end.',
  },
  {
    id: 'whole-run',
    title: 'Whole run divided',
    output: 'count',
    wrong: (values) => roundUp(given(values, 'run') / given(values, 'maxCentres')) + 1,
    sentence: 'That divides the run from outside to outside.',
    wayBack: 'From the first centre to the last it is one width less: take it off first.',
  },
  {
    id: 'by-the-clear-space',
    title: 'Centres taken as clear space',
    output: 'count',
    wrong: (values) =>
      roundUp(lengthOf(values) / (given(values, 'maxCentres') + given(values, 'memberWidth'))) + 1,
    sentence: 'That leaves the centres as clear space between them.',
    wayBack: 'Centres are measured from middle to middle, or from edge to same edge.',
  },
  {
    id: 'widest-kept',
    title: 'Widest centres kept',
    output: 'centres',
    wrong: (values) => given(values, 'maxCentres'),
    sentence: 'That is the most it may be: the last space would come out shorter.',
    wayBack: 'Share the run evenly: divide by the number of spaces.',
  },
  {
    id: 'by-members',
    title: 'Divided by members',
    output: 'centres',
    wrong: (values, outputs) => lengthOf(values) / countOf(outputs),
    sentence: 'That divides by how many there are.',
    wayBack: 'There is one space fewer: divide by the spaces.',
  },
  {
    id: 'run-by-spaces',
    title: 'Width not taken off',
    output: 'centres',
    wrong: (values, outputs) => given(values, 'run') / (countOf(outputs) - 1),
    sentence: 'That leaves the width of one in the run.',
    wayBack: 'From the first centre to the last it is one width less.',
  },
  {
    id: 'centres-for-clear',
    title: 'Centres for clear space',
    output: 'clear',
    wrong: (_values, outputs) => numberOf(outputs, 'centres'),
    sentence: 'That is from centre to centre.',
    wayBack: 'Half a width stands in the space at each side: take one width off.',
  },
  {
    id: 'half-a-width',
    title: 'Half a width taken off',
    output: 'clear',
    wrong: (values, outputs) => numberOf(outputs, 'centres') - given(values, 'memberWidth') / 2,
    sentence: 'That takes half a width off.',
    wayBack: 'Half of one stands at each side of the space: together that is a whole width.',
  },
  {
    id: 'two-widths',
    title: 'Two widths taken off',
    output: 'clear',
    wrong: (values, outputs) => numberOf(outputs, 'centres') - 2 * given(values, 'memberWidth'),
    sentence: 'That takes both widths off whole.',
    wayBack: 'Only half of each stands in the space.',
  },
]
