import { and, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm'
import { db, type Executor } from '../db/client'
import {
  captionTracks,
  courseRevisions,
  courseStaff,
  courses,
  enrolments,
  lessons,
  stages,
  stops,
  videos,
} from '../db/schema'

export type CourseRow = typeof courses.$inferSelect
export type RevisionRow = typeof courseRevisions.$inferSelect
export type LessonRow = typeof lessons.$inferSelect

/** The course with this slug or id, or null. */
export async function findCourse(
  which: { slug: string } | { id: number },
  on: Executor = db,
): Promise<CourseRow | null> {
  const condition = 'slug' in which ? eq(courses.slug, which.slug) : eq(courses.id, which.id)
  const [row] = await on.select().from(courses).where(condition)
  return row ?? null
}

/** A person's place on a course's staff, and the revision they are enrolled with. */
export async function findTies(courseId: number, userId: number) {
  const [staff] = await db
    .select({ role: courseStaff.role })
    .from(courseStaff)
    .where(and(eq(courseStaff.courseId, courseId), eq(courseStaff.userId, userId)))
  const [enrolment] = await db
    .select({ id: enrolments.id, revisionId: enrolments.revisionId })
    .from(enrolments)
    .where(and(eq(enrolments.courseId, courseId), eq(enrolments.userId, userId)))
  return { staffRole: staff?.role ?? null, enrolment: enrolment ?? null }
}

/** The newest issued revision of a course, or null. */
export async function findIssuedRevision(courseId: number): Promise<RevisionRow | null> {
  const [row] = await db
    .select()
    .from(courseRevisions)
    .where(and(eq(courseRevisions.courseId, courseId), isNotNull(courseRevisions.issuedAt)))
    .orderBy(desc(courseRevisions.number))
    .limit(1)
  return row ?? null
}

/** The draft of a course, or null when everything is issued. */
export async function findDraftRevision(
  courseId: number,
  on: Executor = db,
): Promise<RevisionRow | null> {
  const [row] = await on
    .select()
    .from(courseRevisions)
    .where(and(eq(courseRevisions.courseId, courseId), isNull(courseRevisions.issuedAt)))
  return row ?? null
}

/** One revision, or null. */
export async function findRevision(id: number, on: Executor = db): Promise<RevisionRow | null> {
  const [row] = await on.select().from(courseRevisions).where(eq(courseRevisions.id, id))
  return row ?? null
}

/** The lesson with this key in a revision, or null. */
export async function findLessonByKey(revisionId: number, key: string): Promise<LessonRow | null> {
  const [row] = await db
    .select()
    .from(lessons)
    .where(and(eq(lessons.revisionId, revisionId), eq(lessons.key, key)))
  return row ?? null
}

const revisionOfRow = { revisionId: courseRevisions.id, courseId: courseRevisions.courseId }

/** The revision and course that a row of a revision belongs to, or null. */
export async function findOwnerOf(
  thing: { stageId: number } | { lessonId: number } | { stopId: number } | { trackId: number },
): Promise<{ revisionId: number; courseId: number } | null> {
  if ('stageId' in thing) {
    const [row] = await db
      .select(revisionOfRow)
      .from(stages)
      .innerJoin(courseRevisions, eq(courseRevisions.id, stages.revisionId))
      .where(eq(stages.id, thing.stageId))
    return row ?? null
  }
  if ('trackId' in thing) {
    const [row] = await db
      .select({ revisionId: sql<number>`0`, courseId: videos.courseId })
      .from(captionTracks)
      .innerJoin(videos, eq(videos.id, captionTracks.videoId))
      .where(eq(captionTracks.id, thing.trackId))
    return row ?? null
  }
  const base = db
    .select(revisionOfRow)
    .from(lessons)
    .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
  const [row] =
    'lessonId' in thing
      ? await base.where(eq(lessons.id, thing.lessonId))
      : await base
          .innerJoin(stops, eq(stops.lessonId, lessons.id))
          .where(eq(stops.id, thing.stopId))
  return row ?? null
}
