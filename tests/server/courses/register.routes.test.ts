import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sheetSchema, sheetSummarySchema } from '../../../shared/contracts/courses'
import { pageOf } from '../../../shared/contracts/pagination'
import { startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  closeCourse,
  createCourse,
  createInstructor,
  createIssuedCourse,
  createLesson,
  createRevision,
  createStage,
  createStop,
  createUser,
  enrol,
  issueRevision,
} from '../../support/factories'
import { fieldsOf } from '../../support/problems'

const page = pageOf(sheetSummarySchema)
let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('GET /api/courses', () => {
  const slugs = async (query: string, agent = app.asVisitor()) => {
    const { body } = await agent.get(`/api/courses?limit=50&${query}`).expect(200)
    return page.parse(body).items.map((item) => item.slug)
  }

  it('shows issued courses to a visitor, and no draft or closed one', async () => {
    const issued = await createIssuedCourse()
    const draft = await createCourse()
    const closed = await createIssuedCourse()
    await closeCourse(closed.id)
    const found = await slugs('')
    expect(found).toContain(issued.slug)
    expect(found).not.toContain(draft.slug)
    expect(found).not.toContain(closed.slug)
  })

  it('pages through every sheet once and in order', async () => {
    for (let n = 0; n < 5; n++) await createIssuedCourse()
    const expected = await slugs('')
    const seen: string[] = []
    let cursor: string | null = null
    do {
      const query: string = cursor === null ? '' : `&cursor=${cursor}`
      const { body } = await app.asVisitor().get(`/api/courses?limit=2${query}`).expect(200)
      const answer = page.parse(body)
      expect(answer.items.length).toBeLessThanOrEqual(2)
      seen.push(...answer.items.map((item) => item.slug))
      cursor = answer.nextCursor
    } while (cursor !== null)
    expect(seen).toEqual(expected)
  })

  it('keeps only what fits the weekends and the drawing', async () => {
    const small = await createIssuedCourse({ revision: { weekends: 1, coverDrawing: 'deck' } })
    const large = await createIssuedCourse({ revision: { weekends: 9, coverDrawing: 'deck' } })
    const decks = await slugs('cover=deck')
    expect(decks).toEqual(expect.arrayContaining([small.slug, large.slug]))
    expect(await slugs('cover=deck&weekends=8')).toContain(small.slug)
    expect(await slugs('cover=deck&weekends=8')).not.toContain(large.slug)
    expect(await slugs('cover=deck&weekends=9')).toContain(large.slug)
    expect(await slugs('cover=picket-fence')).not.toContain(small.slug)
  })

  it('shows the newest issued revision, and who is enrolled', async () => {
    const course = await createIssuedCourse({ revision: { title: 'As it was' } })
    const second = await createRevision(course.id, { number: 1, title: 'As it is' })
    await issueRevision(second)
    await createRevision(course.id, { number: 2, title: 'As it may be' })
    const learner = await createUser()
    await enrol(learner.id, course)
    const agent = await app.asUser(learner)
    const { body } = await agent.get('/api/courses?limit=50').expect(200)
    const row = page.parse(body).items.find((item) => item.slug === course.slug)
    expect(row).toMatchObject({ title: 'As it is', revision: 'B', isEnrolled: true })
  })

  it.each([
    ['weekends=0', 'weekends'],
    ['weekends=many', 'weekends'],
    ['cover=castle', 'cover'],
    ['limit=51', 'limit'],
    ['cursor=abc', 'cursor'],
  ])('refuses %s and names the field', async (query, field) => {
    const { body, type } = await app.asVisitor().get(`/api/courses?${query}`).expect(400)
    expect(type).toBe('application/problem+json')
    expect(fieldsOf(body)).toContain(field)
  })
})

