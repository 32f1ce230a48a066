import { dimensionAcross, dimensionUp } from './dimensions'
import { Drawing, type Point } from './drawing'
import { drawEarth, drawGroundLine, drawStipple, drawStones } from './materials'
import { drawLeader } from './notes'
import type { RoundFigure } from './figures'

/** Outline of the footing: a pad with a stem that sheds water. */
const FOOTING: readonly Point[] = [
  [-150, 20],
  [-150, -130],
  [-225, -130],
  [-225, -330],
  [225, -330],
  [225, -130],
  [150, -130],
  [150, 20],
  [0, 34],
]

function drawHole(drawing: Drawing): void {
  drawEarth(drawing, -430, 430, 470, 22)
  const hole: Point[] = [
    [-200, 0],
    [-225, -330],
    [225, -330],
    [200, 0],
  ]
  drawing.polygon(hole, 'p2 m-sheet')
  drawing.rect(-225, -430, 450, 100, 'p2 m-stonebed')
  drawStones(drawing, { x: -220, y: -425, width: 440, height: 90 }, 8, 40)
  drawing.polygon(FOOTING, 'p3 m-concrete')
  drawStipple(drawing, { x: -140, y: -120, width: 280, height: 130 }, 3, 34)
  drawStipple(drawing, { x: -215, y: -325, width: 430, height: 190 }, 12, 36)
  for (const side of [-1, 1]) {
    const filling: Point[] = [
      [side * 210, 0],
      [side * 225, -130],
      [side * 150, -130],
      [side * 150, 0],
    ]
    drawing.polygon(filling, 'p1b m-earth')
  }
  drawGroundLine(drawing, -430, -150)
  drawGroundLine(drawing, 150, 430)
}

/** The post in its steel foot, broken off at a height in millimetres. */
function drawPost(drawing: Drawing, top: number): void {
  drawing.rect(-6, -60, 12, 100, 'p1b m-steel')
  drawing.rect(-60, 40, 120, 8, 'p2 m-steel')
  drawing.rect(-52, 48, 8, 90, 'p2 m-steel')
  drawing.rect(44, 48, 8, 90, 'p2 m-steel')
  drawing.rect(-44, 62, 88, top - 62, 'p3 m-timber')
  drawing.line(-18, 80, -14, top - 12, 'grain')
  drawing.line(14, 90, 10, top - 7, 'grain')
  drawing.line(30, 70, 30, top - 92, 'grain')
  for (const x of [-48, 48]) drawing.dot(drawing.x(x), drawing.y(100), 4, 'p1b m-steel')
  const broken: Point[] = [
    [-60, top],
    [-30, top - 8],
    [-12, top + 12],
    [14, top - 10],
    [34, top + 6],
    [60, top - 2],
  ]
  drawing.polyline(broken, 'p2 nofill')
}

/** A section through a post on a concrete footing, for a page or for a phone. */
export function drawPostFoot(size: 'wide' | 'narrow', figure: RoundFigure): Drawing {
  const isWide = size === 'wide'
  const drawing = isWide
    ? new Drawing(620, 620, { originX: 310, originY: 300, scale: 0.62 }, 14)
    : new Drawing(326, 296, { originX: 148, originY: 110, scale: 0.345 }, 12)
  drawing.coloured(() => {
    drawHole(drawing)
    drawPost(drawing, isWide ? 392 : 262)
  })
  const column = isWide ? 70 : 26
  dimensionAcross(drawing, [-225, 225], -430, isWide ? 604 : 282, figure(450, 18))
  dimensionUp(drawing, [-330, 20], -225, column, figure(350, 14))
  const section = `${figure(90, 3.5)} × ${figure(90, 3.5)}`
  const post = isWide ? [`post ${section}`] : ['post', section]
  const foot = ['post foot keeps', 'end grain dry']
  if (!isWide) {
    drawLeader(drawing, [30, 200], [222, 24], post)
    drawLeader(drawing, [0, 44], [222, 62], foot)
    return drawing
  }
  dimensionUp(drawing, [-430, -330], -225, column, figure(100, 4))
  dimensionUp(drawing, [20, 62], 150, 440, figure(42, 1.625), { level: true })
  drawLeader(drawing, [30, 250], [420, 120], post)
  drawLeader(drawing, [0, 44], [420, 190], foot)
  return drawing
}
