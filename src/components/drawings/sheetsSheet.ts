import type { Values } from '../../../shared/calculators/calculator'
import { formatNumber } from '../../../shared/units/number'
import { drawChip } from './ask'
import {
  figureOf,
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { formatDrawnLength, type RoundFigure } from './figures'
import { tenth } from './marks'
import { drawDeck, drawSheetRows, type RoofArea } from './sheetsRoof'

/** A side under this many pixels is drawn at it, and the drawing says so. */
const LEAST_SIDE = 40
/** While one of these is asked for, only the first sheet is laid, so that none can be counted. */
const COUNTED = ['sheets', 'across', 'rows', 'coveredWidth', 'cutLength']

interface Roof {
  input: CalculatorSheetInput
  across: number
  rows: number
  /** Metres that the sheets cover across and up the slope. */
  coveredM: number
  slopeM: number
  isCounting: boolean
}

function readRoof(input: CalculatorSheetInput): Roof | null {
  const across = readPositive(input.outputs, 'across')
  const rows = readPositive(input.outputs, 'rows')
  const cover = readPositive(input.values, 'coverWidth')
  const slope = readPositive(input.values, 'slopeLength')
  if (!across || !rows || !cover || !slope || !readPositive(input.values, 'width')) return null
  return {
    input,
    across,
    rows,
    coveredM: across * cover,
    slopeM: slope + readNumber(input.values, 'eaveOverhang'),
    isCounting: COUNTED.includes(input.asked ?? ''),
  }
}

/** Both sides to one scale, within the room that the figures leave. */
function layOut({ input, coveredM, slopeM }: Roof, drawing: Drawing): RoofArea {
  const narrow = input.size === 'narrow'
  const written = (side: Values | null, name: string) =>
    drawing.textWidth(formatDrawnLength(readNumber(side, name), input.system))
  const before = written(input.values, 'slopeLength') + (narrow ? 32 : 58)
  const after = written(input.outputs, 'cutLength') + (narrow ? 30 : 58)
  const room = { width: drawing.width - before - after, height: narrow ? 150 : 240 }
  const scale = Math.min(room.width / coveredM, room.height / slopeM)
  const width = Math.max(LEAST_SIDE, coveredM * scale)
  const height = Math.max(LEAST_SIDE, slopeM * scale)
  const values = (name: string) => readNumber(input.values, name)
  const [x, y] = [width / coveredM, height / slopeM]
  return {
    left: before + (room.width - width) / 2,
    top: narrow ? 44 : 54,
    width,
    height,
    side: values('sideOverhang') * x,
    eave: values('eaveOverhang') * y,
    deck: values('width') * x,
    cover: values('coverWidth') * x,
    gain: (values('sheetLength') - values('endLap')) * y,
    sheet: Math.min(values('sheetLength') * y, height),
    lap: values('endLap') * y,
    stretched:
      height > slopeM * scale + 0.5
        ? 'slope drawn larger than scale'
        : width > coveredM * scale + 0.5
          ? 'width drawn larger than scale'
          : '',
  }
}

function drawFigures(drawing: Drawing, roof: Roof, area: RoofArea): void {
  const { input } = roof
  const narrow = input.size === 'narrow'
  const { left, top, width, height } = area
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres)
  const [above, below] = narrow ? [20, 24] : [24, 32]
  const deckLeft = left + area.side
  const wide = figure('width', readNumber(input.values, 'width'))
  dimensionRow(drawing, deckLeft, deckLeft + area.deck, top, top - above, wide.text, wide)
  const slope = figure('slopeLength', readNumber(input.values, 'slopeLength'))
  const column = left - (narrow ? 18 : 30)
  dimensionColumn(drawing, top, top + height - area.eave, left, column, slope.text, slope)
  const isTold = !roof.isCounting || input.asked === 'coveredWidth'
  const covered = figure('coveredWidth', readNumber(input.outputs, 'coveredWidth'))
  const base = top + height
  if (isTold) dimensionRow(drawing, left, left + width, base, base + below, covered.text, covered)
  else {
    const one = figure('coverWidth', readNumber(input.values, 'coverWidth'))
    dimensionRow(drawing, left, left + area.cover, base, base + below, one.text, one)
  }
  if (roof.isCounting && input.asked !== 'cutLength') return
  const cut = figure('cutLength', readNumber(input.outputs, 'cutLength'))
  const end = top + (readNumber(input.outputs, 'cutLength') * height) / roof.slopeM
  const edge = left + width
  const level = { level: true, chalk: cut.chalk }
  dimensionColumn(drawing, top, end, edge, edge + (narrow ? 16 : 24), cut.text, level)
}