describe('GET /api/courses/:slug', () => {
  it('shows a visitor the whole sheet', async () => {
    const owner = await createInstructor({ displayName: 'Tove Lind', about: 'Builds sheds.' })
    const course = await createCourse({ owner, revision: { notCovered: 'Drains.' } })
    const first = await createStage(course.revisionId, { kind: 'ground' })
    const second = await createStage(course.revisionId, { kind: 'base' })
    const lessons = [
      await createLesson(first),
      await createLesson(second),
      await createLesson(second),
    ]
    await createStop(lessons[1]!.id)
    await createStop(lessons[1]!.id)
    await issueRevision(course.revisionId)

    const { body } = await app.asVisitor().get(`/api/courses/${course.slug}`).expect(200)
    const sheet = sheetSchema.parse(body)
    expect(sheet).toMatchObject({
      drawnBy: 'Tove Lind',
      revision: 'A',
      lessons: 3,
      isEnrolled: false,
    })
    expect(sheet.stages.map((stage) => stage.lessons.map((lesson) => lesson.number))).toEqual([
      [1],
      [2, 3],
    ])
    expect(sheet.stages[1]!.lessons.map((lesson) => lesson.stops)).toEqual([2, 0])
    expect(sheet.staff).toEqual([{ name: 'Tove Lind', role: 'owner', about: 'Builds sheds.' }])
    expect(sheet.revisions.map(({ revision }) => revision)).toEqual(['A'])
    expect(sheet.can).toEqual({ enrol: false, seeBench: false, writeFence: false })
  })

  it('shows an enrolled person the revision they enrolled with', async () => {
    const course = await createIssuedCourse({ revision: { title: 'As it was' } })
    const learner = await createUser()
    await enrol(learner.id, course)
    await issueRevision(await createRevision(course.id, { number: 1, title: 'As it is' }))
    const agent = await app.asUser(learner)
    const { body } = await agent.get(`/api/courses/${course.slug}`).expect(200)
    expect(sheetSchema.parse(body)).toMatchObject({ title: 'As it was', revision: 'A' })
    const visitor = await app.asVisitor().get(`/api/courses/${course.slug}`)
    expect(visitor.body).toMatchObject({ title: 'As it is', revision: 'B' })
  })

  it('shows a draft to its staff and admins, and is not there for anyone else', async () => {
    const course = await createCourse()
    const helper = await createUser()
    await addHelper(course.id, helper.id)
    const path = `/api/courses/${course.slug}`
    for (const person of [helper, { id: course.ownerId }, await createUser({ role: 'admin' })]) {
      const { body } = await (await app.asUser(person)).get(path).expect(200)
      expect(sheetSchema.parse(body)).toMatchObject({ revision: 'draft', state: 'draft' })
    }
    await (await app.asUser(await createInstructor())).get(path).expect(404)
    await app.asVisitor().get(path).expect(404)
  })

  it('still shows a closed course, in which nobody can enrol', async () => {
    const course = await createIssuedCourse()
    await closeCourse(course.id)
    const agent = await app.asUser(await createUser())
    const { body } = await agent.get(`/api/courses/${course.slug}`).expect(200)
    expect(sheetSchema.parse(body)).toMatchObject({ state: 'closed', can: { enrol: false } })
  })

  it.each([`' or 1=1 -- `, `'; drop table courses; -- `, '%25', '" union select passphrase'])(
    '1.2.4 takes %s for a name, never for a command',
    async (name) => {
      const visitor = app.asVisitor()
      const { status } = await visitor.get(`/api/courses/${encodeURIComponent(name)}`)
      expect([400, 404]).toContain(status)
      const filtered = await visitor.get('/api/courses').query({ cover: name, cursor: name })
      expect(filtered.status).toBe(400)
      await visitor.get('/api/courses').expect(200)
    },
  )

  it('answers 404 with a problem for a course that is not there', async () => {
    const { body, type } = await app.asVisitor().get('/api/courses/nothing-here').expect(404)
    expect(type).toBe('application/problem+json')
    expect(body).toMatchObject({ code: 'not-found', status: 404 })
  })

  it('says who may enrol by one button', async () => {
    const free = await createIssuedCourse()
    const priced = await createIssuedCourse({ course: { priceCents: 4900 } })
    const agent = await app.asUser(await createUser())
    const asked = async (slug: string) =>
      sheetSchema.parse((await agent.get(`/api/courses/${slug}`)).body).can.enrol
    expect(await asked(free.slug)).toBe(true)
    expect(await asked(priced.slug)).toBe(false)
    const owner = await app.asUser({ id: free.ownerId })
    expect((await owner.get(`/api/courses/${free.slug}`)).body.can).toMatchObject({
      enrol: false,
      seeBench: true,
      writeFence: true,
    })
  })
})
