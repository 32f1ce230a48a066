import { at, dot, gatherPlan, type Plan, type PlanLine } from './patterns'
import type { PackingProblem } from './sectionProblem'

/** Counts looked at in all, so that long lists end too. */
const mostTries = 200_000

/**
 * The same pieces, from no other bars, with fewer different cuts, so that the saw stop is set less often: two patterns become
 * one, or three become two, wherever their pieces can be shared out anew. A good plan, not a proved one.
 */
export function useFewerCuts(problem: PackingProblem, plan: Plan): PlanLine[] {
  const tries = { left: mostTries }
  let lines = gatherPlan(plan)
  for (;;) {
    const joined = joinOnce(problem, lines, 2, tries) ?? joinOnce(problem, lines, 3, tries)
    if (!joined) return lines
    lines = joined
  }
}

/** Replaces the first `taken` lines that can be by one line fewer; null where none can. */
function joinOnce(
  problem: PackingProblem,
  lines: readonly PlanLine[],
  taken: 2 | 3,
  tries: { left: number },
): PlanLine[] | null {
  for (const chosen of groupsOf(lines, taken)) {
    if (tries.left <= 0) return null
    tries.left -= problem.sizes.length
    const shared =
      taken === 2 ? shareOutEvenly(problem, chosen) : shareOutInTwo(problem, chosen, tries)
    if (!shared) continue
    const joined = gatherPlan([...lines.filter((line) => !chosen.includes(line)), ...shared])
    if (joined.length < lines.length) return joined
  }
  return null
}

/** Every choice of so many lines that are cut from the same offer. */
function* groupsOf(lines: readonly PlanLine[], taken: number, from = 0): Generator<PlanLine[]> {
  if (taken === 0) {
    yield []
    return
  }
  for (let index = from; index < lines.length; index++) {
    const line = lines[index]
    if (!line) continue
    for (const rest of groupsOf(lines, taken - 1, index + 1)) {
      if (rest.every(({ pattern }) => pattern.offer === line.pattern.offer)) yield [line, ...rest]
    }
  }
}

/** The pieces, bars and room of some lines of one offer. */
function pool({ sizes, offers }: PackingProblem, lines: readonly PlanLine[]) {
  const offer = lines[0]?.pattern.offer ?? 0
  return {
    offer,
    widths: sizes.map(({ width }) => width),
    bars: lines.reduce((sum, line) => sum + line.bars, 0),
    pieces: sizes.map((_, size) =>
      lines.reduce((sum, { pattern, bars }) => sum + bars * at(pattern.counts, size), 0),
    ),
    room: offers[offer]?.capacity ?? 0,
  }
}

function shareOutEvenly(problem: PackingProblem, lines: readonly PlanLine[]): PlanLine[] | null {
  const { offer, widths, bars, pieces, room } = pool(problem, lines)
  if (pieces.some((count) => count % bars !== 0)) return null
  const counts = pieces.map((count) => count / bars)
  return dot(counts, widths) <= room ? [{ pattern: { offer, counts }, bars }] : null
}

/** Looks for two patterns, one for `first` bars and one for the rest, that cut exactly these pieces. */
function shareOutInTwo(
  problem: PackingProblem,
  lines: readonly PlanLine[],
  tries: { left: number },
): PlanLine[] | null {
  const { offer, widths, bars, pieces, room } = pool(problem, lines)
  for (let first = 1; first * 2 <= bars; first++) {
    const second = bars - first
    const counts = pieces.map(() => 0)
    const rests = pieces.map(() => 0)
    const share = (size: number, left: number, restLeft: number): boolean => {
      if (size === pieces.length) return true
      const all = at(pieces, size)
      const width = at(widths, size)
      for (let count = 0; count * first <= all && count * width <= left; count++) {
        const rest = (all - count * first) / second
        if (tries.left-- <= 0) return false
        if (!Number.isInteger(rest) || rest * width > restLeft) continue
        counts[size] = count
        rests[size] = rest
        if (share(size + 1, left - count * width, restLeft - rest * width)) return true
      }
      return false
    }
    if (share(0, room, room)) {
      return [
        { pattern: { offer, counts }, bars: first },
        { pattern: { offer, counts: rests }, bars: second },
      ]
    }
  }
  return null
}
