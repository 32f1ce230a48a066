import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { lengthsOf } from './postsOnFallLengths'
import { postsOnFallSlips } from './postsOnFallSlips'
import { postsOnFallCautions, postsOnFallSources } from './postsOnFallSources'
import { postsOnFallSteps } from './postsOnFallSteps'
import { listOf, numberOf } from './values'
import { formatQuantity } from '../units/format'

/** A post that is shorter or longer than this is a mistake in the numbers. */
const SHORTEST = 0.05
const LONGEST = 6

function compute(values: Values, system: UnitSystem): Values {
  const show = (metres: number) => formatQuantity(metres, 'length', system)
  const run = numberOf(values, 'run')
  const positions = listOf(values, 'positions')
  const beyond = positions.find((at) => at > run + 1e-9)
  if (beyond !== undefined) {
    throw new CalculatorInputError(
      'positions',
      `A post at ${show(beyond)} stands past the end of the run, ${show(run)}. Measure every post from the high edge.`,
    )
  }
  const lengths = lengthsOf(values)
  const longest = Math.max(...lengths)
  const shortest = Math.min(...lengths)
  if (shortest < SHORTEST - 1e-9) {
    throw new CalculatorInputError(
      'roofPitch',
      `The top comes down to the surface: one post would be ${show(shortest)} long. Raise the top or take less pitch.`,
    )
  }
  if (longest > LONGEST + 1e-9) {
    throw new CalculatorInputError(
      'roofPitch',
      `One post would be ${show(longest)} long: too tall for a garden build. Take less pitch or a lower top.`,
    )
  }
  return { lengths, longest, shortest, difference: longest - shortest }
}

/**
 * Posts on a surface that falls, under a straight top: length = top over the high edge + position × fall ∓ position × tan(pitch),
 * position from the high edge in m; minus where the roof falls the way the water runs, plus where it rises.
 * Run 1100 mm, 10 mm per m, top 1480, posts at 50, 550 and 1050 under a level top: 1480.5, 1485.5 and 1490.5 mm.
 */
export const postsOnFall: Calculator = {
  id: 'posts-on-fall',
  version: 1,
  title: 'Posts on a fall: cut to a straight top',
  question: 'How long is each post, under a straight top?',
  help: 'Cut all posts alike on a pad that falls, and the top falls with it: doors swing open and the roof is out of line. Work out every post from the high edge, cut, stand them up and check the top with a straight board and a level before you fix anything.',
  inputs: [
    {
      name: 'run',
      label: 'Run of the surface',
      quantity: 'length',
      help: 'From the high edge to the low one, level.',
      initial: { metric: '1100', imperial: `3' 6"` },
      min: 0.2,
      max: 30,
    },
    {
      name: 'fall',
      label: 'Fall of the surface',
      quantity: 'ratio',
      unit: { metric: 'mm/m', imperial: 'in/ft' },
      initial: { metric: '10', imperial: '1/8' },
      min: 0,
      max: 0.1,
    },
    {
      name: 'positions',
      label: 'Posts, from the high edge',
      quantity: 'length',
      help: 'To the middle of each, with semicolons between.',
      isList: true,
      initial: { metric: '50; 550; 1050', imperial: '2; 21; 40' },
      min: 0,
      max: 30,
    },
    {
      name: 'topHeight',
      label: 'Top over the high edge',
      quantity: 'length',
      help: 'From the surface to the underside of the beam.',
      initial: { metric: '1480', imperial: `4' 10"` },
      min: 0.2,
      max: 5,
    },
    {
      name: 'roofPitch',
      label: 'Pitch of the top',
      quantity: 'angle',
      help: 'Nothing for a level top.',
      assumed: true,
      initial: { metric: '0', imperial: '0' },
      min: 0,
      max: Math.PI / 4,
    },
    {
      name: 'roofFalls',
      label: 'The top falls',
      quantity: 'choice',
      initial: { metric: 'with', imperial: 'with' },
      choices: [
        { value: 'with', label: 'the way the water runs' },
        { value: 'against', label: 'the other way' },
      ],
    },
  ],
  outputs: [
    { name: 'lengths', label: 'Posts, in order', quantity: 'length', isList: true },
    { name: 'longest', label: 'Longest post', quantity: 'length' },
    { name: 'shortest', label: 'Shortest post', quantity: 'length' },
    { name: 'difference', label: 'They differ by', quantity: 'length' },
  ],
  compute,
  steps: postsOnFallSteps,
  slips: postsOnFallSlips,
  cautions: postsOnFallCautions,
  sources: postsOnFallSources,
  example: {
    inputs: {
      run: '1100 mm',
      fall: '20 mm/m',
      positions: '50 mm; 550 mm; 1050 mm',
      topHeight: '1480 mm',
      roofPitch: '5 deg',
    },
    outputs: {
      lengths: [1.47663, 1.44288, 1.40914],
      longest: 1.47663,
      shortest: 1.40914,
      difference: 0.0674887,
    },
  },
}
