import type { UnitSystem } from '../../../shared/contracts/exercises'
import { drawCutBar, headBar, namePieces, type BarPlace, type Saw } from './cutListBar'
import { fitText, formatCutLength, wrapParts } from './cutListFigures'
import type { CutGroup } from './cutListGroups'
import { drawCutScale } from './cutListScale'
import type { CalculatorSheet } from './calculatorSheet'
import { dimensionRow } from './dimensions'
import { Drawing } from './drawing'

export type CutListSheetSize = 'wide' | 'middle' | 'narrow'

export interface CutListSheetInput {
  groups: readonly CutGroup[]
  saw: Saw
  system: UnitSystem
  size: CutListSheetSize
  /** Names a section as it is sold in this system. */
  nameSection: (section: string) => string
}

/** Widths in pixels; on a wide sheet the headings stand beside their bars, else over them. */
const LAYOUTS = {
  wide: { width: 862, left: 164, right: 842, figure: 14, bar: 36 },
  middle: { width: 600, left: 12, right: 588, figure: 13, bar: 34 },
  narrow: { width: 326, left: 8, right: 316, figure: 12, bar: 32 },
} as const

type Layout = (typeof LAYOUTS)[CutListSheetSize]

/** Shorter than this, in pixels, a bar is drawn longer than it is. */
const LEAST_BAR = 40
/** As many different bars as one sheet holds. */
const BARS_ON_SHEET = 12

interface Sheet extends CutListSheetInput {
  /** The longest bar of all sheets, so that they are to one scale. */
  longestMm: number
  drawing: Drawing
  layout: Layout
  isBeside: boolean
  /** How far down the sheet is drawn, in pixels. */
  y: number
  isAnyLengthened: boolean
}

const lineOf = ({ drawing }: Sheet) => drawing.figure + 6

function drawSectionHead(sheet: Sheet, section: string) {
  const { drawing, layout, isBeside } = sheet
  const name = sheet.nameSection(section)
  const room = isBeside ? layout.left - 20 : layout.width - 20
  sheet.y += sheet.y > 0 ? 14 : 0
  if (isBeside) {
    drawing.text(0, sheet.y + 22, fitText(drawing, name, room), 'vtitle')
    return
  }
  drawing.text(layout.left, sheet.y + 16, fitText(drawing, name, room), 'vtitle')
  sheet.y += 24
}

/** How many alike, of which length, and what is left over: beside the bar, or over it in one line. */
function drawBarHead(sheet: Sheet, group: CutGroup, place: BarPlace) {
  const { drawing, layout, isBeside, system } = sheet
  const room = isBeside ? layout.left - 24 : layout.width - 20
  const head = headBar(drawing, group, system, room)
  const left = formatCutLength(group.offcutMm, system)
  const rest = group.offcutMm > 0 ? `offcut ${left}` : 'no offcut'
  if (isBeside) {
    drawing.text(0, place.top + 14, head, 'vtitle')
    drawing.text(0, place.top + 32, fitText(drawing, rest, room), 'tx')
    return
  }
  drawing.text(layout.left, sheet.y + 14, head, 'vtitle')
  const from = layout.left + drawing.textWidth(head) + 10
  drawing.text(from, sheet.y + 14, fitText(drawing, rest, layout.width - from - 4), 'tx')
}

/** The pieces by name, where the bar itself has no room for them. */
function drawPieceList(sheet: Sheet, group: CutGroup) {
  const { drawing, layout, system } = sheet
  const names = namePieces(group, system)
  const parts = names.map((name, at) => (at < names.length - 1 ? `${name},` : name))
  const lines = wrapParts(drawing, parts, layout.width - layout.left - 12)
  lines.forEach((line, at) =>
    drawing.text(layout.left, sheet.y + 16 + at * (lineOf(sheet) - 1), line, 'tx'),
  )
  sheet.y += lines.length * (lineOf(sheet) - 1) + 4
}

