import type { UnitSystem } from '../../../shared/contracts/exercises'
import { rowOf, type CutListTable, type TypedCutList } from './cutListTyped'

type Texts = Record<CutListTable, string[][]> & { kerf: string; endTrim: string }

/** Posts, rails and slats of a log store 2.4 m wide, as they are sold and measured in each system. */
const logStore: Record<UnitSystem, Texts> = {
  metric: {
    parts: [
      ['Front post', '1500', '3', '89×89'],
      ['Back post', '1750', '3', '89×89'],
      ['Long rail', '2390', '4', '38×89'],
      ['Rafter', '1190', '5', '38×89'],
      ['Side rail', '890', '6', '38×89'],
      ['Back slat', '2390', '8', '19×140'],
      ['Side slat', '895', '16', '19×140'],
    ],
    stock: [
      ['89×89', '2400'],
      ['89×89', '3600'],
      ['38×89', '3600'],
      ['38×89', '4800'],
      ['19×140', '2400'],
      ['19×140', '3600'],
    ],
    kerf: '3',
    endTrim: '10',
  },
  imperial: {
    parts: [
      ['Front post', "5'", '3', '4x4'],
      ['Back post', `5' 10"`, '3', '4x4'],
      ['Long rail', `7' 11-1/2"`, '4', '2x4'],
      ['Rafter', `3' 11-1/2"`, '5', '2x4'],
      ['Side rail', `2' 11-1/2"`, '6', '2x4'],
      ['Back slat', `7' 11-1/2"`, '8', '1x6'],
      ['Side slat', `2' 11-3/4"`, '16', '1x6'],
    ],
    stock: [
      ['4x4', "8'"],
      ['4x4', "12'"],
      ['2x4', "12'"],
      ['2x4', "16'"],
      ['1x6', "8'"],
      ['1x6', "12'"],
    ],
    kerf: '1/8',
    endTrim: '1/2',
  },
}

/** The list a visitor starts from, round in their system. */
export function initialCutList(system: UnitSystem): TypedCutList {
  const { parts, stock, kerf, endTrim } = logStore[system]
  const rows = (table: CutListTable, texts: string[][]) =>
    texts.map((row, at) => rowOf(table, `${table}-${at}`, row, system))
  return {
    parts: rows('parts', parts),
    stock: rows('stock', stock),
    kerf: { text: kerf, system },
    endTrim: { text: endTrim, system },
  }
}
