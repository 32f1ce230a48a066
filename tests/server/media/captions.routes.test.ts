import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { captionCues, captionTracks } from '../../../server/db/schema'
import {
  captionTrackSchema,
  captionUploadSchema,
  cuePageSchema,
} from '../../../shared/contracts/media'
import { startTestApp, type Agent, type TestApp } from '../../support/app'
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
  enrol,
} from '../../support/factories'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const fieldsOf = (body: unknown) =>
  (body as { errors: { field: string }[] }).errors.map(({ field }) => field)

const file = `WEBVTT\r
\r
NOTE by Maren\r
\r
STYLE\r
::cue { color: white }\r
\r
first\r
00:01.000 --> 00:04.000 line:90%\r
Sand & gravel go in\r
before the water.\r
\r
00:04.000 --> 00:07.500\r
<v Maren>Set the string.\r
`

async function setUp() {
  const owner = await createInstructor()
  const agent = await app.asUser(owner)
  const course = await createCourse({ owner })
  const lesson = await createLesson(await createStage(course.revisionId))
  const video = await createVideo(course.id, lesson)
  const path = `/api/bench/lessons/${lesson.id}/captions`
  const upload = (text: string | Buffer, query = 'language=en&label=English', who: Agent = agent) =>
    who.post(`${path}?${query}`).set('Content-Type', 'text/vtt').send(text)
  const cuesPath = (trackId: number) => `/api/bench/captions/${trackId}/cues`
  return { owner, agent, course, lesson, video, path, upload, cuesPath }
}
async function setUpTrack() {
  const scene = await setUp()
  const { track } = captionUploadSchema.parse((await scene.upload(file).expect(201)).body)
  const helper = await createInstructor()
  await addHelper(scene.course.id, helper.id)
  return { ...scene, trackId: track!.id, helper: await app.asUser(helper) }
}
const cue = (startMs: number, text: string) => ({
  cueId: '',
  startMs,
  endMs: startMs + 2000,
  settings: '',
  text,
})

