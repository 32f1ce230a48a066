import { findCalculator } from '../../../shared/calculators'
import type { CalculatorDefinition } from '../../../shared/contracts/exercises'
import {
  OWN_PREFIX,
  type OwnCalculatorRow,
  type OwnSlip,
  type OwnSnapshot,
} from '../../../shared/contracts/ownCalculators'
import { describeOwnCalculator, type CalculatorFace } from '../../../shared/ownCalculators/face'

/** What is told of a slip; how it is worked out is no matter of the page. */
export type ToldSlip = Pick<OwnSlip, 'id' | 'title' | 'output' | 'sentence' | 'wayBack'>
/** What a stop on the bench needs to know of its calculator, built in or own. */
export type BenchFace = CalculatorFace & { slips: readonly ToldSlip[] }

/** The calculator of an exercise on the bench; undefined where there is none. */
export function findBenchFace({
  calculator: id,
  own,
}: Pick<CalculatorDefinition, 'calculator' | 'own'>): BenchFace | undefined {
  if (!own) return findCalculator(id)
  if (id !== ownId(own.key)) return undefined
  return { ...describeOwnCalculator(own.definition, own), slips: own.definition.slips }
}

/** The id an own calculator has in exercises. */
export const ownId = (key: string) => `${OWN_PREFIX}${key}`
/** The key of an own calculator, or undefined where the id is of a built-in one. */
export const keyOfOwn = (id: string): string | undefined =>
  id.startsWith(OWN_PREFIX) ? id.slice(OWN_PREFIX.length) : undefined

/** The course's own calculators as choices; the one that is in use stays one, whatever became of it. */
export function ownChoices(rows: readonly OwnCalculatorRow[], own: OwnSnapshot | undefined) {
  const listed = rows.map(({ key, title }) => ({ key, title }))
  const isListed = own === undefined || listed.some(({ key }) => key === own.key)
  const all = isListed ? listed : [...listed, { key: own.key, title: own.definition.title }]
  return all.map(({ key, title }) => ({ value: ownId(key), label: `${title} (own)` }))
}

/** The version that could be taken instead of the one in use; null where there is no newer one. */
export function newerVersion(
  rows: readonly OwnCalculatorRow[],
  own: OwnSnapshot | undefined,
): number | null {
  const newest = rows.find(({ key }) => key === own?.key)?.attachable ?? null
  return own && newest !== null && newest > own.version ? newest : null
}
