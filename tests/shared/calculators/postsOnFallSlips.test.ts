import { describeSlips } from './slipCases'

// tan 5° = 0.0874887: for each metre from the high edge a post gains 20 mm and loses 87.4887.
// 1480 − 0.05 × 67.4887 = 1476.6256 and 1480 − 1.05 × 67.4887 = 1409.1369.
const usual = {
  run: '1100',
  fall: '20',
  positions: '50; 550; 1050',
  topHeight: '1480',
  roofPitch: '5',
  roofFalls: 'with',
}
const longest = { asked: 'longest', right: '1476.6256' }
const shortest = { asked: 'shortest', right: '1409.1369' }
const difference = { asked: 'difference', right: '67.4887' }

describeSlips('posts-on-fall', usual, [
  { ...longest, slip: 'longest-fall-forgotten', typed: '1475.6256' },
  { ...longest, slip: 'longest-fall-taken-off', typed: '1474.6256' },
  // 1475.6256 + 1.1 × 20.
  { ...longest, slip: 'longest-whole-run', typed: '1497.6256' },
  { ...longest, slip: 'longest-roof-forgotten', typed: '1481' },
  { ...longest, slip: 'longest-roof-turned', typed: '1485.3744' },
  { ...shortest, slip: 'shortest-fall-forgotten', typed: '1388.1369' },
  { ...shortest, slip: 'shortest-fall-taken-off', typed: '1367.1369' },
  { ...shortest, slip: 'shortest-whole-run', typed: '1410.1369' },
  { ...shortest, slip: 'shortest-roof-forgotten', typed: '1501' },
  { ...shortest, slip: 'shortest-roof-turned', typed: '1592.8631' },
  { ...difference, slip: 'difference-whole-run', typed: '22' },
  { ...difference, slip: 'difference-roof-forgotten', typed: '20' },
  { ...difference, slip: 'difference-fall-forgotten', typed: '87.4887' },
])
