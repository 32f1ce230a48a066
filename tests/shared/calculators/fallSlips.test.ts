import { describeSlips } from './slipCases'

// 1100 × 20 ÷ 1000 = 22; arctan 0.02 = 1.14576°, 0.0199973 rad. Two feet in the run: 1.1 ÷ 0.3048 = 3.608924.
const usual = { run: '1100', perMetre: '20', besideBuilding: 'no' }
// 3 m fall 3000 ÷ 48 = 62.5 at 1/4 in (6.35 mm) a foot: 2.08333 %. 3 m are 118.11 in.
const perFoot = { run: '3000', perMetre: '', perFoot: '1/4' }
const drop = { asked: 'drop', right: '22' }
const percent = { asked: 'percent', right: '2' }
const angle = { asked: 'angle', right: '1.14576', within: 0.00001 }
const drain = { asked: 'enoughToDrain' }

describeSlips('fall', usual, [
  { asked: 'drop', slip: 'per-foot-as-per-metre', typed: '19.05', right: '62.5', texts: perFoot },
  { ...drop, slip: 'per-metre-as-per-foot', typed: '72.178' },
  { ...drop, slip: 'run-left-out', typed: '20' },
  { asked: 'drop', slip: 'run-left-out', typed: '6.35', right: '62.5', texts: perFoot },
  { asked: 'drop', slip: 'run-in-inches', typed: '750', right: '62.5', texts: perFoot },
  {
    asked: 'drop',
    slip: 'run-in-inches',
    typed: '12',
    right: '1',
    texts: { run: "4'", perMetre: '', perFoot: '1/4' },
    system: 'imperial',
  },
  { ...drop, slip: 'percent-not-divided', typed: '2200', texts: { perMetre: '', percent: '2' } },
  // tan 2° = 0.0349208: 38.4128 mm.
  {
    asked: 'drop',
    slip: 'degrees-as-percent',
    typed: '22',
    right: '38.413',
    texts: { perMetre: '', angle: '2' },
  },
  { ...drop, slip: 'centimetres', typed: '2.2' },
  { ...percent, slip: 'ratio-for-percent', typed: '0.02' },
  { ...percent, slip: 'millimetres-as-percent', typed: '20' },
  { ...percent, slip: 'inches-as-percent', typed: '0.24' },
  { asked: 'percent', slip: 'ten-inches', typed: '2.5', right: '2.08333', texts: perFoot },
  { ...percent, slip: 'degrees-for-percent', typed: '1.14576' },
  { ...angle, slip: 'percent-as-degrees', typed: '2' },
  { ...angle, slip: 'radians', typed: '0.0199973' },
  { ...angle, slip: 'from-the-plumb-line', typed: '88.85424' },
  {
    ...drain,
    slip: 'judged-in-the-open',
    typed: 'yes',
    right: 'no',
    texts: { perMetre: '15', besideBuilding: 'yes' },
  },
  {
    ...drain,
    slip: 'judged-beside-a-building',
    typed: 'no',
    right: 'yes',
    texts: { perMetre: '15' },
  },
  { ...drain, slip: 'judged-by-the-drop', typed: 'yes', right: 'no', texts: { perMetre: '5' } },
])
