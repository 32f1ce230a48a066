import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestApp, type TestApp } from '../support/app'
import { listRoutes } from '../support/routes'
import {
  agentOf,
  createAccessScene,
  roles,
  uploadHeaders,
  type AccessScene,
  type Role,
} from './accessScene'

const everyone = 'ok  ok  ok  ok  ok  ok  ok'
const signedIn = '401 ok  ok  ok  ok  ok  ok'
const inside = '401 403 ok  ok  ok  403 ok'
const enrolled = '401 403 ok  403 403 403 403'
const staff = '401 403 403 ok  ok  403 ok'
const owner = '401 403 403 403 ok  403 ok'
/** The person of each role is not the one who wrote it. */
const nobody = '401 403 403 403 403 403 403'
/** An upload is known to its sender alone, here the owner. */
const sender = '401 404 404 404 ok  404 404'

/** Who may knock where: visitor, learner, enrolled, helper, owner, instructor of another course, admin. */
const table: Record<string, string> = {
  'GET /accounts/me': everyone,
  'POST /accounts': everyone,
  'PATCH /accounts/me': signedIn,
  'POST /accounts/me/bench': signedIn,
  'POST /sessions': everyone,
  'DELETE /sessions/current': everyone,
  'DELETE /sessions': signedIn,

  'GET /courses': everyone,
  'GET /courses/:slug': everyone,
  'POST /courses/:slug/enrolments': '401 ok  ok  403 403 ok  ok',

  'GET /courses/:slug/lessons/:lessonKey': inside,
  'PUT /courses/:slug/lessons/:lessonKey/kit-ticks': inside,
  'POST /courses/:slug/lessons/:lessonKey/progress': enrolled,
  'GET /courses/:slug/lessons/:lessonKey/stops/:stopKey': inside,
  'POST /courses/:slug/lessons/:lessonKey/stops/:stopKey/attempts': inside,

  'GET /builds': signedIn,
  'GET /courses/:slug/build': enrolled,
  'GET /courses/:slug/field-book-entries': enrolled,
  'POST /courses/:slug/field-book-entries': enrolled,

  'GET /courses/:slug/questions': everyone,
  'GET /courses/:slug/lessons/:lessonKey/questions': inside,
  'POST /courses/:slug/lessons/:lessonKey/questions': inside,
  'GET /courses/:slug/lessons/:lessonKey/events': inside,
  'GET /questions/:questionId': inside,
  'PATCH /questions/:questionId': nobody,
  'DELETE /questions/:questionId': staff,
  'POST /questions/:questionId/answers': inside,
  'PUT /questions/:questionId/settlement': staff,
  'DELETE /questions/:questionId/settlement': staff,
  'PATCH /answers/:answerId': nobody,
  'DELETE /answers/:answerId': staff,

  'GET /media/videos/:videoId/file': inside,
  'GET /media/videos/:videoId/poster': inside,
  'GET /courses/:slug/lessons/:lessonKey/poster': inside,
  'GET /media/captions/:trackId.vtt': inside,

  'GET /bench/courses': signedIn,
  'POST /bench/courses': '401 403 403 403 ok  ok  ok',
  'GET /bench/courses/:courseId': staff,
  'PATCH /bench/courses/:courseId': owner,
  'DELETE /bench/courses/:courseId': owner,
  'PUT /bench/courses/:courseId/order': owner,
  'POST /bench/courses/:courseId/issue': owner,
  'POST /bench/courses/:courseId/stages': owner,
  'PATCH /bench/stages/:stageId': owner,
  'DELETE /bench/stages/:stageId': owner,
  'POST /bench/stages/:stageId/lessons': owner,
  'GET /bench/lessons/:lessonId': staff,
  'PATCH /bench/lessons/:lessonId': owner,
  'DELETE /bench/lessons/:lessonId': owner,
  'POST /bench/lessons/:lessonId/stops': owner,
  'PATCH /bench/stops/:stopId': owner,
  'DELETE /bench/stops/:stopId': owner,
  'GET /bench/courses/:courseId/own-calculators': staff,
  'POST /bench/courses/:courseId/own-calculators': owner,
  'GET /bench/courses/:courseId/own-calculators/:ownKey': staff,
  'PATCH /bench/courses/:courseId/own-calculators/:ownKey': owner,
  'DELETE /bench/courses/:courseId/own-calculators/:ownKey': owner,
  'GET /bench/courses/:courseId/own-calculators/:ownKey/versions': staff,
  'GET /bench/courses/:courseId/copyable-own-calculators': staff,
  'POST /bench/courses/:courseId/own-calculator-copies': owner,
  'POST /bench/lessons/:lessonId/captions': owner,
  'GET /bench/captions/:trackId/cues': staff,
  'PUT /bench/captions/:trackId/cues': owner,
  'DELETE /bench/captions/:trackId': owner,

  'OPTIONS /uploads{/:uploadId}': signedIn,
  'POST /uploads': owner,
  'HEAD /uploads/:uploadId': sender,
  'PATCH /uploads/:uploadId': sender,
  'DELETE /uploads/:uploadId': sender,
}

