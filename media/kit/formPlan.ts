import { seeded } from './motion'
import type { Ctx, Point } from './pen'
import { box, colour, line, pen, polygon } from './pen'

const BOARD = 38
const PEG = 45
/** The inside of the demonstration's form, and where its pegs stand along the boards. */
export const FORM = { length: 2600, width: 1100 } as const
export const PEGS = { long: [150, 890, 1665, 2405], short: [160, 960] } as const

/** Places millimetres of a plan on the picture; `lean` shears the form, in pixels to the right for each millimetre up. */
export interface PlanView {
  corner: Point
  scale: number
  lean: number
}

export function at({ corner, scale, lean }: PlanView, x: number, y: number): Point {
  return [corner[0] + x * scale + y * lean, corner[1] - y * scale]
}

/** The crushed stone inside a form of the given size. */
export function stoneBed(ctx: Ctx, view: PlanView, length: number, width: number): void {
  const corners: Point[] = [
    at(view, 0, 0),
    at(view, length, 0),
    at(view, length, width),
    at(view, 0, width),
  ]
  polygon(ctx, corners, { fill: colour.stoneBed })
  const random = seeded(31)
  const count = Math.round((length * width) / 9000)
  for (let n = 0; n < count; n++) {
    const [x, y] = at(view, 30 + random() * (length - 60), 30 + random() * (width - 60))
    const size = (7 + random() * 15) * view.scale
    const turn = random() * 3
    const points: Point[] = [0, 2.3, 4.1].map((angle) => [
      x + Math.cos(angle + turn) * size,
      y + Math.sin(angle + turn) * size * 0.8,
    ])
    polygon(ctx, points, { fill: n % 2 ? colour.stone : '#D2D5CE' })
  }
}

/** A form board seen from above, from `a` to `b` in millimetres, its inside face on that line and its thickness to the left of the way. */
export function board(ctx: Ctx, view: PlanView, a: Point, b: Point, thickness = BOARD): void {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1])
  const [nx, ny] = [(-(b[1] - a[1]) / length) * thickness, ((b[0] - a[0]) / length) * thickness]
  const corner = (p: Point, share: number) => at(view, p[0] + nx * share, p[1] + ny * share)
  const outline = [corner(a, 0), corner(b, 0), corner(b, 1), corner(a, 1)]
  polygon(ctx, outline, { fill: colour.timber, stroke: colour.ink, width: pen.part })
  for (const share of [0.35, 0.7]) {
    line(ctx, corner(a, share), corner(b, share), { stroke: colour.timber2, width: 1 })
  }
}

/** A peg from above, its near left corner in millimetres. */
export function peg(ctx: Ctx, view: PlanView, x: number, y: number, isMarked = false): void {
  const [px, py] = at(view, x, y + PEG)
  const size = PEG * view.scale
  const fill = isMarked ? colour.chalk : colour.timber3
  box(ctx, px, py, size, size, { fill, stroke: colour.ink, width: pen.part })
}

/** The four boards of the form and its pegs. */
export function wholeForm(ctx: Ctx, view: PlanView, isFixed = false): void {
  const { length, width } = FORM
  board(ctx, view, [length + BOARD, 0], [-BOARD, 0])
  board(ctx, view, [-BOARD, width], [length + BOARD, width])
  board(ctx, view, [0, 0], [0, width])
  board(ctx, view, [length, width], [length, 0])
  const out = -BOARD - PEG
  for (const x of PEGS.long) for (const y of [out, width + BOARD]) peg(ctx, view, x, y, isFixed)
  for (const x of [out, length + BOARD]) for (const y of PEGS.short) peg(ctx, view, x, y, isFixed)
}

/** The small square that says a corner is one. */
export function squareSign(ctx: Ctx, [x, y]: Point, size: number): void {
  const style = { stroke: colour.chalk, width: 3 }
  line(ctx, [x, y - size], [x + size, y - size], style)
  line(ctx, [x + size, y - size], [x + size, y], style)
}

/** A hammer that comes down on `at` from the left; `swing` is 0 when it hits and 1 when it is drawn back. */
export function hammer(ctx: Ctx, [x, y]: Point, swing: number): void {
  ctx.save()
  ctx.translate(x - 40, y + 116)
  ctx.rotate(-0.55 * swing)
  box(ctx, -7, -112, 14, 150, { fill: colour.timber2, stroke: colour.ink, width: pen.part })
  box(ctx, -34, -130, 74, 28, { fill: colour.slate, stroke: colour.ink, width: pen.part })
  ctx.restore()
}

/** The tape beside a mark, close up: `reading` in millimetres stands at the mark. */
export function closeUp(ctx: Ctx, [x, y]: Point, reading: number): void {
  const [w, h, perMm] = [264, 118, 9]
  ctx.save()
  ctx.beginPath()
  ctx.rect(x, y, w, h)
  ctx.clip()
  box(ctx, x, y, w, h, { fill: colour.sheet })
  box(ctx, x - 4, y, w + 8, 76, { fill: colour.boxwood, stroke: colour.ink, width: pen.part })
  const middle = x + w / 2
  for (let mm = Math.ceil(reading - 18); mm <= reading + 18; mm++) {
    const px = middle + (mm - reading) * perMm
    const length = mm % 10 === 0 ? 34 : mm % 5 === 0 ? 24 : 14
    line(ctx, [px, y + 76], [px, y + 76 - length], { width: mm % 10 === 0 ? 2.5 : 1.25 })
    if (mm % 10) continue
    ctx.font = '26px "Nunito 800"'
    ctx.textAlign = 'center'
    ctx.textBaseline = 'alphabetic'
    ctx.fillStyle = colour.ink
    ctx.fillText(String(mm), px, y + 32)
  }
  for (const side of [-1, 1]) {
    line(ctx, [middle, y + 80], [middle + side * 12, y + 112], { stroke: colour.chalk, width: 5 })
  }
  ctx.restore()
  box(ctx, x, y, w, h, { stroke: colour.ink, width: pen.part })
}
