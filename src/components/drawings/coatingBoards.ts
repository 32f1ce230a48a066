import type { Drawing } from './drawing'
import { tenth } from './marks'
import type { SheetArea } from './stipple'

/** Bare wood, then darker with the first and the second coat. */
const SHADES = ['m-timber', 'm-timber2', 'm-timber3'] as const
const BOARD = 19

/** Boards on the flat, bare on the left, each coat starting a step farther to the right. */
export function drawCoatedBoards(drawing: Drawing, area: SheetArea, coats: number): void {
  const { left, top, width, height } = area
  const step = width / (coats + 1)
  drawing.coloured(() => {
    for (let coat = 0; coat <= coats; coat++) {
      const shade = SHADES[Math.min(coat, SHADES.length - 1)] ?? SHADES[0]
      drawing.rect(left + coat * step, -top - height, step, height, `nostroke ${shade}`)
    }
    drawing.path(grain(area), 'grain nofill')
    drawing.path(boardEdges(area), 'p1b nofill')
    drawing.rect(left, -top - height, width, height, 'p2 nofill')
  })
  for (let coat = 0; coat <= coats; coat++) {
    const x = left + (coat + 0.5) * step
    const words = coat === 0 ? 'bare' : String(coat)
    if (coat > 0) {
      const edge = tenth(left + coat * step)
      drawing.path(`M${edge} ${tenth(top - 5)}V${tenth(top + height)}`, 'p1 dash')
    }
    if (drawing.textWidth(words) + 4 < step) drawing.text(x, top - 9, words, 'vsub', 'middle')
  }
}

function boardEdges({ left, top, width, height }: SheetArea): string {
  const count = Math.max(2, Math.round(height / BOARD))
  let d = ''
  for (let index = 1; index < count; index++) {
    const y = tenth(top + (height * index) / count)
    d += `M${tenth(left)} ${y}H${tenth(left + width)}`
  }
  return d
}

function grain({ left, top, width, height }: SheetArea): string {
  const count = Math.max(2, Math.round(height / BOARD))
  let d = ''
  for (let index = 0; index < count; index++) {
    const y = top + (height * (index + 0.5)) / count
    const shift = (index * 37) % 50
    for (let x = left + 8 + shift; x < left + width - 46; x += 74)
      d += `M${tenth(x)} ${tenth(y)}q12-3 24 0t16 0`
  }
  return d
}

/** A tin with its handle, standing on a line; x is its middle. */
export function drawTin(
  drawing: Drawing,
  { x, half, top }: { x: number; half: number; top: number },
  base: number,
): void {
  const bulge = tenth(half * 0.22)
  const [left, right] = [tenth(x - half), tenth(x + half)]
  drawing.coloured(() => {
    drawing.path(
      `M${left} ${top}V${tenth(base)}Q${x} ${tenth(base + 2 * half * 0.22)} ${right} ${tenth(base)}V${top}Z`,
      'p2 m-steel',
    )
    drawing.path(
      `M${left} ${top}A${half} ${bulge} 0 0 0 ${right} ${top}A${half} ${bulge} 0 0 0 ${left} ${top}Z`,
      'p2 m-timber3',
    )
  })
  drawing.path(
    `M${left} ${top + 4}Q${x} ${tenth(top - half * 1.5)} ${right} ${top + 4}`,
    'p1b nofill',
  )
}
