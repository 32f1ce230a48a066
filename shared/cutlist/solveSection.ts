import { CalculatorInputError } from '../calculators/calculator'
import { completePlan } from './bestMixtures'
import { notEnough } from './checkCutRequest'
import type { CutProof, SolvedSection } from './cutList'
import { useFewerCuts } from './fewerCuts'
import { searchFewerCuts } from './fewestCuts'
import type { Deadline, LpSolver } from './lpSolver'
import { wholeRemainder, type Goal } from './master'
import { measurePlan, type Plan } from './patterns'
import { reachableCosts } from './reachableCosts'
import { isSettled, openSearch, type Search } from './search'
import type { SectionProblem } from './sectionProblem'
import { solveGoal } from './solveGoal'

/** What a section is solved with. */
export interface SectionTools {
  solver: LpSolver
  deadline: Deadline
  /** Called with each better plan and with each step of the proof. */
  onChange: (solved: SolvedSection) => void
}

const costGoal = ({ offers }: SectionProblem): Goal => ({
  costs: offers.map(({ cost }) => cost),
  cap: null,
})

/** With cost settled, the least bought length that costs no more. */
const lengthGoal = ({ offers }: SectionProblem, most: number): Goal => ({
  costs: offers.map(({ length }) => length),
  cap: { costs: offers.map(({ cost }) => cost), most },
})

/** Whether a bar's price follows its length, so that the cheapest plan also wastes least. */
const isPricedByLength = ({ offers }: SectionProblem) =>
  offers.every((one) =>
    offers.every((other) => one.cost * other.length === other.cost * one.length),
  )

/** What is proved once the goal is searched; with a goal still to come even a settled one leaves a gap of 0. */
function proofOf({ cost, bound }: Pick<Search, 'cost' | 'bound'>, isLastGoal: boolean): CutProof {
  if (bound < cost) return { gapPercent: ((cost - bound) / cost) * 100 }
  return isLastGoal ? 'optimal' : { gapPercent: 0 }
}

/** A plan at once, without a solver; null where stock is so scarce that only a search can tell. */
export function solveAtOnce(problem: SectionProblem): SolvedSection | null {
  const goal = costGoal(problem)
  const found = completePlan(problem, goal, wholeRemainder(problem, goal))
  if (!found) return null
  const plan = useFewerCuts(problem, found)
  const { cost } = measurePlan(problem, plan)
  const bound = reachableCosts(problem, goal.costs)(0)
  const proof = proofOf({ cost, bound }, isPricedByLength(problem))
  return { problem, plan: proof === 'optimal' ? searchFewerCuts(problem, plan) : plan, proof }
}

/** Searches from a first plan for the least cost, then the least bought length at it, then fewer different cuts. */
export function solveSection(
  problem: SectionProblem,
  tools: SectionTools,
  start = solveAtOnce(problem),
): SolvedSection {
  if (start?.proof === 'optimal') return start
  const isOneGoal = isPricedByLength(problem)
  const cheapest = searchGoal(problem, costGoal(problem), start?.plan ?? null, isOneGoal, tools)
  if (!cheapest.plan) throw new CalculatorInputError('stock', noPlanSentence(problem, cheapest))
  const isDone = isOneGoal || !isSettled(cheapest)
  const last = isDone
    ? cheapest
    : searchGoal(problem, lengthGoal(problem, cheapest.cost), cheapest.plan, true, tools)
  const plan = useFewerCuts(problem, last.plan ?? cheapest.plan)
  return { problem, plan: searchFewerCuts(problem, plan), proof: proofOf(last, true) }
}

const noPlanSentence = ({ section }: SectionProblem, { bound }: Search) =>
  Number.isFinite(bound)
    ? `No way to get all parts out of the ${section} stock you have was found in the time given; ` +
      'add a bar or another length.'
    : notEnough(section)

function searchGoal(
  problem: SectionProblem,
  goal: Goal,
  start: Plan | null,
  isLastGoal: boolean,
  { solver, deadline, onChange }: SectionTools,
): Search {
  const search = openSearch(problem, goal, start, {
    solver,
    deadline,
    onChange: (one) => {
      if (one.plan) onChange({ problem, plan: one.plan, proof: proofOf(one, isLastGoal) })
    },
  })
  solveGoal(search)
  return search
}
