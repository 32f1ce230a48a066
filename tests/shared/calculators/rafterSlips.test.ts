import { describeSlips } from './slipCases'

// √10 ÷ 3 = 1.0540926 along the slope for each 1 of run; 18.4349°.
const usual = { run: '1500', pitch: '4', overhang: '200', ridge: '30', depth: '140', seat: '75' }

describeSlips('rafter', usual, [
  { asked: 'lineLength', slip: 'span-for-run', typed: '3162.28', right: '1581.14' },
  { asked: 'lineLength', slip: 'run-for-length', typed: '1500', right: '1581.14' },
  { asked: 'lineLength', slip: 'run-and-rise-added', typed: '2000', right: '1581.14' },
  { asked: 'lineLength', slip: 'overhang-in-line', typed: '1791.96', right: '1581.14' },
  { asked: 'totalLength', slip: 'overhang-forgotten', typed: '1565.33', right: '1776.15' },
  { asked: 'totalLength', slip: 'overhang-level', typed: '1765.33', right: '1776.15' },
  { asked: 'totalLength', slip: 'ridge-forgotten', typed: '1791.96', right: '1776.15' },
  { asked: 'totalLength', slip: 'ridge-whole', typed: '1760.33', right: '1776.15' },
  { asked: 'rise', slip: 'rise-by-sine', typed: '474.34', right: '500' },
  { asked: 'rise', slip: 'rise-by-pitch', typed: '6000', right: '500' },
  { asked: 'plumbCut', slip: 'level-for-plumb', typed: '71.5651', right: '18.4349' },
  { asked: 'plumbCut', slip: 'percent-as-degrees', typed: '33.3333', right: '18.4349' },
  { asked: 'levelCut', slip: 'plumb-for-level', typed: '18.4349', right: '71.5651' },
  { asked: 'heelCut', slip: 'notch-for-heel', typed: '23.717', right: '25' },
  { asked: 'heelCut', slip: 'heel-upside-down', typed: '225', right: '25' },
  { asked: 'birdsmouthDepth', slip: 'heel-for-notch', typed: '25', right: '23.717' },
  { asked: 'birdsmouthDepth', slip: 'seat-for-notch', typed: '75', right: '23.717' },
  {
    asked: 'notchFits',
    slip: 'judged-by-the-heel',
    typed: 'no',
    right: 'yes',
    texts: { pitch: '12', seat: '60' },
  },
  { asked: 'notchFits', slip: 'judged-by-half', typed: 'yes', right: 'no', texts: { pitch: '12' } },
])
