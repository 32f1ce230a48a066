import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { attempts, lessonProgress } from '../../../server/db/schema'
import { buildRowSchema, buildSchema } from '../../../shared/contracts/builds'
import { pageOf } from '../../../shared/contracts/pagination'
import { startTestApp, type TestApp } from '../../support/app'
import {
  createCalculatorExercise,
  createCourse,
  createIssuedCourse,
  createLesson,
  createStage,
  createStop,
  createUser,
  createVideo,
  enrol,
  issueRevision,
  slabDefinition,
} from '../../support/factories'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

/** Ground of two lessons, base of one, frame of none. */
async function createTwoStages() {
  const course = await createCourse({ revision: { title: 'A step by the door' } })
  const ground = await createStage(course.revisionId, { kind: 'ground' })
  const base = await createStage(course.revisionId, { kind: 'base' })
  await createStage(course.revisionId, { kind: 'frame' })
  const lessons = [await createLesson(ground), await createLesson(ground), await createLesson(base)]
  for (const lesson of lessons) await createVideo(course.id, lesson)
  const stop = await createStop(lessons[2]!.id, { name: 'How much' })
  const exercise = await createCalculatorExercise(stop.id, { definition: slabDefinition })
  await issueRevision(course.revisionId)
  const learner = await createUser()
  const { buildId } = await enrol(learner.id, course)
  const agent = await app.asUser(learner)
  const path = `/api/courses/${course.slug}`
  const finish = (lesson: { key: string }) =>
    agent
      .post(`${path}/lessons/${lesson.key}/progress`)
      .send({ intervals: [[0, 100_000]], positionMs: 40_000 })
      .expect(200)
  return { course, lessons, exercise, learner, agent, path, buildId, finish }
}

describe('GET /api/courses/:slug/build', () => {
  it('is all in pencil at the start, with the first lesson next', async () => {
    const { course, lessons, agent, path, buildId } = await createTwoStages()
    const build = buildSchema.parse((await agent.get(`${path}/build`).expect(200)).body)
    expect(build).toMatchObject({
      id: buildId,
      name: 'Mine',
      course: { slug: course.slug, title: 'A step by the door', revision: 'A' },
      lessonsDone: 0,
      lessonsInAll: 3,
      next: { lessonKey: lessons[0]!.key, positionMs: 0 },
      lately: [],
    })
    expect(build.stages.map(({ state }) => state)).toEqual(['pencil', 'pencil', 'pencil'])
  })

  it('inks a stage when all its lessons are done, and goes on to what comes next', async () => {
    const { lessons, agent, path, finish } = await createTwoStages()
    await finish(lessons[0]!)
    const half = buildSchema.parse((await agent.get(`${path}/build`)).body)
    expect(half.stages.map(({ state }) => state)).toEqual(['pencil', 'pencil', 'pencil'])
    expect(half.next?.lessonKey).toBe(lessons[1]!.key)

    await finish(lessons[1]!)
    await finish(lessons[2]!)
    const inked = buildSchema.parse((await agent.get(`${path}/build`)).body)
    expect(inked.stages.map(({ state }) => state)).toEqual(['ink', 'pencil', 'pencil'])
    expect(inked).toMatchObject({
      lessonsDone: 2,
      next: { lessonKey: lessons[2]!.key, positionMs: 40_000 },
    })
    expect(inked.lately.map(({ lessonKey }) => lessonKey).sort()).toEqual(
      [lessons[0]!.key, lessons[1]!.key].sort(),
    )
  })

  it('says lately what was worked out and put in the book, the newest first', async () => {
    const { lessons, exercise, learner, agent, path, finish } = await createTwoStages()
    await finish(lessons[0]!)
    await db
      .update(lessonProgress)
      .set({ doneAt: new Date('2026-01-01T10:00:00Z') })
      .where(eq(lessonProgress.userId, learner.id))
    const verdict = {
      right: true,
      outcome: 'right' as const,
      slip: null,
      message: '',
      wayBack: '',
      field: null,
      questions: {},
    }
    await db.insert(attempts).values({
      userId: learner.id,
      exerciseId: exercise.id,
      tryNumber: 1,
      answer: { kind: 'calculator', inputs: {}, answer: '1', units: 'metric' },
      verdict,
      outcome: 'right',
      createdAt: new Date('2026-01-02T10:00:00Z'),
    })
    const build = buildSchema.parse((await agent.get(`${path}/build`)).body)
    expect(build.lately.map(({ at, lessonKey }) => [at, lessonKey])).toEqual([
      ['2026-01-02T10:00:00.000Z', lessons[2]!.key],
      ['2026-01-01T10:00:00.000Z', lessons[0]!.key],
    ])
    expect(build.lately[0]!.text).toContain('How much')
  })

  it('has nothing next when all is done', async () => {
    const course = await createIssuedCourse()
    const learner = await createUser()
    await enrol(learner.id, course)
    const agent = await app.asUser(learner)
    await agent
      .post(`/api/courses/${course.slug}/lessons/${course.lesson.key}/progress`)
      .send({ intervals: [[0, 100_000]], positionMs: 0 })
    const build = buildSchema.parse((await agent.get(`/api/courses/${course.slug}/build`)).body)
    expect(build).toMatchObject({ next: null, lessonsDone: 1 })
  })

  it('is for the enrolled alone', async () => {
    const { course, path } = await createTwoStages()
    await app.asVisitor().get(`${path}/build`).expect(401)
    await (await app.asUser(await createUser())).get(`${path}/build`).expect(403)
    await (await app.asUser({ id: course.ownerId })).get(`${path}/build`).expect(403)
    await (await app.asUser(await createUser())).get('/api/courses/nowhere/build').expect(404)
  })
})

describe('GET /api/builds', () => {
  it('pages through a person’s builds, the newest first, and no one else’s', async () => {
    const learner = await createUser()
    const slugs: string[] = []
    for (let n = 0; n < 3; n++) {
      const course = await createIssuedCourse()
      await enrol(learner.id, course)
      slugs.unshift(course.slug)
    }
    await createTwoStages()
    const agent = await app.asUser(learner)
    const page = pageOf(buildRowSchema)
    const first = page.parse((await agent.get('/api/builds?limit=2').expect(200)).body)
    expect(first.items.map(({ courseSlug }) => courseSlug)).toEqual(slugs.slice(0, 2))
    const rest = page.parse(
      (await agent.get(`/api/builds?limit=2&cursor=${first.nextCursor}`)).body,
    )
    expect(rest.items.map(({ courseSlug }) => courseSlug)).toEqual(slugs.slice(2))
    expect(rest.nextCursor).toBeNull()
  })

  it('counts the lessons and those that are done', async () => {
    const { lessons, agent, finish } = await createTwoStages()
    await finish(lessons[0]!)
    const { body } = await agent.get('/api/builds').expect(200)
    expect(body.items).toMatchObject([{ lessonsDone: 1, lessonsInAll: 3 }])
  })

  it('refuses visitors and cursors it never gave', async () => {
    await app.asVisitor().get('/api/builds').expect(401)
    const agent = await app.asUser(await createUser())
    await agent.get('/api/builds?cursor=-1').expect(400)
    await agent.get('/api/builds?limit=0').expect(400)
  })
})
