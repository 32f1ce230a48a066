import { clamp01, ramp } from './motion'
import type { Ctx } from './pen'
import { box, colour, faded, line, pen, polygon, write } from './pen'

/** The drawing's frame; what is under y = 600 stays free for the captions. */
const DRAWING = { x: 56, y: 112, w: 784, h: 480 } as const
const BLOCK = { x: 864, y: 112, w: 360, h: 480 } as const

export function paper(ctx: Ctx): void {
  box(ctx, 0, 0, 1280, 720, { fill: colour.paper })
}

/** A heading that slides in from the left while it appears. */
export function heading(ctx: Ctx, text: string, t: number, from: number, to: number): void {
  const shown = ramp(t, from, 0.35) * (1 - ramp(t, to - 0.25, 0.25))
  const lettering = { size: 40, weight: 800, fill: colour.ink } as const
  faded(ctx, shown, () => write(ctx, text, [56, 82], lettering), (1 - ramp(t, from, 0.45)) * -18)
}

/** Paints inside the drawing's frame; nothing runs over its edge. */
export function drawingSheet(ctx: Ctx, title: string, paint: () => void): void {
  const { x, y, w, h } = DRAWING
  box(ctx, x, y, w, h, { fill: colour.sheet })
  ctx.save()
  ctx.beginPath()
  ctx.rect(x, y, w, h)
  ctx.clip()
  paint()
  ctx.restore()
  write(ctx, title, [x + 20, y + 34], { size: 20, weight: 600, fill: colour.ink2 })
  box(ctx, x, y, w, h, { stroke: colour.ink, width: pen.part })
}

interface Row {
  label: string
  value: string
  /** Seconds at which the value is written. */
  from: number
  /** Seconds between which the value stands open, with a question mark. */
  asked?: readonly [number, number]
}

/** The title block at the right: ruled cells, a plain figure in each. */
export function titleBlock(ctx: Ctx, rows: readonly Row[], t: number): void {
  const { x, y, w, h } = BLOCK
  const cell = h / rows.length
  box(ctx, x, y, w, h, { fill: colour.sheet })
  rows.forEach(({ label, value, from, asked }, index) => {
    const top = y + index * cell
    const middle = top + cell / 2
    const waits = asked ? ramp(t, asked[0], 0.3) * (1 - ramp(t, asked[1], 0.3)) : 0
    faded(ctx, waits, () => box(ctx, x, top, w, cell, { fill: colour.chalkWash }))
    if (index) line(ctx, [x, top], [x + w, top], { width: pen.fine })
    write(ctx, label, [x + 26, middle - 18], { size: 21, weight: 600, fill: colour.ink2 })
    const figure = { size: 48, weight: 800 } as const
    faded(ctx, waits, () =>
      write(ctx, '?', [x + 26, middle + 36], { ...figure, fill: colour.chalk }),
    )
    const fill = asked ? colour.chalk : colour.ink
    faded(
      ctx,
      ramp(t, from, 0.35),
      () => write(ctx, value, [x + 26, middle + 36], { ...figure, fill }),
      0,
      8 * (1 - ramp(t, from, 0.4)),
    )
  })
  box(ctx, x, y, w, h, { stroke: colour.ink, width: pen.part })
}

/** The first picture: stage, name, and a rule that is drawn while the voice begins. */
export function nameCard(
  ctx: Ctx,
  stage: string,
  name: readonly string[],
  under: string,
  t: number,
): void {
  const top = 262
  faded(ctx, ramp(t, 0.1, 0.5), () =>
    write(ctx, stage, [96, top - 36], { size: 24, weight: 700, fill: colour.chalk }),
  )
  name.forEach((text, index) => {
    const shown = ramp(t, 0.2 + index * 0.12, 0.6)
    faded(
      ctx,
      shown,
      () => write(ctx, text, [94, top + 34 + index * 74], { size: 68, weight: 900 }),
      0,
      14 * (1 - shown),
    )
  })
  const rule = top + 4 + name.length * 74
  line(ctx, [97, rule], [97 + 150 * clamp01(ramp(t, 0.6, 0.6)), rule], {
    stroke: colour.chalk,
    width: 5,
  })
  faded(ctx, ramp(t, 0.9, 0.5), () =>
    write(ctx, under, [96, rule + 54], { size: 27, weight: 500, fill: colour.ink2 }),
  )
}

/** The sign that stands before every caution. */
function cautionSign(ctx: Ctx, x: number, y: number, size: number): void {
  const half = size / 2
  polygon(
    ctx,
    [
      [x, y - half],
      [x + half * 1.1, y + half * 0.9],
      [x - half * 1.1, y + half * 0.9],
    ],
    {
      fill: colour.amberFill,
      stroke: colour.ink,
      width: pen.outline,
    },
  )
  line(ctx, [x, y - half * 0.32], [x, y + half * 0.28], { width: size * 0.09 })
  line(ctx, [x, y + half * 0.58], [x, y + half * 0.59], { width: size * 0.1 })
}

/** A caution in words on amber; stands before the step that needs it. */
export function cautionSheet(
  ctx: Ctx,
  title: string,
  rows: readonly { text: string; from: number }[],
  t: number,
  paintRow: (index: number) => void,
): void {
  box(ctx, 56, 112, 1168, 480, { fill: colour.amberWash, stroke: colour.amber, width: pen.part })
  cautionSign(ctx, 120, 176, 60)
  write(ctx, title, [176, 190], { size: 38, weight: 800, fill: colour.amber })
  const step = 360 / rows.length
  const size = Math.min(1, step / 92)
  rows.forEach(({ text, from }, index) => {
    const y = 222 + step * (index + 0.5)
    const shown = ramp(t, from, 0.4)
    line(ctx, [88, y - step / 2], [1192, y - step / 2], { stroke: colour.amber, width: 1 })
    faded(
      ctx,
      shown,
      () => {
        ctx.save()
        ctx.translate(140, y)
        ctx.scale(size, size)
        paintRow(index)
        ctx.restore()
        write(ctx, text, [216, y + 1], {
          size: size < 1 ? 31 : 34,
          weight: 700,
          baseline: 'middle',
        })
      },
      (1 - shown) * -16,
    )
  })
}
