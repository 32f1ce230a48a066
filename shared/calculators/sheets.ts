import type { Calculator, QuantityInput, Values } from './calculator'
import { CalculatorInputError } from './calculator'
import { judgeLaps, lapsOutput } from './sheetsLaps'
import { sheetsSlips } from './sheetsSlips'
import { sheetsSteps } from './sheetsSteps'
import { numberOf, optionalNumber } from './values'
import { roundUp } from '../units/number'

function compute(values: Values): Values {
  const sheetLength = numberOf(values, 'sheetLength')
  const endLap = numberOf(values, 'endLap')
  const coverWidth = numberOf(values, 'coverWidth')
  if (endLap > sheetLength / 2) {
    throw new CalculatorInputError(
      'endLap',
      'The end lap takes more than half of a sheet. Give a shorter lap or a longer sheet.',
    )
  }
  const widthToCover = numberOf(values, 'width') + 2 * numberOf(values, 'sideOverhang')
  const slopeToCover = numberOf(values, 'slopeLength') + numberOf(values, 'eaveOverhang')
  const gain = sheetLength - endLap
  const across = roundUp(widthToCover / coverWidth)
  const rows = Math.max(1, roundUp((slopeToCover - endLap) / gain))
  const pitch = optionalNumber(values, 'pitch')
  return {
    sheets: across * rows,
    across,
    rows,
    cutLength: slopeToCover - (rows - 1) * gain,
    coveredWidth: across * coverWidth,
    lapsHold: pitch === undefined ? undefined : judgeLaps(Math.tan(pitch), endLap, rows),
  }
}

const length = (
  name: string,
  [label, help]: [string, string],
  [metric, imperial]: [string, string],
  [min, max]: [number, number],
): QuantityInput => ({
  name,
  label,
  quantity: 'length',
  help,
  initial: { metric, imperial },
  min,
  max,
})

/**
 * Corrugated roofing in whole sheets, lengths in m: across = (width + 2 × side overhang) ÷ cover, rows = (slope + eave − lap) ÷ (sheet − lap),
 * both up; the rows below stay whole, the top row is cut to what is left with its lap.
 * 4.2 m wide with 75 mm at the sides, sheets that cover 760 mm: 6 across. 4.9 m of slope with 60 mm at the eave, 2 m sheets, 200 mm lap: 3 rows, the top one cut to 1.36 m.
 */
export const sheets: Calculator = {
  id: 'sheets',
  version: 1,
  title: 'Corrugated sheets: how many, cut how long',
  question: 'How many sheets, with all the laps counted?',
  help: 'A sheet is wider and longer than what it covers, because each lies over the next. Count by area and the roof comes out a row short, on the day the shop is shut. The flatter the roof, the longer the lap must be, or wind drives the rain up under it.',
  inputs: [
    length('width', ['Width of the roof', 'Along the eave.'], ['2600', `8' 6"`], [0.3, 30]),
    length(
      'slopeLength',
      ['Length of the slope', 'From ridge to eave along the rafter, not level.'],
      ['1400', `4' 6"`],
      [0.3, 15],
    ),
    length(
      'coverWidth',
      ['One sheet covers', 'Its width less the lap at the side; the maker says it.'],
      ['760', '24'],
      [0.3, 1.25],
    ),
    length('sheetLength', ['Length of a sheet', 'As you buy it.'], ['1800', `6'`], [0.5, 12]),
    length(
      'sideOverhang',
      ['Overhang at each side', 'Past the wood, left and right.'],
      ['50', '2'],
      [0, 0.3],
    ),
    length(
      'eaveOverhang',
      ['Overhang at the eave', 'So that drips fall clear of the wood.'],
      ['50', '2'],
      [0, 0.3],
    ),
    length(
      'endLap',
      ['End lap', 'Where one row lies over the row below.'],
      ['200', '8'],
      [0.05, 0.6],
    ),
    {
      name: 'pitch',
      label: 'Slope of the roof',
      quantity: 'angle',
      help: 'Degrees, or a rise such as 4/12. Empty: the laps are not judged.',
      optional: true,
      initial: { metric: '15', imperial: '4/12' },
      min: 0.005,
      max: 1.4,
    },
  ],
  outputs: [
    { name: 'sheets', label: 'Sheets to buy', quantity: 'count' },
    { name: 'across', label: 'Sheets across', quantity: 'count' },
    { name: 'rows', label: 'Rows up the slope', quantity: 'count' },
    { name: 'cutLength', label: 'Sheets of the top row cut to', quantity: 'length' },
    { name: 'coveredWidth', label: 'Width the sheets cover', quantity: 'length' },
    lapsOutput,
  ],
  compute,
  steps: sheetsSteps,
  slips: sheetsSlips,
  cautions: [
    {
      title: 'What the roof must carry',
      text: 'Snow, wind, battens and how the sheets are fixed follow the local code and the maker’s sheet, and come before any figure here. Ask the building department and, where it is required, a licensed engineer.',
    },
    {
      title: 'Off the ground',
      text: 'Tie the ladder, one foot out for every four up, and work from it or from a platform, never alone. Step over the battens, never between them, and never on a wet sheet.',
    },
    {
      title: 'Sharp and flying',
      text: 'Edges cut like a knife: gloves, long sleeves, eye protection. A sheet is a sail, so carry none in wind, and fix each before you fetch the next.',
    },
  ],
  sources: [
    {
      title: 'University of Florida extension, pole building plan',
      detail: 'cover 24 in, rows up to whole, end lap at least 8 in, 2 in over the eave',
      kind: 'published',
    },
    {
      title: 'International Building Code 2012, 1507.4.2',
      detail: 'lapped metal: 3 in 12 without sealant, 1/2 in 12 with; as quoted',
      kind: 'published',
    },
    {
      title: 'FAO, Farm Structures in Tropical Climates (1986), Table 5.10',
      detail: 'asks for less lap than is used here',
      kind: 'published',
    },
    { title: 'End lap of 6 in from 4 in 12 on, 8 in below', kind: 'from memory' },
  ],
  example: {
    inputs: {
      width: '4200 mm',
      slopeLength: '4900 mm',
      coverWidth: '760 mm',
      sheetLength: '2000 mm',
      sideOverhang: '75 mm',
      eaveOverhang: '60 mm',
      endLap: '200 mm',
      pitch: '15 deg',
    },
    outputs: {
      sheets: 18,
      across: 6,
      rows: 3,
      cutLength: 1.36,
      coveredWidth: 4.56,
      lapsHold: 'yes',
    },
  },
}
