import {
  bothDiagonals,
  count,
  exactly,
  inOrder,
  length,
  own,
  quiz,
  ranged,
  several,
  single,
  square345,
  worked,
} from '../exercises'
import { caution, hazards, kit, onYou, toHand } from '../kit'
import type { StageSeed } from '../shapes'

export const base: StageSeed = {
  key: 'base',
  kind: 'base',
  title: 'Posts',
  lessons: [
    {
      key: 'posts-that-stay-put',
      title: 'Posts that stay put',
      summary:
        'The line first, then four holes that widen at the bottom, then concrete that sheds water from the post. A fence is only as upright as its posts on the day they set.',
      youWillWant: 'The boundary agreed, the services marked, a helper for the level.',
      hazards: [hazards.services, hazards.openHoles, hazards.cement, hazards.cementDust],
      isSample: true,
      kit: [
        kit.longGloves,
        kit.eyes,
        kit.mask,
        kit.wetBoots,
        kit.rinse,
        toHand(
          'spade',
          'spade',
          'Post-hole spade and a bar',
          'For the hole that widens as it goes down.',
        ),
        kit.level,
        kit.services,
        kit.burns,
        kit.dust,
        caution(
          'open-holes',
          'Cover every hole you walk away from.',
          'A board with a stone on it, each time. A hole 600 mm deep is a broken leg.',
        ),
      ],
      stops: [
        {
          key: 'water-for-a-bag',
          name: 'Water for a bag',
          at: { afterCue: 5 },
          exercise: worked(
            'Your own bag and the water you gave it. Is the mix too stiff, right or too wet?',
            2,
            {
              calculator: 'mix',
              inputs: { bag: own('80 lb'), waterAdded: own('3.5 qt') },
              asked: 'verdict',
              tolerance: exactly,
              hints: ['Read the least and the most off your bag. Where does yours lie?'],
              slips: [],
            },
          ),
        },
        {
          key: 'top-of-the-concrete',
          name: 'Top of the concrete',
          at: { afterCue: 9 },
          exercise: quiz('The post is plumb and braced, the hole is nearly full.', 60, 3, [
            single(
              'collar',
              'How do you leave the top of the concrete?',
              [
                'A little above the ground, sloped away from the post',
                'Right. Water runs off, and the post dries where it wets most.',
              ],
              [
                [
                  'Below the grass, out of sight',
                  'Soil lies against the post and keeps it wet at the very place where posts rot.',
                ],
                ['Dished towards the post', 'It is a cup with your post standing in it.'],
                [
                  'Level and smooth with the grass',
                  'Better than a dish, but rain stands on it. A slope costs one minute.',
                ],
              ],
              2,
            ),
            several('before-letting-go', 'What is true before you let go of the post?', [
              [
                true,
                'Plumb on two faces next to each other',
                'Right. Two opposite faces tell you the same thing twice.',
              ],
              [true, 'Braced both ways', 'Right. One brace is a hinge.'],
              [
                true,
                'Its face touches the string without pushing it',
                'Right. A pushed string lies to every post after it.',
              ],
              [false, 'The concrete is hard', 'That takes days; the braces hold it until then.'],
            ]),
            length(
              'post-to-buy',
              'Post 1120 mm above the ground, 600 mm of hole with 100 mm of stone under the post. How long is the post?',
              '1620 mm',
              0.005,
              'The stone lies under the post: only the rest of the hole has post in it.',
            ),
          ]),
        },
      ],
    },
  ],
}

