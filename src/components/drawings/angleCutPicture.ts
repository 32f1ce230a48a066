import { dimensionRow } from './dimensions'
import type { Drawing } from './drawing'
import type { RoundFigure } from './figures'

/** A board with a slanting end: how far does the short point lie behind the long one? */
export function drawAngleCutPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.coloured(() => drawing.path('M24 38H194L156 84H24Z', 'p2 m-timber'))
  drawing.path('M36 52h112M36 68h96', 'grain')
  drawing.path('M194 42V96', 'p1 dash nofill')
  dimensionRow(drawing, 24, 194, 34, 20, figure(895, 36))
  dimensionRow(drawing, 156, 194, 88, 104, '?', { chalk: true })
}
