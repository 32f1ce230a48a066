import type { Lesson } from '../kit/lesson'
import { logStore } from '../kit/logStore'
import { during, mix, ramp } from '../kit/motion'
import type { Ctx } from '../kit/pen'
import { faded } from '../kit/pen'
import { buriedService, goggles, localCode } from '../kit/pictograms'
import { cautionSheet, heading, nameCard, paper } from '../kit/sheet'
import type { Timeline } from '../kit/timeline'
import { drawCorner } from './squaring-the-form/corner'
import { drawDiagonals } from './squaring-the-form/diagonals'
import { steps } from './squaring-the-form/script'

function drawCaution(ctx: Ctx, t: number, time: Timeline): void {
  heading(ctx, 'Before you start', t, time.start('buried') - 0.5, time.start('inside'))
  const rows = [
    { text: 'Know what is buried before you drive a peg', from: time.start('buried') - 0.2 },
    { text: 'Eye protection when you hammer', from: time.start('eyes') - 0.2 },
    { text: 'Your local code comes first', from: time.start('eyes') + 1 },
  ]
  cautionSheet(ctx, 'Read this first', rows, t, (index) =>
    [buriedService, goggles, localCode][index]?.(ctx, 0, 0),
  )
}

export const lesson: Lesson = {
  id: 'squaring-the-form',
  title: 'Squaring the form',
  posterLine: 'ask-tape',
  steps,
  draw(ctx, t, time) {
    paper(ctx)
    const [caution, corner, diagonals] = [
      time.start('buried') - 0.5,
      time.start('inside') - 0.5,
      time.start('one') - 0.4,
    ]
    faded(ctx, during(t, -1, caution), () => {
      nameCard(
        ctx,
        'Base stage',
        ['Squaring', 'the form'],
        'Three, four, five and two diagonals',
        t,
      )
      logStore(ctx, 940, 560, mix(0.185, 0.188, ramp(t, 0, 4)), t)
    })
    faded(ctx, during(t, caution, corner), () => drawCaution(ctx, t, time))
    faded(ctx, during(t, corner, diagonals), () => drawCorner(ctx, t, time))
    faded(ctx, during(t, diagonals, time.durationSeconds + 1), () => drawDiagonals(ctx, t, time))
  },
}
