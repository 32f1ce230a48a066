import type { Step } from '../../kit/lesson'

export const steps: Step[] = [
  {
    id: 'caution',
    title: 'Before you start',
    before: 2.4,
    after: 0.2,
    lines: [
      {
        id: 'prop',
        say: 'First: prop a lid before you reach under it.',
        cap: 'First: prop a lid\nbefore you reach under it.',
      },
      {
        id: 'loads',
        say: 'Snow and wind on a roof follow your local code.',
        cap: 'Snow and wind on a roof\nfollow your local code.',
      },
    ],
  },
  {
    id: 'pitch',
    title: 'Rise over run',
    before: 0.4,
    lines: [
      {
        id: 'run',
        say: 'The run is measured level, not along the slope.',
        cap: 'The run is measured level,\nnot along the slope.',
      },
      {
        id: 'rise',
        say: 'Over a run of twelve hundred, this lid rises one hundred and five.',
        cap: 'Over a run of 1200,\nthis lid rises 105.',
      },
      {
        id: 'ask-pitch',
        say: 'What pitch is that?',
        cap: 'What pitch is that?',
        stop: { key: 'pitch', name: 'Pitch' },
      },
    ],
  },
  {
    id: 'ways',
    title: 'One slope, four ways to say it',
    after: 0.6,
    lines: [
      {
        id: 'degrees',
        say: 'Rise over run gives about five degrees.',
        cap: 'Rise over run gives about 5 degrees.',
      },
      {
        id: 'percent',
        say: 'The same slope is eight and three quarter percent.',
        cap: 'The same slope is 8.75 %.',
      },
      {
        id: 'ratio',
        say: 'It is also one in eleven point four.',
        cap: 'It is also 1 in 11.4.',
      },
      {
        id: 'twelve',
        say: 'And a little over one inch in twelve.',
        cap: 'And a little over 1 inch in 12.',
      },
    ],
  },
  {
    id: 'laps',
    title: 'Laps face down the slope',
    before: 0.4,
    after: 1.6,
    lines: [
      {
        id: 'low',
        say: 'Start at the low edge, and lay each sheet over the one below.',
        cap: 'Start at the low edge, and lay\neach sheet over the one below.',
        after: 0.8,
      },
      {
        id: 'down',
        say: 'Laps face down the slope, so that water runs over them, not in.',
        cap: 'Laps face down the slope,\nso that water runs over them, not in.',
        after: 0.8,
      },
      {
        id: 'least',
        say: 'Five degrees is low: check the least pitch your roofing allows.',
        cap: 'Five degrees is low: check the least\npitch your roofing allows.',
      },
    ],
  },
]
