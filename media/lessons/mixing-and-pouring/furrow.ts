import type { MixKind } from '../../kit/concrete'
import { letter, mixHeap, trowel } from '../../kit/concrete'
import { ramp } from '../../kit/motion'
import type { Ctx } from '../../kit/pen'
import { box, colour, faded, line, pen, write } from '../../kit/pen'
import { heading } from '../../kit/sheet'
import type { Timeline } from '../../kit/timeline'

const CHOICES: readonly { kind: MixKind; name: string; verdict: string }[] = [
  { kind: 'dry', name: 'A', verdict: 'Falls in: too dry' },
  { kind: 'stiff', name: 'B', verdict: 'Top stays rough: too stiff' },
  { kind: 'right', name: 'C', verdict: 'Stands, top closes: right' },
  { kind: 'wet', name: 'D', verdict: 'Water shows: too wet' },
]
const [LEFT, TOP, WIDE, HIGH] = [56, 112, 584, 240] as const

/** Four mixes under the trowel, without a word until the question was asked. */
export function drawFurrow(ctx: Ctx, t: number, time: Timeline): void {
  box(ctx, LEFT, TOP, WIDE * 2, HIGH * 2, { fill: colour.sheet })
  CHOICES.forEach(({ kind, name, verdict }, index) => {
    const [x, y] = [LEFT + (index % 2) * WIDE, TOP + Math.floor(index / 2) * HIGH]
    const isRight = kind === 'right'
    const told = isRight
      ? time.start('right') + 0.2
      : time.start('others') + (kind === 'wet' ? 2 : 0.5)
    const chosen = ramp(t, time.start('right'), 0.4)
    if (isRight) faded(ctx, chosen, () => box(ctx, x, y, WIDE, HIGH, { fill: colour.chalkWash }))
    const pass = time.start('trowel') + 0.3 + index * 0.55
    const [heapX, scale] = [x + 120, 1.5]
    const base = y + HIGH - 26
    mixHeap(ctx, kind, [heapX, base - 104 * scale], scale, t > pass + 0.5)
    const depth = ramp(t, pass, 0.5) * (1 - ramp(t, pass + 0.75, 0.5))
    faded(ctx, ramp(t, pass - 0.2, 0.2) * (1 - ramp(t, pass + 0.95, 0.3)), () => {
      trowel(ctx, [heapX + 118 * scale, base - 110 + depth * 86])
    })
    letter(ctx, name, [x + 52, y + 48], isRight && chosen > 0.5)
    const words = { size: 28, weight: 700, fill: isRight ? colour.chalk : colour.ink } as const
    faded(ctx, ramp(t, told, 0.4), () => write(ctx, verdict, [x + 92, y + 58], words))
  })
  line(ctx, [LEFT, TOP + HIGH], [LEFT + WIDE * 2, TOP + HIGH], { width: pen.fine })
  line(ctx, [LEFT + WIDE, TOP], [LEFT + WIDE, TOP + HIGH * 2], { width: pen.fine })
  box(ctx, LEFT, TOP, WIDE * 2, HIGH * 2, { stroke: colour.ink, width: pen.part })
  heading(ctx, 'Pull a trowel through once', t, time.start('trowel') - 0.3, time.start('ask-mix'))
  heading(ctx, 'Which of these would you pour?', t, time.start('ask-mix'), time.start('right'))
  heading(ctx, 'The furrow stands, the top closes', t, time.start('right'), time.start('tip') - 0.3)
}
