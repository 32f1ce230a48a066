import { dimensionRow } from './dimensions'
import type { Drawing } from './drawing'

/** Four posts at equal centres under a rail: how far apart? */
export function drawSpacingPicture(drawing: Drawing): void {
  drawing.coloured(() => {
    for (let index = 0; index < 4; index++)
      drawing.rect(28 + index * 54, -92, 12, 62, 'p2 m-timber')
    drawing.rect(20, -30, 190, 9, 'p1b m-timber2')
  })
  drawing.path('M10 92H224', 'p3')
  dimensionRow(drawing, 34, 88, 94, 108, '?', { chalk: true })
}
