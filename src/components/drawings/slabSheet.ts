import { formatQuantity } from '../../../shared/units/format'
import { questionFor } from './ask'
import {
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { formatDrawnLength } from './figures'
import { drawSlabSection, type SlabSection } from './slabSection'
import { stippleArea } from './stipple'

/** A side under this many pixels is drawn at it, and the drawing says so. */
const LEAST_SIDE = 40

interface Slab {
  input: CalculatorSheetInput
  length: Figure
  width: Figure
  lengthM: number
  widthM: number
  /** Drop over run. */
  fall: number
}

interface Plan {
  left: number
  top: number
  width: number
  height: number
  /** Which side is drawn larger than scale. */
  stretched: string
}

/** One scale for both sides, within the room that the figures leave. */
function layOutPlan(slab: Slab, drawing: Drawing): Plan {
  const narrow = slab.input.size === 'narrow'
  const left = drawing.textWidth(slab.width.text) + (narrow ? 34 : 56)
  const room = { width: drawing.width - left - (narrow ? 18 : 70), height: narrow ? 120 : 220 }
  const figure = drawing.textWidth(slab.length.text) + 14
  // A length too short for its figure has it beside the plan, and leaves it room there.
  const beside = drawing.width - left - figure
  const fitting = Math.min(room.width / slab.lengthM, room.height / slab.widthM)
  const isShort = slab.lengthM * fitting <= figure
  const scale = isShort ? Math.min(fitting, beside / slab.lengthM) : fitting
  const width = Math.max(LEAST_SIDE, slab.lengthM * scale)
  const height = Math.max(LEAST_SIDE, slab.widthM * scale)
  const stretched =
    slab.widthM * scale < LEAST_SIDE ? 'Width' : slab.lengthM * scale < LEAST_SIDE ? 'Length' : ''
  const middle = (room.width - width) / 2
  const from = left + (isShort ? Math.min(middle, beside - width) : middle)
  return { left: from, top: narrow ? 50 : 70, width, height, stretched }
}

function drawPlan(drawing: Drawing, slab: Slab, plan: Plan): void {
  const narrow = slab.input.size === 'narrow'
  const board = narrow ? 4 : 8
  const { left, top, width, height } = plan
  drawing.coloured(() => {
    const outer = [left - board, -top - height - board] as const
    drawing.rect(...outer, width + 2 * board, height + 2 * board, 'p1b m-timber')
    drawing.rect(left, -top - height, width, height, 'p3 m-concrete')
    stippleArea(drawing, { left, top, width, height }, 17)
  })
  const row = top - board - (narrow ? 24 : 34)
  const column = left - board - (narrow ? 16 : 28)
  dimensionRow(
    drawing,
    left,
    left + width,
    top - board - (narrow ? 10 : 14),
    row,
    slab.length.text,
    {
      chalk: slab.length.chalk,
    },
  )
  dimensionColumn(drawing, top, top + height, left - board, column, slab.width.text, {
    chalk: slab.width.chalk,
  })
  const cut = left + width * 0.82
  drawSectionMark(drawing, cut, top - board, -1, narrow)
  drawSectionMark(drawing, cut, top + height + board, 1, narrow)
}

function drawSectionMark(
  drawing: Drawing,
  px: number,
  py: number,
  away: 1 | -1,
  narrow: boolean,
): void {
  drawing.path(`M${px} ${py + away * 3}v${away * (narrow ? 11 : 14)}h-10`, 'sect nofill')
  drawing.text(px + 6, py + away * (narrow ? 9 : 12) + 4, 'A', 'sectt')
}

/** The arrow of the fall; gives true where its words found room beside it. */
function drawFall(drawing: Drawing, plan: Plan, words: string): boolean {
  const x = plan.left + plan.width * 0.32
  const from = plan.top + plan.height * 0.14
  const to = plan.top + plan.height * 0.86
  drawing.path(`M${x} ${from}V${to - 8}`, 'fall')
  drawing.path(`M${x - 5} ${to - 11}L${x} ${to}L${x + 5} ${to - 11}Z`, 'fillchalk')
  const width = drawing.textWidth(words) + 8
  if (plan.width * 0.64 < width + 12 || plan.height < 56) return false
  const middle = plan.top + plan.height / 2
  drawing.rect(x + 8, -middle - 11, width, 22, 'onconcrete')
  drawing.text(x + 13, middle + 5, words, 'fallt')
  return true
}

/** Writes what could not stand inside the plan, a line each; gives the row below. */
function captionPlan(drawing: Drawing, row: number, notes: string[], narrow: boolean): number {
  const left = narrow ? 10 : 24
  drawing.text(left, row, 'Plan', 'vtitle')
  const indent = left + drawing.textWidth('Plan') + 12
  const lines = narrow ? notes : notes.length ? [notes.join('. ')] : []
  lines.forEach((note, index) => drawing.text(indent, row + index * 17, note, 'vsub'))
  return row + Math.max(0, lines.length - 1) * 17
}

function sectionOf(slab: Slab, thicknessM: number, dropM: number): SlabSection {
  const { input } = slab
  const flat = input.values.flatBase
  return {
    narrow: input.size === 'narrow',
    runM: slab.widthM,
    thicknessM,
    dropM,
    isBaseLevel: flat === true || flat === 'yes',
    run: slab.width,
    thickness: lengthFigure(input, 'thickness', thicknessM),
    drop: lengthFigure(input, 'drop', dropM),
    backThickness: formatDrawnLength(thicknessM + dropM, input.system),
    stone: formatDrawnLength(input.system === 'imperial' ? 0.1016 : 0.1, input.system),
    question: questionFor(input.asked),
  }
}

/** Draws a slab in plan and in section from its length, width, thickness and fall. */
export function drawSlabSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const lengthM = readPositive(input.values, 'length')
  const widthM = readPositive(input.values, 'width')
  const thicknessM = readPositive(input.values, 'thickness')
  const fall = readNumber(input.values, 'fall')
  if (!lengthM || !widthM || !thicknessM || fall < 0 || fall >= 1) return null
  const length = lengthFigure(input, 'length', lengthM)
  const width = lengthFigure(input, 'width', widthM)
  const slab: Slab = { input, length, width, lengthM, widthM, fall }
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const plan = layOutPlan(slab, drawing)
  drawPlan(drawing, slab, plan)
  const unit = input.system === 'imperial' ? 'in/ft' : 'mm/m'
  const slope = formatQuantity(fall, 'ratio', input.system, { unit }).replace(
    /\/(m|ft)$/,
    ' per $1',
  )
  const fallWords = `fall ${input.asked === 'fall' ? '?' : slope}`
  const inside = fall > 0 && drawFall(drawing, plan, fallWords)
  const notes = [
    fall > 0 && !inside ? fallWords : '',
    plan.stretched ? `${plan.stretched} drawn larger than scale` : '',
  ].filter(Boolean)
  const row = plan.top + plan.height + (narrow ? 38 : 50)
  const below = captionPlan(drawing, row, notes, narrow)
  const section = sectionOf(slab, thicknessM, widthM * fall)
  drawing.height = drawSlabSection(drawing, section, below + (narrow ? 32 : 44))
  return { drawing, words: describe(slab, section, fallWords) }
}

function describe(slab: Slab, section: SlabSection, fallWords: string): string {
  const unit = slab.input.system === 'metric' ? ' mm' : ''
  const say = ({ text, chalk }: Figure) => (chalk ? 'what is asked' : `${text}${unit}`)
  const falling = slab.fall > 0 ? `, ${fallWords}, the front ${say(section.drop)} lower` : ', level'
  return `Slab in plan and in section: length ${say(slab.length)}, width ${say(slab.width)}, thickness ${say(section.thickness)}${falling}.`
}
