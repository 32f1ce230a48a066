import { type Drawing, type Point } from './drawing'
import { drawEarth, drawStipple } from './materials'

export interface FenceView {
  groundFrom: number
  groundTo: number
  /** Left edges of the posts. */
  posts: readonly number[]
  /** Which space between two posts is the gate. */
  gate: number
}

const POST = 100
const PICKET = 75
const RAILS = [230, 780] as const

/** The fence from the front, its first post at zero, the ground cut away. */
export function drawPicketFence(drawing: Drawing, view: FenceView): void {
  const { posts, gate } = view
  drawing.layer('ground', () => {
    drawEarth(drawing, view.groundFrom, view.groundTo, 720, 34)
    drawing.line(view.groundFrom, 0, view.groundTo, 0, 'p3')
  })
  drawing.layer('base', () => posts.forEach((x) => drawPostHole(drawing, x)))
  const bays = posts
    .slice(0, -1)
    .map((x, index) => ({ from: x + POST, to: posts[index + 1] ?? x, index }))
    .filter(({ index }) => index !== gate)
  drawing.layer('frame', () => {
    for (const { from, to } of bays)
      for (const y of RAILS) drawing.rect(from, y, to - from, 75, 'p1b m-timber2')
  })
  drawing.layer('cladding', () => bays.forEach(({ from, to }) => drawBay(drawing, from, to)))
  drawing.layer('finish', () => drawGate(drawing, posts, gate))
  drawing.layer('frame', () => posts.forEach((x) => drawPost(drawing, x)))
  drawing.layer('roof', () => posts.forEach((x) => drawCap(drawing, x)))
}

function drawPostHole(drawing: Drawing, x: number): void {
  const hole: Point[] = [
    [x - 100, 0],
    [x - 130, -600],
    [x + 230, -600],
    [x + 200, 0],
  ]
  drawing.polygon(hole, 'p1b m-concrete')
  drawStipple(drawing, { x: x - 90, y: -590, width: 280, height: 560 }, x + 3, 90)
  drawing.rect(x, -500, POST, 500, 'p1b dash nofill')
}

function drawPicket(drawing: Drawing, x: number, from: number, height: number): void {
  const picket: Point[] = [
    [x, from],
    [x, from + height - 70],
    [x + PICKET / 2, from + height],
    [x + PICKET, from + height - 70],
    [x + PICKET, from],
  ]
  drawing.polygon(picket, 'p1b m-timber')
}

function drawBay(drawing: Drawing, from: number, to: number): void {
  const count = Math.floor((to - from + 55) / 130)
  const gap = (to - from - count * PICKET) / (count + 1)
  let nails = ''
  for (let index = 0; index < count; index++) {
    const x = from + gap + index * (PICKET + gap)
    drawPicket(drawing, x, 60, 960)
    nails += `M${drawing.at(x + 37, 268)}h.01M${drawing.at(x + 37, 818)}h.01`
  }
  drawing.path(nails, 'nailp')
}

function drawGate(drawing: Drawing, posts: readonly number[], gate: number): void {
  const hinge = posts[gate]
  const latch = posts[gate + 1]
  if (hinge === undefined || latch === undefined) return
  const from = hinge + 112
  const to = latch - 12
  for (const y of RAILS) drawing.rect(from, y, to - from, 95, 'p2 m-timber2')
  const brace: Point[] = [
    [from + 10, 325],
    [from + 120, 325],
    [to - 10, 780],
    [to - 120, 780],
  ]
  drawing.polygon(brace, 'p2 m-timber3')
  const gap = (to - from - 8 * PICKET) / 7
  for (let index = 0; index < 8; index++) {
    const across = (index / 7) * 2 - 1
    drawPicket(drawing, from + index * (PICKET + gap), 60, 1000 - 90 * (1 - across * across))
  }
  drawGateIron(drawing, from, to)
}

function drawGateIron(drawing: Drawing, from: number, to: number): void {
  for (const y of [277, 827]) {
    const strap: Point[] = [
      [from - 30, y - 16],
      [from + 250, y - 6],
      [from + 250, y + 6],
      [from - 30, y + 16],
    ]
    drawing.polygon(strap, 'p1b m-steel')
    drawing.dot(drawing.x(from - 16), drawing.y(y), 2.6, 'p1b m-steel')
  }
  drawing.rect(to - 90, 700, 150, 22, 'p1b m-steel')
  drawing.circle(to - 50, 711, 20, 'p1b m-steel')
}

function drawPost(drawing: Drawing, x: number): void {
  drawing.rect(x, 0, POST, 1120, 'p2 m-timber')
  drawing.line(x + 34, 40, x + 30, 1060, 'grain')
  drawing.line(x + 66, 60, x + 70, 1000, 'grain')
}

function drawCap(drawing: Drawing, x: number): void {
  const cap: Point[] = [
    [x - 16, 1120],
    [x + 116, 1120],
    [x + 116, 1144],
    [x + 50, 1196],
    [x - 16, 1144],
  ]
  drawing.polygon(cap, 'p2 m-timber3')
  drawing.line(x - 16, 1144, x + 116, 1144, 'p1')
}
