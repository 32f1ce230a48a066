import { describeSlips } from './slipCases'

// 520 ÷ 180 = 2.9, so 3 risers of 173.33 mm and two treads.
const usual = { totalRise: '520', maxRise: '180', tread: '300' }

describeSlips('stairs', usual, [
  { asked: 'risers', slip: 'treads-for-risers', typed: '2', right: '3' },
  { asked: 'risers', slip: 'one-riser-more', typed: '4', right: '3' },
  { asked: 'rise', slip: 'highest-kept', typed: '180', right: '173.33' },
  { asked: 'rise', slip: 'by-treads', typed: '260', right: '173.33' },
  { asked: 'totalRun', slip: 'tread-for-each-riser', typed: '900', right: '600' },
  { asked: 'totalRun', slip: 'along-the-slope', typed: '692.95', right: '600' },
  { asked: 'comfort', slip: 'one-rise', typed: '473.33', right: '646.67' },
  { asked: 'comfort', slip: 'two-treads', typed: '773.33', right: '646.67' },
  { asked: 'withinLimits', slip: 'rise-only', typed: 'yes', right: 'no', texts: { tread: '200' } },
  {
    asked: 'withinLimits',
    slip: 'tread-only',
    typed: 'yes',
    right: 'no',
    texts: { totalRise: '400', maxRise: '200' },
  },
])
