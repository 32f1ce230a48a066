import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { lessons, stages } from '../../../server/db/schema'
import {
  benchCourseSchema,
  benchLessonSchema,
  extendedBenchCourseSchema,
} from '../../../shared/contracts/benchCourses'
import { startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  createCaptions,
  createCourse,
  createInstructor,
  createKitItem,
  createLesson,
  createStage,
  createStop,
  createUser,
  createVideo,
} from '../../support/factories'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

async function setUp() {
  const owner = await createInstructor()
  const agent = await app.asUser(owner)
  const course = await createCourse({ owner })
  const stage = await createStage(course.revisionId)
  const lesson = await createLesson(stage)
  const helper = await createInstructor()
  await addHelper(course.id, helper.id)
  return {
    agent,
    course,
    stage,
    lesson,
    helper: await app.asUser(helper),
    stranger: await app.asUser(await createUser()),
    lessonPath: `/api/bench/lessons/${lesson.id}`,
    stagePath: `/api/bench/stages/${stage.id}`,
  }
}

describe('stages of the bench', () => {
  it('are added at the end, renamed and removed with their lessons', async () => {
    const { agent, course, stage } = await setUp()
    const added = extendedBenchCourseSchema.parse(
      (
        await agent
          .post(`/api/bench/courses/${course.id}/stages`)
          .send({ kind: 'roof', title: 'A roof of felt' })
          .expect(201)
      ).body,
    )
    expect(added.stages.at(-1)).toMatchObject({
      id: added.createdId,
      kind: 'roof',
      title: 'A roof of felt',
    })
    expect(added.stages.at(-1)?.key).toMatch(/^a-roof-of-felt-[a-z0-9]{5}$/)
    const renamed = await agent
      .patch(`/api/bench/stages/${added.createdId}`)
      .send({ title: 'Roof' })
      .expect(200)
    expect(benchCourseSchema.parse(renamed.body).stages.at(-1)?.title).toBe('Roof')
    const left = await agent.delete(`/api/bench/stages/${stage.id}`).expect(200)
    expect(benchCourseSchema.parse(left.body).stages).toHaveLength(1)
    expect(await db.select().from(lessons).where(eq(lessons.stageId, stage.id))).toEqual([])
  })

  it('are at most thirty', async () => {
    const { agent, course } = await setUp()
    for (let count = 1; count < 30; count++) await createStage(course.revisionId)
    const answer = await agent
      .post(`/api/bench/courses/${course.id}/stages`)
      .send({ kind: 'roof', title: 'One more' })
      .expect(409)
    expect(answer.body.code).toBe('too-many')
  })

  it('are changed by the owner alone, with what can be taken', async () => {
    const { agent, course, helper, stranger, stagePath } = await setUp()
    const path = `/api/bench/courses/${course.id}/stages`
    const stage = { kind: 'roof', title: 'Roof' }
    await app.asVisitor().post(path).send(stage).expect(401)
    await helper.post(path).send(stage).expect(403)
    await stranger.patch(stagePath).send({ title: 'x' }).expect(403)
    await helper.delete(stagePath).expect(403)
    await agent.patch(stagePath).send({ title: '' }).expect(400)
    await agent.patch('/api/bench/stages/999999').send({ title: 'x' }).expect(404)
    expect(await db.select().from(stages).where(eq(stages.title, 'x'))).toEqual([])
  })
})

