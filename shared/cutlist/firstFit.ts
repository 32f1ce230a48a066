import type { Goal, Remainder } from './master'
import { at, gatherPlan, type PlanLine } from './patterns'
import type { PackingProblem } from './sectionProblem'

interface OpenBar {
  offer: number
  counts: number[]
  left: number
}

/**
 * First-fit decreasing: the widest piece first, into the first bar with room for it, else into a new bar of the
 * first offer in `order` that is left and holds it. Null where none does.
 */
export function firstFit(
  problem: PackingProblem,
  { pieces, bars }: Remainder,
  order: readonly number[],
): PlanLine[] | null {
  const { sizes, offers } = problem
  const left = bars.map((count) => count ?? Infinity)
  const open: OpenBar[] = []
  for (const [size, { width }] of sizes.entries()) {
    for (let piece = 0; piece < at(pieces, size); piece++) {
      let bar = open.find((one) => one.left >= width)
      if (!bar) {
        const offer = order.find(
          (one) => at(left, one) > 0 && (offers[one]?.capacity ?? 0) >= width,
        )
        if (offer === undefined) return null
        left[offer] = at(left, offer) - 1
        bar = { offer, counts: sizes.map(() => 0), left: offers[offer]?.capacity ?? 0 }
        open.push(bar)
      }
      bar.counts[size] = at(bar.counts, size) + 1
      bar.left -= width
    }
  }
  return gatherPlan(open.map(({ offer, counts }) => ({ pattern: { offer, counts }, bars: 1 })))
}

/** Cuts each bar from the cheapest offer that still holds all its pieces and is left. */
export function shrinkBars(
  { sizes, offers }: PackingProblem,
  { costs }: Goal,
  { bars }: Remainder,
  plan: readonly PlanLine[],
): PlanLine[] {
  const left = bars.map((count) => count ?? Infinity)
  for (const { pattern, bars: taken } of plan) {
    left[pattern.offer] = at(left, pattern.offer) - taken
  }
  const shrunk = plan.flatMap(({ pattern, bars: taken }) =>
    Array.from({ length: taken }, () => {
      const width = sizes.reduce((sum, one, size) => sum + one.width * at(pattern.counts, size), 0)
      let cheapest = pattern.offer
      offers.forEach(({ capacity }, offer) => {
        const isBetter = at(costs, offer) < at(costs, cheapest)
        if (isBetter && capacity >= width && at(left, offer) > 0) cheapest = offer
      })
      left[pattern.offer] = at(left, pattern.offer) + 1
      left[cheapest] = at(left, cheapest) - 1
      return { pattern: { ...pattern, offer: cheapest }, bars: 1 }
    }),
  )
  return gatherPlan(shrunk)
}