export const cladding: StageSeed = {
  key: 'pickets',
  kind: 'cladding',
  title: 'Rails and pickets',
  lessons: [
    {
      key: 'rails-and-even-pickets',
      title: 'Rails and even pickets',
      summary:
        'Two rails a bay, pickets to a string, and one gap worked out so that the last picket is as wide as the first. Clear of the ground, so that it can dry.',
      youWillWant: 'A spacer, a string, an even stack of pickets sorted straight from bent.',
      hazards: [hazards.sawing],
      kit: [
        kit.eyes,
        kit.sleeves,
        toHand(
          'spacer',
          'generic',
          'A spacer with a stop on it',
          'It hangs from the rail and leaves both hands free.',
        ),
        kit.blade,
      ],
      stops: [
        {
          key: 'corner-of-the-fence',
          name: 'Where the fence turns',
          at: { stop: 'three-four-five' },
          byTheWay: true,
          exercise: worked(
            'Your fence turns a corner: two strings, one triangle. What must the tape read across?',
            5,
            square345({
              sideA: own('2.4 m'),
              sideB: own('1.8 m'),
              unit: ranged(0.4, 0.6, 0.05),
            }),
          ),
        },
        {
          key: 'pickets-in-a-bay',
          name: 'Pickets in a bay',
          at: { afterCue: 12 },
          exercise: quiz(
            'A bay is 1700 mm clear between the posts. Pickets 75 mm wide; you would like gaps of about 55 mm, the same at both ends.',
            50,
            4,
            [
              count(
                'pickets',
                'How many pickets?',
                '13',
                'One gap more than pickets: take one gap off the bay, then divide by picket and gap together, and round to the nearest whole one.',
              ),
              length(
                'real-gap',
                'And how wide is the gap then?',
                '51.8 mm',
                0.001,
                'Take the pickets off the bay and share what is left among all gaps, both ends included.',
              ),
            ],
          ),
        },
      ],
    },
  ],
}

export const finish: StageSeed = {
  key: 'gate',
  kind: 'finish',
  title: 'The gate',
  lessons: [
    {
      key: 'a-gate-that-still-shuts',
      title: 'A gate that still shuts',
      summary:
        'Square on the bench, braced from the bottom hinge up, hung on the post you trust more. Where it sags it sags at the latch, so that is where the room is left.',
      youWillWant: 'A flat place to build on, packers to stand the gate on, a helper to hold it.',
      hazards: [hazards.sawing, hazards.gate],
      kit: [
        kit.eyes,
        kit.boots,
        onYou('work-gloves', 'gloves', 'Work gloves', 'For carrying; off before the drill.'),
        toHand(
          'gate-packers',
          'generic',
          'Packers to stand it on',
          'The gate stands on them while you screw the hinges, not on your foot.',
        ),
        kit.blade,
        caution(
          'heavy-gate',
          'Two people hang a gate.',
          'Hands out of the gap at the hinge side: it closes like scissors.',
        ),
      ],
      stops: [
        {
          key: 'gate-diagonals',
          name: 'Square on the bench',
          at: { stop: 'both-diagonals' },
          exercise: worked(
            'Your gate lies on the bench. What must both diagonals read before the brace goes in?',
            5,
            bothDiagonals({
              length: own('980 mm'),
              width: own('900 mm'),
              diagonal1: own('1332 mm'),
              diagonal2: own('1329 mm'),
            }),
          ),
        },
        {
          key: 'which-way-the-brace',
          name: 'Which way the brace',
          at: { afterCue: 16 },
          exercise: quiz('One wooden brace, corner to corner.', 100, 3, [
            single(
              'brace',
              'Which way does it run?',
              [
                'From the bottom at the hinge side up to the top at the latch side',
                'Right. The latch side wants to drop; the brace stands on the bottom hinge and pushes it up.',
              ],
              [
                [
                  'From the top at the hinge side down to the bottom at the latch side',
                  'That way the brace hangs, and a wooden joint that is pulled opens. A wire would go that way.',
                ],
                [
                  'Either way: a triangle is a triangle',
                  'A triangle, yes. But wood in a joint pushes well and pulls badly.',
                ],
              ],
              0,
            ),
            inOrder('hanging', 'Put the hanging in order.', [
              [
                'Stand the gate in the opening on packers',
                'It has to stand at its height before any screw.',
              ],
              [
                'Share the gaps: hinge side less, latch side more',
                'The gaps are set while it can still move.',
              ],
              [
                'One screw a hinge, then swing it',
                'The swing is tried before all the screws are in.',
              ],
              ['All the screws', 'Only when it swings free.'],
              [
                'The latch, where the gate wants to meet it',
                'The latch follows the gate; the gate never follows the latch.',
              ],
            ]),
          ]),
        },
      ],
    },
  ],
}
