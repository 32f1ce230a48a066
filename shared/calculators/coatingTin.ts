import type { Values } from './calculator'
import { numberOf, wordOf } from './values'

/** A litre and a US gallon in m³. */
export const LITRE = 0.001
export const GALLON = 231 * 0.0254 ** 3

/** The volume that the coverage is said for, m³. */
export const tinOf = (values: Values): number =>
  wordOf(values, 'coverageFor') === 'gal' ? GALLON : LITRE

/** Area that a volume covers in one coat: m² for each m³. */
export const coverageOf = (values: Values): number => numberOf(values, 'coverage') / tinOf(values)

/** What the coverage is for, in words. */
export const tinWords = (values: Values): string =>
  wordOf(values, 'coverageFor') === 'gal' ? 'a gallon' : 'a litre'
