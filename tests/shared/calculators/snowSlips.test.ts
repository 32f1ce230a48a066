import { describeSlips } from './slipCases'

// ASCE 7: 0.13 × 25 + 14 = 17.25 lb/ft³; × 16.018463 = 276.3185 kg/m³. 25 psf = 1.1970065 kPa; on 40 ft² 1000 lb.
const usual = { groundSnowLoad: '25 psf', depth: '', density: '', area: '40 ft²' }
const imperial = { system: 'imperial' as const, within: 0.001 }
// 0.5 × 200 = 100 kg/m², 980.665 Pa. A foot at 15 lb/ft³ is 15 psf.
const lying = { groundSnowLoad: '', depth: '500', density: '200' }
const foot = { groundSnowLoad: '', depth: '12', density: '15', area: '40' }
const weight = { asked: 'weight', right: '453.592', within: 0.001 }

describeSlips('snow', usual, [
  { ...imperial, asked: 'density', slip: 'fourteen-forgotten', typed: '3.25', right: '17.25' },
  // (0.13 × 1.1970065 + 14) × 16.018463 = 226.751.
  {
    asked: 'density',
    slip: 'kilopascals-in-the-formula',
    typed: '226.751',
    right: '276.3185',
    within: 0.001,
  },
  // 0.13 × 150 + 14.
  {
    ...imperial,
    asked: 'density',
    slip: 'over-the-most',
    typed: '33.5',
    right: '30',
    texts: { groundSnowLoad: '150 psf' },
  },
  // 0.5 × 1000 × 9.80665.
  {
    asked: 'load',
    slip: 'taken-for-water',
    typed: '4.903325',
    right: '0.980665',
    texts: lying,
    within: 0.01,
  },
  {
    ...imperial,
    asked: 'load',
    slip: 'inches-as-feet',
    typed: '180',
    right: '15',
    texts: foot,
  },
  {
    asked: 'load',
    slip: 'pull-forgotten',
    typed: '100 Pa',
    right: '980.665 Pa',
    texts: lying,
    within: 0.01,
  },
  // 0.7 × 1197.0065.
  { asked: 'load', slip: 'reduced', typed: '837.9045 Pa', right: '1197.0065 Pa', within: 0.01 },
  // 1197.0065 ÷ (276.3185 × 9.80665) = 0.441739 m; ÷ (1000 × 9.80665) = 0.122061.
  { asked: 'depth', slip: 'depth-of-water', typed: '122.061', right: '441.739' },
  // 1197.0065 ÷ 9.80665 kg on a square metre; 25 lb on a square foot.
  { ...weight, slip: 'one-square', typed: '122.0607' },
  { ...imperial, asked: 'weight', slip: 'one-square', typed: '25', right: '1000' },
  // 453.592 × 9.80665.
  { ...weight, within: 0.01, slip: 'newtons-as-kilograms', typed: '4448.22' },
  { ...weight, slip: 'kilonewtons-as-kilograms', typed: '4.448' },
])
