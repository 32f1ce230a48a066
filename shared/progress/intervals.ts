import type { Interval } from '../contracts/progress'

/** Part of a video that must have been watched before its lesson counts as done. */
export const doneCoverage = 0.9

/**
 * The union of all stretches, in order, none touching another; empty ones are left out.
 * Milliseconds, `[start, end)`.
 */
export function mergeIntervals(...lists: (readonly Interval[])[]): Interval[] {
  const sorted = lists
    .flat()
    .filter(([start, end]) => end > start)
    .sort((a, b) => a[0] - b[0])
  const merged: Interval[] = []
  for (const [start, end] of sorted) {
    const last = merged.at(-1)
    if (last && start <= last[1]) last[1] = Math.max(last[1], end)
    else merged.push([start, end])
  }
  return merged
}

/** The stretches as far as they lie within a video of `durationMs`, as a union. */
export function clampIntervals(intervals: readonly Interval[], durationMs: number): Interval[] {
  const within = intervals.map(([start, end]): Interval => [
    Math.min(Math.max(start, 0), durationMs),
    Math.min(Math.max(end, 0), durationMs),
  ])
  return mergeIntervals(within)
}

/** How many milliseconds the union of the stretches covers. */
export function measureIntervals(intervals: readonly Interval[]): number {
  return mergeIntervals(intervals).reduce((sum, [start, end]) => sum + end - start, 0)
}

/** The covered part of a video, 0 to 1; 0 for a video without a length. */
export function coverageOf(intervals: readonly Interval[], durationMs: number): number {
  if (durationMs <= 0) return 0
  return measureIntervals(clampIntervals(intervals, durationMs)) / durationMs
}

/** True when enough of the video was watched for its lesson to be done. */
export function isWatchedThrough(intervals: readonly Interval[], durationMs: number): boolean {
  return coverageOf(intervals, durationMs) >= doneCoverage
}
