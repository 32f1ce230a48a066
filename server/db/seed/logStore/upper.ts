import {
  degree,
  fixed,
  inOrder,
  length,
  own,
  quiz,
  ranged,
  several,
  single,
  within,
  withinPercent,
  worked,
} from '../exercises'
import { caution, hazards, kit, onYou, toHand } from '../kit'
import type { StageSeed } from '../shapes'
import { firewood } from './firewood'

export const cladding: StageSeed = {
  key: 'cladding',
  kind: 'cladding',
  title: 'Cladding',
  lessons: [
    {
      key: 'slats-with-even-gaps',
      title: 'Slats with even gaps',
      summary:
        'Wood dries by wind, so the sides are more gap than board. Work the gap out first, cut one spacer to it, and never measure again.',
      youWillWant: 'An offcut for the spacer, a saw you trust, an afternoon.',
      hazards: [hazards.sawing],
      kit: [
        kit.eyes,
        kit.sleeves,
        toHand(
          'spacer',
          'generic',
          'A spacer cut to the gap',
          'Mark it with its measure; by evening there are three.',
        ),
        kit.blade,
      ],
      stops: [
        {
          key: 'even-gap',
          name: 'One gap, many times',
          at: { afterCue: 5 },
          exercise: quiz(
            'Clear height between the rails 1200 mm. Eleven slats of 95 mm, the same gap above the first, between all and below the last.',
            50,
            4,
            [
              length(
                'gap',
                'How wide is the gap?',
                '12.9 mm',
                0.0005,
                'Eleven slats leave 155 mm. Count the gaps again: one above, one below, and those between.',
              ),
              single(
                'nominal',
                'Your slats are sold as 100 mm. Which width goes into the sum?',
                [
                  'What you measure across one of them today',
                  'Right. A name is not a measure, and a wet slat is wider than a dry one.',
                ],
                [
                  [
                    '100 mm, as sold',
                    'Eleven times the difference is more than three gaps: the last slat does not fit.',
                  ],
                  [
                    '90 mm, to be on the safe side',
                    'There is no safe side in a sum: the gaps come out uneven.',
                  ],
                ],
                1,
              ),
            ],
          ),
        },
      ],
    },
  ],
}

export const roof: StageSeed = {
  key: 'roof',
  kind: 'roof',
  title: 'Roof',
  lessons: [
    {
      key: 'the-roof-and-its-pitch',
      title: 'The roof and its pitch',
      summary:
        'One slope said in degrees, in per cent and as a rise, so that you and the person at the timber yard mean the same. Boards from the lower edge up, and a drip edge that drips clear.',
      youWillWant: 'A platform to stand on, a still day, the second person.',
      hazards: [hazards.above, hazards.sawing],
      kit: [
        kit.eyes,
        kit.boots,
        onYou(
          'metal-gloves',
          'gloves',
          'Cut-proof gloves for the drip edge',
          'Fresh sheet metal opens a hand without a sound.',
        ),
        toHand(
          'platform',
          'ladder',
          'A platform or a tied ladder',
          'On the pad, not on the grass.',
        ),
        kit.ladder,
        kit.blade,
        caution(
          'loads',
          'Snow and wind follow the local code.',
          'This roof is drawn for light snow. In snow or storm country ask the building department and, where it is required, a licensed engineer.',
        ),
      ],
      stops: [
        {
          key: 'pitch-in-degrees',
          name: 'Pitch in degrees',
          at: { stop: 'pitch' },
          exercise: worked(
            'The lid on the screen rises 105 over 1200. Now your own roof: front rail to back rail it rises this much over this run. How many degrees is that?',
            4,
            {
              calculator: 'pitch',
              inputs: { rise: own('241 mm'), run: own('900 mm') },
              asked: 'degrees',
              tolerance: within(0.3 * degree),
              hints: [
                'Rise over level run first.',
                'The arctangent turns that number into an angle; set your calculator to degrees.',
              ],
              slips: ['percent-as-degrees', 'sine-for-tangent', 'from-the-plumb-line'],
            },
          ),
        },
        {
          key: 'slope-in-percent',
          name: 'The same in per cent',
          at: { afterCue: 6 },
          exercise: worked(
            'The roofing’s sheet gives the least slope in per cent. This is the pitch you have. What is it in per cent?',
            4,
            {
              calculator: 'pitch',
              inputs: { degrees: ranged(12 * degree, 18 * degree, degree) },
              asked: 'percent',
              tolerance: within(0.5),
              hints: ['How much does it rise over a run of 100?'],
              slips: ['degrees-as-percent', 'rise-over-slope', 'ratio-for-percent'],
            },
          ),
        },
        {
          key: 'rafter-for-the-run',
          name: 'Rafter for the run',
          at: { afterCue: 11 },
          byTheWay: true,
          exercise: worked('At 15°, how long is the rafter for each unit of level run?', 4, {
            calculator: 'pitch',
            inputs: { degrees: fixed('15 deg') },
            asked: 'lengthPerRun',
            tolerance: withinPercent(0.5),
            hints: ['Along 1 and up the rise: the rafter is the straight way.'],
            slips: ['rise-and-run-added', 'no-root'],
          }),
        },
      ],
    },
  ],
}