let app: TestApp
let shared: AccessScene
beforeAll(async () => {
  app = await startTestApp()
  shared = await createAccessScene(app)
})
afterAll(() => app.close())

/** Each path part filled in from the scene; a part the scene does not know stays, and so the row fails. */
const fill = (path: string, scene: AccessScene) =>
  path
    .replace('{/:uploadId}', '')
    .replace(/:([a-zA-Z]+)/g, (part, name: string) => String(scene.params[name] ?? part))

/** An empty knock: whoever is let in hears at most that something is missing. */
async function knock(route: string, role: Role, scene: AccessScene): Promise<string> {
  const [method = '', path = ''] = route.split(' ')
  const agent = await agentOf(role, app, scene)
  const verb = method.toLowerCase() as
    'get' | 'post' | 'put' | 'patch' | 'delete' | 'head' | 'options'
  const request = agent[verb](`/api${fill(path, scene)}`).set('Idempotency-Key', randomUUID())
  if (path.startsWith('/uploads')) request.set(uploadHeaders(scene.draftLessonId))
  if (path.startsWith('/uploads/') && method === 'PATCH') {
    request.set({ 'Content-Type': 'application/offset+octet-stream', 'Upload-Offset': '0' })
    request.set('Content-Length', '0')
  } else if (['POST', 'PUT', 'PATCH'].includes(method)) void request.send({})
  const { status, body } = await request
  if (status >= 500 || body?.code === 'no-such-route') return `broken (${status})`
  return [401, 403, 404].includes(status) ? String(status) : 'ok'
}

describe('every route for every role', () => {
  it('stands in the table, and every row of the table is a route', () => {
    expect(Object.keys(table).sort()).toEqual(listRoutes(app.app).sort())
  })

  it.each(Object.entries(table))('%s', async (route, row) => {
    const expected = row.split(/\s+/)
    const found: string[] = []
    for (const [index, role] of roles.entries()) {
      const takesAway = route.startsWith('DELETE') && expected[index] === 'ok'
      const scene = takesAway ? await createAccessScene(app) : shared
      found.push(await knock(route, role, scene))
    }
    expect(Object.fromEntries(roles.map((role, index) => [role, found[index]]))).toEqual(
      Object.fromEntries(roles.map((role, index) => [role, expected[index]])),
    )
  })

  it('hides a draft from everyone but its staff', async () => {
    const path = `/api/courses/${shared.course.slug}/lessons/${shared.course.lesson.key}?draft=1`
    for (const role of roles) {
      const { body } = await (await agentOf(role, app, shared)).get(path)
      expect([role, body.isPreview === true]).toEqual([
        role,
        ['helper', 'owner', 'admin'].includes(role),
      ])
    }
  })
})

describe('an answer to what is not there', () => {
  it('is a problem in JSON under /api', async () => {
    const { body, type } = await app.asVisitor().get('/api/nothing/here').expect(404)
    expect(type).toBe('application/problem+json')
    expect(body).toMatchObject({ status: 404, code: 'no-such-route' })
  })

  it('names the trouble when the body is no JSON', async () => {
    const request = app.asVisitor().post('/api/sessions').set('Content-Type', 'application/json')
    const { body } = await request.send('{"email":').expect(400)
    expect(body).toMatchObject({ code: 'not-json', errors: [{ field: '' }] })
  })
})
