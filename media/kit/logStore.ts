import { ramp, seeded } from './motion'
import type { Ctx, Point } from './pen'
import { box, colour, disc, faded, line, pen, polygon } from './pen'

/** The front of the log store in millimetres, standing on `ground` and centred on `middle`; parts appear one after another. */
export function logStore(ctx: Ctx, middle: number, ground: number, scale: number, t: number): void {
  const X = (mm: number) => middle + mm * scale
  const Y = (mm: number) => ground - mm * scale
  const part = (
    x: number,
    y: number,
    w: number,
    h: number,
    fill: string,
    width: number = pen.part,
  ) => box(ctx, X(x), Y(y + h), w * scale, h * scale, { fill, stroke: colour.ink, width })
  const appear = (from: number, paint: () => void) =>
    faded(ctx, ramp(t, from, 0.4), paint, 0, 10 * (1 - ramp(t, from, 0.5)))

  appear(0.1, () => {
    part(-1500, -220, 3000, 220, colour.earth, pen.fine)
    part(-1400, -100, 2800, 130, colour.stoneBed)
  })
  appear(0.35, () => part(-1300, 0, 2600, 100, colour.concrete))
  appear(0.65, () => {
    for (let y = 330; y < 1450; y += 125) part(-1155, y, 2310, 72, colour.sheet, 1)
    part(-1155, 200, 2310, 90, colour.timber2)
  })
  appear(0.95, () => logs(ctx, X, Y, scale))
  appear(1.25, () => {
    for (const x of [-1200, -45, 1110]) part(x, 130, 90, 1470, colour.timber)
    for (const x of [-1215, -60, 1095]) part(x, 100, 120, 36, colour.slate, pen.fine)
  })
  appear(1.55, () => {
    part(-1360, 1600, 2720, 300, colour.timber3, pen.outline)
    for (const y of [1675, 1750, 1825])
      line(ctx, [X(-1360), Y(y)], [X(1360), Y(y)], { width: pen.fine })
  })
  line(ctx, [X(-1650), Y(-2)], [X(-1400), Y(-2)], { width: pen.outline })
  line(ctx, [X(1400), Y(-2)], [X(1650), Y(-2)], { width: pen.outline })
}

function logs(ctx: Ctx, X: (mm: number) => number, Y: (mm: number) => number, scale: number): void {
  const random = seeded(7)
  const rows = [9, 8, 9, 8, 6, 4]
  for (const left of [-1100, 55]) {
    rows.forEach((count, row) => {
      const kept = left > 0 ? Math.max(0, count - 2 * row) : count
      for (let n = 0; n < kept; n++) {
        const radius = 58
        const x = left + 60 + n * 116 + (row % 2) * 58
        const at: Point = [X(x), Y(350 + row * 101)]
        disc(ctx, at, radius * scale, {
          fill: random() > 0.5 ? colour.timber : colour.boxwood,
          stroke: colour.bark,
          width: pen.part,
        })
        const turn = random() * Math.PI
        const reach = radius * scale * 0.5
        if (random() > 0.5) disc(ctx, at, reach * 0.6, { stroke: colour.timber3, width: 1 })
        else
          line(
            ctx,
            [at[0] - Math.cos(turn) * reach, at[1] - Math.sin(turn) * reach],
            [at[0] + Math.cos(turn) * reach, at[1] + Math.sin(turn) * reach],
            { stroke: colour.timber3, width: 1.25 },
          )
      }
    })
  }
  polygon(
    ctx,
    [
      [X(-1155), Y(290)],
      [X(1155), Y(290)],
      [X(1155), Y(200)],
      [X(-1155), Y(200)],
    ],
    { fill: colour.timber2, stroke: colour.ink, width: pen.part },
  )
}
