import { db, type Transaction } from '../db/client'
import { and, eq } from 'drizzle-orm'
import { enrolments } from '../db/schema'

/** Enrols a person with a revision; throws a duplicate error when they are enrolled already. */
export async function insertEnrolment(values: typeof enrolments.$inferInsert, tx: Transaction) {
  const [row] = await tx.insert(enrolments).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** A person's enrolment in a course, or null. */
export async function findEnrolment(userId: number, courseId: number) {
  const [row] = await db
    .select()
    .from(enrolments)
    .where(and(eq(enrolments.userId, userId), eq(enrolments.courseId, courseId)))
  return row ?? null
}
