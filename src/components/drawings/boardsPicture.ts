import { dimensionRow } from './dimensions'
import type { Drawing } from './drawing'
import type { RoundFigure } from './figures'

/** Boards between two stops: how many, and how wide the gap? */
export function drawBoardsPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.path('M16 16V92M205 16V92', 'p3 nofill')
  drawing.coloured(() => {
    for (let index = 0; index < 5; index++)
      drawing.rect(18 + index * 38, -88, 33, 68, 'p1b m-timber')
  })
  drawing.text(92, 60, '?', 'ask1', 'middle', 17)
  dimensionRow(drawing, 16, 205, 94, 108, figure(800, 32))
}
