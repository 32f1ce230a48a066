import { clamp01, ramp } from './motion'
import type { Ctx, Point } from './pen'
import { box, colour, disc, faded, line, pen, polygon, polyline } from './pen'

/** A chest with a sloping lid, in millimetres; `foot` is the lower front corner on the picture. */
export interface Chest {
  foot: Point
  scale: number
  run: number
  rise: number
  front: number
}

/** The top of the front wall and of the back wall. */
export function wallTops({ foot, scale, run, rise, front }: Chest): [Point, Point] {
  const [x, y] = foot
  return [
    [x, y - front * scale],
    [x + run * scale, y - (front + rise) * scale],
  ]
}

/** The chest from its side. */
export function drawChest(ctx: Ctx, chest: Chest): void {
  const [a, b] = wallTops(chest)
  const [x, y] = chest.foot
  const right = x + chest.run * chest.scale
  polygon(ctx, [a, b, [right, y], [x, y]], {
    fill: colour.sheet,
    stroke: colour.ink,
    width: pen.outline,
  })
  const boards = 4
  for (let n = 1; n < boards; n++) {
    const level = y - (chest.front * chest.scale * n) / boards
    line(ctx, [x, level], [right, level], { stroke: colour.rule, width: pen.fine })
  }
  for (const side of [x, right - 16]) {
    box(ctx, side, y, 16, 14, { fill: colour.timber3, stroke: colour.ink, width: pen.part })
  }
}

/** The lid lying on the walls, with `over` pixels beyond them at both ends. */
export function drawLid(ctx: Ctx, chest: Chest, over: number, thick: number): void {
  const [a, b] = wallTops(chest)
  const length = Math.hypot(b[0] - a[0], b[1] - a[1])
  const [ux, uy] = [(b[0] - a[0]) / length, (b[1] - a[1]) / length]
  const at = (along: number, up: number): Point => [
    a[0] + ux * along + uy * up,
    a[1] + uy * along - ux * up,
  ]
  polygon(ctx, [at(-over, 0), at(length + over, 0), at(length + over, thick), at(-over, thick)], {
    fill: colour.timber2,
    stroke: colour.ink,
    width: pen.outline,
  })
  line(ctx, at(-over + 8, thick / 2), at(length + over - 8, thick / 2), {
    stroke: colour.timber3,
    width: 1.5,
  })
}

const [SHEET, COVER, THICK] = [350, 280, 8] as const
export const SHEETS = 3

/** Sheets on a slope, laid from the low edge at `low`; `laid` counts them, `drop` is the way of the water, 0 to 1. */
export function lappedSheets(
  ctx: Ctx,
  low: Point,
  angle: number,
  facesDown: boolean,
  laid: number,
  drop: number,
): void {
  ctx.save()
  ctx.translate(low[0], low[1])
  ctx.rotate(-angle)
  box(ctx, 40, 0, COVER * SHEETS + 40, 22, {
    fill: colour.timber2,
    stroke: colour.ink,
    width: pen.part,
  })
  const numbers = [...Array(SHEETS).keys()]
  for (const n of numbers) {
    const shown = ramp(laid, n, 1)
    const lift = (1 - shown) * 44
    const [from, to] = [n * COVER, n * COVER + SHEET]
    const [lowUp, highUp] = facesDown ? [n ? THICK : 0, 0] : [0, n < SHEETS - 1 ? THICK : 0]
    const corners: Point[] = [
      [from, -lowUp - lift],
      [to, -highUp - lift],
      [to, -highUp - THICK - lift],
      [from, -lowUp - THICK - lift],
    ]
    faded(ctx, shown, () => {
      polygon(ctx, corners, {
        fill: n % 2 ? colour.steel : colour.slate,
        stroke: colour.ink,
        width: pen.part,
      })
    })
  }
  if (drop > 0) water(ctx, facesDown, drop)
  ctx.restore()
}

/** Where laps face down the water runs off the low edge; else it runs into the upper joint. */
function water(ctx: Ctx, facesDown: boolean, drop: number): void {
  const start = COVER * SHEETS + 30
  const way: Point[] = facesDown ? runOff(start) : runIn(start)
  const shown = way.slice(0, Math.max(2, Math.ceil(way.length * clamp01(drop * 1.2))))
  polyline(ctx, shown, { stroke: colour.chalk, width: 6 })
  if (facesDown || drop < 0.84) return
  const [x] = way.at(-1) ?? [0]
  for (const later of [0, 0.33, 0.66]) {
    const fallen = (drop - 0.84) / 0.16 - later * 0.6
    if (fallen > 0) disc(ctx, [x + fallen * 6, 34 + fallen * 46], 6, { fill: colour.chalk })
  }
}

function runOff(start: number): Point[] {
  const way: Point[] = []
  for (let along = start; along >= 0; along -= 5) {
    const n = Math.min(SHEETS - 1, Math.floor(along / COVER))
    const under = n ? 1 - (along - n * COVER) / SHEET : 0
    way.push([along, -THICK * (1 + under) - 5])
  }
  for (let over = 2; over <= 30; over += 2) way.push([-over, -THICK - 5 + over ** 2 * 0.075])
  return way
}

function runIn(start: number): Point[] {
  const way: Point[] = []
  for (let along = start; along >= (SHEETS - 1) * COVER; along -= 5) way.push([along, -THICK - 5])
  for (let down = 0; down <= 40; down += 5) way.push([(SHEETS - 1) * COVER - 4, down - THICK])
  return way
}
