import { hazards } from '../kit'
import type { CourseSeed } from '../shapes'
import { questions } from './fence'
import { gateWeight } from './gateWeight'
import { base, cladding, finish } from './stages'

export const picketFence: CourseSeed = {
  slug: 'a-picket-fence-with-a-gate',
  sheetNumber: 3,
  owner: 'wilf',
  helpers: ['petra'],
  title: 'A picket fence with a gate',
  outcome:
    'Two bays and a gate that still shuts in five years: deep posts, a brace that pushes the right way, and pickets clear of the ground.',
  weekends: 2,
  tools: [
    'Post-hole spade',
    'Hand saw',
    'Drill and driver bits',
    'Level, 1200 mm (4 ft)',
    'String line',
    'Tape, 5 m (16 ft)',
    'Carpenter’s square',
  ],
  hazards: [
    hazards.services,
    hazards.openHoles,
    hazards.cement,
    hazards.cementDust,
    hazards.sawing,
    hazards.gate,
  ],
  coverDrawing: 'picket-fence',
  facts: [
    { label: 'Height of the pickets', value: '1020 mm (3′ 4″)' },
    { label: 'Bays', value: '2, posts at 1800 mm (5′ 11″) centres' },
    { label: 'Gate opening, post to post', value: '1000 mm (3′ 3⅜″)' },
    { label: 'Posts in the ground', value: '600 mm (2′)' },
    { label: 'Pickets clear of the ground', value: '60 mm (2⅜″)' },
  ],
  notCovered:
    'Fences on a boundary that is not agreed, fences over 1.2 m (4 ft), pool fences, retaining anything, gates for cars. Height limits and permits follow your local code; pool fences have a code of their own almost everywhere. Where frost goes deeper than 600 mm (2 ft) the holes do too.',
  changeNote: 'First issue: posts, pickets and a gate in three lessons.',
  createdOn: '2026-04-02T15:20:00Z',
  issuedOn: '2026-05-21T15:05:00Z',
  stages: [base, cladding, finish],
  hindsight: [
    {
      lesson: 'a-gate-that-still-shuts',
      at: { afterCue: 11 },
      text: 'I set the latch with the gate dry in July. In November it would not meet. Leave the latch side the thickness of a picket nail more than looks right.',
      by: 'wilf',
      on: '2026-11-07T16:40:00Z',
    },
  ],
  ownCalculators: { 'gate-on-its-hinges': gateWeight },
  questions,
}
