import { FIGURE, type CourseSheet, type CourseSheetOptions } from './courseSheet'
import { DECK, drawDeckDetail, drawDeckFront, drawDeckPlan } from './deck'
import { dimensionAcross, dimensionUp } from './dimensions'
import { Drawing, type Point } from './drawing'
import { drawBubble, drawLeader, drawScaleBar } from './notes'
import { bubbleClass, type Stage } from './stages'

const SUBJECT = 'Ground-level deck, plan and front elevation'
const { widthMm: WIDTH, depthMm: DEPTH, heightMm: HEIGHT, gapMm: GAP } = DECK

interface NumberedPart {
  stage: Stage
  /** In millimetres of the plan, or of the front where `front` is set. */
  point: Point
  front?: boolean
}

/** From the top down, so that no two lines cross. A deck has no roof. */
const PARTS: readonly NumberedPart[] = [
  { stage: 'cladding', point: [2020, 2200] },
  { stage: 'frame', point: [3181, 1500] },
  { stage: 'base', point: [3560, 300] },
  { stage: 'finish', point: [2300, -240] },
  { stage: 'ground', point: [3740, -120], front: true },
]

function drawBubbles(
  drawing: Drawing,
  options: CourseSheetOptions,
  frontY: number,
  column: number,
  rows: readonly number[],
  elbow: number,
): void {
  PARTS.forEach(({ stage, point, front }, index) => {
    const bubble = options.bubbles.find((candidate) => candidate.stage === stage)
    if (!bubble) return
    drawing.within(front ? { originY: frontY } : {}, () =>
      drawBubble(
        drawing,
        point,
        [column, rows[index] ?? 0],
        String(bubble.number),
        bubbleClass(bubble),
        elbow,
      ),
    )
  })
}

/** A ring in which board, joist, bearer and pad are seen larger. */
function drawDetail(drawing: Drawing, [px, py]: Point, radius: number, figure: string): void {
  const ring = { cx: px, cy: py, r: radius }
  drawing.clips.push({ name: 'detail', shape: { tag: 'circle', attributes: ring } })
  drawing.group(
    {},
    () =>
      drawing.within({ originX: px - 60, originY: py + 62, scale: 0.46 }, () =>
        drawDeckDetail(drawing),
      ),
    { clip: 'detail' },
  )
  drawing.add({ tag: 'circle', attributes: { ...ring, class: 'detail' } })
  drawing.within({ originX: px, originY: py, scale: 1 }, () =>
    drawLeader(drawing, [1, 62], [px + 60, py - 150], [`${figure} gap`]),
  )
  const under = py + radius
  drawing.text(px, under + 24, 'Detail: board, joist, bearer, pad', 'vtitle', 'middle')
  drawing.text(px, under + 43, `${figure} between boards; a packer keeps`, 'vsub', 'middle')
  drawing.text(px, under + 60, 'the timber off the pad', 'vsub', 'middle')
}

function drawWide(options: CourseSheetOptions): Drawing {
  const { figure, bubbles } = options
  const drawing = new Drawing(1000, 580, { originX: 100, originY: 376, scale: 0.137 }, FIGURE.wide)
  drawDeckPlan(drawing)
  dimensionAcross(drawing, [0, WIDTH], DEPTH, 24, figure(WIDTH))
  dimensionUp(drawing, [0, DEPTH], -25, 52, figure(DEPTH))
  drawing.within({ originY: 500 }, () => {
    drawDeckFront(drawing, -330, 3930)
    const column = bubbles.length ? 78 : 646
    const edge = bubbles.length ? -25 : 3625
    dimensionUp(drawing, [0, HEIGHT], edge, column, figure(HEIGHT))
  })
  if (bubbles.length) drawBubbles(drawing, options, 500, 672, [76, 196, 330, 424, 516], 17)
  else {
    const joists = ['joists', `${figure(47)} × ${figure(145)}`, `at ${figure(395)} centres`]
    drawLeader(drawing, [3181, 1500], [628, 104], joists)
    drawLeader(drawing, [3540, 265], [628, 322], [`pads ${figure(300)} square`])
  }
  drawDetail(drawing, [856, 214], 128, figure(GAP))
  drawScaleBar(drawing, [724, 550], 1000, '1 m')
  drawing.text(96, 568, 'Plan, boards part lifted, over front elevation', 'vtitle')
  return drawing
}

function drawNarrow(options: CourseSheetOptions): Drawing {
  const { figure, bubbles } = options
  const numbered = bubbles.length > 0
  const scale = numbered ? 0.068 : 0.077
  const drawing = new Drawing(328, 296, { originX: 40, originY: 214, scale }, FIGURE.narrow)
  drawDeckPlan(drawing)
  dimensionAcross(drawing, [0, WIDTH], DEPTH, numbered ? 30 : 14, figure(WIDTH))
  dimensionUp(drawing, [0, DEPTH], -25, 14, figure(DEPTH))
  drawing.within({ originY: 276 }, () => drawDeckFront(drawing, -300, numbered ? 3780 : 3730))
  if (numbered) drawBubbles(drawing, options, 276, 314, [60, 104, 176, 226, 276], 0)
  return drawing
}

function drawMini(): Drawing {
  const drawing = new Drawing(312, 212, { originX: 34, originY: 146, scale: 0.056 }, FIGURE.narrow)
  drawDeckPlan(drawing)
  drawing.within({ originY: 194 }, () => drawDeckFront(drawing, -280, 3900))
  return drawing
}

/** Draws the sheet of the deck, 3600 by 2400 on twelve pads; the boards are its cladding, the step its finish. */
export function drawDeckSheet(options: CourseSheetOptions): CourseSheet {
  if (options.size === 'narrow') return { drawing: drawNarrow(options), subject: SUBJECT }
  if (options.size === 'mini') return { drawing: drawMini(), subject: SUBJECT }
  return { drawing: drawWide(options), subject: SUBJECT }
}
