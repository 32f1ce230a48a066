import type { Transaction } from '../client'
import {
  attempts,
  builds,
  enrolments,
  fieldBookEntries,
  kitTicks,
  lessonProgress,
  stopStates,
} from '../schema'
import type { InsertedCourse } from './insertCourse'
import { insertedId } from './insertedId'
import type { PersonIds } from './insertPeople'
import { people } from './people'
import { addWatched, type Learner, type ProgressRows } from './progressRows'
import type { EnrolmentSeed } from './shapes'

/** Enrols learners, starts their builds, and adds what they watched, ticked and answered. */
export async function insertEnrolments(
  seeds: EnrolmentSeed[],
  courses: Map<string, InsertedCourse>,
  ids: PersonIds,
  tx: Transaction,
) {
  const rows: ProgressRows = {
    kitTicks: [],
    attempts: [],
    stopStates: [],
    lessonProgress: [],
    fieldBookEntries: [],
  }
  for (const seed of seeds) {
    const course = courses.get(seed.course)
    if (!course) throw new Error(`the demo has no course ${seed.course}`)
    const learner = await insertEnrolment(seed, course, ids, tx)
    for (const watched of seed.lessons) {
      const lesson = course.lessons.get(watched.lesson)
      if (!lesson) throw new Error(`${course.slug} has no lesson ${watched.lesson}`)
      addWatched(rows, watched, lesson, learner)
    }
  }
  await tx.insert(kitTicks).values(rows.kitTicks)
  await tx.insert(attempts).values(inTime(rows.attempts))
  await tx.insert(stopStates).values(rows.stopStates)
  await tx.insert(lessonProgress).values(rows.lessonProgress)
  await tx.insert(fieldBookEntries).values(inTime(rows.fieldBookEntries))
}

/** Ids rise with time, as if it had been done live: lists are read by them. */
const inTime = <T extends { createdAt: Date }>(rows: T[]) =>
  rows.toSorted((a, b) => a.createdAt.getTime() - b.createdAt.getTime())

async function insertEnrolment(
  seed: EnrolmentSeed,
  course: InsertedCourse,
  ids: PersonIds,
  tx: Transaction,
): Promise<Learner> {
  const userId = ids[seed.learner]
  const createdAt = new Date(seed.on)
  const values = { userId, courseId: course.id, revisionId: course.revisionId, createdAt }
  const enrolmentId = await insertedId(tx.insert(enrolments).values(values).$returningId())
  const buildId = await insertedId(
    tx.insert(builds).values({ enrolmentId, name: seed.buildName, createdAt }).$returningId(),
  )
  const { units, email } = people[seed.learner]
  return { userId, units, name: `${email}/${course.slug}`, courseId: course.id, buildId }
}
