import type { UnitSystem } from '../../../shared/contracts/exercises'
import type { CutPart, CutStock } from '../../../shared/cutlist/cutRequest'
import { formatQuantity } from '../../../shared/units/format'
import { showSection } from './cutListSections'

/** A part or a stock length with the line it was read from. */
export interface ReadPart extends CutPart {
  id: string
}
export interface ReadStock extends CutStock {
  id: string
}

interface ReadSections {
  parts: readonly ReadPart[]
  stock: readonly ReadStock[]
  endTrimMm: number
  system: UnitSystem
}

/** Less than a step of the solver. */
const hairMm = 1e-6

function faultOfPart(part: ReadPart, { stock, endTrimMm, system }: ReadSections) {
  const name = showSection(part.section, system)
  const own = stock.filter(({ section }) => section === part.section)
  if (own.length === 0) {
    const what = name ? `There is no ${name} among the stock.` : 'The stock all has a section.'
    return [
      `${part.id}.section`,
      `${what} Add a length of it, or write the section as it stands there.`,
    ]
  }
  const usable = own.filter(({ available }) => available !== 0)
  const room = Math.max(0, ...usable.map(({ lengthMm }) => lengthMm - endTrimMm))
  if (part.lengthMm <= room + hairMm) return null
  const trim = formatQuantity(endTrimMm / 1000, 'length', system)
  const once = endTrimMm > 0 ? ` once ${trim} is trimmed off its end` : ''
  return [
    `${part.id}.length`,
    `Longer than every ${name ? `${name} ` : ''}bar${once}. Add a longer stock length, or join two pieces where the plan allows it.`,
  ]
}

/** With a price on one length of a section, the others need theirs. */
function faultOfStock(one: ReadStock, { stock, system }: ReadSections) {
  const isAlone = one.price === undefined
  const own = stock.filter(({ section }) => section === one.section)
  if (!isAlone || own.every(({ price }) => price === undefined)) return null
  const name = showSection(one.section, system)
  return [
    `${one.id}.price`,
    `Another ${name ? `${name} ` : ''}length has a price. Give this one its own too, or none of them.`,
  ]
}

/** What is wrong between parts and stock, in a sentence each, by `row id.column`. */
export function checkSections(read: ReadSections): Record<string, string> {
  const faults = [
    ...read.parts.map((part) => faultOfPart(part, read)),
    ...read.stock.map((one) => faultOfStock(one, read)),
  ]
  return Object.fromEntries(faults.filter((fault) => fault !== null)) as Record<string, string>
}
