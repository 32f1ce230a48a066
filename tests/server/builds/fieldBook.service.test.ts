import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { fieldBookEntries } from '../../../server/db/schema'
import { fieldBookEntrySchema, type PutInFieldBook } from '../../../shared/contracts/builds'
import { pageOf } from '../../../shared/contracts/pagination'
import { startTestApp, type Agent, type TestApp } from '../../support/app'
import { createIssuedCourse, createStop, createUser, enrol } from '../../support/factories'
import { fieldsOf } from '../../support/problems'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

async function createBuild() {
  let stopKey = ''
  const course = await createIssuedCourse({
    furnish: async (lesson) => {
      stopKey = (await createStop(lesson.id)).key
    },
  })
  const learner = await createUser()
  const { buildId } = await enrol(learner.id, course)
  const entry: PutInFieldBook = {
    lessonKey: course.lesson.key,
    stopKey,
    atMs: 5000,
    calculator: 'slab',
    inputs: { length: '2,6 m', width: '1100', thickness: '4"' },
    units: 'metric',
  }
  const path = `/api/courses/${course.slug}/field-book-entries`
  return { course, learner, buildId, entry, path, agent: await app.asUser(learner) }
}

const put = (agent: Agent, path: string, entry: object, key: string = randomUUID()) =>
  agent.post(path).set('Idempotency-Key', key).send(entry)

describe('putting a number in the field book', () => {
  it('keeps the inputs as typed and computes the outputs in SI', async () => {
    const { agent, path, entry, buildId } = await createBuild()
    const made = fieldBookEntrySchema.parse((await put(agent, path, entry).expect(201)).body)
    expect(made).toMatchObject({ ...withoutUnits(entry), calculatorVersion: 1 })
    expect(made.outputs['volume']).toBeCloseTo(2.6 * 1.1 * 0.1016, 12)
    const rows = await db
      .select()
      .from(fieldBookEntries)
      .where(eq(fieldBookEntries.buildId, buildId))
    expect(rows).toMatchObject([{ inputs: entry.inputs }])
  })

  it('reads a bare number in the units it was typed in', async () => {
    const { agent, path, entry } = await createBuild()
    const imperial = {
      ...entry,
      units: 'imperial',
      inputs: { length: "10'", width: "10'", thickness: '4' },
    }
    const made = fieldBookEntrySchema.parse((await put(agent, path, imperial).expect(201)).body)
    expect(made.outputs['volume']).toBeCloseTo(3.048 * 3.048 * 0.1016, 12)
  })

  it('keeps one entry of ten copies with one key', async () => {
    const { agent, path, entry, buildId } = await createBuild()
    const key = randomUUID()
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => put(agent, path, entry, key)),
    )
    expect(new Set(answers.map(({ text }) => text)).size).toBe(1)
    const rows = await db
      .select()
      .from(fieldBookEntries)
      .where(eq(fieldBookEntries.buildId, buildId))
    expect(rows).toHaveLength(1)
    await put(agent, path, { ...entry, atMs: 1 }, key).expect(422)
  })

  it.each<[string, Partial<PutInFieldBook>, string]>([
    [
      'a depth below the ground',
      { inputs: { length: '2 m', width: '1 m', thickness: '-5' } },
      'inputs.thickness',
    ],
    [
      'words for a length',
      { inputs: { length: 'long', width: '1 m', thickness: '100' } },
      'inputs.length',
    ],
    ['a missing input', { inputs: { length: '2 m', width: '1 m' } }, 'inputs.thickness'],
    [
      'an input it does not have',
      { inputs: { length: '2 m', width: '1 m', thickness: '100', colour: 'red' } },
      'inputs.colour',
    ],
    ['a calculator there is not', { calculator: 'roof-of-gold' }, 'calculator'],
    ['a lesson of another course', { lessonKey: 'no-such-lesson' }, 'lessonKey'],
    ['a stop without its lesson', { lessonKey: null }, 'lessonKey'],
    ['a stop the lesson does not have', { stopKey: 'no-such-stop' }, 'stopKey'],
    ['a moment before the start', { atMs: -1 }, 'atMs'],
  ])('refuses %s and names the field', async (_what, change, field) => {
    const { agent, path, entry, buildId } = await createBuild()
    const { body } = await put(agent, path, { ...entry, ...change }).expect(400)
    expect(fieldsOf(body)).toContain(field)
    const rows = await db
      .select()
      .from(fieldBookEntries)
      .where(eq(fieldBookEntries.buildId, buildId))
    expect(rows).toEqual([])
  })

  it('refuses a request without a key, and everybody but the learner', async () => {
    const { course, agent, path, entry } = await createBuild()
    expect(fieldsOf((await agent.post(path).send(entry).expect(400)).body)).toEqual([
      'Idempotency-Key',
    ])
    await put(app.asVisitor(), path, entry).expect(401)
    await put(await app.asUser(await createUser()), path, entry).expect(403)
    await put(await app.asUser({ id: course.ownerId }), path, entry).expect(403)
    await put(agent, '/api/courses/nowhere/field-book-entries', entry).expect(404)
  })
})

describe('reading the field book', () => {
  it('pages through one’s own entries, the newest first', async () => {
    const { agent, path, entry } = await createBuild()
    const ids: number[] = []
    for (let n = 0; n < 3; n++) ids.unshift((await put(agent, path, entry)).body.id)
    const page = pageOf(fieldBookEntrySchema)
    const first = page.parse((await agent.get(`${path}?limit=2`).expect(200)).body)
    expect(first.items.map(({ id }) => id)).toEqual(ids.slice(0, 2))
    const rest = page.parse((await agent.get(`${path}?limit=2&cursor=${first.nextCursor}`)).body)
    expect(rest.items.map(({ id }) => id)).toEqual(ids.slice(2))
    expect(rest.nextCursor).toBeNull()
    const other = await createBuild()
    expect((await other.agent.get(other.path)).body.items).toEqual([])
  })

  it('shows under lately of the build', async () => {
    const { course, agent, path, entry } = await createBuild()
    await put(agent, path, entry).expect(201)
    const { body } = await agent.get(`/api/courses/${course.slug}/build`).expect(200)
    expect(body.lately).toMatchObject([{ lessonKey: entry.lessonKey }])
  })

  it('is for the enrolled alone', async () => {
    const { path } = await createBuild()
    await app.asVisitor().get(path).expect(401)
    await (await app.asUser(await createUser())).get(path).expect(403)
  })
})

function withoutUnits({ units: _units, ...entry }: PutInFieldBook) {
  return entry
}
