import type { Tolerance } from '../contracts/exercises'

/** What binary arithmetic may add to a number that a person would call the same. */
const DUST = 1e-9

/** How far from `right` still counts, in its own unit. */
export const toleranceOf = (right: number, tolerance: Tolerance): number =>
  tolerance.kind === 'percent' ? (Math.abs(right) * tolerance.value) / 100 : tolerance.value

/** Whether a number counts as this one; never true for what is not a number. */
export function isWithin(value: number, right: number, tolerance: Tolerance): boolean {
  const dust = DUST * Math.max(Math.abs(right), Math.abs(value))
  return Math.abs(value - right) <= toleranceOf(right, tolerance) + dust
}
