import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { createUser } from '../../support/factories'
import { startTestApp, type TestApp } from '../../support/app'
import { fieldsOf } from '../../support/problems'
import { pool } from '../../../server/db/client'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const asJson = (text: string) =>
  app.asVisitor().post('/api/sessions').set('Content-Type', 'application/json').send(text)

describe('a request that cannot be read', () => {
  it('is 413 above two megabytes', async () => {
    const { body, type } = await asJson(JSON.stringify({ email: 'x'.repeat(3_000_000) })).expect(
      413,
    )
    expect(type).toBe('application/problem+json')
    expect(body).toMatchObject({ code: 'too-large' })
    expect(fieldsOf(body)).toEqual([''])
  })

  it('is 413 when two megabytes and more come out of a small parcel', async () => {
    const { gzipSync } = await import('node:zlib')
    const parcel = gzipSync(JSON.stringify({ email: ' '.repeat(50_000_000) }))
    expect(parcel.length).toBeLessThan(100_000)
    const answer = await fetch(`${app.url}/api/sessions`, {
      method: 'POST',
      headers: {
        Origin: app.url,
        'Content-Type': 'application/json',
        'Content-Encoding': 'gzip',
      },
      body: parcel,
    })
    expect(answer.status).toBe(413)
  })

  it('is 400 when it is nested a hundred thousand deep', async () => {
    const deep = `{"email":${'['.repeat(100_000)}${']'.repeat(100_000)}}`
    const { body } = await asJson(deep).expect(400)
    expect(fieldsOf(body)).toContain('email')
  })

  it.each(['{"email":', 'null', '"text"', '\u0000', '{"a":1}}'])(
    'is 400 when it is no JSON object (%j)',
    async (text) => {
      const { body } = await asJson(text).expect(400)
      expect(body).toMatchObject({ code: 'not-json' })
    },
  )

  it('names the missing fields when it comes in another format', async () => {
    const { body } = await app
      .asVisitor()
      .post('/api/sessions')
      .type('form')
      .send('email=a%40example.org&passphrase=x')
      .expect(400)
    expect(fieldsOf(body)).toEqual(['email', 'passphrase'])
  })

  it.each([
    '/api/courses/%E0%A4%A',
    '/api/courses/%00',
    '/api/courses?limit[a]=1&cursor=a&cursor=b',
  ])('is a problem and no breakdown: %s', async (path) => {
    const { status, type } = await app.asVisitor().get(path)
    expect([400, 404]).toContain(status)
    expect(type).toBe('application/problem+json')
  })
})

describe('a wrong address or method', () => {
  it('is a problem in JSON', async () => {
    for (const method of ['put', 'patch', 'delete'] as const) {
      const { body } = await app.asVisitor()[method]('/api/accounts').expect(404)
      expect(body).toMatchObject({ code: 'no-such-route' })
    }
    const { body } = await app.asVisitor().post('/register').send({}).expect(404)
    expect(body).toMatchObject({ code: 'no-such-route' })
  })
})

describe('what nobody foresaw', () => {
  it('16.5.1 and 13.4.2 says nothing of itself: no stack, no SQL, no path', async () => {
    const user = await createUser()
    const agent = await app.asUser(user)
    vi.spyOn(pool, 'query').mockRejectedValue(
      Object.assign(new Error('ER_SOMETHING select passphrase'), { sqlMessage: 'x', errno: 1 }),
    )
    const { body, text, type } = await agent.get('/api/accounts/me').expect(500)
    expect(type).toBe('application/problem+json')
    expect(Object.keys(body as object).sort()).toEqual([
      'code',
      'detail',
      'status',
      'title',
      'type',
    ])
    expect(text).not.toMatch(/select|ER_|node_modules|\.ts|at /)
  })
})
