import type { Column, IntegerProgram, RowBounds } from './lpSolver'
import { at, gatherPlan, type Pattern, type Plan } from './patterns'
import { offerPlan, type Search } from './search'

/** How the choice among given patterns ended. */
export interface MasterChoice {
  /** No choice among these patterns costs less; Infinity where there is none. */
  bound: number
  isBetter: boolean
}

/** The solver's numbers are this near to the truth; bounds are rounded up from so much below. */
export const solverSlack = 1e-4

/** The bars of each pattern, read from unknowns that are whole but for the solver's tolerance. */
export function readPlan(patterns: readonly Pattern[], columns: Float64Array): Plan {
  return gatherPlan(
    patterns.map((pattern, column) => ({ pattern, bars: Math.round(at(columns, column)) })),
  )
}

/**
 * Chooses whole bars among the patterns so that the goal's cost is least, and less than the best plan's. Bars of
 * each offer are unknowns of their own: on them the solver decides best where several stock lengths compete.
 */
export function choosePatterns(
  search: Search,
  patterns: readonly Pattern[],
  mostNodes: number,
): MasterChoice {
  const { solver, bound } = search
  const answer = solver.solveInteger(choiceProgram(search, patterns), { target: bound, mostNodes })
  if (answer.isInfeasible) return { bound: Infinity, isBetter: false }
  const isBetter = answer.columns !== null && offerPlan(search, readPlan(patterns, answer.columns))
  return { bound: Math.ceil(answer.bound - solverSlack), isBetter }
}

function choiceProgram(search: Search, patterns: readonly Pattern[]): IntegerProgram {
  const { problem, goal, cost } = search
  const { sizes, offers } = problem
  const rows: RowBounds[] = sizes.map(({ demand }) => ({ lower: demand, upper: Infinity }))
  const addRow = (lower: number, upper: number) => rows.push({ lower, upper }) - 1
  const offerRows = offers.map(() => addRow(0, 0))
  const needed = sizes.reduce((sum, { width, demand }) => sum + width * demand, 0)
  const roomRow = addRow(needed, Infinity)
  const costRow = addRow(-Infinity, cost - 1)
  const capRow = addRow(-Infinity, goal.cap?.most ?? Infinity)
  const columns: Column[] = patterns.map(({ offer, counts }) => ({
    cost: 0,
    upper: Infinity,
    entries: [
      ...counts.flatMap((value, row) => (value > 0 ? [{ row, value }] : [])),
      { row: at(offerRows, offer), value: 1 },
    ],
  }))
  offers.forEach(({ capacity, available }, offer) => {
    const entries = [
      { row: at(offerRows, offer), value: -1 },
      { row: roomRow, value: Math.max(0, capacity) },
      { row: costRow, value: at(goal.costs, offer) },
      { row: capRow, value: goal.cap ? at(goal.cap.costs, offer) : 0 },
    ].filter(({ value }) => value !== 0)
    columns.push({ cost: at(goal.costs, offer), upper: available ?? Infinity, entries })
  })
  return { rows, columns }
}
