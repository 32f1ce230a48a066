import type { KitItem } from '../../shared/contracts/lessons'
import type { BenchLesson, ChangeLesson, CreateLesson } from '../../shared/contracts/benchCourses'
import { can, type Actor } from '../../shared/contracts/policies'
import { conflict, invalid, notFound } from '../errors'
import { describeBenchVideo } from '../media/lessonMedia.service'
import { findRevision, type LessonRow } from './access.queries'
import { accessCourse } from './access.service'
import {
  deleteLesson,
  findLesson,
  insertLesson,
  listLessons,
  measureLessons,
  updateLesson,
} from './benchLessons.queries'
import { changeDraft, staleVersion, withCurrent } from './drafts.service'
import { replaceKit } from './kit.queries'
import { checkLesson, loadLessons } from './outline.service'
import { nameRevision } from './sheets.service'
import { makeStableKey } from './stableKeys.service'
import { findStage } from './stages.queries'

const mostLessons = 200

/** Where a lesson stands: its revision, its stage and its number among all lessons. */
async function placeLesson(lesson: LessonRow) {
  const revision = await findRevision(lesson.revisionId)
  const stage = await findStage(lesson.stageId)
  if (!revision || !stage) throw notFound('lesson')
  const ids = (await listLessons(revision.id)).map(({ id }) => id)
  return {
    revision,
    stageTitle: stage.title,
    number: ids.indexOf(lesson.id) + 1,
    lessonsInCourse: ids.length,
  }
}

/** A lesson as its staff see it on the bench. */
export async function describeBenchLesson(lessonId: number, actor: Actor): Promise<BenchLesson> {
  const lesson = await findLesson(lessonId)
  if (!lesson) throw notFound('lesson')
  const { revision, ...place } = await placeLesson(lesson)
  const { course, thing } = await accessCourse({ id: revision.courseId }, actor)
  const [full] = await loadLessons(course.id, [lesson])
  if (!full) throw notFound('lesson')
  const isIssued = revision.issuedAt !== null
  return {
    id: lesson.id,
    courseId: course.id,
    courseSlug: course.slug,
    courseTitle: revision.title,
    revision: nameRevision(revision),
    isIssued,
    key: lesson.key,
    ...place,
    title: lesson.title,
    summary: lesson.summary,
    youWillWant: lesson.youWillWant,
    hazards: lesson.hazards,
    isSample: lesson.isSample,
    kit: full.kit,
    version: lesson.version,
    savedAt: revision.savedAt.toISOString(),
    video: describeBenchVideo(full.media.video),
    refusedVideo: full.media.refused && {
      originalName: full.media.refused.originalName,
      refusal: full.media.refused.refusal ?? '',
    },
    captions: full.media.captions.map(
      ({ videoId: _videoId, lastStartMs: _last, ...track }) => track,
    ),
    stops: full.stops,
    snags: checkLesson(full),
    can: { edit: !isIssued && can(actor, 'course:edit', thing) },
  }
}

/** Adds a lesson at the end of a stage and returns its id. */
export const addLesson = (
  stageId: number,
  revisionId: number,
  { title }: CreateLesson,
): Promise<number> =>
  changeDraft(revisionId, async (tx) => {
    if (!(await findStage(stageId, tx))) throw notFound('stage')
    const { inAll, nextPosition } = await measureLessons(revisionId, stageId, tx)
    if (inAll >= mostLessons) {
      throw conflict('too-many', `A course has at most ${mostLessons} lessons.`)
    }
    const key = makeStableKey(title)
    const values = { revisionId, stageId, title, key, hazards: [], position: nextPosition }
    return insertLesson(values, tx)
  })

function checkKitKeys(kit: KitItem[]) {
  const keys = kit.map(({ key }) => key)
  const repeated = keys.findIndex((key, index) => keys.indexOf(key) < index)
  if (repeated < 0) return
  throw invalid([
    {
      field: `kit.${repeated}.key`,
      message: 'Another row of this kit check has this key. Each needs one of its own.',
    },
  ])
}

/** Changes a lesson or its whole kit check; 409 with the lesson as it is when someone else was first. */
export async function changeLesson(
  lessonId: number,
  revisionId: number,
  actor: Actor,
  { version, kit, ...values }: ChangeLesson,
): Promise<BenchLesson> {
  if (kit) checkKitKeys(kit)
  const describe = () => describeBenchLesson(lessonId, actor)
  const save = changeDraft(revisionId, async (tx) => {
    const lesson = await findLesson(lessonId, tx)
    if (!lesson) throw notFound('lesson')
    if (lesson.version !== version) throw staleVersion('lesson')
    await updateLesson(lessonId, { ...values, version: version + 1 }, tx)
    if (kit) await replaceKit(lessonId, kit, tx)
  })
  await withCurrent(save, describe)
  return describe()
}

/** Takes a lesson out of the draft, with its kit check and stops. */
export const removeLesson = (lessonId: number, revisionId: number) =>
  changeDraft(revisionId, (tx) => deleteLesson(lessonId, tx))
