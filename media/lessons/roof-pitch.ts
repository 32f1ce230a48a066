import type { Lesson } from '../kit/lesson'
import { drawChest, drawLid } from '../kit/lid'
import { during, ramp } from '../kit/motion'
import type { Ctx } from '../kit/pen'
import { faded, line, pen } from '../kit/pen'
import { localCode, prop } from '../kit/pictograms'
import { cautionSheet, heading, nameCard, paper } from '../kit/sheet'
import type { Timeline } from '../kit/timeline'
import { drawLaps } from './roof-pitch/laps'
import { drawPitch } from './roof-pitch/pitch'
import { steps } from './roof-pitch/script'

function drawName(ctx: Ctx, t: number): void {
  nameCard(ctx, 'Roof stage', ['Roof pitch'], 'Rise over run, and which way a lap faces', t)
  const chest = { foot: [730, 540], scale: 0.34, run: 1200, rise: 105, front: 620 } as const
  const settle = 1 - ramp(t, 0.7, 0.6)
  faded(ctx, ramp(t, 0.2, 0.5), () => {
    drawChest(ctx, { ...chest, foot: [730, 540] })
  })
  faded(ctx, ramp(t, 0.6, 0.4), () => {
    drawLid(ctx, { ...chest, foot: [730, 540 - settle * 40] }, 34, 18)
  })
  line(ctx, [660, 555], [1210, 555], { width: pen.outline })
}

function drawCaution(ctx: Ctx, t: number, time: Timeline): void {
  heading(ctx, 'Before you start', t, 0, time.start('run'))
  const rows = [
    { text: 'Prop a lid before you reach under it', from: time.start('prop') + 0.3 },
    { text: 'Snow and wind: your local code comes first', from: time.start('loads') - 0.1 },
  ]
  cautionSheet(ctx, 'Read this first', rows, t, (index) => [prop, localCode][index]?.(ctx, 0, 0))
}

export const lesson: Lesson = {
  id: 'roof-pitch',
  title: 'Roof pitch',
  posterLine: 'ask-pitch',
  steps,
  draw(ctx, t, time) {
    paper(ctx)
    const caution = time.start('prop') - 0.4
    const [pitch, laps] = [time.start('run') - 0.4, time.start('low') - 0.4]
    faded(ctx, during(t, -1, caution), () => {
      drawName(ctx, t)
    })
    faded(ctx, during(t, caution, pitch), () => {
      drawCaution(ctx, t, time)
    })
    faded(ctx, during(t, pitch, laps), () => {
      drawPitch(ctx, t, time)
    })
    faded(ctx, during(t, laps, time.durationSeconds + 1), () => {
      drawLaps(ctx, t, time)
    })
  },
}
