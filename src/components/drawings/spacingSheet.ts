import { describeMarks, drawBreak, layOutRow, type LaidRow, type Stave } from './boardsRow'
import {
  figureOf,
  lengthFigure,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
} from './calculatorSheet'
import { dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { formatDrawnLength } from './figures'

interface Spacing {
  run: number
  width: number
  count: number
  centres: number
  clear: number
}

/** Where the members stand on the sheet, in pixels. */
interface Area {
  left: number
  right: number
  top: number
  base: number
}

function readSpacing({ values, outputs }: CalculatorSheetInput): Spacing | null {
  const [run, width] = [readPositive(values, 'run'), readPositive(values, 'memberWidth')]
  const [count, centres] = [readPositive(outputs, 'count'), readPositive(outputs, 'centres')]
  if (!run || !width || !count || !centres || count < 2) return null
  return { run, width, count, centres, clear: readPositive(outputs, 'clear') ?? 0 }
}

const middle = ({ left, right }: Stave) => (left + right) / 2

/** The members on their rail, with a crow’s foot at the near edge of each. */
function drawMembers(drawing: Drawing, { left, right, top, base }: Area, row: LaidRow): void {
  drawing.coloured(() => {
    for (const stave of row.staves)
      drawing.rect(stave.left, -base, stave.right - stave.left, base - top, 'p2 m-timber')
    drawing.rect(left - 8, -top - 16, right - left + 16, 16, 'p1b m-timber2')
  })
  for (const stave of row.staves)
    drawing.path(
      `M${stave.left - 4} ${top + 2}L${stave.left} ${top + 14}L${stave.left + 4} ${top + 2}`,
      'chalkline',
    )
  if (row.breakAt !== undefined) drawBreak(drawing, row.breakAt, top - 26, base + 6)
}

/** Centres, clear space and width, each on a row of its own. */
function letterMembers(
  drawing: Drawing,
  input: CalculatorSheetInput,
  spacing: Spacing,
  area: Area,
  [first, second]: readonly [Stave, Stave],
): number {
  const step = input.size === 'narrow' ? 22 : 26
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres)
  const run = figure('run', spacing.run)
  dimensionRow(drawing, area.left, area.right, area.top - 22, area.top - 44, run.text, run)
  const width = figure('memberWidth', spacing.width)
  const rows: [number, number, ReturnType<typeof figure>][] = [[first.left, first.right, width]]
  const asked = input.asked ?? ''
  if (asked !== 'count') {
    const centres = figure('centres', spacing.centres)
    rows.push([middle(first), middle(second), centres])
    if (asked !== 'centres') rows.push([first.right, second.left, figure('clear', spacing.clear)])
  }
  rows.forEach(([from, to, shown], at) =>
    dimensionRow(drawing, from, to, area.base, area.base + 4 + step * (at + 1), shown.text, shown),
  )
  return area.base + 4 + step * rows.length
}

function captions(
  drawing: Drawing,
  input: CalculatorSheetInput,
  spacing: Spacing,
  row: LaidRow,
): [string, string][] {
  const count = figureOf(input, 'count', String(spacing.count))
  const lines: [string, string][] = [
    [`${count.text} in all`, count.chalk ? 'askt' : 'vtitle'],
    [`centres at most ${formatDrawnLength(Number(input.values.maxCentres), input.system)}`, 'tx'],
  ]
  const marks = input.outputs?.marks
  if (!input.asked && Array.isArray(marks))
    lines.push([describeMarks(drawing, marks as readonly number[], input.system), 'tx'])
  if (row.breakAt !== undefined) lines.push(['row cut short', 'vsub'])
  if (row.isWidened) lines.push(['members drawn wider than they are', 'vsub'])
  return lines
}

/** Draws members at equal centres under a rail, marked from the left end. */
export function drawSpacingSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const spacing = readSpacing(input)
  if (!spacing) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const area: Area = narrow
    ? { left: 30, right: 260, top: 74, base: 158 }
    : { left: 96, right: 600, top: 84, base: 200 }
  const starts = Array.from({ length: spacing.count }, (_, at) => at * spacing.centres)
  const members = { starts, width: spacing.width, last: spacing.width, total: spacing.run }
  const row = layOutRow(members, area.left, area.right - area.left, input.asked === 'count')
  const [first, second] = row.staves
  if (!first || !second) return null
  drawMembers(drawing, area, row)
  const line = letterMembers(drawing, input, spacing, area, [first, second])
  const lines = captions(drawing, input, spacing, row)
  const start = narrow ? 20 : area.left
  lines.forEach(([text, style], at) => drawing.text(start, line + 34 + at * 19, text, style))
  drawing.height = line + 34 + lines.length * 19 - 6
  return { drawing, words: describe(input, spacing, lines) }
}

function describe(
  input: CalculatorSheetInput,
  spacing: Spacing,
  lines: [string, string][],
): string {
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const figure = (name: string, metres: number) => lengthFigure(input, name, metres).text
  const asked = input.asked ?? ''
  const centres =
    asked === 'count' ? '' : `, centre to centre ${figure('centres', spacing.centres)}`
  const clear =
    asked === 'count' || asked === 'centres' ? '' : `, clear ${figure('clear', spacing.clear)}`
  const said = lines.map(([text]) => text).join('; ')
  return `A run of ${figure('run', spacing.run)}${unit} outside to outside, each ${figure('memberWidth', spacing.width)} wide${centres}${clear}: ${said}.`
}
