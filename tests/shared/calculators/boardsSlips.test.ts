import { describeSlips } from './slipCases'

// 16 × 150 = 2400: the 17th board is ripped to 50 mm. 16 whole ones leave 130 mm for 15 gaps.
const usual = { opening: '2450', boardWidth: '145', gap: '5', mode: 'fixed-gap', ends: 'board' }

describeSlips('boards', usual, [
  { asked: 'count', slip: 'gap-forgotten', typed: '21', right: '20', texts: { opening: '3000' } },
  { asked: 'count', slip: 'rounded-down', typed: '16', right: '17' },
  {
    asked: 'count',
    slip: 'nominal-for-actual',
    typed: '78',
    right: '80',
    texts: { opening: '12000' },
  },
  {
    asked: 'gap',
    slip: 'gaps-as-many-as-boards',
    typed: '8.125',
    right: '8.667',
    texts: { mode: 'even-gap' },
  },
  { asked: 'gap', slip: 'other-ends', typed: '7.647', right: '8.667', texts: { mode: 'even-gap' } },
  { asked: 'gap', slip: 'wanted-gap', typed: '5', right: '8.667', texts: { mode: 'even-gap' } },
  { asked: 'lastRip', slip: 'gaps-left-out', typed: '130', right: '50' },
  { asked: 'lastRip', slip: 'gap-at-the-stop', typed: '45', right: '50' },
  { asked: 'lastRip', slip: 'waste-for-rip', typed: '95', right: '50' },
])
