import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
import { formatNumber } from '../../../shared/units/number'
import {
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
} from './calculatorSheet'
import { dimensionColumn } from './dimensions'
import { Drawing } from './drawing'
import type { RoundFigure } from './figures'
import { drawHolePlan, drawHoleSection, measureHole, type Hole } from './postholeHole'

function readHole(input: CalculatorSheetInput): Hole | null {
  const read = (name: string) => readPositive(input.values, name)
  const [diameterM, depthM] = [read('diameter'), read('depth')]
  const [wide, thick] = [read('postWidth'), read('postDepth')]
  if (!diameterM || !depthM || !wide || !thick || !input.outputs) return null
  return {
    narrow: input.size === 'narrow',
    diameterM,
    depthM,
    postM: [wide, thick],
    diameter: lengthFigure(input, 'diameter', diameterM),
    depth: lengthFigure(input, 'depth', depthM),
    post: [lengthFigure(input, 'postWidth', wide), lengthFigure(input, 'postDepth', thick)],
  }
}

interface Line {
  text: string
  chalk: boolean
}

const volumeText = (cubic: number, system: UnitSystem) =>
  formatQuantity(cubic, 'volume', system, { unit: system === 'metric' ? 'L' : 'ft³' })

/** From one hole to the bags; what follows the asked figure would tell it. */
function listAmounts({ values, outputs, system, asked }: CalculatorSheetInput): Line[] {
  const count = readNumber(values, 'count')
  const holes = `${formatNumber(count, 0)} ${count === 1 ? 'hole' : 'holes'}`
  const volume = (name: string) => volumeText(readNumber(outputs, name), system)
  const bags = formatNumber(readNumber(outputs, 'bags'), 0)
  const bag = typeof values.bag === 'string' ? ` of ${values.bag}` : ''
  const lines: [name: string, value: string, write: (value: string) => string][] = [
    ['volumeEach', volume('volumeEach'), (value) => `one hole: ${value}`],
    ['volume', volume('volume'), (value) => `${holes}: ${value}`],
    ['volumeWithWaste', volume('volumeWithWaste'), (value) => `with waste: ${value}`],
    ['bags', bags, (value) => `${value} ${value === '1' ? 'bag' : 'bags'}${bag}`],
  ]
  const last = lines.findIndex(([name]) => name === asked)
  const shown = last < 0 ? lines : lines.slice(0, last + 1)
  return shown.map(([name, value, write]) => ({
    text: write(name === asked ? '?' : value),
    chalk: name === asked,
  }))
}

function drawAmounts(drawing: Drawing, lines: Line[], left: number, row: number): number {
  lines.forEach(({ text, chalk }, index) => {
    const style = chalk ? 'askt' : index === 3 ? 'vtitle' : 'tx'
    drawing.text(left, row + index * 20, text, style)
  })
  return row + (lines.length - 1) * 20
}

/** Draws one post in its hole, in section and from above, and what all holes take. */
export function drawPostholeSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const hole = readHole(input)
  if (!hole) return null
  const { narrow } = hole
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const lines = listAmounts(input)
  const note = measureHole(hole).isStretched ? 'not to scale' : ''
  const [titleLeft, indent] = [narrow ? 10 : 24, narrow ? 22 : 36]
  drawing.text(titleLeft, 22, 'Section', 'vtitle')
  if (note) drawing.text(indent + drawing.textWidth('Section'), 22, note, 'vsub')
  const low = drawHoleSection(drawing, hole, narrow ? 128 : 190, 96)
  if (narrow) {
    drawing.text(titleLeft, low + 34, 'Plan', 'vtitle')
    const plan = drawHolePlan(drawing, hole, 62, low + 46)
    const amounts = drawAmounts(drawing, lines, 22, plan + 32)
    drawing.height = amounts + 14
  } else {
    drawing.text(440, 22, 'Plan', 'vtitle')
    const plan = drawHolePlan(drawing, hole, 510, 40)
    const amounts = drawAmounts(drawing, lines, 440, plan + 42)
    drawing.height = Math.max(low, amounts) + 16
  }
  return { drawing, words: describe(input, hole, lines) }
}

function describe({ system }: CalculatorSheetInput, hole: Hole, lines: Line[]): string {
  const unit = system === 'metric' ? ' mm' : ''
  const amounts = lines.map(({ text, chalk }) =>
    chalk ? text.replace('? bags', 'how many bags').replace('?', 'what is asked') : text,
  )
  const [wide, thick] = hole.post
  return `A post of ${wide.text} by ${thick.text}${unit} in a round hole, ${hole.diameter.text}${unit} across and ${hole.depth.text}${unit} deep, in section and from above. Concrete: ${amounts.join('; ')}.`
}

/** A post in its hole under the ground: how many bags? */
export function drawPostholePicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.coloured(() => {
    drawing.rect(8, -114, 204, 76, 'nostroke m-earth')
    drawing.path('M82 38L78 108H142L138 38Z', 'p2 m-concrete')
    drawing.rect(100, -94, 20, 86, 'p2 m-timber')
  })
  drawing.path('M8 38H80M140 38H212', 'p3')
  dimensionColumn(drawing, 38, 108, 142, 160, figure(600, 24), { level: true })
  drawing.text(46, 80, '? bags', 'ask1', 'middle', 15)
}
