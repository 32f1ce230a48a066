import { describeSlips } from './slipCases'

// 24 × 120 = 2880 apart; 7000 ÷ 2880 = 2.43, so 3 panels of 2333.33; 4000 ÷ 2880 = 1.39, so 2 of 2000.
const usual = { length: '7000', width: '4000', thickness: '120', mix: 'small-stone' }
const apart = { asked: 'maxSpacing', right: '2880' }
// Panels of a strip 1 m wide are at most 1500 long: 7000 ÷ 1500 = 4.67, so 5 where the spacing alone asks for 3.
const strip = { asked: 'panelsLong', right: '5', texts: { width: '1000' } }
const across = { asked: 'panelsWide', right: '5', texts: { length: '1000', width: '7000' } }

describeSlips('joints', usual, [
  {
    asked: 'maxSpacing',
    slip: 'inches-as-feet',
    typed: "96'",
    right: '96',
    texts: { thickness: '4', length: "16'", width: "10'" },
    system: 'imperial',
  },
  { ...apart, slip: 'centimetres', typed: '288' },
  { ...apart, slip: 'widest-of-the-range', typed: '4320' },
  // 18 ft are 5486.4 mm; 24 × 300 = 7200.
  {
    asked: 'maxSpacing',
    slip: 'limit-forgotten',
    typed: '7200',
    right: '5486.4',
    texts: { thickness: '300' },
  },
  { ...strip, slip: 'joints-counted-length', typed: '4' },
  { ...strip, slip: 'rounded-down-length', typed: '2' },
  { ...strip, slip: 'long-panels-length', typed: '3' },
  // 5760 is twice 2880: nothing was rounded, the panels are only too long for 1 m.
  {
    asked: 'panelsLong',
    slip: 'long-panels-length',
    typed: '2',
    right: '4',
    texts: { length: '5760', width: '1000' },
  },
  { ...across, slip: 'joints-counted-width', typed: '4' },
  { ...across, slip: 'rounded-down-width', typed: '2' },
  { ...across, slip: 'long-panels-width', typed: '3' },
  { asked: 'panelLength', slip: 'spacing-for-panel', typed: '2880', right: '2333.33' },
  { asked: 'panelLength', slip: 'divided-by-joints', typed: '3500', right: '2333.33' },
  { asked: 'panelWidth', slip: 'spacing-for-panel-width', typed: '2880', right: '2000' },
  {
    asked: 'jointDepth',
    slip: 'least-depth-forgotten',
    typed: '20',
    right: '25',
    texts: { thickness: '80' },
  },
  { asked: 'jointDepth', slip: 'a-quarter-inch', typed: '6.35', right: '30' },
  { asked: 'jointDepth', slip: 'cut-half-way', typed: '60', right: '30' },
])
