import { seeded } from './motion'
import type { Ctx, Point } from './pen'
import { box, colour, disc, line, pen, polygon, shape, write } from './pen'

/** Grains in fresh concrete, over a rectangle in pixels. */
export function grains(ctx: Ctx, x: number, y: number, w: number, h: number, seed: number): void {
  const random = seeded(seed)
  const count = Math.round((w * h) / 700)
  for (let n = 0; n < count; n++) {
    const at: Point = [x + random() * w, y + random() * h]
    disc(ctx, at, 1 + random() * 2.4, { fill: n % 3 ? colour.stone : colour.slate })
  }
}

/** A bag of dry mix lying down, `w` pixels long. */
export function bag(ctx: Ctx, x: number, y: number, w: number): void {
  const h = w * 0.4
  const path = `M4 0Q${w / 2} -3 ${w - 4} 0Q${w + 3} ${h / 2} ${w - 4} ${h}Q${w / 2} ${h + 3} 4 ${h}Q-3 ${h / 2} 4 0Z`
  shape(ctx, path, [x, y], 1, { fill: colour.boxwood, stroke: colour.ink, width: pen.part })
  box(ctx, x + w * 0.28, y + h * 0.28, w * 0.44, h * 0.44, { fill: colour.concrete })
}

/** A wheelbarrow from the side, its wheel standing on `ground`; `load` is 0 to 1. */
export function barrow(ctx: Ctx, x: number, ground: number, scale: number, load: number): void {
  const at = (px: number, py: number): Point => [x + px * scale, ground - py * scale]
  const style = { stroke: colour.ink, width: pen.outline }
  if (load > 0) {
    shape(ctx, 'M-12 -118Q30 -178 92 -164Q150 -180 196 -118Z', [x, ground], scale, {
      fill: colour.concrete,
      ...style,
    })
  }
  polygon(ctx, [at(-26, 118), at(212, 118), at(170, 52), at(30, 52)], {
    fill: colour.chalkWash,
    ...style,
  })
  line(ctx, at(-30, 32), at(330, 92), { ...style, width: 5 })
  line(ctx, at(292, 86), at(338, 94), { stroke: colour.timber3, width: 10 })
  line(ctx, at(160, 60), at(184, 0), style)
  line(ctx, at(184, 0), at(204, 0), style)
  disc(ctx, at(-30, 32), 32 * scale, { fill: colour.sheet, ...style })
  disc(ctx, at(-30, 32), 7 * scale, { fill: colour.ink })
}

export type MixKind = 'dry' | 'stiff' | 'right' | 'wet'

/** Outlines on a field of 240 by 104: with a furrow through the heap, and before it. */
const OUTLINES: Record<MixKind, { furrow: string; heap: string }> = {
  dry: {
    furrow:
      'M28 104C44 60 62 48 84 44L96 54L106 70L112 76L118 73L126 55L140 43C166 45 184 65 200 104Z',
    heap: 'M28 104C44 60 62 48 84 44Q112 34 140 43C166 45 184 65 200 104Z',
  },
  stiff: {
    furrow: 'M24 104C36 62 60 44 86 42L96 46L104 90L132 90L142 46L154 41C184 45 202 67 214 104Z',
    heap: 'M24 104C36 62 60 44 86 42Q120 32 154 41C184 45 202 67 214 104Z',
  },
  right: {
    furrow:
      'M20 104C32 64 56 52 86 51Q94 51 96 58L102 92Q117 98 132 92L140 58Q142 51 150 51C180 53 202 67 216 104Z',
    heap: 'M20 104C32 64 56 52 86 51Q118 46 150 51C180 53 202 67 216 104Z',
  },
  wet: {
    furrow: 'M12 104C18 84 46 74 80 73Q106 81 122 82Q138 83 162 73C196 75 222 85 228 104Z',
    heap: 'M12 104C18 84 46 74 80 73Q122 68 162 73C196 75 222 85 228 104Z',
  },
}

/** Roughness, shine or water on the top, by which the four are told apart. */
const MARKS: Record<MixKind, (ctx: Ctx, at: Point, scale: number) => void> = {
  dry: (ctx, [x, y], scale) => {
    const random = seeded(5)
    for (let n = 0; n < 22; n++) {
      const px =
        x + (n < 14 ? 100 + random() * 34 : n % 2 ? 8 + random() * 22 : 200 + random() * 26) * scale
      const py = y + (n < 14 ? 76 + random() * 22 : 102) * scale
      const size = (2 + random() * 2.5) * scale
      polygon(
        ctx,
        [
          [px - size, py],
          [px, py - size * 1.5],
          [px + size, py],
        ],
        { fill: colour.stone, stroke: colour.ink, width: 1.25 },
      )
    }
  },
  stiff: (ctx, at, scale) => {
    const rough = { stroke: colour.ink, width: pen.part }
    shape(ctx, 'M50 66L56 62L61 67L67 60L73 64L79 58', at, scale, rough)
    shape(ctx, 'M160 58L166 63L172 60L178 68L184 67L190 75', at, scale, rough)
  },
  right: (ctx, at, scale) => {
    shape(ctx, 'M40 78Q60 61 84 60', at, scale, { stroke: '#FFFFFF', width: 6 })
    shape(ctx, 'M154 60Q182 63 198 78', at, scale, { stroke: '#FFFFFF', width: 6 })
  },
  wet: (ctx, at, scale) => {
    const water = { fill: colour.water, stroke: colour.ink, width: 1.5 }
    shape(ctx, 'M84 75L160 75Q140 82 122 81Q104 81 84 75Z', at, scale, water)
    shape(ctx, 'M-12 104Q2 95 16 97L12 104Z', at, scale, water)
    shape(ctx, 'M224 97Q240 95 252 104L228 104Z', at, scale, water)
  },
}

/** A heap of fresh concrete on a board, before or after a trowel was pulled through. */
export function mixHeap(
  ctx: Ctx,
  kind: MixKind,
  at: Point,
  scale: number,
  hasFurrow: boolean,
): void {
  const outline = OUTLINES[kind][hasFurrow ? 'furrow' : 'heap']
  shape(ctx, outline, at, scale, { fill: colour.concrete, stroke: colour.ink, width: pen.outline })
  if (hasFurrow) MARKS[kind](ctx, at, scale)
  line(ctx, [at[0] - 8 * scale, at[1] + 104 * scale], [at[0] + 248 * scale, at[1] + 104 * scale], {
    width: pen.outline,
  })
}

/** A pointed trowel seen from its end, `tip` at its lowest point. */
export function trowel(ctx: Ctx, [x, y]: Point): void {
  polygon(
    ctx,
    [
      [x - 26, y - 44],
      [x + 26, y - 44],
      [x + 20, y],
      [x - 20, y],
    ],
    { fill: colour.steel, stroke: colour.ink, width: pen.part },
  )
  line(ctx, [x, y - 44], [x, y - 62], { width: 6 })
  box(ctx, x - 9, y - 100, 18, 40, { fill: colour.timber2, stroke: colour.ink, width: pen.part })
}

/** A letter in a ring, as on the choices of a judgement. */
export function letter(ctx: Ctx, text: string, at: Point, isChosen: boolean): void {
  disc(ctx, at, 24, {
    fill: isChosen ? colour.chalk : colour.sheet,
    stroke: isChosen ? colour.chalk : colour.ink,
    width: pen.part,
  })
  write(ctx, text, [at[0], at[1] + 1], {
    size: 28,
    weight: 800,
    align: 'center',
    baseline: 'middle',
    fill: isChosen ? '#FFFFFF' : colour.ink,
  })
}
