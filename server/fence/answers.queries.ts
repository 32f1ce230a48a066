import { and, asc, count, eq, inArray, isNull } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { answers, courseStaff, fenceRooms, questions, users } from '../db/schema'

export type AnswerRecord = Awaited<ReturnType<typeof listAnswers>>[number]

/** The answers to several questions that were not deleted, oldest first. */
export async function listAnswers(questionIds: number[], on: Executor) {
  if (!questionIds.length) return []
  return on
    .select({
      answer: answers,
      authorName: users.displayName,
      authorStaffRole: courseStaff.role,
    })
    .from(answers)
    .innerJoin(questions, eq(questions.id, answers.questionId))
    .innerJoin(fenceRooms, eq(fenceRooms.id, questions.roomId))
    .leftJoin(users, eq(users.id, answers.authorId))
    .leftJoin(
      courseStaff,
      and(eq(courseStaff.courseId, fenceRooms.courseId), eq(courseStaff.userId, answers.authorId)),
    )
    .where(and(inArray(answers.questionId, questionIds), isNull(answers.deletedAt)))
    .orderBy(asc(answers.id))
}

/** An answer that was not deleted, or null. */
export async function findAnswer(id: number, on: Executor = db) {
  const [row] = await on
    .select()
    .from(answers)
    .where(and(eq(answers.id, id), isNull(answers.deletedAt)))
  return row ?? null
}

/** How many answers a question has. */
export async function countAnswers(questionId: number, tx: Transaction): Promise<number> {
  const [row] = await tx
    .select({ n: count() })
    .from(answers)
    .where(and(eq(answers.questionId, questionId), isNull(answers.deletedAt)))
  return row?.n ?? 0
}

/** Adds an answer. */
export async function insertAnswer(values: typeof answers.$inferInsert, tx: Transaction) {
  await tx.insert(answers).values(values)
}

/** Changes some columns of an answer. */
export async function updateAnswer(
  id: number,
  values: Partial<typeof answers.$inferInsert>,
  tx: Transaction,
) {
  await tx.update(answers).set(values).where(eq(answers.id, id))
}
