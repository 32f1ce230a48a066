import { and, asc, eq, gt, inArray, lte, sql } from 'drizzle-orm'
import { db } from '../db/client'
import { courseRevisions, courses, enrolments } from '../db/schema'

interface RegisterFilter {
  afterSheet: number
  limit: number
  weekends: number | undefined
  cover: 'log-store' | 'deck' | 'picket-fence' | undefined
}

/** Issued courses with their newest issued revision, in the order of their sheet numbers. */
export async function listIssuedCourses({ afterSheet, limit, weekends, cover }: RegisterFilter) {
  const newest = sql`(select max(newer.number) from ${courseRevisions} newer
    where newer.course_id = ${courses.id} and newer.issued_at is not null)`
  return db
    .select({ course: courses, revision: courseRevisions })
    .from(courses)
    .innerJoin(
      courseRevisions,
      and(eq(courseRevisions.courseId, courses.id), eq(courseRevisions.number, newest)),
    )
    .where(
      and(
        eq(courses.state, 'issued'),
        gt(courses.sheetNumber, afterSheet),
        weekends === undefined ? undefined : lte(courseRevisions.weekends, weekends),
        cover === undefined ? undefined : eq(courseRevisions.coverDrawing, cover),
      ),
    )
    .orderBy(asc(courses.sheetNumber))
    .limit(limit)
}

/** Which of these courses a person is enrolled in. */
export async function listEnrolledIds(userId: number, courseIds: number[]): Promise<Set<number>> {
  if (courseIds.length === 0) return new Set()
  const rows = await db
    .select({ courseId: enrolments.courseId })
    .from(enrolments)
    .where(and(eq(enrolments.userId, userId), inArray(enrolments.courseId, courseIds)))
  return new Set(rows.map((row) => row.courseId))
}
