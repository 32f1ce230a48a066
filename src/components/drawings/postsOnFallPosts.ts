import type { Figure } from './calculatorSheet'
import type { Drawing, Point } from './drawing'
import { stippleArea } from './stipple'
import { tenth } from './marks'

/** A post on the sheet, in pixels; its figure stands beside it. */
export interface Post {
  x: number
  top: number
  foot: number
  length: Figure
  /** From the high edge. */
  at: string
  isEnd: boolean
}

/** The elevation in pixels: the surface from its high edge to its low one, the top above it. */
export interface Elevation {
  narrow: boolean
  left: number
  right: number
  /** Surface and underside of the beam at the high edge and at the low one. */
  high: number
  low: number
  topHigh: number
  topLow: number
}

const SLAB = 26
const BEAM = 10

function fill(drawing: Drawing, points: readonly Point[], style: string): void {
  drawing.polygon(
    points.map(([x, y]) => [x, -y] as const),
    style,
  )
}

/** Draws surface, posts and beam; gives the lowest row of the surface. */
export function drawPosts(drawing: Drawing, at: Elevation, posts: Post[]): number {
  const { left, right, high, low, topHigh, topLow, narrow } = at
  const reach = narrow ? 8 : 14
  const slope = (topLow - topHigh) / (right - left)
  const [beamLeft, beamRight] = [left - reach, right + reach]
  const beamAt = (x: number) => topHigh + (x - left) * slope
  const half = narrow ? 4 : 5
  const bottom = low + SLAB
  drawing.coloured(() => {
    const bank = narrow ? 16 : 24
    fill(
      drawing,
      [
        [left - bank, high + 8],
        [left, high + 8],
        [right, low + 8],
        [right + bank, low + 8],
        [right + bank, bottom + 10],
        [left - bank, bottom + 10],
      ],
      'nostroke m-earth',
    )
    drawing.stroke(left - bank, high + 8, left, high + 8, 'p3')
    drawing.stroke(right, low + 8, right + bank, low + 8, 'p3')
    fill(
      drawing,
      [
        [left, high],
        [right, low],
        [right, bottom],
        [left, bottom],
      ],
      'p3 m-concrete',
    )
    const area = { left, top: low, width: right - left, height: SLAB }
    stippleArea(drawing, area, 43)
    for (const { x, top, foot } of posts)
      drawing.path(
        `M${tenth(x - half)} ${tenth(foot)}V${tenth(top)}H${tenth(x + half)}V${tenth(foot)}Z`,
        'p2 m-timber',
      )
    fill(
      drawing,
      [
        [beamLeft, beamAt(beamLeft)],
        [beamRight, beamAt(beamRight)],
        [beamRight, beamAt(beamRight) - BEAM],
        [beamLeft, beamAt(beamLeft) - BEAM],
      ],
      'p2 m-timber2',
    )
  })
  return bottom + 10
}

/** The posts that get their length beside them: the asked one, then the ends, then as many as stand clear of each other. */
export function chooseLabelled(posts: Post[], gap: number): Post[] {
  const chosen: Post[] = []
  const rank = ({ length, isEnd }: Post) => (length.chalk ? 2 : Number(isEnd))
  const ranked = [...posts].sort((a, b) => rank(b) - rank(a))
  for (const post of ranked)
    if (chosen.every(({ x }) => Math.abs(x - post.x) >= gap)) chosen.push(post)
  return chosen
}

/** A length turned along the right side of its post, its foot just over the surface. */
export function drawLength(drawing: Drawing, post: Post, narrow: boolean): void {
  const half = drawing.textWidth(post.length.text) / 2
  const middle = Math.min((post.top + post.foot) / 2, post.foot - half - 8)
  const off = narrow ? 13 : 16
  if (post.length.chalk) drawing.text(post.x + off - 6, middle, post.length.text, 'askt')
  else drawing.textTurned(post.x + off, middle, -90, post.length.text)
}

/** How far each post stands from the high edge, under it; those that would touch are left out. */
export function drawPositions(drawing: Drawing, posts: Post[], row: number): void {
  let free = -Infinity
  for (const { x, at } of posts) {
    const half = drawing.textWidth(at) / 2
    const middle = Math.min(x, drawing.width - half - 4)
    if (middle - half < free) continue
    drawing.stroke(x, row - 22, x, row - 14, 'p1b')
    drawing.text(middle, row, at, 'tx', 'middle')
    free = middle + half + 8
  }
}