export const finish: StageSeed = {
  key: 'finish',
  kind: 'finish',
  title: 'Finish',
  lessons: [
    {
      key: 'cut-ends-and-first-stack',
      title: 'Cut ends and the first stack',
      summary:
        'Every saw cut has opened the timber: seal the ends, then let the pad carry its first load. How to stack so that it dries and does not roll.',
      youWillWant: 'A dry day, a brush you will throw away, and split wood.',
      hazards: [hazards.stack],
      kit: [
        kit.workGloves,
        kit.eyes,
        kit.boots,
        toHand(
          'preserver',
          'generic',
          'End-grain preserver',
          'Read its label: gloves, air, and where the rest of the tin goes.',
        ),
        caution(
          'rags',
          'Oily rags can light themselves.',
          'Spread them flat outdoors to dry, or keep them in a closed tin of water, as the label says.',
        ),
        caution(
          'stack-height',
          'Stack no higher than your chest.',
          'The end pieces crosswise, and nobody climbs it. A stack that leans is taken down, not pushed.',
        ),
      ],
      stops: [
        {
          key: 'wood-it-holds',
          name: 'Wood it holds',
          at: { afterCue: 4 },
          byTheWay: true,
          exercise: worked(
            'The store is 2400 mm long and 900 mm deep inside. Stacked this high, how much is wood and not air?',
            3,
            {
              calculator: 'own:firewood-it-holds',
              own: { key: 'firewood-it-holds', version: 1, definition: firewood },
              inputs: {
                inside_length: fixed('2400 mm'),
                depth: fixed('900 mm'),
                stack_height: ranged(0.8, 1.2, 0.05),
                air: own('35 %'),
              },
              asked: 'solid',
              tolerance: withinPercent(2),
              hints: [
                'The stack first: all three sides in metres or feet.',
                'If 35 parts in 100 are air, how many are wood?',
              ],
              slips: ['air-kept', 'only-the-air', 'air-added'],
            },
          ),
        },
        {
          key: 'which-ends',
          name: 'Which ends',
          at: { afterCue: 7 },
          exercise: quiz('The timber was treated before you bought it.', 100, null, [
            several('seal', 'Which places want the brush?', [
              [
                true,
                'Every end you sawed',
                'Right. Treatment reaches a few millimetres in; the cut goes past it.',
              ],
              [
                true,
                'Holes you drilled, before the bolt goes in',
                'Right. A hole is end grain all the way round.',
              ],
              [
                true,
                'The notch under the rail',
                'Right. It is out of sight and stays wet longest.',
              ],
              [
                false,
                'The faces that came treated from the yard',
                'They have what they need; save the tin for the cuts.',
              ],
            ]),
            inOrder('stacking', 'Put the first stack in order.', [
              [
                'Two rails on the pad, so that air runs under',
                'Wood on bare concrete draws damp from below.',
              ],
              [
                'End pieces crosswise, as bookends',
                'The ends hold the row, so they come before it.',
              ],
              [
                'The row, pieces touching but not wedged',
                'It leans on the ends that stand already.',
              ],
              ['A gap of a hand before the next row', 'Wind has to pass between the rows.'],
            ]),
          ]),
        },
      ],
    },
  ],
}
