import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { startTestApp, type TestApp } from '../../support/app'
import { createUser, passphrase } from '../../support/factories'

vi.hoisted(() => {
  process.env['PUBLIC_ORIGIN'] = 'https://footing.example'
  process.env['TRUSTED_PROXIES'] = '1'
})

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const behindTls = { Origin: 'https://footing.example', 'X-Forwarded-Proto': 'https' }

async function signIn() {
  const { email } = await createUser()
  const response = await app
    .asVisitor()
    .post('/api/sessions')
    .set(behindTls)
    .send({ email, passphrase })
    .expect(201)
  return { response, cookie: String(response.headers['set-cookie']) }
}

describe('behind TLS', () => {
  it('3.3.1, 3.3.2, 3.3.4 the cookie is Secure, SameSite, HttpOnly and bound to this host', async () => {
    const { cookie } = await signIn()
    expect(cookie).toMatch(/^__Host-gf=/)
    for (const flag of ['Secure', 'HttpOnly', 'SameSite=Lax', 'Path=/'])
      expect(cookie).toContain(flag)
    expect(cookie).not.toMatch(/domain=/i)
  })

  it('3.4.1 browsers are told to come by TLS only, for a year at least', async () => {
    const { response } = await signIn()
    const seconds = /max-age=(\d+)/.exec(String(response.headers['strict-transport-security']))?.[1]
    expect(Number(seconds)).toBeGreaterThanOrEqual(31_536_000)
  })

  it('3.5.1 our own host without TLS is another origin', async () => {
    const send = app.asVisitor().delete('/api/sessions/current')
    await send.set({ Origin: app.url, 'X-Forwarded-Proto': 'https' }).expect(403)
  })

  it('7.4.1 signing out takes the same cookie away', async () => {
    const { cookie } = await signIn()
    const [pair = ''] = cookie.split(';')
    const out = await app
      .asVisitor()
      .delete('/api/sessions/current')
      .set({ ...behindTls, Cookie: pair })
      .expect(204)
    expect(String(out.headers['set-cookie'])).toMatch(/^__Host-gf=;.*Expires=Thu, 01 Jan 1970/)
    const { body } = await app
      .asVisitor()
      .get('/api/accounts/me')
      .set({ ...behindTls, Cookie: pair })
    expect(body.user).toBeNull()
  })
})
