import type { Anchor, Drawing } from './drawing'
import { tenth } from './marks'

export interface DimensionOptions {
  /** Chalk for a figure that is being worked out or set off. */
  chalk?: boolean
  /** Side on which a figure stands that does not fit between its ticks; right or below by default. */
  beyond?: 'before' | 'after'
  /** Keeps an upright dimension's figure level instead of turned along the line. */
  level?: boolean
}

const TICK = 4

/** The slash that ends a dimension line. */
function tick(drawing: Drawing, px: number, py: number): void {
  drawing.stroke(px - TICK, py + TICK, px + TICK, py - TICK, 'dtick')
}

function dimensionClass(options: DimensionOptions): string {
  return options.chalk ? 'dim d-chalk' : 'dim'
}

/** A dimension from left to right, all in pixels: `from` is the edge measured, `row` where the line lies. */
export function dimensionRow(
  drawing: Drawing,
  left: number,
  right: number,
  from: number,
  row: number,
  label: string,
  options: DimensionOptions = {},
): void {
  const away = row > from ? 1 : -1
  const width = drawing.textWidth(label) + 8
  const middle = (left + right) / 2
  const base = row + drawing.figure * 0.36
  drawing.group({ class: dimensionClass(options) }, () => {
    drawing.stroke(left, from + away * 5, left, row + away * 6, 'ext')
    drawing.stroke(right, from + away * 5, right, row + away * 6, 'ext')
    drawing.stroke(left, row, right, row, 'ext')
    tick(drawing, left, row)
    tick(drawing, right, row)
    if (right - left > width + 6) {
      ground(drawing, middle - width / 2, row - 9, width, 18)
      drawing.text(middle, base, label, 'tx', 'middle')
    } else if (options.beyond === 'before') drawing.text(left - 8, base, label, 'tx', 'end')
    else drawing.text(right + 8, base, label, 'tx', 'start')
  })
}

/** A dimension from top to bottom, all in pixels: `from` is the edge measured, `column` where the line lies. */
export function dimensionColumn(
  drawing: Drawing,
  top: number,
  bottom: number,
  from: number,
  column: number,
  label: string,
  options: DimensionOptions = {},
): void {
  const away = column > from ? 1 : -1
  const width = drawing.textWidth(label) + 8
  const middle = (top + bottom) / 2
  drawing.group({ class: dimensionClass(options) }, () => {
    drawing.stroke(from + away * 5, top, column + away * 6, top, 'ext')
    drawing.stroke(from + away * 5, bottom, column + away * 6, bottom, 'ext')
    drawing.stroke(column, top, column, bottom, 'ext')
    tick(drawing, column, top)
    tick(drawing, column, bottom)
    if (!options.level && bottom - top > width + 6) {
      ground(drawing, column - 9, middle - width / 2, 18, width)
      drawing.textTurned(column, middle, -90, label)
    } else {
      const anchor: Anchor = away > 0 ? 'start' : 'end'
      drawing.text(column + away * 10, middle + drawing.figure * 0.36, label, 'tx', anchor)
    }
  })
}

/** Clears the line behind a figure. */
function ground(drawing: Drawing, x: number, y: number, width: number, height: number): void {
  const place = { x: tenth(x), y: tenth(y), width: tenth(width), height: tenth(height) }
  drawing.add({ tag: 'rect', attributes: { ...place, class: 'dimbg' } })
}

/** A dimension across the model, from x1 to x2 in millimetres; the row is in pixels. */
export function dimensionAcross(
  drawing: Drawing,
  [x1, x2]: readonly [number, number],
  edge: number,
  row: number,
  label: string,
  options: DimensionOptions = {},
): void {
  dimensionRow(drawing, drawing.x(x1), drawing.x(x2), drawing.y(edge), row, label, options)
}

/** A dimension up the model, from y1 to y2 in millimetres; the column is in pixels. */
export function dimensionUp(
  drawing: Drawing,
  [y1, y2]: readonly [number, number],
  edge: number,
  column: number,
  label: string,
  options: DimensionOptions = {},
): void {
  dimensionColumn(drawing, drawing.y(y2), drawing.y(y1), drawing.x(edge), column, label, options)
}
