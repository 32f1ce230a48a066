import { and, asc, count, eq, gt, inArray, max, sql } from 'drizzle-orm'
import type { CaptionTrack, Cue } from '../../shared/contracts/media'
import { db, type Executor, type Transaction } from '../db/client'
import { captionCues, captionTracks } from '../db/schema'

export type TrackRow = typeof captionTracks.$inferSelect
/** A track as staff see it, with the end of its last cue. */
export interface MeasuredTrack extends CaptionTrack {
  videoId: number
  /** Start of the last cue in ms. */
  lastStartMs: number
}

/** Cues written by one statement: 5,000 at once would pass the size of a packet. */
const cuesAtOnce = 1000

/** The caption tracks of these videos, the one in the video's own language first. */
export async function listTracks(videoIds: number[], on: Executor = db): Promise<MeasuredTrack[]> {
  if (videoIds.length === 0) return []
  const rows = await on
    .select({ track: captionTracks, cues: count(captionCues.id), last: max(captionCues.startMs) })
    .from(captionTracks)
    .leftJoin(captionCues, eq(captionCues.trackId, captionTracks.id))
    .where(inArray(captionTracks.videoId, videoIds))
    .groupBy(captionTracks.id)
    .orderBy(sql`${captionTracks.isOriginal} desc`, asc(captionTracks.language))
  return rows.map(({ track, cues, last }) => ({
    id: track.id,
    videoId: track.videoId,
    language: track.language,
    label: track.label,
    isOriginal: track.isOriginal,
    cues,
    version: track.version,
    savedAt: track.savedAt.toISOString(),
    lastStartMs: last ?? 0,
  }))
}

/** One track, or null. */
export async function findTrack(id: number, on: Executor = db): Promise<TrackRow | null> {
  const [row] = await on.select().from(captionTracks).where(eq(captionTracks.id, id))
  return row ?? null
}

/** The track of a video in one language, locked; null when there is none. */
export async function lockTrackOf(videoId: number, language: string, tx: Transaction) {
  const [row] = await tx
    .select()
    .from(captionTracks)
    .where(and(eq(captionTracks.videoId, videoId), eq(captionTracks.language, language)))
    .for('update')
  return row ?? null
}

/** One track, locked until the transaction ends; null when it is gone. */
export async function lockTrack(id: number, tx: Transaction) {
  const [row] = await tx.select().from(captionTracks).where(eq(captionTracks.id, id)).for('update')
  return row ?? null
}

/** Adds a track and returns its id. */
export async function insertTrack(
  values: Omit<typeof captionTracks.$inferInsert, 'id'>,
  tx: Transaction,
): Promise<number> {
  const [row] = await tx.insert(captionTracks).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Marks a track as saved now, under its next version. */
export async function updateTrack(
  id: number,
  values: Partial<Pick<TrackRow, 'label' | 'preamble'>>,
  tx: Transaction,
) {
  await tx
    .update(captionTracks)
    .set({
      ...values,
      version: sql`${captionTracks.version} + 1`,
      savedAt: sql`utc_timestamp(3)`,
    })
    .where(eq(captionTracks.id, id))
}

/** Removes a track with its cues. */
export async function deleteTrack(id: number, tx: Transaction) {
  await tx.delete(captionTracks).where(eq(captionTracks.id, id))
}

/** Puts other cues in the place of a track's. */
export async function replaceCues(trackId: number, cues: Cue[], tx: Transaction) {
  await tx.delete(captionCues).where(eq(captionCues.trackId, trackId))
  for (let from = 0; from < cues.length; from += cuesAtOnce) {
    const rows = cues
      .slice(from, from + cuesAtOnce)
      .map((cue, index) => ({ ...cue, trackId, position: from + index }))
    await tx.insert(captionCues).values(rows)
  }
}

/** The cues of a track after a position, in order. */
export async function listCues(
  trackId: number,
  { after, limit }: { after: number; limit: number },
  on: Executor = db,
): Promise<(Cue & { position: number })[]> {
  return on
    .select({
      position: captionCues.position,
      cueId: captionCues.cueId,
      startMs: captionCues.startMs,
      endMs: captionCues.endMs,
      settings: captionCues.settings,
      text: captionCues.text,
    })
    .from(captionCues)
    .where(and(eq(captionCues.trackId, trackId), gt(captionCues.position, after)))
    .orderBy(asc(captionCues.position))
    .limit(limit)
}

/** Copies all tracks of one video to another that has none. */
export async function copyTracks(fromVideoId: number, toVideoId: number, tx: Transaction) {
  const tracks = await tx.select().from(captionTracks).where(eq(captionTracks.videoId, fromVideoId))
  for (const { id, language, label, isOriginal, preamble } of tracks) {
    const trackId = await insertTrack(
      { videoId: toVideoId, language, label, isOriginal, preamble },
      tx,
    )
    await tx.insert(captionCues).select(
      tx
        .select({
          id: sql<number>`null`.as('id'),
          trackId: sql<number>`${trackId}`.as('track_id'),
          position: captionCues.position,
          cueId: captionCues.cueId,
          startMs: captionCues.startMs,
          endMs: captionCues.endMs,
          settings: captionCues.settings,
          text: captionCues.text,
        })
        .from(captionCues)
        .where(eq(captionCues.trackId, id)),
    )
  }
}
