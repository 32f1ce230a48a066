import { dimensionColumn } from './dimensions'
import type { Drawing } from './drawing'

/** A board end within the size it is named by: what does it measure? */
export function drawLumberSizePicture(drawing: Drawing): void {
  drawing.path('M88 10H140V102H88Z', 'p1 dash nofill')
  drawing.coloured(() => drawing.rect(93, -97, 42, 82, 'p3 m-timber'))
  drawing.path('M98 44Q114 30 130 44M98 68Q114 54 130 68', 'grain nofill')
  dimensionColumn(drawing, 15, 97, 142, 162, '?', { chalk: true, level: true })
  drawing.text(74, 62, '2 × 4', 'tx', 'end')
}
