import { dimensionColumn } from './dimensions'
import type { Drawing } from './drawing'
import type { RoundFigure } from './figures'

/** Three equal steps: how high is each? */
export function drawStairsPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.coloured(() => drawing.path('M56 106V82H96V58H136V34H180V106Z', 'nostroke m-concrete'))
  drawing.path('M8 106H56V82H96V58H136V34H180', 'p3 nofill')
  dimensionColumn(drawing, 34, 106, 180, 194, figure(520, 21))
  dimensionColumn(drawing, 82, 106, 52, 40, '?', { chalk: true, level: true })
}
