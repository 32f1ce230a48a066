import {
  figureOf,
  lengthFigure,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { drawJointSection } from './jointsSection'
import { tenth } from './marks'
import { stippleArea } from './stipple'

/** A side under this many pixels is drawn at it, and the drawing says so. */
const LEAST_SIDE = 40

interface Slab {
  narrow: boolean
  lengthM: number
  widthM: number
  length: Figure
  width: Figure
  panelLength: Figure
  panelWidth: Figure
  long: number
  wide: number
  countLong: Figure
  countWide: Figure
  spacing: Figure
}

function readSlab(input: CalculatorSheetInput): Slab | null {
  const lengthM = readPositive(input.values, 'length')
  const widthM = readPositive(input.values, 'width')
  const long = readPositive(input.outputs, 'panelsLong')
  const wide = readPositive(input.outputs, 'panelsWide')
  const spacing = readPositive(input.outputs, 'maxSpacing')
  if (!lengthM || !widthM || !long || !wide || !spacing) return null
  return {
    narrow: input.size === 'narrow',
    lengthM,
    widthM,
    long,
    wide,
    length: lengthFigure(input, 'length', lengthM),
    width: lengthFigure(input, 'width', widthM),
    panelLength: lengthFigure(input, 'panelLength', lengthM / long),
    panelWidth: lengthFigure(input, 'panelWidth', widthM / wide),
    countLong: figureOf(input, 'panelsLong', String(long)),
    countWide: figureOf(input, 'panelsWide', String(wide)),
    spacing: lengthFigure(input, 'maxSpacing', spacing),
  }
}

interface Plan {
  left: number
  top: number
  width: number
  height: number
  stretched: string
}

function layOutPlan(drawing: Drawing, slab: Slab): Plan {
  const { narrow } = slab
  const left = drawing.textWidth(slab.panelWidth.text) + (narrow ? 40 : 62)
  const right = drawing.textWidth(slab.width.text) + (narrow ? 40 : 62)
  const room = { width: drawing.width - left - right, height: narrow ? 130 : 210 }
  const scale = Math.min(room.width / slab.lengthM, room.height / slab.widthM)
  const width = Math.max(LEAST_SIDE, slab.lengthM * scale)
  const height = Math.max(LEAST_SIDE, slab.widthM * scale)
  const stretched =
    slab.widthM * scale < LEAST_SIDE ? 'width' : slab.lengthM * scale < LEAST_SIDE ? 'length' : ''
  return { left: left + (room.width - width) / 2, top: narrow ? 46 : 56, width, height, stretched }
}

/** Joints in chalk; while their number is asked only the first is drawn. */
function drawJoints(drawing: Drawing, slab: Slab, { left, top, width, height }: Plan): void {
  const cuts = (panels: number, figure: Figure) =>
    Array.from({ length: figure.chalk ? Math.min(1, panels - 1) : panels - 1 }, (_, at) => at + 1)
  let d = ''
  for (const at of cuts(slab.long, slab.countLong))
    d += `M${tenth(left + (width * at) / slab.long)} ${top}v${tenth(height)}`
  for (const at of cuts(slab.wide, slab.countWide))
    d += `M${left} ${tenth(top + height - (height * at) / slab.wide)}h${tenth(width)}`
  drawing.path(d, 'chalkline')
}

function drawPlan(drawing: Drawing, slab: Slab, plan: Plan): void {
  const { left, top, width, height } = plan
  const { narrow } = slab
  const bottom = top + height
  drawing.coloured(() => {
    drawing.rect(left, -bottom, width, height, 'p3 m-concrete')
    stippleArea(drawing, { left, top, width, height }, 19)
  })
  drawJoints(drawing, slab, plan)
  const off = narrow ? 18 : 26
  const panel = [width / slab.long, height / slab.wide] as const
  dimensionRow(
    drawing,
    left,
    left + panel[0],
    top,
    top - off,
    slab.panelLength.text,
    slab.panelLength,
  )
  dimensionColumn(drawing, bottom - panel[1], bottom, left, left - off, slab.panelWidth.text, {
    chalk: slab.panelWidth.chalk,
    level: true,
  })
  dimensionRow(drawing, left, left + width, bottom, bottom + off, slab.length.text, slab.length)
  dimensionColumn(drawing, top, bottom, left + width, left + width + off, slab.width.text, {
    chalk: slab.width.chalk,
    level: true,
  })
}

/** What no dimension carries: the panels and the rule; gives the row below. */
function captionPlan(drawing: Drawing, slab: Slab, row: number, stretched: string): number {
  const left = slab.narrow ? 10 : 24
  drawing.text(left, row, 'Plan', 'vtitle')
  const indent = left + drawing.textWidth('Plan') + 12
  const counted = slab.countLong.chalk || slab.countWide.chalk
  const lines: [text: string, style: string][] = [
    [`${slab.countLong.text} × ${slab.countWide.text} panels`, counted ? 'askt' : 'vsub'],
    [`joints at most ${slab.spacing.text} apart`, slab.spacing.chalk ? 'askt' : 'vsub'],
  ]
  if (stretched) lines.push([`${stretched} drawn larger than scale`, 'vsub'])
  lines.forEach(([text, style], index) => drawing.text(indent, row + index * 18, text, style))
  return row + (lines.length - 1) * 18
}

/** Draws a slab in plan with its control joints, and one joint in section. */
export function drawJointsSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const slab = readSlab(input)
  const thicknessM = readPositive(input.values, 'thickness')
  const depthM = readPositive(input.outputs, 'jointDepth')
  if (!slab || !thicknessM || !depthM) return null
  const { narrow } = slab
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const plan = layOutPlan(drawing, slab)
  drawPlan(drawing, slab, plan)
  const row = plan.top + plan.height + (narrow ? 44 : 58)
  const below = captionPlan(drawing, slab, row, plan.stretched)
  const thickness = lengthFigure(input, 'thickness', thicknessM)
  const depth = lengthFigure(input, 'jointDepth', depthM)
  const section = { narrow, depthShare: depthM / thicknessM, thickness, depth }
  drawing.height = drawJointSection(drawing, section, below + (narrow ? 32 : 38))
  return { drawing, words: describe(input, slab, thickness, depth) }
}

function describe(
  input: CalculatorSheetInput,
  slab: Slab,
  thickness: Figure,
  depth: Figure,
): string {
  const unit = input.system === 'metric' ? ' mm' : ''
  const say = ({ text, chalk }: Figure) => (chalk ? 'what is asked' : `${text}${unit}`)
  const count = ({ text, chalk }: Figure) => (chalk ? 'what is asked' : text)
  return `Plan of a slab, length ${say(slab.length)}, width ${say(slab.width)}, with its control joints: panels along the length ${count(slab.countLong)}, across the width ${count(slab.countWide)}, one panel ${say(slab.panelLength)} long and ${say(slab.panelWidth)} wide, joints at most ${say(slab.spacing)} apart. Section of a joint: thickness ${say(thickness)}, cut ${say(depth)} deep.`
}

/** A slab with its cuts: how far apart? */
export function drawJointsPicture(drawing: Drawing): void {
  drawing.coloured(() => drawing.rect(20, -84, 180, 62, 'p3 m-concrete'))
  drawing.path('M80 22V84M140 22V84', 'chalkline')
  dimensionRow(drawing, 20, 80, 84, 102, '?', { chalk: true })
}
