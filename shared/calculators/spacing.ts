import type { Calculator, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { spacingInputs, spacingOutputs } from './spacingFields'
import { spacingSlips } from './spacingSlips'
import { spacingSteps } from './spacingSteps'
import { numberOf } from './values'
import { clean, roundUp } from '../units/number'

/** More members than one run of a garden has. */
const MOST_MEMBERS = 200

function checkSpacing(run: number, most: number, width: number): void {
  if (run < 2 * width) {
    throw new CalculatorInputError(
      'run',
      'Two of them side by side are wider than the run. Measure it from outside to outside of the end ones.',
    )
  }
  if (most <= width) {
    throw new CalculatorInputError(
      'maxCentres',
      'The centres are no wider than what stands on them, so nothing is left between. Give wider centres.',
    )
  }
  if ((run - width) / most > MOST_MEMBERS) {
    throw new CalculatorInputError(
      'run',
      `That is more than ${String(MOST_MEMBERS)} of them. Work it out in two runs.`,
    )
  }
}

function compute(values: Values): Values {
  const run = numberOf(values, 'run')
  const width = numberOf(values, 'memberWidth')
  const most = numberOf(values, 'maxCentres')
  checkSpacing(run, most, width)
  const spaces = Math.max(1, roundUp((run - width) / most))
  const centres = (run - width) / spaces
  return {
    count: spaces + 1,
    centres,
    clear: clean(centres - width),
    marks: Array.from({ length: spaces + 1 }, (_, index) => clean(index * centres)),
  }
}

/**
 * Members at equal centres, metres: spaces = (run − member) ÷ widest centres, up; centres = (run − member) ÷ spaces;
 * clear = centres − member; marks are the near edges from the outside of the first. The run goes from outside to outside.
 * 3600 mm, joists of 45 at most 400 apart: 10 joists at 395 mm, 350 clear. Common practice.
 */
export const spacing: Calculator = {
  id: 'spacing',
  version: 1,
  title: 'Equal spacing',
  question: 'Where does each post, joist or picket stand?',
  help: 'Posts and joists must not stand further apart than the boards on them can bear, and they look right only when all spaces are the same. Divide the run evenly, mark from one end with one tape, and never measure from member to member.',
  inputs: spacingInputs,
  outputs: spacingOutputs,
  compute,
  steps: spacingSteps,
  slips: spacingSlips,
  cautions: [
    {
      title: 'How far apart they may be',
      text: 'Span tables, the board’s maker and your local code set the widest centres. For decks, guards and anything people stand on, ask the building department and, where it is required, a licensed engineer.',
    },
    {
      title: 'Gaps in guards and fences',
      text: 'Where children can climb or put their head through, the local code says how wide the clear space may be.',
    },
    {
      title: 'Before you dig for posts',
      text: 'Have buried cables and pipes located, and wait for the answer.',
    },
  ],
  sources: [
    { title: 'Run less one member, shared evenly', kind: 'common practice, no source' },
    {
      title: 'Near edges marked, an X on the side of the member',
      kind: 'common practice, no source',
    },
  ],
  example: {
    inputs: { run: '3600 mm', maxCentres: '400 mm', memberWidth: '45 mm' },
    outputs: {
      count: 10,
      centres: 0.395,
      clear: 0.35,
      marks: [0, 0.395, 0.79, 1.185, 1.58, 1.975, 2.37, 2.765, 3.16, 3.555],
    },
  },
}
