import { describeSlips } from './slipCases'

// 113 and 98 mm; 15 in 2400 is 0.3581°.
const usual = {
  openingStart: '118',
  openingEnd: '103',
  gap: '5',
  gapAtStop: 'no',
  boardWidth: '140',
  length: '2400',
}

describeSlips('taper', usual, [
  { asked: 'cutStart', slip: 'gap-forgotten-start', typed: '118', right: '113' },
  {
    asked: 'cutStart',
    slip: 'gap-once-start',
    typed: '113',
    right: '108',
    texts: { gapAtStop: 'yes' },
  },
  { asked: 'cutStart', slip: 'gap-twice-start', typed: '108', right: '113' },
  { asked: 'cutStart', slip: 'gap-added-start', typed: '123', right: '113' },
  { asked: 'cutStart', slip: 'other-end-start', typed: '98', right: '113' },
  { asked: 'cutStart', slip: 'mean-width-start', typed: '105.5', right: '113' },
  { asked: 'cutStart', slip: 'waste-for-width-start', typed: '27', right: '113' },
  { asked: 'cutEnd', slip: 'gap-forgotten-end', typed: '103', right: '98' },
  { asked: 'cutEnd', slip: 'gap-once-end', typed: '98', right: '93', texts: { gapAtStop: 'yes' } },
  { asked: 'cutEnd', slip: 'gap-twice-end', typed: '93', right: '98' },
  { asked: 'cutEnd', slip: 'gap-added-end', typed: '108', right: '98' },
  { asked: 'cutEnd', slip: 'other-end-end', typed: '113', right: '98' },
  { asked: 'cutEnd', slip: 'mean-width-end', typed: '105.5', right: '98' },
  { asked: 'cutEnd', slip: 'waste-for-width-end', typed: '42', right: '98' },
  { asked: 'wasteStart', slip: 'waste-without-gap', typed: '22', right: '27' },
  { asked: 'wasteStart', slip: 'waste-at-the-end', typed: '42', right: '27' },
  { asked: 'wasteStart', slip: 'width-for-waste', typed: '113', right: '27' },
  { asked: 'angle', slip: 'one-end-over-length', typed: '2.6957', right: '0.3581' },
  { asked: 'angle', slip: 'ratio-for-angle', typed: '0.00625', right: '0.3581' },
  {
    asked: 'fits',
    slip: 'fits-by-the-narrow-end',
    typed: 'yes',
    right: 'no',
    texts: { boardWidth: '100' },
  },
  {
    asked: 'fits',
    slip: 'fits-by-the-opening',
    typed: 'no',
    right: 'yes',
    texts: { boardWidth: '115' },
  },
])
