import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { db } from '../../../server/db/client'
import { users } from '../../../server/db/schema'
import { problemSchema } from '../../../shared/contracts/errors'
import { threadSchema } from '../../../shared/contracts/fence'
import { startTestApp, type Agent, type TestApp } from '../../support/app'
import { ask, createScene, readEvents, readThread, readThreads, reply } from './fenceScene'

// The limits are tested as they are; the configuration is read once, by the imports.
vi.hoisted(() => {
  process.env['RATE_LIMIT_FACTOR'] = '1'
})

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('asking and answering', () => {
  it('shows a question with its writer, moment and safe HTML, and answers oldest first', async () => {
    const scene = await createScene(app)
    const asked = await ask(scene.asker, scene.path, {
      markdown: '**38** short <script>alert(1)</script>',
    })
    await reply(scene.neighbour, asked.id, 'Outside.')
    await reply(scene.helper, asked.id, 'Inside.')
    await reply(scene.owner, asked.id, 'Petra is right.')

    const { items, lastNumber, can } = await readThreads(scene.neighbour, scene.path)
    expect(items).toHaveLength(1)
    expect(items[0]).toMatchObject({
      title: 'Inside or outside of the boards?',
      atMs: 392_000,
      writer: { id: scene.people.asker.id, name: 'Jo Varga', place: 'learner' },
      state: 'open',
      answerCount: 3,
      asOf: 4,
    })
    expect(items[0]?.html).toContain('<strong>38</strong>')
    expect(items[0]?.html).not.toContain('<script')
    expect(items[0]?.answers.map((answer) => answer.writer.place)).toEqual([
      'learner',
      'helper',
      'owner',
    ])
    expect(lastNumber).toBe(4)
    expect(can).toEqual({ write: true, settleAny: false })
  })

  it('makes one row of ten copies with one key, and gives each the same answer', async () => {
    const { asker, path, helper, people } = await createScene(app)
    const asked = await ask(asker, path)
    const key = randomUUID()
    const agents = await Promise.all(Array.from({ length: 5 }, () => app.asUser(people.helper)))
    const copies = await Promise.all(
      Array.from({ length: 10 }, (_, index) =>
        agents[index % 5]!.post(`/api/questions/${asked.id}/answers`)
          .set('Idempotency-Key', key)
          .send({ markdown: 'Inside.' }),
      ),
    )
    expect(copies.map((copy) => copy.status)).toEqual(Array(10).fill(201))
    expect(new Set(copies.map((copy) => JSON.stringify(copy.body))).size).toBe(1)
    expect((await readThread(helper, asked.id)).answerCount).toBe(1)
    expect((await readEvents(helper, path, 0)).events.map((event) => event.kind)).toEqual([
      'asked',
      'answered',
    ])
  })

  it('refuses a missing key, and a key that was used for something else', async () => {
    const { asker, path } = await createScene(app)
    const body = { title: 'Why?', markdown: '', atMs: null }
    const without = await asker.post(`${path}/questions`).send(body).expect(400)
    expect(problemSchema.parse(without.body).errors?.[0]?.field).toBe('Idempotency-Key')
    const key = randomUUID()
    await asker.post(`${path}/questions`).set('Idempotency-Key', key).send(body).expect(201)
    await asker
      .post(`${path}/questions`)
      .set('Idempotency-Key', key)
      .send({ ...body, title: 'How?' })
      .expect(422)
    expect((await readThreads(asker, path)).items).toHaveLength(1)
  })

  it.each([
    [{ title: '  ', markdown: '', atMs: null }, 'title'],
    [{ title: 'x'.repeat(161), markdown: '', atMs: null }, 'title'],
    [{ title: 'Why?', markdown: 'x'.repeat(10_001), atMs: null }, 'markdown'],
    [{ title: 'Why?', markdown: '<a@b.cd>'.repeat(1200), atMs: null }, 'markdown'],
    [{ title: 'Why?', markdown: '', atMs: -1 }, 'atMs'],
    [{ title: 'Why?', markdown: '' }, 'atMs'],
  ])('names the field of a question that cannot be taken (%#)', async (body, field) => {
    const { asker, path } = await createScene(app)
    const refused = await asker
      .post(`${path}/questions`)
      .set('Idempotency-Key', randomUUID())
      .send(body)
      .expect(400)
    expect(problemSchema.parse(refused.body).errors?.[0]?.field).toBe(field)
    expect((await readThreads(asker, path)).items).toEqual([])
  })

  it('takes ten posts a minute from a person, and says so at the eleventh', async () => {
    const { asker, path } = await createScene(app)
    for (let count = 0; count < 10; count++) await ask(asker, path)
    const refused = await asker
      .post(`${path}/questions`)
      .set('Idempotency-Key', randomUUID())
      .send({ title: 'Eleventh', markdown: '', atMs: null })
      .expect(429)
    expect(problemSchema.parse(refused.body).detail).toContain('Wait a minute')
  })
})

