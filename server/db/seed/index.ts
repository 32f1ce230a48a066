import { inArray } from 'drizzle-orm'
import type { Database, Executor, Transaction } from '../client'
import { courses, users } from '../schema'
import { isDuplicate } from '../transaction'
import { compostBay } from './compostBay/course'
import { deck } from './deck/course'
import { enrolments } from './enrolments'
import { insertCourse, type InsertedCourse } from './insertCourse'
import { insertEnrolments } from './insertEnrolments'
import { insertFence } from './insertFence'
import { insertPeople } from './insertPeople'
import { logStore } from './logStore/course'
import { people } from './people'
import { picketFence } from './picketFence/course'
import { wipeDemo } from './wipe'

export { demoSignIns } from './people'

/** The courses of the demo; the last is still on the bench. */
export const demoCourses = [logStore, deck, picketFence, compostBay]

/** True when the database has neither people nor courses. */
export async function isEmpty(db: Executor): Promise<boolean> {
  const [person] = await db.select({ id: users.id }).from(users).limit(1)
  if (person) return false
  const [course] = await db.select({ id: courses.id }).from(courses).limit(1)
  return course === undefined
}

async function hasDemo(on: Executor): Promise<boolean> {
  const emails = Object.values(people).map(({ email }) => email)
  const found = await on
    .select({ id: users.id })
    .from(users)
    .where(inArray(users.email, emails))
    .limit(1)
  return found.length > 0
}

async function insertDemo(tx: Transaction) {
  const ids = await insertPeople(tx)
  const inserted = new Map<string, InsertedCourse>()
  for (const course of demoCourses) {
    const made = await insertCourse(course, ids, tx)
    inserted.set(course.slug, made)
  }
  await insertEnrolments(enrolments, inserted, ids, tx)
  for (const { slug, questions } of demoCourses) {
    const course = inserted.get(slug)
    if (course) await insertFence(questions, course, ids, tx)
  }
}

/**
 * Puts in the demo people and courses, in one transaction: a crash leaves nothing behind.
 * Does nothing where the demo is in already.
 */
export async function seedDatabase(db: Database): Promise<void> {
  try {
    await db.transaction(async (tx) => {
      if (!(await hasDemo(tx))) await insertDemo(tx)
    })
  } catch (error) {
    // Another process was faster.
    if (!isDuplicate(error) || !(await hasDemo(db))) throw error
  }
}

/** Takes the demo away with all that was done in it, and puts it in anew, in one transaction. */
export async function reseedDatabase(db: Database): Promise<void> {
  await db.transaction(async (tx) => {
    await wipeDemo(
      demoCourses.map(({ slug }) => slug),
      tx,
    )
    await insertDemo(tx)
  })
}
