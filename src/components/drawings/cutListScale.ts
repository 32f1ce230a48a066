import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatCutLength } from './cutListFigures'
import type { Drawing } from './drawing'

const INCH = 25.4
/** Round steps from mark to mark, in millimetres. */
const STEPS: Record<UnitSystem, readonly number[]> = {
  metric: [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000],
  imperial: [1 / 16, 1 / 8, 1 / 4, 1 / 2, 1, 3, 6, 12, 24, 48, 120, 240].map(
    (inches) => inches * INCH,
  ),
}

interface ScalePlace {
  left: number
  right: number
  top: number
  /** Pixels a millimetre takes. */
  scale: number
}

/** A scale in round lengths under the bars; how many pixels it takes. */
export function drawCutScale(
  drawing: Drawing,
  { left, right, top, scale }: ScalePlace,
  { longestMm, system }: { longestMm: number; system: UnitSystem },
): number {
  const widest = drawing.textWidth(formatCutLength(longestMm, system)) + 24
  const step = STEPS[system].find((mm) => mm * scale >= Math.max(widest, 56))
  if (!step || step > longestMm) return 0
  const marks = Math.floor(longestMm / step + 1e-9)
  drawing.group({ class: 'dim' }, () => {
    drawing.stroke(left, top, right, top, 'ext')
    for (let half = 0; half <= marks * 2 + 1; half++) {
      const px = left + (half / 2) * step * scale
      if (px > right + 0.5) break
      drawing.stroke(px, top, px, top + (half % 2 ? 4 : 8), 'ext')
    }
    for (let mark = 0; mark <= marks; mark++) {
      const text = formatCutLength(mark * step, system)
      const px = left + mark * step * scale
      const half = drawing.textWidth(text) / 2
      const middle = Math.max(half + 2, Math.min(px, drawing.width - half - 2))
      drawing.text(middle, top + 10 + drawing.figure, text, 'tx', 'middle')
    }
  })
  return drawing.figure + 24
}
