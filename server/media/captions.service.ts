import type {
  CaptionTrack,
  CaptionUpload,
  CuePage,
  SaveCues,
  UploadCaptionsQuery,
} from '../../shared/contracts/media'
import type { PageQuery } from '../../shared/contracts/pagination'
import type { Actor } from '../../shared/contracts/policies'
import { findCueProblems } from '../../shared/captions/check'
import { readCaptions } from '../../shared/captions/read'
import { writeCaptions } from '../../shared/captions/write'
import { accessBenchRow } from '../courses/access.service'
import { changeDraft, changeDraftOf, staleVersion, withCurrent } from '../courses/drafts.service'
import { findLessonToFilm, isVideoIssued } from '../courses/lessonVideos.service'
import type { Transaction } from '../db/client'
import { conflict, invalid, notFound } from '../errors'
import {
  deleteTrack,
  findTrack,
  insertTrack,
  listCues,
  listTracks,
  lockTrack,
  lockTrackOf,
  replaceCues,
  updateTrack,
  type MeasuredTrack,
} from './captionTracks.queries'
import { listLessonMedia } from './lessonMedia.service'
import { checkMaySee, type Viewer } from './media.service'
import { findVideo } from './videos.queries'

const allCues = { after: -1, limit: 100_000 }

/** How a person stands to the course behind a lesson or a caption track. */
export const accessCaptions = (
  which: { lessonId: number } | { trackId: number },
  actor: Actor | null,
) => accessBenchRow(which, actor)

const toTrack = ({
  videoId: _videoId,
  lastStartMs: _last,
  ...track
}: MeasuredTrack): CaptionTrack => track

async function describeTrack(trackId: number): Promise<CaptionTrack> {
  const track = await findTrack(trackId)
  const measured = track && (await listTracks([track.videoId])).find(({ id }) => id === trackId)
  if (!measured) throw notFound('caption track')
  return toTrack(measured)
}

/** The video whose captions a lesson shows: the one it plays, or the one that is on its way. */
async function findCaptionedVideo(lessonId: number) {
  const lesson = await findLessonToFilm(lessonId)
  const media = (await listLessonMedia(lesson.courseId, [lesson])).get(lessonId)
  const videoId = lesson.videoId ?? media?.video?.id
  if (videoId === undefined) {
    throw conflict('no-video', 'Captions belong to a video. Send the video of this lesson first.')
  }
  return { videoId, revisionId: lesson.revisionId }
}

async function saveTrack(
  videoId: number,
  { language, label }: UploadCaptionsQuery,
  preamble: string,
  tx: Transaction,
): Promise<number> {
  const before = await lockTrackOf(videoId, language, tx)
  if (before) {
    await updateTrack(before.id, { label, preamble }, tx)
    return before.id
  }
  const isOriginal = !(await listTracks([videoId], tx)).some((track) => track.isOriginal)
  return insertTrack({ videoId, language, label, preamble, isOriginal }, tx)
}

/**
 * Takes a caption file for a draft lesson's video. The first language is the video's own. Nothing is
 * stored, and what was there stays, unless the whole file can be read.
 */
export async function uploadCaptions(
  lessonId: number,
  query: UploadCaptionsQuery,
  bytes: Uint8Array,
): Promise<CaptionUpload> {
  const { videoId, revisionId } = await findCaptionedVideo(lessonId)
  const read = readCaptions(bytes)
  if (!read.ok) return { stored: false, track: null, errors: read.errors, marks: [] }
  const trackId = await changeDraft(revisionId, async (tx) => {
    const id = await saveTrack(videoId, query, read.preamble, tx)
    await replaceCues(id, read.cues, tx)
    return id
  })
  return { stored: true, track: await describeTrack(trackId), errors: [], marks: read.marks }
}

/** A page of a track's cues in order. */
export async function listCuePage(trackId: number, { cursor, limit }: PageQuery): Promise<CuePage> {
  if (cursor !== undefined && !/^\d{1,9}$/.test(cursor)) {
    throw invalid([{ field: 'cursor', message: 'Use the cursor of the page before.' }])
  }
  const after = cursor === undefined ? -1 : Number(cursor)
  const rows = await listCues(trackId, { after, limit: limit + 1 })
  const page = rows.slice(0, limit)
  return {
    track: await describeTrack(trackId),
    items: page.map(({ position: _position, ...cue }) => cue),
    nextCursor: rows.length > limit ? String(page.at(-1)?.position) : null,
  }
}

/** Changes a track whose video learners do not have yet, in the draft of its course. */
async function changeTrack(
  trackId: number,
  work: (track: { id: number; version: number }, tx: Transaction) => Promise<void>,
) {
  const known = await findTrack(trackId)
  const video = known && (await findVideo(known.videoId))
  if (!video) throw notFound('caption track')
  await changeDraftOf(video.courseId, async (tx) => {
    const track = await lockTrack(trackId, tx)
    if (!track) throw notFound('caption track')
    if (await isVideoIssued(video.id, tx)) {
      throw conflict('issued', 'Learners have this video with these captions, so they stay.')
    }
    await work(track, tx)
  })
}

/** Puts an edited list in the place of a track's cues; 409 with the track when someone else was first. */
export async function saveCues(
  trackId: number,
  { version, cues }: SaveCues,
): Promise<CaptionTrack> {
  const problems = findCueProblems(cues)
  if (problems.length > 0) {
    throw invalid(problems.map(({ field, message }) => ({ field: `cues.${field}`, message })))
  }
  const save = changeTrack(trackId, async (track, tx) => {
    if (track.version !== version) throw staleVersion('list of captions')
    await updateTrack(trackId, {}, tx)
    await replaceCues(trackId, cues, tx)
  })
  await withCurrent(save, () => describeTrack(trackId))
  return describeTrack(trackId)
}

/** Takes a language off a video. */
export const removeTrack = (trackId: number) =>
  changeTrack(trackId, ({ id }, tx) => deleteTrack(id, tx))

/** A track as a WebVTT file, for whoever may watch its video now. */
export async function renderCaptions(trackId: number, viewer: Viewer): Promise<string> {
  const track = await findTrack(trackId)
  const video = track && (await findVideo(track.videoId))
  if (!video) throw notFound('caption track')
  await checkMaySee(video, viewer, { needsKit: true })
  return writeCaptions(track, await listCues(trackId, allCues))
}
