import type { WatchedLesson } from '../../shared/contracts/lessons'
import type { Video } from '../../shared/contracts/media'
import { can, type Actor } from '../../shared/contracts/policies'
import { notFound } from '../errors'
import { listTapeStops } from '../exercises/stopStates.service'
import { describeKit } from '../progress/kitChecks.service'
import { describeProgress } from '../progress/lessonProgress.service'
import { recordKeeper, type LessonAccess } from './access.service'
import { findReadyVideo, listCaptionTracks, listHindsight } from './lessons.queries'
import { describeStages, findDrawnBy, mayEnrol, nameRevision } from './sheets.service'

/** What a session remembers for whom no rows are kept. */
export interface Remembered {
  kit: Record<string, string[]>
  samples: Record<string, { solved: boolean }>
}

async function describeVideo(videoId: number | null, posterUrl: string): Promise<Video | null> {
  if (videoId === null) return null
  const [video, tracks] = await Promise.all([findReadyVideo(videoId), listCaptionTracks(videoId)])
  if (!video) return null
  return {
    id: video.id,
    src: `/api/media/videos/${video.id}/file`,
    contentType: video.contentType,
    posterUrl: video.posterKey === null ? null : posterUrl,
    durationMs: video.durationMs ?? 0,
    captions: tracks.map(({ id, ...track }) => ({
      ...track,
      src: `/api/media/captions/${id}.vtt`,
    })),
  }
}

/** The picture's address follows from the lesson's, so that a page can ask for both at once. */
function posterOf({ course, revision, lesson }: LessonAccess): string {
  const draft = revision.issuedAt === null ? '?draft=1' : ''
  return `/api/courses/${course.slug}/lessons/${lesson.key}/poster${draft}`
}

/** All that the lesson page shows to one person; the video only once the kit check is complete. */
export async function describeLesson(
  access: LessonAccess,
  actor: Actor | null,
  remembered: Remembered,
): Promise<WatchedLesson> {
  const { course, revision, lesson, thing } = access
  const userId = recordKeeper(access, actor)
  const [drawnBy, stages, { kit, kitState }, video, stops, hindsight, progress] = await Promise.all(
    [
      findDrawnBy(course.id),
      describeStages(revision, userId),
      describeKit(lesson.id, userId, remembered.kit[lesson.id] ?? []),
      describeVideo(lesson.videoId, posterOf(access)),
      listTapeStops(access, userId, remembered.samples),
      listHindsight(course.id, lesson.key),
      describeProgress(userId, course.id, lesson.key),
    ],
  )
  const stage = stages.find(({ lessons }) => lessons.some(({ key }) => key === lesson.key))
  const row = stage?.lessons.find(({ key }) => key === lesson.key)
  if (!stage || !row) throw notFound('lesson')
  return {
    course: {
      id: course.id,
      slug: course.slug,
      title: revision.title,
      sheetNumber: course.sheetNumber,
      coverDrawing: revision.coverDrawing,
      drawnBy,
      revision: nameRevision(revision),
      issuedAt: revision.issuedAt?.toISOString() ?? null,
    },
    stages,
    key: lesson.key,
    number: row.number,
    stageKind: stage.kind,
    stageTitle: stage.title,
    title: lesson.title,
    summary: lesson.summary,
    youWillWant: lesson.youWillWant,
    hazards: lesson.hazards,
    isSample: lesson.isSample,
    kit,
    kitState,
    video: kitState.isComplete ? video : null,
    durationMs: video?.durationMs ?? 0,
    posterUrl: video?.posterUrl ?? null,
    stops,
    hindsight: hindsight.map((note) => ({
      ...note,
      by: note.by ?? 'a former member',
      createdAt: note.createdAt.toISOString(),
    })),
    progress,
    isPreview: revision.issuedAt === null,
    can: {
      keepProgress: userId !== null,
      writeFence: thing.isIssued === true && can(actor, 'fence:write', thing),
      enrol: mayEnrol(course, can(actor, 'course:enrol', thing)),
    },
  }
}
