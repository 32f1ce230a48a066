import { describeSlips } from './slipCases'

// 3655 ÷ 400 = 9.1, so 10 spaces of 365.5 mm and 11 members, 320.5 mm clear.
const usual = { run: '3700', maxCentres: '400', memberWidth: '45' }

describeSlips('spacing', usual, [
  { asked: 'count', slip: 'spaces-for-members', typed: '10', right: '11' },
  { asked: 'count', slip: 'whole-run', typed: '11', right: '10', texts: { run: '3640' } },
  { asked: 'count', slip: 'by-the-clear-space', typed: '19', right: '21', texts: { run: '8000' } },
  { asked: 'centres', slip: 'widest-kept', typed: '400', right: '365.5' },
  { asked: 'centres', slip: 'by-members', typed: '332.27', right: '365.5' },
  { asked: 'centres', slip: 'run-by-spaces', typed: '370', right: '365.5' },
  { asked: 'clear', slip: 'centres-for-clear', typed: '365.5', right: '320.5' },
  { asked: 'clear', slip: 'half-a-width', typed: '343', right: '320.5' },
  { asked: 'clear', slip: 'two-widths', typed: '275.5', right: '320.5' },
])
