import type { UnitSystem } from '../../../shared/contracts/exercises'
import type { CutGroup, CutRun } from './cutListGroups'
import { fitText, formatCutLength } from './cutListFigures'
import type { Drawing } from './drawing'
import { tenth } from './marks'

/** The saw, and what it takes off first. */
export interface Saw {
  kerfMm: number
  endTrimMm: number
}

/** Where a bar lies on the sheet, in pixels. */
export interface BarPlace {
  left: number
  top: number
  height: number
  /** Pixels a millimetre takes. */
  scale: number
}

/** A piece of the bar in pixels. */
interface Piece {
  run: CutRun
  left: number
  right: number
}

/** Narrower than this, in pixels, a saw cut could not be seen. */
const LEAST_GAP = 2.5
/** A narrower piece gives nothing of itself for a wider gap. */
const LEAST_PIECE = 12
/** How far the mark of a cut stands out over the bar. */
const MARK = 6
const HATCH = 7

function layOutPieces({ runs }: CutGroup, { kerfMm, endTrimMm }: Saw, { left, scale }: BarPlace) {
  let mm = endTrimMm
  return runs.flatMap((run) =>
    Array.from({ length: run.count }, (): Piece => {
      const from = mm
      mm += run.lengthMm + kerfMm
      return { run, left: left + from * scale, right: left + (from + run.lengthMm) * scale }
    }),
  )
}

/** Slanting lines over what is not used. */
function drawHatch(drawing: Drawing, left: number, right: number, { top, height }: BarPlace) {
  if (right - left < 1) return
  const base = top + height
  let d = ''
  for (let foot = left - height + HATCH; foot < right; foot += HATCH) {
    const from = Math.max(foot, left)
    const to = Math.min(foot + height, right)
    d += `M${tenth(from)} ${tenth(base - (from - foot))}L${tenth(to)} ${tenth(base - (to - foot))}`
  }
  const shape = { x: tenth(left), y: tenth(top), width: tenth(right - left), height }
  drawing.add({ tag: 'rect', attributes: { ...shape, class: 'p2 m-void' } })
  drawing.path(d, 'p1 nofill')
}

function drawPiece(drawing: Drawing, piece: Piece, place: BarPlace, gapPx: number, first: boolean) {
  const isWide = piece.right - piece.left > LEAST_PIECE
  const give = isWide ? Math.max(0, LEAST_GAP - gapPx) / 2 : 0
  const left = piece.left + (first ? 0 : give)
  const shape = { x: tenth(left), y: place.top, height: place.height }
  const width = tenth(Math.max(0.5, piece.right - give - left))
  drawing.add({ tag: 'rect', attributes: { ...shape, width, class: 'p2 m-timber' } })
}

/** The marks of a cut over and under the bar, in the middle of its gap. */
function drawCut(drawing: Drawing, px: number, { top, height }: BarPlace) {
  drawing.stroke(px, top - MARK, px, top - 1, 'p2')
  drawing.stroke(px, top + height + 1, px, top + height + MARK, 'p2')
}

function letterPiece(drawing: Drawing, piece: Piece, place: BarPlace, system: UnitSystem): boolean {
  const length = formatCutLength(piece.run.lengthMm, system)
  const full = `${length} ${piece.run.label}`
  const room = piece.right - piece.left - 10
  const text = [full, length].find((way) => drawing.textWidth(way) <= room)
  const middle = (piece.left + piece.right) / 2
  const base = place.top + place.height / 2 + drawing.figure * 0.36
  if (text) drawing.group({ class: 'dim' }, () => drawing.text(middle, base, text, 'tx', 'middle'))
  return text === full
}

function letterOffcut(
  drawing: Drawing,
  left: number,
  right: number,
  place: BarPlace,
  text: string,
) {
  const width = drawing.textWidth(text) + 8
  if (right - left < width + 8) return
  const middle = (left + right) / 2
  const base = place.top + place.height / 2
  const ground = {
    x: tenth(middle - width / 2),
    y: tenth(base - 10),
    width: tenth(width),
    height: 20,
  }
  drawing.add({ tag: 'rect', attributes: { ...ground, class: 'dimbg' } })
  drawing.group({ class: 'dim' }, () =>
    drawing.text(middle, base + drawing.figure * 0.36, text, 'tx', 'middle'),
  )
}

/**
 * Draws a bar cut into its pieces: saw cuts as gaps with a mark over and under them, end trim and offcut hatched.
 * Returns whether every piece has room for its length and its name.
 */
export function drawCutBar(
  drawing: Drawing,
  group: CutGroup,
  place: BarPlace,
  saw: Saw,
  system: UnitSystem,
): boolean {
  const pieces = layOutPieces(group, saw, place)
  const end = place.left + group.stockMm * place.scale
  const gapPx = saw.kerfMm * place.scale
  const offcutFrom = end - group.offcutMm * place.scale
  if (saw.endTrimMm > 0) {
    drawHatch(drawing, place.left, place.left + saw.endTrimMm * place.scale, place)
  }
  if (group.offcutMm > 0) drawHatch(drawing, offcutFrom, end, place)
  drawing.coloured(() =>
    pieces.forEach((piece, at) => drawPiece(drawing, piece, place, gapPx, at === 0)),
  )
  // A piece that ends with the bar needs no cut; where less than a kerf is left, all of it turns to dust.
  const cuts = pieces.filter(({ right }) => right < end - 0.01)
  for (const { right } of cuts) drawCut(drawing, right + Math.min(gapPx, end - right) / 2, place)
  const offcut = formatCutLength(group.offcutMm, system)
  if (group.offcutMm > 0) letterOffcut(drawing, offcutFrom, end, place, offcut)
  return pieces.map((piece) => letterPiece(drawing, piece, place, system)).every(Boolean)
}

/** The pieces of a bar from its left end, in words, such as `4 × 895 slat`. */
export function namePieces({ runs }: CutGroup, system: UnitSystem): string[] {
  return runs.map(({ count, lengthMm, label }) => {
    const piece = `${formatCutLength(lengthMm, system)} ${label}`
    return count === 1 ? piece : `${count} × ${piece}`
  })
}

/** The heading of a bar: how many are cut alike, and from which length. */
export const headBar = (
  drawing: Drawing,
  { bars, stockMm }: CutGroup,
  system: UnitSystem,
  room: number,
) => fitText(drawing, `${bars} × ${formatCutLength(stockMm, system)}`, room)
