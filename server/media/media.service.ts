import type { Actor } from '../../shared/contracts/policies'
import { accessVideo } from '../courses/lessonVideos.service'
import { AppError, notAllowed, notFound, signInFirst } from '../errors'
import { describeKit } from '../progress/kitChecks.service'
import { mediaStorage } from './mediaStorage'
import { findVideo, type VideoRow } from './videos.queries'

/** Who asks, with the kit ticks that their session remembers by the lesson's id. */
export interface Viewer {
  actor: Actor | null
  kit: Record<string, string[]>
}

/** A stored file that may be sent. */
export interface StoredFile {
  root: string
  name: string
  contentType: string
  bytes: number
  /** Changes whenever the bytes do. */
  tag: string
}

const kitFirst = () =>
  new AppError(
    403,
    'kit-check-first',
    'Tick the kit check of this lesson first. Then the video plays.',
  )

/** Throws unless a person may see a video: 404, 401, 403, or 403 `kit-check-first`. */
export async function checkMaySee(
  video: VideoRow,
  { actor, kit }: Viewer,
  { needsKit }: { needsKit: boolean },
) {
  const { isStaff, lessons } = await accessVideo(video, actor)
  if (isStaff) return
  if (lessons.length === 0) throw actor ? notAllowed() : signInFirst()
  if (!needsKit) return
  for (const { lesson, keeperId } of lessons) {
    const { kitState } = await describeKit(lesson.id, keeperId, kit[lesson.id] ?? [])
    if (kitState.isComplete) return
  }
  throw kitFirst()
}

async function locate(key: string, contentType: string, tag: string): Promise<StoredFile> {
  const found = await mediaStorage.stat(key)
  if (!found) throw notFound('file')
  return { ...mediaStorage.locate(key), bytes: found.bytes, contentType, tag }
}

/** The file of a video that a person may watch now. */
export async function findVideoFile(videoId: number, viewer: Viewer): Promise<StoredFile> {
  const video = await findVideo(videoId)
  if (!video) throw notFound('video')
  await checkMaySee(video, viewer, { needsKit: true })
  if (video.state !== 'ready') throw notFound('video')
  return locate(video.storageKey, video.contentType, `video-${video.id}-${video.bytes}`)
}

const locatePoster = (id: number, posterKey: string) =>
  locate(posterKey, 'image/webp', `poster-${id}`)

/** The poster of a video whose lesson a person may open; it is shown before the kit check. */
export async function findPosterFile(videoId: number, viewer: Viewer): Promise<StoredFile> {
  const video = await findVideo(videoId)
  if (!video?.posterKey) throw notFound('picture')
  await checkMaySee(video, viewer, { needsKit: false })
  return locatePoster(video.id, video.posterKey)
}

/** The poster of the video that a lesson shows, for whoever was let into the lesson. */
export async function findLessonPoster(videoId: number | null): Promise<StoredFile> {
  const video = videoId === null ? null : await findVideo(videoId)
  if (!video?.posterKey) throw notFound('picture')
  return locatePoster(video.id, video.posterKey)
}
