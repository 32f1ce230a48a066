import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { exercises, quizQuestions, stops } from '../../../server/db/schema'
import { benchStopSchema } from '../../../shared/contracts/benchCourses'
import type { Exercise } from '../../../shared/contracts/exercises'
import { startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  createCourse,
  createInstructor,
  createLesson,
  createStage,
  createStop,
  createUser,
  createVideo,
  singleQuestion,
} from '../../support/factories'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const fieldsOf = (body: unknown) =>
  (body as { errors: { field: string }[] }).errors.map(({ field }) => field)

async function setUp() {
  const owner = await createInstructor()
  const agent = await app.asUser(owner)
  const course = await createCourse({ owner })
  const lesson = await createLesson(await createStage(course.revisionId))
  const stop = await createStop(lesson.id, { name: 'Bags to buy', atMs: 125_000 })
  return {
    agent,
    course,
    lesson,
    stop,
    path: `/api/bench/stops/${stop.id}`,
    listPath: `/api/bench/lessons/${lesson.id}/stops`,
  }
}
const newStop = { name: 'Form size', atMs: 30_000, isRequired: true }

const calculator: Exercise = {
  kind: 'calculator',
  prompt: 'How many bags?',
  tries: 3,
  definition: {
    calculator: 'slab',
    inputs: {
      length: { mode: 'ranged', min: 2, max: 3, step: 0.1 },
      width: { mode: 'fixed', value: '1.1 m' },
      thickness: { mode: 'own', value: '100 mm' },
    },
    asked: 'bags',
    tolerance: { kind: 'absolute', value: 0 },
    hints: ['Work in metres.'],
    slips: [],
  },
}
const quiz = (...keys: string[]): Exercise => ({
  kind: 'quiz',
  prompt: 'What holds?',
  tries: null,
  passMark: 80,
  questions: keys.map((key) => singleQuestion(key)),
})

describe('POST bench/lessons/:lessonId/stops', () => {
  it('sets a stop under a readable key', async () => {
    const { agent, lesson, listPath } = await setUp()
    const made = benchStopSchema.parse((await agent.post(listPath).send(newStop).expect(201)).body)
    expect(made).toMatchObject({ ...newStop, version: 1, exercise: null })
    expect(made.key).toMatch(/^form-size-[a-z0-9]{5}$/)
    const rows = await db.select().from(stops).where(eq(stops.lessonId, lesson.id))
    expect(rows).toHaveLength(2)
  })

  it('refuses a moment that is taken or after the end of the video', async () => {
    const { agent, course, lesson, listPath } = await setUp()
    const taken = await agent
      .post(listPath)
      .send({ ...newStop, atMs: 125_000 })
      .expect(409)
    expect(taken.body).toMatchObject({
      code: 'moment-taken',
      detail: expect.stringContaining('2:05') as string,
    })
    await createVideo(course.id, lesson, { durationMs: 60_500 })
    const late = await agent
      .post(listPath)
      .send({ ...newStop, atMs: 60_501 })
      .expect(400)
    expect(late.body.errors).toEqual([
      { field: 'atMs', message: 'The video ends at 1:00.5. Put the stop before that.' },
    ])
    await agent
      .post(listPath)
      .send({ ...newStop, atMs: 60_500 })
      .expect(201)
  })

  it('lets one of two at the same moment stand', async () => {
    const { agent, listPath } = await setUp()
    const answers = await Promise.all([1, 2, 3].map(() => agent.post(listPath).send(newStop)))
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409])
  })

  it('is for the owner, with what can be taken', async () => {
    const { agent, course, listPath } = await setUp()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    await app.asVisitor().post(listPath).send(newStop).expect(401)
    await (await app.asUser(helper)).post(listPath).send(newStop).expect(403)
    await (await app.asUser(await createUser())).post(listPath).send(newStop).expect(403)
    const bad = await agent
      .post(listPath)
      .send({ name: '', atMs: -1, isRequired: 'yes' })
      .expect(400)
    expect(fieldsOf(bad.body)).toEqual(['name', 'atMs', 'isRequired'])
    await agent.post('/api/bench/lessons/999999/stops').send(newStop).expect(404)
  })
})

