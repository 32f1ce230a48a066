import { and, asc, desc, eq } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { attempts, exercises, quizQuestions, stops } from '../db/schema'
import type { Exercise, QuizQuestion } from '../../shared/contracts/exercises'

export interface StopExercise {
  exerciseId: number
  exercise: Exercise
}

/** The exercise at a stop of a lesson as staff wrote it, or null. */
export async function findStopExercise(
  lessonId: number,
  stopKey: string,
): Promise<StopExercise | null> {
  const [row] = await db
    .select({ exercise: exercises })
    .from(stops)
    .innerJoin(exercises, eq(exercises.stopId, stops.id))
    .where(and(eq(stops.lessonId, lessonId), eq(stops.key, stopKey)))
  if (!row) return null
  const { id, kind, prompt, tries, definition, passMark } = row.exercise
  if (kind === 'calculator') {
    if (!definition) throw new Error('a calculator exercise without a definition')
    return { exerciseId: id, exercise: { kind, prompt, tries, definition } }
  }
  const questions = await listQuizQuestions(id)
  return { exerciseId: id, exercise: { kind, prompt, tries, passMark: passMark ?? 100, questions } }
}

async function listQuizQuestions(exerciseId: number): Promise<QuizQuestion[]> {
  const rows = await db
    .select({
      key: quizQuestions.key,
      kind: quizQuestions.kind,
      prompt: quizQuestions.prompt,
      definition: quizQuestions.definition,
    })
    .from(quizQuestions)
    .where(eq(quizQuestions.exerciseId, exerciseId))
    .orderBy(asc(quizQuestions.position))
  return rows as QuizQuestion[]
}

/** The last answer a person handed in to an exercise and what was said to it, or null. */
export async function findLastAttempt(userId: number, exerciseId: number, on: Executor = db) {
  const [row] = await on
    .select({ answer: attempts.answer, verdict: attempts.verdict })
    .from(attempts)
    .where(and(eq(attempts.userId, userId), eq(attempts.exerciseId, exerciseId)))
    .orderBy(desc(attempts.id))
    .limit(1)
  return row ?? null
}

/** Adds an answer that was handed in. */
export async function insertAttempt(values: typeof attempts.$inferInsert, tx: Transaction) {
  await tx.insert(attempts).values(values)
}