describe('POST bench/lessons/:lessonId/captions', () => {
  it('stores a file that can be read, the first language as the video’s own', async () => {
    const { upload } = await setUp()
    const first = captionUploadSchema.parse((await upload(file).expect(201)).body)
    expect(first).toMatchObject({
      stored: true,
      errors: [],
      track: { language: 'en', label: 'English', cues: 2, version: 1, isOriginal: true },
    })
    expect(first.marks).toContainEqual(expect.objectContaining({ line: 10 }))
    const second = await upload(file, 'language=de&label=Deutsch').expect(201)
    expect(second.body.track).toMatchObject({ language: 'de', isOriginal: false })
  })

  it('stores nothing of a file with an error, and leaves what was there', async () => {
    const { upload, video } = await setUp()
    await upload(file).expect(201)
    const bad = captionUploadSchema.parse(
      (await upload('WEBVTT\n\n00:01,000 --> 00:02.000\nHi\n').expect(200)).body,
    )
    expect(bad).toMatchObject({ stored: false, track: null, errors: [{ line: 3, column: 6 }] })
    const latin = await upload(Buffer.from('WEBVTT\n\nDie Säge\n', 'latin1')).expect(200)
    expect(latin.body.errors).toMatchObject([{ line: 3, column: 6 }])
    const empty = await upload('').expect(200)
    expect(empty.body).toMatchObject({ stored: false, errors: [{ line: 1 }] })
    const tracks = await db.select().from(captionTracks).where(eq(captionTracks.videoId, video.id))
    expect(tracks).toMatchObject([{ version: 1 }])
    const cues = await db.select().from(captionCues).where(eq(captionCues.trackId, tracks[0]!.id))
    expect(cues).toHaveLength(2)
  })

  it('puts a better file in the place of the one before', async () => {
    const { upload, agent, trackId, cuesPath } = await setUpTrack()
    const better = await upload(
      'WEBVTT\n\n00:00.000 --> 00:02.000\nBetter.\n',
      'language=en&label=English%20(GB)',
    ).expect(201)
    expect(better.body.track).toMatchObject({
      id: trackId,
      version: 2,
      cues: 1,
      label: 'English (GB)',
      isOriginal: true,
    })
    const page = cuePageSchema.parse((await agent.get(cuesPath(trackId)).expect(200)).body)
    expect(page.items.map(({ text }) => text)).toEqual(['Better.'])
  })

  it('takes 5,000 captions and gives them page by page', async () => {
    const { upload, agent, cuesPath } = await setUp()
    const clock = (ms: number) => new Date(ms).toISOString().slice(11, 23)
    const many = Array.from(
      { length: 5000 },
      (_, n) => `${clock(n * 2000)} --> ${clock(n * 2000 + 1500)}\nLine ${n}`,
    )
    const { track } = captionUploadSchema.parse(
      (await upload(`WEBVTT\n\n${many.join('\n\n')}\n`).expect(201)).body,
    )
    expect(track!.cues).toBe(5000)
    const texts: string[] = []
    let cursor: string | null = ''
    while (cursor !== null) {
      const query: string = cursor === '' ? '' : `&cursor=${cursor}`
      const page = cuePageSchema.parse(
        (await agent.get(`${cuesPath(track!.id)}?limit=500${query}`)).body,
      )
      texts.push(...page.items.map(({ text }) => text))
      cursor = page.nextCursor
    }
    expect(texts).toEqual(many.map((_, n) => `Line ${n}`))
  })

  it('needs a video, a draft, and a file that is not huge', async () => {
    const { agent, course, upload } = await setUp()
    const bare = await createLesson(await createStage(course.revisionId))
    const none = await agent
      .post(`/api/bench/lessons/${bare.id}/captions?language=en&label=English`)
      .set('Content-Type', 'text/vtt')
      .send(file)
      .expect(409)
    expect(none.body.code).toBe('no-video')
    await upload(Buffer.alloc(2 * 1024 ** 2 + 1, 'a')).expect(413)
    const badQuery = await upload(file, 'language=English&label=').expect(400)
    expect(fieldsOf(badQuery.body)).toEqual(['language', 'label'])
    const owner = await createInstructor()
    const issued = await createIssuedCourse({ owner })
    const frozen = await (
      await app.asUser(owner)
    )
      .post(`/api/bench/lessons/${issued.lesson.id}/captions?language=de&label=Deutsch`)
      .set('Content-Type', 'text/vtt')
      .send(file)
      .expect(409)
    expect(frozen.body.code).toBe('issued')
  })

  it('is for the owner', async () => {
    const { course, upload } = await setUp()
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    await upload(file, 'language=en&label=English', app.asVisitor()).expect(401)
    await upload(file, 'language=en&label=English', await app.asUser(helper)).expect(403)
    await upload(file, 'language=en&label=English', await app.asUser(await createUser())).expect(
      403,
    )
  })
})

