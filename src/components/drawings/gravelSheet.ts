import { formatQuantity } from '../../../shared/units/format'
import {
  figureOf,
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { drawBedPlan, drawBedSection, type Bed } from './gravelBed'

/** A side under this many pixels is drawn at it, and the drawing says so. */
const LEAST_SIDE = 40
/** A reach past the pad of more pixels would push the pad off the sheet. */
const MOST_REACH = 60

interface Figures {
  length: Figure
  width: Figure
  depth: Figure
  overhang: Figure
  loose: Figure
  mass: Figure
}

function readFigures(input: CalculatorSheetInput): Figures | null {
  const { values, outputs, system } = input
  const lengthM = readPositive(values, 'length')
  const widthM = readPositive(values, 'width')
  const depthM = readPositive(values, 'depth')
  const loose = readPositive(outputs, 'looseVolume')
  const mass = readPositive(outputs, 'mass')
  if (!lengthM || !widthM || !depthM || !loose || !mass) return null
  const unit = system === 'metric' ? 'm³' : 'yd³'
  return {
    length: lengthFigure(input, 'length', lengthM),
    width: lengthFigure(input, 'width', widthM),
    depth: lengthFigure(input, 'depth', depthM),
    overhang: lengthFigure(input, 'overhang', readNumber(values, 'overhang')),
    loose: figureOf(input, 'looseVolume', formatQuantity(loose, 'volume', system, { unit })),
    mass: figureOf(input, 'mass', formatQuantity(mass, 'mass', system)),
  }
}

/** One scale for the base with its reach, within the room that the figures leave. */
function layOut(drawing: Drawing, input: CalculatorSheetInput, figures: Figures): Bed {
  const narrow = input.size === 'narrow'
  const overhang = readNumber(input.values, 'overhang')
  const [lengthM, widthM] = [readNumber(input.values, 'length'), readNumber(input.values, 'width')]
  const from = drawing.textWidth(figures.width.text) + (narrow ? 36 : 60)
  const right = drawing.textWidth(figures.depth.text) + (narrow ? 48 : 80)
  const room = { width: drawing.width - from - right, height: narrow ? 120 : 190 }
  const scale = Math.min(
    room.width / (lengthM + 2 * overhang),
    room.height / (widthM + 2 * overhang),
  )
  const reach = Math.min(MOST_REACH, overhang * scale)
  const least = LEAST_SIDE - 2 * Math.min(reach, 12)
  const pad = { width: Math.max(least, lengthM * scale), height: Math.max(least, widthM * scale) }
  const isStretched = lengthM * scale < least || widthM * scale < least
  const outer = pad.width + 2 * reach
  const left = from + (room.width - outer) / 2
  return { narrow, left, top: narrow ? 46 : 58, ...pad, reach, scale, isStretched }
}

/** Draws a base of stone in plan and in section under the pad it carries. */
export function drawGravelSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const figures = readFigures(input)
  if (!figures) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const bed = layOut(drawing, input, figures)
  drawBedPlan(drawing, bed)
  const off = narrow ? 18 : 26
  const { left, top, reach } = bed
  const outer = { right: left + bed.width + 2 * reach, bottom: top + bed.height + 2 * reach }
  const pad = { left: left + reach, top: top + reach }
  dimensionRow(drawing, pad.left, pad.left + bed.width, top, top - off, figures.length.text)
  dimensionColumn(drawing, pad.top, pad.top + bed.height, left, left - off, figures.width.text, {
    level: true,
  })
  if (reach > 0)
    dimensionRow(drawing, left, pad.left, outer.bottom, outer.bottom + off, figures.overhang.text)
  const row = outer.bottom + off + (narrow ? 28 : 36)
  drawing.text(narrow ? 10 : 24, row, 'Plan', 'vtitle')
  const note = bed.isStretched ? 'pad dashed; a side drawn larger than scale' : 'pad dashed'
  drawing.text((narrow ? 22 : 36) + drawing.textWidth('Plan'), row, note, 'vsub')
  const depth = { metres: readNumber(input.values, 'depth'), ...figures.depth }
  const base = drawBedSection(drawing, bed, depth, row + (narrow ? 34 : 40))
  drawOrder(drawing, figures, base + 30)
  drawing.height = base + 42
  return { drawing, words: describe(input, figures) }
}

/** What to order, in chalk where it is asked. */
function drawOrder(drawing: Drawing, { loose, mass }: Figures, row: number): void {
  const parts = [
    { text: `loose: ${loose.text}`, chalk: loose.chalk },
    { text: `weighs ${mass.text}`, chalk: mass.chalk },
  ]
  const widths = parts.map(({ text }) => drawing.textWidth(text))
  const total = widths.reduce((sum, width) => sum + width, 0) + 28
  let x = (drawing.width - total) / 2
  parts.forEach(({ text, chalk }, index) => {
    drawing.text(x, row, text, chalk ? 'askt' : 'vtitle')
    x += (widths[index] ?? 0) + 28
  })
}

function describe(input: CalculatorSheetInput, figures: Figures): string {
  const unit = input.system === 'metric' ? ' mm' : ''
  const order = ({ text, chalk }: Figure) => (chalk ? 'what is asked' : text)
  const { length, width, depth, overhang, loose, mass } = figures
  return `Base of stone in plan and in section: pad ${length.text} by ${width.text}${unit}, the stone ${overhang.text}${unit} past it on every side and ${depth.text}${unit} deep when tamped. To order loose: ${order(loose)}, weighing ${order(mass)}.`
}

/** A hole with stone under the ground line: how much of it, loose? */
export function drawGravelPicture(drawing: Drawing): void {
  let stones = ''
  for (let index = 0; index < 22; index++) {
    const x = 50 + (index % 11) * 12
    const y = (index < 11 ? 54 : 72) + (index % 2 ? -4 : 2)
    stones += `M${x - 4} ${y + 2.4}L${x} ${y - 3.2}L${x + 4} ${y + 2.4}Z`
  }
  drawing.coloured(() => {
    drawing.rect(40, -80, 140, 40, 'p2 m-stonebed')
    drawing.path(stones, 'p1 m-stone')
  })
  drawing.path('M8 40H40M180 40H212', 'p3')
  drawing.text(110, 104, '? m³', 'ask1', 'middle', 17)
}
