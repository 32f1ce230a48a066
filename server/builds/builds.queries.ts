import { and, count, desc, eq, inArray, lt, sql } from 'drizzle-orm'
import { db, type Transaction } from '../db/client'
import {
  attempts,
  builds,
  courseRevisions,
  courses,
  enrolments,
  exercises,
  lessonProgress,
  lessons,
  stops,
} from '../db/schema'

/** Adds the build of an enrolment. */
export async function insertBuild(values: typeof builds.$inferInsert, tx: Transaction) {
  await tx.insert(builds).values(values)
}

/** The build of an enrolment, or null. */
export async function findBuild(enrolmentId: number) {
  const [row] = await db.select().from(builds).where(eq(builds.enrolmentId, enrolmentId))
  return row ?? null
}

/** A person's builds, the newest first, each with the lessons of its revision and how many are done. */
export async function listBuilds(userId: number, beforeId: number | null, limit: number) {
  return db
    .select({
      id: builds.id,
      name: builds.name,
      courseId: courses.id,
      courseSlug: courses.slug,
      revisionId: enrolments.revisionId,
      courseTitle: courseRevisions.title,
      coverDrawing: courseRevisions.coverDrawing,
    })
    .from(builds)
    .innerJoin(enrolments, eq(enrolments.id, builds.enrolmentId))
    .innerJoin(courses, eq(courses.id, enrolments.courseId))
    .innerJoin(courseRevisions, eq(courseRevisions.id, enrolments.revisionId))
    .where(
      and(eq(enrolments.userId, userId), beforeId === null ? undefined : lt(builds.id, beforeId)),
    )
    .orderBy(desc(builds.id))
    .limit(limit)
}

/** Of each revision: its lessons in all, and those the person has done. */
export async function countLessonsDone(userId: number, revisionIds: number[]) {
  if (revisionIds.length === 0) return []
  return db
    .select({
      revisionId: lessons.revisionId,
      inAll: count(),
      done: sql<number>`count(case when ${lessonProgress.state} = 'done' then 1 end)`.mapWith(
        Number,
      ),
    })
    .from(lessons)
    .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
    .leftJoin(
      lessonProgress,
      and(
        eq(lessonProgress.userId, userId),
        eq(lessonProgress.courseId, courseRevisions.courseId),
        eq(lessonProgress.lessonKey, lessons.key),
      ),
    )
    .where(inArray(lessons.revisionId, revisionIds))
    .groupBy(lessons.revisionId)
}

/** The stops a person got right last in a course, the newest first. */
export async function listRightAnswers(userId: number, courseId: number, limit: number) {
  return db
    .select({ at: attempts.createdAt, stopName: stops.name, lessonKey: lessons.key })
    .from(attempts)
    .innerJoin(exercises, eq(exercises.id, attempts.exerciseId))
    .innerJoin(stops, eq(stops.id, exercises.stopId))
    .innerJoin(lessons, eq(lessons.id, stops.lessonId))
    .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
    .where(
      and(
        eq(attempts.userId, userId),
        eq(attempts.outcome, 'right'),
        eq(courseRevisions.courseId, courseId),
      ),
    )
    .orderBy(desc(attempts.id))
    .limit(limit)
}
