import type { DimensionOptions } from './dimensions'
import type { Drawing, Point } from './drawing'
import { tenth } from './marks'

/** How far beside its line a figure stands that does not fit along it. */
const BESIDE = 12

/**
 * A dimension along a slanting edge, all in pixels: the line lies `off` pixels to the left of the way from `from` to `to`
 * (a minus puts it on the right). The figure is turned along the line where it fits, else level beside it.
 */
export function dimensionAlong(
  drawing: Drawing,
  from: Point,
  to: Point,
  off: number,
  label: string,
  options: DimensionOptions = {},
): void {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1])
  const [ux, uy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length]
  const [nx, ny] = [uy, -ux]
  const away = Math.sign(off)
  const at = (end: Point, distance: number): Point => [
    tenth(end[0] + nx * distance),
    tenth(end[1] + ny * distance),
  ]
  const [start, end] = [at(from, off), at(to, off)]
  drawing.group({ class: options.chalk ? 'dim d-chalk' : 'dim' }, () => {
    for (const foot of [from, to]) {
      const [near, far] = [at(foot, away * 5), at(foot, off + away * 6)]
      drawing.stroke(near[0], near[1], far[0], far[1], 'ext')
    }
    drawing.stroke(start[0], start[1], end[0], end[1], 'ext')
    for (const [x, y] of [start, end]) drawing.stroke(x - 4, y + 4, x + 4, y - 4, 'dtick')
    letter(drawing, [start, end], label, [away * nx, away * ny])
  })
}

/** Letters a slanting dimension so that it reads from below or from the right. */
function letter(
  drawing: Drawing,
  [start, end]: readonly [Point, Point],
  label: string,
  [ox, oy]: Point,
): void {
  const [mx, my] = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2]
  const length = Math.hypot(end[0] - start[0], end[1] - start[1])
  const width = drawing.textWidth(label) + 8
  if (length <= width + 6) {
    const anchor = Math.abs(ox) < 0.3 ? 'middle' : ox < 0 ? 'end' : 'start'
    const [px, py] = [mx + ox * BESIDE, my + oy * BESIDE]
    drawing.text(px, py + drawing.figure * 0.36, label, 'tx', anchor)
    return
  }
  let degrees = (Math.atan2(end[1] - start[1], end[0] - start[0]) * 180) / Math.PI
  while (degrees >= 80) degrees -= 180
  while (degrees < -100) degrees += 180
  const turn = `translate(${tenth(mx)} ${tenth(my)}) rotate(${tenth(degrees)})`
  drawing.group({ transform: turn }, () => {
    const place = { x: tenth(-width / 2), y: -9, width: tenth(width), height: 18 }
    drawing.add({ tag: 'rect', attributes: { ...place, class: 'dimbg' } })
  })
  drawing.textTurned(mx, my, degrees, label)
}
