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
import { formatDrawnLength } from './figures'
import { formatNumber } from '../../../shared/units/number'

const INCH = 0.0254
/** The order in which sizes are worked; what follows from the asked number is not shown. */
const ORDER = ['thickness', 'width', 'boardFeet', 'shortfall']

/** A named size and what it measures, in metres. */
interface Lumber {
  name: string
  named: { thickness: number; width: number }
  thickness: number
  width: number
}

/** The end of a board in pixels, its width upright. */
interface Section {
  left: number
  base: number
  thickness: number
  width: number
  /** The named size, before drying and planing. */
  rough: { left: number; top: number; thickness: number; width: number }
  isWidened: boolean
}

function readLumber({ values, outputs }: CalculatorSheetInput): Lumber | null {
  const parts = /^(\d+)(?:\/(\d+))?x(\d+)$/.exec(String(values.nominal))
  const [thickness, width] = [readPositive(outputs, 'thickness'), readPositive(outputs, 'width')]
  if (!parts || !thickness || !width) return null
  const named = {
    thickness: (Number(parts[1]) / Number(parts[2] ?? 1)) * INCH,
    width: Number(parts[3]) * INCH,
  }
  return { name: String(values.nominal).replace('x', ' × '), named, thickness, width }
}

const isShown = ({ asked }: CalculatorSheetInput, name: string): boolean => {
  const at = ORDER.indexOf(asked ?? '')
  return at < 0 || ORDER.indexOf(name) <= at
}

function layOutSection(lumber: Lumber, narrow: boolean): Section {
  const height = narrow ? 150 : 230
  const scale = height / lumber.named.width
  const thickness = Math.max(12, lumber.thickness * scale)
  const isWidened = thickness > lumber.thickness * scale + 0.5
  const grown = isWidened ? lumber.named.thickness / lumber.thickness : 1
  const rough = {
    thickness: isWidened ? thickness * grown : lumber.named.thickness * scale,
    width: height,
  }
  const width = lumber.width * scale
  const left = narrow ? 84 : 190
  const top = 34
  return {
    left,
    base: top + height - (height - width) / 2,
    thickness,
    width,
    rough: { ...rough, left: left - (rough.thickness - thickness) / 2, top },
    isWidened,
  }
}

function drawSection(drawing: Drawing, section: Section): void {
  const { left, base, thickness, width, rough } = section
  drawing.coloured(() => drawing.rect(left, -base, thickness, width, 'p3 m-timber'))
  for (const share of [0.24, 0.5, 0.76]) {
    const y = base - width * share
    drawing.path(
      `M${left + 3} ${y + 5}Q${left + thickness / 2} ${y - 9} ${left + thickness - 3} ${y + 5}`,
      'grain nofill',
    )
  }
  drawing.path(
    `M${rough.left} ${rough.top}h${rough.thickness}v${rough.width}h${-rough.thickness}Z`,
    'p1 dash nofill',
  )
}

function letterSection(
  drawing: Drawing,
  input: CalculatorSheetInput,
  lumber: Lumber,
  section: Section,
): void {
  const { left, base, thickness, width, rough } = section
  const low = rough.top + rough.width
  const thick = lengthFigure(input, 'thickness', lumber.thickness)
  dimensionRow(drawing, left, left + thickness, low + 2, low + 26, thick.text, thick)
  if (!isShown(input, 'width')) return
  const wide = lengthFigure(input, 'width', lumber.width)
  const column = rough.left - (input.size === 'narrow' ? 22 : 34)
  dimensionColumn(drawing, base - width, base, rough.left, column, wide.text, wide)
}

function captions(input: CalculatorSheetInput, lumber: Lumber): [string, string][] {
  const { values, outputs, system, asked } = input
  const state = values.moisture === 'green' ? 'green' : 'dry'
  const lines: [string, string][] = [
    [`named ${lumber.name} in, ${state}`, 'vtitle'],
    ['dashed: the named size', 'tx'],
  ]
  const boardFeet = outputs?.boardFeet
  if (typeof boardFeet === 'number' && isShown(input, 'boardFeet')) {
    const feet = figureOf(input, 'boardFeet', formatNumber(boardFeet, 2))
    const length = formatDrawnLength(readNumber(values, 'length'), system)
    lines.push([`${length} long: ${feet.text} board feet`, feet.chalk ? 'askt' : 'tx'])
  } else if (asked === 'boardFeet') lines.push(['? board feet', 'askt'])
  const measured = readPositive(values, 'measuredWidth')
  if (measured && isShown(input, 'shortfall')) {
    lines.push([`your board ${formatDrawnLength(measured, system)} wide`, 'tx'])
    lines.push(shortfallLine(input))
  } else if (asked === 'shortfall') lines.push(['? narrower', 'askt'])
  return lines
}

/** How your own board compares with the table. */
function shortfallLine(input: CalculatorSheetInput): [string, string] {
  const short = readNumber(input.outputs, 'shortfall')
  if (input.asked === 'shortfall') return ['narrower by ?', 'askt']
  if (Math.abs(short) < 5e-5) return ['as wide as it should be', 'okt']
  const by = formatDrawnLength(Math.abs(short), input.system)
  return [`${short > 0 ? 'narrower' : 'wider'} by ${by}`, short > 0 ? 'slipt' : 'tx']
}

/** Draws the end of a board as it measures, within the size it is named by. */
export function drawLumberSizeSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const lumber = readLumber(input)
  if (!lumber) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const section = layOutSection(lumber, narrow)
  drawSection(drawing, section)
  letterSection(drawing, input, lumber, section)
  const low = section.rough.top + section.rough.width + 40
  const lines = captions(input, lumber)
  const side = narrow ? { x: 20, y: low + 24 } : { x: 430, y: 84 }
  const notes: [string, string][] = section.isWidened
    ? [['thickness drawn larger than it is', 'vsub']]
    : []
  const rows = [...lines, ...notes]
  rows.forEach(([text, style], at) => drawing.text(side.x, side.y + at * 20, text, style))
  drawing.height = Math.max(low, side.y + rows.length * 20 - 8)
  const unit = input.system === 'metric' ? ' millimetres' : ''
  const width = isShown(input, 'width')
    ? ` by ${lengthFigure(input, 'width', lumber.width).text}`
    : ' thick'
  const size = `${lengthFigure(input, 'thickness', lumber.thickness).text}${width}`
  const said = lines.map(([text]) => text).join(', ')
  return { drawing, words: `The end of a board that measures ${size}${unit}: ${said}.` }
}
