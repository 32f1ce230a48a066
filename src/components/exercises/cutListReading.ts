import type { UnitSystem } from '../../../shared/contracts/exercises'
import {
  homeLimits,
  longestMm,
  shortestMm,
  widestKerfMm,
  type CutPart,
  type CutRequest,
  type CutStock,
} from '../../../shared/cutlist/cutRequest'
import { formatQuantity } from '../../../shared/units/format'
import { parseQuantity } from '../../../shared/units/parse'
import { checkSections, type ReadPart, type ReadStock } from './cutListChecks'
import { sectionOf } from './cutListSections'
import { cellOf, isUntouched, type CutListRow, type Typed, type TypedCutList } from './cutListTyped'

/** What is wrong, in a sentence each, by `row id.column`, `kerf`, `endTrim`, `parts` or `stock`. */
export type CutListErrors = Record<string, string>

/** A list as it can be solved, or what is wrong with it. */
export interface CutListReading {
  request: CutRequest | null
  errors: CutListErrors
}

/** Dearer than any bar, in hundredths. */
const dearest = 10_000_000
/** More bars than any garden job has at hand. */
const mostBars = 10_000
/** Less than a step of the solver. */
const hairMm = 1e-6

/** Reads cells one by one and notes what is wrong where. */
class Reader {
  readonly errors: CutListErrors = {}
  constructor(readonly system: UnitSystem) {}

  say(mm: number): string {
    return formatQuantity(mm / 1000, 'length', this.system)
  }

  lengthMm(typed: Typed, key: string, least: number, most: number): number | undefined {
    const read = parseQuantity(typed.text, 'length', { system: typed.system })
    if (!read.ok) return this.refuse(key, read.message)
    const mm = read.value * 1000
    if (mm >= least - hairMm && mm <= most + hairMm) return Math.max(0, mm)
    return this.refuse(key, `Give a length from ${this.say(least)} to ${this.say(most)}.`)
  }

  whole(typed: Typed, key: string, least: number, most: number): number | undefined {
    const read = parseQuantity(typed.text, 'count', { system: typed.system })
    if (!read.ok) return this.refuse(key, read.message)
    if (Number.isInteger(read.value) && read.value >= least && read.value <= most) return read.value
    return this.refuse(key, `Give a whole number from ${least} to ${most}.`)
  }

  cents(typed: Typed, key: string): number | undefined {
    const read = parseQuantity(typed.text, 'money', { system: typed.system })
    if (!read.ok) return this.refuse(key, read.message)
    const cents = Math.round(read.value)
    if (cents >= 0 && cents <= dearest) return cents
    return this.refuse(key, 'Give a price from 0 to 100 000; 0 for a bar you have.')
  }

  refuse(key: string, sentence: string): undefined {
    this.errors[key] = sentence
    return undefined
  }
}

function readPart(reader: Reader, row: CutListRow, at: number): ReadPart | [] {
  const key = (column: string) => `${row.id}.${column}`
  const lengthMm = reader.lengthMm(cellOf(row, 'length'), key('length'), shortestMm, longestMm)
  const count = reader.whole(cellOf(row, 'count'), key('count'), 1, homeLimits.pieces)
  const section = cellOf(row, 'section')
  if (lengthMm === undefined || count === undefined) return []
  const label = cellOf(row, 'label').text.trim() || `Part ${at + 1}`
  return { id: row.id, label, lengthMm, count, section: sectionOf(section.text, section.system) }
}

function readStock(reader: Reader, row: CutListRow): ReadStock | [] {
  const key = (column: string) => `${row.id}.${column}`
  const lengthMm = reader.lengthMm(cellOf(row, 'length'), key('length'), shortestMm, longestMm)
  const given = (column: string) => cellOf(row, column).text.trim() !== ''
  const price = given('price') ? reader.cents(cellOf(row, 'price'), key('price')) : undefined
  const available = given('available')
    ? reader.whole(cellOf(row, 'available'), key('available'), 0, mostBars)
    : undefined
  if (lengthMm === undefined) return []
  const section = cellOf(row, 'section')
  return {
    id: row.id,
    lengthMm,
    section: sectionOf(section.text, section.system),
    ...(price === undefined ? {} : { price }),
    ...(available === undefined ? {} : { available }),
  }
}

const asPart = ({ label, lengthMm, count, section }: ReadPart): CutPart => ({
  ...{ label, lengthMm, count, section },
})
function asStock({ id: _id, ...stock }: ReadStock): CutStock {
  return stock
}

function checkAmounts(reader: Reader, parts: readonly ReadPart[], rows: number, stock: number) {
  const pieces = parts.reduce((sum, { count }) => sum + count, 0)
  const most = `a list holds up to ${homeLimits.pieces}`
  if (rows === 0) reader.refuse('parts', 'List at least one part to cut.')
  if (stock === 0) reader.refuse('stock', 'List at least one length that you can buy or have.')
  if (pieces > homeLimits.pieces) {
    reader.refuse('parts', `There are ${pieces} pieces in all; ${most}.`)
  }
}

/** Reads everything that was typed; sentences name lengths in this system. */
export function readCutList(list: TypedCutList, system: UnitSystem): CutListReading {
  const reader = new Reader(system)
  const partRows = list.parts.filter((row) => !isUntouched(row, 'parts'))
  const stockRows = list.stock.filter((row) => !isUntouched(row, 'stock'))
  const parts = partRows.flatMap((row, at) => readPart(reader, row, at))
  const stock = stockRows.flatMap((row) => readStock(reader, row))
  const kerfMm = reader.lengthMm(list.kerf, 'kerf', 0, widestKerfMm)
  const endTrimMm = reader.lengthMm(list.endTrim, 'endTrim', 0, longestMm)
  checkAmounts(reader, parts, partRows.length, stockRows.length)
  if (stock.length === stockRows.length && stock.length > 0 && endTrimMm !== undefined) {
    const between = checkSections({ parts, stock, endTrimMm, system })
    for (const [key, sentence] of Object.entries(between)) reader.errors[key] ??= sentence
  }
  const isRight = Object.keys(reader.errors).length === 0
  if (!isRight || kerfMm === undefined || endTrimMm === undefined) {
    return { request: null, errors: reader.errors }
  }
  const request = { parts: parts.map(asPart), stock: stock.map(asStock), kerfMm, endTrimMm }
  return { request, errors: {} }
}
