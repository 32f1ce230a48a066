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
import { Drawing, type Point } from './drawing'
import { formatDrawnLength } from './figures'
import { dimensionAlong } from './rafterDimension'
import { drawNotch, isShown, type Rafter } from './rafterNotch'

/** The rafter from the side, in pixels: its tail on the left. */
interface Side {
  tail: number
  plate: number
  ridge: number
  /** Where the outside of the plate meets the seat. */
  base: number
  slope: number
  /** Height of the rafter, measured plumb, above the seat line and below it. */
  above: number
  below: number
  notes: string[]
}

function readRafter({ values }: CalculatorSheetInput): Rafter | null {
  const [run, pitch, depth] = ['run', 'pitch', 'depth'].map((name) => readPositive(values, name))
  if (!run || !pitch || !depth) return null
  const [overhang, ridge, seat] = ['overhang', 'ridge', 'seat'].map((name) =>
    readNumber(values, name),
  ) as [number, number, number]
  return { run, slope: pitch / 12, overhang, ridge, depth, seat }
}

function layOutSide(rafter: Rafter, narrow: boolean): Side {
  const room = narrow ? { width: 120, height: 130 } : { width: 300, height: 210 }
  const across = rafter.run + rafter.overhang
  const scale = Math.min(room.width / across, room.height / (across * rafter.slope))
  const isTiny = rafter.overhang > 0 && rafter.overhang * scale < 8
  const cosine = 1 / Math.hypot(1, rafter.slope)
  const least = narrow ? 12 : 18
  const thick = Math.min(narrow ? 30 : 44, Math.max(least, rafter.depth * scale))
  const isThicker = thick > rafter.depth * scale * 1.15
  const notch = Math.min(0.4, (rafter.seat * rafter.slope * cosine) / rafter.depth)
  const tail = (narrow ? 84 : 96) + (room.width - across * scale) / 2
  const plate = tail + (isTiny ? 8 : rafter.overhang * scale)
  const ridge = Math.max(plate + 16, tail + across * scale)
  const above = (thick * (1 - notch)) / cosine
  const top = (narrow ? 44 : 66) + above
  const base = top + (ridge - plate) * rafter.slope
  return {
    tail,
    plate,
    ridge,
    base,
    slope: rafter.slope,
    above,
    below: (thick * notch) / cosine,
    notes: isThicker ? ['rafter drawn deeper than it is'] : [],
  }
}

const down = (points: readonly Point[]): Point[] => points.map(([x, y]) => [x, -y])

/** Height of the measuring line over a place along the run. */
const lineAt = (side: Side, x: number) => side.base - (x - side.plate) * side.slope

function drawTimber(drawing: Drawing, side: Side, rafter: Rafter, narrow: boolean): void {
  const { tail, plate, ridge, above, below } = side
  const post = narrow ? 14 : 22
  const half = rafter.ridge > 0 ? (narrow ? 3 : 5) : 0
  const end = ridge - half
  const seat = below / side.slope
  const notch: Point[] =
    rafter.seat > 0
      ? [
          [plate + seat, side.base],
          [plate, side.base],
          [plate, side.base + below],
        ]
      : []
  drawing.coloured(() => {
    drawing.rect(plate, -side.base - 40, post, 40, 'p1b m-timber3')
    if (half > 0) {
      const top = lineAt(side, ridge) - above
      drawing.rect(end, -top - above - below - 8, 2 * half, above + below + 8, 'p2 m-timber3')
    }
    drawing.polygon(
      down([
        [tail, lineAt(side, tail) - above],
        [end, lineAt(side, end) - above],
        [end, lineAt(side, end) + below],
        ...notch,
        [tail, lineAt(side, tail) + below],
      ]),
      'p3 m-timber',
    )
  })
  drawing.stroke(plate, side.base, ridge, lineAt(side, ridge), 'chalkline')
}

function letterSide(
  drawing: Drawing,
  input: CalculatorSheetInput,
  side: Side,
  rafter: Rafter,
): void {
  const narrow = input.size === 'narrow'
  const { tail, plate, ridge, above } = side
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres)
  const low = Math.max(side.base + 44, lineAt(side, tail) + side.below + 8)
  const run = figure('run', rafter.run)
  dimensionRow(drawing, plate, ridge, low - 4, low + (narrow ? 18 : 22), run.text, run)
  if (rafter.overhang > 0) {
    const over = figure('overhang', rafter.overhang)
    const row = low + (narrow ? 40 : 48)
    dimensionRow(drawing, tail, plate, low - 4, row, over.text, { ...over, beyond: 'before' })
  }
  if (isShown(input, 'rise')) {
    const rise = figure('rise', readNumber(input.outputs, 'rise'))
    const top = lineAt(side, ridge)
    const column = ridge + (narrow ? 24 : 36)
    dimensionColumn(drawing, top, side.base, ridge + 8, column, rise.text, { ...rise, level: true })
  }
  const lineTop = (x: number): Point => [x, lineAt(side, x) - above]
  if (isShown(input, 'lineLength')) {
    const line = figure('lineLength', readNumber(input.outputs, 'lineLength'))
    dimensionAlong(drawing, lineTop(plate), lineTop(ridge), narrow ? 20 : 24, line.text, line)
  }
}

