import type { Column, Entry, RowBounds } from './lpSolver'
import { at, countBars, countPieces, dot, type Pattern, type Plan } from './patterns'
import type { PackingProblem } from './sectionProblem'

/** What is made least: the sum of the costs of the bars, where need be under a limit on another sum. */
export interface Goal {
  /** One for each offer, whole numbers. */
  costs: readonly number[]
  cap: { costs: readonly number[]; most: number } | null
}

/** What is still to be cut and bought. */
export interface Remainder {
  pieces: readonly number[]
  /** Bars of each offer; null without a limit. */
  bars: readonly (number | null)[]
  /** What is left under the goal's cap. */
  cap: number
}

/** The rows of the master program: one a size, one for each limited offer, one for the cap. */
export interface MasterRows {
  rowOfOffer: readonly (number | null)[]
  capRow: number | null
  count: number
}

/** Everything is still to be cut. */
export const wholeRemainder = ({ sizes, offers }: PackingProblem, goal: Goal): Remainder => ({
  pieces: sizes.map(({ demand }) => demand),
  bars: offers.map(({ available }) => available),
  cap: goal.cap?.most ?? 0,
})

/** What remains once the bars of a plan are cut. */
export function remainderAfter(problem: PackingProblem, goal: Goal, plan: Plan): Remainder {
  const bars = countBars(problem, plan)
  const pieces = countPieces(problem, plan)
  const whole = wholeRemainder(problem, goal)
  return {
    pieces: whole.pieces.map((count, size) => Math.max(0, count - at(pieces, size))),
    bars: whole.bars.map((count, offer) => (count === null ? null : count - at(bars, offer))),
    cap: whole.cap - (goal.cap ? dot(goal.cap.costs, bars) : 0),
  }
}

/** Numbers the rows. */
export function masterRows({ sizes, offers }: PackingProblem, goal: Goal): MasterRows {
  let count = sizes.length
  const rowOfOffer = offers.map(({ available }) => (available === null ? null : count++))
  return { rowOfOffer, capRow: goal.cap ? count++ : null, count }
}

/** What each row may be, for what remains. */
export function rowBounds(rows: MasterRows, remainder: Remainder): RowBounds[] {
  const bounds = remainder.pieces.map((lower) => ({ lower, upper: Infinity }))
  rows.rowOfOffer.forEach((row, offer) => {
    if (row !== null) bounds[row] = { lower: -Infinity, upper: remainder.bars[offer] ?? Infinity }
  })
  if (rows.capRow !== null) bounds[rows.capRow] = { lower: -Infinity, upper: remainder.cap }
  return bounds
}

/** A pattern as a column: its pieces, its bar, its cost. */
export function patternColumn(rows: MasterRows, goal: Goal, { offer, counts }: Pattern): Column {
  const entries: Entry[] = counts.flatMap((value, row) => (value > 0 ? [{ row, value }] : []))
  const offerRow = rows.rowOfOffer[offer] ?? null
  if (offerRow !== null) entries.push({ row: offerRow, value: 1 })
  const capCost = goal.cap ? at(goal.cap.costs, offer) : 0
  if (rows.capRow !== null && capCost > 0) entries.push({ row: rows.capRow, value: capCost })
  return { cost: at(goal.costs, offer), upper: Infinity, entries }
}
