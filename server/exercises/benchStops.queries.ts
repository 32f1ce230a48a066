import { asc, eq, inArray } from 'drizzle-orm'
import type { BenchStop } from '../../shared/contracts/benchCourses'
import type { Exercise, QuizQuestion } from '../../shared/contracts/exercises'
import { db, type Executor, type Transaction } from '../db/client'
import { exercises, lessons, quizQuestions, stops, videos } from '../db/schema'

export type StopRow = typeof stops.$inferSelect
type ExerciseRow = typeof exercises.$inferSelect

function toExercise(row: ExerciseRow, questions: QuizQuestion[]): Exercise | null {
  const { prompt, tries } = row
  if (row.kind === 'quiz') {
    return { kind: 'quiz', prompt, tries, passMark: row.passMark ?? 100, questions }
  }
  return row.definition && { kind: 'calculator', prompt, tries, definition: row.definition }
}

async function listQuestions(exerciseIds: number[], on: Executor) {
  const questions = new Map<number, QuizQuestion[]>(exerciseIds.map((id) => [id, []]))
  if (exerciseIds.length === 0) return questions
  const rows = await on
    .select()
    .from(quizQuestions)
    .where(inArray(quizQuestions.exerciseId, exerciseIds))
    .orderBy(asc(quizQuestions.position))
  for (const { exerciseId, key, kind, prompt, definition } of rows) {
    questions.get(exerciseId)?.push({ key, kind, prompt, definition } as QuizQuestion)
  }
  return questions
}

/** The stops of each of these lessons by time, with their exercises as staff see them. */
export async function listStops(
  lessonIds: number[],
  on: Executor = db,
): Promise<Map<number, BenchStop[]>> {
  const found = new Map<number, BenchStop[]>(lessonIds.map((id) => [id, []]))
  if (lessonIds.length === 0) return found
  const rows = await on
    .select({ stop: stops, exercise: exercises })
    .from(stops)
    .leftJoin(exercises, eq(exercises.stopId, stops.id))
    .where(inArray(stops.lessonId, lessonIds))
    .orderBy(asc(stops.atMs))
  const quizIds = rows.flatMap(({ exercise }) => (exercise?.kind === 'quiz' ? [exercise.id] : []))
  const questions = await listQuestions(quizIds, on)
  for (const { stop, exercise } of rows) {
    const { lessonId, ...rest } = stop
    found.get(lessonId)?.push({
      ...rest,
      exercise: exercise && toExercise(exercise, questions.get(exercise.id) ?? []),
    })
  }
  return found
}

/** One stop, or null. */
export async function findStop(id: number, on: Executor = db): Promise<StopRow | null> {
  const [row] = await on.select().from(stops).where(eq(stops.id, id))
  return row ?? null
}

/** How long a lesson's video is, in ms; null while none is ready. */
export async function findVideoDuration(lessonId: number, on: Executor): Promise<number | null> {
  const [row] = await on
    .select({ durationMs: videos.durationMs })
    .from(lessons)
    .innerJoin(videos, eq(videos.id, lessons.videoId))
    .where(eq(lessons.id, lessonId))
  return row?.durationMs ?? null
}

/** Adds a stop and returns its id; throws a duplicate error when its moment is taken. */
export async function insertStop(
  values: Omit<typeof stops.$inferInsert, 'id'>,
  tx: Transaction,
): Promise<number> {
  const [row] = await tx.insert(stops).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Changes some columns of a stop; throws a duplicate error when its moment is taken. */
export async function updateStop(
  id: number,
  values: Partial<Omit<StopRow, 'id' | 'lessonId' | 'key'>>,
  tx: Transaction,
) {
  await tx.update(stops).set(values).where(eq(stops.id, id))
}

/** Removes a stop with its exercise. */
export async function deleteStop(id: number, tx: Transaction) {
  await tx.delete(stops).where(eq(stops.id, id))
}

/** Takes the exercise off a stop. */
export async function deleteExercise(stopId: number, tx: Transaction) {
  await tx.delete(exercises).where(eq(exercises.stopId, stopId))
}

/** Puts an exercise on a stop in the place of what was there; `key` names it when it is the first. */
export async function saveExercise(
  stopId: number,
  exercise: Exercise,
  key: string,
  tx: Transaction,
) {
  const { kind, prompt, tries } = exercise
  const values =
    exercise.kind === 'quiz'
      ? { kind, prompt, tries, definition: null, passMark: exercise.passMark }
      : { kind, prompt, tries, definition: exercise.definition, passMark: null }
  await tx
    .insert(exercises)
    .values({ ...values, stopId, key })
    .onDuplicateKeyUpdate({ set: values })
  const [row] = await tx
    .select({ id: exercises.id })
    .from(exercises)
    .where(eq(exercises.stopId, stopId))
  if (!row) throw new Error('the exercise was not kept')
  await tx.delete(quizQuestions).where(eq(quizQuestions.exerciseId, row.id))
  if (exercise.kind !== 'quiz' || exercise.questions.length === 0) return
  await tx.insert(quizQuestions).values(
    exercise.questions.map((question, index) => ({
      ...question,
      exerciseId: row.id,
      position: index + 1,
    })),
  )
}
