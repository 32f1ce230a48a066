import { describeSlips } from './slipCases'

// 38.1 × 88.9 mm dry; green 39.69 × 90.49 mm; a dry 2x8 is 184.15 mm wide. 3 m are 9.8425 ft.
const usual = { nominal: '2x4', moisture: 'dry', length: '3000', measuredWidth: '86' }

describeSlips('lumber-size', usual, [
  { asked: 'thickness', slip: 'nominal-thickness', typed: '50.8', right: '38.1' },
  { asked: 'thickness', slip: 'other-column-thickness', typed: '39.69', right: '38.1' },
  { asked: 'thickness', slip: 'width-for-thickness', typed: '88.9', right: '38.1' },
  { asked: 'width', slip: 'nominal-width', typed: '101.6', right: '88.9' },
  {
    asked: 'width',
    slip: 'half-an-inch-off-all',
    typed: '190.5',
    right: '184.15',
    texts: { nominal: '2x8', measuredWidth: '180' },
  },
  { asked: 'width', slip: 'other-column-width', typed: '90.49', right: '88.9' },
  { asked: 'boardFeet', slip: 'dressed-board-feet', typed: '4.3061', right: '6.5617' },
  { asked: 'boardFeet', slip: 'not-by-12', typed: '78.7402', right: '6.5617' },
  { asked: 'boardFeet', slip: 'running-feet', typed: '9.8425', right: '6.5617' },
  { asked: 'shortfall', slip: 'against-the-name', typed: '15.6', right: '2.9' },
  { asked: 'shortfall', slip: 'turned-round', typed: '-2.9', right: '2.9' },
])
