import type { Ctx } from './pen'
import { box, colour, disc, line, pen, polygon, shape } from './pen'

const ink = { stroke: colour.ink, width: pen.part }

/** Drawn 72 pixels wide round (`x`, `y`), one pen, one material. */
type Pictogram = (ctx: Ctx, x: number, y: number) => void

export const buriedService: Pictogram = (ctx, x, y) => {
  box(ctx, x - 36, y - 4, 72, 36, { fill: colour.earth })
  line(ctx, [x - 38, y - 4], [x + 38, y - 4], { width: pen.outline })
  polygon(
    ctx,
    [
      [x - 8, y - 36],
      [x + 8, y - 36],
      [x + 8, y + 2],
      [x, y + 14],
      [x - 8, y + 2],
    ],
    { fill: colour.timber, ...ink },
  )
  shape(ctx, 'M-36 22Q-18 12 0 22Q18 32 36 22', [x, y + 2], 1, { stroke: colour.ink, width: 5 })
}

export const goggles: Pictogram = (ctx, x, y) => {
  const path = 'M-30 -8Q0 -20 30 -8L30 8Q30 18 18 18Q8 18 4 8L-4 8Q-8 18 -18 18Q-30 18 -30 8Z'
  line(ctx, [x - 30, y - 8], [x - 40, y - 20], ink)
  line(ctx, [x + 30, y - 8], [x + 40, y - 20], ink)
  shape(ctx, path, [x, y], 1, { fill: colour.water, ...ink })
  line(ctx, [x - 20, y - 2], [x - 12, y - 6], { stroke: '#FFFFFF', width: 4 })
}

export const gloves: Pictogram = (ctx, x, y) => {
  const path =
    'M-16 34L-16 6L-24 -6Q-27 -12 -22 -13Q-18 -13 -12 -6L-12 -26Q-12 -31 -7 -31Q-3 -31 -3 -26L-3 -30Q-3 -35 2 -35Q7 -35 7 -30L7 -26Q7 -30 11 -30Q16 -30 16 -25L16 -18Q17 -21 20 -20Q24 -19 24 -14L24 8Q24 18 18 24L18 34Z'
  shape(ctx, path, [x, y], 1, { fill: colour.chalkWash, ...ink })
  line(ctx, [x - 16, y + 24], [x + 18, y + 24], ink)
  line(ctx, [x - 3, y - 24], [x - 3, y - 8], ink)
  line(ctx, [x + 7, y - 24], [x + 7, y - 8], ink)
}

export const mask: Pictogram = (ctx, x, y) => {
  for (const side of [-1, 1]) {
    line(ctx, [x + side * 24, y - 4], [x + side * 38, y - 20], ink)
    line(ctx, [x + side * 22, y + 12], [x + side * 36, y + 22], ink)
  }
  shape(ctx, 'M-26 -4Q0 -28 26 -4Q28 14 18 22Q0 32 -18 22Q-28 14 -26 -4Z', [x, y], 1, {
    fill: colour.sheet,
    ...ink,
  })
  disc(ctx, [x, y + 8], 8, { fill: colour.steel, ...ink })
  shape(ctx, 'M-20 -2Q0 -14 20 -2', [x, y], 1, { stroke: colour.ink, width: pen.fine })
}

export const burn: Pictogram = (ctx, x, y) => {
  box(ctx, x - 36, y + 10, 72, 16, { fill: colour.timber, ...ink })
  for (const dx of [-22, 0, 22]) {
    shape(ctx, 'M0 -14Q9 -2 9 4Q9 11 0 11Q-9 11 -9 4Q-9 -2 0 -14Z', [x + dx, y - 12], 1, {
      fill: colour.concrete,
      ...ink,
    })
  }
}

export const rinse: Pictogram = (ctx, x, y) => {
  shape(ctx, 'M-26 -10L26 -10L20 32L-20 32Z', [x, y], 1, { fill: colour.steel, ...ink })
  shape(ctx, 'M-26 -10Q0 -52 26 -10', [x, y], 1, ink)
  shape(ctx, 'M-24 2Q-12 -4 0 2Q12 8 24 2L20 30L-20 30Z', [x, y], 1, {
    fill: colour.water,
    stroke: colour.ink,
    width: 1,
  })
}

export const prop: Pictogram = (ctx, x, y) => {
  line(ctx, [x - 34, y + 30], [x + 34, y + 30], { width: pen.outline })
  polygon(
    ctx,
    [
      [x - 30, y + 6],
      [x - 30, y - 1],
      [x + 32, y - 34],
      [x + 35, y - 28],
    ],
    { fill: colour.timber, ...ink },
  )
  box(ctx, x + 13, y - 18, 8, 48, { fill: colour.timber3, ...ink })
}

export const localCode: Pictogram = (ctx, x, y) => {
  polygon(
    ctx,
    [
      [x - 24, y - 32],
      [x + 12, y - 32],
      [x + 24, y - 20],
      [x + 24, y + 32],
      [x - 24, y + 32],
    ],
    { fill: colour.sheet, ...ink },
  )
  polygon(
    ctx,
    [
      [x + 12, y - 32],
      [x + 12, y - 20],
      [x + 24, y - 20],
    ],
    { fill: colour.paper, ...ink },
  )
  for (const dy of [-8, 4, 16]) line(ctx, [x - 14, y + dy], [x + 14, y + dy], { width: pen.fine })
}

export const twoPeople: Pictogram = (ctx, x, y) => {
  for (const side of [-1, 1]) {
    disc(ctx, [x + side * 26, y - 24], 8, { fill: colour.sheet, ...ink })
    line(ctx, [x + side * 26, y - 14], [x + side * 26, y + 10], { width: pen.outline })
    line(ctx, [x + side * 26, y - 8], [x + side * 14, y + 4], { width: pen.outline })
    line(ctx, [x + side * 26, y + 10], [x + side * 20, y + 32], { width: pen.outline })
    line(ctx, [x + side * 26, y + 10], [x + side * 34, y + 32], { width: pen.outline })
  }
  box(ctx, x - 16, y - 4, 32, 16, { fill: colour.concrete, ...ink })
}
