import { commonDivisor } from './lengthSteps'
import { at, countBars, countPieces, dot, type Plan, type PlanLine } from './patterns'
import type { PackingProblem } from './sectionProblem'

/** Counts looked at in all, so that the answer comes while one waits for it. */
const mostTries = 20_000

/** What is still to be cut, the bars that are left for it, and the room in them beyond the pieces. */
interface Rest {
  pieces: readonly number[]
  bars: readonly number[]
  slack: number
}

/**
 * The same pieces from the same bars with fewer different cuts, one fewer at a time, for as long as a search through
 * patterns and repetitions finds one. Where the search ends of itself there is none; mostly it is left off before.
 */
export function searchFewerCuts(problem: PackingProblem, plan: Plan): PlanLine[] {
  const pieces = countPieces(problem, plan)
  const bars = countBars(problem, plan)
  const widths = problem.sizes.map(({ width }) => width)
  const rooms = problem.offers.map(({ capacity }) => capacity)
  const rest = { pieces, bars, slack: dot(rooms, bars) - dot(widths, pieces) }
  const search = new CutSearch(widths, rooms)
  let lines = [...plan]
  for (;;) {
    const fewer = lines.length > 1 ? search.find(rest, lines.length - 1) : null
    if (!fewer) return lines
    lines = fewer
  }
}

class CutSearch {
  private tries = mostTries

  constructor(
    private readonly widths: readonly number[],
    private readonly rooms: readonly number[],
  ) {}

  /** A plan for the rest of at most so many patterns; null where none was found. */
  find(rest: Rest, patterns: number): PlanLine[] | null {
    const widest = rest.pieces.findIndex((count) => count > 0)
    if (widest < 0) return []
    if (patterns === 1) return this.findLast(rest)
    for (let repeats = at(rest.pieces, widest); repeats > 0; repeats--) {
      for (const [offer, room] of this.rooms.entries()) {
        if (at(rest.bars, offer) < repeats) continue
        const found = this.fill(this.begin(rest, patterns, widest, offer, repeats), widest, room)
        if (found) return found
      }
    }
    return null
  }

  private begin(
    rest: Rest,
    patterns: number,
    widest: number,
    offer: number,
    repeats: number,
  ): Making {
    const fits = this.widths.map(
      (width, size) => width * Math.floor(at(rest.pieces, size) / repeats),
    )
    const fillable = [...fits, 0]
    for (let size = fits.length - 1; size >= 0; size--) {
      fillable[size] = at(fits, size) + at(fillable, size + 1)
    }
    const spare = rest.slack / repeats
    return { rest, patterns, widest, offer, repeats, counts: fits.map(() => 0), fillable, spare }
  }

  /** All that is left by one pattern. */
  private findLast({ pieces, bars }: Rest): PlanLine[] | null {
    const most = commonDivisor(pieces)
    for (const [offer, room] of this.rooms.entries()) {
      for (let repeats = Math.min(most, at(bars, offer)); repeats > 0; repeats--) {
        if (this.tries-- <= 0) return null
        if (most % repeats !== 0) continue
        const counts = pieces.map((count) => count / repeats)
        if (dot(counts, this.widths) <= room) return [{ pattern: { offer, counts }, bars: repeats }]
      }
    }
    return null
  }

  /** Tries every count of this size and those after it, the highest first, in the pattern that is being made. */
  private fill(making: Making, size: number, room: number): PlanLine[] | null {
    const { rest, patterns, widest, offer, repeats, counts } = making
    if (this.tries-- <= 0 || room - at(making.fillable, size) > making.spare) return null
    const width = this.widths[size]
    if (width === undefined) {
      const slack = rest.slack - room * repeats
      const pieces = rest.pieces.map((count, index) => count - repeats * at(counts, index))
      const bars = rest.bars.map((count, index) => count - (index === offer ? repeats : 0))
      const others = this.find({ pieces, bars, slack }, patterns - 1)
      return others && [{ pattern: { offer, counts: [...counts] }, bars: repeats }, ...others]
    }
    const most = Math.min(Math.floor(at(rest.pieces, size) / repeats), Math.floor(room / width))
    for (let count = most; count >= (size === widest ? 1 : 0); count--) {
      counts[size] = count
      const found = this.fill(making, size + 1, room - count * width)
      if (found) return found
    }
    counts[size] = 0
    return null
  }
}

/** A pattern that is being made for the rest. */
interface Making {
  rest: Rest
  patterns: number
  widest: number
  offer: number
  repeats: number
  counts: number[]
  /** For each size the width that it and those after it can fill at most. */
  fillable: readonly number[]
  /** The room that the pattern may leave, or the rest would not fit into the bars. */
  spare: number
}
