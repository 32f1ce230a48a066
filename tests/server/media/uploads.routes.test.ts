import { readdir, utimes } from 'node:fs/promises'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { config } from '../../../server/config'
import { benchLessonSchema } from '../../../shared/contracts/benchCourses'
import { maxVideoBytes } from '../../../shared/contracts/media'
import { createSessionCookie, startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  createInstructor,
  createIssuedCourse,
  createUser,
} from '../../support/factories'
import { readFilm } from '../../support/films'
import { ask, codeOf, metadata, setUpUpload, waitUntilChecked, type Answer } from './uploadScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const setUp = () => setUpUpload(app)

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
      .expect('Content-Type', 'image/webp')
    expect((poster.body as Buffer).subarray(8, 12).toString()).toBe('WEBP')
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
    expect((await ask({ base: app.url, method: 'DELETE', path, cookie })).status).toBe(404)
  })

  it('can be given up', async () => {
    const { open, head, cookie } = await setUp()
    const path = await open(1000)
    expect((await ask({ base: app.url, method: 'DELETE', path, cookie })).status).toBe(204)
    expect((await head(path)).status).toBe(404)
    expect((await readdir(join(config.dataDir, 'uploads'))).join()).not.toContain(path.slice(1))
  })

  it('5.4.1 keep a file under a name of ours, whatever its own says', async () => {
    const { lesson, begin, patch, findVideo } = await setUp()
    const filename = '../../../../escaped"; rm -rf ~.mp4'
    const film = readFilm('plain.mp4')
    const { headers } = await begin(film.length, {
      headers: { 'Upload-Metadata': metadata({ lessonId: String(lesson.id), filename }) },
    })
    const path = (headers.location ?? '').replace('/api/uploads', '')
    expect(path).toMatch(/^\/[0-9a-f]{32}$/)
    await patch(path, 0, film)
    await waitUntilChecked(lesson.key)
    const video = await findVideo()
    expect(video?.storageKey).toMatch(/^[\w/.-]+$/)
    expect(video?.storageKey).not.toContain('..')
    const kept = await readdir(config.dataDir, { recursive: true })
    const outside = await readdir(join(config.dataDir, '..'))
    expect([...kept, ...outside].filter((name) => name.includes('rm -rf'))).toEqual([])
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
      expect((await ask({ base: app.url, method: 'DELETE', path, cookie })).status).toBe(404)
    }
    expect((await ask({ base: app.url, method: 'HEAD', path })).status).toBe(401)
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
    expect((await ask({ base: app.url, method: 'GET', path, cookie })).status).toBe(404)
    for (const strange of ['/..%2F..%2Fsession-secret', '/%00', '/x']) {
      expect((await ask({ base: app.url, method: 'HEAD', path: strange, cookie })).status).toBe(404)
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
