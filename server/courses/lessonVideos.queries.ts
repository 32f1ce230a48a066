import { and, eq, isNotNull, isNull, lt, or, sql } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { courseRevisions, lessons } from '../db/schema'
import type { LessonRow } from './access.queries'

/** The lesson with this key in a course's draft, or null. */
export async function findDraftLesson(
  courseId: number,
  key: string,
  on: Executor = db,
): Promise<LessonRow | null> {
  const [row] = await on
    .select({ lesson: lessons })
    .from(lessons)
    .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
    .where(
      and(
        eq(courseRevisions.courseId, courseId),
        isNull(courseRevisions.issuedAt),
        eq(lessons.key, key),
      ),
    )
  return row?.lesson ?? null
}

/** Lets a lesson show a video, unless it shows a newer one. */
export async function updateLessonVideo(id: number, videoId: number, tx: Transaction) {
  const isOlder = or(isNull(lessons.videoId), lt(lessons.videoId, videoId))
  await tx
    .update(lessons)
    .set({ videoId })
    .where(and(eq(lessons.id, id), isOlder))
}

/** The lessons of a revision that show a video. */
export const listLessonsShowing = (revisionId: number, videoId: number): Promise<LessonRow[]> =>
  db
    .select()
    .from(lessons)
    .where(and(eq(lessons.revisionId, revisionId), eq(lessons.videoId, videoId)))

/** True when a lesson of an issued revision shows this video. */
export async function isShownInIssue(videoId: number, on: Executor = db): Promise<boolean> {
  const [row] = await on
    .select({ one: sql<number>`1` })
    .from(lessons)
    .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
    .where(and(eq(lessons.videoId, videoId), isNotNull(courseRevisions.issuedAt)))
    .limit(1)
  return row !== undefined
}
