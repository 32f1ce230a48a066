import { lappedSheets, SHEETS } from '../../kit/lid'
import { clamp01, ramp } from '../../kit/motion'
import type { Ctx } from '../../kit/pen'
import { box, colour, faded, line, pen, write } from '../../kit/pen'
import { heading } from '../../kit/sheet'
import type { Timeline } from '../../kit/timeline'
import { ANGLE } from './pitch'

const [LEFT, TOP, WIDE, HIGH] = [56, 112, 1168, 240] as const

/** The same sheets twice: lapped so that water runs over the joints, and so that it runs in. */
export function drawLaps(ctx: Ctx, t: number, time: Timeline): void {
  const [low, down] = [time.start('low'), time.start('down')]
  const laid = clamp01((t - low - 0.4) / 3.6) * SHEETS
  const wrong = ramp(t, down - 0.3, 0.4)
  box(ctx, LEFT, TOP, WIDE, HIGH * 2, { fill: colour.sheet })
  lappedSheets(ctx, [150, TOP + 184], ANGLE, true, laid, clamp01((t - down - 0.6) / 2.2))
  faded(ctx, 1 - wrong, () => {
    write(ctx, 'low edge', [76, TOP + 224], { size: 20, fill: colour.ink2 })
  })
  faded(ctx, wrong, () => {
    write(ctx, 'Laps face down: water runs over', [84, TOP + 44], {
      size: 26,
      weight: 700,
      fill: colour.chalk,
    })
    lappedSheets(ctx, [150, TOP + HIGH + 184], ANGLE, false, SHEETS, clamp01((t - down - 2.2) / 2))
    write(ctx, 'Laps face up: water runs in', [84, TOP + HIGH + 46], { size: 26, weight: 700 })
  })
  line(ctx, [LEFT, TOP + HIGH], [LEFT + WIDE, TOP + HIGH], { width: pen.fine })
  box(ctx, LEFT, TOP, WIDE, HIGH * 2, { stroke: colour.ink, width: pen.part })
  heading(ctx, 'Start at the low edge', t, low - 0.3, down)
  heading(ctx, 'Laps face down the slope', t, down, time.start('least'))
  heading(
    ctx,
    'Check the least pitch of your roofing',
    t,
    time.start('least'),
    time.durationSeconds + 1,
  )
}
