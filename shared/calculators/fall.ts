import type { Calculator, QuantityInput, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { fallCautions, fallSources } from './fallSources'
import { fallSlips } from './fallSlips'
import { fallSteps } from './fallSteps'
import { leastFall, ratioSaid, SAID } from './fallSaid'
import { numberOf, wordOf } from './values'

/** Steeper than this is a ramp or a bank, not a surface that sheds water. */
const STEEPEST = 0.1
const empty = { metric: '', imperial: '' }

/** The one way in which the fall was said. */
function findSaid(values: Values, system: UnitSystem): (typeof SAID)[number] {
  const [name, second] = SAID.filter((one) => values[one] !== undefined)
  if (name === undefined) {
    throw new CalculatorInputError(
      system === 'metric' ? 'perMetre' : 'perFoot',
      'Say the fall in one way: for each metre, for each foot, in per cent, as a ratio or as an angle.',
    )
  }
  if (second !== undefined) {
    throw new CalculatorInputError(
      second,
      'The fall is said in two ways. Keep one and empty the other.',
    )
  }
  return name
}

function compute(values: Values, system: UnitSystem): Values {
  const said = findSaid(values, system)
  const ratio = ratioSaid(said, numberOf(values, said))
  const isEnough = ratio >= leastFall(wordOf(values, 'besideBuilding')) - 1e-9
  return {
    drop: numberOf(values, 'run') * ratio,
    percent: ratio * 100,
    angle: Math.atan(ratio),
    enoughToDrain: isEnough ? 'yes' : 'no',
  }
}

/** One way to say the fall; all of them share the same steepest. */
const way = (input: Pick<QuantityInput, 'name' | 'label' | 'quantity' | 'max'>) => ({
  help: 'Say it in one way only.',
  optional: true,
  initial: empty,
  min: 0,
  ...input,
})
const inBoth = (unit: string) => ({ unit: { metric: unit, imperial: unit } })

/**
 * Drop over a run: drop = run × fall, the run level and the fall as drop over run; per cent = fall × 100, angle = arctan(fall).
 * Enough to drain from 1 % in the open and from 2 % beside a building. 1100 mm at 20 mm per m: 22 mm, 2 %, 1.15°.
 */
export const fall: Calculator = {
  id: 'fall',
  version: 1,
  title: 'Fall: so that water runs away',
  question: 'How much lower must the far edge be?',
  help: 'Flat is never flat: water finds the low spot, stays there, freezes and rots what stands in it. A small, steady fall away from the house carries it off, and nobody sees it. Set it on the form before you pour; afterwards it cannot be mended.',
  inputs: [
    {
      name: 'run',
      label: 'Run',
      quantity: 'length',
      help: 'Level, from the high edge to the low one, the way the water goes.',
      initial: { metric: '1100', imperial: `3' 6"` },
      min: 0.1,
      max: 30,
    },
    {
      ...way({ name: 'perMetre', label: 'Fall for each metre', quantity: 'ratio', max: STEEPEST }),
      ...inBoth('mm/m'),
      initial: { metric: '20', imperial: '' },
    },
    {
      ...way({ name: 'perFoot', label: 'Fall for each foot', quantity: 'ratio', max: STEEPEST }),
      ...inBoth('in/ft'),
      initial: { metric: '', imperial: '1/4' },
    },
    way({ name: 'percent', label: 'Per cent', quantity: 'percent', max: STEEPEST * 100 }),
    {
      ...way({ name: 'ratio', label: 'Ratio, drop to run', quantity: 'ratio', max: STEEPEST }),
      ...inBoth('1:n'),
      help: '1:50, or 1 in 50. Say it in one way only.',
    },
    way({ name: 'angle', label: 'Angle', quantity: 'angle', max: Math.atan(STEEPEST) }),
    {
      name: 'besideBuilding',
      label: 'Within 3 m (10 ft) of a building',
      quantity: 'choice',
      help: 'There the ground must shed water faster.',
      initial: { metric: 'no', imperial: 'no' },
      choices: [
        { value: 'no', label: 'no, in the open' },
        { value: 'yes', label: 'yes' },
      ],
    },
  ],
  outputs: [
    { name: 'drop', label: 'Far edge lower by', quantity: 'length' },
    {
      name: 'enoughToDrain',
      label: 'Enough to drain',
      quantity: 'choice',
      choices: [
        { value: 'yes', label: 'Yes, water runs off' },
        { value: 'no', label: 'No, too flat' },
      ],
    },
    { name: 'percent', label: 'Per cent', quantity: 'percent' },
    { name: 'angle', label: 'Angle', quantity: 'angle' },
  ],
  compute,
  steps: fallSteps,
  slips: fallSlips,
  cautions: fallCautions,
  sources: fallSources,
  example: {
    inputs: { run: '1100 mm', perMetre: '20 mm/m' },
    outputs: { drop: 0.022, percent: 2, angle: 0.0199973, enoughToDrain: 'yes' },
  },
}
