import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { db } from '../../../server/db/client'
import { answers, questions, users } from '../../../server/db/schema'
import { startTestApp, type Agent, type TestApp } from '../../support/app'
import { fieldsOf } from '../../support/problems'
import { listRoutes } from '../../support/routes'
import { agentOf, createAccessScene, type AccessScene } from '../accessScene'

vi.hoisted(() => {
  process.env['RATE_LIMIT_FACTOR'] = '1000'
})

type Body = Record<string, unknown>
type Who = 'visitor' | 'enrolled' | 'owner' | 'asker'

/** For each route that takes a body: who may write there, and a body that could be taken. */
const table: Record<string, [Who, Body]> = {
  'POST /accounts': [
    'visitor',
    {
      displayName: 'Ines',
      email: 'ines@example.org',
      passphrase: 'gravel sand and a string',
      units: 'metric',
      isOldEnough: true,
    },
  ],
  'PATCH /accounts/me': [
    'enrolled',
    { displayName: 'Ines', about: '', units: 'metric', theme: 'sun' },
  ],
  'POST /sessions': ['visitor', { email: 'ines@example.org', passphrase: 'x' }],
  'PUT /courses/:slug/lessons/:lessonKey/kit-ticks': ['enrolled', { ticked: [] }],
  'POST /courses/:slug/lessons/:lessonKey/progress': ['enrolled', { intervals: [], positionMs: 0 }],
  'POST /courses/:slug/lessons/:lessonKey/stops/:stopKey/attempts': [
    'enrolled',
    { kind: 'quiz', answers: {} },
  ],
  'POST /courses/:slug/field-book-entries': [
    'enrolled',
    { lessonKey: null, stopKey: null, atMs: null, calculator: 'slab', inputs: {}, units: 'metric' },
  ],
  'POST /courses/:slug/lessons/:lessonKey/questions': [
    'enrolled',
    { title: 'How wet?', markdown: '', atMs: null },
  ],
  'PATCH /questions/:questionId': ['asker', { version: 1, title: 'How wet?', markdown: '' }],
  'POST /questions/:questionId/answers': ['enrolled', { markdown: 'Like porridge.' }],
  'PUT /questions/:questionId/settlement': ['asker', { answerId: 1 }],
  'PATCH /answers/:answerId': ['asker', { version: 1, markdown: 'Like porridge.' }],
  'POST /bench/courses': [
    'owner',
    { title: 'A gate', outcome: '', coverDrawing: 'deck', weekends: 1, stages: ['ground'] },
  ],
  'PATCH /bench/courses/:courseId': [
    'owner',
    {
      version: 1,
      title: 'A gate',
      outcome: '',
      weekends: 1,
      tools: [],
      hazards: [],
      coverDrawing: 'deck',
      facts: [],
      notCovered: '',
      changeNote: '',
    },
  ],
  'PUT /bench/courses/:courseId/order': ['owner', { stages: [] }],
  'POST /bench/courses/:courseId/issue': ['owner', { changeNote: '' }],
  'POST /bench/courses/:courseId/stages': ['owner', { kind: 'ground', title: 'Ground' }],
  'PATCH /bench/stages/:stageId': ['owner', { kind: 'ground', title: 'Ground' }],
  'POST /bench/stages/:stageId/lessons': ['owner', { title: 'Set the string' }],
  'PATCH /bench/lessons/:lessonId': [
    'owner',
    {
      version: 1,
      title: 'Set the string',
      summary: '',
      youWillWant: '',
      hazards: [],
      isSample: false,
      kit: [],
    },
  ],
  'POST /bench/lessons/:lessonId/stops': ['owner', { name: 'Check', atMs: 1, isRequired: true }],
  'PATCH /bench/stops/:stopId': [
    'owner',
    { version: 1, name: 'Check', atMs: 1, isRequired: true, exercise: null },
  ],
  'PUT /bench/captions/:trackId/cues': ['owner', { version: 1, cues: [] }],
  'POST /bench/courses/:courseId/own-calculators': ['owner', { definition: {} }],
  'PATCH /bench/courses/:courseId/own-calculators/:ownKey': [
    'owner',
    { version: 1, definition: {}, keepsVersion: false },
  ],
  'POST /bench/courses/:courseId/own-calculator-copies': ['owner', { fromCourseId: 1, key: 'a' }],
}
/** These take no JSON: nothing at all, the bytes of a file, or the headers of tus. */
const withoutJson = [
  'POST /accounts/me/bench',
  'POST /courses/:slug/enrolments',
  'POST /bench/lessons/:lessonId/captions',
  'POST /uploads',
  'PATCH /uploads/:uploadId',
]

