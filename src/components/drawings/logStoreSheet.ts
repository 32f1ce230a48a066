import { FIGURE, type CourseSheet, type CourseSheetOptions } from './courseSheet'
import { dimensionAcross, dimensionUp } from './dimensions'
import { Drawing, type Point } from './drawing'
import { drawLogStoreFront, drawLogStoreSide } from './logStore'
import { drawBubble, drawLeader, drawScaleBar } from './notes'
import { bubbleClass, type Stage } from './stages'

const SUBJECT = 'Log store with a sloping roof'

/** A point on each stage's part, in millimetres of the front view. */
const PARTS: Record<Stage, Point> = {
  roof: [2440, 1710],
  cladding: [2300, 1310],
  frame: [2370, 960],
  finish: [2240, 420],
  base: [2490, 10],
  ground: [2640, -120],
}

/** From the top down, so that no two lines cross. */
const ORDER: readonly Stage[] = ['roof', 'cladding', 'frame', 'finish', 'base', 'ground']

function drawBubbles(
  drawing: Drawing,
  options: CourseSheetOptions,
  column: number,
  rows: readonly number[],
  elbow?: number,
): void {
  ORDER.forEach((stage, index) => {
    const bubble = options.bubbles.find((candidate) => candidate.stage === stage)
    if (!bubble) return
    const place: Point = [column, rows[index] ?? 0]
    drawBubble(drawing, PARTS[stage], place, String(bubble.number), bubbleClass(bubble), elbow)
  })
}

/** Front and side with everything dimensioned, as wide as a page. */
function drawFull(options: CourseSheetOptions): Drawing {
  const { figure } = options
  const drawing = new Drawing(1312, 646, { originX: 150, originY: 520, scale: 0.25 }, FIGURE.wide)
  drawLogStoreFront(drawing, { groundFrom: -460, groundTo: 2740 })
  dimensionAcross(drawing, [0, 2400], 1852, 26, figure(2400))
  dimensionUp(drawing, [50, 1500], -120, 74, figure(1450))
  dimensionUp(drawing, [50, 1850], -120, 34, figure(1800))
  dimensionAcross(drawing, [-100, 2500], -150, 596, figure(2600))
  drawBubbles(drawing, options, 872, [84, 170, 262, 356, 450, 556])
  drawing.within({ originX: 975 }, () => {
    drawLogStoreSide(drawing, { groundFrom: -210, groundTo: 1190 })
    dimensionAcross(drawing, [0, 900], 1852, 26, figure(900))
    dimensionAcross(drawing, [-100, 1000], -150, 596, figure(1100))
    drawLeader(drawing, [150, 1640], [972, 64], ['15° fall'], 'end')
  })
  drawing.text(150, 634, 'Front elevation', 'vtitle')
  drawing.text(975, 634, 'Side elevation', 'vtitle')
  drawScaleBar(drawing, [545, 618], 1000, '1 m')
  return drawing
}

/** Front and side as the register shows them. */
function drawWide({ figure }: CourseSheetOptions): Drawing {
  const drawing = new Drawing(1000, 530, { originX: 140, originY: 436, scale: 0.2 }, FIGURE.wide)
  drawLogStoreFront(drawing, { groundFrom: -430, groundTo: 2760 })
  dimensionUp(drawing, [50, 1500], -120, 70, figure(1450))
  dimensionUp(drawing, [50, 1850], -120, 34, figure(1800))
  dimensionAcross(drawing, [0, 2400], 1852, 44, figure(2400))
  dimensionAcross(drawing, [37, 1200], -150, 490, figure(1163))
  dimensionAcross(drawing, [1200, 2362], -150, 490, figure(1163))
  drawing.within({ originX: 758 }, () => {
    drawLogStoreSide(drawing, { groundFrom: -360, groundTo: 1180 })
    dimensionAcross(drawing, [0, 900], 1852, 44, figure(900))
    dimensionAcross(drawing, [-100, 1000], -150, 490, figure(1100))
    drawLeader(drawing, [150, 1640], [738, 84], ['15° fall'], 'end')
  })
  drawScaleBar(drawing, [360, 505], 1000, '1 m')
  drawing.text(140, 515, 'Front elevation', 'vtitle')
  drawing.text(758, 515, 'Side elevation', 'vtitle')
  return drawing
}

/** Front and side with a number at each stage's part. */
function drawNumbered(options: CourseSheetOptions): Drawing {
  const { figure } = options
  const drawing = new Drawing(960, 476, { originX: 84, originY: 416, scale: 0.2 }, FIGURE.wide)
  drawLogStoreFront(drawing, { groundFrom: -340, groundTo: 2700 })
  dimensionAcross(drawing, [0, 2400], 1852, 22, figure(2400))
  dimensionUp(drawing, [50, 1500], -120, 26, figure(1450))
  drawBubbles(drawing, options, 650, [64, 138, 206, 274, 348, 440])
  drawing.within({ originX: 724 }, () =>
    drawLogStoreSide(drawing, { groundFrom: -220, groundTo: 1120 }),
  )
  return drawing
}

/** The front alone, for a phone. */
function drawNarrow(options: CourseSheetOptions): Drawing {
  const { figure, bubbles } = options
  if (bubbles.length === 0) {
    const drawing = new Drawing(
      328,
      290,
      { originX: 42, originY: 238, scale: 0.114 },
      FIGURE.narrow,
    )
    drawLogStoreFront(drawing, { groundFrom: -300, groundTo: 2480, stackMm: 860 })
    dimensionUp(drawing, [50, 1500], -120, 14, figure(1450))
    dimensionAcross(drawing, [0, 2400], 1852, 14, figure(2400))
    dimensionAcross(drawing, [-100, 2500], -150, 274, figure(2600))
    return drawing
  }
  const drawing = new Drawing(340, 284, { originX: 36, originY: 234, scale: 0.106 }, FIGURE.narrow)
  drawLogStoreFront(drawing, { groundFrom: -280, groundTo: 2660, stackMm: 860 })
  dimensionAcross(drawing, [0, 2400], 1852, 14, figure(2400))
  dimensionUp(drawing, [50, 1500], -120, 10, figure(1450))
  dimensionAcross(drawing, [-100, 2500], -150, 270, figure(2600))
  drawBubbles(drawing, options, 324, [40, 78, 116, 154, 192, 232], 0)
  return drawing
}

/** Front and side without figures, small enough for a title block. */
function drawMini(): Drawing {
  const drawing = new Drawing(312, 176, { originX: 26, originY: 148, scale: 0.072 }, FIGURE.narrow)
  drawLogStoreFront(drawing, { groundFrom: -240, groundTo: 2680, withLogs: false })
  drawing.within({ originX: 236 }, () =>
    drawLogStoreSide(drawing, { groundFrom: -220, groundTo: 980 }),
  )
  return drawing
}

/** Draws the sheet of the log store: pad 2600 by 1100, store 2400 wide and 900 deep. */
export function drawLogStoreSheet(options: CourseSheetOptions): CourseSheet {
  const { size, bubbles } = options
  const subject =
    size === 'narrow' ? `${SUBJECT}, front elevation` : `${SUBJECT}, front and side elevation`
  if (size === 'full') return { drawing: drawFull(options), subject }
  if (size === 'narrow') return { drawing: drawNarrow(options), subject }
  if (size === 'mini') return { drawing: drawMini(), subject }
  return { drawing: bubbles.length ? drawNumbered(options) : drawWide(options), subject }
}
