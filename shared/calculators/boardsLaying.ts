import { CalculatorInputError } from './calculator'
import { clean, roundUp } from '../units/number'

/** More boards than one opening of a garden takes. */
const MOST_BOARDS = 120

/** An opening and the boards for it, in metres. */
export interface Laying {
  opening: number
  boardWidth: number
  gap: number
  /** Boards stay whole and share the rest among the gaps. */
  isEven: boolean
  /** Gaps beside the stops: two where it starts and ends with a gap, else none. */
  endGaps: 0 | 2
}

/** Boards as they lie: marks are the near edges, from the start of the opening. */
export interface Laid {
  count: number
  gap: number
  lastRip: number
  marks: number[]
}

/** Lays boards into an opening; refuses what holds no board, or more than anyone lays. */
export function layBoards(laying: Laying): Laid {
  const { opening, boardWidth, gap, isEven, endGaps } = laying
  if (opening / (boardWidth + gap) > MOST_BOARDS) {
    throw new CalculatorInputError(
      'opening',
      `That is more than ${String(MOST_BOARDS)} boards. Work it out in two openings.`,
    )
  }
  const laid = isEven ? layEvenly(laying) : layFixed(laying)
  const first = endGaps === 2 ? laid.gap : 0
  const marks = Array.from({ length: laid.count }, (_, index) =>
    clean(first + index * (boardWidth + laid.gap)),
  )
  return { ...laid, marks }
}

type Shares = Omit<Laid, 'marks'>

/** The gap stays, the last board is ripped; where less than a gap is left, it stays whole. */
function layFixed({ opening, boardWidth, gap, endGaps }: Laying): Shares {
  const room = opening - endGaps * gap
  if (room <= 1e-9) {
    throw new CalculatorInputError(
      'opening',
      'The gaps at both ends fill the opening. Start with a board, or make the gap smaller.',
    )
  }
  const count = Math.max(1, roundUp(room / (boardWidth + gap)))
  const left = clean(room - (count - 1) * (boardWidth + gap))
  return { count, gap, lastRip: Math.min(boardWidth, left) }
}

/** Whole boards; of the two counts about the wanted gap the one whose gap is nearer to it. */
function layEvenly({ opening, boardWidth, gap, endGaps }: Laying): Shares {
  const ideal = (opening + gap * (1 - endGaps)) / (boardWidth + gap)
  const least = endGaps === 2 ? 1 : 2
  const counts = [Math.floor(ideal), Math.ceil(ideal)].map((count) => Math.max(least, count))
  const found = counts
    .map((count) => ({
      count,
      gap: clean((opening - count * boardWidth) / (count - 1 + endGaps)),
    }))
    .filter((one) => one.gap > -1e-9)
    .sort((a, b) => Math.abs(a.gap - gap) - Math.abs(b.gap - gap) || b.count - a.count)[0]
  if (!found) {
    throw new CalculatorInputError(
      'opening',
      least === 2
        ? 'Fewer than two whole boards fit, so there is no gap to share. Keep the gap and rip the last board instead.'
        : 'Not one whole board fits. Take a narrower board, or rip one.',
    )
  }
  return { count: found.count, gap: Math.max(0, found.gap), lastRip: boardWidth }
}
