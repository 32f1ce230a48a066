import { bag } from '../../kit/concrete'
import { at, FORM, stoneBed } from '../../kit/formPlan'
import { dimension } from '../../kit/marks'
import { clamp01, during, mix, ramp } from '../../kit/motion'
import type { Ctx } from '../../kit/pen'
import { box, colour, faded, line, pen, polygon, shape, write } from '../../kit/pen'
import { drawingSheet, heading, titleBlock } from '../../kit/sheet'
import type { Timeline } from '../../kit/timeline'

/** The pad in millimetres, and what the bag in the picture says. */
const PAD = { ...FORM, thickness: 100 }
const BAG = { litres: 11.5, waterFrom: 2.5, waterTo: 3 }
const WASTE = 0.1
const VOLUME = (PAD.length * PAD.width * PAD.thickness) / 1e9
const WITH_WASTE = VOLUME * (1 + WASTE)
const EXACT_BAGS = (WITH_WASTE * 1000) / BAG.litres
const BAGS = Math.ceil(EXACT_BAGS)

export function drawBags(ctx: Ctx, t: number, time: Timeline): void {
  const answer = time.start('answer')
  drawingSheet(ctx, '', () => {
    faded(ctx, during(t, 0, answer), () => drawPad(ctx, t, time))
    faded(ctx, ramp(t, answer, 0.3), () => {
      const shown = clamp01((t - answer - 0.2) / 2.6) * BAGS
      for (let n = 0; n < Math.ceil(shown); n++) {
        bag(ctx, 100 + (n % 7) * 102, 382 - Math.floor(n / 7) * 54, 94)
      }
      const steps = [
        `${VOLUME.toFixed(3)} m³ and 10 % make ${WITH_WASTE.toFixed(3)} m³`,
        `${Math.round(WITH_WASTE * 1000)} ÷ ${BAG.litres} = ${EXACT_BAGS.toFixed(1)}, up to the whole bag`,
      ]
      steps.forEach((text, index) => {
        faded(ctx, ramp(t, answer + 0.3 + index * 0.9), () => {
          write(ctx, text, [100, 490 + index * 50], { size: 30, weight: 700 })
        })
      })
    })
  })
  const asked = [time.start('ask-bags') + 1, answer] as const
  titleBlock(
    ctx,
    [
      { label: 'Thickness', value: '100 mm', from: time.start('pad') + 2.6 },
      { label: 'One bag makes', value: '11.5 L', from: time.start('yield') + 0.4 },
      { label: 'For waste', value: '10 %', from: time.start('ask-bags') + 0.3 },
      { label: 'Bags to buy', value: String(BAGS), from: answer + 1.6, asked },
    ],
    t,
  )
  heading(ctx, 'How much does the form hold?', t, time.start('pad') - 0.3, time.start('ask-bags'))
  heading(ctx, 'How many bags do I buy?', t, time.start('ask-bags'), answer)
  heading(ctx, 'Part of a bag counts as a bag', t, answer, time.start('least') - 0.3)
}

function drawPad(ctx: Ctx, t: number, time: Timeline): void {
  const view = { corner: [196, 376], scale: 0.205, lean: 0 } as const
  const { length, width, thickness } = PAD
  const lower = { ...view, corner: [196, 558] } as const
  write(ctx, 'Plan', [76, 146], { size: 20, fill: colour.ink2 })
  write(ctx, 'Section', [76, 496], { size: 20, fill: colour.ink2 })
  stoneBed(ctx, view, length, width)
  polygon(ctx, [at(view, 0, 0), at(view, length, 0), at(view, length, width), at(view, 0, width)], {
    stroke: colour.ink,
    width: pen.outline,
  })
  const [left, top] = at(lower, 0, thickness)
  box(ctx, left - 20, top + 100 * view.scale, length * view.scale + 40, 22, {
    fill: colour.stoneBed,
    stroke: colour.ink,
    width: 1,
  })
  box(ctx, left, top, length * view.scale, thickness * view.scale, {
    fill: colour.concrete,
    stroke: colour.ink,
    width: pen.outline,
  })
  const from = time.start('pad')
  dimension(ctx, at(view, 0, 0), at(view, length, 0), {
    offset: -50,
    label: '2600',
    progress: ramp(t, from + 0.5, 0.8),
  })
  dimension(ctx, at(view, 0, 0), at(view, 0, width), {
    offset: 50,
    label: '1100',
    progress: ramp(t, from + 1.4, 0.8),
  })
  const [right] = at(lower, length, 0)
  faded(ctx, ramp(t, from + 2.4, 0.5), () => {
    for (const y of [top, top + thickness * view.scale])
      line(ctx, [right + 26, y], [right + 56, y], { stroke: colour.ink2, width: pen.fine })
    for (const [y, way] of [
      [top, -1],
      [top + thickness * view.scale, 1],
    ] as const) {
      line(ctx, [right + 42, y], [right + 42, y + way * 22], {
        stroke: colour.ink2,
        width: pen.fine,
      })
      line(ctx, [right + 35, y + 7], [right + 49, y - 7], { stroke: colour.ink2, width: 3 })
    }
    write(ctx, '100', [right + 42, top - 38], {
      size: 28,
      weight: 700,
      align: 'center',
      fill: colour.ink2,
    })
  })
}

