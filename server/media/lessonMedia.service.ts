import type { BenchLesson } from '../../shared/contracts/benchCourses'
import type { Executor } from '../db/client'
import { listTracks, type MeasuredTrack } from './captionTracks.queries'
import { listNewestVideos, listVideos, type VideoRow } from './videos.queries'

/** The video and captions of one lesson as the bench sees them. */
export interface LessonMedia {
  /** The one that is shown, or the newest while none is shown or one is being checked. */
  video: VideoRow | null
  /** The newest, when it was refused and another is still shown. */
  refused: VideoRow | null
  captions: MeasuredTrack[]
}

const videoPath = (id: number) => `/api/media/videos/${id}/file`
const posterPath = (id: number) => `/api/media/videos/${id}/poster`

interface LessonRef {
  id: number
  key: string
  videoId: number | null
}

/** The video and captions of each of these lessons of a course. */
export async function listLessonMedia(
  courseId: number,
  lessons: LessonRef[],
  on?: Executor,
): Promise<Map<number, LessonMedia>> {
  const shownIds = lessons.flatMap(({ videoId }) => (videoId === null ? [] : [videoId]))
  const shown = new Map((await listVideos(shownIds, on)).map((row) => [row.id, row]))
  const newest = await listNewestVideos(
    courseId,
    lessons.map(({ key }) => key),
    on,
  )
  const newestByKey = new Map(newest.map((row) => [row.lessonKey, row]))
  const chosen = lessons.map((lesson) => {
    const current = lesson.videoId === null ? null : (shown.get(lesson.videoId) ?? null)
    const last = newestByKey.get(lesson.key) ?? null
    const isNewer = last !== null && last.id > (current?.id ?? 0)
    if (!isNewer) return { lesson, video: current, refused: null, captioned: current }
    if (last.state === 'refused' && current) {
      return { lesson, video: current, refused: last, captioned: current }
    }
    return { lesson, video: last, refused: null, captioned: current ?? last }
  })
  const tracks = await listTracks(
    chosen.flatMap(({ captioned }) => (captioned ? [captioned.id] : [])),
    on,
  )
  return new Map(
    chosen.map(({ lesson, video, refused, captioned }) => [
      lesson.id,
      { video, refused, captions: tracks.filter(({ videoId }) => videoId === captioned?.id) },
    ]),
  )
}

/** A video as the lesson's page of the bench shows it. */
export const describeBenchVideo = (video: VideoRow | null): BenchLesson['video'] =>
  video && {
    id: video.id,
    state: video.state,
    refusal: video.refusal,
    originalName: video.originalName,
    bytes: video.bytes,
    durationMs: video.durationMs,
    src: video.state === 'ready' ? videoPath(video.id) : null,
    contentType: video.contentType,
    posterUrl: video.posterKey ? posterPath(video.id) : null,
  }
