import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { courseRevisions, courses, lessons } from '../../../server/db/schema'
import { benchCourseRowSchema, benchCourseSchema } from '../../../shared/contracts/benchCourses'
import { pageOf } from '../../../shared/contracts/pagination'
import { startTestApp, type Agent, type TestApp } from '../../support/app'
import {
  addHelper,
  createInstructor,
  createLesson,
  createStage,
  createUser,
  enrol,
} from '../../support/factories'
import { createCourse, setUpCourse, setUpWholeCourse } from './benchScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const fieldsOf = (body: unknown) =>
  (body as { errors: { field: string }[] }).errors.map(({ field }) => field)

const draft = {
  title: 'A log store on a pad',
  outcome: 'A store that keeps two cubic metres dry.',
  coverDrawing: 'log-store',
  weekends: 3,
  stages: ['ground', 'base'],
}
let keys = 0
const create = (agent: Agent, values: object = {}, key = `create-${++keys}-key`) =>
  agent
    .post('/api/bench/courses')
    .set('Idempotency-Key', key)
    .send({ ...draft, ...values })

const setUp = () => setUpCourse(app)
const setUpWhole = () => setUpWholeCourse(app)

describe('POST bench/courses', () => {
  it('begins a draft with its stages, a slug and the next sheet number', async () => {
    const agent = await app.asUser(await createInstructor())
    const first = benchCourseSchema.parse((await create(agent).expect(201)).body)
    const second = benchCourseSchema.parse((await create(agent).expect(201)).body)
    expect(first).toMatchObject({
      slug: 'a-log-store-on-a-pad',
      state: 'draft',
      revision: 'draft',
      version: 1,
      isIssued: false,
      can: { edit: true, issue: true, writeCalculators: true },
      staff: [{ role: 'owner' }],
    })
    expect(first.stages.map(({ kind, title }) => [kind, title])).toEqual([
      ['ground', 'Ground'],
      ['base', 'Base'],
    ])
    expect(second.slug).toBe('a-log-store-on-a-pad-2')
    expect(second.sheetNumber).toBe(first.sheetNumber + 1)
  })

  it('gives every course a number of its own when many begin at once', async () => {
    const agent = await app.asUser(await createInstructor())
    const answers = await Promise.all(
      Array.from({ length: 12 }, () =>
        create(agent, { title: 'Übergroße Gartenbank' }).expect(201),
      ),
    )
    const made = answers.map(({ body }) => benchCourseSchema.parse(body))
    expect(new Set(made.map(({ sheetNumber }) => sheetNumber)).size).toBe(12)
    expect(new Set(made.map(({ slug }) => slug)).size).toBe(12)
    expect(made.every(({ slug }) => /^ubergrosse-gartenbank(-\d+)?$/.test(slug))).toBe(true)
  })

  it('makes one course of copies with the same key, and refuses the key for another', async () => {
    const owner = await createInstructor()
    const agent = await app.asUser(owner)
    const answers = await Promise.all(
      Array.from({ length: 8 }, () => create(agent, {}, 'the-same-key').expect(201)),
    )
    expect(new Set(answers.map(({ body }) => (body as { id: number }).id)).size).toBe(1)
    await create(agent, { title: 'Another' }, 'the-same-key').expect(422)
    const list = await agent.get('/api/bench/courses').expect(200)
    expect(list.body.items).toHaveLength(1)
  })

  it('refuses visitors, learners and what cannot be taken', async () => {
    await create(app.asVisitor()).expect(401)
    await create(await app.asUser(await createUser())).expect(403)
    const agent = await app.asUser(await createInstructor())
    const bad = await create(agent, { title: ' ', weekends: 0, stages: [] }).expect(400)
    expect(fieldsOf(bad.body).sort()).toEqual(['stages', 'title', 'weekends'])
    const noKey = await agent.post('/api/bench/courses').send(draft).expect(400)
    expect(noKey.body.errors[0].field).toBe('Idempotency-Key')
  })
})

