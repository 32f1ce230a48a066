import { describeSlips } from './slipCases'

// 14 × 9.80665 = 137.2931 N, × 400 ÷ 750 = 73.22299. Snow: 0.2 × 200 = 40 kg/m², × 0.8 × 1.2 = 38.4 kg, 376.57536 N.
// (137.2931 + 376.57536) × 400 ÷ 750 = 274.06318.
const usual = {
  weight: '14',
  depth: '800',
  handleDistance: '750',
  width: '1200',
  snowDepth: '200',
  snowDensity: '200',
}
const lift = { asked: 'liftForce', right: '73.22299', within: 0.001 }
const snow = { asked: 'snowWeight', right: '38.4', within: 0.001 }
const under = { asked: 'liftForceWithSnow', right: '274.06318', within: 0.001 }

describeSlips('lid', usual, [
  { ...lift, slip: 'whole-weight', typed: '137.2931' },
  { ...lift, slip: 'always-half', typed: '68.64655' },
  { ...lift, slip: 'weight-at-the-edge', typed: '146.44597' },
  { ...lift, slip: 'lever-upside-down', typed: '257.42456' },
  { ...lift, slip: 'kilograms-as-newtons', typed: '7.46667' },
  { ...snow, slip: 'snow-as-water', typed: '192' },
  { ...snow, slip: 'snow-a-square', typed: '40' },
  // 8 in at 12 lb/ft³ are 8 lb/ft²; on 3 × 4 ft 96 lb.
  {
    asked: 'snowWeight',
    slip: 'snow-a-square',
    typed: '8',
    right: '96',
    texts: {
      weight: '30',
      depth: '36',
      handleDistance: '34',
      width: '48',
      snowDepth: '8',
      snowDensity: '12',
    },
    system: 'imperial',
  },
  { ...under, slip: 'snow-forgotten', typed: '73.22299' },
  { ...under, slip: 'snow-alone', typed: '200.84019' },
  // 73.22299 + 376.57536.
  { ...under, slip: 'snow-without-the-lever', typed: '449.79835' },
])
