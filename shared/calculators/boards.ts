import type { Calculator, Values } from './calculator'
import { boardsInputs, boardsOutputs } from './boardsFields'
import { layBoards } from './boardsLaying'
import { boardsSlips } from './boardsSlips'
import { boardsSteps } from './boardsSteps'
import { numberOf, wordOf } from './values'

const compute = (values: Values): Values => ({
  ...layBoards({
    opening: numberOf(values, 'opening'),
    boardWidth: numberOf(values, 'boardWidth'),
    gap: numberOf(values, 'gap'),
    isEven: wordOf(values, 'mode') === 'even-gap',
    endGaps: wordOf(values, 'ends') === 'gap' ? 2 : 0,
  }),
})

/**
 * Boards in an opening, metres. Fixed gap: count = opening ÷ (board + gap), up; last rip = opening − (count − 1) × (board + gap),
 * at most a board. Even gap: whole boards, gap = (opening − count × board) ÷ (count − 1), the count whose gap is nearest to the
 * wanted one. With a gap at both ends there is one gap more than boards. Common practice.
 * 2400 mm, boards of 145, gap 5: 16 boards, none ripped.
 */
export const boards: Calculator = {
  id: 'boards',
  version: 1,
  title: 'Boards: how many, and the last one',
  question: 'How many boards, and how wide is the gap or the last rip?',
  help: 'Work the boards out before the first screw. Keep the gap and the last board is ripped, or keep every board whole and share the rest among the gaps. Copy the marks to a stick and mark both sides of the frame from it: then errors do not add up.',
  inputs: boardsInputs,
  outputs: boardsOutputs,
  compute,
  steps: boardsSteps,
  slips: boardsSlips,
  cautions: [
    {
      title: 'Gaps that someone can fall or get stuck in',
      text: 'Where boards are a guard, or children use what you build, the local code says how wide a gap may be. Measure the finished gap, not the wanted one.',
    },
    {
      title: 'Wood moves',
      text: 'Wet boards shrink and gaps open; dry boards laid tight swell and push. Follow the supplier’s gap for your boards as they are now.',
    },
    {
      title: 'Ripping the last board',
      text: 'Clamp it, guide the saw along a straight edge, wear eye and ear protection and a dust mask. A strip under about a third of a board splits: share it among the last boards, or rip the first one too.',
    },
  ],
  sources: [
    { title: 'Opening divided by board and gap', kind: 'common practice, no source' },
    { title: 'Story stick: marks copied, not added up', kind: 'common practice, no source' },
  ],
  example: {
    inputs: {
      opening: '800 mm',
      boardWidth: '95 mm',
      gap: '60 mm',
      mode: 'even-gap',
    },
    outputs: {
      count: 6,
      gap: 0.046,
      lastRip: 0.095,
      marks: [0, 0.141, 0.282, 0.423, 0.564, 0.705],
    },
  },
}
