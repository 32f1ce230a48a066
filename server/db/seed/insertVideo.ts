import type { Transaction } from '../client'
import { captionCues, captionTracks, videos } from '../schema'
import { insertedId } from './insertedId'
import type { BuiltVideo } from './videos'

/** Files that ship with the project have this before their name. */
const inDemoFolder = (name: string) => `demo:${name}`

interface VideoPlace {
  courseId: number
  lessonKey: string
  uploaderId: number
  createdAt: Date
  withCaptions: boolean
  tx: Transaction
}

/** Adds the video of one lesson; lessons that share a film have a row each, so that each opens its own. */
export async function insertVideo(
  video: BuiltVideo,
  { withCaptions, tx, ...place }: VideoPlace,
): Promise<number> {
  const videoId = await insertedId(
    tx
      .insert(videos)
      .values({
        ...place,
        storageKey: inDemoFolder(`${video.id}.mp4`),
        posterKey: inDemoFolder(`${video.id}.webp`),
        originalName: `${video.id}.mp4`,
        bytes: video.bytes,
        state: 'ready',
        durationMs: video.durationMs,
        width: video.width,
        height: video.height,
      })
      .$returningId(),
  )
  if (withCaptions) await insertCaptions(video, videoId, place.createdAt, tx)
  return videoId
}

async function insertCaptions(video: BuiltVideo, videoId: number, savedAt: Date, tx: Transaction) {
  const trackId = await insertedId(
    tx
      .insert(captionTracks)
      .values({
        videoId,
        language: 'en',
        label: 'English',
        isOriginal: true,
        preamble: '',
        savedAt,
      })
      .$returningId(),
  )
  await tx.insert(captionCues).values(
    video.cues.map((cue, position) => ({
      ...cue,
      trackId,
      position,
      cueId: String(position + 1),
    })),
  )
}
