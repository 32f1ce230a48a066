import { describeSlips } from './slipCases'

// 20 × 1.2 = 24 m², ÷ 6 = 4 L a coat, 8 L for two.
const usual = { area: '20', coats: '2', coverage: '6', coverageFor: 'L', roughness: '20' }
const all = { asked: 'volume', right: '8', within: 1e-6 }
const coat = { asked: 'volumePerCoat', right: '4', within: 1e-6 }
// 200 × 1.2 ÷ 240 = 1 gallon a coat.
const gallons = {
  asked: 'volume',
  right: '2',
  texts: { area: '200', coverage: '240', coverageFor: 'gal' },
  system: 'imperial' as const,
  within: 1e-6,
}

describeSlips('coating', usual, [
  { ...all, slip: 'one-coat', typed: '4' },
  { ...coat, slip: 'all-coats', typed: '8' },
  { ...all, slip: 'roughness-forgotten', typed: '6.6667' },
  { ...coat, slip: 'roughness-forgotten-in-a-coat', typed: '3.3333' },
  // 20 × 0.8 ÷ 6 × 2.
  { ...all, slip: 'roughness-taken-off', typed: '5.3333' },
  // 24 × 6 × 2; 240 × 240 × 2.
  { ...all, slip: 'multiplied', typed: '288' },
  { ...gallons, slip: 'multiplied', typed: '115200' },
  // A gallon is 3.785412 L.
  { ...all, slip: 'litre-for-gallon', typed: '30.2833' },
  { ...gallons, slip: 'litre-for-gallon', typed: '0.52834' },
])
