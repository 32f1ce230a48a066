import type {
  ChangeOwnCalculator,
  CreateOwnCalculator,
  OwnCalculator,
  OwnCalculatorRow,
} from '../../shared/contracts/ownCalculators'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import { can, type Actor } from '../../shared/contracts/policies'
import { answerOnce } from '../accounts/idempotency.service'
import { accessCourse, revisionFor } from '../courses/access.service'
import { staleVersion, withCurrent } from '../courses/drafts.service'
import { makeStableKey } from '../courses/stableKeys.service'
import type { Transaction } from '../db/client'
import { inTransaction } from '../db/transaction'
import { conflict, notFound } from '../errors'
import { readCursor } from '../paging'
import {
  countAttached,
  countOwnCalculators,
  deleteOwnCalculator,
  findOwnCalculator,
  insertOwnCalculator,
  listOwnCalculators,
  lockOwnCalculator,
  updateOwnCalculator,
} from './ownCalculators.queries'
import { checkDefinition } from './ownCalculatorTasks.service'
import { isSameDefinition, keepVersion } from './ownCalculatorVersions.service'

const mostOfCourse = 60
/** With `own:` before it, a key still fits where the ids of calculators are kept. */
const longestReadable = 30

/** How a person stands to the course whose own calculators are asked for; 404 when there is none. */
export const accessOwnCalculators = (courseId: number, actor: Actor | null) =>
  accessCourse({ id: courseId }, actor)

type Found = NonNullable<Awaited<ReturnType<typeof findOwnCalculator>>>

const isUnkept = ({ calculator, kept }: Found) =>
  kept === null || !isSameDefinition(calculator.definition, kept)
const countStops = (attached: Awaited<ReturnType<typeof countAttached>>, key: string) =>
  attached.filter((one) => one.key === key).reduce((sum, { stops }) => sum + stops, 0)

/** A page of a course's own calculators, the newest first. */
export async function listOfCourse(
  courseId: number,
  { cursor, limit }: PageQuery,
): Promise<Page<OwnCalculatorRow>> {
  const [rows, attached] = await Promise.all([
    listOwnCalculators(courseId, { before: readCursor(cursor), limit: limit + 1 }),
    countAttached(courseId),
  ])
  const shown = rows.slice(0, limit)
  return {
    items: shown.map((found) => ({
      key: found.calculator.key,
      title: found.calculator.title,
      question: found.calculator.definition.question,
      attachable: found.calculator.attachable,
      hasUnkept: isUnkept(found),
      stops: countStops(attached, found.calculator.key),
      savedAt: found.calculator.savedAt.toISOString(),
    })),
    nextCursor: rows.length > limit ? String(shown.at(-1)?.calculator.id) : null,
  }
}

/** One own calculator as its staff see it, checked as it stands; 404 when there is none. */
export async function describeOwnCalculator(
  courseId: number,
  key: string,
  actor: Actor,
): Promise<OwnCalculator> {
  const [found, attached, access] = await Promise.all([
    findOwnCalculator(courseId, key),
    countAttached(courseId),
    accessOwnCalculators(courseId, actor),
  ])
  if (!found) throw notFound('calculator')
  const { calculator, kept } = found
  const { definition, attachable: version } = calculator
  const [check, revision] = await Promise.all([
    checkDefinition(definition),
    revisionFor(access, true),
  ])
  const stops = countStops(attached, key)
  const mayEdit = can(actor, 'course:edit', access.thing)
  return {
    course: { id: courseId, title: revision?.title ?? '' },
    key,
    title: calculator.title,
    question: definition.question,
    definition,
    check,
    version: calculator.version,
    attachable: version === null || kept === null ? null : { key, version, definition: kept },
    hasUnkept: isUnkept(found),
    stops,
    savedAt: calculator.savedAt.toISOString(),
    can: { edit: mayEdit, remove: mayEdit && stops === 0 },
  }
}

/** Adds an own calculator to a course under a key of its own; 409 when there are too many. */
export async function addToCourse(
  courseId: number,
  definition: OwnCalculator['definition'],
  tx: Transaction,
) {
  if ((await countOwnCalculators(courseId, tx)) >= mostOfCourse) {
    throw conflict('too-many', `A course has at most ${mostOfCourse} calculators of its own.`)
  }
  const { title } = definition
  const key = makeStableKey(title.slice(0, longestReadable)).slice(-36).replace(/^-+/, '')
  const id = await insertOwnCalculator({ courseId, key, title, definition }, tx)
  return { id, key }
}

/** Begins an own calculator; the same key never begins two. */
export async function createOwnCalculator(
  courseId: number,
  actor: Actor,
  input: CreateOwnCalculator,
  key: string | undefined,
): Promise<OwnCalculator> {
  const route = `POST bench/courses/${courseId}/own-calculators`
  const { response } = await answerOnce(
    { userId: actor.id, route, key, payload: input },
    async (tx) => ({
      status: 201,
      response: { key: (await addToCourse(courseId, input.definition, tx)).key },
    }),
  )
  return describeOwnCalculator(courseId, response.key, actor)
}

/**
 * Saves the draft of an own calculator, and keeps it as a version when that is asked. 409 `stale` with the
 * calculator as it is when someone else was first, 409 `not-attachable` with the check while it has problems.
 */
export async function changeOwnCalculator(
  courseId: number,
  key: string,
  actor: Actor,
  { version, definition, keepsVersion }: ChangeOwnCalculator,
): Promise<OwnCalculator> {
  if (keepsVersion) {
    const check = await checkDefinition(definition)
    if (check.problems.length > 0) {
      const sentence = 'It cannot be attached yet: put right what is marked, then keep it.'
      throw conflict('not-attachable', sentence, check)
    }
  }
  const save = inTransaction(async (tx) => {
    const calculator = await lockOwnCalculator(courseId, key, tx)
    if (!calculator) throw notFound('calculator')
    if (calculator.version !== version) throw staleVersion('calculator')
    const attachable = keepsVersion
      ? await keepVersion(calculator, definition, actor.id, tx)
      : calculator.attachable
    const { title } = definition
    await updateOwnCalculator(
      calculator.id,
      { title, definition, attachable, version: version + 1 },
      tx,
    )
  })
  await withCurrent(save, () => describeOwnCalculator(courseId, key, actor))
  return describeOwnCalculator(courseId, key, actor)
}

/** Removes an own calculator that no stop is made of; 409 `attached` otherwise. */
export const removeOwnCalculator = (courseId: number, key: string) =>
  inTransaction(async (tx) => {
    const calculator = await lockOwnCalculator(courseId, key, tx)
    if (!calculator) throw notFound('calculator')
    if (countStops(await countAttached(courseId, tx), key) > 0) {
      throw conflict('attached', 'Stops are made of this calculator, so it stays.')
    }
    await deleteOwnCalculator(calculator.id, tx)
  })
