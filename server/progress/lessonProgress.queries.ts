import { and, eq } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { lessonProgress, videos } from '../db/schema'

export type ProgressRow = typeof lessonProgress.$inferSelect
export interface LessonOfPerson {
  userId: number
  courseId: number
  lessonKey: string
}

const isThisLesson = ({ userId, courseId, lessonKey }: LessonOfPerson) =>
  and(
    eq(lessonProgress.userId, userId),
    eq(lessonProgress.courseId, courseId),
    eq(lessonProgress.lessonKey, lessonKey),
  )

/** What a person has watched of a lesson, or null. */
export async function findProgress(
  which: LessonOfPerson,
  on: Executor = db,
): Promise<ProgressRow | null> {
  const [row] = await on.select().from(lessonProgress).where(isThisLesson(which))
  return row ?? null
}

/** State and position of every lesson of a course that a person has begun. */
export async function listProgress(userId: number, courseId: number) {
  return db
    .select({
      lessonKey: lessonProgress.lessonKey,
      state: lessonProgress.state,
      positionMs: lessonProgress.positionMs,
      updatedAt: lessonProgress.updatedAt,
      doneAt: lessonProgress.doneAt,
    })
    .from(lessonProgress)
    .where(and(eq(lessonProgress.userId, userId), eq(lessonProgress.courseId, courseId)))
}

/** Adds an empty row unless another request did. */
export async function insertProgress(which: LessonOfPerson) {
  await db
    .insert(lessonProgress)
    .ignore()
    .values({ ...which, intervals: [] })
}

/** The row, held against every other device until the transaction ends. */
export async function lockProgress(which: LessonOfPerson, tx: Transaction): Promise<ProgressRow> {
  const [row] = await tx.select().from(lessonProgress).where(isThisLesson(which)).for('update')
  if (!row) throw new Error('progress was written before its row was made')
  return row
}

/** Writes some columns of a row. */
export async function updateProgress(id: number, values: Partial<ProgressRow>, tx: Transaction) {
  await tx.update(lessonProgress).set(values).where(eq(lessonProgress.id, id))
}

/** The length of a video in ms; 0 without one. */
export async function findDurationMs(videoId: number | null): Promise<number> {
  if (videoId === null) return 0
  const [row] = await db
    .select({ durationMs: videos.durationMs })
    .from(videos)
    .where(eq(videos.id, videoId))
  return row?.durationMs ?? 0
}
