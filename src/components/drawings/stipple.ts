import type { Drawing } from './drawing'
import { tenth } from './marks'
import { createRandom } from './random'

/** A rectangle of the sheet in pixels. */
export interface SheetArea {
  left: number
  top: number
  width: number
  height: number
}

/** Concrete on a sheet in pixels: dots and a few triangles, as many as the room bears. */
export function stippleArea(drawing: Drawing, area: SheetArea, seed: number): void {
  const random = createRandom(seed)
  const count = Math.max(6, Math.min(90, Math.round((area.width * area.height) / 1100)))
  let dots = ''
  let triangles = ''
  for (let index = 0; index < count; index++) {
    const x = tenth(area.left + 6 + random() * (area.width - 12))
    const y = tenth(area.top + 5 + random() * (area.height - 10))
    if (index % 4) dots += `M${x} ${y}h.1`
    else triangles += `M${tenth(x - 3)} ${tenth(y + 2)}l3-5 3 5z`
  }
  drawing.path(dots, 'dots')
  drawing.path(triangles, 'p1 nofill')
}
