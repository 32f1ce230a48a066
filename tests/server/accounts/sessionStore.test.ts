import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sweepSessions } from '../../../server/accounts/sessions.service'
import { db } from '../../../server/db/client'
import { idempotencyKeys, rateLimits, sessions } from '../../../server/db/schema'
import { createSessionCookie, startTestApp, type TestApp } from '../../support/app'
import { createIssuedCourse, createKitItem, createUser } from '../../support/factories'

const day = 24 * 3600_000

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const sessionsOf = (userId: number) => db.select().from(sessions).where(eq(sessions.userId, userId))
const isSignedIn = async (cookie: string) => {
  const { body } = await app.asVisitor().get('/api/accounts/me').set('Cookie', cookie)
  return body.user !== null
}

describe('a session', () => {
  it('7.3.1 ends when it is not used for the idle limit', async () => {
    const { id } = await createUser()
    const cookie = await createSessionCookie(id)
    expect(await isSignedIn(cookie)).toBe(true)
    await db
      .update(sessions)
      .set({ expiresAt: new Date(Date.now() - 1000) })
      .where(eq(sessions.userId, id))
    expect(await isSignedIn(cookie)).toBe(false)
  })

  it('7.3.2 ends thirty days after signing in, however much it is used', async () => {
    const { id } = await createUser()
    const cookie = await createSessionCookie(id)
    const [row] = await sessionsOf(id)
    const age = async (days: number) => {
      const data = { ...JSON.parse(row?.data ?? ''), signedInAt: Date.now() - days * day }
      await db
        .update(sessions)
        .set({ data: JSON.stringify(data) })
        .where(eq(sessions.userId, id))
      return isSignedIn(cookie)
    }
    expect(await age(29.9)).toBe(true)
    expect(await age(30.1)).toBe(false)
    expect(await isSignedIn(cookie)).toBe(false)
  })

  it('7.2.2 is not believed with another signature, or none', async () => {
    const cookie = await createSessionCookie((await createUser()).id)
    expect(await isSignedIn(cookie)).toBe(true)
    expect(await isSignedIn(`${cookie.slice(0, -3)}abc`)).toBe(false)
    const sid =
      decodeURIComponent(cookie.split('=')[1] ?? '')
        .slice(2)
        .split('.')[0] ?? ''
    expect(await isSignedIn(`gf=${sid}`)).toBe(false)
  })

  it('7.4.1 is not brought back by a request that was under way when it ended', async () => {
    const course = await createIssuedCourse({
      isSample: true,
      furnish: ({ id }) => createKitItem(id, { key: 'gloves' }),
    })
    const path = `/api/courses/${course.slug}/lessons/${course.lesson.key}/kit-ticks`
    for (let turn = 0; turn < 8; turn++) {
      const agent = await app.asUser({ id: course.ownerId })
      await Promise.all([
        agent.put(path).send({ ticked: ['gloves'] }),
        agent.put(path).send({ ticked: ['gloves'] }),
        agent.delete('/api/sessions/current'),
      ])
      expect(await sessionsOf(course.ownerId)).toEqual([])
    }
  })

  it('is not kept for a visitor who only looks around', async () => {
    const before = await db.$count(sessions)
    for (const path of ['/api/accounts/me', '/api/courses', '/api/nothing']) {
      const { headers } = await app.asVisitor().get(path)
      expect(headers['set-cookie']).toBeUndefined()
    }
    expect(await db.$count(sessions)).toBe(before)
  })

  it('that cannot be read breaks one request and not the server', async () => {
    const { id } = await createUser()
    const cookie = await createSessionCookie(id)
    await db.update(sessions).set({ data: '{"cookie":' }).where(eq(sessions.userId, id))
    await app.asVisitor().get('/api/accounts/me').set('Cookie', cookie).expect(500)
    await app.asVisitor().get('/api/accounts/me').expect(200)
  })
})

describe('sweeping', () => {
  it('takes away what is over and leaves what lives', async () => {
    const [idle, old, alive] = [await createUser(), await createUser(), await createUser()]
    for (const { id } of [idle, old, alive]) await createSessionCookie(id)
    const past = (days: number) => new Date(Date.now() - days * day)
    await db
      .update(sessions)
      .set({ expiresAt: past(1) })
      .where(eq(sessions.userId, idle.id))
    await db
      .update(sessions)
      .set({ createdAt: past(31) })
      .where(eq(sessions.userId, old.id))
    await db.insert(rateLimits).values([
      { key: 'over', hits: 1, resetsAt: past(1) },
      { key: 'running', hits: 1, resetsAt: past(-1) },
    ])
    const key = { userId: alive.id, route: 'POST x', fingerprint: 'f' }
    await db.insert(idempotencyKeys).values([
      { ...key, key: 'of-last-month', createdAt: past(31) },
      { ...key, key: 'of-today' },
    ])
    await sweepSessions()
    expect(await sessionsOf(idle.id)).toEqual([])
    expect(await sessionsOf(old.id)).toEqual([])
    expect(await sessionsOf(alive.id)).toHaveLength(1)
    const limits = (await db.select().from(rateLimits)).map((row) => row.key)
    expect(limits).toContain('running')
    expect(limits).not.toContain('over')
    expect((await db.select().from(idempotencyKeys)).map((row) => row.key)).toEqual(['of-today'])
  })
})
