import { describeMarks, drawBreak, layOutRow, type LaidRow } from './boardsRow'
import {
  figureOf,
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
} from './calculatorSheet'
import { dimensionRow } from './dimensions'
import { Drawing } from './drawing'

interface Boards {
  opening: number
  width: number
  gap: number
  count: number
  last: number
  starts: readonly number[]
}

/** Where the boards stand on the sheet, in pixels. */
interface Area {
  left: number
  right: number
  top: number
  base: number
}

function readBoards({ values, outputs }: CalculatorSheetInput): Boards | null {
  const [opening, width] = [readPositive(values, 'opening'), readPositive(values, 'boardWidth')]
  const count = readPositive(outputs, 'count')
  if (!opening || !width || !count) return null
  const gap = readNumber(outputs, 'gap')
  const first = values.ends === 'gap' ? gap : 0
  return {
    opening,
    width,
    count,
    gap,
    last: readPositive(outputs, 'lastRip') ?? width,
    starts: Array.from({ length: count }, (_, at) => first + at * (width + gap)),
  }
}

function drawBoards(
  drawing: Drawing,
  { left, right, top, base }: Area,
  row: LaidRow,
  isRipped: boolean,
) {
  const stop = 12
  drawing.coloured(() => {
    for (const x of [left - stop, right])
      drawing.rect(x, -base - 8, stop, base - top + 16, 'p2 m-timber3')
    row.staves.forEach((stave, at) => {
      const isLast = at === row.staves.length - 1
      const style = isLast && isRipped ? 'p2 m-timber2' : 'p1b m-timber'
      drawing.rect(stave.left, -base, stave.right - stave.left, base - top, style)
    })
  })
  if (row.breakAt !== undefined) drawBreak(drawing, row.breakAt, top - 6, base + 6)
}

/** Width, gap and last rip, each on a row of its own so that none meets another. */
function letterBoards(
  drawing: Drawing,
  input: CalculatorSheetInput,
  boards: Boards,
  area: Area,
  row: LaidRow,
): number {
  const { staves } = row
  const step = input.size === 'narrow' ? 22 : 26
  const [first, second, last] = [staves[0], staves[1], staves.at(-1)]
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres)
  const opening = figure('opening', boards.opening)
  dimensionRow(drawing, area.left, area.right, area.top - 8, area.top - 30, opening.text, opening)
  let line = area.base + 4
  if (first && staves.length > 1) {
    line += step
    const width = figure('boardWidth', boards.width)
    dimensionRow(drawing, first.left, first.right, area.base, line, width.text, width)
  }
  if (first && second) {
    line += step
    const gap = figure('gap', boards.gap)
    dimensionRow(drawing, first.right, second.left, area.base, line, gap.text, gap)
  }
  const isRipped = boards.last < boards.width - 1e-9
  if (last && (isRipped || staves.length === 1 || input.asked === 'lastRip')) {
    line += step
    const rip = figure('lastRip', boards.last)
    const beyond = last.left > area.left + 100 ? 'before' : 'after'
    const options = { ...rip, beyond } as const
    dimensionRow(drawing, last.left, last.right, area.base, line, rip.text, options)
  }
  return line
}

function captions(
  drawing: Drawing,
  input: CalculatorSheetInput,
  boards: Boards,
  row: LaidRow,
): [string, string][] {
  const count = figureOf(input, 'count', String(boards.count))
  const lines: [string, string][] = [
    [`${count.text} ${boards.count === 1 ? 'board' : 'boards'}`, count.chalk ? 'askt' : 'vtitle'],
  ]
  if (!input.asked) lines.push([describeMarks(drawing, boards.starts, input.system), 'tx'])
  if (boards.last < boards.width / 3 && !input.asked)
    lines.push(['the last board is a thin strip: share it', 'slipt'])
  if (row.breakAt !== undefined) lines.push(['row cut short', 'vsub'])
  if (row.isWidened) lines.push(['boards drawn wider than they are', 'vsub'])
  return lines
}

/** Draws the boards of an opening side by side between their stops. */
export function drawBoardsSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const boards = readBoards(input)
  if (!boards) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const area: Area = narrow
    ? { left: 34, right: 262, top: 58, base: 148 }
    : { left: 96, right: 596, top: 66, base: 196 }
  const laid = { starts: boards.starts, width: boards.width, last: boards.last }
  const row = layOutRow(
    { ...laid, total: boards.opening },
    area.left,
    area.right - area.left,
    input.asked === 'count',
  )
  drawBoards(drawing, area, row, boards.last < boards.width - 1e-9)
  const line = letterBoards(drawing, input, boards, area, row)
  const lines = captions(drawing, input, boards, row)
  const start = narrow ? 20 : area.left
  lines.forEach(([text, style], at) => drawing.text(start, line + 34 + at * 19, text, style))
  drawing.height = line + 34 + lines.length * 19 - 6
  return { drawing, words: describe(input, boards, lines) }
}

function describe(input: CalculatorSheetInput, boards: Boards, lines: [string, string][]): string {
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres).text
  const isRipped = boards.last < boards.width - 1e-9 || input.asked === 'lastRip'
  const last = isRipped ? `, the last one ${figure('lastRip', boards.last)}` : ''
  const gap = boards.count > 1 ? `, gap ${figure('gap', boards.gap)}` : ''
  const said = lines.map(([text]) => text).join('; ')
  return `Boards side by side in an opening of ${figure('opening', boards.opening)}${unit}, each ${figure('boardWidth', boards.width)}${gap}${last}: ${said}.`
}