/** Litres in the tub: the least the bag allows at once, then two cupfuls. */
function waterAt(t: number, time: Timeline): number {
  const from = time.start('least')
  const cups = ramp(t, from + 3.3, 0.5) + ramp(t, from + 4.7, 0.5)
  return BAG.waterFrom * ramp(t, from + 0.7, 1.5) + 0.1 * cups
}

export function drawWater(ctx: Ctx, t: number, time: Timeline): void {
  const from = time.start('least')
  const water = waterAt(t, time)
  const isPouring = Math.abs(waterAt(t + 0.02, time) - water) > 1e-6
  drawingSheet(ctx, 'Water for one bag', () => {
    drawTub(ctx, water, isPouring)
    const [x, base, perLitre] = [610, 556, 112]
    const y = (litres: number) => base - litres * perLitre
    box(ctx, x, y(3.5), 92, base - y(3.5), {
      fill: colour.boxwood,
      stroke: colour.ink,
      width: pen.part,
    })
    box(ctx, x, y(water), 92, base - y(water), { fill: colour.water })
    for (let tenth = 1; tenth < 35; tenth++) {
      const length = tenth % 5 === 0 ? 40 : 18
      line(ctx, [x + 92, y(tenth / 10)], [x + 92 - length, y(tenth / 10)], {
        width: tenth % 10 === 0 ? 2.5 : 1.5,
      })
    }
    for (const litres of [1, 2, 3])
      write(ctx, String(litres), [x + 14, y(litres) + 9], { size: 26, weight: 800 })
    box(ctx, x, y(3.5), 92, base - y(3.5), { stroke: colour.ink, width: pen.part })
    faded(ctx, ramp(t, from + 0.2), () => {
      box(ctx, x + 100, y(BAG.waterTo), 10, (BAG.waterTo - BAG.waterFrom) * perLitre, {
        fill: colour.chalk,
      })
      write(ctx, 'the bag', [x + 122, y(2.75) - 6], { size: 22, weight: 700, fill: colour.chalk })
      write(ctx, 'says', [x + 122, y(2.75) + 20], { size: 22, weight: 700, fill: colour.chalk })
    })
    if (water > 0)
      line(ctx, [x - 10, y(water)], [x + 92, y(water)], { stroke: colour.chalk, width: 4 })
  })
  titleBlock(
    ctx,
    [
      { label: 'The bag says', value: '2.5 to 3 L', from: from + 0.1 },
      { label: 'Start with', value: '2.5 L', from: from + 1 },
      { label: 'Then', value: 'a cupful', from: from + 3.1 },
      { label: 'Water so far', value: `${water.toFixed(1)} L`, from: from + 0.6 },
    ],
    t,
  )
  heading(ctx, 'The least water first', t, from - 0.3, time.start('weak'))
  heading(ctx, 'You cannot take water out', t, time.start('weak'), time.start('trowel') - 0.3)
}

function drawTub(ctx: Ctx, water: number, isPouring: boolean): void {
  const wet = clamp01(water / BAG.waterFrom)
  const surface = mix(430, 446, wet)
  const heap = mix(66, 26, wet)
  shape(
    ctx,
    `M118 ${surface}Q290 ${surface - heap * 2} 462 ${surface}L430 540L150 540Z`,
    [0, 0],
    1,
    {
      fill: wet > 0.5 ? colour.concrete : colour.stoneBed,
      stroke: colour.ink,
      width: pen.part,
    },
  )
  polygon(
    ctx,
    [
      [100, 400],
      [112, 400],
      [146, 546],
      [434, 546],
      [468, 400],
      [480, 400],
      [446, 558],
      [134, 558],
    ],
    { fill: colour.slate, stroke: colour.ink, width: pen.part },
  )
  if (isPouring)
    shape(ctx, `M344 286Q316 300 312 ${surface - heap}`, [0, 0], 1, {
      stroke: colour.water,
      width: 10,
    })
  ctx.save()
  ctx.translate(420, 250)
  ctx.rotate(isPouring ? -0.75 : -0.15)
  shape(ctx, 'M-52 -60L52 -60L42 62L-42 62Z', [0, 0], 1, {
    fill: colour.sheet,
    stroke: colour.ink,
    width: pen.outline,
  })
  shape(ctx, 'M-47 -10L47 -10L42 60L-42 60Z', [0, 0], 1, { fill: colour.water })
  shape(ctx, 'M-52 -60L-70 -66L-50 -36Z', [0, 0], 1, {
    fill: colour.sheet,
    stroke: colour.ink,
    width: pen.outline,
  })
  shape(ctx, 'M50 -40Q88 -36 76 4Q68 30 45 32', [0, 0], 1, { stroke: colour.ink, width: 6 })
  ctx.restore()
}
