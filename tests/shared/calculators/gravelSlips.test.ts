import { describeSlips } from './slipCases'

// (2.6 + 0.2) × (1.1 + 0.2) × 0.1 = 0.364 m³ tamped, × 1.2 = 0.4368 loose, × 1600 = 698.88 kg.
const usual = {
  length: '2600',
  width: '1100',
  depth: '100',
  overhang: '100',
  compaction: '1.2',
  density: '1600',
}
const loose = { asked: 'looseVolume', right: '0.4368', within: 0.00001 }
const mass = { asked: 'mass', right: '698.88', within: 0.001 }
// 9 × 9 ft, 4 in deep, loose 1: 27 ft³, a cubic yard.
const feet = {
  asked: 'looseVolume',
  right: '1',
  texts: { length: "9'", width: "9'", depth: '4', overhang: '0', compaction: '1', density: '100' },
  system: 'imperial' as const,
}

describeSlips('gravel', usual, [
  { ...loose, slip: 'tamped-for-loose', typed: '0.364' },
  { ...loose, slip: 'divided-by-compaction', typed: '0.30333' },
  // 2.6 × 1.1 × 0.1 × 1.2 and 2.7 × 1.2 × 0.1 × 1.2.
  { ...loose, slip: 'overhang-forgotten', typed: '0.3432' },
  { ...loose, slip: 'overhang-once', typed: '0.3888' },
  { ...feet, slip: 'inches-as-feet', typed: '12' },
  { ...feet, slip: 'cubic-feet', typed: '27' },
  { ...loose, slip: 'thickness-in-centimetres', typed: '4.368' },
  { ...mass, slip: 'tamped-weighed', typed: '582.4' },
  { ...mass, slip: 'as-heavy-as-concrete', typed: '1048.32' },
  { ...mass, slip: 'as-light-as-water', typed: '436.8' },
])
