import type { Column, IntegerProgram, RowBounds } from './lpSolver'
import type { Goal } from './master'
import { at, gatherPlan, type PlanLine } from './patterns'
import type { PackingProblem } from './sectionProblem'

/** A piece (or, with size null, nothing) from one place along the bar to a later one. */
interface Arc {
  from: number
  to: number
  size: number | null
}

/** Cutting as a flow along the bars (Valério de Carvalho 1999): every plan is a flow and every flow a plan. */
export interface FlowProgram {
  program: IntegerProgram
  /** Reads the plan out of the flow. */
  readPlan: (columns: Float64Array) => PlanLine[]
}

/** Builds the flow, or null where it would have more than `most` arcs. */
export function buildFlow(problem: PackingProblem, goal: Goal, most: number): FlowProgram | null {
  const longest = Math.max(0, ...problem.offers.map(({ capacity }) => capacity))
  const arcs = pieceArcs(problem, longest, most)
  if (!arcs) return null
  const ends = problem.offers.map(({ capacity }) => Math.max(0, capacity))
  const places = [...new Set([0, ...ends, ...arcs.flatMap(({ from, to }) => [from, to])])].sort(
    (one, other) => one - other,
  )
  places.slice(1).forEach((to, index) => arcs.push({ from: at(places, index), to, size: null }))
  return {
    program: flowProgram(problem, goal, arcs, places, ends),
    readPlan: (columns) => readFlow(problem, arcs, ends, columns),
  }
}

/** Arcs on which sizes follow each other from the widest down, which leaves each mixture one order. */
function pieceArcs({ sizes }: PackingProblem, longest: number, most: number): Arc[] | null {
  const arcs: Arc[] = []
  let reached = new Set([0])
  for (const [size, { width, demand }] of sizes.entries()) {
    const known = new Set<number>()
    const after = new Set(reached)
    for (const start of reached) {
      for (let count = 0, from = start; count < demand && from + width <= longest; count++) {
        const to = from + width
        if (!known.has(from)) arcs.push({ from, to, size })
        known.add(from)
        after.add(to)
        from = to
      }
      if (arcs.length > most) return null
    }
    reached = after
  }
  return arcs
}

function flowProgram(
  { sizes, offers }: PackingProblem,
  goal: Goal,
  arcs: readonly Arc[],
  places: readonly number[],
  ends: readonly number[],
): IntegerProgram {
  const balance = { lower: 0, upper: 0 }
  const rows: RowBounds[] = sizes.map(({ demand }) => ({ lower: demand, upper: Infinity }))
  const rowOfPlace = new Map(places.map((place) => [place, rows.push(balance) - 1]))
  const rowOf = (place: number) => rowOfPlace.get(place) ?? 0
  const capRow = goal.cap ? rows.push({ lower: -Infinity, upper: goal.cap.most }) - 1 : null
  const columns: Column[] = arcs.map(({ from, to, size }) => ({
    cost: 0,
    upper: size === null ? Infinity : (sizes[size]?.demand ?? 0),
    entries: [
      ...(size === null ? [] : [{ row: size, value: 1 }]),
      { row: rowOf(from), value: -1 },
      { row: rowOf(to), value: 1 },
    ],
  }))
  offers.forEach(({ available }, offer) => {
    const end = at(ends, offer)
    const entries =
      end > 0
        ? [
            { row: rowOf(0), value: 1 },
            { row: rowOf(end), value: -1 },
          ]
        : []
    const capCost = goal.cap ? at(goal.cap.costs, offer) : 0
    if (capRow !== null && capCost > 0) entries.push({ row: capRow, value: capCost })
    columns.push({ cost: at(goal.costs, offer), upper: available ?? Infinity, entries })
  })
  return { rows, columns }
}

/** Follows the flow from the start of a bar to its end, bar by bar. */
function readFlow(
  { sizes, offers }: PackingProblem,
  arcs: readonly Arc[],
  ends: readonly number[],
  columns: Float64Array,
): PlanLine[] {
  const flow = arcs.map((_, arc) => Math.round(at(columns, arc)))
  const arcsFrom = new Map<number, number[]>()
  arcs.forEach(({ from }, arc) => arcsFrom.set(from, [...(arcsFrom.get(from) ?? []), arc]))
  const lines: PlanLine[] = []
  // Short bars first: a bar is read up to its end, and what flows on belongs to longer ones.
  const byEnd = offers
    .map((_, offer) => offer)
    .sort((one, other) => at(ends, one) - at(ends, other))
  for (const offer of byEnd) {
    const bars = Math.round(at(columns, arcs.length + offer))
    for (let bar = 0; bar < bars; bar++) {
      const path = findPath(arcs, arcsFrom, flow, at(ends, offer))
      if (!path) return []
      const counts = sizes.map(() => 0)
      for (const arc of path) {
        flow[arc] = at(flow, arc) - 1
        const size = arcs[arc]?.size ?? null
        if (size !== null) counts[size] = at(counts, size) + 1
      }
      lines.push({ pattern: { offer, counts }, bars: 1 })
    }
  }
  return gatherPlan(lines)
}

/** A way from 0 to `end` along arcs that still carry flow; null where there is none. */
function findPath(
  arcs: readonly Arc[],
  arcsFrom: ReadonlyMap<number, readonly number[]>,
  flow: readonly number[],
  end: number,
): number[] | null {
  const deadEnds = new Set<number>()
  const walk = (place: number): number[] | null => {
    if (place === end) return []
    if (place > end || deadEnds.has(place)) return null
    for (const arc of arcsFrom.get(place) ?? []) {
      if (at(flow, arc) <= 0) continue
      const rest = walk(arcs[arc]?.to ?? Infinity)
      if (rest) return [arc, ...rest]
    }
    deadEnds.add(place)
    return null
  }
  return walk(0)
}