describe('who may read and write', () => {
  const write = (agent: Agent, path: string) =>
    agent
      .post(`${path}/questions`)
      .set('Idempotency-Key', randomUUID())
      .send({ title: 'May I?', markdown: '', atMs: null })

  it.each([
    ['visitor', false, 401, 401],
    ['stranger', false, 403, 403],
    ['asker', false, 200, 201],
    ['helper', false, 200, 201],
    ['owner', false, 200, 201],
    ['visitor', true, 200, 401],
    ['stranger', true, 200, 403],
  ] as const)('%s, sample lesson %s', async (who, isSample, read, posted) => {
    const scene = await createScene(app, { isSample })
    await scene[who].get(`${scene.path}/questions`).expect(read)
    await scene[who].get(`${scene.path}/events?after=0`).expect(read)
    await write(scene[who], scene.path).expect(posted)
    const asked = await ask(scene.asker, scene.path)
    await scene[who].get(`/api/questions/${asked.id}`).expect(read)
  })

  it('answers 404 for what is not there', async () => {
    const { asker, course } = await createScene(app)
    await asker.get(`/api/courses/${course.slug}/lessons/no-such-lesson/questions`).expect(404)
    await asker.get('/api/courses/no-such-course/questions').expect(404)
    await asker.get('/api/questions/4000000').expect(404)
    await asker.get('/api/questions/one').expect(404)
    await asker.delete('/api/answers/4000000').expect(404)
  })
})

