import type { Point } from './pen'

export const clamp01 = (value: number) => Math.min(1, Math.max(0, value))

/** 0 before `start`, 1 after `start + seconds`, eased at both ends in between. */
export function ramp(t: number, start: number, seconds = 0.5): number {
  const x = clamp01((t - start) / seconds)
  return x * x * (3 - 2 * x)
}

/** 1 between `from` and `to`, faded in and out over `seconds`. */
export function during(t: number, from: number, to: number, seconds = 0.3): number {
  return ramp(t, from, seconds) * (1 - ramp(t, to - seconds, seconds))
}

export const mix = (a: number, b: number, share: number) => a + (b - a) * share

export function between(a: Point, b: Point, share: number): Point {
  return [mix(a[0], b[0], share), mix(a[1], b[1], share)]
}

/** Numbers between 0 and 1 that are the same in every build. */
export function seeded(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0
    return state / 2 ** 32
  }
}