let app: TestApp
let scene: AccessScene
const agents = {} as Record<Who, Agent>
beforeAll(async () => {
  app = await startTestApp()
  scene = await createAccessScene(app)
  const [question] = await db
    .select()
    .from(questions)
    .where(eq(questions.id, Number(scene.params['questionId'])))
  agents.visitor = app.asVisitor()
  agents.enrolled = await agentOf('enrolled', app, scene)
  agents.owner = await agentOf('owner', app, scene)
  agents.asker = await app.asUser({ id: question?.authorId ?? 0 })
})
afterAll(() => app.close())

/** Sends a body to a route and returns which fields the refusal names. */
async function refusedFields(route: string, body: unknown): Promise<string[]> {
  const [method = '', path = ''] = route.split(' ')
  const filled = path.replace(/:([a-zA-Z]+)/g, (_, name: string) => String(scene.params[name]))
  const verb = method.toLowerCase() as 'post' | 'put' | 'patch'
  const response = await agents[table[route]![0]]
    [verb](`/api${filled}`)
    .set('Idempotency-Key', randomUUID())
    .set('Content-Type', 'application/json')
    .send(JSON.stringify(body))
  expect([response.status, response.type]).toEqual([400, 'application/problem+json'])
  return fieldsOf(response.body)
}

const startsWith = (name: string) => (field: string) => field.split('.')[0] === name

describe('every write', () => {
  it('that takes JSON stands in the table', () => {
    const writes = listRoutes(app.app).filter((route) => /^(POST|PUT|PATCH) /.test(route))
    expect([...Object.keys(table), ...withoutJson].sort()).toEqual(writes.sort())
  })

  it.each(Object.keys(table))('2.2.2 %s names each field of a wrong type', async (route) => {
    const body = table[route]![1]
    for (const name of Object.keys(body)) {
      // Where a record is taken, only a list is of a wrong type.
      const wrong = ['answers', 'inputs'].includes(name) ? [] : { wrong: 'type' }
      const fields = await refusedFields(route, { ...body, [name]: wrong })
      expect([name, fields.some(startsWith(name))]).toEqual([name, true])
    }
  })

  it.each(Object.keys(table))('2.2.2 %s names each text that is too long', async (route) => {
    const body = table[route]![1]
    const texts = Object.entries(body).filter(([, value]) => typeof value === 'string')
    for (const [name] of texts) {
      const fields = await refusedFields(route, { ...body, [name]: 'x'.repeat(20_001) })
      expect([name, fields.some(startsWith(name))]).toEqual([name, true])
    }
    expect(await refusedFields(route, [])).not.toEqual([])
  })

  it.each(Object.keys(table))('15.3.3 %s takes no field that is not its own', async (route) => {
    const given = { ...table[route]![1], role: 'admin', userId: 1 }
    expect(await refusedFields(route, given)).toEqual(expect.arrayContaining(['role', 'userId']))
  })

  it.each(Object.keys(table))('15.3.6 %s takes no prototype', async (route) => {
    const text = JSON.stringify(table[route]![1]).replace('{', '{"__proto__":{"role":"admin"},')
    const [method = '', path = ''] = route.split(' ')
    const filled = path.replace(/:([a-zA-Z]+)/g, (_, name: string) => String(scene.params[name]))
    const verb = method.toLowerCase() as 'post' | 'put' | 'patch'
    const response = await agents[table[route]![0]]
      [verb](`/api${filled}`)
      .set('Idempotency-Key', randomUUID())
      .set('Content-Type', 'application/json')
      .send(text)
    expect(response.status).toBe(400)
    expect(fieldsOf(response.body)).toContain('__proto__')
    expect(({} as Body)['role']).toBeUndefined()
  })

  it('8.2.3 changed nothing of all this', async () => {
    expect(await db.select().from(users).where(eq(users.role, 'admin'))).toEqual([])
    expect(await db.select().from(answers)).toHaveLength(1)
  })
})

describe('a sentence for a field', () => {
  it('says what is wrong without sending back what was sent', async () => {
    const { body } = await app
      .asVisitor()
      .post('/api/accounts')
      .send({ email: 7, displayName: 'x'.repeat(61), units: 'cubits', passphrase: 'short' })
      .expect(400)
    expect(body.errors).toEqual(
      expect.arrayContaining([
        { field: 'email', message: 'This must be text.' },
        { field: 'displayName', message: 'At most 60 characters.' },
        { field: 'units', message: 'This must be one of: metric, imperial.' },
      ]),
    )
    expect(JSON.stringify(body)).not.toContain('cubits')
    expect(JSON.stringify(body)).not.toContain('Invalid input')
  })
})
