import { describeSlips } from './slipCases'

// π ÷ 4 × 3² × 6 = 42.4115 L of hole, 0.9² × 6 = 4.86 L of post: 37.5515 L each, 150.206 in all, 165.227 with 10 %.
// 165.227 ÷ 11.5 = 14.37 bags.
const usual = {
  count: '4',
  diameter: '300',
  depth: '600',
  postWidth: '90',
  postDepth: '90',
  waste: '10',
  bag: '25 kg',
  bagYield: '11.5',
}
const each = { asked: 'volumeEach', right: '37.5515', within: 1e-7 }
const all = { asked: 'volume', right: '150.206', within: 1e-6 }
const bags = { asked: 'bags', right: '15' }

describeSlips('posthole', usual, [
  { ...each, slip: 'post-not-taken-off', typed: '42.4115' },
  // 4 × 42.4115 − 4.86, 3² × 6 − 4.86 and 42.4115 − 4.86 × π ÷ 4.
  { ...each, slip: 'diameter-for-radius', typed: '164.786' },
  { ...each, slip: 'square-hole', typed: '49.14' },
  { ...each, slip: 'post-taken-off-round', typed: '38.5945' },
  // A 4 × 4 is 88.9 mm: 0.889² × 6 = 4.74193; as it is called, 1.016² × 6 = 6.19354.
  {
    asked: 'volumeEach',
    slip: 'nominal-post',
    typed: '36.2180',
    right: '37.6696',
    within: 1e-7,
    texts: { postWidth: '88.9', postDepth: '88.9' },
  },
  { ...all, slip: 'one-hole-only', typed: '37.5515' },
  { ...all, slip: 'waste-given-too-early', typed: '165.2266' },
  { ...all, slip: 'posts-left-in', typed: '169.646' },
  {
    asked: 'volumeWithWaste',
    slip: 'waste-left-out',
    typed: '150.206',
    right: '165.2266',
    within: 1e-6,
  },
  { ...bags, slip: 'bags-rounded-down', typed: '14' },
  // 41.307 ÷ 11.5 = 3.6 bags a hole: 4 × 4.
  { ...bags, slip: 'bags-a-hole', typed: '16' },
  // With 20 % 180.247 ÷ 11.5 = 15.7; without 150.206 ÷ 11.5 = 13.1.
  { asked: 'bags', slip: 'bags-without-waste', typed: '14', right: '16', texts: { waste: '20' } },
  // 169.646 × 1.1 ÷ 11.5 = 16.2.
  { ...bags, slip: 'bags-post-left-in', typed: '17' },
])
