import { randomUUID } from 'node:crypto'
import { writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { eq } from 'drizzle-orm'
import { config } from '../../server/config'
import { db } from '../../server/db/client'
import { videos } from '../../server/db/schema'
import { mediaStorage } from '../../server/media/mediaStorage'
import type { Response } from 'supertest'
import type { Agent, TestApp } from '../support/app'
import { createOwnCalculator } from './exercises/ownCalculatorScene'
import {
  addHelper,
  createInstructor,
  createIssuedCourse,
  createLesson,
  createQuiz,
  createRevision,
  createStage,
  createStop,
  createUser,
  enrol,
  nextNumber,
  singleQuestion,
} from '../support/factories'

export const roles = [
  'visitor',
  'learner',
  'enrolled',
  'helper',
  'owner',
  'instructor',
  'admin',
] as const
export type Role = (typeof roles)[number]

/** A file in the storage, so that a 404 can only be a refusal. */
async function store(key: string) {
  const source = join(config.dataDir, randomUUID())
  await writeFile(source, 'not a film, but bytes')
  await mediaStorage.put(key, source)
}

async function send(agent: Agent, path: string, body: object): Promise<Response> {
  return agent.post(path).set('Idempotency-Key', randomUUID()).send(body).expect(201)
}

/** An issued course with a question over the fence, its next draft, and an upload under way. */
export async function createAccessScene(app: TestApp) {
  let stopKey = ''
  const course = await createIssuedCourse({
    furnish: async (lesson) => {
      const stop = await createStop(lesson.id, { atMs: 1000 })
      await createQuiz(stop.id, { questions: [singleQuestion()] })
      stopKey = stop.key
    },
  })
  const posterKey = 'posters/1.webp'
  await db.update(videos).set({ posterKey }).where(eq(videos.id, course.video.id))
  await store(course.video.storageKey)
  await store(posterKey)
  const draftId = await createRevision(course.id, { number: 1 })
  const stage = await createStage(draftId)
  const lesson = await createLesson(stage, { key: course.lesson.key })
  const stop = await createStop(lesson.id)

  const asker = await createUser()
  await enrol(asker.id, course)
  const asking = await app.asUser(asker)
  const question = (
    await send(asking, `/api/courses/${course.slug}/lessons/${course.lesson.key}/questions`, {
      title: 'How wet is wet?',
      markdown: '',
      atMs: null,
    })
  ).body
  const path = `/api/questions/${question.id}/answers`
  const thread = (await send(asking, path, { markdown: 'Like porridge.' })).body

  const owner = await app.asUser({ id: course.ownerId })
  const own = await createOwnCalculator(course.id)
  const upload = await owner.post('/api/uploads').set(uploadHeaders(lesson.id)).expect(201)
  return {
    course,
    draftLessonId: lesson.id,
    params: {
      slug: course.slug,
      lessonKey: course.lesson.key,
      stopKey,
      videoId: course.video.id,
      trackId: course.captions.id,
      courseId: course.id,
      stageId: stage.id,
      lessonId: lesson.id,
      stopId: stop.id,
      ownKey: own.key,
      questionId: question.id,
      answerId: thread.answers?.[0]?.id ?? thread.id,
      uploadId: String(upload.headers['location']).split('/').at(-1) ?? '',
    } as Record<string, string | number>,
  }
}
export type AccessScene = Awaited<ReturnType<typeof createAccessScene>>

/** What begins an upload to a lesson. */
export const uploadHeaders = (lessonId: number) => ({
  'Tus-Resumable': '1.0.0',
  'Upload-Length': '1000',
  'Upload-Metadata': `lessonId ${btoa(String(lessonId))},filename ${btoa(`${nextNumber()}.mp4`)}`,
})

/** A new person of this role, on a device of their own. */
export async function agentOf(role: Role, app: TestApp, { course }: AccessScene): Promise<Agent> {
  if (role === 'visitor') return app.asVisitor()
  if (role === 'owner') return app.asUser({ id: course.ownerId })
  if (role === 'instructor') return app.asUser(await createInstructor())
  if (role === 'admin') return app.asUser(await createUser({ role: 'admin' }))
  const user = await createUser()
  if (role === 'enrolled') await enrol(user.id, course)
  if (role === 'helper') await addHelper(course.id, user.id)
  return app.asUser(user)
}
