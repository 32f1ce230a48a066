import { tinWords } from '../../../shared/calculators/coatingTin'
import { formatQuantity } from '../../../shared/units/format'
import { formatNumber } from '../../../shared/units/number'
import {
  figureOf,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { drawCoatedBoards, drawTin } from './coatingBoards'
import { Drawing } from './drawing'

interface Coating {
  area: string
  coats: number
  extra: string
  covers: string
  all: Figure
  one: Figure
}

function readCoating(input: CalculatorSheetInput): Coating | null {
  const { system, values, outputs } = input
  const area = readPositive(values, 'area')
  const coats = readPositive(values, 'coats')
  const coverage = readPositive(values, 'coverage')
  if (!area || !coats || !coverage || !readPositive(outputs, 'volume')) return null
  const unit = system === 'imperial' ? 'gal' : 'L'
  const volume = (name: string) =>
    figureOf(input, name, formatQuantity(readNumber(outputs, name), 'volume', system, { unit }))
  const rough = readNumber(values, 'roughness')
  return {
    area: formatQuantity(area, 'area', system),
    coats,
    extra: rough > 0 ? `${formatNumber(rough, 1)} % more for a rough face` : 'planed, no extra',
    covers: `${tinWords(values)} covers ${formatQuantity(coverage, 'area', system)}`,
    all: volume('volume'),
    one: volume('volumePerCoat'),
  }
}

const countCoats = (coats: number) => `${formatNumber(coats, 0)} ${coats === 1 ? 'coat' : 'coats'}`

/** The lines beside or under the tin: what to buy, and what one coat takes. */
function tinLines({ all, one, coats }: Coating, asked: string | undefined) {
  const tells = asked === 'volume' && coats === 1
  const first = { text: `${all.text} for ${countCoats(coats)}`, chalk: all.chalk }
  return tells || coats === 1
    ? [asked === 'volumePerCoat' ? { text: `${one.text} a coat`, chalk: true } : first]
    : [first, { text: `${one.text} a coat`, chalk: one.chalk }]
}

/** Draws boards with one coat after the other, and the tin that it takes. */
export function drawCoatingSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const coating = readCoating(input)
  if (!coating) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const boards = narrow
    ? { left: 14, top: 34, width: 206, height: 112 }
    : { left: 60, top: 44, width: 390, height: 176 }
  drawCoatedBoards(drawing, boards, coating.coats)
  const tin = narrow ? { x: 273, half: 32, top: 72 } : { x: 572, half: 52, top: 96 }
  const base = boards.top + boards.height
  drawTin(drawing, tin, base - tin.half * 0.22)
  const row = base + (narrow ? 26 : 30)
  const gap = drawing.figure + 6
  const about = [`${coating.area}, ${countCoats(coating.coats)}`, coating.extra, coating.covers]
  about.forEach((line, index) =>
    drawing.text(boards.left, row + index * gap, line, index ? 'vsub' : 'vtitle'),
  )
  const lines = tinLines(coating, input.asked)
  const under = narrow ? row + about.length * gap + 4 : row
  lines.forEach(({ text, chalk }, index) => {
    const style = chalk ? 'askt' : index ? 'vsub' : 'vtitle'
    const place = narrow ? boards.left : tin.x
    drawing.text(place, under + index * gap, text, style, narrow ? 'start' : 'middle')
  })
  drawing.height = narrow ? under + lines.length * gap : row + about.length * gap - 2
  return { drawing, words: describe(coating, input.asked) }
}

function describe(coating: Coating, asked: string | undefined): string {
  const takes = tinLines(coating, asked).map(({ text }) => text.replace('?', 'how much'))
  return `Boards of ${coating.area} with ${countCoats(coating.coats)}, ${coating.extra}, ${coating.covers}: ${takes.join(', ')}.`
}

/** A wall half coated and its tin: how much for two coats? */
export function drawCoatingPicture(drawing: Drawing): void {
  drawCoatedBoards(drawing, { left: 14, top: 26, width: 138, height: 78 }, 2)
  drawTin(drawing, { x: 192, half: 24, top: 34 }, 78)
  drawing.text(192, 106, '?', 'ask1', 'middle', 17)
}
