import { formatQuantity } from '../../../shared/units/format'
import {
  lengthFigure,
  readNumber,
  readPositive,
  type CalculatorSheet,
  type CalculatorSheetInput,
  type Figure,
} from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { formatDrawnLength, type RoundFigure } from './figures'
import {
  chooseLabelled,
  drawLength,
  drawPositions,
  drawPosts,
  type Elevation,
  type Post,
} from './postsOnFallPosts'

interface Build {
  input: CalculatorSheetInput
  narrow: boolean
  runM: number
  fall: number
  topM: number
  /** Drop of the top a metre; negative where it rises. */
  roof: number
  /** Every post from the high edge on, in metres. */
  posts: { at: number; length: number }[]
}

function readBuild(input: CalculatorSheetInput): Build | null {
  const { values } = input
  const runM = readPositive(values, 'run')
  const topM = readPositive(values, 'topHeight')
  const positions = values.positions
  if (!runM || !topM || !Array.isArray(positions) || positions.length === 0) return null
  const fall = readNumber(values, 'fall')
  const turn = values.roofFalls === 'against' ? -1 : 1
  const roof = turn * Math.tan(readNumber(values, 'roofPitch'))
  const sorted = [...(positions as readonly number[])].sort((a, b) => a - b)
  const posts = sorted.map((at) => ({ at, length: topM + at * (fall - roof) }))
  return { input, narrow: input.size === 'narrow', runM, fall, topM, roof, posts }
}

/** A fall of fewer pixels does not show; it is drawn so many times steeper. */
const LEAST_DROP = 14
/** A fall of more pixels would leave no room for the posts. */
const MOST_DROP = 60
const TIMES = [1, 2, 5, 10, 20, 50, 100]

/** Lengths and heights to one scale where the sheet bears it; the fall steeper, so that it is seen. */
function measure(build: Build, width: number) {
  const { runM, topM, roof, fall } = build
  const across = width / runM
  const tallM = topM + Math.max(0, -roof * runM)
  const [least, most] = build.narrow ? [110, 190] : [130, 230]
  const up = Math.min(most, Math.max(least, tallM * across)) / tallM
  const drop = runM * fall * up
  const times = drop > 0 ? (TIMES.find((one) => drop * one >= LEAST_DROP) ?? 100) : 1
  const isTrue = Math.abs(up / across - 1) < 0.15
  const heights = isTrue ? '' : 'heights not to the scale of the lengths'
  const isCut = drop > MOST_DROP
  const steeper = times > 1 ? `fall drawn ${times} times steeper` : ''
  const notes = [heights, isCut ? 'fall drawn flatter than it is' : steeper]
  return { up, drop: Math.min(drop * times, MOST_DROP), notes: notes.filter(Boolean) }
}

/** The figure of one post: a chalk “?” where it is the end that is asked. */
function postFigure({ input, posts }: Build, length: number): Figure & { isEnd: boolean } {
  const lengths = posts.map((post) => post.length)
  const asked = { longest: Math.max(...lengths), shortest: Math.min(...lengths) }
  const isAsked = Object.entries(asked).some(
    ([name, end]) => input.asked === name && Math.abs(end - length) < 1e-6,
  )
  const isEnd = Object.values(asked).includes(length)
  return { text: isAsked ? '?' : formatDrawnLength(length, input.system), chalk: isAsked, isEnd }
}

/** Places everything under the row the captions leave; labels of short posts may stand above the beam. */
function place(drawing: Drawing, build: Build, [left, right]: [number, number], row: number) {
  const { up, drop, notes } = measure(build, right - left)
  const { runM, topM, roof } = build
  const x = (at: number) => left + ((right - left) * at) / runM
  const surface = (at: number) => (drop * at) / runM
  const top = (at: number) => (at * roof - topM) * up
  const raw = build.posts.map(({ at, length }): Post => {
    const { isEnd, ...figure } = postFigure(build, length)
    const text = formatDrawnLength(at, build.input.system)
    return { x: x(at), top: top(at), foot: surface(at), length: figure, at: text, isEnd }
  })
  const labelTop = raw.map(({ foot, length }) => foot - drawing.textWidth(length.text) - 10)
  const shift = row + 26 - Math.min(...labelTop, top(0), top(runM))
  const posts = raw.map((post) => ({ ...post, top: post.top + shift, foot: post.foot + shift }))
  const elevation: Elevation = {
    narrow: build.narrow,
    left,
    right,
    high: shift,
    low: shift + drop,
    topHigh: top(0) + shift,
    topLow: top(runM) + shift,
  }
  return { elevation, posts, notes }
}

