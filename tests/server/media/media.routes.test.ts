import { mkdir, writeFile } from 'node:fs/promises'
import { get } from 'node:http'
import { join } from 'node:path'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { config } from '../../../server/config'
import { db } from '../../../server/db/client'
import { kitTicks, lessons, videos } from '../../../server/db/schema'
import { createSessionCookie, startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  createCourse,
  createInstructor,
  createIssuedCourse,
  createKitItem,
  createLesson,
  createRevision,
  createStage,
  createUser,
  createVideo,
  enrol,
  issueRevision,
} from '../../support/factories'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
  await mkdir(join(config.dataDir, 'media', 'videos'), { recursive: true })
})
afterAll(() => app.close())

/** A thousand bytes, each telling where it stands. */
const bytes = Buffer.from(Array.from({ length: 1000 }, (_, index) => index % 251))

async function giveFile(videoId: number, values: Partial<typeof videos.$inferInsert> = {}) {
  const storageKey = `videos/v${videoId}`
  await writeFile(join(config.dataDir, 'media', storageKey), bytes)
  await db
    .update(videos)
    .set({ storageKey, posterKey: storageKey, bytes: bytes.length, ...values })
    .where(eq(videos.id, videoId))
}

async function setUp(options: Parameters<typeof createIssuedCourse>[0] = {}) {
  const course = await createIssuedCourse(options)
  await giveFile(course.video.id)
  const path = `/api/media/videos/${course.video.id}`
  const learner = await createUser()
  await enrol(learner.id, course)
  return { course, learner, file: `${path}/file`, poster: `${path}/poster` }
}

const statusOf = async (person: { id: number } | null, path: string) =>
  (await (person ? await app.asUser(person) : app.asVisitor()).get(path)).status

