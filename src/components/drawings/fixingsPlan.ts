import type { Drawing } from './drawing'
import { tenth } from './marks'
import type { SheetArea } from './stipple'

/** How many are drawn, however many there are. */
export interface Shown {
  boards: number
  supports: number
  perCrossing: number
  /** More lie beyond the edge of what is drawn. */
  moreBoards: boolean
  moreSupports: boolean
}

/** Boards seen from above over their supports, a screw head for each fixing. */
export function drawCrossings(drawing: Drawing, area: SheetArea, shown: Shown): void {
  const { left, top, width, height } = area
  const pitch = { x: width / shown.supports, y: height / shown.boards }
  const support = Math.min(30, pitch.x * 0.42)
  const board = Math.min(34, pitch.y * 0.8)
  const column = (index: number) => left + (index + 0.5) * pitch.x
  const row = (index: number) => top + (index + 0.5) * pitch.y
  drawing.coloured(() => {
    for (let index = 0; index < shown.supports; index++)
      drawing.rect(
        column(index) - support / 2,
        -top - height - 6,
        support,
        height + 12,
        'p1b m-timber2',
      )
    for (let index = 0; index < shown.boards; index++)
      drawing.rect(left, -row(index) - board / 2, width, board, 'p2 m-timber')
  })
  for (let x = 0; x < shown.supports; x++)
    for (let y = 0; y < shown.boards; y++)
      drawHeads(drawing, [column(x), row(y)], [support, board], shown.perCrossing)
  if (shown.moreSupports)
    drawing.path(breakDown(left + width, top - 8, top + height + 8), 'p2 nofill')
  if (shown.moreBoards)
    drawing.path(breakAcross(top + height + 6, left - 6, left + width + 6), 'p2 nofill')
}

/** Heads in two rows, spread over the crossing; one alone sits in its middle. */
function drawHeads(
  drawing: Drawing,
  [x, y]: readonly [number, number],
  [width, height]: readonly [number, number],
  count: number,
): void {
  const upper = Math.ceil(count / 2)
  for (let index = 0; index < count; index++) {
    const isUpper = index < upper
    const inRow = isUpper ? upper : count - upper
    const place = isUpper ? index : index - upper
    const dx = (width * (place + 0.5)) / inRow - width / 2
    const dy = count === 1 ? 0 : height * (isUpper ? -0.25 : 0.25)
    drawing.dot(x + dx, y + dy, 2.2, 'nail')
  }
}

function breakDown(x: number, from: number, to: number): string {
  const middle = (from + to) / 2
  return `M${tenth(x)} ${tenth(from)}V${tenth(middle - 8)}l-6 5 12 6-6 5V${tenth(to)}`
}

function breakAcross(y: number, from: number, to: number): string {
  const middle = (from + to) / 2
  return `M${tenth(from)} ${tenth(y)}H${tenth(middle - 8)}l5-6 6 12 5-6H${tenth(to)}`
}

/** A nail through a board into its support, one third in the board; `board` is its thickness in pixels. */
export function drawNail(
  drawing: Drawing,
  { x, top, board }: { x: number; top: number; board: number },
): void {
  const half = board * 1.3
  const end = top + 3 * board
  drawing.coloured(() => {
    drawing.rect(x - half * 0.62, -end - 16, half * 1.24, end + 16 - top - board, 'p2 m-timber2')
    drawing.rect(x - half, -top - board, 2 * half, board, 'p2 m-timber')
  })
  const [px, head] = [tenth(x), tenth(top - 2)]
  drawing.path(
    `M${tenth(x - 6)} ${head}h12v3h-4.5V${tenth(end - 6)}L${px} ${tenth(end)}l-1.5-6V${tenth(top + 1)}h-4.5Z`,
    'nail',
  )
}