describe('GET bench/courses', () => {
  it('lists the courses of one’s own staff page by page, newest first', async () => {
    const helper = await createInstructor()
    const ids = []
    for (let count = 0; count < 3; count++) {
      const course = await createCourse()
      await addHelper(course.id, helper.id)
      ids.unshift(course.id)
    }
    await createCourse()
    const agent = await app.asUser(helper)
    const page = pageOf(benchCourseRowSchema)
    const first = page.parse((await agent.get('/api/bench/courses?limit=2').expect(200)).body)
    const rest = page.parse(
      (await agent.get(`/api/bench/courses?limit=2&cursor=${first.nextCursor}`).expect(200)).body,
    )
    expect([...first.items, ...rest.items].map(({ id }) => id)).toEqual(ids)
    expect(first.items[0]).toMatchObject({ role: 'helper', revision: 'draft', lessons: 0 })
    expect(rest.nextCursor).toBeNull()
    await agent.get('/api/bench/courses?cursor=x').expect(400)
    await app.asVisitor().get('/api/bench/courses').expect(401)
  })

  it('counts lessons and learners', async () => {
    const { owner, agent, course, stage, path } = await setUpWhole()
    await createLesson(stage, { videoId: null, summary: 'More' }).then(({ id }) =>
      db.delete(lessons).where(eq(lessons.id, id)),
    )
    await agent.post(`${path}/issue`).send({ changeNote: '' }).expect(200)
    await enrol((await createUser()).id, course)
    const list = await (await app.asUser(owner)).get('/api/bench/courses').expect(200)
    expect(list.body.items[0]).toMatchObject({
      lessons: 1,
      learners: 1,
      openQuestions: 0,
      revision: 'A',
    })
  })
})

describe('bench/courses/:courseId', () => {
  it('is seen by staff and nobody else', async () => {
    const { agent, course, path } = await setUp()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    benchCourseSchema.parse((await agent.get(path).expect(200)).body)
    const seen = await (await app.asUser(helper)).get(path).expect(200)
    expect(seen.body.can).toEqual({ edit: false, issue: false, writeCalculators: false })
    await app.asVisitor().get(path).expect(401)
    await (await app.asUser(await createInstructor())).get(path).expect(403)
    await agent.get('/api/bench/courses/999999').expect(404)
    await agent.get('/api/bench/courses/x').expect(404)
  })

  it('keeps a change and answers its version', async () => {
    const { agent, course, path } = await setUp()
    const change = {
      version: 1,
      title: 'A bench by the fence',
      tools: ['Saw'],
      hazards: [{ kind: 'saw', label: 'A saw' }],
      facts: [{ label: 'Seat', value: '450' }],
    }
    const saved = await agent.patch(path).send(change).expect(200)
    expect(saved.body).toMatchObject({ ...change, version: 2 })
    const [row] = await db
      .select()
      .from(courseRevisions)
      .where(eq(courseRevisions.id, course.revisionId))
    expect(row).toMatchObject({ title: change.title, tools: ['Saw'], version: 2 })
  })

  it('answers a stale change with what is there, and keeps nothing of it', async () => {
    const { agent, path } = await setUp()
    await agent.patch(path).send({ version: 1, title: 'First' }).expect(200)
    const late = await agent.patch(path).send({ version: 1, title: 'Late' }).expect(409)
    expect(late.body.code).toBe('stale')
    expect(benchCourseSchema.parse(late.body.current)).toMatchObject({ title: 'First', version: 2 })
  })

  it('keeps exactly one of two changes that come at once', async () => {
    const { agent, path } = await setUp()
    const answers = await Promise.all(
      ['One', 'Two', 'Three'].map((title) => agent.patch(path).send({ version: 1, title })),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409])
  })

  it('refuses helpers, other instructors and what cannot be taken', async () => {
    const { agent, course, path } = await setUp()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    await (await app.asUser(helper)).patch(path).send({ version: 1, title: 'x' }).expect(403)
    await (await app.asUser(await createInstructor())).patch(path).send({ version: 1 }).expect(403)
    await app.asVisitor().patch(path).send({ version: 1 }).expect(401)
    await agent.patch(path).send({ version: 1, title: '' }).expect(400)
    await agent.patch(path).send({ version: 1, state: 'issued' }).expect(400)
    await agent
      .patch(path)
      .set('Origin', 'https://elsewhere.example')
      .send({ version: 1 })
      .expect(403)
  })

  it('removes a course that was never issued', async () => {
    const { agent, course, path } = await setUp()
    await createLesson(await createStage(course.revisionId))
    await agent.delete(path).expect(204)
    await agent.get(path).expect(404)
    expect(await db.select().from(courses).where(eq(courses.id, course.id))).toEqual([])
  })
})

