import { type Drawing, type Point } from './drawing'
import { drawEarth, drawGroundLine, drawStipple } from './materials'
import { createRandom } from './random'

export const DECK = { widthMm: 3600, depthMm: 2400, heightMm: 233, boardMm: 120, gapMm: 6 } as const
const PADS_X = [120, 1223, 2377, 3480] as const
const PADS_Y = [325, 1201, 2077] as const
const JOIST_STEP = (DECK.widthMm - 47) / 9

/** The ragged edge up to which the boards are laid: right of it the joists are seen. */
function breakLine(y: number): number {
  return 2360 + Math.sin(y / 210) * 26 - y * 0.12
}

/** The deck from above, boards part lifted, its near left corner at zero. */
export function drawDeckPlan(drawing: Drawing): void {
  const { widthMm, depthMm } = DECK
  drawing.layer('ground', () => drawing.rect(0, 0, widthMm, depthMm, 'p1 dash m-sheet'))
  drawing.layer('base', () => {
    for (const y of PADS_Y)
      for (const x of PADS_X) drawing.rect(x - 150, y - 150, 300, 300, 'p1b dash m-pad')
  })
  drawing.layer('frame', () => {
    for (const y of [300, 1176, 2052]) drawing.rect(0, y, widthMm, 50, 'p1b dash nofill')
    for (let x = 0; x <= widthMm - 47; x += JOIST_STEP)
      drawing.rect(x, 47, 47, depthMm - 94, 'p1b m-timber2')
    drawing.rect(0, 0, widthMm, 47, 'p2 m-timber')
    drawing.rect(0, depthMm - 47, widthMm, 47, 'p2 m-timber')
    drawing.rect(0, 0, widthMm, depthMm, 'p3 nofill')
  })
  drawing.layer('cladding', () => drawBoards(drawing))
  drawing.layer('finish', () => {
    drawing.rect(1200, -320, 1200, 300, 'p2 m-timber')
    drawing.line(1200, -170, 2400, -170, 'p1b')
  })
}

function drawBoards(drawing: Drawing): void {
  const random = createRandom(4)
  const { depthMm, boardMm, gapMm } = DECK
  let nails = ''
  for (let y = 0, row = 0; y + boardMm <= depthMm + 1; y += boardMm + gapMm, row++) {
    const near = breakLine(y)
    const far = breakLine(y + boardMm)
    const board: Point[] = [
      [-25, y],
      [near, y],
      [far, y + boardMm],
      [-25, y + boardMm],
    ]
    drawing.polygon(board, 'p1b m-timber')
    if (row % 3 === 1)
      drawing.line(
        200 + random() * 500,
        y + 50 + random() * 30,
        1300 + random() * 700,
        y + 50 + random() * 30,
        'grain',
      )
    for (let x = 23; x < far - 40; x += JOIST_STEP)
      nails += `M${drawing.at(x, y + 30)}h.01M${drawing.at(x, y + 90)}h.01`
  }
  drawing.path(nails, 'nailp')
  const edge: Point[] = []
  for (let y = -60; y <= depthMm + 60; y += 40) edge.push([breakLine(y), y])
  drawing.polyline(edge, 'p2 nofill')
}

/** The deck from the front, the ground cut away. */
export function drawDeckFront(drawing: Drawing, groundFrom: number, groundTo: number): void {
  drawing.layer('ground', () => {
    drawEarth(drawing, groundFrom, groundTo, 330, 30)
    drawGroundLine(drawing, groundFrom, groundTo)
  })
  drawing.layer('base', () => {
    for (const x of PADS_X) drawing.rect(x - 150, -250, 300, 270, 'p1b dash m-concrete')
  })
  drawing.layer('frame', () => {
    drawing.rect(0, 60, 3600, 145, 'p3 m-timber2')
    drawing.line(60, 120, 1900, 116, 'grain')
    drawing.line(1500, 150, 3400, 146, 'grain')
  })
  drawing.layer('cladding', () => drawing.rect(-25, 205, 3650, 28, 'p3 m-timber'))
  drawing.layer('finish', () => {
    drawing.rect(1220, 0, 1160, 96, 'p2 m-timber2')
    drawing.rect(1200, 96, 1200, 28, 'p2 m-timber')
  })
}

/** Board, joist, bearer and pad at a larger scale, zero at the ground line under the bearer. */
export function drawDeckDetail(drawing: Drawing): void {
  drawing.layer('ground', () => {
    drawEarth(drawing, -400, 500, 300, 26)
    drawing.line(-400, 0, -150, 0, 'p3')
    drawing.line(150, 0, 500, 0, 'p3')
  })
  drawing.layer('base', () => {
    drawing.rect(-150, -250, 300, 270, 'p3 m-concrete')
    drawStipple(drawing, { x: -150, y: -200, width: 300, height: 210 }, 3, 34)
    drawing.rect(-60, 20, 120, 6, 'p1b m-steel')
  })
  drawing.layer('frame', () => {
    drawing.rect(-50, 26, 100, 100, 'p2 m-timber3')
    drawing.line(-50, 26, 50, 126, 'p1')
    drawing.line(50, 26, -50, 126, 'p1')
    drawing.rect(-400, 126, 800, 145, 'p2 m-timber2')
    drawing.line(-300, 180, 300, 186, 'grain')
    drawing.line(-300, 226, 200, 230, 'grain')
  })
  drawing.layer('cladding', () => {
    for (let board = -3; board < 4; board++) {
      drawing.rect(-55 + board * 126, 271, 120, 28, 'p2 m-timber')
      drawing.line(5 + board * 126, 299, 5 + board * 126, 243, 'p2')
    }
  })
}
