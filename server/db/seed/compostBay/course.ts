import { quiz, single, worked, square345, fixed, ranged } from '../exercises'
import { hazards, kit, toHand } from '../kit'
import type { CourseSeed, StageSeed } from '../shapes'

const ground: StageSeed = {
  key: 'ground',
  kind: 'ground',
  title: 'Ground',
  lessons: [
    {
      key: 'three-bays-on-paper',
      title: 'Three bays on paper, then on the ground',
      summary:
        'One to fill, one to turn, one to use. Set out square, because three boxes share their sides.',
      youWillWant: 'String, pegs, a tape.',
      hazards: [],
      kit: [],
      stops: [
        {
          key: 'first-corner',
          name: 'The first corner',
          at: { stop: 'three-four-five' },
          exercise: worked(
            'Three bays in a row. What must the tape read across the first corner?',
            4,
            square345({
              sideA: fixed('3300 mm'),
              sideB: fixed('1100 mm'),
              unit: ranged(0.25, 0.35, 0.05),
            }),
          ),
        },
        {
          key: 'how-far-from-the-wall',
          name: 'How far from the wall',
          at: { afterCue: 12 },
          exercise: null,
        },
      ],
    },
  ],
}

const frame: StageSeed = {
  key: 'frame',
  kind: 'frame',
  title: 'Frame',
  lessons: [
    {
      key: 'posts-and-slides',
      title: 'Posts and slides',
      summary: 'Posts with a groove, so that the front boards lift out one by one.',
      youWillWant: 'A helper for the long posts.',
      hazards: [hazards.sawing, hazards.services],
      withoutCaptions: true,
      kit: [],
      stops: [
        {
          key: 'why-boards-slide',
          name: 'Why boards slide',
          at: { afterCue: 9 },
          exercise: quiz('The front boards are not screwed.', 100, null, [
            {
              key: 'slide',
              kind: 'single',
              prompt: 'Why do they slide in a groove?',
              definition: {
                choices: [
                  {
                    id: 'a',
                    text: 'To take them out as the heap goes down',
                    right: false,
                    feedback: '',
                  },
                  {
                    id: 'b',
                    text: 'To save screws',
                    right: false,
                    feedback: 'Screws are the cheapest part of it.',
                  },
                ],
              },
            },
          ]),
        },
      ],
    },
  ],
}

const finish: StageSeed = {
  key: 'finish',
  kind: 'finish',
  title: 'Finish',
  lessons: [
    {
      key: 'lids-that-lift',
      title: 'Lids that lift',
      summary: 'Light enough for one hand, heavy enough for the wind.',
      youWillWant: '',
      hazards: [hazards.sawing],
      withoutVideo: true,
      kit: [
        kit.eyes,
        kit.sleeves,
        toHand(
          'stay',
          'generic',
          'A stay for the lid',
          'It holds the lid while your head is under it.',
        ),
        kit.blade,
      ],
      stops: [
        {
          key: 'hinge-side',
          name: 'Hinge side',
          at: { afterCue: 1 },
          exercise: quiz('The heap stands in front of a wall.', 100, 3, [
            single(
              'hinge',
              'Where do the hinges go?',
              ['On the wall side', 'Right. The lid leans on the wall while you fork.'],
              [['On the front', 'You would lift it against your own chest.']],
              0,
            ),
          ]),
        },
      ],
    },
  ],
}

/** On the bench with snags still to mend: a lesson without video, one without captions or kit check, a stop without exercise, a question without a right answer. */
export const compostBay: CourseSeed = {
  slug: 'a-compost-bay-in-three-boxes',
  sheetNumber: 4,
  owner: 'wilf',
  helpers: [],
  title: 'A compost bay in three boxes',
  outcome: 'Three boxes in a row whose front boards slide out one by one: fill, turn, use.',
  weekends: 2,
  tools: ['Hand saw', 'Drill and driver bits', 'Level', 'String line'],
  hazards: [hazards.sawing, hazards.services],
  coverDrawing: 'picket-fence',
  facts: [{ label: 'Each bay', value: '1000 × 1000 × 1000 mm (3′ 3⅜″)' }],
  notCovered: '',
  changeNote: '',
  createdOn: '2026-10-24T15:45:00Z',
  issuedOn: null,
  stages: [ground, frame, finish],
  hindsight: [],
  questions: [],
}
