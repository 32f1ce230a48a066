import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { kitTicks, stopStates } from '../../../server/db/schema'
import { watchedLessonSchema } from '../../../shared/contracts/lessons'
import { startTestApp, type TestApp } from '../../support/app'
import {
  addHelper,
  createCaptions,
  createCourse,
  createHindsight,
  createInstructor,
  createIssuedCourse,
  createKitItem,
  createLesson,
  createQuiz,
  createRevision,
  createStage,
  createStop,
  createUser,
  createVideo,
  enrol,
  issueRevision,
  singleQuestion,
} from '../../support/factories'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const pathOf = (course: { slug: string }, lesson: { key: string }) =>
  `/api/courses/${course.slug}/lessons/${lesson.key}`

/** A draft with one lesson that has two rows of kit, a video and one stop. */
async function createDraft(isSample = false) {
  const course = await createCourse()
  const stage = await createStage(course.revisionId, { kind: 'frame', title: 'Frame' })
  const lesson = await createLesson(stage, { isSample, hazards: [{ kind: 'saw', label: 'Saw' }] })
  const kit = [await createKitItem(lesson.id), await createKitItem(lesson.id, { kind: 'caution' })]
  const video = await createVideo(course.id, lesson, { posterKey: 'posters/1.webp' })
  const captions = await createCaptions(video.id)
  const stop = await createStop(lesson.id, { atMs: 5000 })
  await createQuiz(stop.id, { questions: [singleQuestion()] })
  await createStop(lesson.id, { atMs: 6000, name: 'Nothing here yet' })
  return { course, stage, lesson, kit, video, captions, stop }
}

