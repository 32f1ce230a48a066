import type { Chest } from '../../kit/lid'
import { drawChest, drawLid, wallTops } from '../../kit/lid'
import { dimension, tag } from '../../kit/marks'
import { during, ramp } from '../../kit/motion'
import type { Ctx } from '../../kit/pen'
import { colour, faded, line, polygon, write } from '../../kit/pen'
import { drawingSheet, heading, titleBlock } from '../../kit/sheet'
import type { Timeline } from '../../kit/timeline'

const [RUN, RISE] = [1200, 105] as const
export const ANGLE = Math.atan2(RISE, RUN)

const CHEST: Chest = { foot: [130, 560], scale: 0.47, run: RUN, rise: RISE, front: 540 }

export function drawPitch(ctx: Ctx, t: number, time: Timeline): void {
  const [run, rise, ask] = [time.start('run'), time.start('rise'), time.start('ask-pitch')]
  const answer = time.start('degrees')
  const [low, high] = wallTops(CHEST)
  const level = [high[0], low[1]] as const
  drawingSheet(ctx, 'Side elevation', () => {
    drawChest(ctx, CHEST)
    drawLid(ctx, CHEST, 46, 20)
    const wedge = ramp(t, rise + 2.6, 0.5)
    faded(ctx, wedge, () => {
      polygon(ctx, [low, level, high], { fill: colour.chalkWash })
    })
    const levelDrawn = ramp(t, run + 0.2, 0.9)
    line(ctx, low, [low[0] + (level[0] - low[0]) * levelDrawn, low[1]], {
      stroke: colour.chalk,
      width: 4,
    })
    faded(ctx, wedge, () => {
      line(ctx, level, high, { stroke: colour.chalk, width: 4 })
      line(ctx, low, high, { stroke: colour.chalk, width: 4 })
    })
    dimension(ctx, low, level, {
      offset: -112,
      label: '1200',
      ink: colour.chalk,
      progress: ramp(t, rise + 0.3, 0.9),
    })
    const risen = ramp(t, rise + 2.4, 0.8)
    dimension(ctx, level, high, { offset: -60, label: '', ink: colour.chalk, progress: risen })
    faded(ctx, risen, () => {
      const figure = { size: 28, weight: 700, baseline: 'middle', fill: colour.chalk } as const
      write(ctx, String(RISE), [level[0] + 78, (level[1] + high[1]) / 2], figure)
    })
    drawAngle(ctx, t, time)
  })
  const asked = [ask, answer] as const
  titleBlock(
    ctx,
    [
      {
        label: 'In degrees',
        value: `${((ANGLE * 180) / Math.PI).toFixed(1)}°`,
        from: answer + 1.2,
        asked,
      },
      {
        label: 'In per cent',
        value: `${((RISE / RUN) * 100).toFixed(2)} %`,
        from: time.start('percent') + 1.2,
      },
      {
        label: 'As a ratio',
        value: `1 in ${(RUN / RISE).toFixed(1)}`,
        from: time.start('ratio') + 0.8,
      },
      {
        label: 'Rise in twelve',
        value: `${((RISE / RUN) * 12).toFixed(2)} in 12`,
        from: time.start('twelve') + 0.9,
      },
    ],
    t,
  )
  heading(ctx, 'Measure the run level', t, run - 0.3, rise)
  heading(ctx, 'Rise over run', t, rise, ask)
  heading(ctx, 'What pitch is that?', t, ask, answer)
  heading(ctx, 'One slope, four ways to say it', t, answer, time.start('low') - 0.3)
}

function drawAngle(ctx: Ctx, t: number, time: Timeline): void {
  const [low] = wallTops(CHEST)
  const [ask, answer] = [time.start('ask-pitch'), time.start('degrees')]
  const reach = 290
  faded(ctx, ramp(t, ask - 0.1, 0.4), () => {
    ctx.beginPath()
    ctx.arc(low[0], low[1], reach, -ANGLE, 0)
    ctx.strokeStyle = colour.chalk
    ctx.lineWidth = 4
    ctx.stroke()
    const middle = [
      low[0] + reach * Math.cos(ANGLE / 2),
      low[1] - reach * Math.sin(ANGLE / 2),
    ] as const
    line(ctx, middle, [middle[0], low[1] + 32], { stroke: colour.chalk, width: 2 })
  })
  const place = [low[0] + reach, low[1] + 52] as const
  faded(ctx, during(t, ask, answer + 1), () => {
    tag(ctx, '?', place, true)
  })
  faded(ctx, ramp(t, answer + 1, 0.3), () => {
    tag(ctx, '5°', place)
  })
}
