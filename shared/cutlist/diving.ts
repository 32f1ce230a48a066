import { completePlan } from './bestMixtures'
import { generateColumns, setRemainder, type Master } from './columnGeneration'
import { remainderAfter, wholeRemainder } from './master'
import { at, gatherPlan, type PlanLine } from './patterns'
import { isOver, isSettled, offerPlan, type Search } from './search'

const nearWhole = 1e-6
/** Rounds of new patterns at each step; more hardly change the plan. */
const roundsADive = 12

/**
 * Rounds the linear answer step by step: whole bars are cut, the rest is solved again, and where nothing is whole
 * the most used pattern is cut once. At each step the rest is also completed at once.
 */
export function dive(search: Search, master: Master, start: Float64Array): void {
  let fixed: PlanLine[] = []
  let columns: Float64Array | null = start
  while (columns && !isSettled(search) && !isOver(search)) {
    const lines = takeWhole(search, master, columns, fixed)
    if (lines.length === 0) break
    fixed = gatherPlan([...fixed, ...lines])
    const remainder = remainderAfter(search.problem, search.goal, fixed)
    const rest = completePlan(search.problem, search.goal, remainder)
    if (rest) offerPlan(search, gatherPlan([...fixed, ...rest]))
    if (remainder.pieces.every((count) => count === 0)) break
    setRemainder(search, master, remainder)
    columns = generateColumns(search, master, remainder, roundsADive)
  }
  setRemainder(search, master, wholeRemainder(search.problem, search.goal))
}

/** The whole bars of the answer, or one bar of the pattern that is used most; only while pieces still need it. */
function takeWhole(
  { problem, goal }: Search,
  { patterns }: Master,
  columns: Float64Array,
  fixed: readonly PlanLine[],
): PlanLine[] {
  const { pieces } = remainderAfter(problem, goal, fixed)
  const used = patterns.flatMap((pattern, column) => {
    const bars = at(columns, column)
    const isNeeded = pattern?.counts.some((count, size) => count > 0 && at(pieces, size) > 0)
    return pattern && isNeeded && bars > nearWhole ? [{ pattern, bars }] : []
  })
  const whole = used.flatMap(({ pattern, bars }) => {
    const floor = Math.floor(bars + nearWhole)
    return floor > 0 ? [{ pattern, bars: floor }] : []
  })
  if (whole.length > 0) return whole
  const most = used.reduce((best, one) => (one.bars > best + nearWhole ? one.bars : best), 0)
  const first = used.find(({ bars }) => bars >= most - nearWhole)
  return first ? [{ pattern: first.pattern, bars: 1 }] : []
}
