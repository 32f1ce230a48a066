import { fillBest, type Filling } from './knapsack'
import type { LinearAnswer } from './lpSolver'
import type { Goal, MasterRows } from './master'
import { at } from './patterns'
import type { PackingProblem } from './sectionProblem'

/** What a piece, a bar and the cap are worth in the goal's cost, times `scale`, in whole numbers. */
export interface Prices {
  scale: number
  pieces: readonly number[]
  /** Surcharge on a bar of each offer; zero for all but limited ones. */
  bars: readonly number[]
  cap: number
}

/** Prices that no pattern beats, and the cost times `scale` that they prove no plan goes under. */
export interface DualBound {
  prices: Prices
  scaledBound: number
}

const largestScale = 2 ** 26

/** The finest scale at which every sum stays an exact number. */
export function priceScale({ sizes }: PackingProblem, goal: Goal): number {
  const pieces = sizes.reduce((sum, { demand }) => sum + demand, 0)
  const largest = Math.max(1, ...goal.costs)
  return Math.max(1, Math.min(largestScale, Math.floor(2 ** 48 / (pieces * largest))))
}

/** Rounds the solver's row prices to whole numbers; the bound is computed from these alone. */
export function roundPrices(
  problem: PackingProblem,
  rows: MasterRows,
  scale: number,
  { rowPrices }: LinearAnswer,
): Prices {
  const surcharge = (row: number | null) =>
    row === null ? 0 : Math.max(0, Math.ceil(-at(rowPrices, row) * scale - 1e-3))
  return {
    scale,
    pieces: problem.sizes.map((_, size) =>
      Math.max(0, Math.floor(at(rowPrices, size) * scale + 1e-3)),
    ),
    bars: rows.rowOfOffer.map(surcharge),
    cap: surcharge(rows.capRow),
  }
}

/** What the pieces of a bar of this offer may be worth before the pattern pays, the surcharge left out. */
export const barWorth = (goal: Goal, { scale, cap }: Prices, offer: number): number =>
  at(goal.costs, offer) * scale + cap * (goal.cap ? at(goal.cap.costs, offer) : 0)

/** For each offer the pattern whose pieces are worth most. */
export const fillOffers = (
  { sizes, offers }: PackingProblem,
  { pieces }: Prices,
  limits: readonly number[],
): Filling[] =>
  fillBest(
    { widths: sizes.map(({ width }) => width), values: pieces, limits },
    offers.map(({ capacity }) => capacity),
  )

/**
 * Turns prices into ones that no pattern beats, by surcharges on limited offers and by lowering all piece prices
 * alike (Farley 1990), and adds up what they prove. Whole numbers all through; null where they would grow too large.
 */
export function proveBound(
  problem: PackingProblem,
  goal: Goal,
  prices: Prices,
  fillings: readonly Filling[],
): DualBound | null {
  const worths = problem.offers.map((_, offer) => barWorth(goal, prices, offer))
  const tightest = { worth: 1, value: 1 }
  problem.offers.forEach(({ available }, offer) => {
    const value = fillings[offer]?.bound ?? 0
    const worth = at(worths, offer)
    if (
      available === null &&
      value > worth &&
      BigInt(worth) * BigInt(tightest.value) < BigInt(tightest.worth) * BigInt(value)
    ) {
      Object.assign(tightest, { worth, value })
    }
  })
  const lower = (number: number) =>
    Number((BigInt(number) * BigInt(tightest.worth)) / BigInt(tightest.value))
  const pieces = prices.pieces.map(lower)
  const bars = problem.offers.map(({ available }, offer) =>
    available === null ? 0 : Math.max(0, lower(fillings[offer]?.bound ?? 0) - at(worths, offer)),
  )
  let bound = -BigInt(prices.cap) * BigInt(goal.cap?.most ?? 0)
  problem.sizes.forEach(({ demand }, size) => (bound += BigInt(demand) * BigInt(at(pieces, size))))
  problem.offers.forEach(
    ({ available }, offer) => (bound -= BigInt(available ?? 0) * BigInt(at(bars, offer))),
  )
  const scaledBound = Number(bound)
  if (!Number.isSafeInteger(scaledBound) || !worths.every(Number.isSafeInteger)) return null
  return { prices: { ...prices, pieces, bars }, scaledBound }
}
