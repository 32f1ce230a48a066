import { formatNumber } from '../../../shared/units/number'
import {
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn } from './dimensions'
import { Drawing } from './drawing'
import { drawCrossings, drawNail, type Shown } from './fixingsPlan'

/** More than these are not drawn one by one. */
const MOST = { wide: { boards: 6, supports: 7 }, narrow: { boards: 5, supports: 5 } } as const

interface Nail {
  thickness: Figure
  length: Figure
}

function readShown(input: CalculatorSheetInput): Shown | null {
  const [boards, supports, perCrossing] = ['boards', 'supports', 'perCrossing'].map((name) =>
    readPositive(input.values, name),
  )
  if (!boards || !supports || !perCrossing || !readPositive(input.outputs, 'driven')) return null
  const most = MOST[input.size]
  return {
    boards: Math.min(boards, most.boards),
    supports: Math.min(supports, most.supports),
    perCrossing,
    moreBoards: boards > most.boards,
    moreSupports: supports > most.supports,
  }
}

function readNail(input: CalculatorSheetInput): Nail | undefined {
  const thickness = readPositive(input.values, 'thickness')
  const length = readPositive(input.outputs, 'nailLength')
  if (!thickness || !length) return undefined
  return {
    thickness: lengthFigure(input, 'thickness', thickness),
    length: lengthFigure(input, 'nailLength', length),
  }
}

/** The count in words, a line each, up to the one that is asked for. */
function countLines(input: CalculatorSheetInput): Figure[] {
  const { values, outputs, asked } = input
  const value = (name: string) => formatNumber(readNumber(values, name), 2)
  const output = (name: string) =>
    asked === name ? '?' : formatNumber(readNumber(outputs, name), 0)
  const some = (name: string, one: string) =>
    `${value(name)} ${readNumber(values, name) === 1 ? one : `${one}s`}`
  const boxes = output('boxes')
  const spare = readNumber(values, 'spare') > 0 ? `with ${value('spare')} % spare` : 'without spare'
  const lines = [
    [
      '',
      `${some('boards', 'board')} × ${some('supports', 'support')} × ${value('perCrossing')} at each`,
    ],
    ['driven', `${output('driven')} go in`],
    ['fixings', `${spare} buy ${output('fixings')}`],
    ['boxes', `${boxes} ${boxes === '1' ? 'box' : 'boxes'} of ${value('boxSize')}`],
  ] as const
  const last = lines.findIndex(([name]) => name !== '' && name === asked)
  const shown = lines.slice(0, last < 0 ? lines.length : last + 1)
  // Without spare, what goes in is what is bought.
  const tells = asked === 'fixings' && readNumber(outputs, 'driven') === readNumber(outputs, asked)
  return shown
    .filter(([name]) => !(tells && name === 'driven'))
    .map(([name, text]) => ({ text, chalk: name !== '' && name === asked }))
}

function drawNailSection(drawing: Drawing, nail: Nail, narrow: boolean, top: number): number {
  const at = narrow ? { x: 150, top, board: 26 } : { x: 566, top, board: 34 }
  drawNail(drawing, at)
  const reach = at.board * 1.3
  const { thickness, length } = nail
  const [left, right] = [at.x - reach, at.x + reach]
  const end = top + 3 * at.board
  dimensionColumn(drawing, top, top + at.board, left, left - 18, thickness.text, {
    ...thickness,
    level: true,
  })
  dimensionColumn(drawing, top, end, right, right + 18, length.text, { ...length, level: true })
  return end + 16
}

/** Draws boards over their supports with every fixing, and a nail in section where the board is given. */
export function drawFixingsSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const shown = readShown(input)
  if (!shown) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const nail = readNail(input)
  const left = narrow ? 20 : 40
  const plan = narrow
    ? { left, top: 22, width: 286, height: 28 * shown.boards }
    : { left, top: 26, width: nail ? 388 : 640, height: 34 * shown.boards }
  drawCrossings(drawing, plan, shown)
  let row = plan.top + plan.height + (narrow ? 36 : 40)
  const isPart = shown.moreBoards || shown.moreSupports
  if (isPart) drawing.text(left, row, 'not all of them drawn', 'vsub')
  if (isPart) row += drawing.figure + 8
  const lines = countLines(input)
  lines.forEach(({ text, chalk }, index) => {
    const style = chalk ? 'askt' : index ? 'vsub' : 'vtitle'
    drawing.text(left, row + index * (drawing.figure + 6), text, style)
  })
  row += lines.length * (drawing.figure + 6)
  const nailEnd = nail ? drawNailSection(drawing, nail, narrow, narrow ? row + 10 : 40) : 0
  drawing.height = Math.max(row, nailEnd + 12)
  return { drawing, words: describe(lines, nail, input) }
}

function describe(lines: Figure[], nail: Nail | undefined, input: CalculatorSheetInput): string {
  const unit = input.system === 'metric' ? ' mm' : ''
  const say = ({ text, chalk }: Figure) => (chalk ? 'how long is asked' : `${text}${unit}`)
  const count = lines.map(({ text }) => text.replace('?', 'how many')).join(', ')
  const held = nail
    ? ` A nail through a board of ${say(nail.thickness)}, at least ${say(nail.length)}.`
    : ''
  return `Boards over their supports: ${count}.${held}`
}

/** Three boards on three supports: how many screws? */
export function drawFixingsPicture(drawing: Drawing): void {
  const shown = { boards: 3, supports: 3, perCrossing: 2, moreBoards: false, moreSupports: false }
  drawCrossings(drawing, { left: 12, top: 12, width: 160, height: 96 }, shown)
  drawing.text(204, 66, '?', 'ask1', 'middle', 17)
}
