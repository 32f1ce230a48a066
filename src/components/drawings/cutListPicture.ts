import { dimensionRow } from './dimensions'
import type { Drawing } from './drawing'
import type { RoundFigure } from './figures'

/** One bar cut into three and a rest: how many bars? */
export function drawCutListPicture(drawing: Drawing, figure: RoundFigure): void {
  const [left, right, top, high] = [14, 210, 46, 26]
  let hatch = ''
  for (let x = 176; x < right - 4; x += 7)
    hatch += `M${x} ${top + high}L${Math.min(x + high, right)} ${Math.max(top, top + high - (right - x))}`
  drawing.coloured(() => {
    for (const x of [14, 68, 122]) {
      const shape = { x, y: top, width: 51, height: high, class: 'p2 m-timber' }
      drawing.add({ tag: 'rect', attributes: shape })
    }
    const rest = { x: 176, y: top, width: 34, height: high, class: 'p2 m-void' }
    drawing.add({ tag: 'rect', attributes: rest })
  })
  drawing.path(hatch, 'p1 nofill')
  drawing.path('M66.5 40V45M66.5 73V78M120.5 40V45M120.5 73V78M174.5 40V45M174.5 73V78', 'p2')
  dimensionRow(drawing, left, right, top - 4, 24, figure(3600, 144))
  drawing.text(112, 108, '? bars', 'ask1', 'middle', 17)
}
