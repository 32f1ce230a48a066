import { and, eq, inArray, or } from 'drizzle-orm'
import type { Transaction } from '../client'
import {
  attempts,
  courseRevisions,
  courses,
  courseStaff,
  enrolments,
  exercises,
  fenceRooms,
  lessons,
  questions,
  stops,
  users,
} from '../schema'
import { people } from './people'

/**
 * Takes away the people of the demo and the courses they own, with all that others wrote, watched
 * and answered in these courses; everything else stays.
 */
export async function wipeDemo(slugs: string[], tx: Transaction) {
  const emails = Object.values(people).map(({ email }) => email)
  const persons = await tx.select({ id: users.id }).from(users).where(inArray(users.email, emails))
  const personIds = [0, ...persons.map(({ id }) => id)]
  const owned = await tx
    .selectDistinct({ id: courses.id })
    .from(courses)
    .leftJoin(courseStaff, and(eq(courseStaff.courseId, courses.id), eq(courseStaff.role, 'owner')))
    .where(or(inArray(courses.slug, slugs), inArray(courseStaff.userId, personIds)))
  const courseIds = [0, ...owned.map(({ id }) => id)]
  const exerciseIds = tx
    .select({ id: exercises.id })
    .from(exercises)
    .innerJoin(stops, eq(stops.id, exercises.stopId))
    .innerJoin(lessons, eq(lessons.id, stops.lessonId))
    .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
    .where(inArray(courseRevisions.courseId, courseIds))
  const roomIds = tx
    .select({ id: fenceRooms.id })
    .from(fenceRooms)
    .where(inArray(fenceRooms.courseId, courseIds))

  // What would otherwise hold a course or a question back; the rest goes with its course.
  await tx.delete(attempts).where(inArray(attempts.exerciseId, exerciseIds))
  await tx.delete(enrolments).where(inArray(enrolments.courseId, courseIds))
  await tx
    .update(questions)
    .set({ state: 'open', settledAnswerId: null, settledById: null })
    .where(inArray(questions.roomId, roomIds))
  await tx.delete(courses).where(inArray(courses.id, courseIds))
  await tx.delete(users).where(inArray(users.id, personIds))
}
