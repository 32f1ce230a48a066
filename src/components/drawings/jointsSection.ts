import type { Figure } from './calculatorSheet'
import { dimensionColumn } from './dimensions'
import type { Drawing } from './drawing'
import { tenth } from './marks'
import { stippleArea } from './stipple'

/** A cut through one joint; depths as a share of the thickness. */
export interface JointSection {
  narrow: boolean
  depthShare: number
  thickness: Figure
  depth: Figure
}

const THICK = 72
const BED = 26

/** The jagged end of a part that goes on. */
const jagged = (x: number, top: number, bottom: number, away: 1 | -1): string => {
  const step = (bottom - top) / 4
  const teeth = [3, -2, 3, 0].map(
    (dx, index) => `L${x + away * dx} ${tenth(top + (index + 1) * step)}`,
  )
  return `M${x} ${top}${teeth.join('')}`
}

/** Draws a joint in section from a row of the sheet down; gives the height the sheet then needs. */
export function drawJointSection(drawing: Drawing, section: JointSection, row: number): number {
  const { narrow } = section
  drawing.text(narrow ? 10 : 24, row, 'Section of a joint', 'vtitle')
  const top = row + 20
  const left = narrow ? 18 : 130
  const room = drawing.width - left - drawing.textWidth(section.thickness.text) - 44
  const width = Math.min(narrow ? 220 : 330, room)
  const right = left + width
  const bottom = top + THICK
  const middle = (left + right) / 2
  const deep = THICK * section.depthShare
  drawing.coloured(() => {
    drawing.rect(left, -bottom - BED, width, BED, 'nostroke m-stonebed')
    drawing.rect(left, -bottom, width, THICK, 'nostroke m-concrete')
    stippleArea(drawing, { left, top: top + deep, width, height: THICK - deep }, 41)
    const groove = `M${middle - 4} ${top}V${tenth(top + deep - 3)}L${middle} ${tenth(top + deep)}L${middle + 4} ${tenth(top + deep - 3)}V${top}`
    drawing.path(`${groove}Z`, 'nostroke m-sheet')
    drawing.path(
      `M${left} ${top}H${middle - 4}${groove.slice(groove.indexOf('V'))}H${right}`,
      'p3 nofill',
    )
    drawing.path(`M${left} ${bottom}H${right}`, 'p3 nofill')
    const rest = THICK - deep
    const crack = `M${middle} ${tenth(top + deep)}l2 ${tenth(rest * 0.3)}l-4 ${tenth(rest * 0.25)}l3 ${tenth(rest * 0.25)}l-2 ${tenth(rest * 0.2)}`
    drawing.path(crack, 'p1b nofill')
    drawing.path(jagged(left, top - 6, bottom + BED, -1), 'p1b nofill')
    drawing.path(jagged(right, top - 6, bottom + BED, 1), 'p1b nofill')
  })
  const column = middle - (narrow ? 34 : 60)
  drawDepth(drawing, section.depth, [top, tenth(top + deep)], [middle, column])
  dimensionColumn(drawing, top, bottom, right + 4, right + 18, section.thickness.text, {
    level: true,
    chalk: section.thickness.chalk,
  })
  return bottom + BED + 16
}

/** The depth of the groove, on ground of its own so that it reads over the concrete. */
function drawDepth(
  drawing: Drawing,
  depth: Figure,
  [top, bottom]: [number, number],
  [from, column]: [number, number],
): void {
  const width = drawing.textWidth(depth.text) + 8
  const middle = (top + bottom) / 2
  drawing.rect(column - 10 - width + 4, -middle - 9, width, 18, 'onconcrete')
  dimensionColumn(drawing, top, bottom, from, column, depth.text, {
    level: true,
    chalk: depth.chalk,
  })
}
