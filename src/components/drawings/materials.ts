import type { Drawing } from './drawing'
import { tenth } from './marks'
import { createRandom } from './random'

/** A rectangle of the model in millimetres. */
export interface Area {
  x: number
  y: number
  width: number
  height: number
}

/** Small angular stones of a compacted base. */
export function drawStones(drawing: Drawing, area: Area, seed: number, size = 40): void {
  const random = createRandom(seed)
  const count = Math.round((area.width * area.height) / (size * size * 3.2))
  let d = ''
  for (let index = 0; index < count; index++) {
    const x = area.x + size / 2 + random() * (area.width - size)
    const y = area.y + size / 2 + random() * (area.height - size)
    const half = size * (0.35 + random() * 0.4)
    d += `M${drawing.at(x - half, y - half * 0.3)}L${drawing.at(x + half * 0.2, y + half * 0.8)}L${drawing.at(x + half, y - half * 0.5)}Z`
  }
  drawing.path(d, 'p1 m-stone')
}

/** Concrete as it is drawn in section: dots and a few triangles. */
export function drawStipple(drawing: Drawing, area: Area, seed: number, gap = 70): void {
  const random = createRandom(seed)
  const count = Math.max(6, Math.round((area.width * area.height) / (gap * gap)))
  const half = 4 / drawing.frame.scale / 2.4
  let dots = ''
  let triangles = ''
  for (let index = 0; index < count; index++) {
    const x = area.x + 12 + random() * (area.width - 24)
    const y = area.y + 10 + random() * (area.height - 20)
    if (index % 4) dots += `M${drawing.at(x, y)}h.01`
    else
      triangles += `M${drawing.at(x - half, y - half * 0.7)}L${drawing.at(x, y + half * 0.8)}L${drawing.at(x + half, y - half * 0.7)}Z`
  }
  drawing.path(dots, 'dots')
  drawing.path(triangles, 'p1 nofill')
}

/** Earth with its turf, cut away below the ground line. */
export function drawEarth(
  drawing: Drawing,
  from: number,
  to: number,
  depth: number,
  turf: number,
): void {
  drawing.rect(from, -depth, to - from, depth, 'nostroke m-earth')
  drawing.rect(from, -turf, to - from, turf, 'nostroke m-grass')
}

/** The ground line, hatched beneath in pairs. */
export function drawGroundLine(drawing: Drawing, from: number, to: number, hatched = true): void {
  drawing.line(from, 0, to, 0, 'p3')
  if (!hatched) return
  const count = Math.floor(((to - from) * drawing.frame.scale) / 22)
  const y = drawing.y(0) + 2
  let d = ''
  for (let index = 0; index < count; index++) {
    if (index % 3 === 2) continue
    const x = drawing.x(from) + 12 + index * 22
    d += `M${tenth(x)} ${tenth(y)}l-7 8M${tenth(x + 6)} ${tenth(y)}l-7 8`
  }
  drawing.path(d, 'p1 nofill')
}

/** Firewood in rows, some of it split, the top row only partly laid. */
export function drawLogs(drawing: Drawing, area: Area, seed: number): void {
  const random = createRandom(seed)
  const diameter = 122
  const rise = diameter * 0.866
  const rows = Math.floor(area.height / rise)
  for (let row = 0; row < rows; row++) {
    const shift = row % 2 ? diameter / 2 : 0
    const count = Math.floor((area.width - shift + 4) / diameter)
    const y = area.y + diameter / 2 + row * rise
    for (let index = 0; index < count; index++) {
      if (row === rows - 1 && (index < 2 || index > count - 3)) continue
      const x = area.x + shift + diameter / 2 + index * diameter
      drawLog(drawing, x, y, (diameter / 2) * (0.9 + random() * 0.1), random())
    }
  }
}

function drawLog(drawing: Drawing, x: number, y: number, radius: number, kind: number): void {
  if (kind >= 0.36) {
    drawing.circle(x, y, radius, kind > 0.8 ? 'p1b m-log2' : 'p1b m-log')
    drawing.circle(x + 4, y, radius * 0.42, 'p1 nofill')
    return
  }
  const turn = kind * 30
  const half = (side: 1 | -1) =>
    Array.from({ length: 11 }, (_, index) => {
      const angle = turn + (Math.PI * index) / 10
      return [
        x + side * (Math.cos(angle) * radius - Math.sin(turn) * 4),
        y + side * (Math.sin(angle) * radius + Math.cos(turn) * 4),
      ] as const
    })
  drawing.polygon(half(1), 'p1b m-log')
  drawing.polygon(half(-1), 'p1b m-log2')
}
