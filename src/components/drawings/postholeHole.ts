import type { Figure } from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import type { Drawing } from './drawing'
import { stippleArea } from './stipple'

/** A post in its hole, in metres, with the figures that stand beside it. */
export interface Hole {
  narrow: boolean
  diameterM: number
  depthM: number
  postM: readonly [wide: number, thick: number]
  diameter: Figure
  depth: Figure
  post: readonly [wide: Figure, thick: Figure]
}

/** A part of fewer pixels is drawn at them. */
const LEAST = 40
const STONE = 16

/** The hole in pixels, and whether a side of it is larger than scale. */
export function measureHole({ narrow, diameterM, depthM }: Hole) {
  const room = narrow ? { width: 130, height: 150 } : { width: 190, height: 200 }
  const scale = Math.min(room.width / diameterM, room.height / depthM)
  const [across, deep] = [diameterM * scale, depthM * scale]
  return {
    across: Math.max(LEAST, across),
    deep: Math.max(LEAST, deep),
    isStretched: across < LEAST || deep < LEAST,
  }
}

/** Draws the hole in section about a middle line, the ground at a row; gives the lowest row it takes. */
export function drawHoleSection(
  drawing: Drawing,
  hole: Hole,
  middle: number,
  ground: number,
): number {
  const { across, deep } = measureHole(hole)
  const [left, right] = [middle - across / 2, middle + across / 2]
  const bank = hole.narrow ? 22 : 44
  const floor = ground + deep
  const bottom = floor + STONE
  const post = (across * hole.postM[0]) / hole.diameterM
  const [postLeft, top] = [middle - post / 2, ground - 54]
  drawing.coloured(() => {
    drawing.rect(
      left - bank,
      -bottom - 12,
      across + 2 * bank,
      deep + STONE + 12,
      'nostroke m-earth',
    )
    drawing.rect(left - bank, -ground - 5, across + 2 * bank, 5, 'nostroke m-grass')
    drawing.rect(left, -bottom, across, STONE, 'p1b m-stonebed')
    drawing.path(`M${left} ${ground}H${right}V${floor}H${left}Z`, 'p3 m-concrete')
    const beside = Math.max(14, (across - post) / 2)
    stippleArea(drawing, { left, top: ground, width: beside, height: deep }, 37)
    stippleArea(drawing, { left: right - beside, top: ground, width: beside, height: deep }, 53)
    drawing.rect(postLeft, -floor, post, floor - top, 'p2 m-timber')
    drawing.path(`M${postLeft - 4} ${top}l${post / 2}-5 6 9 ${post / 2}-5`, 'p2 nofill')
    drawing.path(`M${left - bank} ${ground}H${left}M${right} ${ground}H${right + bank}`, 'p3')
  })
  dimensionColumn(drawing, ground, floor, right, right + bank + 10, hole.depth.text, {
    level: true,
    chalk: hole.depth.chalk,
  })
  dimensionRow(drawing, left, right, bottom + 12, bottom + 30, hole.diameter.text, hole.diameter)
  return bottom + 30
}

/** Draws hole and post from above about a middle; gives the lowest row it takes. */
export function drawHolePlan(drawing: Drawing, hole: Hole, middle: number, top: number): number {
  const size = hole.narrow ? 84 : 104
  const radius = size / 2
  const centre = top + radius
  const [wide, thick] = hole.postM.map((side) => (side / hole.diameterM) * size) as [number, number]
  const [left, right] = [middle - wide / 2, middle + wide / 2]
  const [above, below] = [centre - thick / 2, centre + thick / 2]
  drawing.coloured(() => {
    drawing.dot(middle, centre, radius, 'p3 m-concrete')
    drawing.rect(left, -below, wide, thick, 'p2 m-timber')
    drawing.path(
      `M${left} ${above}L${right} ${below}M${right} ${above}L${left} ${below}`,
      'p1 nofill',
    )
  })
  const row = top + size + 18
  dimensionRow(drawing, left, right, below, row, hole.post[0].text, hole.post[0])
  dimensionColumn(drawing, above, below, right, middle + radius + 16, hole.post[1].text, {
    level: true,
    chalk: hole.post[1].chalk,
  })
  return row
}
