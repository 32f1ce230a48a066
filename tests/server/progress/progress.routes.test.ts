import { and, eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { builds, enrolments, kitTicks, lessonProgress, stopStates } from '../../../server/db/schema'
import { buildSchema } from '../../../shared/contracts/builds'
import {
  kitStateSchema,
  lessonProgressSchema,
  type Interval,
} from '../../../shared/contracts/progress'
import { startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  closeCourse,
  createCourse,
  createIssuedCourse,
  createKitItem,
  createLesson,
  createQuiz,
  createRevision,
  createStage,
  createStop,
  createUser,
  enrol,
  issueRevision,
  singleQuestion,
} from '../../support/factories'
import { fieldsOf } from '../../support/problems'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const lessonPath = (course: { slug: string; lesson: { key: string } }) =>
  `/api/courses/${course.slug}/lessons/${course.lesson.key}`

async function createLearnerIn(course: { id: number; revisionId: number }) {
  const learner = await createUser()
  await enrol(learner.id, course)
  return { learner, agent: await app.asUser(learner) }
}

describe('POST /api/courses/:slug/enrolments', () => {
  it('enrols once and answers a second time with the same build', async () => {
    const course = await createIssuedCourse()
    const learner = await createUser()
    const agent = await app.asUser(learner)
    const path = `/api/courses/${course.slug}/enrolments`
    const first = buildSchema.parse((await agent.post(path).expect(201)).body)
    expect(first).toMatchObject({ lessonsDone: 0, lessonsInAll: 1 })
    expect(first.next).toMatchObject({ lessonKey: course.lesson.key, positionMs: 0 })
    const second = buildSchema.parse((await agent.post(path).expect(200)).body)
    expect(second).toEqual(first)
    const rows = await db.select().from(enrolments).where(eq(enrolments.userId, learner.id))
    expect(rows.map(({ revisionId }) => revisionId)).toEqual([course.revisionId])
  })

  it('enrols once when twelve requests come at the same time', async () => {
    const course = await createIssuedCourse()
    const learner = await createUser()
    const agent = await app.asUser(learner)
    const path = `/api/courses/${course.slug}/enrolments`
    const answers = await Promise.all(Array.from({ length: 12 }, () => agent.post(path)))
    expect(answers.map(({ status }) => status).sort()).toEqual([...Array(11).fill(200), 201])
    expect(new Set(answers.map(({ text }) => text)).size).toBe(1)
    const rows = await db
      .select({ id: builds.id })
      .from(builds)
      .innerJoin(enrolments, eq(enrolments.id, builds.enrolmentId))
      .where(eq(enrolments.userId, learner.id))
    expect(rows).toHaveLength(1)
  })

  it('refuses visitors, staff, closed courses and courses with a price', async () => {
    const course = await createIssuedCourse()
    const path = `/api/courses/${course.slug}/enrolments`
    await app.asVisitor().post(path).expect(401)
    const helper = await createUser()
    await addHelper(course.id, helper.id)
    await (await app.asUser(helper)).post(path).expect(403)
    const agent = await app.asUser(await createUser())
    await closeCourse(course.id)
    expect((await agent.post(path).expect(409)).body.code).toBe('course-closed')
    const priced = await createIssuedCourse({ course: { priceCents: 100 } })
    const refusal = await agent.post(`/api/courses/${priced.slug}/enrolments`).expect(409)
    expect(refusal.body.code).toBe('course-has-a-price')
    const draft = await createCourse()
    await agent.post(`/api/courses/${draft.slug}/enrolments`).expect(404)
    expect(await db.select().from(enrolments).where(eq(enrolments.courseId, course.id))).toEqual([])
  })

  it('refuses a request from another site', async () => {
    const course = await createIssuedCourse()
    const agent = await app.asUser(await createUser())
    await agent
      .post(`/api/courses/${course.slug}/enrolments`)
      .set('Origin', 'https://elsewhere.example')
      .expect(403)
  })
})

describe('PUT …/kit-ticks', () => {
  async function createWithKit() {
    const keys = ['gloves', 'goggles', 'string-line']
    const course = await createIssuedCourse({
      furnish: async (lesson) => {
        for (const key of keys) await createKitItem(lesson.id, { key })
      },
    })
    return { course, keys, path: `${lessonPath(course)}/kit-ticks` }
  }

  it('keeps ticks, takes none away and is complete with the last', async () => {
    const { course, path } = await createWithKit()
    const { agent } = await createLearnerIn(course)
    const tick = async (ticked: string[]) =>
      kitStateSchema.parse((await agent.put(path).send({ ticked }).expect(200)).body)
    expect(await tick(['goggles'])).toEqual({ ticked: ['goggles'], isComplete: false })
    expect(await tick(['gloves'])).toEqual({ ticked: ['gloves', 'goggles'], isComplete: false })
    expect(await tick([])).toEqual({ ticked: ['gloves', 'goggles'], isComplete: false })
    expect(await tick(['string-line', 'gloves'])).toMatchObject({ isComplete: true })
  })

  it('keeps each tick once when devices send them together', async () => {
    const { course, keys, path } = await createWithKit()
    const { learner, agent } = await createLearnerIn(course)
    await Promise.all(
      Array.from({ length: 10 }, () => agent.put(path).send({ ticked: keys }).expect(200)),
    )
    const rows = await db.select().from(kitTicks).where(eq(kitTicks.userId, learner.id))
    expect(rows).toHaveLength(keys.length)
  })

  it('asks again in a new revision', async () => {
    const { course, keys, path } = await createWithKit()
    const { learner, agent } = await createLearnerIn(course)
    await agent.put(path).send({ ticked: keys }).expect(200)
    const revisionId = await createRevision(course.id, { number: 1 })
    const stage = await createStage(revisionId)
    const lesson = await createLesson(stage, { key: course.lesson.key })
    await createKitItem(lesson.id, { key: 'gloves' })
    await issueRevision(revisionId)
    await db.update(enrolments).set({ revisionId }).where(eq(enrolments.userId, learner.id))
    const { body } = await agent.get(lessonPath(course)).expect(200)
    expect(body.kitState).toEqual({ ticked: [], isComplete: false })
  })

  it('refuses what it cannot take and whoever it does not belong to', async () => {
    const { course, path } = await createWithKit()
    const { agent } = await createLearnerIn(course)
    const unknown = await agent
      .put(path)
      .send({ ticked: ['gloves', 'helmet'] })
      .expect(400)
    expect(unknown.body.errors).toMatchObject([{ field: 'ticked.1' }])
    await agent.put(path).send({ ticked: 'gloves' }).expect(400)
    await app.asVisitor().put(path).send({ ticked: [] }).expect(401)
    await (await app.asUser(await createUser())).put(path).send({ ticked: [] }).expect(403)
    await agent.put(path.replace(course.lesson.key, 'nowhere')).send({ ticked: [] }).expect(404)
  })
})

describe('POST …/progress', () => {
  const report = (intervals: Interval[], positionMs = 0) => ({ intervals, positionMs })

  it('adds stretches to those of before and keeps the position', async () => {
    const course = await createIssuedCourse()
    const { learner, agent } = await createLearnerIn(course)
    const path = `${lessonPath(course)}/progress`
    await agent
      .post(path)
      .send(report([[0, 10_000]], 10_000))
      .expect(200)
    const { body } = await agent.post(path).send(
      report(
        [
          [5_000, 20_000],
          [50_000, 60_000],
        ],
        60_000,
      ),
    )
    const expected = {
      intervals: [
        [0, 20_000],
        [50_000, 60_000],
      ],
      watchedMs: 30_000,
      positionMs: 60_000,
      state: 'under-way',
    }
    expect(lessonProgressSchema.parse(body)).toEqual(expected)
    expect((await agent.get(lessonPath(course))).body.progress).toEqual(expected)
    const rows = await db.select().from(lessonProgress).where(eq(lessonProgress.userId, learner.id))
    expect(rows).toHaveLength(1)
  })

  it('loses nothing of fifty reports that come at once from two devices', async () => {
    const course = await createIssuedCourse()
    const { learner, agent } = await createLearnerIn(course)
    const other = await app.asUser(learner)
    const path = `${lessonPath(course)}/progress`
    const answers = await Promise.all(
      Array.from({ length: 50 }, (_, n) =>
        (n % 2 ? agent : other).post(path).send(report([[n * 2000, n * 2000 + 1000]], n)),
      ),
    )
    expect(answers.map(({ status }) => status)).toEqual(Array(50).fill(200))
    const { body } = await agent.get(lessonPath(course))
    expect(body.progress.watchedMs).toBe(50_000)
    expect(body.progress.intervals).toEqual(
      Array.from({ length: 50 }, (_, n) => [n * 2000, n * 2000 + 1000]),
    )
  })

  it('counts nothing beyond the end, nothing twice and nothing for a jump', async () => {
    const course = await createIssuedCourse({ durationMs: 40_000 })
    const { agent } = await createLearnerIn(course)
    const path = `${lessonPath(course)}/progress`
    await agent.post(path).send(report([], 39_000)).expect(200)
    const jumped = await agent.post(path).send(report([[39_000, 90_000]], 90_000))
    expect(jumped.body).toEqual({
      intervals: [[39_000, 40_000]],
      watchedMs: 1000,
      positionMs: 40_000,
      state: 'under-way',
    })
    const again = await agent.post(path).send(report([[39_000, 40_000]], 0))
    expect(again.body.watchedMs).toBe(1000)
  })

  it.each([
    [89_999, 'under-way'],
    [90_000, 'done'],
  ])('after %i of 100 000 ms a lesson without stops is %s', async (watchedMs, state) => {
    const course = await createIssuedCourse()
    const { agent } = await createLearnerIn(course)
    const { body } = await agent
      .post(`${lessonPath(course)}/progress`)
      .send(report([[0, watchedMs]], watchedMs))
    expect(body.state).toBe(state)
  })

  it('is done only with every required stop, and stays done', async () => {
    let stopKey = ''
    const course = await createIssuedCourse({
      furnish: async (lesson) => {
        const stop = await createStop(lesson.id, { atMs: 1000 })
        const byTheWay = await createStop(lesson.id, { atMs: 2000, isRequired: false })
        await createQuiz(stop.id, { questions: [singleQuestion()] })
        await createQuiz(byTheWay.id, { questions: [singleQuestion()] })
        stopKey = stop.key
      },
    })
    const { learner, agent } = await createLearnerIn(course)
    const path = `${lessonPath(course)}/progress`
    const watched = await agent.post(path).send(report([[0, 100_000]], 100_000))
    expect(watched.body.state).toBe('under-way')
    await db.insert(stopStates).values({
      userId: learner.id,
      courseId: course.id,
      lessonKey: course.lesson.key,
      stopKey,
      seed: 1,
      solvedAt: new Date(),
    })
    expect((await agent.post(path).send(report([]))).body.state).toBe('done')
    await db.delete(stopStates).where(eq(stopStates.userId, learner.id))
    expect((await agent.post(path).send(report([], 500))).body).toMatchObject({
      state: 'done',
      positionMs: 500,
    })
    const [row] = await db
      .select()
      .from(lessonProgress)
      .where(and(eq(lessonProgress.userId, learner.id), eq(lessonProgress.state, 'done')))
    expect(row?.doneAt).toBeInstanceOf(Date)
  })

  it('takes a beacon: a body typed as JSON with the browser’s own origin headers', async () => {
    const course = await createIssuedCourse()
    const { agent } = await createLearnerIn(course)
    await agent
      .post(`${lessonPath(course)}/progress`)
      .set({ 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin' })
      .send(JSON.stringify(report([[0, 5000]], 5000)))
      .expect(200)
  })

  it.each([
    [{ intervals: [[10, 5]], positionMs: 0 }, 'intervals.0'],
    [{ intervals: [[-1, 5]], positionMs: 0 }, 'intervals.0.0'],
    [{ intervals: [[0, 5.5]], positionMs: 0 }, 'intervals.0.1'],
    [{ intervals: [[0]], positionMs: 0 }, 'intervals.0'],
    [{ intervals: [], positionMs: -1 }, 'positionMs'],
    [{ intervals: [] }, 'positionMs'],
    [{ intervals: Array(501).fill([0, 1]), positionMs: 0 }, 'intervals'],
  ])('refuses %j and names %s', async (body, field) => {
    const course = await createIssuedCourse()
    const { agent } = await createLearnerIn(course)
    const answer = await agent
      .post(`${lessonPath(course)}/progress`)
      .send(body)
      .expect(400)
    expect(fieldsOf(answer.body)).toContain(field)
    expect((await agent.get(lessonPath(course))).body.progress.state).toBe('not-started')
  })

  it('refuses visitors, people without a place and staff, and finds no lesson that is not there', async () => {
    const course = await createIssuedCourse({ isSample: true })
    const path = `${lessonPath(course)}/progress`
    await app.asVisitor().post(path).send(report([])).expect(401)
    await (await app.asUser(await createUser())).post(path).send(report([])).expect(403)
    await (await app.asUser({ id: course.ownerId })).post(path).send(report([])).expect(403)
    const { agent } = await createLearnerIn(course)
    await agent.post(path.replace(course.lesson.key, 'nowhere')).send(report([])).expect(404)
  })
})