describe('GET media/videos/:videoId/file', () => {
  // Expectations by RFC 9110, sections 13 and 14.
  const etag = /^"[^"]+"$/
  it.each<[string, string | undefined, number, string | undefined, number]>([
    ['no range', undefined, 200, undefined, 1000],
    ['the first bytes', 'bytes=0-99', 206, 'bytes 0-99/1000', 100],
    ['bytes from within', 'bytes=100-199', 206, 'bytes 100-199/1000', 100],
    ['one byte', 'bytes=999-999', 206, 'bytes 999-999/1000', 1],
    ['an open end', 'bytes=900-', 206, 'bytes 900-999/1000', 100],
    ['a suffix', 'bytes=-10', 206, 'bytes 990-999/1000', 10],
    ['a suffix longer than the file', 'bytes=-5000', 206, 'bytes 0-999/1000', 1000],
    ['an end after the file', 'bytes=900-5000', 206, 'bytes 900-999/1000', 100],
    ['a start after the file', 'bytes=1000-', 416, 'bytes */1000', -1],
    ['an empty suffix', 'bytes=-0', 416, 'bytes */1000', -1],
    ['an unknown unit', 'lines=1-2', 200, undefined, 1000],
    ['nonsense', 'bytes=a-b', 200, undefined, 1000],
  ])('answers %s', async (_what, range, status, contentRange, length) => {
    const { learner, file } = await setUp()
    const agent = await app.asUser(learner)
    const request = agent.get(file).buffer(true)
    const answer = await (range === undefined ? request : request.set('Range', range))
    expect([answer.status, answer.headers['content-range']]).toEqual([status, contentRange])
    expect(answer.headers['accept-ranges']).toBe('bytes')
    if (length < 0) {
      expect(answer.headers['content-type']).toContain('application/problem+json')
      return
    }
    expect(answer.headers['content-length']).toBe(String(length))
    expect(answer.headers['content-type']).toBe('video/mp4')
    expect(answer.headers['etag']).toMatch(etag)
    const from = Number(/bytes (\d+)-/.exec(contentRange ?? '')?.[1] ?? 0)
    expect(Buffer.compare(answer.body as Buffer, bytes.subarray(from, from + length))).toBe(0)
  })

  it('3.2.1 answers HEAD as GET without the bytes', async () => {
    const { learner, file } = await setUp()
    const agent = await app.asUser(learner)
    const whole = await agent.head(file).expect(200)
    expect(whole.headers).toMatchObject({ 'content-length': '1000', 'accept-ranges': 'bytes' })
    expect(whole.headers['cache-control']).toMatch(/^private/)
    expect(whole.headers['x-content-type-options']).toBe('nosniff')
  })

  it('gives the range while the file is the same, and the whole file when it is not', async () => {
    const { learner, file } = await setUp()
    const agent = await app.asUser(learner)
    const tag = (await agent.head(file)).headers['etag'] as string
    const ask = (ifRange: string) =>
      agent.get(file).set('Range', 'bytes=0-9').set('If-Range', ifRange)
    expect((await ask(tag)).status).toBe(206)
    expect((await ask('"another"')).status).toBe(200)
    expect((await agent.get(file).set('If-None-Match', tag)).status).toBe(304)
  })

  it('survives a browser that breaks off', async () => {
    const { course, learner, file } = await setUp()
    await writeFile(
      join(config.dataDir, 'media', `videos/v${course.video.id}`),
      Buffer.alloc(30_000_000),
    )
    const cookie = await createSessionCookie(learner.id)
    await new Promise<void>((resolve) => {
      get(app.url + file, { headers: { Cookie: cookie } }, (response) => {
        response.once('data', () => {
          response.destroy()
          resolve()
        })
      })
    })
    expect(await statusOf(learner, `/api/media/videos/${course.video.id}/poster`)).toBe(200)
  })

  it('is for staff and those who may watch a lesson that shows it', async () => {
    const { course, learner, file, poster } = await setUp()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    const admin = await createUser({ role: 'admin' })
    for (const person of [learner, helper, admin, { id: course.ownerId }]) {
      expect(await statusOf(person, file)).toBe(200)
      expect(await statusOf(person, poster)).toBe(200)
    }
    for (const path of [file, poster]) {
      expect(await statusOf(null, path)).toBe(401)
      expect(await statusOf(await createUser(), path)).toBe(403)
      expect(await statusOf(await createInstructor(), path)).toBe(403)
    }
    expect(await statusOf(learner, '/api/media/videos/999999/file')).toBe(404)
  })

  it('is open to everyone where the lesson is a sample', async () => {
    const { file, poster } = await setUp({ isSample: true })
    expect(await statusOf(null, file)).toBe(200)
    expect(await statusOf(await createUser(), poster)).toBe(200)
  })

  it('2.3.1 waits for the kit check of its lesson, the poster does not', async () => {
    let kit: { id: number }[] = []
    const { learner, course, file, poster } = await setUp({
      furnish: async ({ id }) => {
        kit = [await createKitItem(id), await createKitItem(id)]
      },
    })
    const agent = await app.asUser(learner)
    const refused = await agent.get(file).expect(403)
    expect(refused.body.code).toBe('kit-check-first')
    await agent.get(poster).expect(200)
    const ofLesson = `/api/courses/${course.slug}/lessons/${course.lesson.key}/poster`
    const picture = await agent.get(ofLesson).expect(200)
    expect(picture.headers).toMatchObject({ 'cache-control': 'private, no-cache' })
    await agent
      .get(ofLesson)
      .set('If-None-Match', picture.headers['etag'] as string)
      .expect(304)
    await db.insert(kitTicks).values({ userId: learner.id, kitItemId: kit[0]!.id })
    await agent.get(file).expect(403)
    await db.insert(kitTicks).values({ userId: learner.id, kitItemId: kit[1]!.id })
    await agent.get(file).expect(200)
    expect(await statusOf({ id: course.ownerId }, file)).toBe(200)
  })

  it('waits for the kit check of a sample lesson in a visitor’s session', async () => {
    let key = ''
    const { course, file } = await setUp({
      isSample: true,
      furnish: async ({ id }) => {
        key = (await createKitItem(id)).key
      },
    })
    const visitor = app.asVisitor()
    await visitor.get(file).expect(403)
    await visitor
      .put(`/api/courses/${course.slug}/lessons/${course.lesson.key}/kit-ticks`)
      .send({ ticked: [key] })
      .expect(200)
    await visitor.get(file).expect(200)
    await app.asVisitor().get(file).expect(403)
  })

  it('follows the revision a person reads', async () => {
    const { course, learner, file } = await setUp()
    const next = await createRevision(course.id, { number: 1 })
    const lesson = await createLesson(await createStage(next), { key: course.lesson.key })
    const video = await createVideo(course.id, lesson)
    await giveFile(video.id)
    const newFile = `/api/media/videos/${video.id}/file`
    expect(await statusOf(learner, newFile)).toBe(403)
    expect(await statusOf({ id: course.ownerId }, newFile)).toBe(200)
    await issueRevision(next)
    const later = await createUser()
    await enrol(later.id, { id: course.id, revisionId: next })
    expect(await statusOf(later, newFile)).toBe(200)
    expect(await statusOf(later, file)).toBe(403)
    expect(await statusOf(learner, file)).toBe(200)
    expect(await statusOf(learner, newFile)).toBe(403)
  })

  it('is not there while the video is not ready, or its file is gone', async () => {
    const owner = await createInstructor()
    const course = await createCourse({ owner })
    const lesson = await createLesson(await createStage(course.revisionId))
    const video = await createVideo(course.id, null, { lessonKey: lesson.key, state: 'checking' })
    expect(await statusOf(owner, `/api/media/videos/${video.id}/file`)).toBe(404)
    await db.update(videos).set({ state: 'ready' }).where(eq(videos.id, video.id))
    expect(await statusOf(owner, `/api/media/videos/${video.id}/file`)).toBe(404)
    expect(await statusOf(owner, `/api/media/videos/${video.id}/poster`)).toBe(404)
    await db.update(lessons).set({ videoId: video.id }).where(eq(lessons.id, lesson.id))
    expect(await statusOf(owner, '/api/media/videos/x/file')).toBe(404)
  })

  it('reads the videos that ship with the project from their own folder', async () => {
    const { course, learner, file } = await setUp()
    const storageKey = 'demo:squaring-the-form.mp4'
    await db
      .update(videos)
      .set({ storageKey, posterKey: 'demo:squaring-the-form.webp' })
      .where(eq(videos.id, course.video.id))
    const agent = await app.asUser(learner)
    const answer = await agent.get(file).set('Range', 'bytes=4-7').expect(206)
    expect((answer.body as Buffer).toString()).toBe('ftyp')
  })
})
