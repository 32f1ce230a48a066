import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
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
import { drawFallSection, placeRun, timesSteeper, type FallSection } from './fallSection'
import type { RoundFigure } from './figures'

/** A fall in every way it is said, by the name of the input that says it so. */
const WAYS: [name: string, write: (ratio: number, system: UnitSystem) => string][] = [
  ['perMetre', (ratio, system) => slope(ratio, system, 'mm/m')],
  ['perFoot', (ratio, system) => slope(ratio, system, 'in/ft')],
  ['percent', (ratio, system) => formatQuantity(ratio * 100, 'percent', system)],
  ['ratio', (ratio, system) => formatQuantity(ratio, 'ratio', system, { unit: '1:n' })],
  ['angle', (ratio, system) => formatQuantity(Math.atan(ratio), 'angle', system)],
]

const slope = (ratio: number, system: UnitSystem, unit: string) =>
  formatQuantity(ratio, 'ratio', system, { unit }).replace(/\/(m|ft)$/, ' per $1')

const isAsking = ({ asked }: CalculatorSheetInput) => asked !== undefined && asked !== ''

/** What was given; every way where nothing is asked. Nobody needs inches beside millimetres. */
function findWays(input: CalculatorSheetInput, ratio: number): { name: string; text: string }[] {
  const other = input.system === 'metric' ? 'perFoot' : 'perMetre'
  return WAYS.flatMap(([name, write]) => {
    const isGiven = input.values[name] !== undefined
    const isShown = isGiven || (!isAsking(input) && name !== other)
    return isShown ? [{ name, text: figureOf(input, name, write(ratio, input.system)).text }] : []
  })
}

/** What is asked for, where the section has no place for it. */
const QUESTIONS: Record<string, string> = {
  enoughToDrain: 'enough to drain: ?',
  percent: 'per cent: ?',
  angle: 'angle: ?',
}

/** The line under the drawing: the question, else whether water runs off. */
function lastLine(input: CalculatorSheetInput): { text: string; style: string } | undefined {
  const question = QUESTIONS[input.asked ?? '']
  if (question) return { text: question, style: 'askt' }
  if (isAsking(input)) return undefined
  return input.outputs?.enoughToDrain === 'yes'
    ? { text: 'enough for water to run off', style: 'okt' }
    : { text: 'too flat: water stays', style: 'slipt' }
}

/** Draws a surface that falls, in section along the way the water runs. */
export function drawFallSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const runM = readPositive(input.values, 'run')
  if (!runM || !input.outputs) return null
  const narrow = input.size === 'narrow'
  const ratio = readNumber(input.outputs, 'percent') / 100
  const ways = findWays(input, ratio)
  const given = ways.find(({ name }) => input.values[name] !== undefined) ?? ways[0]
  const section: FallSection = {
    narrow,
    ratio,
    run: lengthFigure(input, 'run', runM),
    drop: lengthFigure(input, 'drop', readNumber(input.outputs, 'drop')),
    words: given?.text ?? '',
    hasBuilding: input.values.besideBuilding === 'yes',
  }
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const top = caption(drawing, section)
  const row = drawFallSection(drawing, section, top)
  drawing.height = drawLines(drawing, input, ways, row + 34)
  return { drawing, words: describe(input, section, ways) }
}

/** Title, and how much steeper the fall is drawn than it is; gives the row below. */
function caption(drawing: Drawing, section: FallSection): number {
  const left = section.narrow ? 10 : 24
  const { left: from, right } = placeRun(drawing, section.drop.text, section.narrow)
  const times = timesSteeper(section.ratio, right - from)
  drawing.text(left, 22, 'Section', 'vtitle')
  const note = times > 1 ? `fall drawn ${times} times steeper` : 'fall to scale'
  drawing.text(left + drawing.textWidth('Section') + 12, 22, note, 'vsub')
  return 30
}

/** Words in a row, or in two where one is too long for the sheet. */
function breakLine(drawing: Drawing, words: string[]): string[] {
  const join = (some: string[]) => some.join('  ·  ')
  if (drawing.textWidth(join(words)) < drawing.width - 16) return [join(words)]
  const half = Math.ceil(words.length / 2)
  return [join(words.slice(0, half)), join(words.slice(half))]
}

/** The other ways to say it and the verdict; gives the height the sheet then needs. */
function drawLines(
  drawing: Drawing,
  input: CalculatorSheetInput,
  ways: { name: string; text: string }[],
  row: number,
): number {
  const middle = drawing.width / 2
  const said = lastLine(input)
  let base = row
  // The one way that was given stands on the surface already.
  const lines =
    ways.length > 1
      ? breakLine(
          drawing,
          ways.map(({ text }) => text),
        )
      : []
  for (const line of lines) {
    drawing.text(middle, base, line, 'vsub', 'middle')
    base += 21
  }
  if (said) {
    drawing.text(middle, base, said.text, said.style, 'middle')
    base += 21
  }
  return base - 7
}

function describe(
  input: CalculatorSheetInput,
  { run, drop, hasBuilding }: FallSection,
  ways: { text: string }[],
): string {
  const unit = input.system === 'metric' ? ' mm' : ''
  const lower = drop.chalk
    ? 'how much lower the far edge lies is asked'
    : `the far edge ${drop.text}${unit} lower`
  const where = hasBuilding ? ' beside a building' : ''
  const said = lastLine(input)?.text ?? ''
  const judged =
    said && ` ${said[0]?.toUpperCase() ?? ''}${said.slice(1).replace(': ?', ' is asked')}.`
  const fall = ways.map(({ text }) => text.replace('?', 'what is asked'))
  return `Section of a surface that falls${where}: run ${run.text}${unit}, ${lower}, fall ${fall.join(', ')}.${judged}`
}

/** A surface that falls under a level line: how much lower is the far edge? */
export function drawFallPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.coloured(() => drawing.path('M24 46L186 66V90H24Z', 'p2 m-concrete'))
  drawing.path('M24 46H200', 'datum')
  dimensionColumn(drawing, 46, 66, 186, 196, '?', { chalk: true, level: true })
  dimensionRow(drawing, 24, 186, 40, 22, figure(1100, 42))
}
