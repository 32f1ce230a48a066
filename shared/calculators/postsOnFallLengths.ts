import type { Values } from './calculator'
import { listOf, numberOf, wordOf } from './values'

/** How much of the surface’s fall and of the roof’s pitch is counted; a slip leaves one out or turns it round. */
export interface Counted {
  surface: number
  roof: number
}
const ALL: Counted = { surface: 1, roof: 1 }

/** Drop of the top for each metre from the high edge; negative where the top rises that way. */
export const topFall = (values: Values): number =>
  (wordOf(values, 'roofFalls') === 'with' ? 1 : -1) * Math.tan(numberOf(values, 'roofPitch'))

/** Length in m of a post so far from the high edge. */
export const lengthAt = (values: Values, at: number, { surface, roof }: Counted = ALL): number =>
  numberOf(values, 'topHeight') + at * (surface * numberOf(values, 'fall') - roof * topFall(values))

/** Length of every post in m, in the order they were given. */
export const lengthsOf = (values: Values, counted: Counted = ALL): number[] =>
  listOf(values, 'positions').map((at) => lengthAt(values, at, counted))

/** Where the longest and the shortest post stand, in m from the high edge. */
export function findEnds(values: Values): { longest: number; shortest: number } {
  const positions = listOf(values, 'positions')
  const lengths = lengthsOf(values)
  const at = (length: number) => positions[lengths.indexOf(length)] ?? 0
  return { longest: at(Math.max(...lengths)), shortest: at(Math.min(...lengths)) }
}
