import { can, type Actor } from '../../shared/contracts/policies'
import type { Transaction } from '../db/client'
import { notFound } from '../errors'
import { findDraftRevision, findRevision } from './access.queries'
import { accessCourse, recordKeeper, revisionFor, type LessonAccess } from './access.service'
import { findLesson } from './benchLessons.queries'
import { lockRevision } from './drafts.queries'
import { issuedRevision } from './drafts.service'
import {
  findDraftLesson,
  isShownInIssue,
  listLessonsShowing,
  updateLessonVideo,
} from './lessonVideos.queries'

/** Lets the draft's lesson that a video was sent for show it; nothing happens when it is issued or gone. */
export async function showVideo(
  video: { id: number; courseId: number; lessonKey: string },
  tx: Transaction,
) {
  const draft = await findDraftRevision(video.courseId, tx)
  const locked = draft && (await lockRevision(draft.id, tx))
  if (!locked || locked.issuedAt) return
  const lesson = await findDraftLesson(video.courseId, video.lessonKey, tx)
  if (lesson) await updateLessonVideo(lesson.id, video.id, tx)
}

/** True when learners have this video: its captions stay as they were issued. */
export const isVideoIssued = isShownInIssue

/** The draft lesson that a video is sent for, or 409 `issued`; 404 when there is no such lesson. */
export async function findLessonToFilm(lessonId: number) {
  const lesson = await findLesson(lessonId)
  const revision = lesson && (await findRevision(lesson.revisionId))
  if (!revision) throw notFound('lesson')
  if (revision.issuedAt) throw issuedRevision()
  return {
    id: lesson.id,
    key: lesson.key,
    videoId: lesson.videoId,
    revisionId: revision.id,
    courseId: revision.courseId,
  }
}

/**
 * How a person stands to a video: staff see all of a course's, everyone else those of the lessons
 * they may watch in the revision they read. `lessons` are the ones that show it.
 */
export async function accessVideo(
  video: { id: number; courseId: number },
  actor: Actor | null,
): Promise<{ isStaff: boolean; lessons: (LessonAccess & { keeperId: number | null })[] }> {
  const access = await accessCourse({ id: video.courseId }, actor)
  if (can(actor, 'course:see-bench', access.thing)) return { isStaff: true, lessons: [] }
  const revision = await revisionFor(access)
  if (!revision) return { isStaff: false, lessons: [] }
  const rows = await listLessonsShowing(revision.id, video.id)
  const lessons = rows
    .map((lesson) => ({
      ...access,
      revision,
      lesson,
      thing: {
        ...access.thing,
        isSample: lesson.isSample,
        isIssued: revision.issuedAt !== null,
      },
    }))
    .filter(({ thing }) => can(actor, 'lesson:watch', thing))
    .map((lesson) => ({ ...lesson, keeperId: recordKeeper(lesson, actor) }))
  return { isStaff: false, lessons }
}
