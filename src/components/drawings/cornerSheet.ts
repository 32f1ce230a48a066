import { formatQuantity } from '../../../shared/units/format'
import { drawChip, questionFor } from './ask'
import {
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionRow } from './dimensions'
import { Drawing, type Point } from './drawing'
import { dimensionAlong } from './rafterDimension'

const DEGREE = Math.PI / 180
/** A lean smaller than this is drawn this large, so that it is seen. */
const LEAST_LEAN = 5 * DEGREE
/** Corners beyond these are drawn at them: both legs would lie on each other. */
const [NARROWEST, WIDEST] = [40 * DEGREE, 140 * DEGREE]

interface Corner {
  angle: number
  error: number
  a: number
  b: number
}

/** The corner on the sheet, in pixels: where it lies, the marks on its legs, and what is not to scale. */
interface Place {
  at: Point
  a: Point
  b: Point
  /** Where the end of leg B would lie if the corner were square. */
  square: Point
  notes: string[]
}

function readCorner({ values, outputs }: CalculatorSheetInput): Corner | null {
  const a = readPositive(values, 'legA')
  const b = readPositive(values, 'legB')
  const d = readPositive(values, 'diagonal')
  if (!a || !b || !d) return null
  const angle =
    readPositive(outputs, 'angle') ?? Math.acos((a ** 2 + b ** 2 - d ** 2) / (2 * a * b))
  if (!(angle > 0 && angle < Math.PI)) return null
  return { angle, error: angle - Math.PI / 2, a, b }
}

/** The corner as it is drawn: a small lean is drawn larger, a folded corner less folded. */
function drawnAngle({ error }: Corner): { angle: number; note: string } {
  const isSquare = Math.abs(error) < 1e-6
  if (!isSquare && Math.abs(error) < LEAST_LEAN) {
    const angle = Math.PI / 2 + Math.sign(error) * LEAST_LEAN
    return { angle, note: 'lean drawn larger than it is' }
  }
  const angle = Math.min(WIDEST, Math.max(NARROWEST, Math.PI / 2 + error))
  const isTrue = Math.abs(angle - Math.PI / 2 - error) < 1e-9
  return { angle, note: isTrue ? '' : 'corner not drawn to its angle' }
}

/** Lays the corner out; no leg gets shorter than its figure. */
function placeCorner(corner: Corner, narrow: boolean, lettering: number): Place {
  const { angle, note } = drawnAngle(corner)
  const room = narrow ? { width: 190, height: 150, leg: 70 } : { width: 400, height: 230, leg: 110 }
  const least = Math.max(room.leg, lettering + 16)
  const lean = Math.cos(angle)
  const right = Math.max(corner.a, corner.b * lean)
  const left = Math.min(0, corner.b * lean)
  const scale = Math.min(
    room.width / (right - left),
    room.height / (corner.b * Math.max(Math.sin(angle), 0.6)),
  )
  const a = Math.max(least, corner.a * scale)
  const b = Math.max(least, corner.b * scale)
  const isStretched = a > corner.a * scale + 1 || b > corner.b * scale + 1
  const width = Math.max(a, b * lean) - Math.min(0, b * lean)
  const x = (narrow ? 68 : 160) + (room.width - width) / 2 - Math.min(0, b * lean)
  const y = (narrow ? 38 : 44) + Math.max(b, b * Math.sin(angle))
  return {
    at: [x, y],
    a: [x + a, y],
    b: [x + b * lean, y - b * Math.sin(angle)],
    square: [x, y - b],
    notes: [note, isStretched ? 'short leg drawn longer than it is' : ''].filter(Boolean),
  }
}

const down = ([x, y]: Point): Point => [x, -y]

/** A form board along a leg, on the side away from the corner's inside. */
function board(drawing: Drawing, from: Point, to: Point, thick: number): void {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1])
  const [nx, ny] = [(to[1] - from[1]) / length, -(to[0] - from[0]) / length]
  const off = ([x, y]: Point): Point => [x + nx * thick, y + ny * thick]
  drawing.polygon([from, to, off(to), off(from)].map(down), 'p2 m-timber')
}

function drawLegs(drawing: Drawing, place: Place, narrow: boolean): void {
  const { at, a, b, square } = place
  const thick = narrow ? 6 : 10
  drawing.polygon([at, a, b].map(down), 'tri')
  drawing.coloured(() => {
    board(drawing, at, a, -thick)
    board(drawing, at, b, thick)
  })
  drawing.stroke(at[0], at[1], square[0], square[1], 'p1 dash')
  drawing.path(`M${at[0] + 14} ${at[1]}v-14h-14`, 'p1 nofill')
  for (const style of ['tapeline', 'tapeline2']) drawing.stroke(a[0], a[1], b[0], b[1], style)
}