/** What no line of the drawing carries, a line each. */
function captions(input: CalculatorSheetInput, rafter: Rafter): [string, string][] {
  const { asked, outputs, system } = input
  const style = (...names: string[]) => (names.includes(asked ?? '') ? 'askt' : 'tx')
  const length = (name: string) => lengthFigure(input, name, readNumber(outputs, name)).text
  const angle = (name: string) =>
    figureOf(input, name, formatQuantity(readNumber(outputs, name), 'angle', system)).text
  const pitch = formatQuantity(rafter.slope * 12, 'risePer12', system)
  const lines: [string, string][] = [[`pitch ${pitch}`, 'tx']]
  if (isShown(input, 'totalLength'))
    lines.push([`in all, tail to ridge ${length('totalLength')}`, style('totalLength')])
  if (isShown(input, 'plumbCut'))
    lines.push([`plumb cut ${angle('plumbCut')} off square`, style('plumbCut')])
  if (isShown(input, 'levelCut'))
    lines.push([`level cut ${angle('levelCut')} off square`, style('levelCut')])
  const depth = formatDrawnLength(rafter.depth, system)
  if (isShown(input, 'birdsmouthDepth') && rafter.seat > 0)
    lines.push([`notch ${length('birdsmouthDepth')} into ${depth}`, style('birdsmouthDepth')])
  if (asked === 'notchFits') lines.push(['? no deeper than a third', 'askt'])
  if (!asked && outputs?.notchFits === 'no')
    lines.push(['the notch is too deep: over a third', 'slipt'])
  return lines
}

/** Two captions a row; a row that holds the question is in chalk. */
function pair(lines: [string, string][]): [string, string][] {
  return lines.flatMap(([text, style], at) => {
    if (at % 2) return []
    const next = lines[at + 1]
    if (!next) return [[text, style] as [string, string]]
    const chosen = style === 'tx' ? next[1] : style
    return [[`${text}  ·  ${next[0]}`, chosen] as [string, string]]
  })
}

/** Draws a rafter from the side, true to its pitch, with its notch beside it. */
export function drawRafterSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const rafter = readRafter(input)
  if (!rafter) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const side = layOutSide(rafter, narrow)
  drawTimber(drawing, side, rafter, narrow)
  letterSide(drawing, input, side, rafter)
  const low = Math.max(side.base + 44, lineAt(side, side.tail) + side.below + 8)
  const foot = low + (rafter.overhang > 0 ? 74 : 52)
  const detail = narrow ? { x: 130, y: foot + 92 } : { x: 648, y: 146 }
  const figures = drawNotch(drawing, input, rafter, detail)
  const lines = captions(input, rafter)
  const rows = narrow ? lines : pair(lines)
  const hasNotch = figures.length > 0
  const first = narrow ? (hasNotch ? detail.y + 116 : foot) : Math.max(foot, hasNotch ? 262 : 0)
  const start = narrow ? 20 : 96
  rows.forEach(([text, style], at) => drawing.text(start, first + at * 19, text, style))
  const last = first + rows.length * 19
  side.notes.forEach((note, at) => drawing.text(start, last + at * 17, note, 'vsub'))
  drawing.height = last + side.notes.length * 17 - 6
  return { drawing, words: describe(input, rafter, [...figures, ...lines.map(([text]) => text)]) }
}

function describe(input: CalculatorSheetInput, rafter: Rafter, said: readonly string[]): string {
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const figure = (name: string, metres: number): Figure => lengthFigure(input, name, metres)
  const over = rafter.overhang > 0 ? `, overhang ${figure('overhang', rafter.overhang).text}` : ''
  const named = [
    ['rise', 'rise'],
    ['lineLength', 'plate to middle of ridge'],
  ] as const
  const lengths = named
    .filter(([name]) => isShown(input, name))
    .map(([name, word]) => `${word} ${figure(name, readNumber(input.outputs, name)).text}`)
  return `A rafter from the side, run ${figure('run', rafter.run).text}${unit}${over}: ${[...lengths, ...said].join(', ')}.`
}
