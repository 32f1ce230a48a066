import type { QuestionSeed } from '../shapes'

export const questions: QuestionSeed[] = [
  {
    lesson: 'twelve-pads-in-line',
    at: { afterCue: 3 },
    by: 'tomas',
    on: '2026-07-11T16:30:00Z',
    title: 'Could I set the deck on concrete blocks straight on the grass?',
    markdown: 'A neighbour did, and it has stood for a summer.',
    answers: [
      {
        by: 'petra',
        on: '2026-07-11T17:45:00Z',
        markdown:
          'For a summer, yes. Grass rots, the block sinks on the soft side, and frost lifts the rest. At the least: turf off, tamped stone, block on that, and packers you can get at to level it again.\n\nWhether blocks are allowed at all, and how deep a footing has to go against frost, is for your local code. Ask before you carry twelve of anything.',
      },
    ],
    settled: { answer: 0, by: 'tomas', on: '2026-07-12T09:10:00Z' },
  },
  {
    lesson: 'twelve-pads-in-line',
    at: { afterCue: 8 },
    by: 'bram',
    on: '2026-08-02T08:25:00Z',
    title: 'One pad came out 8 mm low. Patch it or pack it?',
    markdown: 'Eleven are level within 2 mm. The one in the far corner is not.',
    answers: [
      {
        by: 'maren',
        on: '2026-08-02T09:02:00Z',
        markdown:
          'Pack it. A thin skin of mortar on an old pad cracks off in its first winter. Use packers that do not rot and do not squash, as wide as the bearer, so that the load goes straight down.',
      },
      {
        by: 'tomas',
        on: '2026-08-02T12:16:00Z',
        markdown: 'I have three different packs under mine. Nobody has noticed but me.',
      },
    ],
    settled: { answer: 0, by: 'bram', on: '2026-08-02T18:40:00Z' },
  },
  {
    lesson: 'a-frame-that-stays-square',
    at: { stop: 'both-diagonals' },
    by: 'bram',
    on: '2026-08-16T14:50:00Z',
    title: 'Diagonals 6 mm apart on 4.3 m. Do I loosen everything again?',
    markdown: 'The frame is screwed at the corners, the inner joists are not.',
    answers: [
      {
        by: 'petra',
        on: '2026-08-16T15:22:00Z',
        markdown:
          'No. Push in the two corners of the longer diagonal, about 3 mm off its reading is all you want, and fix one board or a batten across while it is held. The inner joists go in after that and keep it there.\n\nSix millimetres would not make it fall down, but it would leave you a wedge at the last board.',
      },
    ],
    settled: { answer: 0, by: 'petra', on: '2026-08-17T06:20:00Z' },
  },
  {
    lesson: 'boards-and-their-gaps',
    at: { afterCue: 6 },
    by: 'tomas',
    on: '2026-09-13T10:05:00Z',
    title: 'Ribbed side up or smooth side up?',
    markdown:
      'The yard says ribbed, for grip. My aunt says ribbed is a skating rink with moss in it.',
    answers: [
      {
        by: 'bram',
        on: '2026-09-13T11:30:00Z',
        markdown: 'Smooth here. The ribs held water and leaves all winter at my brother’s.',
      },
      {
        by: 'petra',
        on: '2026-09-13T16:12:00Z',
        markdown:
          'Your aunt has swept one. Ribs along the board hold water unless they fall with the slope. Smooth side up, kept clean, gaps open. Where it has to grip, at a step or in shade, use strips made for it.',
      },
    ],
  },
  {
    lesson: 'boards-and-their-gaps',
    at: null,
    by: 'noor',
    on: '2026-10-04T06:44:00Z',
    title: 'Is 233 mm over the grass low enough to go without a rail?',
    markdown: 'There will be a toddler on it.',
    answers: [
      {
        by: 'maren',
        on: '2026-10-04T07:31:00Z',
        markdown:
          'At which height a guard is asked for, and how it has to be made, is for your local code, and it also counts what lies beside the deck: a drop to a path or a pond is measured from there. Ask the building department with your height in hand.\n\nThis sheet has no rail because it was drawn for level grass on all sides. A rail on this frame is not drawn here; it needs posts made for it.',
      },
    ],
    settled: { answer: 0, by: 'noor', on: '2026-10-05T05:20:00Z' },
  },
]
