import { eq, sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import {
  courseRevisions,
  courses,
  exercises,
  kitItems,
  lessons,
  quizQuestions,
  stages,
  stops,
} from '../../../server/db/schema'
import { errorNumber } from '../../../server/db/transaction'
import { benchCourseSchema } from '../../../shared/contracts/benchCourses'
import { startTestApp, type TestApp } from '../../support/app'
import { addHelper, createInstructor, createUser } from '../../support/factories'
import { setUpWholeCourse } from './benchScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const setUpWhole = () => setUpWholeCourse(app)

describe('POST bench/courses/:courseId/issue', () => {
  it('issues a course without snags, and freezes it', async () => {
    const { owner, agent, course, path } = await setUpWhole()
    const answer = await agent.post(`${path}/issue`).send({ changeNote: 'The first.' }).expect(200)
    expect(benchCourseSchema.parse(answer.body)).toMatchObject({
      state: 'issued',
      revision: 'A',
      isIssued: true,
      changeNote: 'The first.',
      can: { edit: false, issue: false, writeCalculators: true },
    })
    const [row] = await db
      .select()
      .from(courseRevisions)
      .where(eq(courseRevisions.id, course.revisionId))
    expect(row).toMatchObject({ issuedById: owner.id, changeNote: 'The first.' })
    expect(row!.issuedAt).not.toBeNull()
  })

  it('answers the snags while one of them is a must, and issues nothing', async () => {
    const { agent, course, path, lesson } = await setUpWhole()
    await db.update(lessons).set({ videoId: null }).where(eq(lessons.id, lesson.id))
    await db.execute(sql`delete from videos where course_id = ${course.id}`)
    const answer = await agent.post(`${path}/issue`).send({ changeNote: '' }).expect(409)
    expect(answer.body.code).toBe('snags')
    expect(answer.body.current).toContainEqual(
      expect.objectContaining({
        weight: 'must',
        code: 'no-video',
        place: { kind: 'lesson', lessonId: lesson.id, stopId: null },
      }),
    )
    const [row] = await db.select().from(courses).where(eq(courses.id, course.id))
    expect(row!.state).toBe('draft')
  })

  it('issues once when asked twice at the same time', async () => {
    const { agent, path } = await setUpWhole()
    const answers = await Promise.all(
      [1, 2].map(() => agent.post(`${path}/issue`).send({ changeNote: '' })),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
  })

  it('lets nobody but the owner issue', async () => {
    const { course, path } = await setUpWhole()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    const body = { changeNote: '' }
    await app.asVisitor().post(`${path}/issue`).send(body).expect(401)
    await (await app.asUser(helper)).post(`${path}/issue`).send(body).expect(403)
    await (await app.asUser(await createUser())).post(`${path}/issue`).send(body).expect(403)
    const admin = await app.asUser(await createUser({ role: 'admin' }))
    await admin.post(`${path}/issue`).send(body).expect(200)
  })

  it('answers every later write with 409, and the database refuses even a direct one', async () => {
    const { agent, course, path, stage, lesson, stop, quiz, kit } = await setUpWhole()
    await agent.post(`${path}/issue`).send({ changeNote: '' }).expect(200)
    const writes = [
      agent.patch(path).send({ version: 1, title: 'x' }),
      agent.delete(path),
      agent.post(`${path}/issue`).send({ changeNote: '' }),
      agent.post(`${path}/stages`).send({ kind: 'roof', title: 'Roof' }),
      agent.put(`${path}/order`).send({ stages: [{ id: stage.id, lessonIds: [lesson.id] }] }),
      agent.patch(`/api/bench/stages/${stage.id}`).send({ title: 'x' }),
      agent.delete(`/api/bench/stages/${stage.id}`),
      agent.post(`/api/bench/stages/${stage.id}/lessons`).send({ title: 'x' }),
      agent.patch(`/api/bench/lessons/${lesson.id}`).send({ version: 1, title: 'x' }),
      agent.delete(`/api/bench/lessons/${lesson.id}`),
      agent
        .post(`/api/bench/lessons/${lesson.id}/stops`)
        .send({ name: 'x', atMs: 1, isRequired: true }),
      agent.patch(`/api/bench/stops/${stop.id}`).send({ version: 1, name: 'x' }),
      agent.delete(`/api/bench/stops/${stop.id}`),
    ]
    for (const write of writes) {
      const answer = await write
      expect([answer.status, answer.body.code]).toEqual([409, 'issued'])
    }
    const direct = [
      () =>
        db
          .update(courseRevisions)
          .set({ title: 'x' })
          .where(eq(courseRevisions.id, course.revisionId)),
      () => db.update(stages).set({ title: 'x' }).where(eq(stages.id, stage.id)),
      () => db.update(lessons).set({ title: 'x' }).where(eq(lessons.id, lesson.id)),
      () => db.update(kitItems).set({ title: 'x' }).where(eq(kitItems.id, kit.id)),
      () => db.update(stops).set({ name: 'x' }).where(eq(stops.id, stop.id)),
      () => db.update(exercises).set({ prompt: 'x' }).where(eq(exercises.id, quiz.id)),
      () =>
        db.update(quizQuestions).set({ prompt: 'x' }).where(eq(quizQuestions.exerciseId, quiz.id)),
      () => db.delete(lessons).where(eq(lessons.id, lesson.id)),
    ]
    for (const write of direct) {
      const refusal = await write().then(() => null, errorNumber)
      expect(refusal).toBe(1644)
    }
  })
})
