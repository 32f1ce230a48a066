import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { lapsOutput, leastEndLap } from './sheetsLaps'
import { numberOf, optionalNumber, stepWriter } from './values'

/** The worked solution of `sheets`. */
export function sheetsSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const output = (name: string) => writer.number(numberOf(outputs, name))
  return [
    ...acrossSteps(values, outputs, system),
    ...rowSteps(values, outputs, system),
    {
      label: 'Sheets to buy',
      formula: 'across × rows',
      numbers: `${output('across')} × ${output('rows')}`,
      result: output('sheets'),
      output: 'sheets',
    },
    ...lapSteps(values, outputs, system),
  ]
}

function acrossSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const length = (name: string) => writer.length(numberOf(values, name))
  const toCover = numberOf(values, 'width') + 2 * numberOf(values, 'sideOverhang')
  const cover = numberOf(values, 'coverWidth')
  const across = writer.number(numberOf(outputs, 'across'))
  return [
    {
      label: 'Width to cover',
      formula: 'width + 2 × overhang at the side',
      numbers: `${length('width')} + 2 × ${length('sideOverhang')}`,
      result: writer.length(toCover),
    },
    {
      label: 'Across, up to whole sheets',
      formula: 'width to cover ÷ what one sheet covers',
      numbers: `${writer.length(toCover)} ÷ ${length('coverWidth')} = ${writer.number(toCover / cover)}`,
      result: across,
      output: 'across',
    },
    {
      label: 'Width they cover',
      formula: 'across × what one sheet covers',
      numbers: `${across} × ${length('coverWidth')}`,
      result: writer.length(numberOf(outputs, 'coveredWidth')),
      output: 'coveredWidth',
    },
  ]
}

function rowSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const [sheet, lap] = ['sheetLength', 'endLap'].map((name) => numberOf(values, name)) as [
    number,
    number,
  ]
  const toCover = numberOf(values, 'slopeLength') + numberOf(values, 'eaveOverhang')
  const rows = numberOf(outputs, 'rows')
  const below = `${writer.number(rows - 1)} × (${writer.length(sheet)} − ${writer.length(lap)})`
  return [
    {
      label: 'Slope to cover',
      formula: 'slope + overhang at the eave',
      numbers: `${writer.length(numberOf(values, 'slopeLength'))} + ${writer.length(numberOf(values, 'eaveOverhang'))}`,
      result: writer.length(toCover),
    },
    {
      label: 'Rows, up to whole ones',
      formula: '(slope to cover − end lap) ÷ (sheet − end lap), at least one',
      numbers: `(${writer.length(toCover)} − ${writer.length(lap)}) ÷ (${writer.length(sheet)} − ${writer.length(lap)}) = ${writer.number((toCover - lap) / (sheet - lap))}`,
      result: writer.number(rows),
      output: 'rows',
    },
    {
      label: rows > 1 ? 'Top row cut to' : 'Sheets cut to',
      formula: rows > 1 ? 'slope to cover − rows below × (sheet − end lap)' : 'slope to cover',
      numbers: rows > 1 ? `${writer.length(toCover)} − ${below}` : 'one row',
      result: writer.length(numberOf(outputs, 'cutLength')),
      output: 'cutLength',
    },
  ]
}

function lapSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const pitch = optionalNumber(values, 'pitch')
  const verdict = lapsOutput.choices?.find(({ value }) => value === outputs['lapsHold'])
  if (pitch === undefined || !verdict) return []
  const writer = stepWriter(system)
  const slope = Math.tan(pitch)
  const least = writer.length(system === 'metric' ? leastEndLap(slope) : inInches(slope))
  return [
    {
      label: 'Laps at this slope',
      formula: `end lap at least ${least} here; sealant below 3 in 12`,
      numbers: `${writer.length(numberOf(values, 'endLap'))} at ${writer.number(slope * 12)} in 12`,
      result: verdict.label,
      output: 'lapsHold',
    },
  ]
}

/** The same least lap as it is said in inches: 6 or 8. */
const inInches = (slope: number) => (leastEndLap(slope) > 0.16 ? 8 : 6) * 0.0254
