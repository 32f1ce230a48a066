import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { fenceEvents, fenceRooms } from '../../../server/db/schema'
import { startTestApp, type TestApp } from '../../support/app'
import { ask, createScene, readEvents, reply } from './fenceScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('what was missed', () => {
  it('gives what followed a number, and asks for a new reading when it was too much', async () => {
    const { asker, helper, path, course } = await createScene(app)
    expect(await readEvents(asker, path, 0)).toEqual({
      lastNumber: 0,
      isComplete: true,
      events: [],
    })
    const { id } = await ask(asker, path)
    await reply(helper, id)
    const missed = await readEvents(asker, path, 1)
    expect(missed).toMatchObject({ lastNumber: 2, isComplete: true })
    expect(missed.events.map((event) => event.number)).toEqual([2])
    expect(missed.events[0]?.thread.answers).toHaveLength(1)
    expect(await readEvents(asker, path, 9)).toMatchObject({ isComplete: false, events: [] })

    const [first] = await db.select().from(fenceEvents).where(eq(fenceEvents.questionId, id))
    const roomId = first!.roomId
    await db.insert(fenceEvents).values(
      Array.from({ length: 199 }, (_, index) => ({
        roomId,
        number: index + 3,
        questionId: id,
        kind: 'edited' as const,
      })),
    )
    await db.update(fenceRooms).set({ lastNumber: 201 }).where(eq(fenceRooms.courseId, course.id))
    expect((await readEvents(asker, path, 1)).events).toHaveLength(200)
    expect(await readEvents(asker, path, 0)).toMatchObject({ lastNumber: 201, isComplete: false })
    await asker.get(`${path}/events?after=-1`).expect(400)
    await asker.get(`${path}/events`).expect(400)
  })

  it('numbers thirty posts at once from one on without a gap', async () => {
    const { asker, neighbour, helper, path } = await createScene(app)
    await Promise.all(
      [asker, neighbour, helper].flatMap((agent) =>
        Array.from({ length: 10 }, () => ask(agent, path)),
      ),
    )
    const { events, lastNumber } = await readEvents(asker, path, 0)
    expect(lastNumber).toBe(30)
    expect(events.map((event) => event.number)).toEqual(Array.from({ length: 30 }, (_, i) => i + 1))
    expect(new Set(events.map((event) => event.thread.id)).size).toBe(30)
  })
})
