import { sql } from 'drizzle-orm'
import {
  bigint,
  boolean,
  check,
  index,
  int,
  json,
  mysqlEnum,
  mysqlTable,
  text,
  unique,
  varchar,
} from 'drizzle-orm/mysql-core'
import { users } from './accounts'
import { createdAt, id, moment, reference, stableKey } from './columns'

/** A video as it was uploaded; several lessons and revisions may show the same one. */
export const videos = mysqlTable(
  'videos',
  {
    id: id(),
    courseId: reference('course_id').notNull(),
    lessonKey: stableKey('lesson_key').notNull(),
    uploaderId: reference('uploader_id').references(() => users.id, { onDelete: 'set null' }),
    /** The tus upload it came by; null for videos that were put in otherwise. */
    uploadId: varchar('upload_id', { length: 64 }).unique(),
    /** Key in the media storage. */
    storageKey: varchar('storage_key', { length: 190 }).notNull(),
    posterKey: varchar('poster_key', { length: 190 }),
    originalName: varchar('original_name', { length: 255 }).notNull(),
    contentType: varchar('content_type', { length: 100 }).notNull().default('video/mp4'),
    bytes: bigint('bytes', { mode: 'number', unsigned: true }).notNull(),
    state: mysqlEnum('state', ['checking', 'ready', 'refused']).notNull().default('checking'),
    /** Why a refused file cannot be used, in a sentence. */
    refusal: varchar('refusal', { length: 500 }),
    durationMs: int('duration_ms', { unsigned: true }),
    width: int('width', { unsigned: true }),
    height: int('height', { unsigned: true }),
    createdAt: createdAt(),
  },
  (t) => [
    index('videos_lesson').on(t.courseId, t.lessonKey),
    check('videos_ready_is_measured', sql`${t.state} <> 'ready' or ${t.durationMs} > 0`),
    check('videos_refused_says_why', sql`${t.state} <> 'refused' or ${t.refusal} is not null`),
  ],
)

export const captionTracks = mysqlTable(
  'caption_tracks',
  {
    id: id(),
    videoId: reference('video_id')
      .notNull()
      .references(() => videos.id, { onDelete: 'cascade' }),
    language: varchar('language', { length: 35 }).notNull(),
    label: varchar('label', { length: 60 }).notNull(),
    isOriginal: boolean('is_original').notNull().default(false),
    /** What stood before the first cue: header text, NOTE and STYLE blocks. */
    preamble: text('preamble').notNull(),
    version: int('version', { unsigned: true }).notNull().default(1),
    savedAt: moment('saved_at')
      .notNull()
      .default(sql`CURRENT_TIMESTAMP(3)`),
  },
  (t) => [unique('caption_tracks_language').on(t.videoId, t.language)],
)

export const captionCues = mysqlTable(
  'caption_cues',
  {
    id: id(),
    trackId: reference('track_id')
      .notNull()
      .references(() => captionTracks.id, { onDelete: 'cascade' }),
    position: int('position', { unsigned: true }).notNull(),
    cueId: varchar('cue_id', { length: 190 }).notNull().default(''),
    startMs: int('start_ms', { unsigned: true }).notNull(),
    endMs: int('end_ms', { unsigned: true }).notNull(),
    settings: varchar('settings', { length: 255 }).notNull().default(''),
    text: text('text').notNull(),
  },
  (t) => [
    unique('caption_cues_position').on(t.trackId, t.position),
    check('caption_cues_end_after_start', sql`${t.endMs} > ${t.startMs}`),
  ],
)

/** Work done in the background, one row a job. */
export const jobs = mysqlTable(
  'jobs',
  {
    id: id(),
    kind: varchar('kind', { length: 40 }).notNull(),
    payload: json('payload').$type<Record<string, unknown>>().notNull(),
    state: mysqlEnum('state', ['waiting', 'running', 'done', 'failed'])
      .notNull()
      .default('waiting'),
    attempts: int('attempts', { unsigned: true }).notNull().default(0),
    runAfter: moment('run_after')
      .notNull()
      .default(sql`CURRENT_TIMESTAMP(3)`),
    /** Set while running and renewed; a job whose beat is old is taken up again. */
    beatAt: moment('beat_at'),
    failure: varchar('failure', { length: 500 }),
    createdAt: createdAt(),
  },
  (t) => [index('jobs_next').on(t.state, t.runAfter)],
)
