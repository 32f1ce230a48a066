import { and, asc, desc, eq } from 'drizzle-orm'
import { db } from '../db/client'
import { captionTracks, hindsightNotes, users, videos } from '../db/schema'

/** A video that is ready to be played, or null. */
export async function findReadyVideo(id: number) {
  const [row] = await db
    .select({
      id: videos.id,
      contentType: videos.contentType,
      posterKey: videos.posterKey,
      durationMs: videos.durationMs,
    })
    .from(videos)
    .where(and(eq(videos.id, id), eq(videos.state, 'ready')))
  return row ?? null
}

/** The caption tracks of a video, its own language first. */
export async function listCaptionTracks(videoId: number) {
  return db
    .select({
      id: captionTracks.id,
      language: captionTracks.language,
      label: captionTracks.label,
      isOriginal: captionTracks.isOriginal,
    })
    .from(captionTracks)
    .where(eq(captionTracks.videoId, videoId))
    .orderBy(desc(captionTracks.isOriginal), asc(captionTracks.language))
}

/** The hindsight notes of a lesson in the order of their moments. */
export async function listHindsight(courseId: number, lessonKey: string) {
  return db
    .select({
      id: hindsightNotes.id,
      atMs: hindsightNotes.atMs,
      text: hindsightNotes.text,
      by: users.displayName,
      createdAt: hindsightNotes.createdAt,
    })
    .from(hindsightNotes)
    .leftJoin(users, eq(users.id, hindsightNotes.authorId))
    .where(and(eq(hindsightNotes.courseId, courseId), eq(hindsightNotes.lessonKey, lessonKey)))
    .orderBy(asc(hindsightNotes.atMs), asc(hindsightNotes.id))
}
