import { existsSync } from 'node:fs'
import { appendFile, readdir, utimes } from 'node:fs/promises'
import { request as httpRequest, type IncomingHttpHeaders } from 'node:http'
import { join } from 'node:path'
import { eq } from 'drizzle-orm'
import express from 'express'
import type { AddressInfo } from 'node:net'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { config } from '../../../server/config'
import { db } from '../../../server/db/client'
import { jobs, lessons, videos } from '../../../server/db/schema'
import { startJobs, stopJobs } from '../../../server/jobs/queue'
import { createUploadsRouter } from '../../../server/media/uploads.routes'
import { createUploads, sweepUploads } from '../../../server/media/uploads.service'
import { errorHandler } from '../../../server/middleware/errorHandler'
import { benchLessonSchema } from '../../../shared/contracts/courses'
import { maxVideoBytes } from '../../../shared/contracts/media'
import { createSessionCookie, startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  createCaptions,
  createCourse,
  createInstructor,
  createIssuedCourse,
  createLesson,
  createStage,
  createUser,
  createVideo,
} from '../../support/factories'
import { readFilm } from '../../support/films'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

interface Answer {
  status: number
  headers: IncomingHttpHeaders
  body: string
}
interface Sending {
  method: string
  path?: string
  cookie?: string
  headers?: Record<string, string>
  body?: Buffer
  /** Cut the line after so many bytes of the body. */
  cutAfter?: number
  base?: string
}

/** Speaks tus over a socket of its own, and can cut it. */
function send({ method, path = '', cookie, headers = {}, body, cutAfter, base }: Sending) {
  return new Promise<Answer | 'cut'>((resolve, reject) => {
    const origin = base ?? app.url
    const request = httpRequest(`${origin}/api/uploads${path}`, {
      method,
      headers: {
        Origin: origin,
        'Tus-Resumable': '1.0.0',
        ...(cookie ? { Cookie: cookie } : {}),
        ...(body ? { 'Content-Length': String(body.length) } : {}),
        ...headers,
      },
    })
    request.on('error', (error) => (cutAfter === undefined ? reject(error) : resolve('cut')))
    request.on('response', (response) => {
      const parts: Buffer[] = []
      response.on('data', (part: Buffer) => parts.push(part))
      response.on('end', () =>
        resolve({
          status: response.statusCode ?? 0,
          headers: response.headers,
          body: Buffer.concat(parts).toString(),
        }),
      )
    })
    if (cutAfter === undefined) request.end(body)
    else request.write(body!.subarray(0, cutAfter), () => setTimeout(() => request.destroy(), 150))
  })
}
async function ask(sending: Sending): Promise<Answer> {
  const answer = await send(sending)
  if (answer === 'cut') throw new Error('the line was cut')
  return answer
}
const codeOf = ({ body }: Answer) => (JSON.parse(body) as { code: string }).code

const metadata = (values: Record<string, string>) =>
  Object.entries(values)
    .map(([name, value]) => `${name} ${Buffer.from(value).toString('base64')}`)
    .join(',')

async function setUp() {
  const owner = await createInstructor()
  const course = await createCourse({ owner })
  const lesson = await createLesson(await createStage(course.revisionId))
  const cookie = await createSessionCookie(owner.id)
  const begin = (length: number, values: Partial<Sending> = {}) =>
    ask({
      method: 'POST',
      cookie,
      ...values,
      headers: {
        'Upload-Length': String(length),
        'Upload-Metadata': metadata({
          lessonId: String(lesson.id),
          filename: 'Säge.mp4',
          filetype: 'video/mp4',
        }),
        ...values.headers,
      },
    })
  const open = async (length: number) => {
    const { headers } = await begin(length)
    return (headers.location ?? '').replace('/api/uploads', '')
  }
  const patch = (path: string, offset: number, body: Buffer, values: Partial<Sending> = {}) =>
    send({
      method: 'PATCH',
      path,
      cookie,
      body,
      ...values,
      headers: {
        'Upload-Offset': String(offset),
        'Content-Type': 'application/offset+octet-stream',
        ...values.headers,
      },
    })
  const head = (path: string, who = cookie) => ask({ method: 'HEAD', path, cookie: who })
  const findVideo = async () =>
    (await db.select().from(videos).where(eq(videos.lessonKey, lesson.key)))[0]
  return { owner, course, lesson, cookie, begin, open, patch, head, findVideo }
}

