import {
  bothDiagonals,
  fixed,
  length,
  own,
  quiz,
  ranged,
  several,
  single,
  within,
  worked,
} from '../exercises'
import { hazards, kit, onYou, toHand } from '../kit'
import type { StageSeed } from '../shapes'

export const frame: StageSeed = {
  key: 'frame',
  kind: 'frame',
  title: 'Frame',
  lessons: [
    {
      key: 'posts-and-their-feet',
      title: 'Posts and their feet',
      summary:
        'Six posts, each on a metal foot that keeps its end grain off the concrete. Where to drill so that the edge does not break out, and how to hold a post until the rails do.',
      youWillWant: 'A pad that has had a week, two braces a post, a second person.',
      hazards: [hazards.drillDust, hazards.frame, hazards.sawing],
      kit: [
        kit.eyes,
        kit.mask,
        onYou(
          'ears',
          'ear-protection',
          'Hearing protection',
          'A hammer drill in concrete is louder than it feels.',
        ),
        toHand(
          'feet',
          'generic',
          'Post feet and their anchors',
          'Anchors for outdoors, with the sheet that says hole, depth and edge distance.',
        ),
        toHand('braces', 'generic', 'Two braces a post', 'Pegged and screwed before you let go.'),
        kit.level,
        kit.drill,
        kit.prop,
        kit.blade,
      ],
      stops: [
        {
          key: 'edge-distance',
          name: 'How near the edge',
          at: { afterCue: 4 },
          exercise: quiz('The foot plate could stand flush with the corner of the pad.', 100, 3, [
            single(
              'edge',
              'Where do the anchor holes go?',
              [
                'As far in as the anchor’s sheet asks, even if the post moves in',
                'Right. The sheet that comes with the anchor says the least edge distance; it wins over the drawing.',
              ],
              [
                [
                  'Flush with the edge: it looks neater',
                  'The corner breaks out when the anchor is tightened, and looks less neat.',
                ],
                [
                  '20 mm in, so that the bit does not slip',
                  'The bit does not slip, but the anchor still spreads, and the edge still breaks.',
                ],
                [
                  'In the middle of the pad, away from all edges',
                  'Strong, but then the roof stands on nothing.',
                ],
              ],
              0,
            ),
            several('why-feet', 'Why does the post stand on a foot and not on the concrete?', [
              [
                true,
                'End grain drinks, and standing water rots it',
                'Right. A finger of air under the post is worth more than any paint.',
              ],
              [
                true,
                'The foot holds it down when wind lifts the roof',
                'Right. A small roof is a small wing.',
              ],
              [
                false,
                'It makes the post stronger',
                'The post is as strong as before; it lasts longer.',
              ],
            ]),
          ]),
        },
        {
          key: 'post-length',
          name: 'Cut the front posts',
          at: { afterCue: 9 },
          byTheWay: true,
          exercise: quiz(
            'The top of the front posts is drawn 1500 mm above the pad, and each stands on a foot that lifts it by 50 mm.',
            100,
            4,
            [
              length(
                'front-post',
                'How long is the front post cut?',
                '1450 mm',
                0.002,
                'The foot stands inside the drawn height: what is metal need not be timber.',
              ),
            ],
          ),
        },
      ],
    },
    {
      key: 'rails-and-rafters',
      title: 'Rails and rafters',
      summary:
        'Rails level, front and back, and the front square by its diagonals before any rafter goes on. Then one rafter as a pattern, and the others from it.',
      youWillWant: 'A second person at the far end, clamps, and no wind.',
      hazards: [hazards.sawing, hazards.frame],
      kit: [
        kit.eyes,
        kit.sleeves,
        kit.boots,
        toHand(
          'clamps',
          'generic',
          'Two clamps',
          'They hold better than a helper, and do not look away.',
        ),
        kit.level,
        kit.blade,
        kit.prop,
      ],
      stops: [
        {
          key: 'front-diagonals',
          name: 'The front, square',
          at: { stop: 'both-diagonals' },
          exercise: worked(
            'Your front: post to post along the pad, and pad to rail up the post. What must both diagonals read?',
            5,
            bothDiagonals({
              length: own('2400 mm'),
              width: own('1450 mm'),
              diagonal1: own('2806 mm'),
              diagonal2: own('2802 mm'),
            }),
          ),
        },
        {
          key: 'within-limits',
          name: 'Square enough',
          at: { afterCue: 16 },
          exercise: worked(
            'A front of 2400 by 1450 mm and the two diagonals as measured. How far apart are they?',
            3,
            {
              calculator: 'diagonals',
              inputs: {
                length: fixed('2400 mm'),
                width: fixed('1450 mm'),
                diagonal1: ranged(2.798, 2.802, 0.001),
                diagonal2: ranged(2.804, 2.81, 0.001),
              },
              asked: 'difference',
              tolerance: within(0.0005),
              hints: ['One reading off the other. The drawn size has no part in it.'],
              slips: ['half-difference', 'off-the-drawn-size'],
            },
          ),
        },
      ],
    },
  ],
}