describe('GET /api/courses/:slug/lessons/:lessonKey', () => {
  it('shows a learner the lesson, its place in the course and its stops', async () => {
    const { course, lesson, video, stop } = await createDraft()
    await issueRevision(course.revisionId)
    const learner = await createUser()
    await enrol(learner.id, course)
    await createHindsight({
      courseId: course.id,
      lessonKey: lesson.key,
      atMs: 7000,
      text: 'I would cut it longer now.',
      authorId: course.ownerId,
    })
    const { body } = await (await app.asUser(learner)).get(pathOf(course, lesson)).expect(200)
    const watched = watchedLessonSchema.parse(body)
    expect(watched).toMatchObject({
      key: lesson.key,
      number: 1,
      stageKind: 'frame',
      stageTitle: 'Frame',
      durationMs: video.durationMs,
      posterUrl: `/api/courses/${course.slug}/lessons/${lesson.key}/poster`,
      isPreview: false,
      progress: { intervals: [], watchedMs: 0, positionMs: 0, state: 'not-started' },
      can: { keepProgress: true, writeFence: true, enrol: false },
    })
    expect(watched.course).toMatchObject({ id: course.id, revision: 'A' })
    expect(watched.hindsight.map(({ atMs, text }) => ({ atMs, text }))).toEqual([
      { atMs: 7000, text: 'I would cut it longer now.' },
    ])
    expect(watched.stops).toEqual([
      {
        key: stop.key,
        name: stop.name,
        atMs: 5000,
        isRequired: true,
        isSolved: false,
        exerciseKind: 'quiz',
      },
    ])
  })

  it('does not show the hindsight of another course', async () => {
    const course = await createIssuedCourse({ isSample: true })
    const other = await createIssuedCourse()
    const lessonKey = course.lesson.key
    await createHindsight({ courseId: other.id, lessonKey, atMs: 1, text: 'Elsewhere' })
    const { body } = await app.asVisitor().get(pathOf(course, course.lesson)).expect(200)
    expect(body.hindsight).toEqual([])
  })

  it('gives a lesson without a kit check its video and captions at once', async () => {
    const course = await createIssuedCourse({ isSample: true })
    const { body } = await app.asVisitor().get(pathOf(course, course.lesson)).expect(200)
    const watched = watchedLessonSchema.parse(body)
    expect(watched.kitState).toEqual({ ticked: [], isComplete: true })
    expect(watched.video).toMatchObject({
      src: `/api/media/videos/${course.video.id}/file`,
      durationMs: 100_000,
      captions: [
        { src: `/api/media/captions/${course.captions.id}.vtt`, language: 'en', isOriginal: true },
      ],
    })
    expect(watched.can).toEqual({ keepProgress: false, writeFence: false, enrol: false })
  })

  it('keeps the video back until the kit check is complete', async () => {
    const { course, lesson, kit } = await createDraft()
    await issueRevision(course.revisionId)
    const learner = await createUser()
    await enrol(learner.id, course)
    const agent = await app.asUser(learner)
    const path = pathOf(course, lesson)
    const before = watchedLessonSchema.parse((await agent.get(path)).body)
    expect(before.video).toBeNull()
    expect(before.durationMs).toBe(100_000)
    expect(before.kitState.isComplete).toBe(false)

    await agent
      .put(`${path}/kit-ticks`)
      .send({ ticked: [kit[0]!.key] })
      .expect(200)
    expect((await agent.get(path)).body.video).toBeNull()
    await agent
      .put(`${path}/kit-ticks`)
      .send({ ticked: [kit[1]!.key] })
      .expect(200)
    const after = watchedLessonSchema.parse((await agent.get(path)).body)
    expect(after.kitState.isComplete).toBe(true)
    expect(after.video).not.toBeNull()
  })

  it('remembers a visitor’s ticks for their session alone', async () => {
    const { course, lesson, kit } = await createDraft(true)
    await issueRevision(course.revisionId)
    const path = pathOf(course, lesson)
    const visitor = app.asVisitor()
    expect((await visitor.get(path).expect(200)).body.video).toBeNull()
    await visitor
      .put(`${path}/kit-ticks`)
      .send({ ticked: kit.map(({ key }) => key) })
      .expect(200)
    expect((await visitor.get(path)).body.video).not.toBeNull()
    expect((await app.asVisitor().get(path)).body.video).toBeNull()
  })

  it('lets staff preview the draft with a kit check that leaves no rows', async () => {
    const { course, lesson, kit, stop } = await createDraft()
    const helper = await createUser()
    await addHelper(course.id, helper.id)
    const agent = await app.asUser(helper)
    const path = pathOf(course, lesson)
    const before = watchedLessonSchema.parse((await agent.get(`${path}?draft=1`)).body)
    expect(before).toMatchObject({ isPreview: true, video: null })
    expect(before.course.revision).toBe('draft')
    const ticked = kit.map(({ key }) => key)
    await agent.put(`${path}/kit-ticks?draft=1`).send({ ticked }).expect(200)
    await agent.get(`${path}/stops/${stop.key}?draft=1`).expect(200)
    const after = watchedLessonSchema.parse((await agent.get(`${path}?draft=1`)).body)
    expect(after.video).not.toBeNull()
    expect(await db.select().from(kitTicks).where(eq(kitTicks.userId, helper.id))).toEqual([])
    expect(await db.select().from(stopStates).where(eq(stopStates.userId, helper.id))).toEqual([])
  })

  it('shows the draft to staff only when they ask for it, and to nobody else', async () => {
    const course = await createIssuedCourse({ isSample: true })
    const draft = await createRevision(course.id, { number: 1 })
    const stage = await createStage(draft)
    await createLesson(stage, { key: course.lesson.key, title: 'As it may be', isSample: true })
    const path = pathOf(course, course.lesson)
    const owner = await app.asUser({ id: course.ownerId })
    expect((await owner.get(`${path}?draft=1`)).body.title).toBe('As it may be')
    expect((await owner.get(path)).body.title).toBe(course.lesson.title)
    for (const agent of [app.asVisitor(), await app.asUser(await createUser())]) {
      expect((await agent.get(`${path}?draft=1`)).body.title).toBe(course.lesson.title)
    }
  })

  it('refuses whoever is not enrolled, and does not find what is not there', async () => {
    const course = await createIssuedCourse()
    const path = pathOf(course, course.lesson)
    await app.asVisitor().get(path).expect(401)
    await (await app.asUser(await createUser())).get(path).expect(403)
    await (await app.asUser(await createInstructor())).get(path).expect(403)
    await (await app.asUser({ id: course.ownerId })).get(path).expect(200)
    await app
      .asVisitor()
      .get(pathOf(course, { key: 'no-such-lesson' }))
      .expect(404)
    await app
      .asVisitor()
      .get(pathOf({ slug: 'no-course' }, course.lesson))
      .expect(404)
    const { course: draft, lesson } = await createDraft(true)
    await app.asVisitor().get(pathOf(draft, lesson)).expect(404)
  })

  it('never carries a right answer', async () => {
    const course = await createIssuedCourse({
      isSample: true,
      furnish: async (lesson) => {
        const stop = await createStop(lesson.id)
        await createQuiz(stop.id, { questions: [singleQuestion()] })
      },
    })
    const { text } = await app.asVisitor().get(pathOf(course, course.lesson)).expect(200)
    expect(text).not.toContain('It fills the form.')
    expect(text).not.toContain('"right"')
  })
})
