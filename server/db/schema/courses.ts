import { sql } from 'drizzle-orm'
import {
  boolean,
  check,
  foreignKey,
  index,
  int,
  json,
  mysqlEnum,
  mysqlTable,
  smallint,
  text,
  tinyint,
  unique,
  varchar,
} from 'drizzle-orm/mysql-core'
import type { Hazard } from '../../../shared/contracts/courses'
import { users } from './accounts'
import { createdAt, id, moment, reference, stableKey } from './columns'
import { videos } from './media'

export const courses = mysqlTable(
  'courses',
  {
    id: id(),
    slug: varchar('slug', { length: 80 }).notNull().unique(),
    /** Shown as sheet GF-01. */
    sheetNumber: smallint('sheet_number', { unsigned: true }).notNull().unique(),
    state: mysqlEnum('state', ['draft', 'issued', 'closed']).notNull().default('draft'),
    priceCents: int('price_cents', { unsigned: true }).notNull().default(0),
    currency: varchar('currency', { length: 3 }).notNull().default('EUR'),
    createdAt: createdAt(),
  },
  (t) => [check('courses_currency_code', sql`${t.currency} regexp '^[A-Z]{3}$'`)],
)

export const courseStaff = mysqlTable(
  'course_staff',
  {
    id: id(),
    courseId: reference('course_id')
      .notNull()
      .references(() => courses.id, { onDelete: 'cascade' }),
    userId: reference('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    role: mysqlEnum('role', ['owner', 'helper']).notNull(),
    /** The owner's course id, else null: a course has one owner. */
    ownerOf: int('owner_of', { unsigned: true }).generatedAlwaysAs(
      sql`(if(\`role\` = 'owner', \`course_id\`, null))`,
      { mode: 'stored' },
    ),
  },
  (t) => [
    unique('course_staff_person_once').on(t.courseId, t.userId),
    unique('course_staff_one_owner').on(t.ownerOf),
    index('course_staff_user_id').on(t.userId),
  ],
)

/** One version of a course; a draft until `issuedAt` is set, frozen from then on by triggers. */
export const courseRevisions = mysqlTable(
  'course_revisions',
  {
    id: id(),
    courseId: reference('course_id')
      .notNull()
      .references(() => courses.id, { onDelete: 'cascade' }),
    /** 0 is Rev A, 1 is Rev B. */
    number: smallint('number', { unsigned: true }).notNull(),
    title: varchar('title', { length: 90 }).notNull(),
    /** What you will have built. */
    outcome: varchar('outcome', { length: 600 }).notNull().default(''),
    weekends: tinyint('weekends', { unsigned: true }).notNull().default(1),
    tools: json('tools').$type<string[]>().notNull(),
    hazards: json('hazards').$type<Hazard[]>().notNull(),
    coverDrawing: mysqlEnum('cover_drawing', ['log-store', 'deck', 'picket-fence']).notNull(),
    /** Facts beside the drawing: "Pad", "2600 × 1100 × 100". */
    facts: json('facts').$type<{ label: string; value: string }[]>().notNull(),
    notCovered: varchar('not_covered', { length: 1000 }).notNull().default(''),
    changeNote: varchar('change_note', { length: 300 }).notNull().default(''),
    version: int('version', { unsigned: true }).notNull().default(1),
    savedAt: moment('saved_at')
      .notNull()
      .default(sql`CURRENT_TIMESTAMP(3)`),
    issuedAt: moment('issued_at'),
    issuedById: reference('issued_by_id').references(() => users.id, { onDelete: 'set null' }),
    /** The course's id while a draft, else null: a course has one draft. */
    draftOf: int('draft_of', { unsigned: true }).generatedAlwaysAs(
      sql`(if(\`issued_at\` is null, \`course_id\`, null))`,
      { mode: 'stored' },
    ),
  },
  (t) => [
    unique('course_revisions_number').on(t.courseId, t.number),
    unique('course_revisions_one_draft').on(t.draftOf),
    check('course_revisions_title', sql`char_length(trim(${t.title})) > 0`),
    check('course_revisions_weekends', sql`${t.weekends} between 1 and 52`),
  ],
)

export const stages = mysqlTable(
  'stages',
  {
    id: id(),
    revisionId: reference('revision_id')
      .notNull()
      .references(() => courseRevisions.id, { onDelete: 'cascade' }),
    key: stableKey().notNull(),
    kind: mysqlEnum('kind', ['ground', 'base', 'frame', 'cladding', 'roof', 'finish']).notNull(),
    title: varchar('title', { length: 60 }).notNull(),
    position: smallint('position', { unsigned: true }).notNull(),
  },
  (t) => [
    unique('stages_key').on(t.revisionId, t.key),
    unique('stages_position').on(t.revisionId, t.position),
    unique('stages_in_revision').on(t.id, t.revisionId),
    check('stages_title', sql`char_length(trim(${t.title})) > 0`),
  ],
)

export const lessons = mysqlTable(
  'lessons',
  {
    id: id(),
    revisionId: reference('revision_id').notNull(),
    stageId: reference('stage_id').notNull(),
    key: stableKey().notNull(),
    title: varchar('title', { length: 90 }).notNull(),
    summary: varchar('summary', { length: 600 }).notNull().default(''),
    /** "A second pair of hands, four dry hours, no frost tonight." */
    youWillWant: varchar('you_will_want', { length: 300 }).notNull().default(''),
    hazards: json('hazards').$type<Hazard[]>().notNull(),
    position: smallint('position', { unsigned: true }).notNull(),
    isSample: boolean('is_sample').notNull().default(false),
    videoId: reference('video_id').references(() => videos.id, { onDelete: 'set null' }),
    version: int('version', { unsigned: true }).notNull().default(1),
  },
  (t) => [
    foreignKey({
      name: 'lessons_stage_in_revision',
      columns: [t.stageId, t.revisionId],
      foreignColumns: [stages.id, stages.revisionId],
    }).onDelete('cascade'),
    unique('lessons_key').on(t.revisionId, t.key),
    unique('lessons_position').on(t.stageId, t.position),
    check('lessons_title', sql`char_length(trim(${t.title})) > 0`),
  ],
)

/** One row of a lesson's kit check. */
export const kitItems = mysqlTable(
  'kit_items',
  {
    id: id(),
    lessonId: reference('lesson_id')
      .notNull()
      .references(() => lessons.id, { onDelete: 'cascade' }),
    key: stableKey().notNull(),
    kind: mysqlEnum('kind', ['on-you', 'to-hand', 'caution']).notNull(),
    icon: varchar('icon', { length: 30 }).notNull().default('generic'),
    title: varchar('title', { length: 90 }).notNull(),
    detail: varchar('detail', { length: 300 }).notNull().default(''),
    position: smallint('position', { unsigned: true }).notNull(),
  },
  (t) => [
    unique('kit_items_key').on(t.lessonId, t.key),
    unique('kit_items_position').on(t.lessonId, t.position),
    check('kit_items_title', sql`char_length(trim(${t.title})) > 0`),
  ],
)

/** A hindsight note pinned to a moment of a lesson, in whatever revision. */
export const hindsightNotes = mysqlTable(
  'hindsight_notes',
  {
    id: id(),
    courseId: reference('course_id')
      .notNull()
      .references(() => courses.id, { onDelete: 'cascade' }),
    lessonKey: stableKey('lesson_key').notNull(),
    atMs: int('at_ms', { unsigned: true }).notNull(),
    text: text('text').notNull(),
    authorId: reference('author_id').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
  },
  (t) => [index('hindsight_notes_lesson').on(t.courseId, t.lessonKey, t.atMs)],
)
