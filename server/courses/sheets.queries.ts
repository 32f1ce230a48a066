import { asc, count, eq, inArray, isNotNull, and } from 'drizzle-orm'
import { db } from '../db/client'
import { courseRevisions, courseStaff, lessons, stages, stops, users, videos } from '../db/schema'

/** The stages of a revision in order. */
export async function listStages(revisionId: number) {
  return db
    .select({ id: stages.id, key: stages.key, kind: stages.kind, title: stages.title })
    .from(stages)
    .where(eq(stages.revisionId, revisionId))
    .orderBy(asc(stages.position))
}

/** The lessons of a revision in the order of each stage, with the length of their videos in ms. */
export async function listLessons(revisionId: number) {
  return db
    .select({
      id: lessons.id,
      stageId: lessons.stageId,
      key: lessons.key,
      title: lessons.title,
      summary: lessons.summary,
      hazards: lessons.hazards,
      isSample: lessons.isSample,
      durationMs: videos.durationMs,
    })
    .from(lessons)
    .leftJoin(videos, eq(videos.id, lessons.videoId))
    .where(eq(lessons.revisionId, revisionId))
    .orderBy(asc(lessons.position))
}

/** How many stops each lesson of a revision has, by the lesson's id. */
export async function countStops(revisionId: number): Promise<Map<number, number>> {
  const rows = await db
    .select({ lessonId: stops.lessonId, n: count() })
    .from(stops)
    .innerJoin(lessons, eq(lessons.id, stops.lessonId))
    .where(eq(lessons.revisionId, revisionId))
    .groupBy(stops.lessonId)
  return new Map(rows.map((row) => [row.lessonId, row.n]))
}

/** How many lessons each revision has, by its id. */
export async function countLessons(revisionIds: number[]): Promise<Map<number, number>> {
  if (revisionIds.length === 0) return new Map()
  const rows = await db
    .select({ revisionId: lessons.revisionId, n: count() })
    .from(lessons)
    .where(inArray(lessons.revisionId, revisionIds))
    .groupBy(lessons.revisionId)
  return new Map(rows.map((row) => [row.revisionId, row.n]))
}

/** The staff of courses, owners first. */
export async function listStaff(courseIds: number[]) {
  if (courseIds.length === 0) return []
  return db
    .select({
      courseId: courseStaff.courseId,
      role: courseStaff.role,
      name: users.displayName,
      about: users.about,
    })
    .from(courseStaff)
    .innerJoin(users, eq(users.id, courseStaff.userId))
    .where(inArray(courseStaff.courseId, courseIds))
    .orderBy(asc(courseStaff.role), asc(courseStaff.id))
}

/** All issued revisions of a course, oldest first. */
export async function listIssuedRevisions(courseId: number) {
  return db
    .select({
      number: courseRevisions.number,
      issuedAt: courseRevisions.issuedAt,
      changeNote: courseRevisions.changeNote,
    })
    .from(courseRevisions)
    .where(and(eq(courseRevisions.courseId, courseId), isNotNull(courseRevisions.issuedAt)))
    .orderBy(asc(courseRevisions.number))
}
