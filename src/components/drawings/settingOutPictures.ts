import { dimensionColumn, dimensionRow } from './dimensions'
import type { Drawing } from './drawing'
import type { RoundFigure } from './figures'

const ask = (drawing: Drawing, px: number, py: number, text: string) =>
  drawing.text(px, py, text, 'ask1', 'middle', 17)

/** The corner of a form with its triangle: what must the tape read across? */
export function drawSquarePicture(drawing: Drawing): void {
  drawing.coloured(() => drawing.path('M40 96H160V90H46V16H40Z', 'p1b m-timber'))
  drawing.path('M46 90L46 26L132 90Z', 'tri')
  drawing.path('M46 26L132 90', 'chalkline')
  ask(drawing, 104, 50, '?')
  drawing.text(30, 64, '3', 'tx', 'end')
  drawing.text(90, 112, '4', 'tx', 'middle')
}

/** A form that leans, with both diagonals: which end moves? */
export function drawDiagonalsPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.path('M34 22H186L190 96H30Z', 'p3 nofill')
  drawing.path('M34 22L190 96M186 22L30 96', 'chalkline')
  drawing.text(30, 114, figure(2823, 110.5), 'tx', 'start')
  drawing.text(190, 114, figure(2826, 110.625), 'tx', 'end')
  ask(drawing, 110, 64, '?')
}

/** A slope of 4 in 12: how many degrees? */
export function drawPitchPicture(drawing: Drawing): void {
  drawing.coloured(() => drawing.path('M24 86H190L190 34Z', 'p2 m-timber'))
  drawing.path('M66 86A42 42 0 0 0 64 74', 'chalkline')
  ask(drawing, 92, 82, '?°')
  dimensionRow(drawing, 24, 190, 92, 104, '12')
  dimensionColumn(drawing, 34, 86, 192, 204, '4', { level: true })
}
