import { dimensionColumn, dimensionRow } from './dimensions'
import type { Figure } from './calculatorSheet'
import type { Drawing, Point } from './drawing'
import { tenth } from './marks'
import { createRandom } from './random'

/** A cut along the way the water runs, its high edge on the left. */
export interface FallSection {
  narrow: boolean
  /** Drop over run. */
  ratio: number
  run: Figure
  drop: Figure
  /** The fall as it was said. */
  words: string
  hasBuilding: boolean
}

interface Layout {
  left: number
  right: number
  /** Surface at the high edge and at the low one. */
  high: number
  low: number
  slab: number
  bed: number
  bank: number
}

/** How many times steeper the fall may be drawn, so that it can be seen. */
const TIMES = [1, 2, 5, 10, 20, 50, 100]
/** A drop of fewer pixels does not show. */
const LEAST_DROP = 24

/** How many times steeper than true the fall is drawn over so many pixels of run. */
export const timesSteeper = (ratio: number, width: number): number =>
  ratio > 0 ? (TIMES.find((times) => ratio * width * times >= LEAST_DROP) ?? 100) : 1

/** The ends of the run on the sheet; the figures beside the drop keep their room. */
export function placeRun(drawing: Drawing, drop: string, narrow: boolean) {
  const room = drawing.textWidth(drop) + (narrow ? 66 : 104)
  return { left: narrow ? 50 : 120, right: drawing.width - Math.max(narrow ? 90 : 150, room) }
}

function fill(drawing: Drawing, points: readonly Point[], style: string): void {
  drawing.polygon(
    points.map(([x, y]) => [x, -y] as const),
    style,
  )
}

/** A strip under the surface, from so far below it to so far below it. */
function strip({ left, right, high, low }: Layout, from: number, to: number): Point[] {
  return [
    [left, high + from],
    [right, low + from],
    [right, low + to],
    [left, high + to],
  ]
}

function drawGround(drawing: Drawing, at: Layout, hasBuilding: boolean): void {
  const depth = at.low + at.slab + at.bed + 16
  const [from, to] = [at.left - at.bank, at.right + at.bank]
  const [groundHigh, groundLow] = [at.high + 14, at.low + 14]
  const earth: Point[] = [
    [from, groundHigh],
    [at.left, groundHigh],
    [at.right, groundLow],
    [to, groundLow],
    [to, depth],
    [from, depth],
  ]
  fill(drawing, earth, 'nostroke m-earth')
  if (!hasBuilding) drawing.stroke(from, groundHigh, at.left, groundHigh, 'p3')
  drawing.stroke(at.right, groundLow, to, groundLow, 'p3')
}

function drawStonesUnder(drawing: Drawing, at: Layout): void {
  const random = createRandom(11)
  let d = ''
  for (let x = at.left + 5; x < at.right - 12; x += 19) {
    const surface = at.high + ((at.low - at.high) * (x - at.left)) / (at.right - at.left)
    const y = surface + at.slab + 8 + random() * (at.bed - 16)
    d += `M${tenth(x)} ${tenth(y + 4)}l5-7 6 6z`
  }
  drawing.path(d, 'p1 m-stone')
}

/** Grain of the concrete, spread evenly under a surface that leans. */
function drawGrain(drawing: Drawing, at: Layout): void {
  const random = createRandom(31)
  const width = at.right - at.left
  let dots = ''
  let stones = ''
  for (let index = 0; index < width / 8; index++) {
    const along = 8 + random() * (width - 16)
    const x = tenth(at.left + along)
    const y = tenth(at.high + ((at.low - at.high) * along) / width + 7 + random() * (at.slab - 14))
    if (index % 5) dots += `M${x} ${y}h.1`
    else stones += `M${tenth(x - 3)} ${tenth(y + 2)}l3-5 3 5z`
  }
  drawing.path(dots, 'dots')
  drawing.path(stones, 'p1 nofill')
}

/** A wall on its footing, cut off at the top, with a thin joint to the surface. */
function drawBuilding(drawing: Drawing, at: Layout): void {
  const [from, to] = [at.left - at.bank, at.left - 3]
  const top = at.high - 36
  const foot = at.low + at.slab + at.bed + 16
  drawing.rect(from, -foot, to - from, foot - top, 'p2 m-stone')
  let hatch = ''
  for (let y = top + 10; y < foot - 8; y += 12)
    hatch += `M${from} ${tenth(y + 8)}L${to} ${tenth(y)}`
  drawing.path(hatch, 'p1 nofill')
  drawing.path(
    `M${from - 3} ${top}l${tenth((to - from) / 2)}-5 6 9 ${tenth((to - from) / 2)}-5`,
    'p2 nofill',
  )
}