/** Draws posts of different lengths between a surface that falls and a straight top. */
export function drawPostsOnFallSheet(input: CalculatorSheetInput): CalculatorSheet | null {
  const build = readBuild(input)
  if (!build) return null
  const { narrow } = build
  const drawing = new Drawing(narrow ? 326 : 720, 0, undefined, narrow ? 12 : 14)
  const topFigure = lengthFigure(input, 'topHeight', build.topM)
  const left = drawing.textWidth(topFigure.text) + (narrow ? 52 : 90)
  const right = drawing.width - (narrow ? 34 : 90)
  const margin = narrow ? 10 : 24
  drawing.text(margin, 22, 'Elevation', 'vtitle')
  const { notes } = measure(build, right - left)
  notes.forEach((note, index) => drawing.text(margin, 41 + index * 18, note, 'vsub'))
  const row = 30 + notes.length * 18
  const { elevation, posts } = place(drawing, build, [left, right], row)
  const bottom = drawPosts(drawing, elevation, posts)
  const shown = chooseLabelled(posts, narrow ? 30 : 34)
  for (const post of shown) drawLength(drawing, post, narrow)
  const { high, topHigh } = elevation
  const column = left - (narrow ? 30 : 42)
  dimensionColumn(drawing, topHigh, high, left, column, topFigure.text, {
    level: true,
    ...topFigure,
  })
  drawPositions(drawing, posts, bottom + 26)
  const run = lengthFigure(input, 'run', build.runM)
  dimensionRow(drawing, left, right, bottom + 30, bottom + 52, run.text, run)
  drawing.height = drawSlopes(drawing, build, bottom + 84, margin)
  return { drawing, words: describe(build, topFigure, run) }
}

/** Fall, pitch and the difference in words; gives the height the sheet then needs. */
function drawSlopes(drawing: Drawing, build: Build, row: number, left: number): number {
  const { input } = build
  drawing.text(left, row, slopesText(build), 'vsub')
  const difference = lengthFigure(input, 'difference', readNumber(input.outputs, 'difference'))
  const unit = input.system === 'metric' && !difference.chalk ? ' mm' : ''
  const words = `longest and shortest differ by ${difference.text}${unit}`
  const isShown = !input.asked || difference.chalk
  if (isShown) drawing.text(left, row + 20, words, difference.chalk ? 'askt' : 'tx')
  return row + (isShown ? 34 : 14)
}

function slopesText({ input, fall, roof }: Build): string {
  const unit = input.system === 'imperial' ? 'in/ft' : 'mm/m'
  const slope = formatQuantity(fall, 'ratio', input.system, { unit }).replace(
    /\/(m|ft)$/,
    ' per $1',
  )
  const pitch = formatQuantity(Math.atan(Math.abs(roof)), 'angle', input.system)
  const top = roof === 0 ? 'top level' : `top ${roof > 0 ? 'falls' : 'rises'} ${pitch}`
  return `surface falls ${slope}, ${top}`
}

function describe(build: Build, top: Figure, run: Figure): string {
  const { input, posts } = build
  const unit = input.system === 'metric' ? ' mm' : ''
  const each = posts.map(({ at, length }) => {
    const figure = postFigure(build, length)
    const said = figure.chalk ? 'what is asked' : `${figure.text}${unit}`
    return `at ${formatDrawnLength(at, input.system)}${unit} ${said}`
  })
  return `Elevation of posts on a surface with a run of ${run.text}${unit}, its high edge on the left: ${slopesText(build)}, ${top.text}${unit} over the high edge. Posts: ${each.join('; ')}.`
}

/** Posts between a falling pad and a level beam: how long is the last? */
export function drawPostsOnFallPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.coloured(() => {
    drawing.path('M16 78L204 98V112H16Z', 'p2 m-concrete')
    drawing.rect(20, -34, 180, 10, 'p1b m-timber2')
    drawing.path('M26 34h12v46l-12-1zM104 34h12v54l-12-1zM182 34h12v62l-12-1z', 'p2 m-timber')
  })
  dimensionColumn(drawing, 34, 80, 38, 54, figure(1480, 58), { level: true })
  dimensionColumn(drawing, 34, 95, 182, 166, '?', { chalk: true, level: true })
}
