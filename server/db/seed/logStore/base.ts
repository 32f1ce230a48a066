import {
  bothDiagonals,
  drawn,
  exactly,
  fixed,
  inOrder,
  length,
  own,
  quiz,
  ranged,
  several,
  single,
  square345,
  within,
  worked,
} from '../exercises'
import { caution, hazards, kit, toHand } from '../kit'
import type { StageSeed } from '../shapes'

export const base: StageSeed = {
  key: 'base',
  kind: 'base',
  title: 'Base',
  lessons: [
    {
      key: 'stone-and-form-boards',
      title: 'Stone and form boards',
      summary:
        'Dig level, lay crushed stone in two layers, tamp each until it rings, and peg the form boards on the outside. The fall to the front is made here and not with the float.',
      youWillWant: 'A tamper, borrowed or hired, and a dry day.',
      hazards: [hazards.services, hazards.sawing, hazards.stoneDust],
      kit: [
        kit.eyes,
        kit.boots,
        kit.mask,
        kit.workGloves,
        toHand('tamper', 'tamper', 'Tamper', 'A hand tamper does a pad of this size in an hour.'),
        kit.level,
        kit.services,
        kit.blade,
        caution(
          'open-dig',
          'Fence off what you leave open.',
          'A board and a rope round the dig overnight: children and hedgehogs do not read signs.',
        ),
      ],
      stops: [
        {
          key: 'dig-depth',
          name: 'How deep to dig',
          at: { afterCue: 5 },
          exercise: quiz(
            'Tamped stone 100 mm, concrete 100 mm, top of the pad 20 mm above the grass.',
            100,
            4,
            [
              length(
                'depth',
                'How deep do you dig below the grass?',
                '180 mm',
                0.005,
                'Stone and concrete make 200 mm. What stands above the grass need not be dug for.',
              ),
            ],
          ),
        },
        {
          key: 'tamping',
          name: 'Two layers',
          at: { afterCue: 11 },
          exercise: quiz('The stone is in the barrow.', 100, 3, [
            single(
              'layers',
              'How does 100 mm of stone go in?',
              [
                'Two layers, each tamped until the tamper rings',
                'Right. A hand tamper reaches about 50 mm (2 in) down.',
              ],
              [
                [
                  'All at once, tamped on top',
                  'The top is hard and the bottom is loose. It settles under the pad.',
                ],
                [
                  'All at once, hosed in',
                  'Water carries the fines away and leaves the stone as loose as before.',
                ],
                [
                  'Loose, so that it drains',
                  'It drains tamped too. Loose stone moves, and the pad moves with it.',
                ],
              ],
              2,
            ),
          ]),
        },
      ],
    },
    {
      key: 'squaring-the-form',
      title: 'Squaring the form',
      summary:
        'A square form saves trouble all the way up to the roof. One corner by 3-4-5 from the inside faces, then both diagonals, then the pegs.',
      youWillWant: 'A second pair of hands, a long tape, a nail for the inside corner.',
      hazards: [hazards.services],
      isSample: true,
      kit: [
        kit.eyes,
        kit.boots,
        toHand(
          'tape',
          'tape',
          'Tape of 5 m (16 ft) and a pencil',
          'One tape for everything: two tapes differ.',
        ),
        toHand(
          'hammer',
          'hammer',
          'Hammer and pegs',
          'Pegs half driven until both diagonals agree.',
        ),
        kit.services,
      ],
      stops: [
        {
          key: 'three-four-five',
          name: '3-4-5',
          at: { stop: 'three-four-five' },
          exercise: worked(
            'Set a 3-4-5 triangle off one corner of your own form. What must the tape read between the two marks?',
            5,
            square345({ sideA: own('2600 mm'), sideB: own('1100 mm'), unit: own('300 mm') }),
          ),
        },
        {
          key: 'both-diagonals',
          name: 'Both diagonals',
          at: { stop: 'both-diagonals' },
          exercise: worked(
            'The corner is square. Measured inside corner to inside corner, what must both diagonals of your form read?',
            5,
            bothDiagonals({
              length: own('2600 mm'),
              width: own('1100 mm'),
              diagonal1: own('2826 mm'),
              diagonal2: own('2821 mm'),
            }),
          ),
        },
        {
          key: 'which-end',
          name: 'Which end moves',
          at: { afterCue: 16 },
          byTheWay: true,
          exercise: worked(
            'A form of 2600 by 1100 mm; one diagonal reads longer than the other. By how much does the long board slide along itself?',
            4,
            {
              calculator: 'diagonals',
              inputs: {
                length: fixed('2600 mm'),
                width: fixed('1100 mm'),
                diagonal1: ranged(2.828, 2.84, 0.002),
                diagonal2: ranged(2.81, 2.82, 0.002),
              },
              asked: 'moveBy',
              tolerance: within(0.001),
              hints: [
                'Sliding the board shortens one diagonal and lengthens the other: do not move it by the whole difference.',
                'Take the squares of the two diagonals off each other, then divide by four times the length.',
              ],
              slips: ['moved-by-the-difference', 'two-for-four'],
            },
          ),
        },
      ],
    },
    {
      key: 'mixing-and-pouring',
      title: 'Mixing and pouring',
      summary:
        'How many bags, how much water, and how to tell by a furrow when to stop adding it. Then the pour itself: from the far corner, tread the edges, strike off, wait, float.',
      youWillWant: 'A second pair of hands, four dry hours, no frost tonight.',
      hazards: [hazards.cement, hazards.bags, hazards.cementDust],
      kit: [
        kit.longGloves,
        kit.eyes,
        kit.mask,
        kit.wetBoots,
        kit.rinse,
        kit.barrow,
        toHand(
          'float',
          'board-float',
          'Straight board and float',
          'A board longer than the pad is deep.',
        ),
        kit.level,
        kit.burns,
        kit.bags,
        kit.dust,
      ],
      stops: [
        {
          key: 'bags',
          name: 'How many bags',
          at: { stop: 'bags' },
          exercise: worked(
            'Your own pad, and ten per cent for what the ground, the barrow and the form keep. How many bags do you buy?',
            4,
            {
              calculator: 'slab',
              inputs: {
                length: own('2600 mm'),
                width: own('1100 mm'),
                thickness: own('100 mm'),
                bag: own('25 kg'),
                waste: fixed('10 %'),
              },
              asked: 'bags',
              tolerance: exactly,
              hints: [
                'Length × width × thickness, all in metres, is the concrete. Then the waste.',
                'Divide by what one bag makes. Your bag says it; half a bag is not for sale.',
              ],
              slips: ['bags-rounded-down', 'bags-without-waste', 'bags-by-weight'],
            },
          ),
        },
        {
          key: 'stiff-right-wet',
          name: 'Stiff, right or wet',
          at: { afterCue: 10 },
          byTheWay: true,
          exercise: worked(
            'The bag of 25 kg asks for 2.5 to 3 litres. Someone poured this much into one of them. What is the mix now?',
            2,
            {
              calculator: 'mix',
              inputs: {
                bag: fixed('25 kg'),
                waterAdded: ranged(0.0021, 0.0036, 0.0003),
                bagWaterMin: fixed('2.5 L'),
                bagWaterMax: fixed('3 L'),
              },
              asked: 'verdict',
              tolerance: exactly,
              hints: ['Less than the least, more than the most, or between the two?'],
              slips: [],
            },
          ),
        },
        {
          key: 'the-mix',
          name: 'The mix',
          at: { stop: 'the-mix' },
          exercise: quiz('A trowel is pulled through once.', 100, null, [
            drawn(
              single(
                'furrow',
                'Which of the four goes into the form, with a fall of 10 mm per metre (1/8 in per foot) to keep?',
                [
                  'It stands, the top closes',
                  'Right. The furrow stands, so the fall stays; the top closes, so the float can finish it.',
                ],
                [
                  [
                    'The furrow falls in',
                    'Too dry. Water has not reached all of it; it leaves hollows along the form. Add a cupful, turn it twice.',
                  ],
                  [
                    'It stands, the top stays rough',
                    'Nearly. The float tears it instead of closing it. A cupful more, and no more than the bag allows.',
                  ],
                  [
                    'It closes, water shows',
                    'Too wet. It runs down the fall and dries weak. Add dry mix, never sand alone.',
                  ],
                ],
                2,
              ),
              ['furrow-falls-in', 'furrow-rough-top', 'furrow-closed-top', 'furrow-water-shows'],
            ),
          ]),
        },
        {
          key: 'order-of-the-pour',
          name: 'Order of the pour',
          at: { afterCue: 16 },
          byTheWay: true,
          exercise: quiz(
            'The form is square, the stone is damp, the first barrow stands ready.',
            100,
            null,
            [
              inOrder('pour', 'Put the pour in order.', [
                [
                  'Wet the stone',
                  'Dry stone drinks from the mix; it is wetted before anything goes in.',
                ],
                [
                  'Tip from the far corner, working back',
                  'You cannot walk over what is poured, so the way out stays open.',
                ],
                [
                  'Tread the edges and corners down',
                  'Corners are filled while the mix is loose, before the board goes over it.',
                ],
                [
                  'Strike off with the board, along the fall',
                  'The board needs full corners and comes before any smoothing.',
                ],
                [
                  'Wait until the shine is gone, then float',
                  'Floating with water on top makes a skin that dusts off next year.',
                ],
                [
                  'Cover it and keep it damp',
                  'Curing is the last step and takes the longest: a week, not a night.',
                ],
              ]),
              several(
                'tired',
                'Half the bags are in and your helper has to leave. What is sound?',
                [
                  [
                    true,
                    'Strike off what is in, end it against a board, cover it',
                    'Right. A clean, upright edge is a joint you can go on from.',
                  ],
                  [
                    true,
                    'Carry half bags for the rest',
                    'Right. The mix does not care; your back does.',
                  ],
                  [
                    false,
                    'Mix faster and wetter, so that it flows by itself',
                    'Water above what the bag allows takes strength for good.',
                  ],
                  [
                    false,
                    'Leave a slope of loose concrete to pour against tomorrow',
                    'A feathered edge breaks off. End it against a board.',
                  ],
                ],
              ),
            ],
          ),
        },
      ],
    },
  ],
}
