import type { Drawing } from './drawing'
import { tenth } from './marks'

/** A closed lid from the side, in pixels, hinged on the left. */
export interface LidPlace {
  left: number
  /** Front edge of the lid, and where the handle is. */
  front: number
  handle: number
  /** Thickness of the snow; none at zero. */
  snow: number
  /** Top of the lid, and foot of the box. */
  hinge: number
  base: number
  note: string
}

const LID = 10
const WALL = 8

/** The box with its lid, hinge and handle. */
export function drawLidBox(drawing: Drawing, at: LidPlace): void {
  const top = at.hinge + LID
  const width = at.front - at.left
  drawing.coloured(() => {
    drawing.rect(at.left, -at.base, width, at.base - top, 'p1b m-sheet')
    drawing.rect(at.left, -at.base, WALL, at.base - top, 'p2 m-timber2')
    drawing.rect(at.front - WALL, -at.base, WALL, at.base - top, 'p2 m-timber2')
    drawing.rect(at.left, -at.hinge - LID, Math.max(width, at.handle - at.left), LID, 'p2 m-timber')
    drawing.dot(at.left, at.hinge + LID, 5, 'p2 m-steel')
  })
  drawing.path(`M${tenth(at.left - 18)} ${tenth(at.base)}H${tenth(at.front + 18)}`, 'p3')
}

/** Snow on the lid, its edges rounded off. */
export function drawLidSnow(drawing: Drawing, at: LidPlace): void {
  const { left, front, hinge } = at
  const top = hinge - at.snow
  const round = Math.min(14, at.snow * 0.6, (front - left) / 3)
  const d = `M${tenth(left)} ${tenth(hinge)}V${tenth(top + round)}Q${tenth(left)} ${tenth(top)} ${tenth(left + round)} ${tenth(top)}H${tenth(front - round)}Q${tenth(front)} ${tenth(top)} ${tenth(front)} ${tenth(top + round)}V${tenth(hinge)}Z`
  drawing.coloured(() => drawing.path(d, 'p1b m-sheet2'))
}

/** An arrow straight up or down, from one row to another. */
export function pullArrow(
  drawing: Drawing,
  x: number,
  from: number,
  to: number,
  style: string,
): void {
  const back = to < from ? 9 : -9
  const [px, end] = [tenth(x), tenth(to)]
  drawing.path(`M${px} ${tenth(from)}V${end}m-6 ${back}l6 ${-back} 6 ${back}`, style)
}
