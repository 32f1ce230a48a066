import { grains } from '../../kit/concrete'
import { at, FORM, stoneBed, wholeForm } from '../../kit/formPlan'
import type { PlanView } from '../../kit/formPlan'
import { mix, ramp } from '../../kit/motion'
import type { Ctx, Point } from '../../kit/pen'
import { box, colour, faded, line, pen, polygon, write } from '../../kit/pen'
import { drawingSheet, heading, titleBlock } from '../../kit/sheet'
import type { Timeline } from '../../kit/timeline'

const { length: LENGTH, width: WIDTH } = FORM
/** Ten millimetres to the metre over the width, towards the front. */
const FALL = Math.round(WIDTH * 0.01)
const VIEW: PlanView = { corner: [156, 470], scale: 0.235, lean: 0 }

/** The concrete as it spreads from the far corner; `share` is 0 to 1. */
function poured(ctx: Ctx, share: number): void {
  if (share <= 0) return
  const [farX, farY] = at(VIEW, LENGTH, WIDTH)
  const reach = share * (Math.hypot(LENGTH, WIDTH) + 60) * VIEW.scale
  const edge: Point[] = [[farX, farY]]
  for (let step = 0; step <= 40; step++) {
    const angle = Math.PI / 2 + (step / 40) * (Math.PI / 2)
    const wave = 1 + 0.025 * Math.sin(step * 1.7) + 0.02 * Math.sin(step * 0.61 + 1)
    edge.push([farX + Math.cos(angle) * reach * wave, farY + Math.sin(angle) * reach * wave])
  }
  const [x, y] = at(VIEW, 0, WIDTH)
  ctx.save()
  ctx.beginPath()
  ctx.rect(x, y, LENGTH * VIEW.scale, WIDTH * VIEW.scale)
  ctx.clip()
  polygon(ctx, edge, { fill: colour.concrete, stroke: colour.ink, width: pen.part })
  trace(ctx, edge)
  ctx.clip()
  grains(ctx, x, y, LENGTH * VIEW.scale, WIDTH * VIEW.scale, 17)
  ctx.restore()
}

function trace(ctx: Ctx, points: readonly Point[]): void {
  ctx.beginPath()
  points.forEach(([x, y], index) => (index ? ctx.lineTo(x, y) : ctx.moveTo(x, y)))
  ctx.closePath()
}

export function drawPour(ctx: Ctx, t: number, time: Timeline): void {
  const [tip, strike] = [time.start('tip'), time.start('strike')]
  const wet = ramp(t, tip + 0.1, 0.8)
  const filled = ramp(t, tip + 1.1, 3)
  const struck = ramp(t, strike + 0.9, 4.4)
  drawingSheet(ctx, 'Plan', () => {
    stoneBed(ctx, VIEW, LENGTH, WIDTH)
    const [x, y] = at(VIEW, 0, WIDTH)
    const [w, h] = [LENGTH * VIEW.scale, WIDTH * VIEW.scale]
    faded(ctx, wet * 0.4, () => box(ctx, x, y, w, h, { fill: colour.slate }))
    poured(ctx, filled)
    if (struck > 0) smooth(ctx, x + w * (1 - struck), y, w * struck, h)
    wholeForm(ctx, VIEW)
    faded(ctx, ramp(t, tip + 1, 0.4) * (1 - ramp(t, strike - 0.3, 0.3)), () =>
      workBack(ctx, filled),
    )
    const shown = ramp(t, strike - 0.2, 0.5)
    faded(ctx, shown, () => {
      straightBoard(
        ctx,
        mix(LENGTH - 60, 30, struck),
        struck > 0 && struck < 1 ? Math.sin((t - strike) * 7) * 55 : 0,
      )
      fallArrow(ctx)
    })
  })
  titleBlock(
    ctx,
    [
      { label: 'First', value: 'wet the stone', from: tip },
      { label: 'Tip from', value: 'the far corner', from: tip + 1 },
      { label: 'Board lies', value: 'along the fall', from: strike + 0.3 },
      { label: 'Front edge lower by', value: `${FALL} mm`, from: strike + 1.2 },
    ],
    t,
  )
  heading(ctx, 'From the far corner, working back', t, tip - 0.3, strike)
  heading(ctx, 'Strike off along the fall', t, strike, time.start('code'))
  heading(
    ctx,
    'Local code and your bag come first',
    t,
    time.start('code'),
    time.durationSeconds + 1,
  )
}

/** Where the board has passed, the top is even. */
function smooth(ctx: Ctx, x: number, y: number, w: number, h: number): void {
  box(ctx, x, y, w, h, { fill: '#DDE1DF' })
  const right = x + w
  for (let streak = right - 16; streak > x; streak -= 26) {
    line(ctx, [streak, y + 6], [streak, y + h - 6], { stroke: colour.concrete, width: 2 })
  }
}

function straightBoard(ctx: Ctx, x: number, saw: number): void {
  const [left, top] = at(VIEW, x, WIDTH + 190 + saw)
  const [w, h] = [60 * VIEW.scale + 8, (WIDTH + 380) * VIEW.scale]
  box(ctx, left - w / 2, top, w, h, {
    fill: colour.timber2,
    stroke: colour.ink,
    width: pen.outline,
  })
  line(ctx, [left, top + 5], [left, top + h - 5], { stroke: colour.timber3, width: 1.5 })
}

function fallArrow(ctx: Ctx): void {
  const [x, y] = at(VIEW, -260, WIDTH)
  const end = at(VIEW, -260, 0)[1]
  line(ctx, [x, y], [x, end], { stroke: colour.chalk, width: 5 })
  polygon(
    ctx,
    [
      [x, end + 8],
      [x - 12, end - 18],
      [x + 12, end - 18],
    ],
    { fill: colour.chalk },
  )
  write(ctx, 'fall', [x, y - 14], { size: 24, weight: 700, fill: colour.chalk, align: 'center' })
  write(ctx, 'front', at(VIEW, LENGTH / 2, -290), {
    size: 24,
    weight: 700,
    fill: colour.ink2,
    align: 'center',
  })
}

/** The way of the work: from the far corner towards the near one. */
function workBack(ctx: Ctx, share: number): void {
  const [from, to] = [at(VIEW, LENGTH - 220, WIDTH - 160), at(VIEW, 420, 240)]
  const point: Point = [mix(from[0], to[0], share), mix(from[1], to[1], share)]
  const angle = Math.atan2(to[1] - from[1], to[0] - from[0])
  const back = (turn: number, reach: number): Point => [
    point[0] - Math.cos(angle + turn) * reach,
    point[1] - Math.sin(angle + turn) * reach,
  ]
  line(ctx, from, point, { stroke: colour.chalk, width: 5, dash: [14, 10] })
  polygon(ctx, [point, back(0.42, 28), back(-0.42, 28)], { fill: colour.chalk })
}
