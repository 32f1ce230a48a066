import { describeSlips } from './slipCases'

// 0.11 m³ with waste, × 1.5 ÷ 6 = 27.5 L a part: 41.25 kg of cement, 55 L of sand, 82.5 L of stone.
// ACI 211.1: 216 kg/m³ for 12.5 mm and 3 to 4 in without air, 193 with; 2.5 and 5.5 % air. 23.76 L; 23.76 ÷ 41.25 = 0.576.
const usual = {
  volume: '0.1',
  proportions: '1:2:3',
  maxAggregate: '12.5',
  slump: '75',
  airEntrained: 'no',
  waste: '10',
}
const cement = { asked: 'cement', right: '41.25', within: 0.001 }
const sand = { asked: 'sand', right: '55', within: 1e-6 }
const stone = { asked: 'stone', right: '82.5', within: 1e-6 }
const water = { asked: 'water', right: '23.76', within: 1e-6 }
const ratio = { asked: 'waterCementRatio', right: '0.576' }
// Between 0.54 (30 MPa) and 0.61 (25): 30 − 5 × 36 ÷ 70; with air between 0.52 (25) and 0.60 (20): 25 − 5 × 56 ÷ 80.
const strength = { asked: 'strengthEstimate', right: '27.4286', within: 1000 }

describeSlips('batch', usual, [
  { ...cement, slip: 'cement-not-loose', typed: '27.5' },
  { ...cement, slip: 'cement-waste-left-out', typed: '37.5' },
  { ...cement, slip: 'cement-cement-not-counted', typed: '49.5' },
  { ...sand, slip: 'sand-not-loose', typed: '36.6667' },
  { ...sand, slip: 'sand-waste-left-out', typed: '50' },
  { ...sand, slip: 'sand-cement-not-counted', typed: '66' },
  { ...sand, slip: 'sand-stone-swapped', typed: '82.5' },
  { ...stone, slip: 'stone-not-loose', typed: '55' },
  { ...stone, slip: 'stone-waste-left-out', typed: '75' },
  { ...stone, slip: 'stone-cement-not-counted', typed: '99' },
  // 0.165 m³ ÷ 7 = 23.5714 L a part.
  {
    asked: 'stone',
    slip: 'stone-sand-swapped',
    typed: '47.1429',
    right: '94.2857',
    within: 1e-6,
    texts: { proportions: '1:2:4' },
  },
  { asked: 'waterContent', slip: 'wrong-half', typed: '193', right: '216' },
  { ...water, slip: 'water-of-a-cubic-metre', typed: '216' },
  { ...water, slip: 'water-waste-left-out', typed: '21.6' },
  // 4.4 ft³ × 1728 ÷ 57.75 … 216 × 4.4 × 0.0283168466 = 26.9124 kg = 59.3316 lb; a quart is 0.946353 L: 28.4380.
  {
    asked: 'water',
    slip: 'pounds-as-quarts',
    typed: '59.3316',
    right: '28.4380',
    within: 1e-6,
    texts: { volume: '4', maxAggregate: '1/2', slump: '3' },
    system: 'imperial',
  },
  { ...ratio, slip: 'cement-to-water', typed: '1.7361' },
  // 41.25 kg of loose cement at 1500 kg/m³ fill 27.5 L: 23.76 ÷ 27.5.
  { ...ratio, slip: 'by-volume', typed: '0.864' },
  { asked: 'airTarget', slip: 'air-of-the-wrong-half', typed: '5.5', right: '2.5' },
  { ...strength, slip: 'strength-of-the-wrong-column', typed: '21.5' },
  { ...strength, slip: 'strength-not-between', typed: '30' },
])
