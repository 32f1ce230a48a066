import { formatQuantity } from '../../../shared/units/format'
import { formatNumber } from '../../../shared/units/number'
import {
  figureOf,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { drawBoxes, drawWater, measureBoxes, type Column } from './batchBoxes'
import { Drawing } from './drawing'

/** In the order of the worked steps: what follows the asked figure would tell it. */
const ORDER = [
  'cement',
  'sand',
  'stone',
  'waterContent',
  'water',
  'waterCementRatio',
  'airTarget',
  'strengthEstimate',
] as const
type Name = (typeof ORDER)[number]

/** The figure of an amount; none for what would tell the asked one. */
function amount(input: CalculatorSheetInput, name: Name): Figure | undefined {
  const { outputs, system, asked } = input
  const last = ORDER.findIndex((one) => one === asked)
  if (last >= 0 && ORDER.indexOf(name) > last) return undefined
  const value = readPositive(outputs, name)
  if (value === undefined) return name === asked ? { text: '?', chalk: true } : undefined
  return figureOf(input, name, write(name, value, system === 'metric'))
}

function write(name: Name, value: number, metric: boolean): string {
  const system = metric ? 'metric' : 'imperial'
  const volume = (unit: string) => formatQuantity(value, 'volume', system, { unit })
  const writers: Record<Name, () => string> = {
    cement: () => formatQuantity(value, 'mass', system),
    sand: () => volume(metric ? 'L' : 'ft³'),
    stone: () => volume(metric ? 'L' : 'ft³'),
    water: () => volume(metric ? 'L' : 'qt'),
    waterContent: () =>
      formatQuantity(value, 'massDensity', system, { unit: metric ? 'kg/m³' : 'lb/yd³' }),
    waterCementRatio: () => formatNumber(value, 2),
    airTarget: () => formatQuantity(value, 'percent', system),
    strengthEstimate: () =>
      metric
        ? `${formatNumber(value / 1e6, 0)} MPa`
        : `${formatNumber(Math.round(value / 689475.729) * 100, 0)} psi`,
  }
  return writers[name]()
}

/** The dry heaps and the water as columns of one width, so that their heights compare volumes. */
function readColumns(input: CalculatorSheetInput): Column[] | null {
  const parts = String(input.values.proportions ?? '')
    .split(':')
    .map(Number)
  const names = ['cement', 'sand', 'stone'] as const
  const sand = readPositive(input.outputs, 'sand')
  const water = readPositive(input.outputs, 'water')
  if (parts.length !== 3 || parts.some((part) => !(part > 0)) || !sand || !water) return null
  const onePart = sand / (parts[1] ?? 1)
  const dry = names.map((name, index) => ({
    name,
    parts: parts[index] ?? 1,
    figure: amount(input, name),
  }))
  return [...dry, { name: 'water', parts: water / onePart, figure: amount(input, 'water') }]
}

/** What no column carries. */
function listLines(input: CalculatorSheetInput): Figure[] {
  const lines: [name: Name, before: string, after: string][] = [
    ['waterContent', 'water in the concrete: ', ''],
    ['waterCementRatio', 'water to cement, by weight: ', ''],
    ['airTarget', 'air: ', ''],
    ['strengthEstimate', 'in a laboratory about ', ', no promise'],
  ]
  const shown = lines.flatMap(([name, before, after]) => {
    const figure = amount(input, name)
    return figure ? [{ text: `${before}${figure.text}${after}`, chalk: figure.chalk }] : []
  })
  const isTooWet = !input.asked && input.outputs?.strengthEstimate === undefined
  return isTooWet ? [...shown, { text: 'weaker than the table goes', chalk: false }] : shown
}

/** Draws the gauge boxes of a batch side by side, with the water and what it comes to. */
export function drawBatchSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const columns = readColumns(input)
  if (!columns) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const left = narrow ? 10 : 24
  const title = 'Boxes of one size'
  drawing.text(left, 22, title, 'vtitle')
  const indent = left + drawing.textWidth(title) + 12
  drawing.text(indent, 22, narrow ? 'water to scale' : 'the water to the same scale', 'vsub')
  const layout = measureBoxes(narrow, columns)
  columns.forEach((column, index) => {
    if (column.name === 'water') drawWater(drawing, layout, column, index)
    else drawBoxes(drawing, layout, column, index)
  })
  let row = layout.base + (narrow ? 68 : 76)
  const lines = listLines(input)
  for (const { text, chalk } of lines) {
    drawing.text(left, row, text, chalk ? 'askt' : 'tx')
    row += 20
  }
  drawing.height = row - 6
  return { drawing, words: describe(columns, lines) }
}

function describe(columns: Column[], lines: Figure[]): string {
  const heaps = columns.map(({ name, parts, figure }) => {
    const amountText = figure ? (figure.chalk ? ', which is asked' : `, ${figure.text}`) : ''
    return name === 'water'
      ? `water${amountText}`
      : `${formatNumber(parts, 1)} of ${name}${amountText}`
  })
  const said = lines.map(({ text, chalk }) => (chalk ? text.replace('?', 'what is asked') : text))
  const rest = said.length ? ` ${said.join('; ')}.` : ''
  return `A batch measured in boxes of one size: ${heaps.join('; ')}.${rest.replace(/^ ./, (start) => start.toUpperCase())}`
}

/** Boxes of cement, sand and stone: how much of each? */
export function drawBatchPicture(drawing: Drawing): void {
  const box = (x: number, y: number, style: string) => drawing.rect(x, -y - 24, 36, 24, style)
  drawing.coloured(() => {
    box(24, 78, 'p2 m-steel')
    for (const y of [78, 54]) box(78, y, 'p2 m-boxwood')
    for (const y of [78, 54, 30]) box(132, y, 'p2 m-stonebed')
  })
  drawing.path('M10 102H212', 'p3')
  drawing.text(42, 68, '1', 'tx', 'middle')
  drawing.text(96, 44, '2', 'tx', 'middle')
  drawing.text(150, 20, '3', 'tx', 'middle')
  drawing.text(192, 74, '?', 'ask1', 'middle', 17)
}