/** 6 across × 2 rows = 12 sheets, without what is asked for or would tell it. */
function countLine({ input, across, rows, isCounting }: Roof): string {
  const { asked } = input
  const hides = (...names: string[]) => asked !== undefined && names.includes(asked)
  const first = hides('across', 'coveredWidth') ? '?' : formatNumber(across, 0)
  const second = hides('rows') ? '?' : formatNumber(rows, 0)
  const line = `${first} across × ${second} ${second === '1' ? 'row' : 'rows'}`
  const all = figureOf(input, 'sheets', formatNumber(across * rows, 0)).text
  return isCounting && asked !== 'sheets' ? line : `${line} = ${all} sheets`
}

/** Notes under the plan, a line each on a phone. */
function noteLines({ input, rows, isCounting }: Roof, area: RoofArea): string[] {
  const length = (name: string) => formatDrawnLength(readNumber(input.values, name), input.system)
  const verdict = input.outputs?.['lapsHold']
  const laps: Record<string, string> = {
    yes: 'laps long enough for this slope',
    no: 'end lap too short for this slope',
    sealant: 'laps hold only with sealant',
    flat: 'too flat to lap',
  }
  const judged = typeof verdict === 'string' && input.asked !== 'lapsHold' ? laps[verdict] : ''
  return [
    `over each side ${length('sideOverhang')}, over the eave ${length('eaveOverhang')}`,
    rows > 1 || isCounting ? `end lap ${length('endLap')}` : '',
    isCounting ? '' : describeExcess(input),
    judged ?? '',
    area.stretched,
  ].filter(Boolean)
}

/** What whole sheets reach past the overhang, and what is done about it. */
function describeExcess(input: CalculatorSheetInput): string {
  const wanted = readNumber(input.values, 'width') + 2 * readNumber(input.values, 'sideOverhang')
  const excess = readNumber(input.outputs, 'coveredWidth') - wanted
  if (excess < 0.001) return ''
  return `${formatDrawnLength(excess, input.system)} too wide: lap more or cut the last`
}

/** As many notes on a line as fit. */
function packNotes(drawing: Drawing, notes: string[], room: number): string[] {
  const lines: string[] = []
  for (const note of notes) {
    const longer = `${lines.at(-1) ?? ''}; ${note}`
    if (lines.length > 0 && drawing.textWidth(longer) < room) lines[lines.length - 1] = longer
    else lines.push(note)
  }
  return lines
}

function drawLegend(drawing: Drawing, roof: Roof, area: RoofArea, notes: string[]): void {
  const narrow = roof.input.size === 'narrow'
  const left = narrow ? 12 : 28
  const row = area.top + area.height + (narrow ? 54 : 68)
  const line = countLine(roof)
  drawing.text(left, row, line, line.includes('?') ? 'askt' : 'vtitle')
  const shown = packNotes(drawing, notes, drawing.width - 2 * left)
  shown.forEach((note, index) => drawing.text(left, row + 20 + index * 18, note, 'vsub'))
  drawing.height = row + 14 + shown.length * 18
}

/** Draws the roof seen square to its slope, the ridge at the top, with every sheet and lap. */
export function drawSheetsSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const roof = readRoof(input)
  if (!roof) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const area = layOut(roof, drawing)
  drawDeck(drawing, area)
  drawSheetRows(drawing, area, roof.isCounting ? { across: 1, rows: 1 } : roof)
  drawFigures(drawing, roof, area)
  if (input.asked === 'lapsHold')
    drawChip(drawing, area.left + area.width / 2, area.top + area.height / 2, '? laps')
  const notes = noteLines(roof, area)
  drawLegend(drawing, roof, area, notes)
  return { drawing, words: describe(roof, notes) }
}

function describe(roof: Roof, notes: string[]): string {
  const { input } = roof
  const length = (name: string) => formatDrawnLength(readNumber(input.values, name), input.system)
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const plan = `Roof seen square to its slope, ${length('width')} wide by ${length('slopeLength')}${unit} from ridge to eave`
  const cut = lengthFigure(input, 'cutLength', readNumber(input.outputs, 'cutLength')).text
  const told = roof.isCounting ? '' : `, ${roof.rows > 1 ? 'the top row' : 'each'} cut to ${cut}`
  return `${plan}: ${countLine(roof)}${told}; ${notes.join('; ')}.`
}

/** Three sheets from the eave, each over its neighbour: how many? */
export function drawSheetsPicture(drawing: Drawing, figure: RoundFigure): void {
  const wave = (x: number, y: number, count: number) =>
    `M${x} ${y}q7-14 14 0${'t14 0'.repeat(count)}`
  drawing.path(wave(14, 70, 5), 'p3 nofill')
  drawing.path(wave(84, 63, 5), 'p2 nofill')
  drawing.path(wave(154, 70, 3), 'p3 nofill')
  dimensionRow(drawing, 14, 84, 76, 96, figure(760, 24))
  drawing.text(tenth(119), 44, '? sheets', 'ask1', 'middle', 17)
}
