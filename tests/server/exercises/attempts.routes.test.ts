import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { config } from '../../../server/config'
import { db } from '../../../server/db/client'
import {
  attempts,
  enrolments,
  lessonProgress,
  rateLimits,
  stopStates,
} from '../../../server/db/schema'
import { gradedAttemptSchema, stopStateSchema } from '../../../shared/contracts/exercises'
import { startTestApp, type TestApp } from '../../support/app'
import {
  createCalculatorExercise,
  createLesson,
  createRevision,
  createStage,
  createStop,
  createUser,
  issueRevision,
  slabDefinition,
} from '../../support/factories'
import { fieldsOf } from '../../support/problems'
import { answer, choice, createLearnerIn, createStopCourse, rightNumber, volume } from './stopScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('POST …/attempts', () => {
  it('names the slip, keeps the answer as typed and earns a hint', async () => {
    const { course, path, exerciseId } = await createStopCourse()
    const { learner, agent } = await createLearnerIn(app, course)
    const { body } = await answer(agent, path, volume('2,86')).expect(201)
    const { verdict, state } = gradedAttemptSchema.parse(body)
    expect(verdict).toMatchObject({ outcome: 'slip', slip: { id: 'thickness-in-centimetres' } })
    expect(state).toMatchObject({
      triesUsed: 1,
      solved: false,
      lastAnswer: { answer: '2,86' },
      shownAnswer: null,
    })
    expect(state.exercise).toMatchObject({ hints: ['All three sides in metres.'] })
    const rows = await db.select().from(attempts).where(eq(attempts.userId, learner.id))
    expect(rows).toMatchObject([
      { exerciseId, tryNumber: 1, outcome: 'slip', slipId: 'thickness-in-centimetres' },
    ])
    expect(stopStateSchema.parse((await agent.get(path)).body)).toEqual(state)
  })

  it('never tells the answer before it is solved or the tries are used', async () => {
    const { course, path, lessonPath } = await createStopCourse({ tries: 2 })
    const { agent } = await createLearnerIn(app, course)
    const before = [
      await agent.get(lessonPath).expect(200),
      await agent.get(path).expect(200),
      await answer(agent, path, volume('0.5')).expect(201),
      await agent.get(path).expect(200),
      await agent.get(`/api/courses/${course.slug}`).expect(200),
      await agent.get(`/api/courses/${course.slug}/build`).expect(200),
    ]
    for (const { text, headers } of before) {
      expect(text).not.toContain(rightNumber)
      expect(JSON.stringify(headers)).not.toContain(rightNumber)
    }
    const last = await answer(agent, path, volume('0.6')).expect(201)
    expect(last.body.state).toMatchObject({ triesUsed: 2, solved: false })
    expect(last.body.state.shownAnswer.metric).toContain(rightNumber)
    expect((await agent.get(path)).body.shownAnswer.metric).toContain(rightNumber)
  })

  it('never tells the right choice of a quiz, nor why, before it is solved', async () => {
    const { course, path } = await createStopCourse({ quiz: true })
    const { agent } = await createLearnerIn(app, course)
    const state = await agent.get(path).expect(200)
    const wrong = await answer(agent, path, choice('dry')).expect(201)
    expect(state.text).not.toContain('right')
    for (const { text } of [state, wrong]) expect(text).not.toContain('It fills the form.')
    expect(wrong.body.verdict.questions['which-mix']).toMatchObject({
      right: false,
      feedback: { dry: 'It leaves holes.' },
      rightIds: [],
    })
    const right = await answer(agent, path, choice('wet')).expect(201)
    expect(right.body.state.solved).toBe(true)
  })

  it('solves the stop for good and on every device', async () => {
    const { course, path, lessonPath } = await createStopCourse()
    const { learner, agent } = await createLearnerIn(app, course)
    const { body } = await answer(agent, path, volume('0.286 m³')).expect(201)
    expect(body).toMatchObject({ verdict: { right: true }, state: { solved: true, triesUsed: 1 } })
    const other = await app.asUser(learner)
    const later = await answer(other, path, volume('7')).expect(201)
    expect(later.body).toMatchObject({
      verdict: { right: false },
      state: { solved: true, triesUsed: 1 },
    })
    expect((await other.get(lessonPath)).body.stops[0].isSolved).toBe(true)
  })

  it('stays solved where a later revision has the stop again', async () => {
    const { course, path, stopKey, lessonPath } = await createStopCourse()
    const { learner, agent } = await createLearnerIn(app, course)
    await answer(agent, path, volume('0.286')).expect(201)
    const revisionId = await createRevision(course.id, { number: 1 })
    const lesson = await createLesson(await createStage(revisionId), { key: course.lesson.key })
    const stop = await createStop(lesson.id, { key: stopKey, name: 'Anew', atMs: 9000 })
    await createCalculatorExercise(stop.id, { definition: slabDefinition })
    await issueRevision(revisionId)
    await db.update(enrolments).set({ revisionId }).where(eq(enrolments.userId, learner.id))
    expect((await agent.get(lessonPath)).body.stops).toMatchObject([
      { name: 'Anew', isSolved: true },
    ])
    expect((await agent.get(path)).body.solved).toBe(true)
  })

  it('lets an answer that cannot be read cost no try', async () => {
    const { course, path } = await createStopCourse()
    const { agent } = await createLearnerIn(app, course)
    const { body } = await answer(agent, path, volume('a lot')).expect(201)
    expect(body).toMatchObject({
      verdict: { outcome: 'unread', field: 'answer' },
      state: { triesUsed: 0 },
    })
    expect((await agent.get(path)).body).toMatchObject({
      triesUsed: 0,
      lastAnswer: { answer: 'a lot' },
    })
  })

  it('15.4.2 counts twenty wrong answers that come at once as twenty tries', async () => {
    const { course, path } = await createStopCourse({ tries: null })
    const { learner, agent } = await createLearnerIn(app, course)
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, n) => answer(agent, path, volume(`${n + 3}`))),
    )
    expect(answers.map(({ status }) => status)).toEqual(Array(20).fill(201))
    expect((await agent.get(path)).body.triesUsed).toBe(20)
    const rows = await db.select().from(attempts).where(eq(attempts.userId, learner.id))
    expect(rows.map(({ tryNumber }) => tryNumber).sort((a, b) => a - b)).toEqual(
      Array.from({ length: 20 }, (_, n) => n + 1),
    )
  })

  it('does once what is sent twenty times with one key', async () => {
    const { course, path } = await createStopCourse()
    const { learner, agent } = await createLearnerIn(app, course)
    const key = randomUUID()
    const answers = await Promise.all(
      Array.from({ length: 20 }, () => answer(agent, path, volume('0.5'), key)),
    )
    expect(answers.map(({ status }) => status)).toEqual(Array(20).fill(201))
    expect(new Set(answers.map(({ text }) => text)).size).toBe(1)
    expect(await db.select().from(attempts).where(eq(attempts.userId, learner.id))).toHaveLength(1)
    await answer(agent, path, volume('0.7'), key).expect(422)
  })

  it('finishes the lesson with the last required stop', async () => {
    const { course, path, lessonPath } = await createStopCourse()
    const { learner, agent } = await createLearnerIn(app, course)
    const report = { intervals: [[0, 95_000]], positionMs: 95_000 }
    const watched = await agent.post(`${lessonPath}/progress`).send(report).expect(200)
    expect(watched.body.state).toBe('under-way')
    await answer(agent, path, volume('0.286')).expect(201)
    const [row] = await db
      .select()
      .from(lessonProgress)
      .where(eq(lessonProgress.userId, learner.id))
    expect(row).toMatchObject({ state: 'done', watchedMs: 95_000, positionMs: 95_000 })
  })

  it('misses no lesson whose last stretch and last stop come at the same time', async () => {
    for (let n = 0; n < 8; n++) {
      const { course, path, lessonPath } = await createStopCourse()
      const { agent } = await createLearnerIn(app, course)
      await Promise.all([
        answer(agent, path, volume('0.286')).expect(201),
        agent
          .post(`${lessonPath}/progress`)
          .send({ intervals: [[0, 100_000]], positionMs: 0 })
          .expect(200),
      ])
      expect((await agent.get(lessonPath)).body.progress.state).toBe('done')
    }
  })

  it('keeps a visitor’s tries at a sample for their session, without a row', async () => {
    const { course, path, lessonPath, exerciseId } = await createStopCourse({
      isSample: true,
      tries: 2,
    })
    const visitor = app.asVisitor()
    const key = randomUUID()
    expect((await answer(visitor, path, volume('0.5'), key)).body.state.triesUsed).toBe(1)
    expect((await answer(visitor, path, volume('0.5'), key)).body.state.triesUsed).toBe(1)
    const wrong = await visitor.get(path)
    expect(wrong.body).toMatchObject({ triesUsed: 1, shownAnswer: null })
    expect(wrong.text).not.toContain(rightNumber)
    await answer(visitor, path, volume('0.286')).expect(201)
    expect((await visitor.get(path)).body).toMatchObject({ solved: true, triesUsed: 2 })
    expect((await visitor.get(lessonPath)).body.stops[0].isSolved).toBe(true)
    expect((await app.asVisitor().get(path)).body).toMatchObject({ solved: false, triesUsed: 0 })
    expect(await db.select().from(attempts).where(eq(attempts.exerciseId, exerciseId))).toEqual([])
    expect(await db.select().from(stopStates).where(eq(stopStates.courseId, course.id))).toEqual([])
  })

  it('refuses what it cannot take', async () => {
    const { course, path } = await createStopCourse()
    const { learner, agent } = await createLearnerIn(app, course)
    const noKey = await agent.post(`${path}/attempts`).send(volume('1')).expect(400)
    expect(fieldsOf(noKey.body)).toEqual(['Idempotency-Key'])
    const otherKind = await answer(agent, path, choice('wet')).expect(400)
    expect(fieldsOf(otherKind.body)).toEqual(['kind'])
    await agent.post(`${path}/attempts`).set('Idempotency-Key', randomUUID()).send({}).expect(400)
    await answer(agent, `${path}-gone`, volume('1')).expect(404)
    await answer(app.asVisitor(), path, volume('1')).expect(401)
    await answer(await app.asUser(await createUser()), path, volume('1')).expect(403)
    expect(await db.select().from(attempts).where(eq(attempts.userId, learner.id))).toEqual([])
  })

  it('takes thirty answers a minute and asks to wait after that', async () => {
    const { course, path } = await createStopCourse({ tries: null })
    const { learner, agent } = await createLearnerIn(app, course)
    await db.insert(rateLimits).values({
      key: `attempts:user-${learner.id}`,
      hits: 30 * config.rateLimitFactor - 1,
      resetsAt: new Date(Date.now() + 60_000),
    })
    await answer(agent, path, volume('5')).expect(201)
    const { body } = await answer(agent, path, volume('5')).expect(429)
    expect(body.code).toBe('too-often')
    expect((await agent.get(path)).body.triesUsed).toBe(1)
  })
})