describe('bench/captions/:trackId', () => {
  it('keeps an edited list and answers its version', async () => {
    const { agent, trackId, cuesPath } = await setUpTrack()
    const cues = [cue(0, 'a < b & c'), cue(1000, 'Two\nlines')]
    const saved = await agent.put(cuesPath(trackId)).send({ version: 1, cues }).expect(200)
    expect(captionTrackSchema.parse(saved.body)).toMatchObject({ id: trackId, version: 2, cues: 2 })
    expect((await agent.get(cuesPath(trackId))).body.items).toEqual(cues)
    const vtt = await agent.get(`/api/media/captions/${trackId}.vtt`).expect(200)
    expect(vtt.text).toContain('00:00:00.000 --> 00:00:02.000\na &lt; b &amp; c\n')
  })

  it('answers a stale list with the track as it is', async () => {
    const { agent, trackId, cuesPath } = await setUpTrack()
    await agent
      .put(cuesPath(trackId))
      .send({ version: 1, cues: [cue(0, 'First')] })
      .expect(200)
    const late = await agent
      .put(cuesPath(trackId))
      .send({ version: 1, cues: [cue(0, 'Late')] })
      .expect(409)
    expect(captionTrackSchema.parse(late.body.current)).toMatchObject({ version: 2, cues: 1 })
    expect((await agent.get(cuesPath(trackId))).body.items[0].text).toBe('First')
  })

  it('keeps nothing of a list with a mistake, and names the field', async () => {
    const { agent, trackId, cuesPath } = await setUpTrack()
    const put = (cues: object[]) =>
      agent.put(cuesPath(trackId)).send({ version: 1, cues }).expect(400)
    const fields = async (cues: object[]) =>
      ((await put(cues)).body.errors as { field: string }[]).map(({ field }) => field)
    expect(await fields([cue(0, 'x'), { ...cue(2000, 'x'), endMs: 2000 }])).toEqual([
      'cues.1.endMs',
    ])
    expect(await fields([cue(2000, 'x'), cue(0, 'x')])).toEqual(['cues.1.startMs'])
    expect(await fields([cue(0, '')])).toEqual(['cues.0.text'])
    expect(await fields([])).toEqual(['cues'])
    expect(await fields([{ ...cue(0, 'x'), settings: 'align:start\nx --> y' }])).toEqual([
      'cues.0.settings',
    ])
    expect((await agent.get(cuesPath(trackId))).body.track).toMatchObject({ version: 1, cues: 2 })
  })

  it('is read by staff, changed and removed by the owner', async () => {
    const { agent, trackId, helper, cuesPath } = await setUpTrack()
    const save = { version: 1, cues: [cue(0, 'x')] }
    await helper.get(cuesPath(trackId)).expect(200)
    await helper.put(cuesPath(trackId)).send(save).expect(403)
    await helper.delete(`/api/bench/captions/${trackId}`).expect(403)
    await app.asVisitor().get(cuesPath(trackId)).expect(401)
    await (await app.asUser(await createUser())).get(cuesPath(trackId)).expect(403)
    await agent.get('/api/bench/captions/999999/cues').expect(404)
    await agent.get(`${cuesPath(trackId)}?cursor=x`).expect(400)
    await agent.delete(`/api/bench/captions/${trackId}`).expect(204)
    await agent.get(cuesPath(trackId)).expect(404)
  })

  it('stays as it is once learners have the video', async () => {
    const owner = await createInstructor()
    const agent = await app.asUser(owner)
    const { captions } = await createIssuedCourse({ owner })
    const path = `/api/bench/captions/${captions.id}`
    const refused = await agent
      .put(`${path}/cues`)
      .send({ version: 1, cues: [cue(0, 'x')] })
      .expect(409)
    expect(refused.body.code).toBe('issued')
    expect((await agent.delete(path).expect(409)).body.code).toBe('issued')
  })
})

describe('GET media/captions/:trackId.vtt', () => {
  it('gives the file back with what stood above it, signs escaped', async () => {
    const { agent, trackId } = await setUpTrack()
    const answer = await agent.get(`/api/media/captions/${trackId}.vtt`).expect(200)
    expect(answer.headers['content-type']).toMatch(/^text\/vtt/)
    expect(answer.headers['cache-control']).toMatch(/^private/)
    expect(answer.text).toBe(
      [
        'WEBVTT\n\nNOTE by Maren\n\nSTYLE\n::cue { color: white }',
        'first\n00:00:01.000 --> 00:00:04.000 line:90%\nSand &amp; gravel go in\nbefore the water.',
        '00:00:04.000 --> 00:00:07.500\n<v Maren>Set the string.\n',
      ].join('\n\n'),
    )
  })

  it('is for whoever may watch the video', async () => {
    const course = await createIssuedCourse()
    const path = `/api/media/captions/${course.captions.id}.vtt`
    const learner = await createUser()
    await enrol(learner.id, course)
    await (await app.asUser(learner)).get(path).expect(200)
    await app.asVisitor().get(path).expect(401)
    await (await app.asUser(await createUser())).get(path).expect(403)
    await (await app.asUser(learner)).get('/api/media/captions/999999.vtt').expect(404)
    const sample = await createIssuedCourse({ isSample: true })
    await app.asVisitor().get(`/api/media/captions/${sample.captions.id}.vtt`).expect(200)
    const draft = await createCourse()
    const lesson = await createLesson(await createStage(draft.revisionId))
    const { id } = await createCaptions((await createVideo(draft.id, lesson)).id)
    await (await app.asUser(learner)).get(`/api/media/captions/${id}.vtt`).expect(403)
  })
})
