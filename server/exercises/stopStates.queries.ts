import { and, asc, eq, isNotNull } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { exercises, stopStates, stops } from '../db/schema'

export type StopStateRow = typeof stopStates.$inferSelect
export interface StopOfPerson {
  userId: number
  courseId: number
  lessonKey: string
  stopKey: string
}

const isThisStop = ({ userId, courseId, lessonKey, stopKey }: StopOfPerson) =>
  and(
    eq(stopStates.userId, userId),
    eq(stopStates.courseId, courseId),
    eq(stopStates.lessonKey, lessonKey),
    eq(stopStates.stopKey, stopKey),
  )

/** The stops of a lesson that have an exercise, in the order of their moments. */
export async function listStops(lessonId: number) {
  return db
    .select({
      key: stops.key,
      name: stops.name,
      atMs: stops.atMs,
      isRequired: stops.isRequired,
      exerciseKind: exercises.kind,
    })
    .from(stops)
    .innerJoin(exercises, eq(exercises.stopId, stops.id))
    .where(eq(stops.lessonId, lessonId))
    .orderBy(asc(stops.atMs))
}

/** The keys of the stops of a lesson that a person has solved. */
export async function listSolvedKeys(
  { userId, courseId, lessonKey }: Omit<StopOfPerson, 'stopKey'>,
  on: Executor = db,
): Promise<string[]> {
  const rows = await on
    .select({ key: stopStates.stopKey })
    .from(stopStates)
    .where(
      and(
        eq(stopStates.userId, userId),
        eq(stopStates.courseId, courseId),
        eq(stopStates.lessonKey, lessonKey),
        isNotNull(stopStates.solvedAt),
      ),
    )
  return rows.map((row) => row.key)
}

/** How a person stands at a stop, or null before their first look. */
export async function findStopState(which: StopOfPerson): Promise<StopStateRow | null> {
  const [row] = await db.select().from(stopStates).where(isThisStop(which))
  return row ?? null
}

/** Adds the state with its seed unless another request did. */
export async function insertStopState(which: StopOfPerson, seed: number) {
  await db
    .insert(stopStates)
    .ignore()
    .values({ ...which, seed })
}

/** The state, held against every other answer to the same stop until the transaction ends. */
export async function lockStopState(which: StopOfPerson, tx: Transaction): Promise<StopStateRow> {
  const [row] = await tx.select().from(stopStates).where(isThisStop(which)).for('update')
  if (!row) throw new Error('a stop was answered before its state was made')
  return row
}

/** Keeps the tries, and the moment it was solved. */
export async function updateStopState(
  id: number,
  values: { triesUsed: number; solvedAt: Date | null },
  tx: Transaction,
) {
  await tx.update(stopStates).set(values).where(eq(stopStates.id, id))
}
