import { computed, shallowRef } from 'vue'
import { homeLimits } from '../../../shared/cutlist/cutRequest'
import { useAccountsStore } from '../../stores/accounts'
import { initialCutList } from './cutListInitial'
import { readCutList } from './cutListReading'
import {
  cellOf,
  isShownRounded,
  rowOf,
  showTyped,
  type CutListSetting,
  type CutListTable,
  type TypedCutList,
} from './cutListTyped'

/** As many lines as a table holds. */
export const mostRows: Record<CutListTable, number> = {
  parts: homeLimits.parts,
  stock: homeLimits.stockLengths,
}

/**
 * Both tables and the saw, each cell kept as it was typed and shown converted in the other system until it is typed
 * anew; read on every stroke.
 */
export function useCutListInputs(given: TypedCutList | null) {
  const accounts = useAccountsStore()
  const typed = shallowRef(given)
  const list = computed(() => typed.value ?? initialCutList(accounts.units))
  const reading = computed(() => readCutList(list.value, accounts.units))
  const isRounded = computed(() => isShownRounded(list.value, accounts.units))
  let added = 0

  function write(table: CutListTable, id: string, column: string, text: string) {
    const cell = { text, system: accounts.units }
    const rows = list.value[table].map((row) =>
      row.id === id ? { ...row, cells: { ...row.cells, [column]: cell } } : row,
    )
    typed.value = { ...list.value, [table]: rows }
  }
  function setting(name: CutListSetting) {
    return computed({
      get: () => showTyped(list.value[name], 'length', accounts.units),
      set: (text: string) =>
        (typed.value = { ...list.value, [name]: { text, system: accounts.units } }),
    })
  }
  /** Adds a line at the end, of the section of the last one; its id. */
  function addRow(table: CutListTable): string {
    const rows = list.value[table]
    const last = rows.at(-1)
    const section = last ? showTyped(cellOf(last, 'section'), 'section', accounts.units) : ''
    const texts = table === 'parts' ? ['', '', '1', section] : [section]
    const row = rowOf(table, `${table}-added-${++added}`, texts, accounts.units)
    typed.value = { ...list.value, [table]: [...rows, row] }
    return row.id
  }
  function takeOut(table: CutListTable, id: string) {
    typed.value = { ...list.value, [table]: list.value[table].filter((row) => row.id !== id) }
  }
  /** Back to the list a visitor starts from. */
  function startAgain() {
    typed.value = null
  }
  /** Leaves one empty line in each table, for a list of one's own; the saw stays. */
  function clear() {
    const empty = (table: CutListTable) => [
      rowOf(
        table,
        `${table}-added-${++added}`,
        table === 'parts' ? ['', '', '1'] : [],
        accounts.units,
      ),
    ]
    typed.value = { ...list.value, parts: empty('parts'), stock: empty('stock') }
  }
  return {
    typed,
    list,
    reading,
    isRounded,
    write,
    setting,
    addRow,
    takeOut,
    startAgain,
    clear,
  }
}

export type CutListInputs = ReturnType<typeof useCutListInputs>
