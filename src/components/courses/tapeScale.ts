/** How a tape is divided: a line each `minor`, a longer one each `middle`, a full one with a numeral each `major` (seconds). */
export interface TapeDivision {
  minor: number
  middle: number
  major: number
}

/** Minutes carry the numerals; a lesson of a few minutes is divided finer, as a short rule is. */
export function divideTape(durationMs: number): TapeDivision {
  if (durationMs > 240_000) return { minor: 10, middle: 30, major: 60 }
  return { minor: 1, middle: 5, major: 10 }
}

export interface TapeTick {
  second: number
  height: number
}

/** The tick lines of a tape, hook and end left out. */
export function ticksOf(durationMs: number): TapeTick[] {
  const { minor, middle, major } = divideTape(durationMs)
  const ticks: TapeTick[] = []
  for (let second = minor; second * 1000 < durationMs - minor * 500; second += minor) {
    const height = second % major === 0 ? 54 : second % middle === 0 ? 15 : 8
    ticks.push({ second, height })
  }
  return ticks
}

/** The numerals, each at the foot left of its line: minutes, or minutes and seconds on a short tape. */
export function numeralsOf(durationMs: number): { second: number; text: string }[] {
  const { major } = divideTape(durationMs)
  return ticksOf(durationMs)
    .filter(({ second }) => second % major === 0)
    .map(({ second }) => ({
      second,
      text:
        major === 60
          ? String(second / 60)
          : `${Math.floor(second / 60)}:${String(second % 60).padStart(2, '0')}`,
    }))
}

/** Marks that stand closer than a finger's width, as groups in the order of time. */
export function groupMarks<T extends { atMs: number }>(
  marks: readonly T[],
  leastGapMs: number,
): T[][] {
  const groups: T[][] = []
  for (const mark of [...marks].sort((a, b) => a.atMs - b.atMs)) {
    const group = groups.at(-1)
    if (group?.[0] && mark.atMs - group[0].atMs < leastGapMs) group.push(mark)
    else groups.push([mark])
  }
  return groups
}

/** The nearest of `targets` within `reachMs`, else the moment itself. */
export function settleOn(atMs: number, targets: readonly number[], reachMs: number): number {
  let best = atMs
  let gap = reachMs
  for (const target of targets) {
    const distance = Math.abs(target - atMs)
    if (distance <= gap) {
      gap = distance
      best = target
    }
  }
  return best
}