async function waitUntilChecked(lessonKey: string) {
  startJobs()
  try {
    for (;;) {
      const rows = await db.select().from(videos).where(eq(videos.lessonKey, lessonKey))
      const open = rows.some(({ state }) => state === 'checking')
      if (!open) return rows.at(-1)!
      await new Promise((resolve) => setTimeout(resolve, 100))
    }
  } finally {
    await stopJobs()
  }
}

describe('uploads', () => {
  it('take a film in parts, check it, make a poster and show it in the draft', async () => {
    const { owner, lesson, begin, open, patch, head, findVideo } = await setUp()
    const film = readFilm('plain.mp4')
    expect((await begin(film.length)).status).toBe(201)
    const path = await open(film.length)
    const first = await patch(path, 0, film.subarray(0, 10_000))
    expect(first).toMatchObject({
      status: 204,
      headers: { 'upload-offset': '10000', 'tus-resumable': '1.0.0' },
    })
    expect(await findVideo()).toBeUndefined()
    const half = await head(path)
    expect(half).toMatchObject({
      status: 200,
      headers: {
        'upload-offset': '10000',
        'upload-length': String(film.length),
        'cache-control': 'no-store',
      },
    })
    expect(half.headers['access-control-allow-origin']).toBeUndefined()
    expect(await patch(path, 10_000, film.subarray(10_000))).toMatchObject({ status: 204 })
    expect(await findVideo()).toMatchObject({
      state: 'checking',
      bytes: film.length,
      originalName: 'Säge.mp4',
      uploaderId: owner.id,
    })
    const checked = await waitUntilChecked(lesson.key)
    expect(checked).toMatchObject({
      state: 'ready',
      width: 320,
      height: 180,
      contentType: 'video/mp4',
    })
    expect(Math.abs(checked.durationMs! - 2000)).toBeLessThan(60)
    const agent = await app.asUser(owner)
    const seen = benchLessonSchema.parse((await agent.get(`/api/bench/lessons/${lesson.id}`)).body)
    expect(seen.video).toMatchObject({ id: checked.id, state: 'ready' })
    const poster = await agent
      .get(seen.video!.posterUrl!)
      .expect(200)
      .expect('Content-Type', 'image/jpeg')
    expect((poster.body as Buffer).subarray(0, 2).toString('hex')).toBe('ffd8')
    const back = await agent.get(seen.video!.src!).expect(200)
    expect(Buffer.compare(back.body as Buffer, film)).toBe(0)
  })

  it('go on after the line was cut, from what the server holds', async () => {
    const { lesson, open, patch, head, findVideo } = await setUp()
    const film = readFilm('plain.mp4')
    const path = await open(film.length)
    expect(await patch(path, 0, film, { cutAfter: 20_000 })).toBe('cut')
    await expect
      .poll(async () => Number((await head(path)).headers['upload-offset']), { timeout: 10_000 })
      .toBeGreaterThan(0)
    const offset = Number((await head(path)).headers['upload-offset'])
    expect(offset).toBeLessThanOrEqual(20_000)
    expect(await patch(path, offset, film.subarray(offset))).toMatchObject({ status: 204 })
    expect(await findVideo()).toMatchObject({ bytes: film.length })
    expect(await waitUntilChecked(lesson.key)).toMatchObject({ state: 'ready' })
  })

  it('leave the file alone when a part begins elsewhere', async () => {
    const { open, patch, head } = await setUp()
    const path = await open(1000)
    await patch(path, 0, Buffer.alloc(100))
    for (const offset of [0, 50, 200]) {
      const answer = (await patch(path, offset, Buffer.alloc(100))) as Answer
      expect([answer.status, codeOf(answer)]).toEqual([409, 'other-offset'])
    }
    expect((await head(path)).headers['upload-offset']).toBe('100')
  })

  it('say how much is in, even when the answer to the last part was lost', async () => {
    const { open, patch, head, cookie } = await setUp()
    const path = await open(500)
    await patch(path, 0, Buffer.alloc(500))
    expect(await head(path)).toMatchObject({
      status: 200,
      headers: { 'upload-offset': '500', 'upload-length': '500' },
    })
    const other = await createSessionCookie((await createInstructor()).id)
    expect((await head(path, other)).status).toBe(404)
    expect((await ask({ method: 'DELETE', path, cookie })).status).toBe(404)
  })

  it('take over what was whole when the server was killed', async () => {
    const { open, patch, findVideo } = await setUp()
    const path = await open(500)
    await patch(path, 0, Buffer.alloc(499))
    await appendFile(join(config.dataDir, 'uploads', path.slice(1)), Buffer.alloc(1))
    expect(await findVideo()).toBeUndefined()
    await sweepUploads()
    expect(await findVideo()).toMatchObject({ bytes: 500, state: 'checking' })
  })

  it('refuse what is not a video in a sentence, whatever its name, and keep the one before', async () => {
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

  it('refuse a film that was cut off before its pictures', async () => {
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

  it('carry the captions over to a new cut', async () => {
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

  it('can be given up', async () => {
    const { open, head, cookie } = await setUp()
    const path = await open(1000)
    expect((await ask({ method: 'DELETE', path, cookie })).status).toBe(204)
    expect((await head(path)).status).toBe(404)
    expect((await readdir(join(config.dataDir, 'uploads'))).join()).not.toContain(path.slice(1))
  })

  it('belong to the one who began them', async () => {
    const { course, open, patch, head } = await setUp()
    const path = await open(1000)
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    const admin = await createUser({ role: 'admin' })
    for (const person of [helper, await createInstructor(), admin]) {
      const cookie = await createSessionCookie(person.id)
      expect((await head(path, cookie)).status).toBe(404)
      expect(await patch(path, 0, Buffer.alloc(10), { cookie })).toMatchObject({ status: 404 })
      expect((await ask({ method: 'DELETE', path, cookie })).status).toBe(404)
    }
    expect((await ask({ method: 'HEAD', path })).status).toBe(401)
    expect((await head(path)).headers['upload-offset']).toBe('0')
  })

  it('begin for the owner of a draft alone', async () => {
    const { course, begin } = await setUp()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    expect((await begin(10, { cookie: '' })).status).toBe(401)
    expect((await begin(10, { cookie: await createSessionCookie(helper.id) })).status).toBe(403)
    expect(
      (await begin(10, { cookie: await createSessionCookie((await createUser()).id) })).status,
    ).toBe(403)
    expect((await begin(10, { headers: { Origin: 'https://elsewhere.example' } })).status).toBe(403)
    const nowhere = { headers: { 'Upload-Metadata': metadata({ lessonId: '999999' }) } }
    expect((await begin(10, nowhere)).status).toBe(404)
    const owner = await createInstructor()
    const issued = await createIssuedCourse({ owner })
    const answer = await begin(10, {
      cookie: await createSessionCookie(owner.id),
      headers: { 'Upload-Metadata': metadata({ lessonId: String(issued.lesson.id) }) },
    })
    expect([answer.status, codeOf(answer)]).toEqual([409, 'issued'])
  })

  it('refuse what cannot be taken, with the field', async () => {
    const { begin, open, patch, cookie } = await setUp()
    const noLesson = await begin(10, {
      headers: { 'Upload-Metadata': metadata({ filename: 'x' }) },
    })
    expect([noLesson.status, noLesson.body]).toEqual([400, expect.stringContaining('lessonId')])
    const empty = await begin(0)
    expect([empty.status, empty.body]).toEqual([400, expect.stringContaining('Upload-Length')])
    expect((await begin(maxVideoBytes + 1)).status).toBe(413)
    expect((await begin(10, { headers: { 'Tus-Resumable': '0.2.2' } })).status).toBe(412)
    const path = await open(100)
    const oldVersion = (await patch(path, 0, Buffer.alloc(10), {
      headers: { 'Tus-Resumable': '0.2.2' },
    })) as Answer
    expect([oldVersion.status, oldVersion.headers['tus-version']]).toEqual([412, '1.0.0'])
    expect(oldVersion.headers['content-type']).toContain('application/problem+json')
    expect(
      await patch(path, 0, Buffer.alloc(10), { headers: { 'Content-Type': 'text/plain' } }),
    ).toMatchObject({ status: 415 })
    expect(
      await patch(path, 0, Buffer.alloc(10), { headers: { 'Upload-Offset': 'x' } }),
    ).toMatchObject({ status: 400 })
    expect(await patch(path, 0, Buffer.alloc(101))).toMatchObject({ status: 413 })
    expect((await ask({ method: 'GET', path, cookie })).status).toBe(404)
    for (const strange of ['/..%2F..%2Fsession-secret', '/%00', '/x']) {
      expect((await ask({ method: 'HEAD', path: strange, cookie })).status).toBe(404)
    }
  })

  it('give way when one person has many under way, the idle one first', async () => {
    const { begin, open, head } = await setUp()
    for (let count = 0; count < 4; count++) await open(100)
    const path = await open(100)
    expect((await begin(100)).status).toBe(429)
    const idle = new Date(Date.now() - 3600_000)
    await utimes(join(config.dataDir, 'uploads', path.slice(1)), idle, idle)
    expect((await begin(100)).status).toBe(201)
    expect((await head(path)).status).toBe(404)
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
