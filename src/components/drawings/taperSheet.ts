import { formatQuantity } from '../../../shared/units/format'
import {
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

interface Taper {
  /** Opening, width that stays, and length, in metres; the start first. */
  openings: [number, number]
  cuts: [number, number]
  gap: number
  isGapAtStop: boolean
  board: number
  length: number
}

/** The boards from above, in pixels: the start lies at the foot of the sheet, the far end at its head. */
interface Plan {
  /** Edge of the board before. */
  edge: number
  /** Edge of the last board that keeps the gap. */
  left: number
  /** Where the board ends, and where the stop stands, at the start and at the far end. */
  cuts: [number, number]
  stops: [number, number]
  /** Edge of the board before it is ripped. */
  whole: number
  top: number
  base: number
  notes: string[]
}

/** Nothing is drawn narrower than this: board, pixels; the difference of both ends less than that. */
const [LEAST_BOARD, LEAST_TAPER, LEAST_GAP] = [40, 12, 7] as const

function readTaper({ values, outputs }: CalculatorSheetInput): Taper | null {
  const [start, end] = [readPositive(values, 'openingStart'), readPositive(values, 'openingEnd')]
  const [board, length] = [readPositive(values, 'boardWidth'), readPositive(values, 'length')]
  if (!start || !end || !board || !length) return null
  const gap = readNumber(values, 'gap')
  const isGapAtStop = values.gapAtStop === 'yes'
  const off = isGapAtStop ? 2 * gap : gap
  const cuts: [number, number] = [
    readPositive(outputs, 'cutStart') ?? start - off,
    readPositive(outputs, 'cutEnd') ?? end - off,
  ]
  if (!(Math.min(...cuts) > 0)) return null
  return { openings: [start, end], cuts, gap, isGapAtStop, board, length }
}

/** Widths in pixels; small ones are drawn larger, and it is said. */
function layOutPlan(taper: Taper, narrow: boolean): Plan {
  const room = narrow ? 96 : 190
  const scale = room / Math.max(...taper.openings, taper.board)
  const cuts = taper.cuts.map((cut) => Math.max(LEAST_BOARD, cut * scale)) as [number, number]
  const [start, end] = taper.cuts
  const isLevel = Math.abs(start - end) < 1e-9
  const isSteeper = !isLevel && Math.abs(cuts[0] - cuts[1]) < LEAST_TAPER
  if (isSteeper) {
    const wide = start > end ? 0 : 1
    cuts[wide] = Math.max(...cuts, LEAST_BOARD + LEAST_TAPER)
    cuts[1 - wide] = cuts[wide] - LEAST_TAPER
  }
  const gap = taper.gap > 0 ? Math.min(40, Math.max(LEAST_GAP, taper.gap * scale)) : 0
  const edge = narrow ? 92 : 236
  const left = edge + gap
  const beyond = taper.isGapAtStop ? gap : 0
  const isWider = Math.min(...taper.cuts) * scale < LEAST_BOARD
  const wide = start > end ? 0 : 1
  const whole = left + cuts[wide] + (taper.board - taper.cuts[wide]) * scale
  const top = narrow ? 78 : 86
  return {
    edge,
    left,
    cuts: [left + cuts[0], left + cuts[1]],
    stops: [left + cuts[0] + beyond, left + cuts[1] + beyond],
    whole: Math.max(left + 20, whole),
    top,
    base: top + (narrow ? 170 : 210),
    notes: [
      isSteeper ? 'taper drawn larger than it is' : '',
      isWider ? 'narrow end drawn wider than it is' : '',
      'widths drawn larger than the length',
    ].filter(Boolean),
  }
}

const down = (points: readonly Point[]): Point[] => points.map(([x, y]) => [x, -y])

function drawBoards(drawing: Drawing, plan: Plan, taper: Taper, narrow: boolean): void {
  const { edge, left, cuts, stops, whole, top, base } = plan
  const gap = left - edge
  const before = narrow ? [30] : gap > 12 ? [90] : [64, 64]
  const wall = narrow ? 16 : 26
  const fits = taper.board >= Math.max(...taper.cuts) - 1e-9
  const ends = fits ? cuts : cuts.map((cut) => Math.min(cut, whole))
  drawing.coloured(() => {
    let right = edge
    for (const width of before) {
      drawing.rect(right - width, -base, width, base - top, 'p2 m-timber')
      right -= width + Math.max(gap, 2)
    }
    drawing.polygon(
      down([
        [stops[1], top - 6],
        [stops[1] + wall, top - 6],
        [stops[0] + wall, base + 6],
        [stops[0], base + 6],
      ]),
      'nostroke m-stonebed',
    )
    drawing.polygon(
      down([
        [left, top],
        [ends[1] ?? left, top],
        [ends[0] ?? left, base],
        [left, base],
      ]),
      'p3 m-timber2',
    )
  })
  drawing.stroke(stops[1], top - 6, stops[0], base + 6, 'p3')
  if (fits) drawing.path(`M${left} ${top}H${whole}V${base}H${left}`, 'p1 dash nofill')
  const grain = left + Math.min(...ends, whole) - left
  for (const share of [0.3, 0.62])
    drawing.stroke(
      left + (grain - left) * share,
      top + 12,
      left + (grain - left) * share,
      base - 12,
      'grain',
    )
}

/** What is said beside the drawing: the gap, and what follows from the widths or is asked. */
function captions(input: CalculatorSheetInput, taper: Taper): [string, string][] {
  const { asked, outputs, system } = input
  const where = taper.isGapAtStop ? 'gap on both sides' : 'gap'
  const gap: [string, string] = [`${where} ${formatDrawnLength(taper.gap, system)}`, 'tx']
  const board: [string, string] = [`board ${formatDrawnLength(taper.board, system)} wide`, 'tx']
  if (outputs === null) return [gap, board]
  if (asked === 'wasteStart') return [gap, board, ['? off at the start', 'askt']]
  if (asked === 'angle') return [gap, board, ['rip at ?°', 'askt']]
  if (asked === 'fits') return [gap, board, ['? wide enough', 'askt']]
  if (asked) return [gap, board]
  if (outputs.fits === 'no') return [gap, board, ['this board is too narrow', 'slipt']]
  const waste = formatDrawnLength(readNumber(outputs, 'wasteStart'), system)
  const angle = formatQuantity(readNumber(outputs, 'angle'), 'angle', system)
  return [gap, board, [`${waste} off at the start`, 'tx'], [`rip at ${angle}`, 'tx']]
}

/** Widths at both ends: the board's own nearest to it, the opening outside. */
function letterEnds(
  drawing: Drawing,
  plan: Plan,
  figures: readonly { cut: Figure; opening: Figure }[],
): void {
  figures.forEach(({ cut, opening }, at) => {
    const away = at === 0 ? 1 : -1
    const edge = (at === 0 ? plan.base : plan.top) + away * 4
    const [right, stop] = [plan.cuts[at] ?? 0, plan.stops[at] ?? 0]
    dimensionRow(drawing, plan.left, right, edge, edge + away * 20, cut.text, cut)
    dimensionRow(drawing, plan.edge, stop, edge, edge + away * 46, opening.text, opening)
  })
}

/** Draws the last opening from above, the start near, with the board that fills it. */
export function drawTaperSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const taper = readTaper(input)
  if (!taper) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const plan = layOutPlan(taper, narrow)
  const { top, base, edge } = plan
  drawBoards(drawing, plan, taper, narrow)
  const figures = [
    {
      cut: lengthFigure(input, 'cutStart', taper.cuts[0]),
      opening: lengthFigure(input, 'openingStart', taper.openings[0]),
    },
    {
      cut: lengthFigure(input, 'cutEnd', taper.cuts[1]),
      opening: lengthFigure(input, 'openingEnd', taper.openings[1]),
    },
  ]
  letterEnds(drawing, plan, figures)
  const length = lengthFigure(input, 'length', taper.length)
  const column = edge - (narrow ? 50 : 172)
  dimensionColumn(drawing, top, base, edge - (narrow ? 34 : 144), column, length.text, length)
  drawing.text(edge - 12, top - 20, 'far end', 'vtitle', 'end')
  drawing.text(edge - 12, base + 32, 'start', 'vtitle', 'end')
  const lines = captions(input, taper)
  const side = narrow ? { x: 20, y: base + 78 } : { x: 494, y: top + 40 }
  lines.forEach(([text, style], at) => drawing.text(side.x, side.y + at * 20, text, style))
  const row = narrow ? side.y + lines.length * 20 : base + 78
  plan.notes.forEach((note, at) => drawing.text(narrow ? 20 : 92, row + at * 17, note, 'vsub'))
  drawing.height = row + plan.notes.length * 17 - 4
  return { drawing, words: describe(input, figures, length, lines) }
}

function describe(
  { system }: CalculatorSheetInput,
  figures: readonly { cut: Figure; opening: Figure }[],
  length: Figure,
  lines: [string, string][],
): string {
  const unit = system === 'metric' ? ' millimetres' : ''
  const ends = ['at the start', 'at the far end'].map(
    (end, at) =>
      `${end} the opening is ${figures[at]?.opening.text ?? ''} and the board ${figures[at]?.cut.text ?? ''}`,
  )
  const said = lines.map(([text]) => text).join(', ')
  return `The last board from above, ${length.text}${unit} long: ${ends.join(', ')}; ${said}.`
}