/** The arrow from where the end of leg B lies to where it belongs. */
function drawSwing(drawing: Drawing, { b, square }: Place, isTold: boolean): void {
  if (!isTold || Math.abs(b[0] - square[0]) < 8) return
  const way = Math.sign(square[0] - b[0])
  const y = Math.min(b[1], square[1]) - 10
  drawing.path(
    `M${b[0]} ${y}H${square[0]}M${square[0] - way * 7} ${y - 4.5}L${square[0]} ${y}l${-way * 7} 4.5`,
    'slipline nofill',
  )
}

/** What the corner is and what to do, a line each; nothing that follows from what is asked. */
function captions(input: CalculatorSheetInput, { error }: Corner): [string, string][] {
  const { asked, outputs, system } = input
  if (outputs === null) return []
  const isSquare = outputs.square === 'yes'
  const degrees = (value: number) => formatQuantity(value, 'angle', system)
  if (asked === 'angle') return [['corner ?°', 'askt']]
  const corner: [string, string] = [`corner ${degrees(readNumber(outputs, 'angle'))}`, 'vtitle']
  if (asked === 'error') return [corner, ['? out of square', 'askt']]
  const out = `${degrees(Math.abs(error))} too ${error > 0 ? 'wide' : 'narrow'}`
  const state: [string, string] = [out, isSquare ? 'tx' : 'slipt']
  if (asked === 'move') return [corner, state, ['which way does the end of B swing?', 'askt']]
  if (asked === 'square') return [corner, state, [questionFor(asked) ?? '', 'askt']]
  const by = lengthFigure(input, 'offsetAtLegB', readNumber(outputs, 'offsetAtLegB'))
  const end = `the end of B ${by.text}`
  if (by.chalk) return [corner, state, [`swing ${end}`, 'askt']]
  if (isSquare) return [corner, [`square: ${end} off`, 'okt']]
  return [corner, state, [`swing ${end} ${error > 0 ? 'toward A' : 'away from A'}`, 'slipt']]
}

function letterLegs(
  drawing: Drawing,
  input: CalculatorSheetInput,
  place: Place,
  [legA, legB, tape]: readonly [Figure, Figure, Figure],
): void {
  const { at, a, b } = place
  const narrow = input.size === 'narrow'
  dimensionRow(drawing, at[0], a[0], at[1] + 8, at[1] + (narrow ? 26 : 34), legA.text, legA)
  dimensionAlong(drawing, at, b, narrow ? 26 : 36, legB.text, legB)
  drawing.text(a[0] + 10, a[1] + 4, 'A', 'sectt')
  drawing.text(b[0] + (b[0] > at[0] + 20 ? 10 : -4), b[1] - 20, 'B', 'sectt')
  drawTape(drawing, place, tape.text)
}

/** The tape's figure on the tape; beyond it where corner and tape lie close together. */
function drawTape(drawing: Drawing, { at, a, b }: Place, text: string): void {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]]
  const length = Math.hypot(dx, dy)
  const depth = Math.abs(dx * (at[1] - a[1]) - dy * (at[0] - a[0])) / length
  const off = Math.min(40, Math.max(0, 64 - depth))
  const degrees = (Math.atan2(dy, dx) * 180) / Math.PI
  const px = (a[0] + b[0]) / 2 - (dy / length) * off
  const py = (a[1] + b[1]) / 2 + (dx / length) * off
  drawChip(drawing, px, py, text, degrees < -90 ? degrees + 180 : degrees)
}

/** Draws a corner in plan with the tape across it, and which way the end of leg B must swing. */
export function drawCornerSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const corner = readCorner(input)
  if (!corner) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const figures = [
    lengthFigure(input, 'legA', corner.a),
    lengthFigure(input, 'legB', corner.b),
    lengthFigure(input, 'diagonal', readNumber(input.values, 'diagonal')),
  ] as const
  const lettering = Math.max(...figures.map(({ text }) => drawing.textWidth(text)))
  const place = placeCorner(corner, narrow, lettering)
  drawLegs(drawing, place, narrow)
  const isTold = !['angle', 'move', 'square'].includes(input.asked ?? '')
  drawSwing(drawing, place, isTold && input.outputs?.square === 'no')
  letterLegs(drawing, input, place, figures)
  const lines = captions(input, corner)
  const start = Math.min(place.at[0], narrow ? 20 : 160)
  const first = place.at[1] + (narrow ? 58 : 70)
  lines.forEach(([text, style], index) => drawing.text(start, first + index * 20, text, style))
  const notes = narrow ? place.notes : [place.notes.join('; ')].filter(Boolean)
  const row = first + lines.length * 20
  notes.forEach((note, index) => drawing.text(start, row + index * 17, note, 'vsub'))
  drawing.height = row + notes.length * 17 - 4
  return { drawing, words: describe(input, figures, lines) }
}

function describe(
  { system }: CalculatorSheetInput,
  [legA, legB, tape]: readonly [Figure, Figure, Figure],
  lines: [string, string][],
): string {
  const unit = system === 'metric' ? ' millimetres' : ''
  const sides = `leg A ${legA.text}, leg B ${legB.text}, ${tape.text}${unit} straight across`
  const said = lines.map(([text]) => text).join(', ')
  return `A corner from above, ${sides}${said ? `: ${said}` : ''}.`
}
