import { eq } from 'drizzle-orm'
import { db } from '../../../server/db/client'
import { exercises } from '../../../server/db/schema'
import type { TestApp } from '../../support/app'
import {
  createCaptions,
  createCourse as insertCourse,
  createInstructor,
  createKitItem,
  createLesson,
  createQuiz,
  createStage,
  createStop,
  createVideo,
  nextNumber,
  singleQuestion,
} from '../../support/factories'

/** Numbered from the top down, away from those that the application gives. */
export const createCourse = (options: Parameters<typeof insertCourse>[0] = {}) =>
  insertCourse({ ...options, course: { sheetNumber: 60_000 - nextNumber() } })

/** A course with an empty draft and its owner signed in. */
export async function setUpCourse(app: TestApp) {
  const owner = await createInstructor()
  const agent = await app.asUser(owner)
  const course = await createCourse({ owner })
  return { owner, agent, course, path: `/api/bench/courses/${course.id}` }
}

/** A course with nothing left on its snag list that must be put right. */
export async function setUpWholeCourse(app: TestApp) {
  const scene = await setUpCourse(app)
  const stage = await createStage(scene.course.revisionId)
  const lesson = await createLesson(stage, { summary: 'The pad.', isSample: true })
  const video = await createVideo(scene.course.id, lesson)
  await createCaptions(video.id)
  const stop = await createStop(lesson.id, { atMs: 5000 })
  const quiz = await createQuiz(stop.id, { questions: [singleQuestion()] })
  await db.update(exercises).set({ prompt: 'Choose one.' }).where(eq(exercises.id, quiz.id))
  const kit = await createKitItem(lesson.id)
  return { ...scene, stage, lesson, stop, quiz, kit }
}
