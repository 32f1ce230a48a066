import { lengthFigure, readNumber, type CalculatorSheetInput } from './calculatorSheet'
import { dimensionColumn, dimensionRow } from './dimensions'
import type { Drawing, Point } from './drawing'

/** The order in which a rafter is worked; what follows from the asked number is not shown. */
const ORDER = [
  'rise',
  'lineLength',
  'totalLength',
  'plumbCut',
  'levelCut',
  'heelCut',
  'birdsmouthDepth',
  'notchFits',
]

/** A rafter in metres, its slope as rise over run. */
export interface Rafter {
  run: number
  slope: number
  overhang: number
  ridge: number
  depth: number
  seat: number
}

/** Whether a figure may be shown while another is asked for. */
export function isShown({ asked, outputs }: CalculatorSheetInput, name: string): boolean {
  if (outputs === null) return false
  const at = ORDER.indexOf(asked ?? '')
  return at < 0 || ORDER.indexOf(name) <= at
}

/** The larger of seat and heel on the sheet, in pixels, and half the window that shows the notch. */
const [NOTCH, HALF] = [52, 62] as const
/** How far the window reaches to the left, so that the heel’s figure has room on the rafter. */
const BEFORE = 100

/**
 * The notch on its plate, larger, about a place in pixels where seat and heel meet; returns what it says in words.
 * Nothing is drawn for a rafter without a seat.
 */
export function drawNotch(
  drawing: Drawing,
  input: CalculatorSheetInput,
  { slope, seat, depth }: Rafter,
  { x, y }: { x: number; y: number },
): string[] {
  if (!(seat > 0)) return []
  const scale = NOTCH / Math.max(seat, seat * slope)
  const [along, up] = [Math.max(6, seat * scale), Math.max(2, seat * slope * scale)]
  const lean = up / along
  const thick = Math.min(150, Math.max(up * 1.3 + 8, depth * scale)) * Math.hypot(1, lean)
  const low = (at: number) => y + up - (at - x) * lean
  const [left, right] = [x - BEFORE, x + HALF]
  const shape: Point[] = [
    [left, low(left) - thick],
    [right, low(right) - thick],
    [right, low(right)],
    [x + along, y],
    [x, y],
    [x, y + up],
    [left, low(left)],
  ]
  drawing.clip('notch', [
    [left, -(y - HALF)],
    [right, -(y - HALF)],
    [right, -(y + HALF)],
    [left, -(y + HALF)],
  ])
  drawing.group(
    { class: 'layer is-signed' },
    () => {
      drawing.rect(x, -(y + HALF), along, HALF, 'p1b m-timber3')
      drawing.polygon(
        shape.map(([px, py]) => [px, -py]),
        'p3 m-timber',
      )
    },
    { clip: 'notch' },
  )
  return letterNotch(drawing, input, { seat, x, y, along, up, left })
}

interface Corner {
  seat: number
  x: number
  y: number
  along: number
  up: number
  left: number
}

function letterNotch(
  drawing: Drawing,
  input: CalculatorSheetInput,
  { seat, x, y, along, up, left }: Corner,
): string[] {
  const flat = lengthFigure(input, 'seat', seat)
  drawing.text(left, y - HALF - 8, 'the notch, larger', 'vtitle')
  dimensionRow(drawing, x, x + along, y + HALF, y + HALF + 18, flat.text, {
    ...flat,
    beyond: 'before',
  })
  if (!isShown(input, 'heelCut')) return [`seat ${flat.text}`]
  const heel = lengthFigure(input, 'heelCut', readNumber(input.outputs, 'heelCut'))
  dimensionColumn(drawing, y, y + up, x, x - 18, heel.text, { ...heel, level: true })
  return [`seat ${flat.text}`, `heel cut ${heel.text}`]
}
