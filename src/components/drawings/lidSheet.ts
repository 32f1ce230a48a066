import { formatQuantity } from '../../../shared/units/format'
import { readLidSnow } from '../../../shared/calculators/lidSnow'
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
import { drawLidBox, drawLidSnow, pullArrow, type LidPlace } from './lidBox'

interface Lid {
  depthM: number
  handleM: number
  /** Zero where no snow was said. */
  snowM: number
  depth: Figure
  handle: Figure
  snowDepth: string
  weight: string
  snowWeight: Figure
  lift: Figure
  liftWithSnow: Figure
}

/** What would tell the asked figure, though it is another. */
const TELLS: Readonly<Record<string, string[]>> = {
  liftForce: ['liftForceWithSnow'],
  snowWeight: ['liftForceWithSnow'],
}

function readLid(input: CalculatorSheetInput): Lid | null {
  const depthM = readPositive(input.values, 'depth')
  const handleM = readPositive(input.values, 'handleDistance')
  const weight = readPositive(input.values, 'weight')
  if (!depthM || !handleM || !weight || !readPositive(input.outputs, 'liftForce')) return null
  const output = (name: string, quantity: 'mass' | 'force') =>
    figureOf(input, name, formatQuantity(readNumber(input.outputs, name), quantity, input.system))
  const snowM = readLidSnow(input.values)?.depth ?? 0
  return {
    depthM,
    handleM,
    snowM,
    depth: lengthFigure(input, 'depth', depthM),
    handle: lengthFigure(input, 'handleDistance', handleM),
    snowDepth: lengthFigure(input, 'snowDepth', snowM).text,
    weight: formatQuantity(weight, 'mass', input.system),
    snowWeight: output('snowWeight', 'mass'),
    lift: output('liftForce', 'force'),
    liftWithSnow: output('liftForceWithSnow', 'force'),
  }
}

/** The lid to scale along its depth; snow keeps the scale as far as there is room. */
function layOut(lid: Lid, narrow: boolean, snowRoom: number): LidPlace {
  const left = narrow ? 34 : 120
  const room = (narrow ? 326 : 720) - left - snowRoom - (narrow ? 40 : 130)
  const scale = room / Math.max(lid.depthM, lid.handleM)
  const scaled = lid.snowM * scale
  const most = narrow ? 64 : 120
  const snow = lid.snowM > 0 ? Math.min(most, Math.max(18, scaled)) : 0
  const hinge = (narrow ? 76 : 90) + snow
  return {
    left,
    front: left + lid.depthM * scale,
    handle: left + lid.handleM * scale,
    snow,
    hinge,
    base: hinge + (narrow ? 98 : 116),
    note: snow > 0 && Math.abs(snow - scaled) > 1.5 ? 'depth of snow not to scale' : '',
  }
}

/** The lines over the handle: the pull without snow, and with it. */
function liftLines(input: CalculatorSheetInput, lid: Lid): Figure[] {
  const { asked } = input
  const hides = (name: string) => TELLS[asked ?? '']?.includes(name) ?? false
  const bare = { ...lid.lift, text: `lift with ${lid.lift.text}` }
  const under = { ...lid.liftWithSnow, text: `under snow ${lid.liftWithSnow.text}` }
  if (lid.snowM === 0) return asked === 'liftForceWithSnow' ? [under] : [bare]
  return hides('liftForceWithSnow') ? [bare] : [bare, under]
}

function drawPulls(drawing: Drawing, input: CalculatorSheetInput, lid: Lid, at: LidPlace): void {
  const lines = liftLines(input, lid)
  const rows = drawing.figure + 5
  const top = at.hinge - at.snow - 22
  pullArrow(drawing, at.handle, at.hinge - 6, top - 6, 'chalkline')
  lines.forEach((line, index) => {
    const wide = drawing.textWidth(line.text) / 2 + 6
    const x = Math.min(drawing.width - wide, Math.max(wide, at.handle))
    const row = top - 14 - (lines.length - 1 - index) * rows
    drawing.text(x, row, line.text, 'askt', 'middle')
  })
  const middle = (at.left + at.front) / 2
  pullArrow(drawing, middle, at.hinge + 6, at.hinge + 44, 'p2 nofill')
  const weights = [{ text: `lid ${lid.weight}`, chalk: false }]
  const snow = { ...lid.snowWeight, text: `snow ${lid.snowWeight.text}` }
  if (lid.snowM > 0 || snow.chalk) weights.push(snow)
  weights.forEach(({ text, chalk }, index) => {
    const wide = drawing.textWidth(text) / 2 + 6
    const x = Math.max(wide, middle)
    drawing.text(x, at.hinge + 60 + index * rows, text, chalk ? 'askt' : 'vtitle', 'middle')
  })
}

function drawFigures(drawing: Drawing, lid: Lid, at: LidPlace, narrow: boolean): void {
  const gap = narrow ? 24 : 28
  const { left, base } = at
  dimensionRow(drawing, left, at.handle, base, base + gap, lid.handle.text, lid.handle)
  dimensionRow(drawing, left, at.front, base, base + 2 * gap, lid.depth.text, lid.depth)
  drawing.height = base + 2 * gap + 16 + (at.note ? 18 : 0)
  if (at.note) drawing.text(left, base + 2 * gap + 26, at.note, 'vsub')
  if (at.snow === 0) return
  const column = Math.max(at.front, at.handle) + (narrow ? 14 : 24)
  const top = at.hinge - at.snow
  dimensionColumn(drawing, top, at.hinge, at.front, column, lid.snowDepth, { level: true })
}

/** Draws a lid from the side as it lies, hinged on the left: its weight, its snow and the pull at the handle. */
export function drawLidSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const lid = readLid(input)
  if (!lid) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const at = layOut(lid, narrow, lid.snowM > 0 ? drawing.textWidth(lid.snowDepth) : 0)
  if (at.snow > 0) drawLidSnow(drawing, at)
  drawLidBox(drawing, at)
  drawPulls(drawing, input, lid, at)
  drawFigures(drawing, lid, at, narrow)
  return { drawing, words: describe(input, lid) }
}

function describe(input: CalculatorSheetInput, lid: Lid): string {
  const unit = input.system === 'metric' ? ' mm' : ''
  const say = ({ text, chalk }: Figure, after = '') => (chalk ? 'what is asked' : `${text}${after}`)
  const pulls = liftLines(input, lid).map(({ text }) => text)
  const snow =
    lid.snowM > 0 ? ` Snow on it, ${lid.snowDepth}${unit} deep, weighs ${say(lid.snowWeight)}.` : ''
  return `A lid from the side, hinged on the left, ${say(lid.depth, unit)} deep, ${lid.weight}; the handle is ${say(lid.handle, unit)} from the hinge.${snow} Pull at the handle: ${pulls.join(', ')}.`
}

/** A lid half open: how hard is it to lift? */
export function drawLidPicture(drawing: Drawing): void {
  drawing.coloured(() => {
    drawing.path('M40 56H170V102H40Z', 'p2 m-timber2')
    drawing.path('M40 54L156 12L160 20L43 62Z', 'p2 m-timber')
    drawing.dot(42, 57, 5, 'p2 m-steel')
  })
  drawing.path('M8 102H212', 'p3')
  drawing.path('M178 46V14M172 22l6-9 6 9', 'chalkline')
  drawing.text(202, 36, '?', 'ask1', 'middle', 17)
}
