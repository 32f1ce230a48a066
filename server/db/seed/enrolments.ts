import { deck } from './deck/course'
import { logStore } from './logStore/course'
import { picketFence } from './picketFence/course'
import type { EnrolmentSeed, WatchedLessonSeed } from './shapes'

/** A lesson watched to its end with every stop answered right at once. */
const done = (lesson: string, on: string): WatchedLessonSeed => ({
  lesson,
  on,
  watched: 'whole',
  stops: 'all',
})

/** Who builds what, and how far they are. */
export const enrolments: EnrolmentSeed[] = [
  {
    learner: 'ines',
    course: logStore.slug,
    buildName: 'Log store, south wall',
    on: '2026-10-18T20:40:00Z',
    lessons: [],
  },
  {
    learner: 'jo',
    course: logStore.slug,
    buildName: 'Log store by the back fence',
    on: '2026-09-12T18:31:00Z',
    lessons: [
      done('reading-your-ground', '2026-09-13T09:20:00Z'),
      {
        lesson: 'setting-out-the-corner',
        on: '2026-09-19T16:58:00Z',
        watched: [
          [0, 31_395],
          [12_000, 24_500],
        ],
        stops: [
          {
            stop: 'tape-across',
            wrong: [{ slip: 'round-the-corner' }, '1300 mm'],
            solved: false,
          },
        ],
      },
    ],
  },
  {
    learner: 'callum',
    course: logStore.slug,
    buildName: 'Woodshed behind the garage',
    on: '2026-06-03T14:22:00Z',
    lessons: [
      done('reading-your-ground', '2026-06-06T16:10:00Z'),
      done('setting-out-the-corner', '2026-06-10T20:45:00Z'),
      done('stone-and-form-boards', '2026-06-13T22:05:00Z'),
      {
        lesson: 'squaring-the-form',
        on: '2026-06-21T12:40:00Z',
        watched: 'whole',
        stops: [
          { stop: 'three-four-five', wrong: ['4.92'], solved: true },
          { stop: 'both-diagonals', solved: true },
          { stop: 'which-end', wrong: [{ slip: 'moved-by-the-difference' }], solved: true },
        ],
        inFieldBook: true,
      },
      {
        lesson: 'mixing-and-pouring',
        on: '2026-06-28T13:20:00Z',
        watched: 'whole',
        stops: [
          { stop: 'bags', wrong: [{ slip: 'bags-without-waste' }], solved: true },
          {
            stop: 'the-mix',
            wrong: [{ furrow: { choice: 'd' } }, { furrow: { choice: 'b' } }],
            solved: true,
          },
          { stop: 'stiff-right-wet', solved: true },
        ],
        inFieldBook: true,
      },
      {
        lesson: 'posts-and-their-feet',
        on: '2026-11-14T18:12:00Z',
        watched: [[0, 38_000]],
        stops: [{ stop: 'edge-distance', solved: true }],
      },
    ],
  },
  {
    learner: 'anke',
    course: logStore.slug,
    buildName: 'Log store between the hedges',
    on: '2026-05-14T17:05:00Z',
    lessons: [
      done('reading-your-ground', '2026-05-14T18:00:00Z'),
      done('setting-out-the-corner', '2026-05-15T17:30:00Z'),
      done('stone-and-form-boards', '2026-05-16T09:15:00Z'),
      { ...done('squaring-the-form', '2026-05-17T16:20:00Z'), inFieldBook: true },
      {
        lesson: 'mixing-and-pouring',
        on: '2026-05-29T06:50:00Z',
        watched: 'whole',
        stops: [
          { stop: 'bags', wrong: [{ slip: 'bags-rounded-down' }], solved: true },
          { stop: 'the-mix', solved: true },
          { stop: 'stiff-right-wet', solved: true },
          { stop: 'order-of-the-pour', solved: true },
        ],
        inFieldBook: true,
      },
      done('posts-and-their-feet', '2026-06-09T17:10:00Z'),
      { ...done('rails-and-rafters', '2026-06-14T09:40:00Z'), inFieldBook: true },
      done('slats-with-even-gaps', '2026-06-21T11:50:00Z'),
      { ...done('the-roof-and-its-pitch', '2026-06-28T10:05:00Z'), inFieldBook: true },
      done('cut-ends-and-first-stack', '2026-07-04T14:30:00Z'),
    ],
  },
  {
    learner: 'anke',
    course: picketFence.slug,
    buildName: 'Fence to the lane',
    on: '2026-07-20T17:12:00Z',
    lessons: [
      done('posts-that-stay-put', '2026-07-24T18:25:00Z'),
      done('rails-and-even-pickets', '2026-08-09T11:20:00Z'),
      done('a-gate-that-still-shuts', '2026-08-23T15:45:00Z'),
    ],
  },
  {
    learner: 'tomas',
    course: deck.slug,
    buildName: 'Deck under the walnut',
    on: '2026-07-10T21:20:00Z',
    lessons: [
      done('twelve-pads-in-line', '2026-07-12T09:30:00Z'),
      { ...done('a-frame-that-stays-square', '2026-08-22T16:15:00Z'), inFieldBook: true },
      {
        lesson: 'boards-and-their-gaps',
        on: '2026-09-13T10:02:00Z',
        watched: [
          [0, 25_000],
          [23_000, 41_000],
        ],
        stops: [
          {
            stop: 'how-many-boards',
            wrong: [{ boards: { value: '20', units: 'metric' } }],
            solved: false,
          },
        ],
      },
    ],
  },
  {
    learner: 'tomas',
    course: logStore.slug,
    buildName: 'A small store for the stove',
    on: '2026-07-18T20:50:00Z',
    lessons: [
      {
        lesson: 'squaring-the-form',
        on: '2026-07-19T17:04:00Z',
        watched: [[0, 31_395]],
        stops: [],
      },
    ],
  },
  {
    learner: 'meilin',
    course: picketFence.slug,
    buildName: 'The gate first',
    on: '2026-06-28T15:55:00Z',
    lessons: [
      {
        lesson: 'posts-that-stay-put',
        on: '2026-06-29T22:16:00Z',
        watched: [[0, 30_000]],
        stops: [{ stop: 'water-for-a-bag', solved: true }],
      },
      { ...done('a-gate-that-still-shuts', '2026-10-04T19:50:00Z'), inFieldBook: true },
    ],
  },
  {
    learner: 'meilin',
    course: logStore.slug,
    buildName: 'Log store, next year',
    on: '2026-06-30T22:20:00Z',
    lessons: [
      done('reading-your-ground', '2026-07-01T15:58:00Z'),
      {
        lesson: 'setting-out-the-corner',
        on: '2026-07-02T15:35:00Z',
        watched: [[0, 52_000]],
        stops: [{ stop: 'tape-across', wrong: [`5' 6"`], solved: true }],
      },
    ],
  },
  {
    learner: 'bram',
    course: logStore.slug,
    buildName: 'Log store on bearers',
    on: '2026-06-12T19:00:00Z',
    lessons: [
      done('reading-your-ground', '2026-06-14T19:05:00Z'),
      done('the-roof-and-its-pitch', '2026-07-12T19:20:00Z'),
    ],
  },
  {
    learner: 'bram',
    course: deck.slug,
    buildName: 'Deck by the ditch',
    on: '2026-07-28T18:10:00Z',
    lessons: [
      done('twelve-pads-in-line', '2026-08-01T17:40:00Z'),
      { ...done('a-frame-that-stays-square', '2026-08-16T15:40:00Z'), inFieldBook: true },
      done('boards-and-their-gaps', '2026-09-05T13:25:00Z'),
    ],
  },
  {
    learner: 'bram',
    course: picketFence.slug,
    buildName: 'Fence along the dyke',
    on: '2026-07-22T20:05:00Z',
    lessons: [done('posts-that-stay-put', '2026-07-26T10:30:00Z')],
  },
  {
    learner: 'noor',
    course: logStore.slug,
    buildName: 'Store for the cabin',
    on: '2026-08-20T05:40:00Z',
    lessons: [
      done('reading-your-ground', '2026-08-20T06:15:00Z'),
      done('setting-out-the-corner', '2026-08-21T06:05:00Z'),
      done('stone-and-form-boards', '2026-08-22T15:00:00Z'),
      {
        lesson: 'squaring-the-form',
        on: '2026-08-29T08:30:00Z',
        watched: [
          [0, 60_146],
          [40_000, 58_000],
        ],
        stops: [
          { stop: 'three-four-five', solved: true },
          {
            stop: 'both-diagonals',
            wrong: [{ slip: 'round-the-corner' }, `9' 6"`, '12353.5', `9' 1"`, `9' 2"`],
            solved: false,
          },
        ],
      },
    ],
  },
  {
    learner: 'noor',
    course: deck.slug,
    buildName: 'Deck at the cabin',
    on: '2026-10-03T07:10:00Z',
    lessons: [
      {
        lesson: 'twelve-pads-in-line',
        on: '2026-10-03T07:40:00Z',
        watched: [[0, 22_000]],
        stops: [],
      },
    ],
  },
]
