import type { QuestionSeed } from '../shapes'

export const questions: QuestionSeed[] = [
  {
    lesson: 'posts-that-stay-put',
    at: { afterCue: 4 },
    by: 'meilin',
    on: '2026-06-29T22:14:00Z',
    title: 'Our frost line is 42 inches. Does a 2 foot hole still do?',
    markdown: 'The sheet says 2 ft in the ground. The neighbor says everyone here goes to 4.',
    answers: [
      {
        by: 'wilf',
        on: '2026-06-30T13:20:00Z',
        markdown:
          'Your neighbor is right and the sheet says so under “not covered”. A footing that ends above the frost line gets jacked up a little each winter. Ask your building department for the depth they want for a fence, and go there.\n\nWiden the hole at the bottom, not at the top: a mushroom of concrete at the surface is a handle for the frost.',
      },
    ],
    settled: { answer: 0, by: 'meilin', on: '2026-06-30T22:05:00Z' },
  },
  {
    lesson: 'posts-that-stay-put',
    at: { afterCue: 7 },
    by: 'bram',
    on: '2026-07-25T13:35:00Z',
    title: 'Water comes into the hole faster than I can bail. Pour anyway?',
    markdown: 'It is up to a third of the hole by the time I have the bag open.',
    answers: [
      {
        by: 'anke',
        on: '2026-07-25T15:10:00Z',
        markdown: 'I waited for a dry fortnight. It was quicker than what I tried first.',
      },
      {
        by: 'wilf',
        on: '2026-07-25T16:02:00Z',
        markdown:
          'Not into standing water: it takes the cement out of the mix. Wait for a dry spell, dig and pour one hole at a time, bail just before the concrete goes in, and put it in stiff from the bottom up.\n\nIf it never dries out, ask locally what is done: a driven post or a longer one, set in tamped stone, often beats concrete in ground like yours. And mind the sides, wet holes cave.',
      },
    ],
    settled: { answer: 1, by: 'bram', on: '2026-07-26T09:12:00Z' },
  },
  {
    lesson: 'rails-and-even-pickets',
    at: { afterCue: 10 },
    by: 'anke',
    on: '2026-08-09T10:28:00Z',
    title: 'The ground drops 150 mm over one bay. Step the rails or follow the slope?',
    markdown: '',
    answers: [
      {
        by: 'petra',
        on: '2026-08-09T11:41:00Z',
        markdown:
          'Either looks right if you stay with it. On a steady slope I let the rails follow the ground and keep every picket plumb: set each by the level, not square to the rail. The gate stays level, so let its bay be the flat one.\n\nStepping leaves a triangle under each bay, which matters if you have a dog.',
      },
    ],
  },
  {
    lesson: 'a-gate-that-still-shuts',
    at: { afterCue: 15 },
    by: 'meilin',
    on: '2026-09-27T21:50:00Z',
    title: 'Existing gate sags an inch at the latch. New brace or new gate?',
    markdown: 'It has one brace, and it runs down from the top hinge. The hinge post is solid.',
    answers: [
      {
        by: 'bram',
        on: '2026-09-28T06:32:00Z',
        markdown: 'Check the post with a level first. Mine was the post, not the gate.',
      },
      {
        by: 'wilf',
        on: '2026-09-28T14:15:00Z',
        markdown:
          'If the rails are sound, a new brace. Take the gate off with someone holding it, lay it flat, push it square until both diagonals agree, and fit the brace the other way: **from the bottom hinge up to the latch side**, its ends cut tight against the rails.\n\nRot in the bottom rail, and you are building a gate.',
      },
      {
        by: 'meilin',
        on: '2026-10-04T20:11:00Z',
        markdown: 'Turned the brace around. It shuts with one finger, and the dog is furious.',
      },
    ],
    settled: { answer: 1, by: 'meilin', on: '2026-10-04T20:12:00Z' },
  },
]
