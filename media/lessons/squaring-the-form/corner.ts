import { at, board, closeUp, hammer, peg, PEGS, squareSign, stoneBed } from '../../kit/formPlan'
import type { PlanView } from '../../kit/formPlan'
import { crowsFoot, dimension, tag, tape } from '../../kit/marks'
import { between, during, ramp } from '../../kit/motion'
import type { Ctx, Point } from '../../kit/pen'
import { colour, faded, line, polygon, write } from '../../kit/pen'
import { drawingSheet, heading, titleBlock } from '../../kit/sheet'
import type { Timeline } from '../../kit/timeline'
import { ACROSS, LARGER, LONG, SHORT } from './form'

/** The far peg of the short board is the one that is tapped. */
const TAPPED = PEGS.short[1]
const FIRST_READING = 1506

/** What the tape reads while the peg is tapped: three taps of two millimetres. */
function reading(t: number, taps: readonly number[]): number {
  const done = taps.reduce((sum, tapAt) => sum + ramp(t, tapAt, 0.14), 0)
  return FIRST_READING - ((FIRST_READING - ACROSS) * done) / taps.length
}

export function drawCorner(ctx: Ctx, t: number, time: Timeline): void {
  const tapsFrom = time.start('tap') + 0.5
  const taps = [tapsFrom, tapsFrom + 1.1, tapsFrom + 2.2] as const
  const lastTap = taps[2]
  const now = reading(t, taps)
  const cosine = (SHORT ** 2 + LONG ** 2 - now ** 2) / (2 * SHORT * LONG)
  const scale = 0.36
  const straight: PlanView = { corner: [232, 500], scale, lean: 0 }
  const leaning: PlanView = { ...straight, lean: cosine * LARGER * scale }
  const [shortMark, longMark] = [at(leaning, 0, SHORT), at(straight, LONG, 0)]
  const tapping = during(t, time.start('tap'), lastTap + 0.9)
  drawingSheet(ctx, '', () => {
    write(ctx, 'Plan', [76, 574], { size: 20, fill: colour.ink2 })
    stoneBed(ctx, straight, 2100, 1200)
    polygon(ctx, [at(straight, 0, 0), at(leaning, 0, 1200), at(straight, 0, 1200)], {
      fill: colour.stoneBed,
    })
    const truth = ramp(t, time.start('open') + 1.6, 0.4) * (1 - ramp(t, lastTap, 0.4))
    faded(ctx, truth, () =>
      line(ctx, at(straight, 0, 0), at(straight, 0, 1100), { stroke: colour.chalk, dash: [10, 8] }),
    )
    board(ctx, straight, [LONG + 1000, 0], [-38, 0])
    board(ctx, leaning, [0, 0], [0, 1200])
    for (const x of PEGS.long) peg(ctx, straight, x, -83)
    for (const y of PEGS.short) peg(ctx, leaning, -83, y, y === TAPPED && tapping > 0.5)
    const faces = during(t, time.start('inside'), time.start('short'))
    faded(ctx, faces, () => {
      const style = { stroke: colour.chalk, width: 6 }
      line(ctx, at(straight, 0, 0), at(straight, 2000, 0), style)
      line(ctx, at(leaning, 0, 0), at(leaning, 0, 1100), style)
    })
    triangle(ctx, t, time, [at(straight, 0, 0), longMark, shortMark])
    faded(ctx, 1 - tapping, () =>
      dimension(ctx, at(leaning, -38, 0), at(leaning, -38, SHORT), {
        offset: 62,
        label: '900',
        ink: colour.chalk,
        progress: ramp(t, time.start('short') + 0.3, 1),
      }),
    )
    dimension(ctx, at(straight, 0, -38), at(straight, LONG, -38), {
      offset: -46,
      label: '1200',
      ink: colour.chalk,
      progress: ramp(t, time.start('long') + 0.2, 1),
    })
    const pulled = ramp(t, time.start('five') + 0.1, 1.2)
    tape(ctx, shortMark, between(shortMark, longMark, 1.07), pulled, 50 * scale)
    crowsFoot(ctx, shortMark, 0, ramp(t, time.start('short') + 1.2, 0.5))
    crowsFoot(ctx, longMark, -Math.PI / 2, ramp(t, time.start('long') + 1.1, 0.5))
    const asks = during(t, time.start('ask-tape') + 0.6, time.start('five') + 0.3)
    faded(ctx, asks, () => tag(ctx, '5 × 300 = ?', between(shortMark, longMark, 0.5), true))
    faded(ctx, ramp(t, time.start('open') - 0.1), () => closeUp(ctx, [548, 150], now))
    faded(ctx, ramp(t, lastTap + 0.5), () => squareSign(ctx, at(straight, 0, 0), 30))
    faded(ctx, tapping, () => hammer(ctx, at(leaning, -83, TAPPED + 22), swing(t, taps)))
    faded(ctx, truth, () =>
      write(ctx, `Lean drawn ${LARGER} times larger`, [822, 300], {
        size: 20,
        fill: colour.chalk,
        align: 'right',
      }),
    )
  })
  const asked = [time.start('ask-tape'), time.start('five')] as const
  titleBlock(
    ctx,
    [
      { label: 'Short board, 3 × 300', value: '900', from: time.start('short') + 1 },
      { label: 'Long board, 4 × 300', value: '1200', from: time.start('long') + 0.9 },
      { label: 'Straight across, 5 × 300', value: '1500', from: time.start('five') + 1.4, asked },
      { label: 'The tape reads', value: String(Math.round(now)), from: time.start('open') + 0.4 },
    ],
    t,
  )
  heading(ctx, 'Measure from the inside faces', t, time.start('inside') - 0.4, time.start('short'))
  heading(ctx, 'Mark three and four', t, time.start('short'), time.start('ask-tape'))
  heading(ctx, 'What must the tape read?', t, time.start('ask-tape'), time.start('five'))
  heading(ctx, 'Straight across, mark to mark', t, time.start('five'), time.start('open'))
  heading(ctx, 'Too long: the corner is open', t, time.start('open'), time.start('tap'))
  heading(ctx, 'Tap the peg, not the corner', t, time.start('tap'), time.start('one') - 0.3)
}

function triangle(
  ctx: Ctx,
  t: number,
  time: Timeline,
  [corner, long, short]: readonly [Point, Point, Point],
): void {
  const shown = ramp(t, time.start('ask-tape'), 0.5)
  faded(ctx, shown * 0.7, () => polygon(ctx, [corner, long, short], { fill: colour.chalkWash }))
  const dashed = shown * (1 - ramp(t, time.start('five') + 0.6, 0.4))
  faded(ctx, dashed, () =>
    line(ctx, long, short, { stroke: colour.chalk, width: 3, dash: [12, 9] }),
  )
}

/** 0 at each tap, drawn back before it. */
function swing(t: number, taps: readonly number[]): number {
  return Math.min(
    ...taps.map((tapAt) => (t < tapAt ? ramp(-t, -tapAt, 0.45) : ramp(t, tapAt + 0.1, 0.5))),
  )
}
