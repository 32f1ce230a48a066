import { setTimeout as wait } from 'node:timers/promises'
import { eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest'
import { db } from '../../../server/db/client'
import { enrolments, sessions } from '../../../server/db/schema'
import { fenceEventSchema } from '../../../shared/contracts/fence'
import {
  clientEvents,
  joinedSchema,
  serverEvents,
  writingLastsMs,
  type RoomChanged,
} from '../../../shared/contracts/socketEvents'
import { createSessionCookie, startTestApp, type TestApp } from '../../support/app'
import { ask, createScene, reply } from './fenceScene'
import { Line } from './line'
import { patience } from '../../support/patience'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const lines: Line[] = []
afterEach(() => {
  for (const line of lines.splice(0)) line.close()
})
async function lineOf(user: { id: number } | null) {
  const line = user ? await Line.openAs(app.url, user) : await Line.open(app.url)
  lines.push(line)
  return line
}

describe('a change in a room', () => {
  it('reaches every other reader within a second, each kind of it', async () => {
    const scene = await createScene(app)
    const line = await lineOf(scene.people.neighbour)
    joinedSchema.parse(await line.join(scene.room))
    const expectNext = async (kind: string, change: () => Promise<unknown>) => {
      const before = line.events.length
      await change()
      const committedAt = performance.now()
      await vi.waitFor(() => expect(line.events).toHaveLength(before + 1), {
        timeout: 1000,
        interval: 5,
      })
      expect(performance.now() - committedAt).toBeLessThan(1000)
      const event = fenceEventSchema.parse(line.events.at(-1))
      expect(event).toMatchObject({ kind, number: before + 1 })
      return event.thread
    }
    const { id } = await expectNext('asked', () => ask(scene.asker, scene.path))
    const answered = await expectNext('answered', () => reply(scene.helper, id))
    const answerId = answered.answers[0]!.id
    await expectNext('edited', () =>
      scene.helper.patch(`/api/answers/${answerId}`).send({ version: 1, markdown: 'Inside!' }),
    )
    await expectNext('settled', () =>
      scene.asker.put(`/api/questions/${id}/settlement`).send({ answerId }),
    )
    await expectNext('unsettled', () => scene.asker.delete(`/api/questions/${id}/settlement`))
    const deleted = await expectNext('deleted', () => scene.asker.delete(`/api/questions/${id}`))
    expect(deleted).toMatchObject({ isDeleted: true, title: '' })
  })

  it('is told of once, by the request that did the work', async () => {
    const scene = await createScene(app)
    const line = await lineOf(scene.people.neighbour)
    await line.join(scene.room)
    const body = { title: 'Once?', markdown: '', atMs: null }
    const copies = Array.from({ length: 5 }, () =>
      scene.asker
        .post(`${scene.path}/questions`)
        .set('Idempotency-Key', 'one-key-for-all')
        .send(body),
    )
    await Promise.all(copies)
    await wait(150)
    expect(line.events.map((event) => event.number)).toEqual([1])
  })

  it('stays in its room', async () => {
    const [here, elsewhere] = [await createScene(app), await createScene(app)]
    const line = await lineOf(elsewhere.people.asker)
    await line.join(elsewhere.room)
    await ask(here.asker, here.path)
    await ask(elsewhere.asker, elsewhere.path, { title: 'Ours' })
    await vi.waitFor(() => expect(line.events).toHaveLength(1), patience)
    expect(line.events[0]?.thread.title).toBe('Ours')
  })

  it('is neither missed nor told twice over twenty cut lines', { timeout: 40_000 }, async () => {
    const scene = await createScene(app)
    const { people, room, path } = scene
    const cookie = await createSessionCookie(people.neighbour.id)
    const seen: number[] = []
    let lastNumber = 0
    const take = (number: number) => {
      if (number <= lastNumber) return
      seen.push(number)
      lastNumber = number
    }
    const line = await Line.open(app.url, { Cookie: cookie }, true)
    lines.push(line)
    const steady = await lineOf(people.owner)
    await steady.join(room)
    const waiting: RoomChanged['event'][] = []
    let isJoining = true
    line.socket.on(serverEvents.roomChanged, ({ event }: RoomChanged) => {
      if (isJoining) waiting.push(event)
      else take(event.number)
    })
    const join = async () => {
      isJoining = true
      const { catchUp } = await line.join(room, lastNumber)
      expect(catchUp.isComplete).toBe(true)
      for (const event of [...catchUp.events, ...waiting.splice(0)]) take(event.number)
      isJoining = false
    }
    let cuts = 0
    line.socket.on('connect', () => void join().catch(() => undefined))
    await join()

    const writers = [scene.asker, scene.helper, scene.neighbour]
    const posting = (async () => {
      for (let count = 0; count < 30; count++) {
        await ask(writers[count % 3]!, path, { title: `Question ${count}` })
        await wait(40)
      }
    })()
    while (cuts < 20) {
      await vi.waitFor(() => expect(line.socket.connected).toBe(true), {
        timeout: 3000,
        interval: 3,
      })
      await wait(Math.random() * 40)
      line.socket.io.engine.close()
      cuts++
    }
    await posting
    await vi.waitFor(() => expect(seen).toHaveLength(30), { timeout: 5000 })
    const all = Array.from({ length: 30 }, (_, index) => index + 1)
    expect(seen).toEqual(all)
    expect(steady.events.map((event) => event.number).sort((a, b) => a - b)).toEqual(all)
  })
})

describe('who is here and who writes', () => {
  it('names people once and counts visitors, as they come and go', async () => {
    const scene = await createScene(app, { isSample: true })
    const first = await lineOf(scene.people.asker)
    await first.join(scene.room)
    const second = await lineOf(scene.people.asker)
    await second.join(scene.room)
    const visitor = await lineOf(null)
    const joined = await visitor.join(scene.room)
    expect(joined.presence).toEqual({
      ...scene.room,
      here: [{ id: scene.people.asker.id, name: 'Jo Varga' }],
      count: 2,
    })
    visitor.close()
    await vi.waitFor(() => expect(first.presences.at(-1)?.count).toBe(1), patience)
    second.close()
    const anke = await lineOf(scene.people.neighbour)
    await anke.join(scene.room)
    await vi.waitFor(
      () =>
        expect(first.presences.at(-1)?.here.map((person) => person.name)).toEqual([
          'Jo Varga',
          'Anke',
        ]),
      patience,
    )
    await anke.send(clientEvents.leaveRoom, scene.room)
    await vi.waitFor(() => expect(first.presences.at(-1)?.here).toHaveLength(1), patience)
  })

  it(
    'says who writes to the others, and takes it back by itself',
    { timeout: 12_000 },
    async () => {
      const scene = await createScene(app)
      const reader = await lineOf(scene.people.asker)
      await reader.join(scene.room)
      const writer = await lineOf(scene.people.neighbour)
      await writer.join(scene.room)
      const word = { ...scene.room, questionId: null, isWriting: true }
      expect(await writer.send(clientEvents.writing, word)).toEqual({ ok: true, data: {} })
      await vi.waitFor(() => expect(reader.writings).toHaveLength(1), patience)
      expect(reader.writings[0]).toMatchObject({ isWriting: true, person: { name: 'Anke' } })
      expect(writer.writings).toEqual([])
      const saidAt = performance.now()
      await vi.waitFor(() => expect(reader.writings).toHaveLength(2), {
        timeout: writingLastsMs + 1000,
      })
      expect(performance.now() - saidAt).toBeGreaterThan(writingLastsMs - 500)
      expect(reader.writings[1]?.isWriting).toBe(false)
      await writer.send(clientEvents.writing, word)
      writer.close()
      await vi.waitFor(() => expect(reader.writings.at(-1)?.isWriting).toBe(false), patience)
      expect(reader.writings).toHaveLength(4)
    },
  )
})

describe('what a line may do', () => {
  it('refuses to join a room that may not be read', async () => {
    const scene = await createScene(app)
    const code = async (line: Line) => {
      const reply = await line.send(clientEvents.joinRoom, { ...scene.room, after: 0 })
      return reply.ok ? 'ok' : reply.error.code
    }
    expect(await code(await lineOf(null))).toBe('sign-in-first')
    const stranger = await lineOf(scene.people.stranger)
    expect(await code(stranger)).toBe('not-allowed')
    expect(await code(await lineOf(scene.people.asker))).toBe('ok')
    await ask(scene.asker, scene.path)
    await wait(150)
    expect(stranger.events).toEqual([])
    const nowhere = { ...scene.room, lessonKey: 'no-such-lesson' }
    const reply = await stranger.send(clientEvents.joinRoom, { ...nowhere, after: 0 })
    expect(reply).toMatchObject({ ok: false, error: { code: 'not-found' } })
  })

  it('asks the database at every message, not the line', async () => {
    const scene = await createScene(app)
    const line = await lineOf(scene.people.asker)
    await line.join(scene.room)
    await db.delete(enrolments).where(eq(enrolments.userId, scene.people.asker.id))
    const word = { ...scene.room, questionId: null, isWriting: true }
    expect(await line.send(clientEvents.writing, word)).toMatchObject({
      ok: false,
      error: { code: 'not-allowed' },
    })
  })

  it('lets a visitor read a sample lesson, but not say that they write', async () => {
    const scene = await createScene(app, { isSample: true })
    const line = await lineOf(null)
    await line.join(scene.room)
    const word = { ...scene.room, questionId: null, isWriting: true }
    expect(await line.send(clientEvents.writing, word)).toMatchObject({
      ok: false,
      error: { code: 'sign-in-first' },
    })
    await ask(scene.asker, scene.path)
    await vi.waitFor(() => expect(line.events).toHaveLength(1), patience)
  })

  it.each([
    [clientEvents.joinRoom, undefined],
    [clientEvents.joinRoom, { courseSlug: 'x', lessonKey: 'abc' }],
    [clientEvents.joinRoom, { courseSlug: 'x', lessonKey: 'abc', after: -1 }],
    [clientEvents.joinRoom, { courseSlug: 'x', lessonKey: 'abc', after: 0, actor: { id: 1 } }],
    [clientEvents.leaveRoom, 'everything'],
    [clientEvents.writing, { courseSlug: 'x', lessonKey: 'abc', questionId: '1', isWriting: 1 }],
  ])('refuses %s with %j', async (name, payload) => {
    const line = await lineOf(null)
    expect(await line.send(name, payload)).toMatchObject({ ok: false, error: { code: 'invalid' } })
    line.socket.emit(name, payload)
    expect(line.socket.connected).toBe(true)
  })

  it('slows a line that sends too much', async () => {
    const line = await lineOf(null)
    const room = { courseSlug: 'x', lessonKey: 'abc' }
    const replies = await Promise.all(
      Array.from({ length: 60 }, () => line.send(clientEvents.leaveRoom, room)),
    )
    expect(replies.filter((reply) => reply.ok)).toHaveLength(40)
    expect(replies.at(-1)).toMatchObject({ ok: false, error: { code: 'too-often' } })
  })

  it('cuts a line that sends more than 32 KiB at once', async () => {
    const line = await lineOf(null)
    const cut = new Promise((resolve) => line.socket.once('disconnect', resolve))
    line.socket.emit(clientEvents.leaveRoom, { courseSlug: 'x'.repeat(40_000), lessonKey: 'abc' })
    await cut
    expect((await app.asVisitor().get('/api/accounts/me')).status).toBe(200)
  })
})

describe('the line and the session', () => {
  it('refuses a handshake from another site (ASVS 4.4.2)', async () => {
    await expect(Line.open(app.url, { Origin: 'https://elsewhere.example' })).rejects.toThrow()
    await expect(Line.open(app.url, { 'Sec-Fetch-Site': 'cross-site' })).rejects.toThrow()
  })

  it('is cut at sign-out, and only that device (ASVS 7.4.1)', async () => {
    const scene = await createScene(app)
    const cookie = await createSessionCookie(scene.people.asker.id)
    const line = await Line.open(app.url, { Cookie: cookie })
    const other = await lineOf(scene.people.asker)
    lines.push(line)
    await line.join(scene.room)
    const cut = new Promise((resolve) => line.socket.once('disconnect', resolve))
    const agent = app.asVisitor()
    await agent.delete('/api/sessions/current').set('Cookie', cookie).expect(204)
    await cut
    expect(line.isSessionEnded).toBe(true)
    await wait(50)
    expect(other.socket.connected).toBe(true)
  })

  it('is cut at the next message when the session ended elsewhere (ASVS 7.4.2)', async () => {
    const scene = await createScene(app)
    const line = await lineOf(scene.people.asker)
    await line.join(scene.room)
    await db.delete(sessions).where(eq(sessions.userId, scene.people.asker.id))
    const cut = new Promise((resolve) => line.socket.once('disconnect', resolve))
    line.socket.emit(clientEvents.leaveRoom, scene.room)
    await cut
    expect(line.isSessionEnded).toBe(true)
  })
})
