import { hazards } from '../kit'
import type { CourseSeed } from '../shapes'
import { base } from './base'
import { firewood } from './firewood'
import { questions } from './fence'
import { frame } from './frame'
import { ground } from './ground'
import { cladding, finish, roof } from './upper'

export const logStore: CourseSeed = {
  slug: 'a-log-store-on-a-concrete-pad',
  sheetNumber: 1,
  owner: 'maren',
  helpers: ['sunil', 'petra'],
  title: 'A log store on a concrete pad',
  outcome:
    'A dry, airy home for two cubic metres of firewood, on a pad you poured yourself: open to the wind on four sides, a roof that falls to the front, and no post that touches the ground. A good first build, because every cut is square but one.',
  weekends: 2,
  tools: [
    'Spade',
    'Hand saw',
    'Drill with a masonry bit',
    'Level, 1200 mm (4 ft)',
    'Two string lines',
    'Tape, 5 m (16 ft)',
    'Hammer',
    'Tamper, borrowed or hired',
    'Barrow',
    'Float and a straight board',
  ],
  hazards: [
    hazards.services,
    hazards.cement,
    hazards.bags,
    hazards.cementDust,
    hazards.sawing,
    hazards.frame,
    hazards.above,
  ],
  coverDrawing: 'log-store',
  facts: [
    { label: 'Room for', value: '2 m³ of split wood (about 70 ft³)' },
    { label: 'Pad', value: '2600 × 1100 × 100 mm (8′ 6⅜″ × 3′ 7¼″ × 4″)' },
    { label: 'Store, width and depth', value: '2400 × 900 mm (7′ 10½″ × 2′ 11½″)' },
    { label: 'Roof', value: 'Falls 15° to the front' },
    { label: 'Concrete', value: '0.315 m³ with waste, 28 bags of 25 kg' },
    { label: 'Stone under the pad', value: '100 mm tamped (4″)' },
  ],
  notCovered:
    'Stores over 2 m (6′ 6″) high, against a house wall, or with a floor that people stand on. Ground steeper than 1 in 12, made-up ground, ground that stays wet. Snow country: the roof is drawn for light snow. Some places want a permit, a distance from the boundary or a deeper footing against frost: your local code, and the licensed trades where it asks for them, come before this sheet.',
  changeNote: 'First issue: ten lessons over six stages.',
  createdOn: '2026-03-09T07:30:00Z',
  issuedOn: '2026-05-12T06:45:00Z',
  stages: [ground, base, frame, cladding, roof, finish],
  hindsight: [
    {
      lesson: 'squaring-the-form',
      at: { afterCue: 6 },
      text: 'I used to draw a line across the board. A crow’s foot is better: its point is the mark, and rain does not widen it.',
      by: 'maren',
      on: '2026-06-20T06:10:00Z',
    },
    {
      lesson: 'mixing-and-pouring',
      at: { afterCue: 11 },
      text: 'I said “like porridge” here for years. Nobody agrees on porridge. Draw a trowel through it and look at the furrow: it should stand, and its top should close under the float.',
      by: 'maren',
      on: '2026-07-05T06:22:00Z',
    },
    {
      lesson: 'posts-and-their-feet',
      at: { afterCue: 6 },
      text: 'Give the pad its week before you drill. I drilled on day three here, and the hole broke out at the surface: it holds, but it drinks.',
      by: 'maren',
      on: '2026-08-11T05:58:00Z',
    },
  ],
  ownCalculators: { 'firewood-it-holds': firewood },
  questions,
}
