import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
import { parseQuantity } from '../../../shared/units/parse'
import { siteUnit } from '../../../shared/units/unit'
import { sectionOf, showSection } from './cutListSections'
import { withoutUnit } from './typedTexts'

/** What was typed, and the system a bare number of it belongs to. */
export interface Typed {
  text: string
  system: UnitSystem
}

export type TypedKind = 'words' | 'section' | 'length' | 'count' | 'money'

export interface CutListColumn {
  name: string
  label: string
  kind: TypedKind
  isOptional?: boolean
}

/** One line of a table: what was typed in each column. */
export interface CutListRow {
  id: string
  cells: Readonly<Record<string, Typed>>
}

export type CutListTable = 'parts' | 'stock'
export type CutListSetting = 'kerf' | 'endTrim'

/** Everything that was typed. */
export interface TypedCutList
  extends Record<CutListTable, readonly CutListRow[]>, Record<CutListSetting, Typed> {}

export const cutListColumns: Record<CutListTable, readonly CutListColumn[]> = {
  parts: [
    { name: 'label', label: 'Part', kind: 'words' },
    { name: 'length', label: 'Length', kind: 'length' },
    { name: 'count', label: 'How many', kind: 'count' },
    { name: 'section', label: 'Section', kind: 'section' },
  ],
  stock: [
    { name: 'section', label: 'Section', kind: 'section' },
    { name: 'length', label: 'Length', kind: 'length' },
    { name: 'price', label: 'Price each', kind: 'money', isOptional: true },
    { name: 'available', label: 'You have', kind: 'count', isOptional: true },
  ],
}

/** Longest text of a cell; a part's name is short, so that it can stand on the piece. */
export const longestText = 30

const nothing: Typed = { text: '', system: 'metric' }
export const cellOf = (row: CutListRow, column: string): Typed => row.cells[column] ?? nothing

/** What was typed as it reads in a system: as typed in its own, converted in the other. */
export function showTyped({ text, system }: Typed, kind: TypedKind, to: UnitSystem): string {
  if (system === to) return text
  if (kind === 'section') {
    const section = sectionOf(text, system)
    const shown = showSection(section, to)
    return shown === section && section === sectionOf(text, to) ? text : shown
  }
  if (kind !== 'length') return text
  const read = parseQuantity(text, 'length', { system })
  if (!read.ok) return text
  return withoutUnit(formatQuantity(read.value, 'length', to), siteUnit('length', to))
}

/** A line that has only been added: it asks for nothing yet. */
export function isUntouched(row: CutListRow, table: CutListTable): boolean {
  const telling = table === 'parts' ? ['label', 'length'] : ['length', 'price', 'available']
  return telling.every((name) => cellOf(row, name).text.trim() === '')
}

/** The finest a list is shown to, in metres: a tenth of a millimetre, a sixteenth of an inch. */
const finest: Record<UnitSystem, number> = { metric: 0.0001, imperial: 0.0254 / 16 }

function isRounded(typed: Typed, to: UnitSystem): boolean {
  if (typed.text.trim() === '') return false
  if (typed.system !== to) return true
  const read = parseQuantity(typed.text, 'length', { system: typed.system })
  const steps = read.ok ? read.value / finest[to] : 0
  return Math.abs(steps - Math.round(steps)) > 1e-6
}

/** Whether any length is shown rounded: converted, or typed finer than it is shown. */
export function isShownRounded({ parts, stock, kerf, endTrim }: TypedCutList, system: UnitSystem) {
  const lengths = [...parts, ...stock].map((row) => cellOf(row, 'length'))
  return [...lengths, kerf, endTrim].some((typed) => isRounded(typed, system))
}

/** Builds a row from texts in the order of its columns. */
export function rowOf(
  table: CutListTable,
  id: string,
  texts: readonly string[],
  system: UnitSystem,
): CutListRow {
  const cells = cutListColumns[table].map(({ name }, at) => [
    name,
    { text: texts[at] ?? '', system },
  ])
  return { id, cells: Object.fromEntries(cells) as Record<string, Typed> }
}
