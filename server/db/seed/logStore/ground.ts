import { inOrder, quiz, ranged, several, single, square345, worked } from '../exercises'
import { caution, hazards, kit, toHand } from '../kit'
import type { StageSeed } from '../shapes'

export const ground: StageSeed = {
  key: 'ground',
  kind: 'ground',
  title: 'Ground',
  lessons: [
    {
      key: 'reading-your-ground',
      title: 'Reading your ground',
      summary:
        'Where the store may stand, which way water already runs, and what one small trial hole tells you about the soil. You leave with a place chosen, not a hole dug.',
      youWillWant: 'An hour after rain, a spade, four pegs, and the answer about buried services.',
      hazards: [hazards.services],
      isSample: true,
      kit: [
        kit.boots,
        kit.workGloves,
        toHand(
          'spade',
          'spade',
          'Spade and a bucket',
          'For one trial hole, a spade deep and wide.',
        ),
        toHand(
          'pegs',
          'string',
          'Four pegs and a string',
          'To see the size before you believe it.',
        ),
        kit.services,
        caution(
          'local-rules',
          'Ask before you dig.',
          'Distance to the boundary, permits and frost depth follow your local code. The building department answers by phone in most places.',
        ),
      ],
      stops: [
        {
          key: 'before-the-spade',
          name: 'Before the spade',
          at: { afterCue: 3 },
          exercise: quiz('You have found a level corner by the fence.', 100, null, [
            several('know-first', 'What do you need to know before the first spadeful?', [
              [
                true,
                'Where cables and pipes run',
                'Right. The locating service or the owners mark them; a detector from a shop is no answer.',
              ],
              [
                true,
                'How far from the boundary the local code wants it',
                'Right. A pad in the wrong place is the most expensive pad there is.',
              ],
              [
                true,
                'Where the water goes when it rains',
                'Right. Stand there in the rain once: a hollow stays a hollow under a pad.',
              ],
              [
                false,
                'Which bags of concrete are on offer',
                'Not yet. Bags come after you know the size, and the size comes after the place.',
              ],
            ]),
          ]),
        },
        {
          key: 'soft-corner',
          name: 'The soft corner',
          at: { afterCue: 12 },
          byTheWay: true,
          exercise: quiz('Three corners are firm. In the fourth your heel sinks in.', 100, 3, [
            single(
              'soft-ground',
              'What do you do with the soft corner?',
              [
                'Dig it out to firm ground and fill with stone, tamped in layers',
                'Right. Stone on firm ground carries; stone on soft ground only hides it.',
              ],
              [
                [
                  'Pour the concrete thicker there',
                  'The extra weight sinks with the corner, and the pad cracks at the edge of the soft part.',
                ],
                [
                  'Fill it with the soil you dug elsewhere',
                  'Loose soil settles for a year. The pad does not wait.',
                ],
                [
                  'Leave it: the pad spans it',
                  'A plain pad 100 mm (4 in) thick is not made to span anything.',
                ],
              ],
              1,
            ),
          ]),
        },
      ],
    },
    {
      key: 'setting-out-the-corner',
      title: 'Setting out the corner',
      summary:
        'Two string lines, four profiles and a triangle of three, four and five. Once the first corner is square, the rest of the pad follows from it.',
      youWillWant: 'A second pair of hands for the tape, and no wind.',
      hazards: [],
      kit: [],
      stops: [
        {
          key: 'tape-across',
          name: 'Across the corner',
          at: { stop: 'three-four-five' },
          exercise: worked(
            'Three units along one string, four along the other. What must the tape read between the two marks when the corner is square?',
            5,
            square345({
              sideA: ranged(2.4, 3.2, 0.1),
              sideB: ranged(1, 1.4, 0.1),
              unit: ranged(0.2, 0.3, 0.05),
            }),
          ),
        },
        {
          key: 'order-of-strings',
          name: 'Order of the strings',
          at: { afterCue: 13 },
          byTheWay: true,
          exercise: quiz('Bare ground, four profiles, a ball of string.', 100, null, [
            inOrder('setting-out', 'Put the setting out in order.', [
              [
                'Front string, parallel to the fence',
                'The front line comes first: it is the one everyone will see.',
              ],
              [
                'One side string, square to it by 3-4-5',
                'The corner is made off the front line, so the front line must be there.',
              ],
              [
                'Back string, measured off the front at both ends',
                'It is held parallel by two equal measures; it needs the front and the side.',
              ],
              ['Other side string, measured off the first', 'The last side closes the rectangle.'],
              [
                'Both diagonals, compared',
                'The diagonals are the proof. They need all four corners.',
              ],
            ]),
          ]),
        },
      ],
    },
  ],
}
