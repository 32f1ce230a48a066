import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { rafterInputs, rafterOutputs } from './rafterFields'
import { rafterSlips } from './rafterSlips'
import { rafterSteps } from './rafterSteps'
import { numberOf, optionalNumber } from './values'

/** The most of a rafter's depth that a notch may take. */
const MOST_NOTCHED = 1 / 3

/** Refuses a ridge that takes all of the run, and a notch that goes through the rafter. */
function checkRafter(run: number, ridge: number, notch: number, depth: number): void {
  if (ridge / 2 >= run) {
    throw new CalculatorInputError(
      'ridge',
      'Half the ridge board is longer than the run. Measure the run to the middle of the ridge.',
    )
  }
  if (notch >= depth) {
    throw new CalculatorInputError(
      'seat',
      'A seat as long as that cuts the rafter through. Shorten the seat, or take a deeper rafter.',
    )
  }
}

function compute(values: Values): Values {
  const run = numberOf(values, 'run')
  const ratio = numberOf(values, 'pitch') / 12
  const ridge = numberOf(values, 'ridge')
  const depth = numberOf(values, 'depth')
  const seat = numberOf(values, 'seat')
  const angle = Math.atan(ratio)
  const slope = Math.hypot(1, ratio)
  const birdsmouthDepth = seat * Math.sin(angle)
  checkRafter(run, ridge, birdsmouthDepth, depth)
  const overhang = optionalNumber(values, 'overhang') ?? 0
  return {
    rise: run * ratio,
    lineLength: run * slope,
    totalLength: (run - ridge / 2 + overhang) * slope,
    plumbCut: angle,
    levelCut: Math.PI / 2 - angle,
    heelCut: seat * ratio,
    birdsmouthDepth,
    notchFits: birdsmouthDepth <= depth * MOST_NOTCHED + 1e-9 ? 'yes' : 'no',
  }
}

/**
 * A common rafter: line length = run × √(1 + ratio²), total = (run − ridge ÷ 2 + overhang) × √(1 + ratio²), rise = run × ratio,
 * plumb cut = arctan(ratio) off a square cut, heel = seat × ratio, notch = seat × sin(plumb cut), at most a third of the depth.
 * Metres and radians. Run 8 ft at 7 in 12: line length 111.14 in (NAVEDTRA 14044 prints 111 1/8 in).
 */
export const rafter: Calculator = {
  id: 'rafter',
  version: 1,
  title: 'Rafter: length and cuts',
  question: 'How long is a rafter, and where are its cuts?',
  help: 'A rafter is longer than the run it covers, and the tail is longer than the overhang. Both follow from the pitch. Cut one, try it at both ends of the roof, and use it as the pattern for all others.',
  inputs: rafterInputs,
  outputs: rafterOutputs,
  compute,
  steps: rafterSteps,
  slips: rafterSlips,
  cautions: [
    {
      title: 'What the roof must carry',
      text: 'Size, spacing and fixing of rafters follow snow, wind and your local code, not this sheet. Ask the building department and, where it is required, a licensed engineer.',
    },
    {
      title: 'A notch weakens',
      text: 'No deeper than a third of the rafter, less where the code says so, and never overcut past its corner.',
    },
    {
      title: 'Buy longer, work safely',
      text: 'The slanting ends need more board than the length along the slope. Clamp it for every cut; eye and ear protection; lift and fix rafters with two people, from a tied ladder or a platform.',
    },
  ],
  sources: [
    {
      title: 'NAVEDTRA 14044, Builder 3 & 2, Vol. 2',
      detail: 'line length, ridge allowance, step-off',
      kind: 'published',
    },
    { title: 'US Army subcourse EN0069, Carpentry', detail: 'rafter length', kind: 'published' },
    { title: 'Griffith, Ira S., Carpentry (1916)', detail: 'rafter length', kind: 'published' },
    { title: 'Notch at most a third of the depth', kind: 'common practice, no source' },
  ],
  example: {
    inputs: {
      run: '1500 mm',
      pitch: '4/12',
      overhang: '200 mm',
      ridge: '30 mm',
      depth: '140 mm',
      seat: '75 mm',
    },
    outputs: {
      rise: 0.5,
      lineLength: 1.58114,
      totalLength: 1.77615,
      plumbCut: 0.321751,
      levelCut: 1.24905,
      heelCut: 0.025,
      birdsmouthDepth: 0.0237171,
      notchFits: 'yes',
    },
  },
}
