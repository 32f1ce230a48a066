import { rm } from 'node:fs/promises'
import { join } from 'node:path'
import { showVideo } from '../courses/lessonVideos.service'
import { isDuplicate, inTransaction } from '../db/transaction'
import { ringBell } from '../jobs/bell'
import { insertJob } from '../jobs/jobs.queries'
import { copyTracks, listTracks } from './captionTracks.queries'
import { judgeVideo, unreadablePicture, type Judgement } from './judgeVideo'
import { mediaStorage } from './mediaStorage'
import { makePoster } from './poster'
import { probeFile } from './probe'
import {
  deleteVideo,
  findCaptionedBefore,
  findVideo,
  findVideoByUpload,
  insertVideo,
  listForgottenVideos,
  updateCheckedVideo,
  type VideoRow,
} from './videos.queries'

/** A file that has come in whole. */
export interface FinishedUpload {
  uploadId: string
  path: string
  bytes: number
  courseId: number
  lessonKey: string
  uploaderId: number
  originalName: string
}

/** The video that an upload has become, for the person who sent it. */
export async function findUploaded(uploadId: string, uploaderId: number) {
  const video = await findVideoByUpload(uploadId)
  return video?.uploaderId === uploaderId ? video : null
}

/** Takes a finished upload over as a video to be checked; a second time for the same upload does nothing. */
export async function addUploadedVideo({ uploadId, path, ...upload }: FinishedUpload) {
  const storageKey = `videos/${uploadId}`
  await mediaStorage.put(storageKey, path)
  try {
    await inTransaction(async (tx) => {
      const videoId = await insertVideo({ ...upload, uploadId, storageKey }, tx)
      await insertJob('probe-video', { videoId }, tx)
    })
  } catch (error) {
    if (!isDuplicate(error)) throw error
  }
  ringBell()
}

async function judgeFile(video: VideoRow, path: string, signal: AbortSignal) {
  const judgement = judgeVideo(await probeFile(path, signal))
  if (!judgement.isUsable) return { judgement, posterKey: null }
  const { durationMs } = judgement
  const poster = await makePoster(path, { videoId: video.id, durationMs, signal })
  if (!poster) return { judgement: unreadablePicture(), posterKey: null }
  const posterKey = `posters/${video.id}.webp`
  await mediaStorage.put(posterKey, poster)
  await rm(poster, { force: true })
  return { judgement, posterKey }
}

async function acceptVideo(
  video: VideoRow,
  { isUsable: _isUsable, ...found }: Extract<Judgement, { isUsable: true }>,
  posterKey: string | null,
) {
  await inTransaction(async (tx) => {
    if (!(await updateCheckedVideo(video.id, { ...found, posterKey, state: 'ready' }, tx))) return
    await showVideo(video, tx)
    const captioned = await findCaptionedBefore(video, tx)
    if (captioned === null || (await listTracks([video.id], tx)).length > 0) return
    await copyTracks(captioned, video.id, tx)
  })
}

/**
 * Finds out what an uploaded file is. A video that browsers play is measured, gets a poster and is
 * shown by its lesson while that is a draft, with the captions of the one before; anything else is
 * refused in a sentence and its file removed.
 */
export async function checkVideo(videoId: number, signal: AbortSignal) {
  const video = await findVideo(videoId)
  if (video?.state !== 'checking') return
  const { root, name } = mediaStorage.locate(video.storageKey)
  if (!(await mediaStorage.stat(video.storageKey)))
    throw new Error('the file is not in the storage')
  const { judgement, posterKey } = await judgeFile(video, join(root, name), signal)
  if (judgement.isUsable) return acceptVideo(video, judgement, posterKey)
  await updateCheckedVideo(videoId, { state: 'refused', refusal: judgement.refusal })
  await mediaStorage.remove(video.storageKey)
}

/** Refuses a video whose check has failed again and again. */
export async function refuseUncheckable(videoId: number) {
  await updateCheckedVideo(videoId, {
    state: 'refused',
    refusal:
      'The file could not be checked here. Send it again; if that fails too, tell the office.',
  })
}

/** Removes videos, files and all, that no lesson has shown for a month. */
export async function sweepVideos() {
  for (const video of await listForgottenVideos(50)) {
    await deleteVideo(video.id)
    await mediaStorage.remove(video.storageKey)
    if (video.posterKey) await mediaStorage.remove(video.posterKey)
  }
}