describe('bench/stops/:stopId', () => {
  it('moves and renames a stop', async () => {
    const { agent, path } = await setUp()
    const change = { version: 1, name: 'Bags', atMs: 126_000, isRequired: false }
    const saved = benchStopSchema.parse((await agent.patch(path).send(change).expect(200)).body)
    expect(saved).toMatchObject({ ...change, version: 2 })
  })

  it('gives a stop a calculator, then a quiz in its place, then nothing', async () => {
    const { agent, stop, path } = await setUp()
    const first = await agent.patch(path).send({ version: 1, exercise: calculator }).expect(200)
    expect(benchStopSchema.parse(first.body).exercise).toEqual(calculator)
    const [row] = await db.select().from(exercises).where(eq(exercises.stopId, stop.id))
    const second = await agent
      .patch(path)
      .send({ version: 2, exercise: quiz('which-mix', 'how-wet') })
      .expect(200)
    expect(benchStopSchema.parse(second.body).exercise).toEqual(quiz('which-mix', 'how-wet'))
    const [same] = await db.select().from(exercises).where(eq(exercises.stopId, stop.id))
    expect([same!.id, same!.key]).toEqual([row!.id, row!.key])
    const turned = await agent
      .patch(path)
      .send({ version: 3, exercise: quiz('how-wet', 'which-mix') })
      .expect(200)
    expect(turned.body.exercise).toEqual(quiz('how-wet', 'which-mix'))
    const questions = await db
      .select()
      .from(quizQuestions)
      .where(eq(quizQuestions.exerciseId, same!.id))
    expect(questions.map(({ key }) => key).sort()).toEqual(['how-wet', 'which-mix'])
    const off = await agent.patch(path).send({ version: 4, exercise: null }).expect(200)
    expect(off.body.exercise).toBeNull()
    expect(await db.select().from(exercises).where(eq(exercises.stopId, stop.id))).toEqual([])
  })

  it('answers a stale change with the stop as it is', async () => {
    const { agent, path } = await setUp()
    await agent.patch(path).send({ version: 1, name: 'First' }).expect(200)
    const late = await agent.patch(path).send({ version: 1, name: 'Late' }).expect(409)
    expect(late.body.code).toBe('stale')
    expect(benchStopSchema.parse(late.body.current)).toMatchObject({ name: 'First', version: 2 })
  })

  it('keeps nothing of a change that is refused in part', async () => {
    const { agent, lesson, path } = await setUp()
    await createStop(lesson.id, { atMs: 5000 })
    await agent.patch(path).send({ version: 1, name: 'Late', atMs: 5000 }).expect(409)
    const twice = await agent
      .patch(path)
      .send({ version: 1, name: 'Late', exercise: quiz('same-key', 'same-key') })
      .expect(400)
    expect(twice.body.errors[0].field).toBe('exercise.questions.1.key')
    const kept = await agent.patch(path).send({ version: 1 }).expect(200)
    expect(kept.body).toMatchObject({ name: 'Bags to buy', atMs: 125_000, exercise: null })
  })

  it('is for the owner, with what can be taken', async () => {
    const { agent, course, path } = await setUp()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    await app.asVisitor().patch(path).send({ version: 1 }).expect(401)
    await (await app.asUser(helper)).delete(path).expect(403)
    await (await app.asUser(await createInstructor())).patch(path).send({ version: 1 }).expect(403)
    await agent
      .patch(path)
      .send({ version: 1, exercise: { kind: 'essay' } })
      .expect(400)
    await agent.patch(path).send({}).expect(400)
    await agent.patch('/api/bench/stops/999999').send({ version: 1 }).expect(404)
  })

  it('takes a stop off the tape', async () => {
    const { agent, lesson, path } = await setUp()
    await agent.delete(path).expect(204)
    await agent.delete(path).expect(404)
    expect(await db.select().from(stops).where(eq(stops.lessonId, lesson.id))).toEqual([])
  })
})
