import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { questions } from '../../../server/db/schema'
import { questionRowSchema } from '../../../shared/contracts/fence'
import { pageOf } from '../../../shared/contracts/pagination'
import { startTestApp, type Agent, type TestApp } from '../../support/app'
import {
  createCourse,
  createLesson,
  createStage,
  createUser,
  enrol,
  issueRevision,
} from '../../support/factories'
import { ask, createScene, readThreads, reply, type Scene } from './fenceScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('lists', () => {
  const writeRows = async ({ path, asker, people }: Scene, moments: (number | null)[]) => {
    await ask(asker, path, { title: 'first', atMs: moments[0] ?? null })
    const roomId = (
      await db.select().from(questions).where(eq(questions.authorId, people.asker.id))
    )[0]!.roomId
    for (const atMs of moments.slice(1)) {
      await db.insert(questions).values({ roomId, atMs, title: 'more', markdown: '', html: '' })
    }
  }

  it('pages a lesson by moment, those without one last, nothing twice', async () => {
    const scene = await createScene(app)
    const moments = [5000, null, 1000, 5000, null, 0, 9000]
    await writeRows(scene, moments)
    const seen: (number | null)[] = []
    const ids = new Set<number>()
    let cursor: string | null = ''
    while (cursor !== null) {
      const query: string = `?limit=2${cursor && `&cursor=${cursor}`}`
      const page = await readThreads(scene.asker, scene.path, query)
      seen.push(...page.items.map((item) => item.atMs))
      for (const item of page.items) ids.add(item.id)
      cursor = page.nextCursor
    }
    expect(seen).toEqual([0, 1000, 5000, 5000, 9000, null, null])
    expect(ids.size).toBe(7)
    await scene.asker.get(`${scene.path}/questions?cursor=bm9uc2Vuc2U`).expect(400)
  })

  it('lists a course by place or newest, with filters, and visitors only the sample lessons', async () => {
    const course = await createCourse()
    const ground = await createStage(course.revisionId)
    const base = await createStage(course.revisionId)
    const sample = await createLesson(ground, { isSample: true, title: 'Setting out' })
    const dig = await createLesson(ground)
    const pour = await createLesson(base, { title: 'Mixing and pouring' })
    await issueRevision(course.revisionId)
    const learner = await createUser()
    await enrol(learner.id, course)
    const agent = await app.asUser(learner)
    const owner = await app.asUser({ id: course.ownerId })
    const at = (key: string) => `/api/courses/${course.slug}/lessons/${key}`
    const poured = await ask(agent, at(pour.key), { title: 'Stop at 100% rain?', atMs: 185_000 })
    await ask(agent, at(sample.key), { title: 'String or laser?', atMs: null })
    await ask(owner, at(sample.key), { title: 'Which stakes?', atMs: 4000 })
    await ask(agent, at(dig.key), { title: 'Roots?', atMs: 1000 })
    const { answers } = await reply(owner, poured.id)

    const list = async (who: Agent, query: string) =>
      pageOf(questionRowSchema).parse(
        (await who.get(`/api/courses/${course.slug}/questions?${query}`).expect(200)).body,
      )
    const titles = async (who: Agent, query: string) =>
      (await list(who, query)).items.map((item) => item.title)

    expect(await titles(agent, 'order=newest')).toEqual([
      'Roots?',
      'Which stakes?',
      'String or laser?',
      'Stop at 100% rain?',
    ])
    const byPlace = ['Which stakes?', 'String or laser?', 'Roots?', 'Stop at 100% rain?']
    expect(await titles(agent, 'order=moment')).toEqual(byPlace)
    const paged: string[] = []
    let cursor: string | null = ''
    while (cursor !== null) {
      const query: string = `order=moment&limit=1${cursor && `&cursor=${cursor}`}`
      const page = await list(agent, query)
      paged.push(...page.items.map((item) => item.title))
      cursor = page.nextCursor
    }
    expect(paged).toEqual(byPlace)
    const [row] = (await list(agent, `stage=${base.key}`)).items
    expect(row).toMatchObject({
      lessonTitle: 'Mixing and pouring',
      lessonNumber: 3,
      answerCount: 1,
    })
    expect(await titles(agent, 'state=unanswered&order=moment')).toEqual(byPlace.slice(0, 3))
    await owner.put(`/api/questions/${poured.id}/settlement`).send({ answerId: answers[0]!.id })
    expect(await titles(agent, 'state=settled')).toEqual(['Stop at 100% rain?'])
    expect(await titles(agent, 'state=open')).toHaveLength(3)
    expect(await titles(owner, 'state=mine')).toEqual(['Which stakes?'])
    expect(await titles(agent, 'words=100%25 r')).toEqual(['Stop at 100% rain?'])
    expect(await titles(agent, 'words=1__')).toEqual([])
    expect(await titles(app.asVisitor(), 'order=moment')).toEqual(byPlace.slice(0, 2))
    await agent.get(`/api/courses/${course.slug}/questions?state=lost`).expect(400)
  })
})
