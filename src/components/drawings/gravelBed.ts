import type { Figure } from './calculatorSheet'
import { dimensionColumn } from './dimensions'
import type { Drawing } from './drawing'
import { tenth } from './marks'
import { createRandom } from './random'

/** A base of stone on the sheet, in pixels; width and height are those of the pad it carries. */
export interface Bed {
  narrow: boolean
  left: number
  top: number
  width: number
  height: number
  /** How far the stone reaches past the pad. */
  reach: number
  /** Pixels a metre. */
  scale: number
  isStretched: boolean
}

/** Small angular stones all over a rectangle. */
function stones(
  { left, top, width, height }: { left: number; top: number; width: number; height: number },
  seed: number,
): string {
  const random = createRandom(seed)
  const columns = Math.max(1, Math.floor(width / 19))
  const rows = Math.max(1, Math.floor(height / 15))
  let d = ''
  for (let index = 0; index < columns * rows; index++) {
    const across = (index % columns) + 0.5 + (random() - 0.5) * 0.5
    const down = Math.floor(index / columns) + 0.5 + (random() - 0.5) * 0.5
    const half = 2.5 + random() * 2.5
    const x = left + (across * width) / columns
    const y = top + (down * height) / rows
    d += `M${tenth(x - half)} ${tenth(y + half * 0.7)}l${tenth(half)}-${tenth(half * 1.4)} ${tenth(half * 1.1)} ${tenth(half * 1.2)}z`
  }
  return d
}

/** The stone from above, with the pad that will lie on it dashed. */
export function drawBedPlan(drawing: Drawing, bed: Bed): void {
  const { left, top, reach } = bed
  const width = bed.width + 2 * reach
  const height = bed.height + 2 * reach
  drawing.coloured(() => {
    drawing.rect(left, -top - height, width, height, 'p2 m-stonebed')
    drawing.path(stones({ left, top, width, height }, 29), 'p1 m-stone')
  })
  drawing.rect(left + reach, -top - reach - bed.height, bed.width, bed.height, 'p2 dash nofill')
}

const between = (least: number, value: number, most: number) =>
  Math.min(most, Math.max(least, value))

function describeDepth(times: number): string {
  if (times > 1.15) return `depth drawn ${tenth(times)} times larger`
  return times < 0.87 ? `depth drawn ${tenth(1 / times)} times smaller` : ''
}

/** The stone in its hole, the pad above it dashed; gives the lowest row it takes. */
export function drawBedSection(
  drawing: Drawing,
  bed: Bed,
  depth: Figure & { metres: number },
  row: number,
): number {
  const { narrow, left } = bed
  const deep = between(34, depth.metres * bed.scale, 96)
  const indent = (narrow ? 22 : 36) + drawing.textWidth('Section')
  drawing.text(narrow ? 10 : 24, row, 'Section', 'vtitle')
  const note = describeDepth(deep / (depth.metres * bed.scale))
  if (note) drawing.text(indent, row, note, 'vsub')
  const top = row + 52
  const width = bed.width + 2 * bed.reach
  const bank = narrow ? 14 : 30
  const bottom = top + deep
  const right = left + width
  drawing.coloured(() => {
    drawing.rect(left - bank, -bottom - 14, width + 2 * bank, deep + 14, 'nostroke m-earth')
    drawing.rect(left, -bottom, width, deep, 'p2 m-stonebed')
    drawing.path(stones({ left, top, width, height: deep }, 17), 'p1 m-stone')
    drawing.stroke(left - bank, top, left, top, 'p3')
    drawing.stroke(right, top, right + bank, top, 'p3')
  })
  drawing.rect(left + bed.reach, -top, bed.width, 26, 'p2 dash nofill')
  dimensionColumn(drawing, top, bottom, right + bank - 4, right + bank + 12, depth.text, {
    level: true,
    chalk: depth.chalk,
  })
  return bottom + 14
}
