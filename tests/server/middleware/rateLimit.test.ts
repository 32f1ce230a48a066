import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { db } from '../../../server/db/client'
import { rateLimits, sessions } from '../../../server/db/schema'
import { startTestApp, type TestApp } from '../../support/app'
import {
  createIssuedCourse,
  createQuiz,
  createStop,
  createUser,
  singleQuestion,
} from '../../support/factories'

vi.hoisted(() => {
  process.env['RATE_LIMIT_FACTOR'] = '0.2'
  process.env['TRUSTED_PROXIES'] = '1'
})

let app: TestApp
let second: TestApp
beforeAll(async () => {
  app = await startTestApp()
  second = await startTestApp()
})
afterAll(async () => {
  await app.close()
  await second.close()
})

/** With one proxy in front, the address it names counts. */
const from = (on: TestApp, address: string, email: string) =>
  on
    .asVisitor()
    .post('/api/sessions')
    .set('X-Forwarded-For', address)
    .send({ email, passphrase: 'not the right one' })

describe('2.4.1 a limit', () => {
  it('6.3.1 stops guessing from one machine, on all servers together', async () => {
    const statuses: number[] = []
    for (let turn = 0; turn < 6; turn++) {
      const on = turn % 2 ? app : second
      statuses.push((await from(on, '192.0.2.1', `a${turn}@example.org`)).status)
    }
    expect(statuses).toEqual([400, 400, 400, 400, 429, 429])
    const { body, headers } = await from(app, '192.0.2.1', 'a@example.org')
    expect(body).toMatchObject({ code: 'too-often', status: 429 })
    expect(Number(headers['retry-after'])).toBeGreaterThan(0)
    expect((await from(app, '192.0.2.2', 'a@example.org')).status).toBe(400)
  })

  it('6.3.1 stops guessing at one account from many machines', async () => {
    const statuses: number[] = []
    for (let turn = 0; turn < 22; turn++) {
      const email = turn % 2 ? 'target@example.org' : ' Target@Example.org '
      statuses.push((await from(app, `198.51.100.${turn}`, email)).status)
    }
    expect(statuses).toEqual([...Array<number>(20).fill(400), 429, 429])
    expect((await from(app, '198.51.100.99', 'other@example.org')).status).toBe(400)
    const keys = (await db.select().from(rateLimits)).map((row) => row.key)
    expect(keys.join()).not.toContain('target')
  })

  it('6.3.1 is not begun anew by whoever signs in between', async () => {
    const statuses: number[] = []
    for (let turn = 0; turn < 6; turn++) {
      const agent = await app.asUser(await createUser())
      const send = agent.post('/api/sessions').set('X-Forwarded-For', '203.0.113.7')
      const guess = { email: `b${turn}@example.org`, passphrase: 'not the right one' }
      statuses.push((await send.send(guess)).status)
    }
    expect(statuses.slice(4)).toEqual([429, 429])
  })

  it('counts each of many requests at once', async () => {
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, n) => from(app, '192.0.2.77', `c${n}@example.org`)),
    )
    expect(answers.filter(({ status }) => status === 400)).toHaveLength(4)
  })

  it('keeps visitors without a cookie from filling the table of sessions', async () => {
    const course = await createIssuedCourse({
      isSample: true,
      furnish: async ({ id }) => {
        const stop = await createStop(id, { key: 'which-mix' })
        await createQuiz(stop.id, { questions: [singleQuestion()] })
      },
    })
    const before = await db.$count(sessions)
    const path = `/api/courses/${course.slug}/lessons/${course.lesson.key}/stops/which-mix`
    const statuses: number[] = []
    for (let turn = 0; turn < 52; turn++) {
      const look = app.asVisitor().get(path).set('X-Forwarded-For', '192.0.2.50')
      statuses.push((await look).status)
    }
    expect(statuses.filter((status) => status === 200)).toHaveLength(48)
    expect((await db.$count(sessions)) - before).toBe(48)
  })
})
