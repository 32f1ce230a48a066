import { type Drawing, type Point } from './drawing'
import { drawEarth, drawGroundLine, drawLogs, drawStipple, drawStones } from './materials'

/** Fall of the roof, 15 degrees to the front. */
const ROOF_SLOPE = Math.tan((15 * Math.PI) / 180)

export interface LogStoreView {
  groundFrom: number
  groundTo: number
  /** Left out where only the structure matters. */
  withLogs?: boolean
  /** Height of the fuller stack. */
  stackMm?: number
}

/** The log store seen from the front, its left post at zero and the ground line at zero. */
export function drawLogStoreFront(drawing: Drawing, view: LogStoreView): void {
  drawing.layer('ground', () => drawFrontGround(drawing, view))
  drawing.layer('base', () => {
    drawing.rect(-140, -150, 2680, 100, 'p2 m-stonebed')
    drawStones(drawing, { x: -140, y: -150, width: 2680, height: 100 }, 11, 46)
    drawing.rect(-100, -50, 2600, 100, 'p3 m-concrete')
    drawStipple(drawing, { x: -100, y: -50, width: 2600, height: 100 }, 8, 62)
  })
  drawing.layer('cladding', () => {
    for (let y = 250; y < 1400; y += 120) drawing.rect(60, y, 2280, 95, 'p1b m-timber2')
  })
  if (view.withLogs !== false)
    drawing.layer('finish', () => {
      drawLogs(drawing, { x: 80, y: 237, width: 1078, height: view.stackMm ?? 900 }, 21)
      drawLogs(drawing, { x: 1242, y: 237, width: 1078, height: 560 }, 77)
    })
  drawing.layer('frame', () => drawFrontFrame(drawing))
  drawing.layer('roof', () => drawFrontRoof(drawing))
}

function drawFrontGround(drawing: Drawing, { groundFrom, groundTo }: LogStoreView): void {
  drawEarth(drawing, groundFrom, groundTo, 230, 26)
  const dig: Point[] = [
    [-150, 0],
    [-150, -150],
    [2550, -150],
    [2550, 0],
  ]
  drawing.polyline(dig, 'p1b dashy m-void')
  drawGroundLine(drawing, groundFrom, -100)
  drawGroundLine(drawing, 2500, groundTo)
}

function drawFrontFrame(drawing: Drawing): void {
  drawing.rect(75, 1405, 2250, 95, 'p2 m-timber')
  drawing.rect(75, 120, 2250, 95, 'p2 m-timber')
  drawing.rect(75, 215, 2250, 20, 'p1b m-timber2')
  for (const x of [0, 1162.5, 2325]) {
    drawing.rect(x + 12, 50, 51, 20, 'p1b m-steel')
    drawing.rect(x, 70, 75, 1430, 'p2 m-timber')
    drawing.line(x + 26, 120, x + 22, 1380, 'grain')
    drawing.line(x + 52, 90, x + 55, 1440, 'grain')
  }
}

function drawFrontRoof(drawing: Drawing): void {
  drawing.rect(-120, 1568, 2640, 284, 'p3 m-roof')
  for (let row = 1; row < 6; row++) {
    const y = 1568 + (row * 284) / 6
    drawing.line(-120, y, 2520, y, 'p1b')
    drawing.line(-120, y - 9, 2520, y - 9, 'p1')
  }
  drawing.rect(-120, 1468, 2640, 100, 'p3 m-timber3')
  drawing.line(-120, 1556, 2520, 1556, 'p1')
}

/** Height of the rafter's underside over the ground, at a distance from the front. */
function eaves(x: number): number {
  return 1500 + x * ROOF_SLOPE
}

/** The log store seen from its side, the front on the left. */
export function drawLogStoreSide(drawing: Drawing, { groundFrom, groundTo }: LogStoreView): void {
  drawing.layer('ground', () => {
    drawEarth(drawing, groundFrom, groundTo, 230, 26)
    drawGroundLine(drawing, groundFrom, -100)
    drawGroundLine(drawing, 1000, groundTo)
  })
  drawing.layer('base', () => {
    drawing.rect(-140, -150, 1180, 100, 'p2 m-stonebed')
    drawStones(drawing, { x: -140, y: -150, width: 1180, height: 100 }, 31, 46)
    const pad: Point[] = [
      [-100, -50],
      [-100, 44],
      [1000, 56],
      [1000, -50],
    ]
    drawing.polygon(pad, 'p3 m-concrete')
    drawStipple(drawing, { x: -100, y: -50, width: 1100, height: 94 }, 9, 62)
  })
  drawing.layer('frame', () => drawSideFrame(drawing))
  drawing.layer('cladding', () => drawSideSlats(drawing))
  drawing.layer('roof', () => drawSideRoof(drawing))
}

function drawSideFrame(drawing: Drawing): void {
  for (const x of [0, 825]) {
    drawing.rect(x + 12, 52, 51, 20, 'p1b m-steel')
    const post: Point[] = [
      [x, 72],
      [x, eaves(x)],
      [x + 75, eaves(x + 75)],
      [x + 75, 72],
    ]
    drawing.polygon(post, 'p2 m-timber')
    drawing.line(x + 28, 100, x + 25, 1430, 'grain')
  }
  drawing.rect(75, 120, 750, 95, 'p2 m-timber')
}

function drawSideSlats(drawing: Drawing): void {
  drawing.clip('side', [
    [-2, 240],
    [-2, eaves(0) - 6],
    [902, eaves(900) - 6],
    [902, 240],
  ])
  drawing.group(
    {},
    () => {
      for (let y = 250; y < 1740; y += 120) drawing.rect(0, y, 900, 95, 'p1b m-timber2')
    },
    { clip: 'side' },
  )
  for (const x of [37, 862])
    for (let y = 297; y < 1460; y += 120)
      for (const offset of [14, -14]) drawing.dot(drawing.x(x), drawing.y(y + offset), 1.1, 'nail')
}

function drawSideRoof(drawing: Drawing): void {
  const rafter: Point[] = [
    [-120, eaves(-120)],
    [940, eaves(940)],
    [940, eaves(940) + 75],
    [-120, eaves(-120) + 75],
  ]
  drawing.polygon(rafter, 'p2 m-timber')
  for (let board = 0; board < 6; board++) {
    const low = -150 + board * 182
    const high = Math.min(low + 215, 960)
    const under = eaves(low) + 75
    const over = eaves(high) + 75
    const lap: Point[] = [
      [low, under + 6],
      [low - 6, under + 32],
      [high - 2, over + 14],
      [high, over + 4],
    ]
    drawing.polygon(lap, 'p1b m-roof')
  }
  drawing.rect(-142, eaves(-120) - 6, 24, 100, 'p2 m-timber3')
}
