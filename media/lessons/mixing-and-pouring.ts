import { bag, barrow } from '../kit/concrete'
import type { Lesson } from '../kit/lesson'
import { during, ramp } from '../kit/motion'
import type { Ctx } from '../kit/pen'
import { faded, line, pen } from '../kit/pen'
import { burn, gloves, mask, rinse, twoPeople } from '../kit/pictograms'
import { cautionSheet, heading, nameCard, paper } from '../kit/sheet'
import type { Timeline } from '../kit/timeline'
import { drawFurrow } from './mixing-and-pouring/furrow'
import { drawPour } from './mixing-and-pouring/pour'
import { drawBags, drawWater } from './mixing-and-pouring/quantities'
import { steps } from './mixing-and-pouring/script'

function drawName(ctx: Ctx, t: number): void {
  nameCard(
    ctx,
    'Base stage',
    ['Mixing', 'and pouring'],
    'Bags, water and the look of a right mix',
    t,
  )
  line(ctx, [640, 540], [1230, 540], { width: pen.outline })
  const rows = [4, 3, 3, 2]
  rows.forEach((count, row) => {
    for (let n = 0; n < count; n++) {
      const shown = ramp(t, 0.2 + row * 0.2 + n * 0.05, 0.3)
      const x = 1000 + (row % 2) * 20 + n * 62 - (count === 4 ? 8 : 0)
      faded(ctx, shown, () => bag(ctx, x, 514 - row * 26, 60), 0, -14 * (1 - shown))
    }
  })
  faded(ctx, ramp(t, 0.3, 0.5), () => barrow(ctx, 700, 540, 0.85, 1), -30 * (1 - ramp(t, 0.3, 0.8)))
}

function drawCaution(ctx: Ctx, t: number, time: Timeline): void {
  heading(ctx, 'Before you open a bag', t, 0, time.start('pad'))
  const rows = [
    { text: 'Wet cement burns skin without hurting at first', from: time.start('burns') + 1.2 },
    { text: 'Long waterproof gloves, boots, eye protection', from: time.start('gloves') - 0.1 },
    { text: 'A mask for fine dust until the last bag is wet', from: time.start('mask') - 0.1 },
    {
      text: 'Rinse at once; an eye 20 minutes, and get medical help',
      from: time.start('rinse') - 0.1,
    },
    { text: 'Two people to a bag, and no twisting', from: time.start('rinse') + 2.6 },
  ]
  cautionSheet(ctx, 'Read this first', rows, t, (index) =>
    [burn, gloves, mask, rinse, twoPeople][index]?.(ctx, 0, 0),
  )
}

export const lesson: Lesson = {
  id: 'mixing-and-pouring',
  title: 'Mixing and pouring',
  posterLine: 'ask-mix',
  steps,
  draw(ctx, t, time) {
    paper(ctx)
    const caution = time.start('burns') - 0.4
    const [bags, water] = [time.start('pad') - 0.4, time.start('least') - 0.4]
    const [furrow, pour] = [time.start('trowel') - 0.4, time.start('tip') - 0.4]
    faded(ctx, during(t, -1, caution), () => {
      drawName(ctx, t)
    })
    faded(ctx, during(t, caution, bags), () => {
      drawCaution(ctx, t, time)
    })
    faded(ctx, during(t, bags, water), () => {
      drawBags(ctx, t, time)
    })
    faded(ctx, during(t, water, furrow), () => {
      drawWater(ctx, t, time)
    })
    faded(ctx, during(t, furrow, pour), () => {
      drawFurrow(ctx, t, time)
    })
    faded(ctx, during(t, pour, time.durationSeconds + 1), () => {
      drawPour(ctx, t, time)
    })
  },
}
