import { formatQuantity } from '../../../shared/units/format'
import {
  figureOf,
  lengthFigure,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing, type Point } from './drawing'

interface AngleCut {
  width: number
  angle: number
  long: number
  offset: number
}

/** The piece in pixels: its square end on the left, its long point at the top right. */
interface Piece {
  left: number
  top: number
  base: number
  long: number
  short: number
  isBroken: boolean
  notes: string[]
}

function readCut({ values, outputs }: CalculatorSheetInput): AngleCut | null {
  const [width, angle, long] = ['boardWidth', 'angle', 'longPoint'].map((name) =>
    readPositive(values, name),
  )
  if (!width || !angle || !long || angle >= Math.PI / 2) return null
  const offset = readPositive(outputs, 'offset') ?? width * Math.tan(angle)
  return offset < long ? { width, angle, long, offset } : null
}

/** The slanting end true to its angle; a long piece is cut short behind it. */
function layOutPiece(cut: AngleCut, narrow: boolean): Piece {
  const room = narrow
    ? { left: 108, width: 132, height: 64, slant: 84 }
    : { left: 140, width: 400, height: 110, slant: 260 }
  const slope = Math.tan(cut.angle)
  const height = Math.max(40, Math.min(room.height, room.slant / slope))
  const slant = Math.min(height * slope, room.slant)
  const scale = height / cut.width
  const wanted = cut.long * scale
  const least = slant + 44
  const long = Math.max(least, Math.min(room.width, wanted))
  const top = narrow ? 56 : 64
  return {
    left: room.left,
    top,
    base: top + height,
    long: room.left + long,
    short: room.left + long - Math.max(4, slant),
    isBroken: wanted > room.width + 1,
    notes: [
      slant < height * slope - 1 || slant < 4 ? 'cut not drawn to its angle' : '',
      wanted > room.width + 1 ? 'piece cut short; its end is to scale' : '',
      wanted < least - 1 ? 'piece drawn longer than it is' : '',
    ].filter(Boolean),
  }
}

const down = (points: readonly Point[]): Point[] => points.map(([x, y]) => [x, -y])

function drawPiece(drawing: Drawing, piece: Piece, { angle }: AngleCut): void {
  const { left, top, base, long, short, isBroken } = piece
  drawing.coloured(() =>
    drawing.polygon(
      down([
        [left, top],
        [long, top],
        [short, base],
        [left, base],
      ]),
      'p3 m-timber',
    ),
  )
  for (const share of [0.34, 0.68]) {
    const y = top + (base - top) * share
    const end = long - (long - short) * share - 14
    if (end > left + 20) drawing.stroke(left + 12, y, end, y, 'grain')
  }
  if (isBroken) drawGap(drawing, left + (short - left) * 0.3, top, base)
  drawing.stroke(long, top, long, base + 4, 'p1 dash')
  const radius = Math.min(36, (base - top) * 0.7)
  const lean = Math.atan2(long - short, base - top)
  const from = `${String(long)} ${String(top + radius)}`
  const to = `${String(long - radius * Math.sin(lean))} ${String(top + radius * Math.cos(lean))}`
  if (angle > 0)
    drawing.path(`M${from}A${String(radius)} ${String(radius)} 0 0 1 ${to}`, 'chalkline')
}

/** A gap in the board: two broken edges with the sheet between them. */
function drawGap(drawing: Drawing, x: number, top: number, base: number): void {
  const middle = (top + base) / 2
  const edge = (at: number) =>
    `M${String(at)} ${String(top - 5)}L${String(at)} ${String(middle - 8)}l-6 5 12 6-6 5L${String(at)} ${String(base + 5)}`
  drawing.rect(x, -base - 3, 9, base - top + 6, 'dimbg')
  drawing.path(edge(x), 'p1b nofill')
  drawing.path(edge(x + 9), 'p1b nofill')
}

/** Draws a piece with its slanting end, and the lengths to both of its points. */
export function drawAngleCutSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const cut = readCut(input)
  if (!cut) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const piece = layOutPiece(cut, narrow)
  const { left, top, base, long, short } = piece
  drawPiece(drawing, piece, cut)
  const figure = (name: string, metres: number): Figure => lengthFigure(input, name, metres)
  const [width, whole] = [figure('boardWidth', cut.width), figure('longPoint', cut.long)]
  const offset = figure('offset', cut.offset)
  const rest = figure('shortPoint', cut.long - cut.offset)
  const degrees = figureOf(input, 'angle', formatQuantity(cut.angle, 'angle', input.system))
  const step = narrow ? 24 : 30
  dimensionRow(drawing, left, long, top, top - (narrow ? 24 : 32), whole.text, whole)
  dimensionColumn(drawing, top, base, left, left - (narrow ? 22 : 34), width.text, width)
  const row = base + step
  dimensionRow(drawing, short, long, base, row, offset.text, { ...offset, beyond: 'before' })
  const isTold = input.asked !== 'offset'
  if (isTold) dimensionRow(drawing, left, short, base, row + step, rest.text, rest)
  drawing.text(long + 10, top + (narrow ? 24 : 30), degrees.text, 'askt')
  drawing.text(long + 10, top - 2, 'long point', 'vsub')
  const last = row + (isTold ? step : 0) + (narrow ? 28 : 34)
  piece.notes.forEach((note, at) => drawing.text(narrow ? 20 : left, last + at * 17, note, 'vsub'))
  drawing.height = last + piece.notes.length * 17 - 6
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const told = isTold ? `, ${rest.text} to its short point` : ''
  const words = `A board ${width.text}${unit} wide, cut ${degrees.text} off square: ${whole.text} to its long point${told}; the points lie ${offset.text} apart along the board.`
  return { drawing, words }
}
