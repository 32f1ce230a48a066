import { dimensionRow } from './dimensions'
import type { Drawing } from './drawing'
import type { RoundFigure } from './figures'

/** A rafter on its two plates: how long is it? */
export function drawRafterPicture(drawing: Drawing, figure: RoundFigure): void {
  drawing.coloured(() => {
    drawing.rect(44, -104, 14, 27, 'p2 m-timber2')
    drawing.rect(168, -104, 14, 62, 'p2 m-timber2')
    drawing.path('M16 76L196 24V38L62 76.7V77H44V82L16 90Z', 'p2 m-timber')
  })
  drawing.path('M13 64L193 12', 'chalkline')
  drawing.path('M11 58l4 12M191 6l4 12', 'chalkline')
  drawing.text(100, 34, '?', 'ask1', 'middle', 17)
  dimensionRow(drawing, 58, 168, 92, 98, figure(1500, 60))
}
