import { formatDrawnLength } from './figures'
import { drawChip, questionFor } from './ask'
import {
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { drawForm, type FormArea } from './formPlan'

/** Least length of the triangle's long leg on the sheet, so that its figures have room. */
const LEAST_LEG = { wide: 230, narrow: 104 } as const

interface Leg {
  metres: number
  short: string
  long: string
}

interface Triangle {
  short: Leg
  long: Leg
  diagonal: Leg
}

/** A side of the triangle, short and with its working: `1200` and `4 × 300 = 1200`. */
function legFigure(input: CalculatorSheetInput, name: string, times: number, unitM: number): Leg {
  const metres = readPositive(input.outputs, name) ?? times * unitM
  const short = input.asked === name ? '?' : formatDrawnLength(metres, input.system)
  const unit = input.asked === 'unit' ? '?' : formatDrawnLength(unitM, input.system)
  return { metres, short, long: `${times} × ${unit} = ${short}` }
}

function readTriangle(input: CalculatorSheetInput): Triangle | null {
  const unitM = readPositive(input.outputs, 'unit') ?? readPositive(input.values, 'unit')
  if (!unitM) return null
  return {
    short: legFigure(input, 'legShort', 3, unitM),
    long: legFigure(input, 'legLong', 4, unitM),
    diagonal: legFigure(input, 'diagonal', 5, unitM),
  }
}

/** The working where it fits along so many pixels, else the length alone. */
function chooseText(drawing: Drawing, leg: Leg, room: number): string {
  return drawing.textWidth(leg.long) + 16 < room ? leg.long : leg.short
}

/** Places the form so that its corner is to scale; a long form is cut short at a break. */
function layOutForm(
  drawing: Drawing,
  input: CalculatorSheetInput,
  [longM, shortM]: readonly [number, number],
  triangle: Triangle | null,
  up: Figure,
): FormArea {
  const upright =
    16 + Math.max(...[triangle?.short.short ?? '', up.text].map((text) => drawing.textWidth(text)))
  const least = Math.max(LEAST_LEG[input.size], (upright * 4) / 3)
  const wide = input.size === 'wide'
  const room = wide ? { width: 530, height: 240 } : { width: 238, height: 124 }
  const fitting = Math.min(room.width / longM, room.height / shortM)
  const scale = Math.max(fitting, triangle ? least / triangle.long.metres : 0)
  const width = Math.min(longM * scale, room.width)
  const height = Math.min(shortM * scale, room.height)
  return {
    left: (wide ? 92 : 44) + (room.width - width) / 2,
    top: wide ? 62 : 40,
    width,
    height: Math.max(height, wide ? 60 : 44, upright),
    scale,
    board: wide ? 8 : 4,
    cutAcross: longM * scale > width + 1,
    cutUp: shortM * scale > height + 1,
  }
}

function drawTriangle(drawing: Drawing, form: FormArea, triangle: Triangle, wide: boolean): void {
  const { left, board } = form
  const base = form.top + form.height
  const long = triangle.long.metres * form.scale
  const short = triangle.short.metres * form.scale
  drawing.polygon(
    [
      [left, -base],
      [left + long, -base],
      [left, -base + short],
    ],
    'tri',
  )
  drawing.path(`M${left + 16} ${base}v-16h-16`, 'chalkline')
  for (const style of ['tapeline', 'tapeline2'])
    drawing.stroke(left, base - short, left + long, base, style)
  drawing.path(`M${left + long - 6} ${base - 15}L${left + long} ${base}l6-15`, 'crow')
  drawing.path(`M${left - 15} ${base - short - 6}L${left} ${base - short}l-15 6`, 'crow')
  const row = base + board + (wide ? 26 : 20)
  const column = left - board - (wide ? 26 : 18)
  const along = chooseText(drawing, triangle.long, long)
  const up = chooseText(drawing, triangle.short, short)
  dimensionRow(drawing, left, left + long, base + board, row, along, { chalk: true })
  dimensionColumn(drawing, base - short, base, left - board, column, up, { chalk: true })
  const degrees = (Math.atan2(short, long) * 180) / Math.PI
  const off = wide ? 28 : 24
  const lean = (degrees * Math.PI) / 180
  const px = left + long / 2 + Math.sin(lean) * off
  const py = base - short / 2 - Math.cos(lean) * off
  drawChip(
    drawing,
    px,
    py,
    chooseText(drawing, triangle.diagonal, Math.hypot(long, short) - 60),
    degrees,
  )
}

/** Draws the form in plan with a 3-4-5 triangle set off from its near left corner. */
export function drawSquareSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const sideA = readPositive(input.values, 'sideA')
  const sideB = readPositive(input.values, 'sideB')
  if (!sideA || !sideB) return null
  const wide = input.size === 'wide'
  const [longName, shortName] = sideA >= sideB ? ['sideA', 'sideB'] : ['sideB', 'sideA']
  const [longM, shortM] = [Math.max(sideA, sideB), Math.min(sideA, sideB)]
  const triangle = readTriangle(input)
  const drawing = new Drawing(wide ? 720 : 326, 0, undefined, wide ? 14 : 12)
  const across = sideText(input, longName, longM)
  const up = sideText(input, shortName, shortM)
  const form = layOutForm(drawing, input, [longM, shortM], triangle, up)
  const isCut = form.cutAcross || form.cutUp
  const question = questionFor(input.asked)
  const base = form.top + form.height + form.board
  const height = base + (wide ? 46 : 38) + (isCut ? 22 : 0) + (question ? 22 : 0)
  drawing.height = height
  drawForm(drawing, form)
  if (triangle) drawTriangle(drawing, form, triangle, wide)
  const right = form.left + form.width
  const above = form.top - form.board - (wide ? 28 : 20)
  const column = right + form.board + (wide ? 34 : 20)
  dimensionRow(drawing, form.left, right, form.top - form.board, above, across.text, across)
  const below = form.top + form.height
  dimensionColumn(drawing, form.top, below, right + form.board, column, up.text, up)
  if (question) drawing.text(form.left, height - 8, question, 'askt')
  const row = height - (question ? 30 : 8)
  if (isCut) drawing.text(form.left, row, 'form cut short; the corner is to scale', 'vsub')
  return { drawing, words: describe(input, across, up, triangle) }
}

function sideText(input: CalculatorSheetInput, name: string, metres: number): Figure {
  const chalk = input.asked === name
  return { text: chalk ? '?' : formatDrawnLength(metres, input.system), chalk }
}

function describe(
  input: CalculatorSheetInput,
  across: Figure,
  up: Figure,
  triangle: Triangle | null,
): string {
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const form = `Plan of the form, ${across.text} by ${up.text}${unit}`
  if (!triangle) return `${form}.`
  const tape =
    input.asked === 'diagonal'
      ? 'what the tape reads is asked'
      : `the tape reads ${triangle.diagonal.short}`
  return `${form}, with a 3-4-5 triangle off the near left corner: ${triangle.short.short} up the short board, ${triangle.long.short} along the long board, ${tape}.`
}
