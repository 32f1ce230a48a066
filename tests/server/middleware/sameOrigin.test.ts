import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestApp, type TestApp } from '../../support/app'
import { createUser } from '../../support/factories'
import { listRoutes } from '../../support/routes'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('a write from elsewhere', () => {
  it('3.5.1 is refused on every route, before anything else is looked at', async () => {
    const writes = listRoutes(app.app).filter((route) => /^(POST|PUT|PATCH|DELETE) /.test(route))
    expect(writes.length).toBeGreaterThan(25)
    for (const route of writes) {
      const [method = '', path = ''] = route.split(' ')
      const answer = await fetch(`${app.url}/api${path.replace(/:[a-zA-Z]+/g, '1')}`, {
        method,
        headers: { Origin: 'https://elsewhere.example' },
      })
      const body = (await answer.json()) as { code: string }
      expect([route, answer.status, body.code]).toEqual([route, 403, 'other-origin'])
    }
  })

  it.each([
    ['no word of where it comes from', {}],
    ['another site', { 'Sec-Fetch-Site': 'cross-site' }],
    ['a neighbour of the same site', { 'Sec-Fetch-Site': 'same-site' }],
    ['our Origin, but sent by another site', { own: true, 'Sec-Fetch-Site': 'cross-site' }],
    ['an opaque page', { Origin: 'null' }],
    ['another port', { Origin: 'http://127.0.0.1:1' }],
    ['another scheme', { scheme: 'https' }],
  ])(
    '3.5.1 is refused with %s',
    async (_what, { own, scheme, ...headers }: Record<string, unknown>) => {
      const origin = own ? app.url : scheme ? app.url.replace('http', 'https') : undefined
      const answer = await fetch(`${app.url}/api/sessions/current`, {
        method: 'DELETE',
        headers: { ...(origin ? { Origin: origin } : {}), ...(headers as Record<string, string>) },
      })
      expect(answer.status).toBe(403)
    },
  )

  it('3.5.3 cannot be dressed up as reading: nothing is written by GET', async () => {
    const agent = await app.asUser(await createUser())
    await agent.get('/api/sessions/current').expect(404)
    await agent.get('/api/accounts/me?_method=DELETE').set('X-HTTP-Method-Override', 'DELETE')
    const { body } = await agent.get('/api/accounts/me').expect(200)
    expect(body.user).not.toBeNull()
  })

  it('3.4.2 opens nothing to other sites', async () => {
    const answer = await fetch(`${app.url}/api/accounts/me`, {
      headers: { Origin: 'https://elsewhere.example' },
    })
    expect([...answer.headers.keys()].filter((name) => name.startsWith('access-control'))).toEqual(
      [],
    )
  })
})
