import { FIGURE, type CourseSheet, type CourseSheetOptions } from './courseSheet'
import { dimensionAcross, dimensionUp } from './dimensions'
import { Drawing, type Point } from './drawing'
import { drawBubble, drawLeader, drawScaleBar } from './notes'
import { drawPicketFence } from './picketFence'
import { bubbleClass, type Stage } from './stages'

const SUBJECT = 'Picket fence with a gate'
const POSTS = [0, 1800, 2900, 4700] as const

/** A point on each stage's part, measured from the last post; from the top down, so that no two lines cross. */
const PARTS: readonly (readonly [stage: Stage, point: Point])[] = [
  ['roof', [85, 1165]],
  ['frame', [60, 905]],
  ['cladding', [-58, 560]],
  ['finish', [-1840, 420]],
  ['base', [150, -250]],
  ['ground', [300, -620]],
]

function drawBubbles(
  drawing: Drawing,
  options: CourseSheetOptions,
  lastPost: number,
  column: number,
  rows: readonly number[],
  elbow: number,
): void {
  PARTS.forEach(([stage, [x, y]], index) => {
    const bubble = options.bubbles.find((candidate) => candidate.stage === stage)
    if (!bubble) return
    const place: Point = [column, rows[index] ?? 0]
    drawBubble(drawing, [lastPost + x, y], place, String(bubble.number), bubbleClass(bubble), elbow)
  })
}

function drawWide(options: CourseSheetOptions): Drawing {
  const { figure } = options
  const numbered = options.bubbles.length > 0
  const frame = { originX: numbered ? 92 : 88, originY: 270, scale: numbered ? 0.164 : 0.168 }
  const drawing = new Drawing(1000, 444, frame, FIGURE.wide)
  drawPicketFence(drawing, { groundFrom: -240, groundTo: 5040, posts: POSTS, gate: 1 })
  dimensionAcross(drawing, [50, 1850], 1196, 34, figure(1800))
  dimensionAcross(drawing, [1850, 2950], 1196, 34, figure(1100))
  dimensionAcross(drawing, [2950, 4750], 1196, 34, figure(1800))
  dimensionUp(drawing, [0, 1020], -40, 46, figure(1020))
  dimensionUp(drawing, [-600, 0], -130, 46, figure(600))
  if (numbered) drawBubbles(drawing, options, 4700, 962, [74, 122, 178, 226, 308, 366], 17)
  else {
    drawLeader(drawing, [2352, 560], [548, 418], ['brace rises from the hinge side'])
    const clear = drawing.x(5040) + 14
    dimensionUp(drawing, [0, 60], 5040, clear, figure(60), { level: true })
  }
  drawScaleBar(drawing, [numbered ? 560 : 775, 416], 1000, '1 m')
  drawing.text(98, 430, 'Front elevation, ground shown cut away', 'vtitle')
  return drawing
}

function drawNarrow(options: CourseSheetOptions): Drawing {
  const { figure } = options
  const numbered = options.bubbles.length > 0
  const frame = { originX: 46, originY: 156, scale: numbered ? 0.091 : 0.1 }
  const drawing = new Drawing(328, 236, frame, FIGURE.narrow)
  const posts = numbered ? [0, 1100, 2200] : [0, 1320, 2420]
  const last = posts[2] ?? 0
  const gate = numbered ? 0 : 1
  drawPicketFence(drawing, { groundFrom: -200, groundTo: last + 400, posts, gate })
  const [from, to] = [(posts[gate] ?? 0) + 50, (posts[gate + 1] ?? 0) + 50]
  dimensionAcross(drawing, [from, to], 1196, 16, figure(1100))
  dimensionUp(drawing, [0, 1020], -40, 14, figure(1020))
  if (!numbered) dimensionUp(drawing, [-600, 0], 220, drawing.x(400), figure(600), { level: true })
  else drawBubbles(drawing, options, last, 312, [34, 68, 102, 136, 178, 214], 0)
  return drawing
}

function drawMini(): Drawing {
  const drawing = new Drawing(312, 142, { originX: 22, originY: 92, scale: 0.056 }, FIGURE.narrow)
  drawPicketFence(drawing, { groundFrom: -280, groundTo: 5080, posts: POSTS, gate: 1 })
  return drawing
}

/** Draws the sheet of the picket fence: the post caps are its roof, the gate its finish. */
export function drawPicketFenceSheet(options: CourseSheetOptions): CourseSheet {
  if (options.size === 'narrow')
    return { drawing: drawNarrow(options), subject: `${SUBJECT}, part front elevation` }
  const subject = `${SUBJECT}, front elevation`
  return { drawing: options.size === 'mini' ? drawMini() : drawWide(options), subject }
}
