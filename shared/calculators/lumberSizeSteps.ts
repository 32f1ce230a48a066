import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { countedThickness, INCH, readNominal } from './lumberSizeTables'
import { numberOf, optionalNumber, stepWriter, wordOf } from './values'

const state = (values: Values) => (wordOf(values, 'moisture') === 'green' ? 'green' : 'dry')

/** The worked solution of `lumber-size`. */
export function lumberSizeSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const nominal = readNominal(wordOf(values, 'nominal'))
  const shown = (inches: number) => `${writer.number(inches)} in`
  const lost = (named: number, name: string) =>
    writer.number(named - numberOf(outputs, name) / INCH, 5)
  return [
    {
      label: 'Thickness',
      formula: 'table: the named size less what drying and planing take',
      numbers: `${shown(nominal.thickness)} ${state(values)}, − ${lost(nominal.thickness, 'thickness')}`,
      result: writer.length(numberOf(outputs, 'thickness')),
      output: 'thickness',
    },
    {
      label: 'Width',
      formula: 'table: the named size less what drying and planing take',
      numbers: `${shown(nominal.width)} ${state(values)}, − ${lost(nominal.width, 'width')}`,
      result: writer.length(numberOf(outputs, 'width')),
      output: 'width',
    },
    ...boardFeetStep(values, outputs, writer),
    ...shortfallStep(values, outputs, writer),
  ]
}

type Writer = ReturnType<typeof stepWriter>

function boardFeetStep(values: Values, outputs: Values, writer: Writer): Step[] {
  const length = optionalNumber(values, 'length')
  if (length === undefined) return []
  const nominal = readNominal(wordOf(values, 'nominal'))
  const counted = writer.number(countedThickness(nominal))
  const feet = writer.number(length / (12 * INCH), 3)
  return [
    {
      label: 'Board feet',
      formula: 'named thickness × named width × length in feet ÷ 12',
      numbers: `${counted} × ${writer.number(nominal.width)} × ${feet} ÷ 12`,
      result: writer.number(numberOf(outputs, 'boardFeet')),
      output: 'boardFeet',
    },
  ]
}

function shortfallStep(values: Values, outputs: Values, writer: Writer): Step[] {
  const measured = optionalNumber(values, 'measuredWidth')
  if (measured === undefined) return []
  return [
    {
      label: 'Your board is narrower by',
      formula: 'width − your board',
      numbers: `${writer.plain(numberOf(outputs, 'width'))} − ${writer.plain(measured)}`,
      result: writer.length(numberOf(outputs, 'shortfall')),
      output: 'shortfall',
    },
  ]
}
