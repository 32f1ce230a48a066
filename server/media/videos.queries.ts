import { and, desc, eq, inArray, max, ne, notInArray, sql } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { captionTracks, courses, lessons, videos } from '../db/schema'

export type VideoRow = typeof videos.$inferSelect

/** One video, or null. */
export async function findVideo(id: number, on: Executor = db): Promise<VideoRow | null> {
  const [row] = await on.select().from(videos).where(eq(videos.id, id))
  return row ?? null
}

/** The video that came by this upload, or null. */
export async function findVideoByUpload(uploadId: string): Promise<VideoRow | null> {
  const [row] = await db.select().from(videos).where(eq(videos.uploadId, uploadId))
  return row ?? null
}

/** Those of these videos that are there. */
export const listVideos = async (ids: number[], on: Executor = db): Promise<VideoRow[]> =>
  ids.length ? on.select().from(videos).where(inArray(videos.id, ids)) : []

/** The last video that was sent for each of these lessons. */
export async function listNewestVideos(
  courseId: number,
  lessonKeys: string[],
  on: Executor = db,
): Promise<VideoRow[]> {
  if (lessonKeys.length === 0) return []
  const newest = await on
    .select({ id: max(videos.id) })
    .from(videos)
    .where(and(eq(videos.courseId, courseId), inArray(videos.lessonKey, lessonKeys)))
    .groupBy(videos.lessonKey)
  return listVideos(
    newest.flatMap(({ id }) => (id === null ? [] : [id])),
    on,
  )
}

/** Adds a video and returns its id; throws a duplicate error when its upload has one. */
export async function insertVideo(
  values: Omit<typeof videos.$inferInsert, 'id'>,
  tx: Transaction,
): Promise<number> {
  const [row] = await tx.insert(videos).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Writes down what was found out about a video that is still being checked; false when it is not. */
export async function updateCheckedVideo(
  id: number,
  values: Partial<
    Pick<
      VideoRow,
      'state' | 'refusal' | 'durationMs' | 'width' | 'height' | 'contentType' | 'posterKey'
    >
  >,
  on: Executor = db,
): Promise<boolean> {
  const [result] = await on
    .update(videos)
    .set(values)
    .where(and(eq(videos.id, id), eq(videos.state, 'checking')))
  return result.affectedRows === 1
}

/** The last video of the same lesson, other than this one, that has captions; null when none has. */
export async function findCaptionedBefore(
  video: VideoRow,
  tx: Transaction,
): Promise<number | null> {
  const [row] = await tx
    .select({ id: videos.id })
    .from(videos)
    .innerJoin(captionTracks, eq(captionTracks.videoId, videos.id))
    .where(
      and(
        eq(videos.courseId, video.courseId),
        eq(videos.lessonKey, video.lessonKey),
        ne(videos.id, video.id),
      ),
    )
    .orderBy(desc(videos.id))
    .limit(1)
  return row?.id ?? null
}

/** Storage keys of all files of a course's videos. */
export async function listStorageKeys(courseId: number): Promise<string[]> {
  const rows = await db
    .select({ storageKey: videos.storageKey, posterKey: videos.posterKey })
    .from(videos)
    .where(eq(videos.courseId, courseId))
  return rows.flatMap(({ storageKey, posterKey }) =>
    posterKey ? [storageKey, posterKey] : [storageKey],
  )
}

/** Videos that no lesson shows and that no lesson may still want: older than a month, and not the newest of a lesson. */
export async function listForgottenVideos(limit: number): Promise<VideoRow[]> {
  const shown = db
    .select({ id: sql<number>`${lessons.videoId}` })
    .from(lessons)
    .where(sql`${lessons.videoId} is not null`)
  const newest = db
    .select({ id: sql<number>`max(${videos.id})` })
    .from(videos)
    .innerJoin(courses, eq(courses.id, videos.courseId))
    .groupBy(videos.courseId, videos.lessonKey)
  return db
    .select()
    .from(videos)
    .where(
      and(
        notInArray(videos.id, shown),
        notInArray(videos.id, newest),
        sql`${videos.createdAt} < utc_timestamp(3) - interval 30 day`,
      ),
    )
    .limit(limit)
}

/** Forgets a video with its captions. */
export async function deleteVideo(id: number) {
  await db.delete(videos).where(eq(videos.id, id))
}
