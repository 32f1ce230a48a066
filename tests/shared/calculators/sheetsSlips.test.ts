import { describeSlips } from './slipCases'

// 4200 + 2 × 75 = 4350 ÷ 760 = 5.7, so 6 across that cover 4560; 4900 + 60 = 4960, (4960 − 200) ÷ 1800 = 2.6, so 3 rows,
// the top one cut to 4960 − 2 × 1800 = 1360.
const usual = {
  width: '4200',
  slopeLength: '4900',
  coverWidth: '760',
  sheetLength: '2000',
  sideOverhang: '75',
  eaveOverhang: '60',
  endLap: '200',
  pitch: '15',
}
const cut = { asked: 'cutLength', right: '1360' }
const sheets = { asked: 'sheets', right: '18' }

describeSlips(
  'sheets',
  usual,
  [
    // 20 150 ÷ 760 = 26.5; a sheet is 3 in, 76.2 mm, wider than its cover: 20 150 ÷ 836.2 = 24.1.
    {
      asked: 'across',
      slip: 'whole-width-of-a-sheet',
      typed: '25',
      right: '27',
      texts: { width: '20 m' },
    },
    // (1000 + 600) ÷ 300 = 5.3; 1000 ÷ 300 = 3.3.
    {
      asked: 'across',
      slip: 'side-overhang-forgotten',
      typed: '4',
      right: '6',
      texts: { width: '1000', coverWidth: '300', sideOverhang: '300' },
    },
    { asked: 'across', slip: 'across-rounded-down', typed: '5', right: '6' },
    { asked: 'coveredWidth', slip: 'width-of-the-roof', typed: '4350', right: '4560' },
    // (14 960 − 600) ÷ 1400 = 10.3; 14 960 ÷ 2000 = 7.5.
    {
      asked: 'rows',
      slip: 'end-lap-forgotten',
      typed: '8',
      right: '11',
      texts: { slopeLength: '14900', endLap: '600' },
    },
    { asked: 'rows', slip: 'rows-rounded-down', typed: '2', right: '3' },
    { ...cut, slip: 'eave-forgotten', typed: '1300' },
    // 4960 − 2 × 2000.
    { ...cut, slip: 'cut-without-laps', typed: '960' },
    // 4.35 × 4.96 ÷ (0.76 × 2) = 14.2.
    { ...sheets, slip: 'by-area', typed: '15' },
    { ...sheets, slip: 'added', typed: '9' },
    {
      asked: 'lapsHold',
      slip: 'lap-by-habit',
      typed: 'yes',
      right: 'no',
      texts: { endLap: '150' },
    },
  ],
  [
    // 5400 ÷ 900 and (5600 − 200) ÷ 1800 come out even by hand and not quite in binary: nothing was rounded down.
    {
      asked: 'across',
      typed: '5',
      right: '6',
      texts: { width: '5300', coverWidth: '900', sideOverhang: '50' },
    },
    { asked: 'rows', typed: '2', right: '3', texts: { slopeLength: '5550', eaveOverhang: '50' } },
  ],
)
