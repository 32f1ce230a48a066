import { hazards } from '../kit'
import type { CourseSeed } from '../shapes'
import { questions } from './fence'
import { base, cladding, frame } from './stages'

export const deck: CourseSeed = {
  slug: 'a-deck-at-ground-level',
  sheetNumber: 2,
  owner: 'maren',
  helpers: ['petra'],
  title: 'A deck at ground level',
  outcome:
    'Nine square metres of boards a hand’s height off the grass, carried on twelve small pads: level enough for a table, open enough to dry, low enough that nobody falls far.',
  weekends: 3,
  tools: [
    'Spade',
    'Hand saw or circular saw',
    'Drill and driver bits',
    'Level, 1200 mm (4 ft)',
    'Carpenter’s square',
    'String lines',
    'Tape, 5 m (16 ft)',
    'Tamper',
  ],
  hazards: [
    hazards.services,
    hazards.cement,
    hazards.cementDust,
    hazards.sawing,
    hazards.longBoards,
  ],
  coverDrawing: 'deck',
  facts: [
    { label: 'Deck', value: '3600 × 2400 mm (11′ 9¾″ × 7′ 10½″)' },
    { label: 'Height over the grass', value: '233 mm (9 3⁄16″)' },
    { label: 'Pads', value: '12, each 300 mm square (12″)' },
    { label: 'Joists', value: '47 × 145 mm at 395 mm centres' },
    { label: 'Gap between boards', value: '6 mm (¼″)' },
  ],
  notCovered:
    'Decks fixed to a house, decks higher than 300 mm (12″), roof decks, hot tubs and anything else that weighs more than people and a table. Stairs and guards. Where frost goes deep or the ground stays wet, footings follow your local code. Ask the building department before you begin; some count a deck of this size as a building.',
  changeNote: 'First issue: pads, frame and boards in three lessons.',
  createdOn: '2026-04-20T07:10:00Z',
  issuedOn: '2026-06-30T06:30:00Z',
  stages: [base, frame, cladding],
  hindsight: [
    {
      lesson: 'boards-and-their-gaps',
      at: { afterCue: 9 },
      text: 'I began at the house side and ended with a strip two fingers wide at the edge everyone sees. Lay them all out loose first, and split the difference.',
      by: 'maren',
      on: '2026-08-30T06:12:00Z',
    },
  ],
  questions,
}
