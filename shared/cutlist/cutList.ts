import type { CutPart, CutRequest, CutStock } from './cutRequest'
import { stepsDown, stepsToMm, stepsUp } from './lengthSteps'
import { at, measurePlan, type Plan, type PlanLine } from './patterns'
import type { SectionProblem } from './sectionProblem'

/** Proved that nothing is cheaper and nothing as cheap wastes less, or how far off that may be at most. */
export type CutProof = 'optimal' | { gapPercent: number }

/** One bar to buy or take, and what is cut from it, the longest piece first. */
export interface CutBar {
  stock: CutStock
  section: string
  cuts: { label: string; lengthMm: number }[]
  /** What is left in one piece, the end trim and the dust of the last cut taken off. */
  offcutMm: number
}

/** What is known of one section. */
export interface CutSection {
  section: string
  count: number
  boughtMm: number
  /** In hundredths of the currency; null without prices. */
  cost: number | null
  differentCuts: number
  proof: CutProof
}

/** Which bars to buy and how to cut them. */
export interface CutList {
  bars: CutBar[]
  /** Bars in all. */
  count: number
  boughtMm: number
  /** Bought length less the parts: offcuts, end trims and saw dust. */
  wasteMm: number
  /** In hundredths of the currency; null where a section has no prices. */
  cost: number | null
  /** Settings of the saw: bars cut alike from the same stock count once. Made small, not proved to be least. */
  differentCuts: number
  sections: CutSection[]
  proof: CutProof
}

/** A section with its plan and what is proved of it. */
export interface SolvedSection {
  problem: SectionProblem
  plan: Plan
  proof: CutProof
}

const lengthOfAll = ({ lengthMm, count }: CutPart) => lengthMm * count
const sum = (numbers: readonly number[]) => numbers.reduce((total, number) => total + number, 0)

/** Writes plans of sizes and offers as bars with labelled pieces. */
export function layOut(request: CutRequest, solved: readonly SolvedSection[]): CutList {
  const sections = solved.map(describeSection)
  const bars = solved.flatMap((section) => layOutSection(request, section))
  const boughtMm = sum(sections.map((section) => section.boughtMm))
  const costs = sections.map(({ cost }) => cost)
  return {
    bars,
    count: bars.length,
    boughtMm,
    // To whole steps, which takes away what is left of adding up inches.
    wasteMm: stepsToMm(stepsDown(boughtMm - sum(request.parts.map(lengthOfAll)))),
    cost: costs.includes(null) ? null : sum(costs.map((cost) => cost ?? 0)),
    differentCuts: sum(sections.map(({ differentCuts }) => differentCuts)),
    sections,
    proof: widestGap(sections.map(({ proof }) => proof)),
  }
}

function widestGap(proofs: readonly CutProof[]): CutProof {
  const gaps = proofs.map((proof) => (proof === 'optimal' ? 0 : proof.gapPercent))
  return proofs.every((proof) => proof === 'optimal')
    ? 'optimal'
    : { gapPercent: Math.max(...gaps) }
}

function describeSection({ problem, plan, proof }: SolvedSection): CutSection {
  const { cost, length, differentCuts } = measurePlan(problem, plan)
  return {
    section: problem.section,
    count: sum(plan.map(({ bars }) => bars)),
    boughtMm: stepsToMm(length * problem.lengthUnit),
    cost: problem.isPriced ? cost * problem.costUnit : null,
    differentCuts,
    proof,
  }
}

/** The cuts repeated most often first, then by the longest pieces: the order in which one sets the saw. */
function sortLines(plan: Plan): PlanLine[] {
  return [...plan].sort((one, other) => {
    const size = one.pattern.counts.findIndex(
      (count, index) => count !== at(other.pattern.counts, index),
    )
    const pieces = size < 0 ? 0 : at(other.pattern.counts, size) - at(one.pattern.counts, size)
    return other.bars - one.bars || pieces || one.pattern.offer - other.pattern.offer
  })
}

function layOutSection(request: CutRequest, { problem, plan }: SolvedSection): CutBar[] {
  /** The parts still to be cut of each size, piece by piece. */
  const waiting = problem.partsOfSize.map((parts) =>
    parts.flatMap((part) => {
      const { label, lengthMm, count } = request.parts[part] ?? { label: '', lengthMm: 0, count: 0 }
      return Array.from({ length: count }, () => ({ label, lengthMm }))
    }),
  )
  return sortLines(plan).flatMap(({ pattern, bars }) => {
    const stock = request.stock[at(problem.stockOfOffer, pattern.offer)]
    if (!stock) return []
    return Array.from({ length: bars }, () => {
      const cuts = pattern.counts.flatMap((count, size) => waiting[size]?.splice(0, count) ?? [])
      return { stock, section: problem.section, cuts, offcutMm: offcutMm(request, stock, cuts) }
    })
  })
}

/** A cut follows every piece but one that ends with the bar; where less than the kerf is left, it is all dust. */
function offcutMm(request: CutRequest, stock: CutStock, cuts: readonly { lengthMm: number }[]) {
  const kerf = stepsUp(request.kerfMm)
  const pieces = sum(cuts.map(({ lengthMm }) => stepsUp(lengthMm) + kerf))
  const left = stepsDown(stock.lengthMm) - stepsUp(request.endTrimMm) - pieces
  return stepsToMm(Math.max(0, left))
}
