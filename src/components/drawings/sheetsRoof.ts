import type { Drawing } from './drawing'
import { tenth } from './marks'

/** A roof on the sheet, in pixels, its ridge at the top; all lengths are to its scale. */
export interface RoofArea {
  left: number
  top: number
  width: number
  height: number
  /** Overhang at each side and at the eave. */
  side: number
  eave: number
  /** Width of the wood under it. */
  deck: number
  /** What one sheet covers, the length of a sheet, and what one row gains. */
  cover: number
  sheet: number
  gain: number
  lap: number
  /** Which side is drawn larger than scale, in words. */
  stretched: string
}

/** Waves closer than this cannot be told apart. */
const LEAST_WAVE = 5
const WAVES_PER_SHEET = 10

/** The wood under the sheets, with its battens. */
export function drawDeck(drawing: Drawing, area: RoofArea): void {
  const left = area.left + area.side
  const height = area.height - area.eave
  drawing.coloured(() => {
    drawing.rect(left, -area.top - height, area.deck, height, 'p1b m-timber2')
    const battens = Math.max(2, Math.round(height / 44))
    for (let index = 0; index <= battens; index++) {
      const y = area.top + 3 + ((height - 10) * index) / battens
      drawing.rect(left, -y - 5, area.deck, 5, 'p1 m-timber')
    }
  })
}

/** Lays so many sheets across and rows up, from the eave; the lap under each row is dashed. */
export function drawSheetRows(
  drawing: Drawing,
  area: RoofArea,
  { across, rows }: { across: number; rows: number },
): void {
  const base = area.top + area.height
  drawing.coloured(() => {
    for (let row = 0; row < rows; row++) {
      const foot = base - row * area.gain
      const head = Math.max(area.top, foot - area.sheet)
      const width = across * area.cover
      drawing.rect(area.left, -foot, width, foot - head, 'p2 m-roof')
      drawing.path(waves(area, width, head, foot), 'grain')
      drawing.path(seams(area, across, head, foot), 'p1b nofill')
    }
  })
  outlineDeck(drawing, area)
  if (area.lap < 5) return
  for (let row = 1; row < rows; row++) {
    const y = tenth(base - row * area.gain - area.lap)
    drawing.path(`M${tenth(area.left)} ${y}H${tenth(area.left + across * area.cover)}`, 'p1 dash')
  }
}

/** The edge of the wood as it lies hidden under the sheets. */
function outlineDeck(drawing: Drawing, area: RoofArea): void {
  const foot = area.top + area.height - area.eave
  const [left, right] = [area.left + area.side, area.left + area.side + area.deck]
  const [top, low] = [tenth(area.top), tenth(foot)]
  drawing.path(`M${tenth(left)} ${top}V${low}H${tenth(right)}V${top}`, 'p1 dash nofill')
}

function seams({ left, cover }: RoofArea, across: number, head: number, foot: number): string {
  let d = ''
  for (let index = 1; index < across; index++)
    d += `M${tenth(left + index * cover)} ${tenth(head)}V${tenth(foot)}`
  return d
}

function waves({ left, cover }: RoofArea, width: number, head: number, foot: number): string {
  const step = Math.max(LEAST_WAVE, cover / WAVES_PER_SHEET)
  if (cover < 2 * LEAST_WAVE) return ''
  let d = ''
  for (let x = step; x < width - 1; x += step)
    d += `M${tenth(left + x)} ${tenth(head)}V${tenth(foot)}`
  return d
}
