import { createRequire } from 'node:module'
import { GlobalFonts } from '@napi-rs/canvas'
import type { SKRSContext2D } from '@napi-rs/canvas'

export type Ctx = SKRSContext2D
export type Point = readonly [number, number]

/** The colours of the drawing set. Chalk is the one accent, amber stands for cautions only. */
export const colour = {
  paper: '#EFF1EB',
  sheet: '#FBFCF9',
  rule: '#CDD4CC',
  ink: '#18272E',
  ink2: '#46575D',
  pencil: '#76848A',
  chalk: '#1B5C8C',
  chalkWash: '#DCE9F3',
  moss: '#37632F',
  amber: '#7A5200',
  amberFill: '#EDB02F',
  amberWash: '#FCEFCB',
  boxwood: '#EEDDAE',
  boxwoodEdge: '#C9AE6A',
  timber: '#E6C493',
  timber2: '#D6AD77',
  timber3: '#C6965E',
  concrete: '#D3D8D6',
  stone: '#BCC4C3',
  stoneBed: '#E3E4DC',
  earth: '#D9C7AC',
  grass: '#BCD0A4',
  slate: '#9DABB0',
  steel: '#C7D0D3',
  bark: '#8F6A48',
  water: '#A9C4D2',
} as const

/** Three pens as on a drawing: dimensions, parts, outline of the thing drawn. */
export const pen = { fine: 1.5, part: 2.25, outline: 3.5 } as const

const WEIGHTS = [500, 600, 700, 800, 900] as const
type Weight = (typeof WEIGHTS)[number]

/** Every weight goes under a family name of its own: the canvas does not choose among weights of one family. */
export function registerFonts(): void {
  const require = createRequire(import.meta.url)
  for (const weight of WEIGHTS) {
    const file = require.resolve(`@fontsource/nunito/files/nunito-latin-${weight}-normal.woff2`)
    if (!GlobalFonts.registerFromPath(file, `Nunito ${weight}`)) throw new Error(`No font ${file}`)
  }
}

interface Stroke {
  stroke?: string
  fill?: string
  width?: number
  dash?: number[]
}

function finish(ctx: Ctx, { stroke, fill, width = pen.part, dash = [] }: Stroke): void {
  if (fill) {
    ctx.fillStyle = fill
    ctx.fill()
  }
  if (!stroke) return
  ctx.strokeStyle = stroke
  ctx.lineWidth = width
  ctx.lineJoin = 'round'
  ctx.lineCap = dash.length ? 'butt' : 'round'
  ctx.setLineDash(dash)
  ctx.stroke()
  ctx.setLineDash([])
}

export function line(ctx: Ctx, a: Point, b: Point, style: Stroke = {}): void {
  ctx.beginPath()
  ctx.moveTo(a[0], a[1])
  ctx.lineTo(b[0], b[1])
  finish(ctx, { stroke: colour.ink, ...style })
}

export function polyline(ctx: Ctx, points: readonly Point[], style: Stroke = {}): void {
  trace(ctx, points)
  finish(ctx, { stroke: colour.ink, ...style })
}

export function polygon(ctx: Ctx, points: readonly Point[], style: Stroke): void {
  trace(ctx, points)
  ctx.closePath()
  finish(ctx, style)
}

function trace(ctx: Ctx, points: readonly Point[]): void {
  ctx.beginPath()
  points.forEach(([x, y], index) => (index ? ctx.lineTo(x, y) : ctx.moveTo(x, y)))
}

export function box(ctx: Ctx, x: number, y: number, w: number, h: number, style: Stroke): void {
  ctx.beginPath()
  ctx.rect(x, y, w, h)
  finish(ctx, style)
}

export function disc(ctx: Ctx, [x, y]: Point, radius: number, style: Stroke): void {
  ctx.beginPath()
  ctx.arc(x, y, radius, 0, 2 * Math.PI)
  finish(ctx, style)
}

/** An outline in the notation of SVG paths, its origin moved to `at` and its size multiplied. */
export function shape(ctx: Ctx, path: string, at: Point, scale: number, style: Stroke): void {
  ctx.save()
  ctx.translate(at[0], at[1])
  ctx.scale(scale, scale)
  drawPath(ctx, path)
  ctx.restore()
  finish(ctx, style)
}

/** Absolute M, L, C, Q and Z only. */
function drawPath(ctx: Ctx, path: string): void {
  ctx.beginPath()
  for (const [, command, rest] of path.matchAll(/([MLCQZ])([^MLCQZ]*)/g)) {
    const n = (rest ?? '')
      .trim()
      .split(/[\s,]+/)
      .filter(Boolean)
      .map(Number)
    const at = (index: number) => n[index] ?? 0
    if (command === 'M') ctx.moveTo(at(0), at(1))
    else if (command === 'Z') ctx.closePath()
    else if (command === 'L') for (let i = 0; i < n.length; i += 2) ctx.lineTo(at(i), at(i + 1))
    else if (command === 'Q')
      for (let i = 0; i < n.length; i += 4)
        ctx.quadraticCurveTo(at(i), at(i + 1), at(i + 2), at(i + 3))
    else
      for (let i = 0; i < n.length; i += 6)
        ctx.bezierCurveTo(at(i), at(i + 1), at(i + 2), at(i + 3), at(i + 4), at(i + 5))
  }
}

interface Lettering {
  size?: number
  weight?: Weight
  fill?: string
  align?: 'left' | 'center' | 'right'
  /** Where `y` lies on the letters; figures on dimension lines sit on their middle. */
  baseline?: 'alphabetic' | 'middle'
}

function setFont(ctx: Ctx, { size = 24, weight = 600 }: Lettering): void {
  ctx.font = `${size}px "Nunito ${weight}"`
}

export function write(ctx: Ctx, text: string, [x, y]: Point, style: Lettering = {}): void {
  setFont(ctx, style)
  ctx.fillStyle = style.fill ?? colour.ink
  ctx.textAlign = style.align ?? 'left'
  ctx.textBaseline = style.baseline ?? 'alphabetic'
  ctx.fillText(text, x, y)
}

export function widthOf(ctx: Ctx, text: string, style: Lettering = {}): number {
  setFont(ctx, style)
  return ctx.measureText(text).width
}

/** Draws what `paint` draws with the given opacity, moved by `dx`, `dy`. */
export function faded(ctx: Ctx, opacity: number, paint: () => void, dx = 0, dy = 0): void {
  if (opacity <= 0) return
  ctx.save()
  ctx.globalAlpha *= Math.min(1, opacity)
  ctx.translate(dx, dy)
  paint()
  ctx.restore()
}
