import { homeLimits } from '../../../shared/cutlist/cutRequest'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import { parseQuantity } from '../../../shared/units/parse'
import { siteUnit } from '../../../shared/units/unit'
import {
  cellOf,
  cutListColumns,
  longestText,
  rowOf,
  showTyped,
  type CutListColumn,
  type CutListTable,
  type Typed,
  type TypedCutList,
} from './cutListTyped'

/** What stands between rows and between cells; in a text they are written as spaces. */
const [BETWEEN_ROWS, BETWEEN_CELLS] = ['~', '*'] as const
const rowsAtMost: Record<CutListTable, number> = {
  parts: homeLimits.parts,
  stock: homeLimits.stockLengths,
}

/** As typed, with its unit where that is not the unit of the link: 35 of a list in millimetres is `35 in`. */
function carried(typed: Typed, kind: CutListColumn['kind'], system: UnitSystem): string {
  const { text } = typed
  if (typed.system === system) return text
  if (kind === 'section') return showTyped(typed, kind, system)
  if (kind !== 'length') return text
  const read = parseQuantity(text, 'length', { system: typed.system })
  return read.ok && read.bare ? `${text.trim()} ${siteUnit('length', typed.system)}` : text
}

const safe = (text: string) => text.replace(/[~*]/g, ' ').slice(0, longestText)

function writeRows(list: TypedCutList, table: CutListTable, system: UnitSystem): string {
  const rows = list[table].slice(0, rowsAtMost[table]).map((row) =>
    cutListColumns[table]
      .map(({ name, kind }) => safe(carried(cellOf(row, name), kind, system)))
      .join(BETWEEN_CELLS)
      .replace(/\*+$/, ''),
  )
  return rows.join(BETWEEN_ROWS)
}

/** The query of a link that opens the page with this list; none for the list it starts with anyway. */
export function writeCutListLink(
  list: TypedCutList | null,
  system: UnitSystem,
): Record<string, string> {
  if (!list) return {}
  return {
    units: system,
    parts: writeRows(list, 'parts', system),
    stock: writeRows(list, 'stock', system),
    kerf: safe(carried(list.kerf, 'length', system)),
    trim: safe(carried(list.endTrim, 'length', system)),
  }
}

function readRows(text: string, table: CutListTable, system: UnitSystem) {
  const most = rowsAtMost[table]
  const rows = text.split(BETWEEN_ROWS, most).map((row) => row.split(BETWEEN_CELLS))
  return rows.map((cells, at) => {
    const texts = cells.map((cell) => cell.slice(0, longestText))
    return rowOf(table, `${table}-${at}`, texts, system)
  })
}

/** The list a link carries, at most as long as a list may be; null for a link without one. */
export function readCutListLink(query: Readonly<Record<string, unknown>>): TypedCutList | null {
  const textOf = (name: string) => {
    const text = query[name]
    return typeof text === 'string' ? text : ''
  }
  const [parts, stock] = [textOf('parts'), textOf('stock')]
  if (parts === '' && stock === '') return null
  const system = query['units'] === 'imperial' ? 'imperial' : 'metric'
  const setting = (name: string): Typed => ({ text: textOf(name).slice(0, longestText), system })
  return {
    parts: readRows(parts, 'parts', system),
    stock: readRows(stock, 'stock', system),
    kerf: setting('kerf'),
    endTrim: setting('trim'),
  }
}
