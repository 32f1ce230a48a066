import { and, count, desc, eq, isNotNull, lt, max, ne, sql } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import {
  courseRevisions,
  courseStaff,
  exercises,
  lessons,
  ownCalculators,
  ownCalculatorVersions,
  stops,
} from '../db/schema'

export type OwnCalculatorEntry = typeof ownCalculators.$inferSelect
export type OwnVersionEntry = typeof ownCalculatorVersions.$inferSelect

/** A keyset page: rows below an id, the newest first. */
export interface Below {
  before: number | null
  limit: number
}

const versionOf = and(
  eq(ownCalculatorVersions.calculatorId, ownCalculators.id),
  eq(ownCalculatorVersions.number, ownCalculators.attachable),
)

/** A course's own calculators, the newest first, each with the version that can be attached. */
export const listOwnCalculators = (courseId: number, { before, limit }: Below) =>
  db
    .select({ calculator: ownCalculators, kept: ownCalculatorVersions.definition })
    .from(ownCalculators)
    .leftJoin(ownCalculatorVersions, versionOf)
    .where(
      and(
        eq(ownCalculators.courseId, courseId),
        before === null ? undefined : lt(ownCalculators.id, before),
      ),
    )
    .orderBy(desc(ownCalculators.id))
    .limit(limit)

/** How many own calculators a course has. */
export const countOwnCalculators = (courseId: number, tx: Transaction) =>
  tx.$count(ownCalculators, eq(ownCalculators.courseId, courseId))

/** One own calculator with the version that can be attached, or null. */
export async function findOwnCalculator(courseId: number, key: string, on: Executor = db) {
  const [row] = await on
    .select({ calculator: ownCalculators, kept: ownCalculatorVersions.definition })
    .from(ownCalculators)
    .leftJoin(ownCalculatorVersions, versionOf)
    .where(and(eq(ownCalculators.courseId, courseId), eq(ownCalculators.key, key)))
  return row ?? null
}

/** One own calculator, locked until the transaction ends; null when it is gone. */
export async function lockOwnCalculator(
  courseId: number,
  key: string,
  tx: Transaction,
): Promise<OwnCalculatorEntry | null> {
  const [row] = await tx
    .select()
    .from(ownCalculators)
    .where(and(eq(ownCalculators.courseId, courseId), eq(ownCalculators.key, key)))
    .for('update')
  return row ?? null
}

/** Adds an own calculator and returns its id. */
export async function insertOwnCalculator(
  values: Omit<typeof ownCalculators.$inferInsert, 'id'>,
  tx: Transaction,
): Promise<number> {
  const [row] = await tx.insert(ownCalculators).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Changes some columns of an own calculator and notes when it was saved. */
export async function updateOwnCalculator(
  id: number,
  values: Partial<Omit<OwnCalculatorEntry, 'id' | 'courseId' | 'key'>>,
  tx: Transaction,
) {
  await tx
    .update(ownCalculators)
    .set({ ...values, savedAt: sql`utc_timestamp(3)` })
    .where(eq(ownCalculators.id, id))
}

/** Removes an own calculator with its versions. */
export async function deleteOwnCalculator(id: number, tx: Transaction) {
  await tx.delete(ownCalculators).where(eq(ownCalculators.id, id))
}

/** Keeps a version; it is never changed afterwards. */
export async function insertOwnVersion(
  values: Omit<typeof ownCalculatorVersions.$inferInsert, 'id'>,
  tx: Transaction,
) {
  await tx.insert(ownCalculatorVersions).values(values)
}

/** One kept version, or null. */
export async function findOwnVersion(
  calculatorId: number,
  number: number,
  on: Executor = db,
): Promise<OwnVersionEntry | null> {
  const [row] = await on
    .select()
    .from(ownCalculatorVersions)
    .where(
      and(
        eq(ownCalculatorVersions.calculatorId, calculatorId),
        eq(ownCalculatorVersions.number, number),
      ),
    )
  return row ?? null
}

/** The kept versions of a calculator, the newest first. */
export const listOwnVersions = (
  calculatorId: number,
  { before, limit }: Below,
): Promise<OwnVersionEntry[]> =>
  db
    .select()
    .from(ownCalculatorVersions)
    .where(
      and(
        eq(ownCalculatorVersions.calculatorId, calculatorId),
        before === null ? undefined : lt(ownCalculatorVersions.number, before),
      ),
    )
    .orderBy(desc(ownCalculatorVersions.number))
    .limit(limit)

const attachedKey = sql<string | null>`json_value(${exercises.definition}, '$.own.key')`
const attachedVersion = sql<number>`json_value(${exercises.definition}, '$.own.version')`

/** The stops of all revisions of a course that an own calculator is attached to, by its key and version. */
export async function countAttached(courseId: number, on: Executor = db) {
  const rows = await on
    .select({
      key: attachedKey,
      version: attachedVersion.mapWith(Number),
      stops: count(),
    })
    .from(exercises)
    .innerJoin(stops, eq(stops.id, exercises.stopId))
    .innerJoin(lessons, eq(lessons.id, stops.lessonId))
    .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
    .where(
      and(
        eq(courseRevisions.courseId, courseId),
        eq(exercises.kind, 'calculator'),
        isNotNull(attachedKey),
      ),
    )
    .groupBy(attachedKey, attachedVersion)
  return rows.flatMap(({ key, ...row }) => (key === null ? [] : [{ key, ...row }]))
}

/** Own calculators of other courses on whose staff a person is, the newest first, with their course's title. */
export const listCopyable = (userId: number, exceptCourseId: number, { before, limit }: Below) => {
  const newest = db
    .select({
      courseId: courseRevisions.courseId,
      number: max(courseRevisions.number).as('newest_number'),
    })
    .from(courseRevisions)
    .groupBy(courseRevisions.courseId)
    .as('newest')
  return db
    .select({ calculator: ownCalculators, courseTitle: courseRevisions.title })
    .from(ownCalculators)
    .innerJoin(
      courseStaff,
      and(eq(courseStaff.courseId, ownCalculators.courseId), eq(courseStaff.userId, userId)),
    )
    .innerJoin(newest, eq(newest.courseId, ownCalculators.courseId))
    .innerJoin(
      courseRevisions,
      and(
        eq(courseRevisions.courseId, ownCalculators.courseId),
        eq(courseRevisions.number, newest.number),
      ),
    )
    .where(
      and(
        ne(ownCalculators.courseId, exceptCourseId),
        before === null ? undefined : lt(ownCalculators.id, before),
      ),
    )
    .orderBy(desc(ownCalculators.id))
    .limit(limit)
}

/** The exercise of a stop of a revision as staff wrote it, or null where it is no calculator. */
export async function findCalculatorAt(revisionId: number, lessonKey: string, stopKey: string) {
  const [row] = await db
    .select({ definition: exercises.definition })
    .from(exercises)
    .innerJoin(stops, eq(stops.id, exercises.stopId))
    .innerJoin(lessons, eq(lessons.id, stops.lessonId))
    .where(
      and(eq(lessons.revisionId, revisionId), eq(lessons.key, lessonKey), eq(stops.key, stopKey)),
    )
  return row?.definition ?? null
}

/** Titles of a course's own calculators by their keys. */
export async function listOwnTitles(courseId: number): Promise<Map<string, string>> {
  const rows = await db
    .select({ key: ownCalculators.key, title: ownCalculators.title })
    .from(ownCalculators)
    .where(eq(ownCalculators.courseId, courseId))
  return new Map(rows.map(({ key, title }) => [key, title]))
}
