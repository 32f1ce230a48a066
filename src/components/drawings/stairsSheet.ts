import {
  figureOf,
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing, type Point } from './drawing'

/** The order in which steps are worked; what follows from the asked number is not shown. */
const ORDER = ['risers', 'rise', 'totalRun', 'comfort', 'withinLimits']
/** No more steps than this are drawn, and this many where they must not be counted. */
const [MOST_DRAWN, UNCOUNTED] = [14, 4] as const

interface Stairs {
  totalRise: number
  tread: number
  risers: number
  rise: number
  totalRun: number
}

/** The flight in pixels: its foot on the left. */
interface Flight {
  left: number
  base: number
  /** Steps drawn, and the size of each. */
  count: number
  tread: number
  rise: number
  landing: number
  notes: string[]
}

function readStairs({ values, outputs }: CalculatorSheetInput): Stairs | null {
  const [totalRise, tread] = [readPositive(values, 'totalRise'), readPositive(values, 'tread')]
  const [risers, rise] = [readPositive(outputs, 'risers'), readPositive(outputs, 'rise')]
  if (!totalRise || !tread || !risers || !rise) return null
  return { totalRise, tread, risers, rise, totalRun: readNumber(outputs, 'totalRun') }
}

function isShown({ asked }: CalculatorSheetInput, name: string): boolean {
  const at = ORDER.indexOf(asked ?? '')
  return at < 0 || ORDER.indexOf(name) <= at
}

function layOutFlight(stairs: Stairs, narrow: boolean, isUncounted: boolean): Flight {
  const room = narrow ? { width: 104, height: 140 } : { width: 340, height: 220 }
  const count = isUncounted ? UNCOUNTED : Math.min(stairs.risers, MOST_DRAWN)
  const scale = Math.min(
    room.width / (Math.max(1, count - 1) * stairs.tread),
    room.height / (count * stairs.rise),
  )
  const plain = narrow ? 26 : 36
  const tread = isUncounted ? plain * 1.3 : Math.max(9, stairs.tread * scale)
  const rise = isUncounted ? plain : Math.max(10, stairs.rise * scale)
  const isStretched = tread > stairs.tread * scale + 0.5 || rise > stairs.rise * scale + 0.5
  return {
    left: narrow ? 94 : 130,
    base: (narrow ? 28 : 34) + count * rise,
    count,
    tread,
    rise,
    landing: narrow ? 26 : 70,
    notes: [
      isUncounted ? 'drawn with four steps, however many there are' : '',
      !isUncounted && count < stairs.risers ? 'not all steps are drawn' : '',
      isStretched && !isUncounted ? 'heights and treads not to one scale' : '',
    ].filter(Boolean),
  }
}

/** The outline of the steps from the foot of the first to the end of the landing. */
function outline({ left, base, count, tread, rise, landing }: Flight): Point[] {
  const points: Point[] = []
  for (let at = 0; at < count; at++) {
    const x = left + at * tread
    points.push([x, base - at * rise], [x, base - (at + 1) * rise])
  }
  const end = left + (count - 1) * tread + landing
  return [...points, [end, base - count * rise]]
}

function drawFlight(drawing: Drawing, flight: Flight): void {
  const steps = outline(flight)
  const end = steps.at(-1)?.[0] ?? flight.left
  const low = flight.base + 14
  const ring: Point[] = [...steps, [end, low], [flight.left, low]]
  drawing.coloured(() => {
    drawing.rect(flight.left - 44, -low, 44, 14, 'nostroke m-earth')
    drawing.polygon(
      ring.map(([x, y]) => [x, -y]),
      'nostroke m-concrete',
    )
  })
  drawing.path(
    `M${flight.left - 44} ${flight.base}H${flight.left}${steps.map(([x, y]) => `L${x} ${y}`).join('')}`,
    'p3 nofill',
  )
}

function letterFlight(
  drawing: Drawing,
  input: CalculatorSheetInput,
  stairs: Stairs,
  flight: Flight,
): number {
  const { left, base, count, tread, rise } = flight
  const step = input.size === 'narrow' ? 24 : 28
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres)
  const end = left + (count - 1) * tread + flight.landing
  const height = figure('totalRise', stairs.totalRise)
  const [top, column] = [base - count * rise, end + (input.size === 'narrow' ? 18 : 28)]
  dimensionColumn(drawing, top, base, end, column, height.text, height)
  if (isShown(input, 'rise')) {
    const each = figure('rise', stairs.rise)
    const level = { ...each, level: true }
    dimensionColumn(drawing, base - rise, base, left - 6, left - 20, each.text, level)
  }
  let row = base + 14
  if (count > 1) {
    row += step
    const one = figure('tread', stairs.tread)
    dimensionRow(drawing, left, left + tread, base + 10, row, one.text, one)
  }
  if (count > 1 && isShown(input, 'totalRun')) {
    row += step
    const run = figure('totalRun', stairs.totalRun)
    dimensionRow(drawing, left, left + (count - 1) * tread, base + 10, row, run.text, run)
  }
  return row
}

function captions(input: CalculatorSheetInput, stairs: Stairs): [string, string][] {
  const { asked, outputs } = input
  const count = figureOf(input, 'risers', String(stairs.risers))
  const word = stairs.risers === 1 && !count.chalk ? 'riser' : 'risers, all the same'
  const lines: [string, string][] = [[`${count.text} ${word}`, count.chalk ? 'askt' : 'vtitle']]
  if (stairs.risers === 1 && asked === 'totalRun') lines.push(['? first riser to last', 'askt'])
  if (isShown(input, 'comfort')) {
    const comfort = lengthFigure(input, 'comfort', readNumber(outputs, 'comfort'))
    lines.push([`two rises and a tread ${comfort.text}`, comfort.chalk ? 'askt' : 'tx'])
  }
  if (asked === 'withinLimits') lines.push(['? within the limits', 'askt'])
  if (!asked && outputs?.withinLimits === 'no')
    lines.push(['beyond 7 3/4 in rise or 10 in tread', 'slipt'])
  return lines
}

/** Draws a flight of equal steps from the side. */
export function drawStairsSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const stairs = readStairs(input)
  if (!stairs) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const flight = layOutFlight(stairs, narrow, input.asked === 'risers')
  drawFlight(drawing, flight)
  const row = letterFlight(drawing, input, stairs, flight)
  const lines = captions(input, stairs)
  const start = narrow ? 20 : flight.left
  lines.forEach(([text, style], at) => drawing.text(start, row + 36 + at * 19, text, style))
  const last = row + 36 + lines.length * 19
  flight.notes.forEach((note, at) => drawing.text(start, last + at * 17, note, 'vsub'))
  drawing.height = last + flight.notes.length * 17 - 6
  return { drawing, words: describe(input, stairs, lines) }
}

function describe(input: CalculatorSheetInput, stairs: Stairs, lines: [string, string][]): string {
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres).text
  const each = isShown(input, 'rise') ? `, each ${figure('rise', stairs.rise)}` : ''
  const run =
    isShown(input, 'totalRun') && stairs.risers > 1
      ? `, first riser to last ${figure('totalRun', stairs.totalRun)}`
      : ''
  const said = lines.map(([text]) => text).join(', ')
  return `Steps from the side, ${figure('totalRise', stairs.totalRise)}${unit} in all${each}, tread ${figure('tread', stairs.tread)}${run}: ${said}.`
}
