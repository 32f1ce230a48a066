import { buildFlow } from './arcFlow'
import { generateColumns, openMaster } from './columnGeneration'
import { dive } from './diving'
import type { DualBound } from './dualBound'
import { choosePatterns, solverSlack } from './integerMaster'
import { listUsefulPatterns } from './patternEnumeration'
import { isOver, isSettled, offerPlan, raiseBound, type Search } from './search'

const fewPatterns = 3000
const manyPatterns = 30_000
const mostArcs = 60_000
const shortSearchNodes = 300
const longSearchNodes = 1_000_000

/**
 * Makes the plan better and the bound higher until they meet, time is up, or every method has been used:
 * linear bound and rounding, the patterns met so far, all useful patterns, and last the flow along the bars.
 */
export function solveGoal(search: Search): void {
  const methods = [
    boundAndDive,
    (one: Search) => proveByPatterns(one, fewPatterns),
    (one: Search) => void choosePatterns(one, [...one.pool.values()], shortSearchNodes),
    (one: Search) => proveByPatterns(one, manyPatterns),
    proveByFlow,
  ]
  for (const method of methods) {
    if (isSettled(search) || isOver(search)) return
    method(search)
  }
}

function boundAndDive(search: Search) {
  const master = openMaster(search)
  try {
    const columns = generateColumns(search, master, null)
    if (columns) dive(search, master, columns)
  } finally {
    master.program.close()
  }
}

/**
 * Looks for a plan below the best one among all patterns such a plan can use; where those are too many, below
 * a cost nearer to the bound. Each round ends with a better plan or a higher bound.
 */
function proveByPatterns(search: Search, most: number) {
  while (search.dual && !isSettled(search) && !isOver(search)) {
    const target = findTarget(search, search.dual, most)
    if (!target) return
    const choice = choosePatterns(search, target.patterns, longSearchNodes)
    raiseBound(search, Math.min(choice.bound, target.cost + 1, search.cost))
    if (choice.bound <= target.cost && !choice.isBetter) return
  }
}

/** The highest cost below the best plan's for which there are not too many patterns. */
function findTarget(search: Search, dual: DualBound, most: number) {
  const { problem, goal, bound } = search
  let cost = search.plan ? search.cost - 1 : search.mostCost
  for (;;) {
    const patterns = listUsefulPatterns(problem, goal, dual, cost, most)
    if (patterns) return { cost, patterns }
    if (cost <= bound) return null
    cost = bound + Math.floor((cost - bound) / 2)
  }
}

function proveByFlow(search: Search) {
  const flow = buildFlow(search.problem, search.goal, mostArcs)
  if (!flow) return
  const limits = { target: search.bound, mostNodes: longSearchNodes }
  const answer = search.solver.solveInteger(flow.program, limits)
  if (answer.isInfeasible && !search.plan) return raiseBound(search, Infinity)
  if (answer.columns) offerPlan(search, flow.readPlan(answer.columns))
  raiseBound(search, Math.min(search.cost, Math.ceil(answer.bound - solverSlack)))
}
