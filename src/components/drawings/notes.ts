import type { Anchor, Drawing, Point } from './drawing'
import { tenth } from './marks'

/** A thin line from a part, in millimetres, to words beside it, in pixels; each entry of `lines` is one line. */
export function drawLeader(
  drawing: Drawing,
  [x, y]: Point,
  [px, py]: Point,
  lines: readonly string[],
  anchor: Anchor = 'start',
): void {
  const gap = anchor === 'start' ? -5 : 5
  const elbow = px + gap * 3.4
  drawing.group({ class: 'lead' }, () => {
    leaderLine(drawing, [x, y], [elbow, py], [px + gap, py])
    lines.forEach((line, index) => {
      const base = py + drawing.figure * 0.36 + index * (drawing.figure + 3)
      drawing.text(px, base, line, 'tx', anchor)
    })
  })
}

/** A numbered ring at the end of a thin line from the part it names. */
export function drawBubble(
  drawing: Drawing,
  [x, y]: Point,
  [px, py]: Point,
  number: string,
  style: string,
  elbow = 17,
): void {
  drawing.group({ class: 'lead' }, () => {
    const end = px - 13
    if (elbow > 0) leaderLine(drawing, [x, y], [end - elbow, py], [end, py])
    else leaderLine(drawing, [x, y], [end, py], [end, py])
  })
  drawing.group({ class: `bub ${style}`.trim() }, () => {
    drawing.dot(px, py, 13, 'ring')
    drawing.text(px, py + 4.8, number, 'tx', 'middle')
  })
}

function leaderLine(drawing: Drawing, [x, y]: Point, ...points: Point[]): void {
  const start = `${drawing.x(x)},${drawing.y(y)}`
  const rest = points.map(([px, py]) => `${tenth(px)},${tenth(py)}`).join(' ')
  drawing.add({ tag: 'polyline', attributes: { points: `${start} ${rest}`, class: 'lead-line' } })
  drawing.dot(drawing.x(x), drawing.y(y), 2.2, 'lead-dot')
}

/** A bar of known length in four black and white parts, at a pixel place. */
export function drawScaleBar(
  drawing: Drawing,
  [px, py]: Point,
  lengthMm: number,
  label: string,
): void {
  const part = (lengthMm * drawing.frame.scale) / 4
  drawing.group({ class: 'sbar' }, () => {
    for (let index = 0; index < 4; index++) {
      const attributes = { x: tenth(px + index * part), y: py, width: tenth(part), height: 6 }
      drawing.add({ tag: 'rect', attributes: { ...attributes, class: index % 2 ? 'sb0' : 'sb1' } })
    }
    drawing.text(px, py + 21, '0')
    drawing.text(px + part * 4, py + 21, label, 'tx', 'middle')
  })
}
