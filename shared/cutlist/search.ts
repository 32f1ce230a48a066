import { type DualBound, priceScale } from './dualBound'
import type { Deadline, LpSolver } from './lpSolver'
import { masterRows, type Goal, type MasterRows } from './master'
import {
  at,
  comparePlans,
  dot,
  isPlanSound,
  countBars,
  measurePlan,
  patternKey,
  trimSurplus,
  type Pattern,
  type Plan,
} from './patterns'
import { reachableCosts, type NextCost } from './reachableCosts'
import type { PackingProblem } from './sectionProblem'

/** What a search towards one goal knows so far. */
export interface Search {
  problem: PackingProblem
  goal: Goal
  solver: LpSolver
  deadline: Deadline
  rows: MasterRows
  scale: number
  nextCost: NextCost
  /** Every pattern met so far, in the order in which they were met. */
  pool: Map<string, Pattern>
  /** The best plan so far; null while none is known. */
  plan: Plan | null
  /** Its cost in the goal; Infinity while there is none. */
  cost: number
  /** No plan costs less; Infinity once it is proved that there is no plan. */
  bound: number
  dual: DualBound | null
  /** No plan worth making costs more; a higher bound means that there is none. */
  mostCost: number
  /** Called whenever plan or bound has become better. */
  onChange: (search: Search) => void
}

/** Opens a search from a plan, if one is known. */
export function openSearch(
  problem: PackingProblem,
  goal: Goal,
  plan: Plan | null,
  tools: Pick<Search, 'solver' | 'deadline' | 'onChange'>,
): Search {
  const nextCost = reachableCosts(problem, goal.costs)
  const search: Search = {
    problem,
    goal,
    ...tools,
    rows: masterRows(problem, goal),
    scale: priceScale(problem, goal),
    nextCost,
    pool: new Map(),
    plan: null,
    cost: Infinity,
    bound: nextCost(0),
    dual: null,
    mostCost: mostCost(problem, goal),
  }
  if (plan) offerPlan(search, plan)
  return search
}

/** A bar for each piece at most, as far as there are bars. */
function mostCost({ sizes, offers }: PackingProblem, { costs }: Goal): number {
  const pieces = sizes.reduce((sum, { demand }) => sum + demand, 0)
  return offers.reduce(
    (sum, { available }, offer) => sum + (available ?? pieces) * at(costs, offer),
    0,
  )
}

/** Whether nothing is left to search for. */
export const isSettled = ({ cost, bound }: Search): boolean => bound >= cost
/** Whether time is up or somebody has cancelled. */
export const isOver = ({ deadline }: Search): boolean => deadline.millisecondsLeft() <= 0

/** Adds a pattern to the pool; false where it was there. */
export function addPattern({ pool }: Search, pattern: Pattern): boolean {
  const key = patternKey(pattern)
  if (pool.has(key)) return false
  pool.set(key, pattern)
  return true
}

/** Takes the plan where it is sound, under the cap, and better than the one there was. */
export function offerPlan(search: Search, offered: Plan): boolean {
  const { problem, goal } = search
  if (!isPlanSound(problem, offered)) return false
  const plan = trimSurplus(problem, offered)
  const bars = countBars(problem, plan)
  if (goal.cap && dot(goal.cap.costs, bars) > goal.cap.most) return false
  for (const { pattern } of offered) addPattern(search, pattern)
  const cost = dot(goal.costs, bars)
  const isBetter =
    search.plan === null ||
    cost < search.cost ||
    (cost === search.cost &&
      comparePlans(measurePlan(problem, plan), measurePlan(problem, search.plan)) < 0)
  if (!isBetter) return false
  search.plan = plan
  search.cost = cost
  search.onChange(search)
  return true
}

/** Lifts the bound to the least cost that can occur from `cost` up. */
export function raiseBound(search: Search, cost: number): void {
  const bound = cost > search.mostCost ? Infinity : search.nextCost(cost)
  if (bound <= search.bound) return
  search.bound = bound
  search.onChange(search)
}
