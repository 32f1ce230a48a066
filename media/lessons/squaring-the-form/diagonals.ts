import { at, FORM, stoneBed, wholeForm } from '../../kit/formPlan'
import type { PlanView } from '../../kit/formPlan'
import { dimension, tag, tape } from '../../kit/marks'
import { between, during, ramp } from '../../kit/motion'
import type { Ctx, Point } from '../../kit/pen'
import { colour, faded, line, polygon, write } from '../../kit/pen'
import { drawingSheet, heading, titleBlock } from '../../kit/sheet'
import type { Timeline } from '../../kit/timeline'
import { LARGER } from './form'

/** How far the far board is racked in the last demonstration, in millimetres. */
const RACKED = 13

export function drawDiagonals(ctx: Ctx, t: number, time: Timeline): void {
  const racked = ramp(t, time.start('rack') - 0.2, 0.5) * (1 - ramp(t, time.start('rack') + 2, 1.2))
  const scale = 0.22
  const lean = (racked * RACKED * LARGER * scale) / FORM.width
  const view: PlanView = { corner: [180, 476], scale, lean }
  const { length, width } = FORM
  const far = (dx: number) => String(Math.round(Math.hypot(length + dx * RACKED * racked, width)))
  drawingSheet(ctx, 'Plan', () => {
    stoneBed(ctx, view, length, width)
    wholeForm(ctx, view, t > time.start('fix') + 1)
    dimension(ctx, at(view, 0, -38), at(view, length, -38), { offset: -56, label: '2600' })
    dimension(ctx, at(view, -38, 0), at(view, -38, width), { offset: 54, label: '1100' })
    const ways = [
      { from: at(view, 0, 0), to: at(view, length, width), text: far(1), share: 0.74 },
      { from: at(view, 0, width), to: at(view, length, 0), text: far(-1), share: 0.74 },
    ]
    ways.forEach(({ from, to, text, share }, index) => {
      const hint = ramp(t, time.start('both') + 0.6 + index * 0.9, 0.8)
      if (hint > 0)
        line(ctx, from, between(from, to, hint), { stroke: colour.chalk, width: 3, dash: [12, 9] })
      const place = between(from, to, share)
      const answered = time.start('answer') + 0.3 + index * 1.2
      faded(ctx, during(t, time.start('ask-both') + 0.4, answered), () =>
        tag(ctx, '?', place, true),
      )
      const isLonger = racked > 0.02 && index === 0
      const put = index ? time.start('rack') - 0.2 : answered + 0.9
      tape(ctx, from, to, ramp(t, answered - 0.4, 0.8) * (1 - ramp(t, put - 0.3, 0.3)), 50 * scale)
      faded(ctx, ramp(t, answered, 0.4), () => tag(ctx, text, place, isLonger))
    })
    faded(ctx, racked, () => {
      push(ctx, at(view, length + 50, width + 20), Math.PI * 0.86)
      push(ctx, at(view, -50, -20), -Math.PI * 0.14)
      write(ctx, `Lean drawn ${LARGER} times larger`, [822, 144], {
        size: 20,
        fill: colour.chalk,
        align: 'right',
      })
    })
  })
  const asked = [time.start('ask-both'), time.start('answer')] as const
  const agree = t > time.start('rack') && t < time.start('rack') + 3.2
  titleBlock(
    ctx,
    [
      { label: 'Inside, long by short', value: '2600 × 1100', from: time.start('one') },
      { label: 'One way', value: far(1), from: time.start('answer') + 0.5, asked },
      { label: 'The other way', value: far(-1), from: time.start('answer') + 1.8, asked },
      {
        label: 'So the form is',
        value: agree ? 'racked' : 'square',
        from: time.start('rack') + (agree ? 0 : 3.2),
      },
    ],
    t,
  )
  heading(ctx, 'One corner is not enough', t, time.start('one') - 0.3, time.start('both'))
  heading(ctx, 'Inside corner to inside corner', t, time.start('both'), time.start('ask-both'))
  heading(ctx, 'What must both diagonals read?', t, time.start('ask-both'), time.start('answer'))
  heading(
    ctx,
    `Both read ${Math.round(Math.hypot(length, width))}`,
    t,
    time.start('answer'),
    time.start('rack'),
  )
  heading(ctx, 'Push in the ends of the longer one', t, time.start('rack'), time.start('fix'))
  heading(ctx, 'Fix the pegs, measure once more', t, time.start('fix'), time.durationSeconds + 1)
}

/** An arrow whose point is at `p`, looking along `angle`. */
function push(ctx: Ctx, p: Point, angle: number): void {
  const back = (turn: number, reach: number): Point => [
    p[0] - Math.cos(angle + turn) * reach,
    p[1] - Math.sin(angle + turn) * reach,
  ]
  line(ctx, p, back(0, 52), { stroke: colour.chalk, width: 6 })
  polygon(ctx, [p, back(0.4, 24), back(-0.4, 24)], {
    fill: colour.chalk,
    stroke: colour.chalk,
    width: 3,
  })
}
