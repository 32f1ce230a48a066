import argon2 from 'argon2'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { db } from '../../../server/db/client'
import { sessions, users } from '../../../server/db/schema'
import { logger } from '../../../server/logger'
import { startTestApp, type TestApp } from '../../support/app'
import { createUser, nextNumber, passphrase } from '../../support/factories'
import { fieldsOf } from '../../support/problems'

vi.hoisted(() => {
  process.env['RATE_LIMIT_FACTOR'] = '1000'
})

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const someone = (values: object = {}) => ({
  displayName: 'Ines Holm',
  email: `ines-${nextNumber()}@example.org`,
  passphrase,
  units: 'imperial',
  isOldEnough: true,
  ...values,
})
const cookieOf = (headers: Record<string, unknown>) =>
  String(headers['set-cookie']).split(';')[0] ?? ''
const sidOf = (cookie: string) =>
  decodeURIComponent(cookie.split('=')[1] ?? '')
    .slice(2)
    .split('.')[0] ?? ''
const findByEmail = (email: string) => db.select().from(users).where(eq(users.email, email))

describe('signing up', () => {
  it('makes an account, signs in and says who one is', async () => {
    const agent = app.asVisitor()
    const { body } = await agent.post('/api/accounts').send(someone()).expect(201)
    expect(body.user).toMatchObject({
      displayName: 'Ines Holm',
      role: 'learner',
      units: 'imperial',
    })
    const me = await agent.get('/api/accounts/me').expect(200)
    expect(me.body.user.id).toBe(body.user.id)
  })

  it('15.3.1 sends back nothing of the passphrase, hashed or not', async () => {
    const { text } = await app.asVisitor().post('/api/accounts').send(someone()).expect(201)
    expect(text).not.toMatch(/argon2|hash|gravel/i)
  })

  it('8.2.3 takes no role from whoever signs up', async () => {
    const given = someone({ role: 'admin' })
    const { body } = await app.asVisitor().post('/api/accounts').send(given).expect(400)
    expect(fieldsOf(body)).toEqual(['role'])
    expect(await findByEmail(given.email)).toEqual([])
  })

  it('2.3.4 makes one account of ten requests with one address', async () => {
    const { email } = someone()
    const answers = await Promise.all(
      Array.from({ length: 10 }, (_, n) =>
        app
          .asVisitor()
          .post('/api/accounts')
          .send(someone({ email: n % 2 ? email : email.toUpperCase() })),
      ),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([201, ...Array<number>(9).fill(409)])
    const refused = answers.find(({ status }) => status === 409)
    expect(fieldsOf(refused?.body)).toEqual(['email'])
    expect(await findByEmail(email)).toHaveLength(1)
  })

  it.each([
    ['6.2.1 a short passphrase', { passphrase: 'eleven char' }, 'passphrase'],
    ['6.2.4 a passphrase that is guessed first', { passphrase: 'password1234' }, 'passphrase'],
    ['6.2.4 a passphrase of their own name', { passphrase: 'inesholminesholm' }, 'passphrase'],
    ['a passphrase past all measure', { passphrase: 'x'.repeat(129) }, 'passphrase'],
    ['an address without an @', { email: 'ines.example.org' }, 'email'],
    ['an empty name', { displayName: '   ' }, 'displayName'],
    ['a child', { isOldEnough: false }, 'isOldEnough'],
    ['units nobody measures in', { units: 'ells' }, 'units'],
  ])('refuses %s and names the field', async (_what, values, field) => {
    const { body } = await app.asVisitor().post('/api/accounts').send(someone(values)).expect(400)
    expect(fieldsOf(body)).toEqual([field])
  })

  it('6.2.9 takes a passphrase of a hundred characters, of any kind and just as typed', async () => {
    const long = `Zwölf 🪵 Bretter, ${'und noch eins '.repeat(6)}`.slice(0, 100)
    const given = someone({ passphrase: long })
    await app.asVisitor().post('/api/accounts').send(given).expect(201)
    const again = { email: given.email, passphrase: long }
    await app.asVisitor().post('/api/sessions').send(again).expect(201)
    const shorter = { email: given.email, passphrase: long.slice(0, 99) }
    await app.asVisitor().post('/api/sessions').send(shorter).expect(400)
  })
})

describe('signing in', () => {
  it('7.2.3 and 7.2.4 gives a new id of 128 bits or more each time, and ends the one before', async () => {
    const { email } = await createUser()
    const agent = app.asVisitor()
    const ids: string[] = []
    for (let turn = 0; turn < 3; turn++) {
      const { headers } = await agent.post('/api/sessions').send({ email, passphrase }).expect(201)
      ids.push(sidOf(cookieOf(headers)))
    }
    expect(new Set(ids).size).toBe(3)
    for (const id of ids)
      expect(Buffer.from(id, 'base64url').length * 8).toBeGreaterThanOrEqual(128)
    const rows = await db.select({ sid: sessions.sid }).from(sessions)
    expect(ids.map((sid) => rows.some((row) => row.sid === sid))).toEqual([false, false, true])
  })

  it('7.2.4 does not take over an id that someone else has chosen', async () => {
    const { email } = await createUser()
    const send = app.asVisitor().post('/api/sessions').set('Cookie', 'gf=s%3Achosen.signature')
    const { headers } = await send.send({ email, passphrase }).expect(201)
    expect(sidOf(cookieOf(headers))).not.toBe('chosen')
  })

  it('6.3.8 answers an unknown address and a wrong passphrase word for word the same', async () => {
    const { email } = await createUser()
    const wrong = { email, passphrase: 'not the right one' }
    const unknown = { email: `nobody-${nextNumber()}@example.org`, passphrase: 'not the right one' }
    const verify = vi.spyOn(argon2, 'verify')
    const first = await app.asVisitor().post('/api/sessions').send(wrong).expect(400)
    const second = await app.asVisitor().post('/api/sessions').send(unknown).expect(400)
    expect(second.text).toBe(first.text)
    expect(verify).toHaveBeenCalledTimes(2)
    const costs = verify.mock.calls.map(([hash]) => /\$m=.*?\$/.exec(hash)?.[0])
    expect(costs[1]).toBe(costs[0])
    expect(first.headers['set-cookie']).toBeUndefined()
  })

  it('1.2.4 takes an address for an address, whatever stands in it', async () => {
    for (const email of ["a'or'1'='1@example.org", 'a"--@b', '%@%']) {
      await app.asVisitor().post('/api/sessions').send({ email, passphrase }).expect(400)
    }
    const nested = { email: { $ne: '' }, passphrase: { $ne: '' } }
    await app.asVisitor().post('/api/sessions').send(nested).expect(400)
  })

  it('3.3.2 and 3.3.4 keeps the cookie from scripts and other sites', async () => {
    const { email } = await createUser()
    const { headers } = await app.asVisitor().post('/api/sessions').send({ email, passphrase })
    expect(String(headers['set-cookie'])).toMatch(/HttpOnly/)
    expect(String(headers['set-cookie'])).toMatch(/SameSite=Lax/)
  })

  it('16.3.1 is written down, refused or not, without what was typed', async () => {
    const { id, email } = await createUser()
    const lines: unknown[] = []
    vi.spyOn(logger, 'info').mockImplementation((line: unknown) => void lines.push(line))
    vi.spyOn(logger, 'warn').mockImplementation((line: unknown) => void lines.push(line))
    const agent = app.asVisitor()
    await agent.post('/api/sessions').send({ email, passphrase: 'not the right one' }).expect(400)
    await agent.post('/api/sessions').send({ email, passphrase }).expect(201)
    await agent.delete('/api/sessions/current').expect(204)
    await agent.delete('/api/sessions/current').expect(204)
    expect(lines).toMatchObject([
      { event: 'sign-in', userId: null, status: 400 },
      { event: 'sign-in', userId: id, status: 201 },
      { event: 'sign-out', userId: id, status: 204 },
      { event: 'sign-out', userId: null, status: 204 },
    ])
    expect(JSON.stringify(lines)).not.toMatch(/example\.org|gravel|not the right/)
  })

  it('lifts a hash of weaker parameters to those of today', async () => {
    const weak = await argon2.hash(passphrase, { memoryCost: 8192, timeCost: 1, parallelism: 1 })
    const { id, email } = await createUser({ passwordHash: weak })
    await app.asVisitor().post('/api/sessions').send({ email, passphrase }).expect(201)
    const [row] = await db.select().from(users).where(eq(users.id, id))
    expect(row?.passwordHash).toContain('m=19456,t=2,p=1')
  })
})

describe('sessions', () => {
  it('live in the database: a second server over it knows them, and knows when they end', async () => {
    const agent = app.asVisitor()
    const given = someone()
    const { headers } = await agent.post('/api/accounts').send(given).expect(201)
    const second = await startTestApp()
    const cookie = cookieOf(headers)
    const there = () => second.asVisitor().get('/api/accounts/me').set('Cookie', cookie)
    expect((await there()).body.user.email).toBe(given.email)
    await agent.delete('/api/sessions/current').expect(204)
    expect((await there()).body.user).toBeNull()
    await second.close()
  })

  it('7.4.1 are over on the server when one signs out here, not only in the browser', async () => {
    const agent = app.asVisitor()
    const { headers } = await agent.post('/api/accounts').send(someone()).expect(201)
    const cookie = cookieOf(headers)
    await agent.delete('/api/sessions/current').expect(204)
    const { body } = await app.asVisitor().get('/api/accounts/me').set('Cookie', cookie)
    expect(body.user).toBeNull()
    await app.asVisitor().patch('/api/accounts/me').set('Cookie', cookie).send({}).expect(401)
  })

  it('7.4.3 end on all devices by one request, and nobody else’s do', async () => {
    const user = await createUser()
    const [here, there, other] = [
      await app.asUser(user),
      await app.asUser(user),
      await app.asUser(await createUser()),
    ]
    expect((await here.get('/api/accounts/me')).body.user.sessions).toBe(2)
    await here.delete('/api/sessions').expect(204)
    expect((await here.get('/api/accounts/me')).body.user).toBeNull()
    expect((await there.get('/api/accounts/me')).body.user).toBeNull()
    expect((await other.get('/api/accounts/me')).body.user).not.toBeNull()
  })

  it('7.4.2 end with the account', async () => {
    const user = await createUser()
    const agent = await app.asUser(user)
    await db.delete(users).where(eq(users.id, user.id))
    expect((await agent.get('/api/accounts/me')).body.user).toBeNull()
    await agent.post('/api/accounts/me/bench').expect(401)
  })

  it('8.3.2 follow a change of role at once', async () => {
    const user = await createUser({ role: 'instructor' })
    const agent = await app.asUser(user)
    const able = await agent.get('/api/accounts/me')
    expect(able.body.user.can.createCourse).toBe(true)
    await db.update(users).set({ role: 'learner' }).where(eq(users.id, user.id))
    await agent
      .post('/api/bench/courses')
      .set('Idempotency-Key', 'a-key-of-mine')
      .send({})
      .expect(403)
  })

  it('14.3.2 nothing about a person is kept on the way', async () => {
    const agent = await app.asUser(await createUser())
    for (const path of ['/api/accounts/me', '/api/builds', '/api/bench/courses']) {
      const { headers } = await agent.get(path).expect(200)
      expect([path, headers['cache-control']]).toEqual([path, 'no-store'])
    }
  })
})

describe('one’s own page', () => {
  it('8.2.2 changes oneself and nobody else, whatever id is sent along', async () => {
    const [own, other] = [await createUser(), await createUser()]
    const agent = await app.asUser(own)
    const { body } = await agent
      .patch('/api/accounts/me')
      .send({ displayName: 'Ines', about: 'Decks.', units: 'imperial', theme: 'sun' })
      .expect(200)
    expect(body.user).toMatchObject({ displayName: 'Ines', about: 'Decks.', theme: 'sun' })
    const stolen = { id: other.id, displayName: 'Taken' }
    expect(fieldsOf((await agent.patch('/api/accounts/me').send(stolen).expect(400)).body)).toEqual(
      ['id'],
    )
    for (const path of [`/api/accounts/${other.id}`, `/api/users/${other.id}`]) {
      await agent.patch(path).send({ displayName: 'Taken' }).expect(404)
    }
    const [row] = await db.select().from(users).where(eq(users.id, other.id))
    expect(row?.displayName).toBe(other.displayName)
  })

  it.each(['role', 'email', 'passwordHash', 'passphrase', 'createdAt'])(
    '15.3.3 does not take %s',
    async (field) => {
      const agent = await app.asUser(await createUser())
      const { body } = await agent
        .patch('/api/accounts/me')
        .send({ [field]: 'admin' })
        .expect(400)
      expect(fieldsOf(body)).toEqual([field])
    },
  )

  it('1.2.1 keeps a name as it was written and sends it as data', async () => {
    const agent = await app.asUser(await createUser())
    const displayName = '<img src=x onerror=alert(1)>'
    const { body, type } = await agent.patch('/api/accounts/me').send({ displayName }).expect(200)
    expect(body.user.displayName).toBe(displayName)
    expect(type).toBe('application/json')
  })
})

describe('opening a bench', () => {
  it('makes a learner an instructor once, and leaves an admin what they are', async () => {
    const agent = await app.asUser(await createUser())
    for (let turn = 0; turn < 2; turn++) {
      const { body } = await agent.post('/api/accounts/me/bench').expect(200)
      expect(body.user).toMatchObject({ role: 'instructor', can: { openBench: false } })
    }
    const admin = await app.asUser(await createUser({ role: 'admin' }))
    expect((await admin.post('/api/accounts/me/bench').expect(200)).body.user.role).toBe('admin')
    await app.asVisitor().post('/api/accounts/me/bench').expect(401)
  })
})
