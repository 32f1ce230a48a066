import { eq } from 'drizzle-orm'
import { io as connect, type Socket } from 'socket.io-client'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { sweepSessions } from '../../server/accounts/sessions.service'
import { db } from '../../server/db/client'
import { sessions } from '../../server/db/schema'
import { clientEvents, serverEvents, type Joined } from '../../shared/contracts/socketEvents'
import { createSessionCookie, startTestApp, type TestApp } from '../support/app'
import { createIssuedCourse, createUser, enrol } from '../support/factories'

let app: TestApp
const open = new Set<Socket>()
beforeAll(async () => {
  app = await startTestApp()
})
afterEach(() => {
  for (const socket of open) socket.disconnect()
  open.clear()
})
afterAll(() => app.close())

interface Opening {
  cookie?: string
  headers?: Record<string, string>
  transport?: 'websocket' | 'polling'
}

/** A line to the server; rejects when it is refused. */
async function openLine({ cookie, headers = {}, transport = 'websocket' }: Opening = {}) {
  const socket = connect(app.url, {
    transports: [transport],
    extraHeaders: { Origin: app.url, ...(cookie ? { Cookie: cookie } : {}), ...headers },
    forceNew: true,
    reconnection: false,
  })
  open.add(socket)
  await new Promise<void>((resolve, reject) => {
    socket.once('connect', () => resolve())
    socket.once('connect_error', reject)
  })
  return socket
}

const whenCut = (socket: Socket) =>
  new Promise<string[]>((resolve, reject) => {
    const heard: string[] = []
    socket.once(serverEvents.sessionEnded, () => heard.push('told'))
    socket.once('disconnect', () => resolve([...heard, 'cut']))
    setTimeout(() => reject(new Error('the line is still open')), 5000)
  })

async function createReader() {
  const course = await createIssuedCourse()
  const user = await createUser()
  await enrol(user.id, course)
  const room = { courseSlug: course.slug, lessonKey: course.lesson.key, after: 0 }
  return { user, room, cookie: await createSessionCookie(user.id) }
}

type Reply = { ok: true; data: Joined } | { ok: false; error: { code: string; detail: string } }
const ask = (socket: Socket, name: string, payload: unknown) =>
  socket.timeout(5000).emitWithAck(name, payload) as Promise<Reply>

describe('a line', () => {
  it.each(['websocket', 'polling'] as const)(
    '4.4.2 is refused to the pages of another site, by %s',
    async (transport) => {
      const elsewhere: Record<string, string>[] = [
        { Origin: 'https://elsewhere.example' },
        { Origin: 'null' },
        { 'Sec-Fetch-Site': 'cross-site' },
      ]
      for (const headers of elsewhere) {
        await expect(openLine({ headers, transport })).rejects.toThrow()
      }
      expect((await openLine({ transport })).connected).toBe(true)
    },
  )

  it('8.2.1 is asked the same policies as the routes, at every message', async () => {
    const { cookie, room } = await createReader()
    const reader = await openLine({ cookie })
    expect(await ask(reader, clientEvents.joinRoom, room)).toMatchObject({ ok: true })
    const visitor = await openLine()
    expect(await ask(visitor, clientEvents.joinRoom, room)).toMatchObject({
      error: { code: 'sign-in-first' },
    })
    const stranger = await openLine({ cookie: await createSessionCookie((await createUser()).id) })
    expect(await ask(stranger, clientEvents.joinRoom, room)).toMatchObject({
      error: { code: 'not-allowed' },
    })
  })

  it.each([
    ['nothing', undefined],
    ['a text', 'room'],
    ['a list', []],
    ['a name too many', { courseSlug: 'x', lessonKey: 'lesson', after: 0, userId: 1 }],
    ['a prototype', JSON.parse('{"__proto__":{"after":0},"courseSlug":"x","lessonKey":"abc"}')],
    ['a number that is none', { courseSlug: 'x', lessonKey: 'lesson', after: 'one' }],
  ])('2.2.2 answers a payload that is %s with a refusal and stays', async (_what, payload) => {
    const socket = await openLine()
    expect(await ask(socket, clientEvents.joinRoom, payload)).toMatchObject({
      ok: false,
      error: { code: 'invalid' },
    })
    expect(socket.connected).toBe(true)
  })

  it('2.4.1 may not say more than a person does', async () => {
    const socket = await openLine()
    const replies = await Promise.all(
      Array.from({ length: 60 }, () => ask(socket, clientEvents.leaveRoom, {})),
    )
    const codes = replies.map((reply) => (reply.ok ? 'ok' : reply.error.code))
    expect(codes.filter((code) => code === 'too-often')).toHaveLength(20)
  })

  it('is cut when it sends more than a message can be', async () => {
    const socket = await openLine()
    const cut = whenCut(socket)
    socket.emit(clientEvents.joinRoom, 'x'.repeat(40_000))
    expect(await cut).toEqual(['cut'])
  })
})

describe('7.4.1 the lines of a session', () => {
  it('end when one signs out here, and those of another device do not', async () => {
    const { user, cookie } = await createReader()
    const line = await openLine({ cookie })
    const elsewhere = await openLine({ cookie: await createSessionCookie(user.id) })
    const cut = whenCut(line)
    await app.asVisitor().delete('/api/sessions/current').set('Cookie', cookie).expect(204)
    expect(await cut).toEqual(['told', 'cut'])
    expect(elsewhere.connected).toBe(true)
  })

  it('end on every device when one signs out everywhere', async () => {
    const { user, cookie } = await createReader()
    const lines = [
      await openLine({ cookie }),
      await openLine({ cookie: await createSessionCookie(user.id) }),
    ]
    const cuts = Promise.all(lines.map(whenCut))
    await app.asVisitor().delete('/api/sessions').set('Cookie', cookie).expect(204)
    expect(await cuts).toEqual([
      ['told', 'cut'],
      ['told', 'cut'],
    ])
  })

  it('end when the session has run out, even if nobody says a word', async () => {
    const { user, cookie } = await createReader()
    const line = await openLine({ cookie })
    const cut = whenCut(line)
    await db
      .update(sessions)
      .set({ expiresAt: new Date(Date.now() - 1000) })
      .where(eq(sessions.userId, user.id))
    await sweepSessions()
    expect(await cut).toEqual(['told', 'cut'])
  })

  it('end at the next word when the session is gone by any other way', async () => {
    const { user, cookie, room } = await createReader()
    const line = await openLine({ cookie })
    const cut = whenCut(line)
    await db.delete(sessions).where(eq(sessions.userId, user.id))
    line.emit(clientEvents.joinRoom, room)
    expect(await cut).toEqual(['told', 'cut'])
  })
})
