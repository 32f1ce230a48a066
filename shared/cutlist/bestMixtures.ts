import { firstFit, shrinkBars } from './firstFit'
import { fillWell } from './knapsack'
import type { Goal, Remainder } from './master'
import { at, countBars, dot, gatherPlan, type Pattern, type PlanLine } from './patterns'
import type { PackingProblem } from './sectionProblem'

/**
 * Bar after bar, each with the widest piece left and the mixture that fills it best, as often as the pieces last;
 * of the allowed offers the one that costs least for the width it uses. Null where stock runs out.
 */
export function bestMixtures(
  problem: PackingProblem,
  goal: Goal,
  remainder: Remainder,
  allowed: readonly number[],
): PlanLine[] | null {
  const pieces = [...remainder.pieces]
  const left = remainder.bars.map((count, offer) =>
    allowed.includes(offer) ? (count ?? Infinity) : 0,
  )
  const lines: PlanLine[] = []
  while (pieces.some((count) => count > 0)) {
    const pattern = nextMixture(problem, goal, pieces, left)
    if (!pattern) return null
    const times = Math.min(
      at(left, pattern.offer),
      ...pattern.counts.flatMap((count, size) =>
        count > 0 ? [Math.floor(at(pieces, size) / count)] : [],
      ),
    )
    pattern.counts.forEach((count, size) => (pieces[size] = at(pieces, size) - times * count))
    left[pattern.offer] = at(left, pattern.offer) - times
    lines.push({ pattern, bars: times })
  }
  return gatherPlan(lines)
}

function nextMixture(
  { sizes, offers }: PackingProblem,
  { costs }: Goal,
  pieces: readonly number[],
  left: readonly number[],
): Pattern | null {
  const widest = pieces.findIndex((count) => count > 0)
  const widths = sizes.map(({ width }) => width)
  const rooms = offers.map(({ capacity }, offer) =>
    at(left, offer) > 0 ? capacity - at(widths, widest) : -1,
  )
  const limits = pieces.map((count, size) => count - (size === widest ? 1 : 0))
  const fillings = fillWell({ widths, values: widths, limits }, rooms)
  let best: { pattern: Pattern; cost: number; used: number } | null = null
  for (const [offer, room] of rooms.entries()) {
    const filling = fillings[offer]
    if (room < 0 || !filling) continue
    const counts = filling.counts.map((count, size) => count + (size === widest ? 1 : 0))
    const candidate = {
      pattern: { offer, counts },
      cost: at(costs, offer),
      used: filling.value + at(widths, widest),
    }
    if (!best || candidate.cost * best.used < best.cost * candidate.used) best = candidate
  }
  return best?.pattern ?? null
}

/** The cheapest of what first-fit and mixtures make of a remainder; null where stock or cap does not allow any. */
export function completePlan(
  problem: PackingProblem,
  goal: Goal,
  remainder: Remainder,
): PlanLine[] | null {
  const { offers } = problem
  const all = offers.map((_, offer) => offer)
  const byLength = [...all].sort(
    (one, other) => (offers[other]?.capacity ?? 0) - (offers[one]?.capacity ?? 0),
  )
  const byCost = [...all].sort(
    (one, other) =>
      at(goal.costs, one) * (offers[other]?.capacity ?? 0) -
      at(goal.costs, other) * (offers[one]?.capacity ?? 0),
  )
  const limited = all.filter((offer) => remainder.bars[offer] !== null)
  const orders = [byCost, byLength, ...all.map((offer) => [offer, ...byCost])]
  const choices = [all, ...all.map((offer) => [offer, ...limited])]
  const plans = [
    ...(offers.length > 1 ? choices : [all]).map((allowed) =>
      bestMixtures(problem, goal, remainder, allowed),
    ),
    ...(offers.length > 1 ? orders : [all]).map((order) => firstFit(problem, remainder, order)),
  ]
  let best: { plan: PlanLine[]; cost: number } | null = null
  for (const found of plans) {
    if (!found) continue
    const plan = shrinkBars(problem, goal, remainder, found)
    const bars = countBars(problem, plan)
    const cost = dot(goal.costs, bars)
    if (goal.cap && dot(goal.cap.costs, bars) > remainder.cap) continue
    if (!best || cost < best.cost) best = { plan, cost }
  }
  return best?.plan ?? null
}
