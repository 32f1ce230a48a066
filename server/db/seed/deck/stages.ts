import {
  bothDiagonals,
  fixed,
  count,
  inOrder,
  length,
  own,
  quiz,
  ranged,
  several,
  single,
  square345,
  withinPercent,
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
      key: 'twelve-pads-in-line',
      title: 'Twelve pads in line',
      summary:
        'Three rows of four small pads on tamped stone, set by a string and not by eye. What each takes, how to keep the tops level, and why the ground under the deck still has to shed water.',
      youWillWant: 'A string line, a long straight board, a second person for the bags.',
      hazards: [hazards.services, hazards.cement, hazards.cementDust, hazards.bags],
      isSample: true,
      kit: [
        kit.longGloves,
        kit.eyes,
        kit.mask,
        kit.wetBoots,
        kit.rinse,
        kit.barrow,
        kit.level,
        kit.services,
        kit.burns,
        kit.bags,
        kit.dust,
      ],
      stops: [
        {
          key: 'twelve-pads',
          name: 'Concrete for twelve pads',
          at: { afterCue: 4 },
          exercise: worked(
            'Twelve pads, each 300 mm square: laid end to end they make one strip, 3600 mm long. This is how deep you cast them. How much concrete is that, before any waste?',
            5,
            {
              calculator: 'slab',
              inputs: {
                length: fixed('3600 mm'),
                width: fixed('300 mm'),
                thickness: ranged(0.15, 0.25, 0.05),
                bag: fixed('25 kg'),
                waste: fixed('10 %'),
              },
              asked: 'volume',
              tolerance: withinPercent(3),
              hints: [
                'All three sides in metres, or all three in feet, then multiply.',
                'Waste is not asked here.',
              ],
              slips: [
                'litres',
                'thickness-in-centimetres',
                'inches-as-feet',
                'cubic-feet',
                'waste-given-too-early',
              ],
            },
          ),
        },
        {
          key: 'water-under-the-deck',
          name: 'Water under the deck',
          at: { afterCue: 9 },
          exercise: quiz(
            'The boards will keep the rain off nothing: it runs between them.',
            50,
            3,
            [
              single(
                'under-the-deck',
                'What lies under the deck?',
                [
                  'Ground that falls away from the house, a weed sheet that lets water through, stone on it',
                  'Right. Water leaves, nothing grows, and the timber dries from below.',
                ],
                [
                  [
                    'A sheet of plastic, so that it stays dry',
                    'It makes a pond. The timber stands over it and never dries.',
                  ],
                  [
                    'Good soil, so that something green grows',
                    'It grows up through the gaps and keeps the joists wet.',
                  ],
                ],
                1,
              ),
              count(
                'joists',
                'Run of joists 3600 mm, outside to outside; each 47 mm wide; centres not over 400 mm. How many joists?',
                '10',
                'Centre to centre of the two end joists is 3600 − 47. Divide by 400, round up, and count the first one too.',
              ),
            ],
          ),
        },
      ],
    },
  ],
}

export const frame: StageSeed = {
  key: 'frame',
  kind: 'frame',
  title: 'Frame',
  lessons: [
    {
      key: 'a-frame-that-stays-square',
      title: 'A frame that stays square',
      summary:
        'Bearers on packers, joists on bearers, and the diagonals before the last screw. A frame that is a finger out of square shows in every board you lay on it.',
      youWillWant: 'Two people for the long boards, clamps, a flat hour of light at the end.',
      hazards: [hazards.sawing, hazards.longBoards],
      kit: [
        kit.eyes,
        kit.sleeves,
        kit.boots,
        toHand(
          'packers',
          'generic',
          'Packers that do not rot',
          'They keep the bearers off the pads and make them level.',
        ),
        kit.level,
        kit.blade,
        caution(
          'long-boards',
          'Two people to a long board.',
          'One calls the turn; nobody walks backwards. Look for the window before you swing.',
        ),
      ],
      stops: [
        {
          key: 'first-corner',
          name: 'The first corner',
          at: { stop: 'three-four-five' },
          exercise: worked(
            'A frame this size is big enough for a big triangle. What must the tape read across the first corner?',
            5,
            square345({
              sideA: fixed('3600 mm'),
              sideB: fixed('2400 mm'),
              unit: ranged(0.5, 0.8, 0.1),
            }),
          ),
        },
        {
          key: 'frame-diagonals',
          name: 'Both diagonals',
          at: { stop: 'both-diagonals' },
          exercise: worked(
            'Your own frame, outside corner to outside corner. What must both diagonals read?',
            5,
            bothDiagonals({
              length: own('3600 mm'),
              width: own('2400 mm'),
              diagonal1: own('4330 mm'),
              diagonal2: own('4324 mm'),
            }),
          ),
        },
      ],
    },
  ],
}

export const cladding: StageSeed = {
  key: 'boards',
  kind: 'cladding',
  title: 'Boards',
  lessons: [
    {
      key: 'boards-and-their-gaps',
      title: 'Boards and their gaps',
      summary:
        'Lay them loose first. A gap the width of a nail, every joint over a joist, two screws a crossing, and the ends run long and cut in one go against a straight edge.',
      youWillWant: 'Knee pads, a box of spacers, a saw with a sharp blade.',
      hazards: [hazards.sawing, hazards.longBoards],
      kit: [
        kit.eyes,
        kit.sleeves,
        kit.boots,
        toHand(
          'spacers',
          'generic',
          'Spacers of 6 mm (¼″)',
          'Nails, coins or offcuts, as long as all are the same.',
        ),
        kit.blade,
        caution(
          'treated-dust',
          'Do not breathe or burn treated timber.',
          'Mask on when you saw it, offcuts to the waste site and never into the fire or the compost.',
        ),
      ],
      stops: [
        {
          key: 'how-many-boards',
          name: 'How many boards',
          at: { afterCue: 5 },
          exercise: quiz(
            'The frame is 2400 mm deep. The boards measure 120 mm and lie 6 mm apart; the first is flush with the frame.',
            50,
            4,
            [
              count(
                'boards',
                'How many whole boards fit?',
                '19',
                'n boards have n − 1 gaps: count one gap more on the 2400, then divide by board and gap together. Only whole boards.',
              ),
              length(
                'left-over',
                'How much is left over for the last strip, its gap taken off?',
                '6 mm',
                0.001,
                'Take the boards and the gaps between them off 2400, and then the gap before the strip.',
              ),
            ],
          ),
        },
        {
          key: 'laying-order',
          name: 'Order of laying',
          at: { afterCue: 13 },
          exercise: quiz('A strip that thin will not do.', 100, null, [
            inOrder('laying', 'Put the laying in order.', [
              ['Lay all boards out loose', 'Seeing them all comes before fixing any.'],
              [
                'Adjust the gap until no strip is left',
                'It can only be adjusted while nothing is fixed.',
              ],
              ['Fix the first board to a string', 'Every other board copies the first.'],
              [
                'Fix the rest, checking the distance every fifth',
                'A drift is mended over five boards, not over the last.',
              ],
              ['Cut all ends in one go', 'One cut along a straight edge, when all are fixed.'],
            ]),
            several('screws', 'Why two screws at every crossing?', [
              [
                true,
                'One screw lets the board cup and turn',
                'Right. Boards move with every shower.',
              ],
              [
                true,
                'Spread, they keep the edge down where a toe finds it',
                'Right. And set them just below the face.',
              ],
              [
                false,
                'It carries twice the load',
                'The joist carries the load; the screws hold the board down.',
              ],
            ]),
          ]),
        },
      ],
    },
  ],
}
