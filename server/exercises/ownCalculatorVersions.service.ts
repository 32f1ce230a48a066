import type {
  OwnCalculatorDefinition,
  OwnCalculatorVersion,
} from '../../shared/contracts/ownCalculators'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import type { Transaction } from '../db/client'
import { notFound } from '../errors'
import { readCursor } from '../paging'
import {
  countAttached,
  findOwnCalculator,
  findOwnVersion,
  insertOwnVersion,
  listOwnVersions,
} from './ownCalculators.queries'

/** True when two definitions say the same; both have been through the contract, so their keys are in its order. */
export const isSameDefinition = (a: OwnCalculatorDefinition, b: OwnCalculatorDefinition) =>
  JSON.stringify(a) === JSON.stringify(b)

/** Keeps a definition as the version after the last one, unless it says the same. */
export async function keepVersion(
  calculator: { id: number; attachable: number | null },
  definition: OwnCalculatorDefinition,
  createdById: number | null,
  tx: Transaction,
): Promise<number> {
  const { id, attachable } = calculator
  const last = attachable === null ? null : await findOwnVersion(id, attachable, tx)
  if (last && isSameDefinition(last.definition, definition)) return last.number
  const number = (attachable ?? 0) + 1
  await insertOwnVersion({ calculatorId: id, number, definition, createdById }, tx)
  return number
}

/** A page of the versions that were kept, the newest first. */
export async function listVersions(
  courseId: number,
  key: string,
  { cursor, limit }: PageQuery,
): Promise<Page<OwnCalculatorVersion>> {
  const found = await findOwnCalculator(courseId, key)
  if (!found) throw notFound('calculator')
  const [rows, attached] = await Promise.all([
    listOwnVersions(found.calculator.id, { before: readCursor(cursor), limit: limit + 1 }),
    countAttached(courseId),
  ])
  const shown = rows.slice(0, limit)
  return {
    items: shown.map(({ number, definition, createdAt }) => ({
      version: number,
      definition,
      createdAt: createdAt.toISOString(),
      stops: attached.find((one) => one.key === key && one.version === number)?.stops ?? 0,
    })),
    nextCursor: rows.length > limit ? String(shown.at(-1)?.number) : null,
  }
}
