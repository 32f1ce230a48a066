import { describeSlips } from './slipCases'

// 2400² + 1800² − 3010² = −60 100; ÷ (2 × 2400 × 1800) = −0.006956: 90.3986°, 12.52 mm at the end of B.
const usual = { legA: '2400', legB: '1800', diagonal: '3010', tolerance: '5' }

describeSlips('corner', usual, [
  { asked: 'angle', slip: 'sign-lost', typed: '89.6014', right: '90.3986' },
  { asked: 'angle', slip: 'two-left-out', typed: '90.7971', right: '90.3986' },
  { asked: 'angle', slip: 'angle-at-the-mark', typed: '36.8699', right: '90.3986' },
  { asked: 'error', slip: 'whole-angle', typed: '90.3986', right: '0.3986' },
  { asked: 'error', slip: 'wide-for-narrow', typed: '-0.3986', right: '0.3986' },
  { asked: 'error', slip: 'radians', typed: '0.00696', right: '0.3986' },
  { asked: 'offsetAtLegB', slip: 'diagonal-difference', typed: '10', right: '12.52' },
  { asked: 'offsetAtLegB', slip: 'half-the-difference', typed: '5', right: '12.52' },
  { asked: 'offsetAtLegB', slip: 'wrong-leg', typed: '16.69', right: '12.52' },
  { asked: 'offsetAtLegB', slip: 'degrees-as-length', typed: '717.4', right: '12.52' },
  { asked: 'move', slip: 'turned-round', typed: 'out', right: 'in' },
  {
    asked: 'square',
    slip: 'judged-by-the-tape',
    typed: 'yes',
    right: 'no',
    texts: { tolerance: '11' },
  },
])
