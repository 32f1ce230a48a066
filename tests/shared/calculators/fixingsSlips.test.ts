import { describeSlips } from './slipCases'

// 22 × 7 × 2 = 308; × 1.1 = 338.8, so 339; ÷ 100, so 4 boxes; 3 × 20.
const usual = {
  boards: '22',
  supports: '7',
  perCrossing: '2',
  boxSize: '100',
  spare: '10',
  thickness: '20',
}
const driven = { asked: 'driven', right: '308' }
const bought = { asked: 'fixings', right: '339' }

describeSlips(
  'fixings',
  usual,
  [
    { ...driven, slip: 'one-at-a-crossing', typed: '154' },
    { ...driven, slip: 'gaps-for-supports', typed: '264' },
    { ...driven, slip: 'one-board', typed: '14' },
    { ...bought, slip: 'spare-forgotten', typed: '308' },
    { ...bought, slip: 'spare-rounded-down', typed: '338' },
    { ...bought, slip: 'spare-as-a-count', typed: '318' },
    { asked: 'boxes', slip: 'boxes-rounded-down', typed: '3', right: '4' },
    // 308 × 1.5 = 462, ÷ 50 = 9.2; 308 ÷ 50 = 6.2.
    {
      asked: 'boxes',
      slip: 'boxes-without-spare',
      typed: '7',
      right: '10',
      texts: { spare: '50', boxSize: '50' },
    },
    { asked: 'nailLength', slip: 'twice-as-long', typed: '40', right: '60' },
  ],
  [
    // 100 × 1.15 is 115 by hand and not quite in binary: nothing was rounded down.
    {
      asked: 'fixings',
      typed: '114',
      right: '115',
      texts: { boards: '50', supports: '2', perCrossing: '1', spare: '15' },
    },
  ],
)
