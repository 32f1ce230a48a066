import { formatNumber } from '../../../shared/units/number'
import type { Figure } from './calculatorSheet'
import type { Drawing } from './drawing'
import { tenth } from './marks'
import { createRandom } from './random'

/** A heap measured in boxes of one size; the water too, to compare. */
export interface Column {
  name: 'cement' | 'sand' | 'stone' | 'water'
  parts: number
  figure: Figure | undefined
}

interface Layout {
  narrow: boolean
  first: number
  step: number
  width: number
  box: number
  base: number
}

/** Columns share the sheet; the tallest sets where they stand. */
export function measureBoxes(narrow: boolean, columns: Column[]): Layout {
  const most = Math.max(...columns.map(({ parts }) => parts))
  const box = narrow ? 24 : 32
  const base = 54 + Math.ceil(most) * box
  return narrow
    ? { narrow, first: 46, step: 78, width: 40, box, base }
    : { narrow, first: 120, step: 160, width: 64, box, base }
}

const STYLES = { cement: 'm-steel', sand: 'm-boxwood', stone: 'm-stonebed' } as const

/** Grain of a heap in one box: dots for cement and sand, stones for stone. */
function grain(name: Column['name'], left: number, top: number, width: number, height: number) {
  const random = createRandom(Math.round(left + top))
  let d = ''
  const rows = Math.max(1, Math.floor(height / 9))
  for (let index = 0; index < rows * 4; index++) {
    const x = left + (((index % 4) + 0.3 + random() * 0.4) * width) / 4
    const y = top + ((Math.floor(index / 4) + 0.3 + random() * 0.4) * height) / rows
    d +=
      name === 'stone'
        ? `M${tenth(x - 3)} ${tenth(y + 2)}l3-5 3.4 4.6z`
        : `M${tenth(x)} ${tenth(y)}h.1`
  }
  return d
}

function lettering(drawing: Drawing, { base, narrow }: Layout, x: number, column: Column): void {
  const { figure, name } = column
  drawing.text(x, base + (narrow ? 19 : 22), name, 'vsub', 'middle')
  if (!figure) return
  const style = figure.chalk ? 'askt' : 'vtitle'
  drawing.text(x, base + (narrow ? 37 : 43), figure.text, style, 'middle')
}

/** A heap as boxes on each other; half a part is half a box. */
export function drawBoxes(drawing: Drawing, layout: Layout, column: Column, index: number): void {
  const { first, step, width, box, base } = layout
  const middle = first + index * step
  const left = middle - width / 2
  const style = STYLES[column.name === 'water' ? 'sand' : column.name]
  drawing.coloured(() => {
    for (let from = 0; from < column.parts; from++) {
      const height = Math.min(1, column.parts - from) * box
      const top = base - from * box - height
      drawing.rect(left, -top - height, width, height, `p2 ${style}`)
      const marks = grain(column.name, left, top, width, height)
      drawing.path(marks, column.name === 'stone' ? 'p1 m-stone' : 'dots')
    }
  })
  drawing.stroke(left - 10, base, left + width + 10, base, 'p3')
  const above = base - column.parts * box - 8
  drawing.text(middle, above, formatNumber(column.parts, 1), 'tx', 'middle')
  lettering(drawing, layout, middle, column)
}

/** The water in a jug as wide as a box, filled to scale. */
export function drawWater(drawing: Drawing, layout: Layout, column: Column, index: number): void {
  const { first, step, width, box, base } = layout
  const middle = first + index * step
  const [left, right] = [middle - width / 2, middle + width / 2]
  const level = base - column.parts * box
  const top = Math.min(level - 10, base - box * 1.4)
  drawing.coloured(() => {
    drawing.rect(left, -base, width, base - level, 'nostroke m-water')
    drawing.path(`M${left} ${tenth(level)}H${right}`, 'p1b nofill')
    drawing.path(`M${left} ${tenth(top)}V${base}H${right}V${tenth(top)}l6-6`, 'p2 nofill')
  })
  lettering(drawing, layout, middle, column)
}
