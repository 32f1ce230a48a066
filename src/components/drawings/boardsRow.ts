import type { Drawing } from './drawing'
import { formatDrawnLength } from './figures'
import { tenth } from './marks'
import type { UnitSystem } from '../../../shared/contracts/exercises'

/** Members that stand in a row, in metres: where each begins, how wide it is, and how long the row is. */
export interface Row {
  starts: readonly number[]
  width: number
  /** Width of the last one, where it is ripped. */
  last: number
  total: number
}

/** A member of the row as it is drawn, in pixels. */
export interface Stave {
  left: number
  right: number
}

/** The row on the sheet: the members that are shown, and where it is cut short. */
export interface LaidRow {
  staves: Stave[]
  /** Place of the break, where not all are shown. */
  breakAt?: number
  /** Members are drawn wider than they are, so that they can be seen. */
  isWidened: boolean
}

/** Closer than this, in pixels, members run together. */
const [LEAST_STEP, LEAST_WIDTH] = [15, 7] as const
/** How many are shown before and after a break. */
const [BEFORE, AFTER] = [3, 2] as const

/**
 * Lays a row out from `left` over so many pixels, to scale where each can be seen, else cut short in the middle;
 * a row whose members must not be counted is cut short in any case.
 */
export function layOutRow(row: Row, left: number, room: number, isUncounted = false): LaidRow {
  const { starts, width, last, total } = row
  const scale = room / total
  const step = (starts[1] ?? total) - (starts[0] ?? 0)
  const isTight = step * scale < LEAST_STEP
  const isBroken = starts.length > BEFORE + AFTER && (isTight || isUncounted)
  if (isBroken) return breakRow(row, left, room, step)
  const most = starts.length > 1 ? step * scale - 4 : room
  const drawn = Math.min(Math.max(LEAST_WIDTH, width * scale), Math.max(most, 3))
  const isWidened = drawn > width * scale + 1
  const staves = starts.map((start, at) => {
    const isLast = at === starts.length - 1
    const ripped = isWidened ? (drawn * last) / width : last * scale
    const wide = isLast && last < width ? Math.max(4, ripped) : drawn
    const right = isLast ? Math.min(left + room, left + start * scale + wide) : undefined
    const from = right === undefined ? left + start * scale : right - wide
    return { left: from, right: from + wide }
  })
  return { staves, isWidened }
}

/** The first few from the left and the last few from the right, at one scale. */
function breakRow({ starts, width, last, total }: Row, left: number, room: number, step: number) {
  const scale = room / (BEFORE + AFTER + 1.4) / step
  const wide = Math.min(Math.max(LEAST_WIDTH, width * scale), step * scale - 4)
  const count = starts.length
  const before = starts.slice(0, BEFORE).map((start) => {
    const from = left + start * scale
    return { left: from, right: from + wide }
  })
  const after = starts.slice(count - AFTER).map((start, at) => {
    const isRipped = at === AFTER - 1 && last < width
    const from = left + room - (total - start) * scale
    return { left: from, right: from + (isRipped ? Math.max(4, (wide * last) / width) : wide) }
  })
  const breakAt = ((before.at(-1)?.right ?? left) + (after[0]?.left ?? left + room)) / 2
  return { staves: [...before, ...after], breakAt, isWidened: wide > width * scale + 1 }
}

/** The first marks of a stick and the last one, as many as the sheet has room for; all stand among the results. */
export function describeMarks(
  drawing: Drawing,
  marks: readonly number[],
  system: UnitSystem,
): string {
  const texts = marks.map((mark) => formatDrawnLength(mark, system))
  const short = (first: number) => [...texts.slice(0, first), '…', texts.at(-1) ?? '']
  const ways = texts.length > 4 ? [short(3), short(2), short(1)] : [texts, short(2), short(1)]
  const lines = ways.map((way) => `marks: ${way.join(', ')}`)
  const fitting = lines.find((line) => drawing.textWidth(line) < drawing.width - 60)
  return fitting ?? lines.at(-1) ?? ''
}

/** The two waves that say that something was left out. */
export function drawBreak(drawing: Drawing, x: number, top: number, base: number): void {
  const wave = (at: number) => {
    const step = (base - top) / 4
    return `M${tenth(at)} ${tenth(top)}q-6 ${tenth(step / 2)} 0 ${tenth(step)}t0 ${tenth(step)} 0 ${tenth(step)} 0 ${tenth(step)}`
  }
  drawing.path(wave(x - 4), 'p2 nofill')
  drawing.path(wave(x + 4), 'p2 nofill')
}
