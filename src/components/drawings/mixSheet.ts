import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
import { questionFor } from './ask'
import {
  figureOf,
  lengthFigure,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn } from './dimensions'
import { Drawing } from './drawing'
import { drawHeap, type Consistency } from './heap'
import { tenth } from './marks'

/** How far a cone of each consistency drops, in millimetres, where no slump was measured. */
const TYPICAL_SLUMP: Record<Consistency, number> = { stiff: 30, right: 75, wet: 150 }
/** A US liquid quart in cubic metres: 57.75 cubic inches. */
const QUART = 57.75 * 0.0254 ** 3
const WORDS: Record<Consistency, string> = {
  stiff: 'too stiff',
  right: 'right',
  wet: 'too wet',
}
/** Outputs that no line of this drawing carries. */
const ELSEWHERE = ['waterCementRatio', 'slumpClass']
const STYLES: Record<Consistency, string> = { stiff: 'slipt', right: 'okt', wet: 'slipt' }

interface Jug {
  left: number
  right: number
  top: number
  base: number
}

function readVerdict(outputs: CalculatorSheetInput['outputs']): Consistency | undefined {
  const verdict = outputs?.verdict
  if (typeof verdict !== 'string') return undefined
  if (verdict.includes('wet')) return 'wet'
  return verdict.includes('right') || verdict.includes('work') ? 'right' : 'stiff'
}

/** Water by the litre, or by the quart. */
function waterFigure(input: CalculatorSheetInput, name: string, cubicMetres: number): Figure {
  const unit = input.system === 'imperial' ? 'qt' : 'L'
  return figureOf(input, name, formatQuantity(cubicMetres, 'volume', input.system, { unit }))
}

/** Marks of the jug every half litre or half quart, wider apart where it holds much. */
function markWater(full: number, system: UnitSystem): number[] {
  let step = system === 'imperial' ? QUART / 2 : 0.0005
  while (full / step > 16) step *= 2
  return Array.from({ length: Math.floor(full / step) }, (_, index) => (index + 1) * step)
}

function drawJug(drawing: Drawing, jug: Jug, level: number, marks: number[]): void {
  const { left, right, top, base } = jug
  drawing.coloured(() => {
    drawing.rect(left, -base, right - left, base - level, 'nostroke m-water')
    drawing.path(`M${left} ${tenth(level)}H${right}`, 'p1b nofill')
    drawing.path(`M${left} ${top}V${base}H${right}V${top}l7-7`, 'p2 nofill')
    drawing.path(`M${left} ${top + 26}h-13q-9 0-9 10v38q0 10 9 10h13`, 'p2 nofill')
  })
  marks.forEach((y, index) =>
    drawing.stroke(right - (index % 2 ? 14 : 8), tenth(y), right, tenth(y), 'p1'),
  )
}

/** Draws the bag's range on the jug; its two figures are kept a line apart. */
function drawRange(
  drawing: Drawing,
  jug: Jug,
  rows: [number, number],
  figures: [Figure, Figure],
): void {
  const [low, high] = rows
  const gap = Math.max(0, drawing.figure + 5 - (low - high))
  const offsets = [gap / 2, -gap / 2]
  const end = jug.right + 22
  drawing.path(`M${jug.right + 6} ${tenth(low)}V${tenth(high)}`, 'okline')
  rows.forEach((y, index) => {
    const figure = figures[index]
    if (!figure) return
    const label = y + (offsets[index] ?? 0)
    drawing.path(`M${jug.left} ${tenth(y)}H${jug.right + 8}L${end} ${tenth(label)}`, 'okline')
    const words = `${figure.text} ${index ? 'at most' : 'at least'}`
    drawing.text(end + 5, label + drawing.figure * 0.36, words, figure.chalk ? 'askt' : 'okt')
  })
}

function drawAdded(drawing: Drawing, jug: Jug, level: number, figure: Figure): void {
  const x = jug.left - 30
  const y = tenth(level)
  drawing.path(`M${x} ${y}H${jug.left - 3}M${jug.left - 11} ${y - 5}l8 5-8 5`, 'chalkline')
  drawing.text(x - 5, level + drawing.figure * 0.36, figure.text, 'askt', 'end')
}

/** Draws the water for a bag against the bag's own range, and how the mix then stands. */
export function drawMixSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const least = readPositive(input.outputs, 'waterMin')
  const most = readPositive(input.outputs, 'waterMax')
  const added = input.values.waterAdded
  if (!least || !most || most < least || typeof added !== 'number' || added < 0) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, narrow ? 388 : 268, undefined, narrow ? 12 : 14)
  const jug: Jug = narrow
    ? { left: 120, right: 196, top: 34, base: 190 }
    : { left: 150, right: 246, top: 40, base: 220 }
  const full = Math.max(most * 1.3, added * 1.1)
  const rowOf = (water: number) => jug.base - ((jug.base - jug.top) * water) / full
  const figures: [Figure, Figure] = [
    waterFigure(input, 'waterMin', least),
    waterFigure(input, 'waterMax', most),
  ]
  const addedFigure = waterFigure(input, 'waterAdded', added)
  const marks = markWater(full, input.system).map(rowOf)
  drawJug(drawing, jug, rowOf(added), marks)
  drawRange(drawing, jug, [rowOf(least), rowOf(most)], figures)
  drawAdded(drawing, jug, rowOf(added), addedFigure)
  drawing.text((jug.left + jug.right) / 2, jug.base + 22, 'water for one bag', 'vsub', 'middle')
  const verdict = readVerdict(input.outputs)
  if (verdict) drawCone(drawing, input, verdict)
  const range = `at least ${figures[0].text}, at most ${figures[1].text}`
  const mixed = verdict && input.asked !== 'verdict' ? ` The mix is ${WORDS[verdict]}.` : ''
  return {
    drawing,
    words: `Water for one bag: ${addedFigure.text} added; the bag takes ${range}.${mixed}`,
  }
}

function drawCone(drawing: Drawing, input: CalculatorSheetInput, verdict: Consistency): void {
  const narrow = input.size === 'narrow'
  const frame = narrow
    ? { originX: 140, originY: 344, scale: 0.36 }
    : { originX: 520, originY: 220, scale: 0.56 }
  const asked = input.asked === 'verdict'
  const slumpM = readPositive(input.values, 'slump')
  const drop = slumpM ? Math.min(slumpM * 1000, 290) : TYPICAL_SLUMP[asked ? 'right' : verdict]
  drawing.within(frame, () => {
    drawHeap(drawing, drop)
    const figure = slumpM ? lengthFigure(input, 'slump', slumpM) : { text: '', chalk: false }
    const column = Math.min(drawing.x(230), drawing.width - drawing.textWidth(figure.text) - 18)
    if (figure.text)
      dimensionColumn(
        drawing,
        drawing.y(300),
        drawing.y(300 - drop),
        drawing.x(110),
        column,
        figure.text,
        { ...figure, level: true },
      )
    const words = asked ? '?' : WORDS[verdict]
    const style = asked ? 'askt' : STYLES[verdict]
    drawing.text(drawing.x(0), drawing.y(0) + 22, `the mix is ${words}`, style, 'middle')
    const question = ELSEWHERE.includes(input.asked ?? '') ? questionFor(input.asked) : undefined
    if (question) drawing.text(drawing.x(0), drawing.y(0) + 41, question, 'askt', 'middle')
  })
}
