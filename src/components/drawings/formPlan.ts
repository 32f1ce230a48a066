import type { Drawing } from './drawing'
import { tenth } from './marks'

/** A timber form seen from above, in pixels of the sheet; `scale` is pixels a metre. */
export interface FormArea {
  left: number
  top: number
  width: number
  height: number
  scale: number
  board: number
  /** The form is longer than the sheet, so its right side is a break. */
  cutAcross: boolean
  /** The form is deeper than the sheet, so its far side is a break. */
  cutUp: boolean
}

const PEG = { wide: 9, narrow: 5 } as const

/** Draws the boards of a form with their pegs, cut short where it is longer than the sheet. */
export function drawForm(drawing: Drawing, form: FormArea): void {
  const { left, top, width, height, board, cutAcross, cutUp } = form
  const right = left + width
  const bottom = top + height
  const place = (x: number, y: number, w: number, h: number, style: string) =>
    drawing.rect(x, -y - h, w, h, style)
  drawing.coloured(() => {
    place(left, top, width, height, 'nostroke m-sheet')
    place(left - board, top, board, height, 'p2 m-timber')
    if (!cutAcross) place(right, top, board, height, 'p2 m-timber')
    if (!cutUp)
      place(left - board, top - board, width + (cutAcross ? 1 : 2) * board, board, 'p2 m-timber')
    place(left - board, bottom, width + (cutAcross ? 1 : 2) * board, board, 'p2 m-timber')
    drawPegs(drawing, form)
  })
  if (cutAcross) drawing.path(breakDown(right, top - board - 4, bottom + board + 4), 'p2 nofill')
  if (cutUp) drawing.path(breakAcross(top, left - board - 4, right + board + 4), 'p2 nofill')
}

function drawPegs(
  drawing: Drawing,
  { left, top, width, height, board, cutAcross, cutUp }: FormArea,
): void {
  const peg = board > 5 ? PEG.wide : PEG.narrow
  const at = (px: number, py: number) => drawing.rect(px, -py - peg, peg, peg, 'p1b m-timber3')
  for (const share of [0.12, 0.5, 0.88]) {
    if (!cutUp) at(left + width * share - peg / 2, top - board - peg)
    at(left + width * share - peg / 2, top + height + board)
  }
  for (const share of [0.22, 0.78]) {
    at(left - board - peg, top + height * share - peg / 2)
    if (!cutAcross) at(left + width + board, top + height * share - peg / 2)
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
