import { describeSlips } from './slipCases'

// 140 ÷ √3 = 80.829; 140 × √3 = 242.487; 280 ÷ √3 = 161.658.
const usual = { boardWidth: '140', angle: '30', longPoint: '895' }

describeSlips('angle-cut', usual, [
  { asked: 'offset', slip: 'sine-for-tangent', typed: '70', right: '80.829' },
  { asked: 'offset', slip: 'from-the-edge', typed: '242.487', right: '80.829' },
  { asked: 'offset', slip: 'nominal-for-actual', typed: '83.716', right: '80.829' },
  { asked: 'offset', slip: 'half-the-angle', typed: '37.513', right: '80.829' },
  { asked: 'offset', slip: 'length-of-the-cut', typed: '161.658', right: '80.829' },
  { asked: 'shortPoint', slip: 'offset-added', typed: '975.829', right: '814.171' },
  { asked: 'shortPoint', slip: 'long-for-short', typed: '895', right: '814.171' },
  { asked: 'shortPoint', slip: 'offset-for-short', typed: '80.829', right: '814.171' },
  { asked: 'shortPoint', slip: 'half-the-offset', typed: '854.585', right: '814.171' },
])