function drawGroup(sheet: Sheet, group: CutGroup, before: CutGroup | undefined) {
  const { drawing, layout, isBeside } = sheet
  if (group.section !== before?.section) drawSectionHead(sheet, group.section)
  const isDimensioned = group.section !== before?.section || group.stockMm !== before.stockMm
  const headHigh = isBeside ? 0 : 22
  const dimensionHigh = isDimensioned ? 34 : 12
  const top = sheet.y + headHigh + dimensionHigh
  const toScale = (layout.right - layout.left) / sheet.longestMm
  const scale = Math.max(toScale, LEAST_BAR / group.stockMm)
  if (scale > toScale * 1.001) sheet.isAnyLengthened = true
  const place = { left: layout.left, top, height: layout.bar, scale }
  drawBarHead(sheet, group, place)
  if (isDimensioned) {
    const right = layout.left + group.stockMm * scale
    const text = formatCutLength(group.stockMm, sheet.system)
    dimensionRow(drawing, layout.left, right, top - 2, top - 20, text)
  }
  const isLettered = drawCutBar(drawing, group, place, sheet.saw, sheet.system)
  sheet.y = top + layout.bar + 8
  if (!isLettered) drawPieceList(sheet, group)
  sheet.y += isBeside ? 6 : 8
}

/** What gaps and hatching mean. */
function captions({ saw, system, isAnyLengthened, groups }: Sheet): string[] {
  const isHatched = groups.some(({ offcutMm }) => offcutMm > 0)
  return [
    ...(saw.kerfMm > 0 ? [`Gap: saw cut, ${formatCutLength(saw.kerfMm, system)}.`] : []),
    ...(saw.endTrimMm > 0
      ? [`Hatched at the left: end trim, ${formatCutLength(saw.endTrimMm, system)}.`]
      : []),
    ...(isHatched ? ['Hatched at the right: offcut.'] : []),
    ...(isAnyLengthened ? ['Bars this short are drawn longer than they are.'] : []),
  ]
}

function drawFoot(sheet: Sheet) {
  const { drawing, layout } = sheet
  const scale = (layout.right - layout.left) / sheet.longestMm
  sheet.y += drawCutScale(drawing, { ...layout, top: sheet.y + 4, scale }, sheet)
  const lines = wrapParts(drawing, captions(sheet), layout.width - layout.left - 12)
  lines.forEach((line, at) =>
    drawing.text(layout.left, sheet.y + 18 + at * lineOf(sheet), line, 'tx'),
  )
  drawing.height = Math.ceil(sheet.y + lines.length * lineOf(sheet) + 10)
}

function drawSheet(input: CutListSheetInput, longestMm: number): CalculatorSheet {
  const layout = LAYOUTS[input.size]
  const drawing = new Drawing(layout.width, 0, undefined, layout.figure)
  const isBeside = input.size === 'wide'
  const sheet: Sheet = {
    ...input,
    ...{ longestMm, drawing, layout, isBeside, y: 0, isAnyLengthened: false },
  }
  input.groups.forEach((group, at) => drawGroup(sheet, group, input.groups[at - 1]))
  drawFoot(sheet)
  return { drawing, words: describe(input) }
}

/** Draws bars and how they are cut, all to one scale, on as many sheets as they need. */
export function drawCutListSheets(input: CutListSheetInput): CalculatorSheet[] {
  const { groups } = input
  const longestMm = Math.max(...groups.map(({ stockMm }) => stockMm))
  const sheets = Math.ceil(groups.length / BARS_ON_SHEET)
  return Array.from({ length: sheets }, (_, sheet) => {
    const from = sheet * BARS_ON_SHEET
    return drawSheet({ ...input, groups: groups.slice(from, from + BARS_ON_SHEET) }, longestMm)
  })
}

function describe({ groups, system, saw, nameSection }: CutListSheetInput): string {
  const unit = system === 'metric' ? ' millimetres' : ''
  const length = (mm: number) => `${formatCutLength(mm, system)}${unit}`
  const bars = groups.map((group) => {
    const alike = group.bars === 1 ? 'one bar' : `${group.bars} bars`
    const name = nameSection(group.section)
    const what = `${alike} of ${name ? `${name}, ` : ''}${length(group.stockMm)} long`
    const rest = group.offcutMm > 0 ? `offcut ${length(group.offcutMm)}` : 'no offcut'
    return `${what}, cut into ${namePieces(group, system).join(', ')}, ${rest}`
  })
  return `Bars drawn to scale with their saw cuts of ${length(saw.kerfMm)}: ${bars.join('; ')}.`
}
