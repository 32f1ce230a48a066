import { existsSync } from 'node:fs'
import { appendFile, readdir } from 'node:fs/promises'
import type { AddressInfo } from 'node:net'
import { join } from 'node:path'
import { eq } from 'drizzle-orm'
import express from 'express'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { config } from '../../../server/config'
import { db } from '../../../server/db/client'
import { jobs, lessons } from '../../../server/db/schema'
import { createUploadsRouter } from '../../../server/media/uploads.routes'
import { createUploads, sweepUploads } from '../../../server/media/uploads.service'
import { errorHandler } from '../../../server/middleware/errorHandler'
import { benchLessonSchema } from '../../../shared/contracts/benchCourses'
import { startTestApp, type TestApp } from '../../support/app'
import { createCaptions, createVideo } from '../../support/factories'
import { readFilm } from '../../support/films'
import { codeOf, setUpUpload, waitUntilChecked } from './uploadScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const setUp = () => setUpUpload(app)

describe('a finished upload', () => {
  it('is taken over when the server was killed between its last byte and the answer', async () => {
    const { open, patch, findVideo } = await setUp()
    const path = await open(500)
    await patch(path, 0, Buffer.alloc(499))
    await appendFile(join(config.dataDir, 'uploads', path.slice(1)), Buffer.alloc(1))
    expect(await findVideo()).toBeUndefined()
    await sweepUploads()
    expect(await findVideo()).toMatchObject({ bytes: 500, state: 'checking' })
  })

  it('is refused in a sentence when it is no video, whatever its name, and the one before stays', async () => {
    const { owner, course, lesson, open, patch } = await setUp()
    const before = await createVideo(course.id, lesson)
    const text = Buffer.from('Just a few words, called film.mp4.')
    const path = await open(text.length)
    await patch(path, 0, text)
    const checked = await waitUntilChecked(lesson.key)
    expect(checked).toMatchObject({
      state: 'refused',
      refusal: expect.stringMatching(/not a video/) as string,
    })
    const [row] = await db.select().from(lessons).where(eq(lessons.id, lesson.id))
    expect(row!.videoId).toBe(before.id)
    expect(existsSync(join(config.dataDir, 'media', checked.storageKey))).toBe(false)
    const agent = await app.asUser(owner)
    const seen = benchLessonSchema.parse((await agent.get(`/api/bench/lessons/${lesson.id}`)).body)
    expect(seen.video?.id).toBe(before.id)
    expect(seen.refusedVideo?.refusal).toMatch(/not a video/)
    await agent.get(`/api/media/videos/${checked.id}/file`).expect(404)
  })

  it('is refused when the film was cut off before its pictures', async () => {
    const { lesson, open, patch } = await setUp()
    const film = readFilm('plain.mp4')
    const cut = Buffer.concat([film.subarray(0, film.indexOf('mdat') + 8), Buffer.alloc(4000)])
    const path = await open(cut.length)
    await patch(path, 0, cut)
    expect(await waitUntilChecked(lesson.key)).toMatchObject({
      state: 'refused',
      refusal: expect.stringMatching(/damaged|cut off|not a video/) as string,
    })
  })

  it('gets the captions of the cut before it', async () => {
    const { owner, course, lesson, open, patch } = await setUp()
    await createCaptions((await createVideo(course.id, lesson)).id, ['One.', 'Two.'])
    const film = readFilm('silent.mp4')
    const path = await open(film.length)
    await patch(path, 0, film)
    const checked = await waitUntilChecked(lesson.key)
    const agent = await app.asUser(owner)
    const seen = benchLessonSchema.parse((await agent.get(`/api/bench/lessons/${lesson.id}`)).body)
    expect(seen.video?.id).toBe(checked.id)
    expect(seen.captions).toMatchObject([{ language: 'en', cues: 2, isOriginal: true }])
    expect(seen.snags.map(({ code }) => code)).toContain('captions-beyond-end')
  })
})

describe('a disk that is full', () => {
  async function startWith(findFree: () => Promise<number>) {
    const small = express()
    small.use('/api', createUploadsRouter(createUploads({ findFree })))
    small.use(errorHandler)
    const server = small.listen(0, '127.0.0.1')
    await new Promise((resolve) => server.once('listening', resolve))
    return { server, base: `http://127.0.0.1:${(server.address() as AddressInfo).port}` }
  }

  it('is said before a byte is sent, and nothing is kept', async () => {
    const { begin } = await setUp()
    const before = await readdir(join(config.dataDir, 'uploads'))
    const { server, base } = await startWith(() => Promise.resolve(600 * 1024 ** 2))
    const answer = await begin(200 * 1024 ** 2, { base })
    expect([answer.status, codeOf(answer)]).toEqual([507, 'disk-full'])
    expect(await readdir(join(config.dataDir, 'uploads'))).toEqual(before)
    server.close()
  })

  it('is said to a part as well, and what has come in is kept', async () => {
    const { open, patch, head } = await setUp()
    const path = await open(1000)
    await patch(path, 0, Buffer.alloc(300))
    const { server, base } = await startWith(() => Promise.resolve(10))
    expect(await patch(path, 300, Buffer.alloc(700), { base })).toMatchObject({ status: 507 })
    expect((await head(path)).headers['upload-offset']).toBe('300')
    server.close()
  })
})

describe('the job of an upload', () => {
  it('is there with the video, and once', async () => {
    const { open, patch, findVideo } = await setUp()
    const path = await open(500)
    await patch(path, 0, Buffer.alloc(500))
    const video = await findVideo()
    const rows = await db.select().from(jobs).where(eq(jobs.kind, 'probe-video'))
    expect(rows.filter(({ payload }) => payload['videoId'] === video!.id)).toHaveLength(1)
  })
})
