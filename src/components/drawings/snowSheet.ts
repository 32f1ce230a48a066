import { formatQuantity } from '../../../shared/units/format'
import {
  figureOf,
  lengthFigure,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn } from './dimensions'
import { Drawing } from './drawing'
import type { RoundFigure } from './figures'
import { tenth } from './marks'
import { createRandom } from './random'

/** Snow thinner than this is drawn at it, thicker than the most is cut to it, and the drawing says so. */
const LEAST_DEPTH = 40
const ROOF = 14
const POST = { wide: 14, narrow: 9 } as const

interface Snow {
  depth: Figure
  density: Figure
  load: Figure
  weight: Figure
  area: string
  depthM: number
  /** Side of a square roof of this area, in metres. */
  sideM: number
}

interface Layout {
  left: number
  right: number
  /** Top and underside of the snow. */
  top: number
  base: number
  ground: number
  note: string
}

function readSnow(input: CalculatorSheetInput): Snow | null {
  const [depthM, density, load, weight] = ['depth', 'density', 'load', 'weight'].map((name) =>
    readPositive(input.outputs, name),
  )
  const area = readPositive(input.values, 'area')
  if (!depthM || !density || !load || !weight || !area) return null
  const { system } = input
  return {
    depth: lengthFigure(input, 'depth', depthM),
    density: figureOf(input, 'density', formatQuantity(density, 'massDensity', system)),
    load: figureOf(input, 'load', formatQuantity(load, 'pressure', system)),
    weight: figureOf(input, 'weight', formatQuantity(weight, 'mass', system)),
    area: formatQuantity(area, 'area', system),
    depthM,
    sideM: Math.sqrt(area),
  }
}

/** A square roof of this area seen from the front, its snow to the same scale where it can be. */
function layOut(snow: Snow, narrow: boolean, figureRoom: number): Layout {
  const room = narrow ? { width: 232, height: 104 } : { width: 480, height: 130 }
  const right = (narrow ? 326 : 720) - figureRoom - (narrow ? 38 : 90)
  const width = Math.min(room.width, right - (narrow ? 16 : 60))
  const scaled = (snow.depthM * width) / snow.sideM
  const thick = Math.min(room.height, Math.max(LEAST_DEPTH, scaled))
  const times = thick / scaled
  const top = narrow ? 74 : 88
  return {
    left: right - width,
    right,
    top,
    base: top + thick,
    ground: top + thick + ROOF + (narrow ? 70 : 84),
    note:
      times > 1.15
        ? `snow drawn ${tenth(times)} times as deep`
        : times < 0.87
          ? 'snow drawn less deep than it is'
          : '',
  }
}

/** The upper edge of snow as it lies: level with soft hollows, rounded off at both ends. */
function snowOutline({ left, right, top, base }: Layout): string {
  const random = createRandom(31)
  const round = Math.min(22, (base - top) * 0.5)
  const count = 6
  const step = (right - left - 2 * round) / count
  let d = `M${tenth(left)} ${tenth(base)}V${tenth(top + round)}Q${tenth(left)} ${tenth(top)} ${tenth(left + round)} ${tenth(top)}`
  for (let index = 1; index <= count; index++) {
    const x = left + round + index * step
    const dip = index % 2 ? 1 + random() * 3 : 0
    d += `Q${tenth(x - step / 2)} ${tenth(top + dip)} ${tenth(x)} ${tenth(top)}`
  }
  return `${d}Q${tenth(right)} ${tenth(top)} ${tenth(right)} ${tenth(top + round)}V${tenth(base)}Z`
}

function drawBuild(drawing: Drawing, at: Layout, post: number): void {
  const under = at.base + ROOF
  const width = at.right - at.left
  drawing.coloured(() => {
    for (const x of [at.left + width * 0.07, at.right - width * 0.07 - post])
      drawing.rect(x, -at.ground, post, at.ground - under, 'p2 m-timber')
    drawing.rect(at.left, -under, width, ROOF, 'p2 m-roof')
    drawing.path(snowOutline(at), 'p2 m-sheet2')
    drawing.path(crystals(at), 'dots')
  })
  drawing.path(`M${tenth(at.left - 12)} ${tenth(at.ground)}H${tenth(at.right + 12)}`, 'p3')
}

