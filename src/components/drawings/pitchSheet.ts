import { formatQuantity } from '../../../shared/units/format'
import { formatNumber } from '../../../shared/units/number'
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

interface Pitch {
  /** Slope in radians. */
  angle: number
  run: Figure
  rise?: Figure
  degrees?: Figure
  slope?: Figure
}

/** A triangle in pixels, its low end on the left. */
interface Wedge {
  left: number
  right: number
  top: number
  base: number
}

/** The slope from whichever way of saying it is known. */
function readAngle({ outputs }: CalculatorSheetInput): number | undefined {
  const degrees = readPositive(outputs, 'degrees')
  if (degrees !== undefined) return degrees
  const known = [
    readPositive(outputs, 'ratio'),
    readNumber(outputs, 'percent') / 100,
    readNumber(outputs, 'risePer12') / 12,
  ].find((slope) => slope)
  return known && Math.atan(known)
}

/** While one way is asked for, only what was given and the question are shown. */
function isShown({ values, asked }: CalculatorSheetInput, name: string): boolean {
  return asked === undefined || asked === '' || asked === name || values[name] !== undefined
}

function readPitch(input: CalculatorSheetInput): Pitch | null {
  const angle = readAngle(input)
  if (!angle || angle >= Math.PI / 2) return null
  const runM = readPositive(input.values, 'run')
  const riseM = readPositive(input.values, 'rise')
  const lengthPerRun = readPositive(input.outputs, 'lengthPerRun')
  const isMeasured = runM !== undefined && riseM !== undefined
  const shown = (name: string, text: string) =>
    isShown(input, name) ? figureOf(input, name, text) : undefined
  return {
    angle,
    run: isMeasured ? lengthFigure(input, 'run', runM) : { text: '12', chalk: false },
    rise: isMeasured
      ? lengthFigure(input, 'rise', riseM)
      : shown('risePer12', formatNumber(12 * Math.tan(angle), 2)),
    degrees: shown('degrees', formatQuantity(angle, 'angle', input.system)),
    slope: shown('lengthPerRun', formatNumber(lengthPerRun ?? 1 / Math.cos(angle), 4)),
  }
}

/** True to its angle as long as both sides can be seen; the figure beside the rise keeps its room. */
function placeWedge(drawing: Drawing, { angle, rise }: Pitch, narrow: boolean): Wedge {
  const beside = drawing.textWidth(rise?.text ?? '') + (narrow ? 36 : 46)
  const room = narrow ? { width: 190, height: 130 } : { width: 430, height: 210 }
  room.width = Math.min(room.width, drawing.width - (narrow ? 66 : 130) - beside)
  const slope = Math.tan(angle)
  const width = Math.max(12, Math.min(room.width, room.height / slope))
  const left = (narrow ? 66 : 130) + (room.width - width) / 2
  const height = width * slope
  const top = narrow ? 40 : 48
  return { left, right: left + width, top, base: top + height }
}

function drawAngle(drawing: Drawing, wedge: Wedge, { angle, degrees }: Pitch): void {
  const { left, right, base } = wedge
  const radius = Math.min(52, (right - left) * 0.5)
  const x = left + radius * Math.cos(angle)
  const y = base - radius * Math.sin(angle)
  drawing.path(`M${left + radius} ${base}A${radius} ${radius} 0 0 0 ${x} ${y}`, 'chalkline')
  if (degrees) drawing.text(left - 10, base + 4, degrees.text, 'askt', 'end')
}

/** The slope's length for every 1 of run, written along the slope and clear of it. */
function drawSlope(drawing: Drawing, wedge: Wedge, pitch: Pitch): void {
  if (!pitch.slope) return
  const words = `${pitch.slope.text} for 1 of run`
  const degrees = (pitch.angle * 180) / Math.PI
  const off = drawing.figure + 4
  const px = (wedge.left + wedge.right) / 2 - Math.sin(pitch.angle) * off
  const py = (wedge.top + wedge.base) / 2 - Math.cos(pitch.angle) * off
  const length = Math.hypot(wedge.right - wedge.left, wedge.base - wedge.top)
  const fits = drawing.textWidth(words) < length - 10
  drawing.textTurned(
    px,
    py,
    -degrees,
    fits ? words : pitch.slope.text,
    pitch.slope.chalk ? 'askt' : 'tx',
  )
}

/** The same slope in the other ways that it is said. */
function otherWays(input: CalculatorSheetInput): string[] {
  const ways: [name: string, write: (value: number) => string, after: string][] = [
    ['risePer12', (value) => formatNumber(value, 2), ' in 12'],
    ['percent', (value) => formatNumber(value, 2), ' %'],
    ['ratio', (value) => formatQuantity(value, 'ratio', input.system, { unit: '1:n' }), ''],
    ['hipPerRun', (value) => formatNumber(value, 3), ' hip for 1 of run'],
  ]
  return ways.flatMap(([name, write, after]) => {
    const value = readPositive(input.outputs, name)
    if (value === undefined || !isShown(input, name)) return []
    return [`${figureOf(input, name, write(value)).text}${after}`]
  })
}

/** Draws one slope as a wedge, true to its angle, with rise, run and slope length. */
export function drawPitchSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const pitch = readPitch(input)
  if (!pitch) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const wedge = placeWedge(drawing, pitch, narrow)
  const { left, right, top, base } = wedge
  const row = base + (narrow ? 26 : 32)
  drawing.coloured(() =>
    drawing.polygon(
      [
        [left, -base],
        [right, -base],
        [right, -top],
      ],
      'p2 m-timber',
    ),
  )
  drawAngle(drawing, wedge, pitch)
  drawSlope(drawing, wedge, pitch)
  dimensionRow(drawing, left, right, base, row, pitch.run.text, pitch.run)
  const column = right + (narrow ? 20 : 30)
  if (pitch.rise)
    dimensionColumn(drawing, top, base, right, column, pitch.rise.text, {
      ...pitch.rise,
      level: true,
    })
  const ways = otherWays(input)
  const groups = narrow ? [ways.slice(0, 3), ways.slice(3)] : [ways]
  const lines = groups.map((group) => group.join('  ·  ')).filter(Boolean)
  drawing.height = row + 26 + 18 * lines.length
  lines.forEach((line, index) =>
    drawing.text(drawing.width / 2, row + 34 + index * 18, line, 'vsub', 'middle'),
  )
  return { drawing, words: describe(pitch, ways) }
}

function describe({ run, rise, degrees, slope }: Pitch, ways: string[]): string {
  const first = rise ? `A slope that rises ${rise.text} over ${run.text}` : 'A slope'
  const said = [...(degrees ? [degrees.text] : []), ...ways].join(', ')
  const length = slope ? ` Its length is ${slope.text} for 1 of run.` : ''
  return `${first}: ${said}.${length}`
}
