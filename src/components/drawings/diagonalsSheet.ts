import { questionFor } from './ask'
import {
  lengthFigure,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing, type Point } from './drawing'

interface Diagonals {
  lengthM: number
  widthM: number
  first: number
  second: number
  isSquare: boolean
}

interface Corners {
  /** A side had to be drawn larger than scale to be seen. */
  isStretched: boolean
  a: Point
  b: Point
  c: Point
  d: Point
}

function readDiagonals({ values, outputs }: CalculatorSheetInput): Diagonals | null {
  const lengthM = readPositive(values, 'length')
  const widthM = readPositive(values, 'width')
  const first = readPositive(values, 'diagonal1')
  const second = readPositive(values, 'diagonal2')
  if (!lengthM || !widthM || !first || !second) return null
  const verdict = outputs?.square
  return { lengthM, widthM, first, second, isSquare: verdict === true || verdict === 'yes' }
}

/** The corners, clockwise from the back left; the lean is drawn so large that it is seen. */
function placeCorners(shape: Diagonals, narrow: boolean, least: number): Corners {
  const room = narrow ? { width: 196, height: 116 } : { width: 470, height: 230 }
  const scale = Math.min(room.width / shape.lengthM, room.height / shape.widthM)
  const width = Math.max(narrow ? 120 : 200, shape.lengthM * scale)
  const height = Math.max(least, shape.widthM * scale)
  const isStretched = width > shape.lengthM * scale + 1 || height > shape.widthM * scale + 1
  const size = narrow ? 12 : 22
  const lean =
    shape.isSquare || shape.first === shape.second ? 0 : shape.first > shape.second ? -size : size
  const left = (narrow ? 74 : 124) + (room.width - width) / 2
  const top = narrow ? 52 : 70
  const bottom = top + height
  return {
    isStretched,
    a: [left + lean, top],
    b: [left + width + lean, top],
    c: [left + width, bottom],
    d: [left, bottom],
  }
}

function drawOutline(drawing: Drawing, { a, b, c, d }: Corners, isSquare: boolean): void {
  const down = ([x, y]: Point): Point => [x, -y]
  drawing.coloured(() => drawing.polygon([a, b, c, d].map(down), 'p3 m-sheet'))
  if (!isSquare) {
    const upright: Point[] = [[d[0], a[1]], [c[0], b[1]], c, d]
    drawing.polygon(upright.map(down), 'p1 dash nofill')
  }
  drawing.stroke(a[0], a[1], c[0], c[1], 'chalkline')
  drawing.stroke(b[0], b[1], d[0], d[1], 'chalkline')
  drawing.text(a[0] - 8, a[1] - 4, 'A', 'sectt', 'end')
  drawing.text(b[0] + 8, b[1] - 4, 'B', 'sectt')
  drawing.text(c[0] + 8, c[1] + 14, 'C', 'sectt')
  drawing.text(d[0] - 8, d[1] + 14, 'D', 'sectt', 'end')
}

/** A note of two words a line: what, and how much. */
function captionLines(
  input: CalculatorSheetInput,
  shape: Diagonals,
): { text: string; style: string }[] {
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres).text
  const lines = [
    { text: `A to C ${figure('diagonal1', shape.first)}`, style: 'askt' },
    { text: `B to D ${figure('diagonal2', shape.second)}`, style: 'askt' },
  ]
  const move = readPositive(input.outputs, 'moveBy')
  if (input.outputs === null) return lines
  const question = questionFor(input.asked)
  if (question) return [...lines, { text: question, style: 'askt' }]
  if (shape.isSquare) {
    const apart = figure('difference', Math.abs(shape.first - shape.second))
    return [...lines, { text: `${apart} apart: square enough`, style: 'okt' }]
  }
  if (move === undefined) return lines
  const side = shape.first > shape.second ? 'B' : 'A'
  const by = figure('moveBy', move)
  return [...lines, { text: `move A and B ${by} toward ${side}`, style: 'slipt' }]
}

function describeScale(isStretched: boolean, isLeaning: boolean): string {
  if (isStretched) return 'not to scale'
  return isLeaning ? 'lean drawn larger than it is' : ''
}

/** The arrow along the back that shows which way it goes. */
function drawMove(drawing: Drawing, { a, b }: Corners, toLeft: boolean): void {
  const [from, to] = toLeft ? [b[0] - 14, b[0] - 60] : [a[0] + 14, a[0] + 60]
  const y = a[1] + 12
  const head = toLeft ? 8 : -8
  drawing.path(`M${from} ${y}H${to}M${to + head} ${y - 5}L${to} ${y}l${head} 5`, 'slipline')
}

/** Draws a rectangle by its corners with both diagonals, and which way its far side must go. */
export function drawDiagonalsSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const shape = readDiagonals(input)
  if (!shape) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const length = lengthFigure(input, 'length', shape.lengthM)
  const width = lengthFigure(input, 'width', shape.widthM)
  const upright = drawing.textWidth(width.text) + 16
  const corners = placeCorners(shape, narrow, Math.max(narrow ? 60 : 90, upright))
  const { a, b, c, d } = corners
  drawOutline(drawing, corners, shape.isSquare)
  if (input.outputs && !shape.isSquare && shape.first !== shape.second)
    drawMove(drawing, corners, shape.first < shape.second)
  dimensionRow(drawing, a[0], b[0], a[1] - 8, a[1] - (narrow ? 28 : 36), length.text, length)
  const left = Math.min(a[0], d[0]) - (narrow ? 30 : 48)
  dimensionColumn(drawing, a[1], d[1], Math.min(a[0], d[0]) - 18, left, width.text, width)
  const lines = captionLines(input, shape)
  const first = c[1] + (narrow ? 38 : 46)
  const longest = Math.max(...lines.map(({ text }) => drawing.textWidth(text)))
  const start = Math.max(10, Math.min(a[0], d[0], drawing.width - longest - 10))
  lines.forEach(({ text, style }, index) => drawing.text(start, first + index * 20, text, style))
  const isLeaning = !shape.isSquare && shape.first !== shape.second
  const note = describeScale(corners.isStretched, isLeaning)
  const row = first + lines.length * 20
  if (note) drawing.text(start, row, note, 'vsub')
  drawing.height = row + (note ? 14 : -6)
  return { drawing, words: describe(input, length, width, lines) }
}

function describe(
  input: CalculatorSheetInput,
  length: Figure,
  width: Figure,
  lines: { text: string }[],
): string {
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const notes = lines.map(({ text }) => text).join(', ')
  return `Rectangle ${length.text} by ${width.text}${unit} with both diagonals: ${notes}.`
}
