import { drawChip } from './ask'
import type { Figure } from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import type { Drawing, Point } from './drawing'
import { tenth } from './marks'
import { createRandom } from './random'
import { stippleArea } from './stipple'

/** A cut through the short side of a slab, the front on the left. Lengths in metres. */
export interface SlabSection {
  narrow: boolean
  runM: number
  thicknessM: number
  dropM: number
  /** The ground under the slab is level and only its top falls. */
  isBaseLevel: boolean
  run: Figure
  thickness: Figure
  drop: Figure
  /** Thickness at the back, where the ground is level and the top alone falls. */
  backThickness: string
  stone: string
  question?: string
}

interface Layout {
  left: number
  right: number
  /** Top of the concrete at the back and at the front. */
  back: number
  front: number
  /** Underside of the concrete at the back and at the front. */
  backUnder: number
  frontUnder: number
  bottom: number
  board: number
  bank: number
}

const between = (least: number, value: number, most: number) =>
  Math.min(most, Math.max(least, value))

/** How many times the heights are drawn larger than the lengths, and the heights in pixels. */
function measureHeights(section: SlabSection, width: number) {
  const across = width / section.runM
  const thickness = between(section.narrow ? 26 : 30, section.thicknessM * across, 90)
  const scale = thickness / section.thicknessM
  const stone = between(24, 0.1 * scale, 60)
  const drop = Math.min(84, section.dropM * scale)
  return {
    thickness,
    stone,
    drop,
    note: describeScale(scale / across, section.dropM * scale > drop),
  }
}

function describeScale(times: number, isFallCut: boolean): string {
  if (isFallCut) return 'heights and fall not to scale'
  if (times > 1.15) return `heights drawn ${tenth(times)} times the lengths`
  if (times < 0.87) return `heights drawn ${tenth(1 / times)} times smaller`
  return ''
}

/** Draws the section from a row of the sheet down; gives the height the sheet then needs. */
export function drawSlabSection(drawing: Drawing, section: SlabSection, row: number): number {
  const { narrow } = section
  const board = narrow ? 6 : 12
  const bank = narrow ? 14 : 34
  const stone = narrow ? section.stone : `${section.stone} stone`
  const front = section.isBaseLevel ? drawing.textWidth(section.thickness.text) : 0
  const leftRoom =
    Math.max(drawing.textWidth(section.drop.text), front) + bank + board + (narrow ? 26 : 34)
  const back = section.isBaseLevel ? section.backThickness : section.thickness.text
  const rightRoom = Math.max(drawing.textWidth(stone), drawing.textWidth(back))
  const left = Math.max(narrow ? 62 : 150, leftRoom)
  const right = drawing.width - rightRoom - bank - board - (narrow ? 28 : 50)
  const heights = measureHeights(section, right - left)
  const top = captionSection(drawing, section, row, heights.note) + (narrow ? 40 : 46)
  const low = top + heights.drop
  const deeper = section.isBaseLevel ? heights.drop : 0
  const layout: Layout = {
    left,
    right,
    back: top,
    front: low,
    backUnder: top + heights.thickness + deeper,
    frontUnder: low + heights.thickness,
    bottom: low + heights.thickness + heights.stone,
    board,
    bank,
  }
  drawMaterials(drawing, layout)
  drawLevelLine(drawing, section, layout)
  drawFigures(drawing, section, layout, stone)
  return Math.ceil(layout.bottom + (narrow ? 50 : 58))
}

function captionSection(
  drawing: Drawing,
  section: SlabSection,
  row: number,
  scale: string,
): number {
  const left = section.narrow ? 10 : 24
  drawing.text(left, row, 'Section A–A', 'vtitle')
  const indent = left + drawing.textWidth('Section A–A') + 12
  if (!section.narrow) {
    drawing.text(indent, row, ['front on the left', scale].filter(Boolean).join('; '), 'vsub')
    return row
  }
  drawing.text(indent, row, 'front on the left', 'vsub')
  if (!scale) return row
  drawing.text(left, row + 18, scale, 'vsub')
  return row + 18
}

