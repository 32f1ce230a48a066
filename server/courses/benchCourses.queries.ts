import { and, desc, eq, inArray, isNotNull, like, lt, max, sql } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import {
  courseRevisions,
  courses,
  courseStaff,
  enrolments,
  fenceRooms,
  lessons,
  questions,
  users,
} from '../db/schema'
import type { RevisionRow } from './access.queries'

type NewRevision = Omit<typeof courseRevisions.$inferInsert, 'id'>

/** The newest revision of a course, draft or issued; null when the course is gone. */
export async function findNewestRevision(
  courseId: number,
  on: Executor = db,
): Promise<RevisionRow | null> {
  const [row] = await on
    .select()
    .from(courseRevisions)
    .where(eq(courseRevisions.courseId, courseId))
    .orderBy(desc(courseRevisions.number))
    .limit(1)
  return row ?? null
}

/** A course's staff, owner first. */
export const listBenchStaff = (courseId: number, on: Executor = db) =>
  on
    .select({ name: users.displayName, role: courseStaff.role })
    .from(courseStaff)
    .innerJoin(users, eq(users.id, courseStaff.userId))
    .where(eq(courseStaff.courseId, courseId))
    .orderBy(courseStaff.role, courseStaff.id)

/**
 * The number after the highest sheet in the register. The first course stands for the whole register:
 * whoever asks next waits for it until this transaction has ended, so that no two get the same.
 */
export async function takeSheetNumber(tx: Transaction): Promise<number> {
  await tx.select({ id: courses.id }).from(courses).orderBy(courses.id).limit(1).for('update')
  const [row] = await tx.select({ last: max(courses.sheetNumber) }).from(courses)
  return (row?.last ?? 0) + 1
}

/** Slugs that begin like this one. */
export async function listSlugsLike(slug: string, tx: Transaction): Promise<string[]> {
  const rows = await tx
    .select({ slug: courses.slug })
    .from(courses)
    .where(like(courses.slug, `${slug}%`))
  return rows.map((row) => row.slug)
}

/** Adds a course with its owner and an empty draft; returns both ids. */
export async function insertCourse(
  course: { slug: string; sheetNumber: number; ownerId: number },
  revision: Omit<NewRevision, 'courseId' | 'number'>,
  tx: Transaction,
): Promise<{ courseId: number; revisionId: number }> {
  const { ownerId, ...values } = course
  const [row] = await tx.insert(courses).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  await tx.insert(courseStaff).values({ courseId: row.id, userId: ownerId, role: 'owner' })
  const [draft] = await tx
    .insert(courseRevisions)
    .values({ ...revision, courseId: row.id, number: 0 })
    .$returningId()
  if (!draft) throw new Error('insert returned no id')
  return { courseId: row.id, revisionId: draft.id }
}

/** Changes some columns of a draft. */
export async function updateRevision(id: number, values: Partial<NewRevision>, tx: Transaction) {
  await tx.update(courseRevisions).set(values).where(eq(courseRevisions.id, id))
}

/** Opens a course that was a draft until now. */
export async function openCourse(id: number, tx: Transaction) {
  await tx
    .update(courses)
    .set({ state: 'issued' })
    .where(and(eq(courses.id, id), eq(courses.state, 'draft')))
}

/** Removes a course with all that hangs on it; a settled question would hold on to its answer. */
export async function deleteCourse(id: number, tx: Transaction) {
  const rooms = tx.select({ id: fenceRooms.id }).from(fenceRooms).where(eq(fenceRooms.courseId, id))
  await tx
    .update(questions)
    .set({ state: 'open', settledAnswerId: null })
    .where(and(inArray(questions.roomId, rooms), isNotNull(questions.settledAnswerId)))
  await tx.delete(courses).where(eq(courses.id, id))
}

/** The courses on whose staff a person is, newest first, from below an id. */
export function listStaffedCourses(
  userId: number,
  { before, limit }: { before: number | null; limit: number },
) {
  const newest = db
    .select({
      courseId: courseRevisions.courseId,
      number: max(courseRevisions.number).as('newest_number'),
    })
    .from(courseRevisions)
    .groupBy(courseRevisions.courseId)
    .as('newest')
  return db
    .select({
      course: courses,
      revision: courseRevisions,
      role: courseStaff.role,
      lessons: db.$count(lessons, eq(lessons.revisionId, courseRevisions.id)),
      learners: db.$count(enrolments, eq(enrolments.courseId, courses.id)),
      openQuestions: sql<number>`(
        select count(*) from ${questions}
        join ${fenceRooms} on ${fenceRooms.id} = ${questions.roomId}
        where ${fenceRooms.courseId} = ${courses.id} and ${questions.state} = 'open'
          and ${questions.deletedAt} is null)`.mapWith(Number),
    })
    .from(courseStaff)
    .innerJoin(courses, eq(courses.id, courseStaff.courseId))
    .innerJoin(newest, eq(newest.courseId, courses.id))
    .innerJoin(
      courseRevisions,
      and(eq(courseRevisions.courseId, courses.id), eq(courseRevisions.number, newest.number)),
    )
    .where(
      and(eq(courseStaff.userId, userId), before === null ? undefined : lt(courses.id, before)),
    )
    .orderBy(desc(courses.id))
    .limit(limit)
}