function crystals({ left, right, top, base }: Layout): string {
  const random = createRandom(9)
  const count = Math.round(((right - left) * (base - top)) / 900)
  let d = ''
  for (let index = 0; index < count; index++) {
    const x = left + 14 + random() * (right - left - 28)
    const y = top + 10 + random() * (base - top - 16)
    d += `M${tenth(x)} ${tenth(y)}h.1`
  }
  return d
}

/** Arrows that press on the snow, evenly, with the load above them. */
function drawLoad(drawing: Drawing, at: Layout, load: Figure): void {
  const words = `${load.text} over the whole roof`
  drawing.text((at.left + at.right) / 2, at.top - 42, words, 'askt', 'middle')
  const count = 7
  for (let index = 0; index < count; index++) {
    const x = tenth(at.left + ((at.right - at.left) * (index + 0.5)) / count)
    const end = tenth(at.top - 5)
    drawing.path(`M${x} ${tenth(at.top - 30)}V${end}m-4-7l4 7 4-7`, 'chalkline')
  }
}

/** The density on a clear patch of the snow. */
function drawDensity(drawing: Drawing, at: Layout, density: Figure): void {
  const middle = (at.top + at.base) / 2
  const width = drawing.textWidth(density.text) + 16
  const x = (at.left + at.right - width) / 2
  drawing.coloured(() => drawing.rect(x, -middle - 11, width, 22, 'nostroke m-sheet2'))
  const style = density.chalk ? 'askt' : 'tx'
  drawing.text(
    (at.left + at.right) / 2,
    middle + drawing.figure * 0.36,
    density.text,
    style,
    'middle',
  )
}

/** Draws snow on a small flat roof: how deep, how dense, what it presses with and what it weighs. */
export function drawSnowSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const snow = readSnow(input)
  if (!snow) return null
  const narrow = input.size === 'narrow'
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const at = layOut(snow, narrow, drawing.textWidth(snow.depth.text))
  drawing.height = at.ground + (at.note ? 32 : 14)
  drawBuild(drawing, at, POST[input.size])
  drawLoad(drawing, at, snow.load)
  drawDensity(drawing, at, snow.density)
  const depth = { level: true, chalk: snow.depth.chalk }
  const column = at.right + (narrow ? 16 : 28)
  dimensionColumn(drawing, at.top, at.base, at.right, column, snow.depth.text, depth)
  const middle = (at.left + at.right) / 2
  const row = at.base + ROOF + (narrow ? 30 : 36)
  const style = snow.weight.chalk ? 'askt' : 'vtitle'
  drawing.text(middle, row, `${snow.weight.text} of snow`, style, 'middle')
  drawing.text(middle, row + 20, `on ${snow.area} of roof`, 'vsub', 'middle')
  if (at.note) drawing.text(middle, at.ground + 20, at.note, 'vsub', 'middle')
  return { drawing, words: describe(input, snow) }
}

function describe(input: CalculatorSheetInput, snow: Snow): string {
  const say = ({ text, chalk }: Figure) => (chalk ? 'what is asked' : text)
  const mm = input.system === 'metric' && !snow.depth.chalk ? ' mm' : ''
  return `A flat roof of ${snow.area} under snow, depth ${say(snow.depth)}${mm}, density ${say(snow.density)}: it presses with ${say(snow.load)} over the whole roof and weighs ${say(snow.weight)}.`
}

/** A lean-to roof under snow: what does it weigh? */
export function drawSnowPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.coloured(() => {
    drawing.path('M46 74h12v36H46ZM164 54h12v56h-12Z', 'p2 m-timber')
    drawing.path('M30 70L190 44V52L30 78Z', 'p2 m-roof')
    drawing.path('M30 70V52Q31 45 40 43L104 33 168 21Q190 18 190 30V44Z', 'p1b m-sheet2')
  })
  drawing.path('M8 110H212', 'p3')
  drawing.text(111, 92, '? of snow', 'ask1', 'middle', 17)
  dimensionColumn(drawing, 20, 44, 190, 200, figure(300, 12), { level: true })
}