function drawMaterials(drawing: Drawing, at: Layout): void {
  const outerLeft = at.left - at.board
  const outerRight = at.right + at.board
  const ground = at.back + Math.min((at.backUnder - at.back) * 0.4, 20) + (at.front - at.back) * 0.5
  const fill = (points: readonly Point[], style: string) =>
    drawing.polygon(
      points.map(([x, y]) => [x, -y] as const),
      style,
    )
  drawing.coloured(() => {
    const [bankLeft, bankRight, deep] = [outerLeft - at.bank, outerRight + at.bank, at.bottom + 14]
    fill(
      [
        [bankLeft, ground],
        [bankRight, ground],
        [bankRight, deep],
        [bankLeft, deep],
      ],
      'nostroke m-earth',
    )
    fill(
      [
        [outerLeft, at.frontUnder],
        [outerRight, at.backUnder],
        [outerRight, at.bottom],
        [outerLeft, at.bottom],
      ],
      'p2 m-stonebed',
    )
    drawBed(drawing, at)
    fill(
      [
        [at.left, at.front],
        [at.right, at.back],
        [at.right, at.backUnder],
        [at.left, at.frontUnder],
      ],
      'p3 m-concrete',
    )
    stippleArea(
      drawing,
      {
        left: at.left + 4,
        top: at.front,
        width: at.right - at.left - 8,
        height: Math.max(14, Math.min(at.frontUnder, at.backUnder) - at.front),
      },
      23,
    )
    fill(
      [
        [outerLeft, at.front],
        [at.left, at.front],
        [at.left, at.frontUnder],
        [outerLeft, at.frontUnder],
      ],
      'p2 m-timber3',
    )
    fill(
      [
        [at.right, at.back],
        [outerRight, at.back],
        [outerRight, at.backUnder],
        [at.right, at.backUnder],
      ],
      'p2 m-timber3',
    )
    drawing.stroke(bankLeft, ground, outerLeft, ground, 'p3')
    drawing.stroke(outerRight, ground, bankRight, ground, 'p3')
  })
}

function drawBed(drawing: Drawing, at: Layout): void {
  const random = createRandom(7)
  const width = at.right - at.left
  let d = ''
  for (let x = at.left + 6; x < at.right - 10; x += width > 300 ? 22 : 15) {
    const top = at.frontUnder + ((at.backUnder - at.frontUnder) * (x - at.left)) / width
    const y = top + 6 + random() * Math.max(2, at.bottom - top - 14)
    d += `M${tenth(x)} ${tenth(y + 5)}l5-7 6 6z`
  }
  drawing.path(d, 'p1 m-stone')
}

function drawLevelLine(drawing: Drawing, section: SlabSection, at: Layout): void {
  const from = tenth(at.left - at.board - at.bank - 10)
  drawing.path(`M${tenth(at.right + at.board)} ${tenth(at.back)}H${from}`, 'datum')
  const words = section.narrow ? 'level line' : 'level line from the back board'
  drawing.text(at.left, at.back - 9, words, 'vsub')
}

function drawFigures(drawing: Drawing, section: SlabSection, at: Layout, stone: string): void {
  const edge = at.right + at.board
  const column = edge + at.bank + (section.narrow ? 8 : 16)
  const level = { level: true }
  const front = at.left - at.board - at.bank - (section.narrow ? 2 : 8)
  const near = at.left - at.board
  if (section.dropM > 0)
    dimensionColumn(drawing, at.back, at.front, near, front, section.drop.text, {
      ...level,
      ...section.drop,
    })
  const isThicker = section.isBaseLevel && section.dropM > 0
  if (isThicker)
    dimensionColumn(drawing, at.front, at.frontUnder, near, front, section.thickness.text, {
      ...level,
      ...section.thickness,
    })
  const back: Figure = isThicker ? { text: section.backThickness, chalk: false } : section.thickness
  dimensionColumn(drawing, at.back, at.backUnder, edge + at.bank - 4, column, back.text, {
    ...level,
    ...back,
  })
  dimensionColumn(drawing, at.backUnder, at.bottom, edge + at.bank - 4, column, stone, level)
  const row = at.bottom + (section.narrow ? 34 : 40)
  dimensionRow(drawing, at.left, at.right, at.bottom + 12, row, section.run.text, {
    chalk: section.run.chalk,
  })
  if (!section.question) return
  const middle = (at.back + at.front + at.backUnder + at.frontUnder) / 4
  drawChip(drawing, (at.left + at.right) / 2, middle, section.question)
}
