import { barWorth, fillOffers, proveBound, roundPrices } from './dualBound'
import type { GrowingProgram } from './lpSolver'
import { patternColumn, rowBounds, wholeRemainder, type Remainder } from './master'
import { at, type Pattern } from './patterns'
import { addPattern, isOver, isSettled, raiseBound, type Search } from './search'

/** The master program with the patterns in it. */
export interface Master {
  program: GrowingProgram
  /** One for each column; null for the columns that stand for a missing piece. */
  patterns: (Pattern | null)[]
}

/** What a missing piece costs, in dearest bars: so much that it is left out only where it cannot be had. */
const missingPieceBars = 1000
/** Closer than this to the linear optimum, rounding up gives the same bound. */
const closeEnough = 1e-6

/** Opens the master with every pattern in the pool. */
export function openMaster(search: Search): Master {
  const { problem, goal, rows, solver, pool } = search
  const program = solver.open(rowBounds(rows, wholeRemainder(problem, goal)))
  const master: Master = { program, patterns: [] }
  const missing = missingPieceBars * Math.max(1, ...goal.costs)
  problem.sizes.forEach((_, row) => {
    program.addColumn({ cost: missing, upper: Infinity, entries: [{ row, value: 1 }] })
    master.patterns.push(null)
  })
  for (const pattern of pool.values()) addColumn(search, master, pattern)
  return master
}

function addColumn({ rows, goal }: Search, { program, patterns }: Master, pattern: Pattern) {
  program.addColumn(patternColumn(rows, goal, pattern))
  patterns.push(pattern)
}

/** Sets the master to what remains. */
export function setRemainder({ rows }: Search, { program }: Master, remainder: Remainder): void {
  rowBounds(rows, remainder).forEach((bounds, row) => program.setRow(row, bounds))
}

/**
 * Adds patterns until the linear program cannot be made cheaper; answers with its unknowns, or null when stopped.
 * On the whole list it raises the bound as it goes and ends as soon as that settles the search.
 */
export function generateColumns(
  search: Search,
  master: Master,
  remainder: Remainder | null,
  mostRounds = Infinity,
): Float64Array | null {
  const { problem, goal } = search
  const limits = (remainder ?? wholeRemainder(problem, goal)).pieces
  for (let round = 0; !isOver(search); round++) {
    const answer = master.program.solve()
    if (!answer) return null
    if (round >= mostRounds) return answer.columns
    const prices = roundPrices(problem, search.rows, search.scale, answer)
    const fillings = fillOffers(problem, prices, limits)
    if (!remainder) {
      const dual = proveBound(problem, goal, prices, fillings)
      if (dual) keepBound(search, dual)
      const isClose =
        answer.cost <= search.mostCost && search.nextCost(answer.cost - closeEnough) <= search.bound
      if (isSettled(search) || isClose) return answer.columns
    }
    const paying = fillings.flatMap(({ counts, value }, offer) =>
      value > barWorth(goal, prices, offer) + at(prices.bars, offer) ? [{ offer, counts }] : [],
    )
    const fresh = paying
      .map((pattern) => fillUp(search, pattern, limits))
      .filter((pattern) => addPattern(search, pattern))
    if (fresh.length === 0) return answer.columns
    for (const pattern of fresh) addColumn(search, master, pattern)
  }
  return null
}

function keepBound(search: Search, dual: NonNullable<Search['dual']>) {
  if (search.dual && dual.scaledBound <= search.dual.scaledBound) return
  search.dual = dual
  raiseBound(search, Math.ceil(dual.scaledBound / search.scale))
}

/** Uses the room that is left for pieces that are worth nothing now, the widest first. */
function fillUp({ problem }: Search, pattern: Pattern, limits: readonly number[]): Pattern {
  const { sizes, offers } = problem
  let left = offers[pattern.offer]?.capacity ?? 0
  sizes.forEach(({ width }, size) => (left -= width * at(pattern.counts, size)))
  const counts = sizes.map(({ width }, size) => {
    const count = at(pattern.counts, size)
    const more = Math.min(at(limits, size) - count, Math.floor(left / width))
    left -= more * width
    return count + more
  })
  return { offer: pattern.offer, counts }
}