describe('changing', () => {
  it('lets only the writer edit, and gives what is there when the version is old', async () => {
    const { asker, neighbour, owner, path } = await createScene(app)
    const asked = await ask(asker, path)
    const change = { version: 1, title: 'Inside, or outside?', markdown: 'Of the boards.' }
    await neighbour.patch(`/api/questions/${asked.id}`).send(change).expect(403)
    await owner.patch(`/api/questions/${asked.id}`).send(change).expect(403)
    const changed = await asker.patch(`/api/questions/${asked.id}`).send(change).expect(200)
    expect(threadSchema.parse(changed.body)).toMatchObject({
      title: 'Inside, or outside?',
      html: '<p>Of the boards.</p>',
      version: 2,
      asOf: 2,
    })
    expect(changed.body.editedAt).not.toBeNull()
    const stale = await asker.patch(`/api/questions/${asked.id}`).send(change).expect(409)
    expect(threadSchema.parse(problemSchema.parse(stale.body).current).version).toBe(2)
    expect((await readEvents(asker, path, 1)).events.map((event) => event.kind)).toEqual(['edited'])
  })

  it('lets only the writer edit an answer, by its version', async () => {
    const { asker, helper, owner, path } = await createScene(app)
    const { answers } = await reply(helper, (await ask(asker, path)).id)
    const address = `/api/answers/${answers[0]!.id}`
    await owner.patch(address).send({ version: 1, markdown: 'No.' }).expect(403)
    await helper.patch(address).send({ version: 1, markdown: 'Inside, always.' }).expect(200)
    await helper.patch(address).send({ version: 1, markdown: 'Late.' }).expect(409)
    const thread = await readThread(asker, answers[0]!.questionId)
    expect(thread.answers[0]).toMatchObject({ markdown: 'Inside, always.', version: 2 })
  })

  it('settles by asker or staff, moves the settled answer first, and opens again', async () => {
    const { asker, neighbour, helper, owner, path } = await createScene(app)
    const { id } = await ask(asker, path)
    await reply(neighbour, id, 'Outside.')
    const { answers } = await reply(owner, id, 'Inside.')
    const other = await reply(owner, (await ask(asker, path)).id)
    const settle = (agent: Agent, answerId: number) =>
      agent.put(`/api/questions/${id}/settlement`).send({ answerId })

    await settle(neighbour, answers[1]!.id).expect(403)
    await settle(asker, other.answers[0]!.id).expect(400)
    const settled = threadSchema.parse((await settle(helper, answers[1]!.id).expect(200)).body)
    expect(settled).toMatchObject({ state: 'settled', settledBy: 'Petra' })
    expect(settled.answers.map((answer) => answer.markdown)).toEqual(['Inside.', 'Outside.'])
    const again = threadSchema.parse((await settle(asker, answers[1]!.id).expect(200)).body)
    expect(again.settledBy).toBe('Petra')

    await neighbour.delete(`/api/questions/${id}/settlement`).expect(403)
    await asker.delete(`/api/questions/${id}/settlement`).expect(200)
    expect(await readThread(asker, id)).toMatchObject({ state: 'open', settledAnswerId: null })
    const kinds = (await readEvents(asker, path, 0)).events
      .filter((event) => event.thread.id === id)
      .map((event) => event.kind)
    expect(kinds).toEqual(['asked', 'answered', 'answered', 'settled', 'unsettled'])
  })

  it('opens a question again when the answer that settled it is deleted', async () => {
    const { asker, neighbour, helper, path } = await createScene(app)
    const { id } = await ask(asker, path)
    const { answers } = await reply(helper, id)
    await asker
      .put(`/api/questions/${id}/settlement`)
      .send({ answerId: answers[0]!.id })
      .expect(200)
    await neighbour.delete(`/api/answers/${answers[0]!.id}`).expect(403)
    await helper.delete(`/api/answers/${answers[0]!.id}`).expect(200)
    expect(await readThread(asker, id)).toMatchObject({ state: 'open', answers: [] })
    await helper.delete(`/api/answers/${answers[0]!.id}`).expect(404)
  })

  it('takes a deleted question away with its answers, and tells of it once without its words', async () => {
    const { asker, neighbour, owner, path } = await createScene(app)
    const { id } = await ask(asker, path, { title: 'A secret', markdown: 'my address' })
    const { answers } = await reply(neighbour, id)
    await neighbour.delete(`/api/questions/${id}`).expect(403)
    await owner.delete(`/api/questions/${id}`).expect(204)
    await owner.delete(`/api/questions/${id}`).expect(404)
    await asker.get(`/api/questions/${id}`).expect(404)
    await neighbour
      .patch(`/api/answers/${answers[0]!.id}`)
      .send({ version: 1, markdown: 'x' })
      .expect(404)
    expect((await readThreads(asker, path)).items).toEqual([])
    const { events } = await readEvents(asker, path, 2)
    expect(events).toHaveLength(1)
    expect(events[0]).toMatchObject({
      kind: 'deleted',
      thread: { id, isDeleted: true, answers: [] },
    })
    expect(JSON.stringify(events)).not.toMatch(/secret|address|Jo Varga/)
  })

  it('keeps the discussion of a member who is gone', async () => {
    const { asker, helper, path, people } = await createScene(app)
    const { id } = await ask(helper, path)
    await reply(asker, id)
    await db.delete(users).where(eq(users.id, people.helper.id))
    const thread = await readThread(asker, id)
    expect(thread.writer).toEqual({ id: null, name: 'a former member', place: 'learner' })
  })
})
