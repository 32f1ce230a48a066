import type { PackingProblem } from './sectionProblem'

/** One way to cut one bar: how many of each size, from which offer. */
export interface Pattern {
  offer: number
  counts: readonly number[]
}

/** A pattern and how many bars are cut so. */
export interface PlanLine {
  pattern: Pattern
  bars: number
}
/** Which bars are cut how. */
export type Plan = readonly PlanLine[]

/** What a plan is judged by, in this order. */
export interface PlanMeasure {
  cost: number
  length: number
  differentCuts: number
}

/** The number at this place; a place outside the row is a defect. */
export function at(row: ArrayLike<number>, index: number): number {
  const value = row[index]
  if (value === undefined) throw new Error(`No number at ${index} of ${row.length}`)
  return value
}

/** Sum of the products, place by place. */
export function dot(one: ArrayLike<number>, other: ArrayLike<number>): number {
  let sum = 0
  for (let index = 0; index < one.length; index++) sum += at(one, index) * at(other, index)
  return sum
}

/** The same for equal patterns only. */
export const patternKey = ({ offer, counts }: Pattern): string => `${offer}:${counts.join(',')}`

/** Joins equal patterns and leaves out bars of which nothing is cut. */
export function gatherPlan(lines: Iterable<PlanLine>): PlanLine[] {
  const gathered = new Map<string, PlanLine>()
  for (const { pattern, bars } of lines) {
    if (bars === 0 || pattern.counts.every((count) => count === 0)) continue
    const key = patternKey(pattern)
    gathered.set(key, { pattern, bars: bars + (gathered.get(key)?.bars ?? 0) })
  }
  return [...gathered.values()]
}

/** Cost, bought length and number of different cuts of a gathered plan. */
export function measurePlan({ offers }: PackingProblem, plan: Plan): PlanMeasure {
  const sum = (of: 'cost' | 'length') =>
    plan.reduce((total, { pattern, bars }) => total + bars * (offers[pattern.offer]?.[of] ?? 0), 0)
  return { cost: sum('cost'), length: sum('length'), differentCuts: plan.length }
}

/** Negative where the first is the better plan. */
export const comparePlans = (one: PlanMeasure, other: PlanMeasure): number =>
  one.cost - other.cost || one.length - other.length || one.differentCuts - other.differentCuts

/** The pieces a plan cuts, size by size. */
export function countPieces(problem: PackingProblem, plan: Plan): number[] {
  return problem.sizes.map((_, size) =>
    plan.reduce((sum, { pattern, bars }) => sum + bars * at(pattern.counts, size), 0),
  )
}

/** Bars of each offer that a plan takes. */
export function countBars(problem: PackingProblem, plan: Plan): number[] {
  return problem.offers.map((_, offer) =>
    plan.reduce((sum, { pattern, bars }) => sum + (pattern.offer === offer ? bars : 0), 0),
  )
}

/** Whether the plan cuts at least the demand, keeps every bar's room and takes no more bars than there are. */
export function isPlanSound(problem: PackingProblem, plan: Plan): boolean {
  const widths = problem.sizes.map(({ width }) => width)
  const pieces = countPieces(problem, plan)
  const bars = countBars(problem, plan)
  return (
    problem.sizes.every(({ demand }, size) => at(pieces, size) >= demand) &&
    problem.offers.every(
      ({ available }, offer) => available === null || at(bars, offer) <= available,
    ) &&
    plan.every(({ pattern }) => {
      const room = problem.offers[pattern.offer]?.capacity ?? -1
      return dot(pattern.counts, widths) <= room && pattern.counts.every((count) => count >= 0)
    })
  )
}

/**
 * Takes away what is cut beyond the demand, from the patterns used least first, so that as few patterns as
 * possible are split.
 */
export function trimSurplus(problem: PackingProblem, plan: Plan): PlanLine[] {
  const surplus = countPieces(problem, plan).map(
    (count, size) => count - (problem.sizes[size]?.demand ?? 0),
  )
  const rarest = [...plan].sort((one, other) => one.bars - other.bars)
  return gatherPlan(rarest.flatMap((line) => trimLine(line, surplus)))
}

/** Splits a line into bars with the same cuts, surplus pieces left out; lowers the surplus by what it left out. */
function trimLine({ pattern, bars }: PlanLine, surplus: number[]): PlanLine[] {
  let left = bars
  const lines: PlanLine[] = []
  while (left > 0) {
    const taken = pattern.counts.map((count, size) => Math.min(count, at(surplus, size)))
    if (taken.every((count) => count === 0)) break
    const times = Math.min(
      left,
      ...taken.flatMap((count, size) => (count > 0 ? [Math.floor(at(surplus, size) / count)] : [])),
    )
    taken.forEach((count, size) => (surplus[size] = at(surplus, size) - count * times))
    const counts = pattern.counts.map((count, size) => count - at(taken, size))
    lines.push({ pattern: { ...pattern, counts }, bars: times })
    left -= times
  }
  return [...lines, { pattern, bars: left }]
}