describe('lessons of the bench', () => {
  it('are added to the end of their stage under a readable key', async () => {
    const { agent, stagePath, lesson } = await setUp()
    const added = extendedBenchCourseSchema.parse(
      (await agent.post(`${stagePath}/lessons`).send({ title: 'Squaring the form' }).expect(201))
        .body,
    )
    expect(added.stages[0]?.lessons.map(({ id }) => id)).toEqual([lesson.id, added.createdId])
    expect(added.stages[0]?.lessons[1]?.key).toMatch(/^squaring-the-form-[a-z0-9]{5}$/)
    expect(added.stages[0]?.lessons[1]?.video.state).toBe('none')
  })

  it('are shown whole to staff and to nobody else', async () => {
    const { agent, course, lesson, helper, stranger, lessonPath } = await setUp()
    const video = await createVideo(course.id, lesson)
    await createCaptions(video.id)
    await createStop(lesson.id, { name: 'Bags to buy', atMs: 2000 })
    await createKitItem(lesson.id, { title: 'Gloves' })
    const seen = benchLessonSchema.parse((await agent.get(lessonPath).expect(200)).body)
    expect(seen).toMatchObject({
      number: 1,
      lessonsInCourse: 1,
      revision: 'draft',
      video: { id: video.id, state: 'ready', src: `/api/media/videos/${video.id}/file` },
      refusedVideo: null,
      captions: [{ language: 'en', cues: 1, isOriginal: true }],
      stops: [{ name: 'Bags to buy', exercise: null }],
      kit: [{ title: 'Gloves' }],
      can: { edit: true },
    })
    expect(seen.snags.map(({ code }) => code)).toEqual(['no-summary', 'no-exercise'])
    expect((await helper.get(lessonPath).expect(200)).body.can).toEqual({ edit: false })
    await stranger.get(lessonPath).expect(403)
    await app.asVisitor().get(lessonPath).expect(401)
    await agent.get('/api/bench/lessons/999999').expect(404)
  })

  it('show a refused newer video beside the one that stays', async () => {
    const { agent, course, lesson, lessonPath } = await setUp()
    const video = await createVideo(course.id, lesson)
    await createVideo(course.id, null, {
      lessonKey: lesson.key,
      state: 'refused',
      refusal: 'This file is not a video.',
      originalName: 'notes.mp4',
      durationMs: null,
    })
    const seen = benchLessonSchema.parse((await agent.get(lessonPath).expect(200)).body)
    expect(seen.video?.id).toBe(video.id)
    expect(seen.refusedVideo).toEqual({
      originalName: 'notes.mp4',
      refusal: 'This file is not a video.',
    })
  })

  it('keep a change and replace the whole kit check, keys and all', async () => {
    const { agent, lessonPath } = await setUp()
    const kit = [
      { key: 'gloves-1', kind: 'on-you', icon: 'gloves', title: 'Gloves', detail: '' },
      {
        key: 'wet-cement',
        kind: 'caution',
        icon: 'cement',
        title: 'Wet cement burns',
        detail: 'Wash it off.',
      },
    ]
    const change = {
      version: 1,
      summary: 'Diagonals.',
      hazards: [{ kind: 'cement', label: 'Wet cement' }],
      isSample: true,
      kit,
    }
    const saved = await agent.patch(lessonPath).send(change).expect(200)
    expect(saved.body).toMatchObject({ ...change, version: 2 })
    expect(typeof saved.body.savedAt).toBe('string')
    const turned = await agent
      .patch(lessonPath)
      .send({ version: 2, kit: [...kit].reverse() })
      .expect(200)
    expect(turned.body.kit).toEqual([...kit].reverse())
    const emptied = await agent.patch(lessonPath).send({ version: 3, kit: [] }).expect(200)
    expect(emptied.body).toMatchObject({ kit: [], summary: 'Diagonals.' })
  })

  it('answer a stale change with the lesson as it is', async () => {
    const { agent, lessonPath } = await setUp()
    await agent.patch(lessonPath).send({ version: 1, title: 'First' }).expect(200)
    const late = await agent.patch(lessonPath).send({ version: 1, title: 'Late' }).expect(409)
    expect(benchLessonSchema.parse(late.body.current)).toMatchObject({ title: 'First', version: 2 })
  })

  it('are changed by the owner alone, with what can be taken', async () => {
    const { agent, helper, stranger, lessonPath, stagePath } = await setUp()
    await app.asVisitor().patch(lessonPath).send({ version: 1 }).expect(401)
    await helper.patch(lessonPath).send({ version: 1, title: 'x' }).expect(403)
    await stranger.delete(lessonPath).expect(403)
    await helper.post(`${stagePath}/lessons`).send({ title: 'x' }).expect(403)
    await agent.patch(lessonPath).send({ version: 1, title: '' }).expect(400)
    await agent.patch(lessonPath).send({ version: 1, videoId: 7 }).expect(400)
    const item = { key: 'same-key', kind: 'on-you', icon: '', title: 'Gloves', detail: '' }
    const twice = await agent
      .patch(lessonPath)
      .send({ version: 1, kit: [item, item] })
      .expect(400)
    expect(twice.body.errors[0].field).toBe('kit.1.key')
    expect((await agent.get(lessonPath)).body).toMatchObject({ version: 1, kit: [] })
  })

  it('are taken out', async () => {
    const { agent, lessonPath } = await setUp()
    const left = await agent.delete(lessonPath).expect(200)
    expect(benchCourseSchema.parse(left.body).stages[0]?.lessons).toEqual([])
    await agent.get(lessonPath).expect(404)
  })
})
