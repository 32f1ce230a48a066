import { between, clamp01 } from './motion'
import type { Ctx, Point } from './pen'
import { box, colour, line, pen, polygon, polyline, widthOf, write } from './pen'

const TICK = 8
const FIGURE = 28

interface Dimension {
  /** Distance of the dimension line from what it measures; to the left of the way from `a` to `b`. */
  offset: number
  /** Left empty where the figure finds no room on the line and is written beside it. */
  label: string
  /** 0 to 1: the line grows, then the figure appears. */
  progress?: number
  ink?: string
  size?: number
  ground?: string
}

/** A dimension line with ticks, its figure upright on the middle. */
export function dimension(ctx: Ctx, a: Point, b: Point, style: Dimension): void {
  const {
    offset,
    label,
    progress = 1,
    ink = colour.ink2,
    size = FIGURE,
    ground = colour.sheet,
  } = style
  if (progress <= 0) return
  const length = Math.hypot(b[0] - a[0], b[1] - a[1])
  const [ux, uy] = [(b[0] - a[0]) / length, (b[1] - a[1]) / length]
  const [nx, ny] = [uy, -ux]
  const move = ([x, y]: Point, by: number): Point => [x + nx * by, y + ny * by]
  const sign = Math.sign(offset)
  const grown = clamp01(progress / 0.7)
  const [from, to] = [move(a, offset), move(between(a, b, grown), offset)]
  const fine = { stroke: ink, width: pen.fine }
  const tick = (p: Point) => {
    const [cx, cy] = [ux + nx, uy + ny]
    polyline(
      ctx,
      [
        [p[0] - cx * TICK, p[1] - cy * TICK],
        [p[0] + cx * TICK, p[1] + cy * TICK],
      ],
      { stroke: ink, width: pen.part + 0.75 },
    )
  }
  line(ctx, move(a, sign * 8), move(a, offset + sign * 10), fine)
  line(ctx, from, to, fine)
  tick(from)
  if (grown < 1) return
  line(ctx, move(b, sign * 8), move(b, offset + sign * 10), fine)
  tick(to)
  if (!label) return
  const middle = between(from, to, 0.5)
  const lettering = { size, weight: 700, align: 'center', baseline: 'middle' } as const
  const half = widthOf(ctx, label, lettering) / 2 + 9
  ctx.save()
  ctx.globalAlpha *= clamp01((progress - 0.7) / 0.3)
  box(ctx, middle[0] - half, middle[1] - size * 0.6, half * 2, size * 1.2, { fill: ground })
  write(ctx, label, [middle[0], middle[1] + 1], { ...lettering, fill: ink })
  ctx.restore()
}

/** A crow's foot; its point is the mark, `angle` is the way the point looks. */
export function crowsFoot(ctx: Ctx, [x, y]: Point, angle: number, progress = 1): void {
  if (progress <= 0) return
  const leg = (side: number, grown: number): Point => [
    x - Math.cos(angle + side * 0.42) * 24 * grown,
    y - Math.sin(angle + side * 0.42) * 24 * grown,
  ]
  const style = { stroke: colour.chalk, width: 5 }
  line(ctx, leg(1, 1), between(leg(1, 1), [x, y], clamp01(progress * 2)), style)
  if (progress > 0.5) line(ctx, [x, y], leg(-1, clamp01(progress * 2 - 1)), style)
}

/** A pulled tape: band with ticks, hook at `a`, case at the end that moves to `b`. */
export function tape(ctx: Ctx, a: Point, b: Point, progress: number, tickEvery: number): void {
  if (progress <= 0) return
  const full = Math.hypot(b[0] - a[0], b[1] - a[1])
  const angle = Math.atan2(b[1] - a[1], b[0] - a[0])
  const length = full * progress
  ctx.save()
  ctx.translate(a[0], a[1])
  ctx.rotate(angle)
  box(ctx, 0, -8, length, 16, { fill: colour.boxwood, stroke: colour.ink, width: pen.fine })
  for (let at = tickEvery, n = 1; at < length; at += tickEvery, n++) {
    const isLong = n % 2 === 0
    line(ctx, [at, -8], [at, isLong ? 1 : -3], { width: isLong ? 2 : 1.25 })
  }
  box(ctx, -4, -11, 5, 22, { fill: colour.slate, stroke: colour.ink, width: pen.fine })
  ctx.translate(length, 0)
  polygon(
    ctx,
    [
      [0, -17],
      [34, -17],
      [42, -6],
      [42, 21],
      [0, 21],
    ],
    { fill: '#2F4A57', stroke: colour.ink, width: pen.part },
  )
  ctx.beginPath()
  ctx.arc(20, 3, 9, 0, 2 * Math.PI)
  ctx.fillStyle = colour.boxwood
  ctx.fill()
  ctx.restore()
}

/** A figure in a ruled box, as asked for or read off. */
export function tag(ctx: Ctx, text: string, at: Point, isAsked = false): void {
  const lettering = { size: 30, weight: 800, align: 'center', baseline: 'middle' } as const
  const half = widthOf(ctx, text, lettering) / 2 + 14
  box(ctx, at[0] - half, at[1] - 23, half * 2, 46, {
    fill: isAsked ? colour.chalk : colour.sheet,
    stroke: colour.chalk,
    width: pen.part,
  })
  write(ctx, text, [at[0], at[1] + 1], { ...lettering, fill: isAsked ? '#FFFFFF' : colour.chalk })
}