/** A peg beside the surface that carries the string. */
function drawPeg(drawing: Drawing, x: number, top: number, foot: number, width: number): void {
  const half = width / 2
  const points: Point[] = [
    [x - half, top],
    [x + half, top],
    [x + half, foot - 8],
    [x, foot],
    [x - half, foot - 8],
  ]
  fill(drawing, points, 'p2 m-timber3')
}

function drawMaterials(drawing: Drawing, section: FallSection, at: Layout): void {
  const peg = section.narrow ? 7 : 10
  drawing.coloured(() => {
    drawGround(drawing, at, section.hasBuilding)
    fill(drawing, strip(at, at.slab, at.slab + at.bed), 'p2 m-stonebed')
    drawStonesUnder(drawing, at)
    fill(drawing, strip(at, 0, at.slab), 'p3 m-concrete')
    drawGrain(drawing, at)
    if (section.hasBuilding) drawBuilding(drawing, at)
    else drawPeg(drawing, at.left - peg - 4, at.high - 14, at.low + 30, peg)
    drawPeg(drawing, at.right + peg + 4, at.high - 14, at.low + 34, peg)
  })
}

/** The arrow down the slope, and what the fall is where it fits. */
function drawArrow(drawing: Drawing, section: FallSection, at: Layout): void {
  const lean = (at.low - at.high) / (at.right - at.left)
  const width = drawing.textWidth(section.words)
  const middle = (at.left + at.right) / 2
  const along = (x: number) => at.high + at.slab / 2 + (x - at.left) * lean
  const degrees = (Math.atan(lean) * 180) / Math.PI
  const [from, to] = [middle + width / 2 + 14, middle + width / 2 + (section.narrow ? 46 : 90)]
  const turn = `translate(${tenth(middle)} ${tenth(along(middle))}) rotate(${tenth(degrees)})`
  drawing.group({ transform: turn }, () =>
    drawing.rect(-width / 2 - 6, -10, width + 12, 20, 'onconcrete'),
  )
  drawing.textTurned(middle, along(middle), degrees, section.words, 'fallt')
  if (lean === 0 || to > at.right - 6) return
  drawing.path(`M${from} ${tenth(along(from))}L${to - 8} ${tenth(along(to - 8))}`, 'fall')
  const head = `M-11-5L0 0L-11 5Z`
  drawing.group(
    { transform: `translate(${tenth(to)} ${tenth(along(to))}) rotate(${tenth(degrees)})` },
    () => drawing.path(head, 'fillchalk'),
  )
}

/** Draws the section from a row of the sheet down; gives the row below it. */
export function drawFallSection(drawing: Drawing, section: FallSection, top: number): number {
  const { narrow } = section
  const ends = placeRun(drawing, section.drop.text, narrow)
  const width = ends.right - ends.left
  const drop = section.ratio * width * timesSteeper(section.ratio, width)
  const at: Layout = {
    ...ends,
    high: top + 46,
    low: top + 46 + drop,
    slab: narrow ? 40 : 52,
    bed: narrow ? 26 : 34,
    bank: narrow ? 32 : 60,
  }
  drawMaterials(drawing, section, at)
  const column = at.right + at.bank + (narrow ? 4 : 10)
  const string = section.hasBuilding ? at.left - 3 : at.left - at.bank * 0.5
  drawing.path(`M${tenth(string)} ${at.high}H${tenth(column + 8)}`, 'datum')
  drawing.text(at.left + 6, at.high - 8, narrow ? 'string, level' : 'string, set level', 'vsub')
  drawArrow(drawing, section, at)
  if (drop > 0 || section.drop.chalk)
    dimensionColumn(drawing, at.high, at.low, at.right, column, section.drop.text, {
      level: true,
      chalk: section.drop.chalk,
    })
  const bottom = at.low + at.slab + at.bed + 16
  dimensionRow(drawing, at.left, at.right, bottom, bottom + 22, section.run.text, section.run)
  return bottom + 22
}
