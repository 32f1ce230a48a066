import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { answers, courses, fenceRooms, questions } from '../../../server/db/schema'
import { startTestApp, type TestApp } from '../../support/app'
import { createCourse, createUser, issueRevision } from '../../support/factories'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

/** A draft whose staff have asked, answered and settled a question among themselves. */
async function createDraftWithSettledQuestion() {
  const course = await createCourse()
  const insert = async (
    table: typeof fenceRooms | typeof questions | typeof answers,
    row: object,
  ) => {
    const [made] = await db
      .insert(table)
      .values(row as never)
      .$returningId()
    return made?.id ?? 0
  }
  const roomId = await insert(fenceRooms, { courseId: course.id, lessonKey: 'set-the-string' })
  const text = { markdown: '', html: '' }
  const questionId = await insert(questions, { roomId, title: 'How wet?', ...text })
  const settledAnswerId = await insert(answers, { questionId, ...text })
  await db
    .update(questions)
    .set({ state: 'settled', settledAnswerId })
    .where(eq(questions.id, questionId))
  return course
}

describe('deleting a draft', () => {
  it('takes settled questions along, for its owner and for an admin', async () => {
    for (const role of ['owner', 'admin']) {
      const course = await createDraftWithSettledQuestion()
      const id = role === 'owner' ? course.ownerId : (await createUser({ role: 'admin' })).id
      const agent = await app.asUser({ id })
      await agent.delete(`/api/bench/courses/${course.id}`).expect(204)
      expect(await db.select().from(courses).where(eq(courses.id, course.id))).toEqual([])
    }
    expect(await db.select().from(answers)).toEqual([])
  })

  it('is refused once it is issued, to an admin too, and its settled question stays', async () => {
    const course = await createDraftWithSettledQuestion()
    await issueRevision(course.revisionId)
    const agent = await app.asUser(await createUser({ role: 'admin' }))
    await agent.delete(`/api/bench/courses/${course.id}`).expect(409)
    const rows = await db.select().from(questions).where(eq(questions.state, 'settled'))
    expect(rows).toHaveLength(1)
  })
})