describe('PUT bench/courses/:courseId/order', () => {
  async function setUpOutline() {
    const scene = await setUp()
    const [one, two] = [
      await createStage(scene.course.revisionId),
      await createStage(scene.course.revisionId),
    ]
    const a = await createLesson(one)
    const b = await createLesson(one)
    const c = await createLesson(two)
    return { ...scene, one, two, a, b, c }
  }
  const shape = (body: unknown) =>
    benchCourseSchema
      .parse(body)
      .stages.map(({ id, lessons: rows }) => ({ id, lessonIds: rows.map((row) => row.id) }))

  it('puts stages and lessons where they are put, again and again', async () => {
    const { agent, path, one, two, a, b, c } = await setUpOutline()
    const orders = [
      [
        { id: two.id, lessonIds: [b.id, c.id] },
        { id: one.id, lessonIds: [a.id] },
      ],
      [
        { id: one.id, lessonIds: [] },
        { id: two.id, lessonIds: [c.id, a.id, b.id] },
      ],
      [
        { id: one.id, lessonIds: [a.id, b.id] },
        { id: two.id, lessonIds: [c.id] },
      ],
    ]
    for (const order of orders) {
      const answer = await agent.put(`${path}/order`).send({ stages: order }).expect(200)
      expect(shape(answer.body)).toEqual(order)
      expect(shape((await agent.get(path)).body)).toEqual(order)
    }
  })

  it('takes any order and loses nothing', async () => {
    const { agent, path, one, two, a, b, c } = await setUpOutline()
    for (let turn = 0; turn < 8; turn++) {
      const mixed = [a.id, b.id, c.id].sort(() => Math.random() - 0.5)
      const cut = Math.floor(Math.random() * 4)
      const order = [
        { id: two.id, lessonIds: mixed.slice(0, cut) },
        { id: one.id, lessonIds: mixed.slice(cut) },
      ].sort(() => Math.random() - 0.5)
      const answer = await agent.put(`${path}/order`).send({ stages: order }).expect(200)
      expect(shape(answer.body)).toEqual(order)
    }
  })

  it('refuses an order that leaves out, repeats or adds', async () => {
    const { agent, path, one, two, a, b, c } = await setUpOutline()
    const other = await setUpOutline()
    const orders = [
      [{ id: one.id, lessonIds: [a.id, b.id, c.id] }],
      [
        { id: one.id, lessonIds: [a.id, b.id] },
        { id: two.id, lessonIds: [] },
      ],
      [
        { id: one.id, lessonIds: [a.id, b.id] },
        { id: two.id, lessonIds: [c.id, a.id] },
      ],
      [
        { id: one.id, lessonIds: [a.id, b.id] },
        { id: two.id, lessonIds: [c.id, other.a.id] },
      ],
    ]
    for (const order of orders) {
      const answer = await agent.put(`${path}/order`).send({ stages: order }).expect(400)
      expect(answer.body.errors[0].field).toBe('stages')
    }
  })
})
