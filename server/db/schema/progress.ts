import { sql } from 'drizzle-orm'
import {
  check,
  foreignKey,
  index,
  int,
  json,
  mysqlEnum,
  mysqlTable,
  unique,
} from 'drizzle-orm/mysql-core'
import type { Interval } from '../../../shared/contracts/progress'
import { users } from './accounts'
import { createdAt, id, moment, reference, stableKey } from './columns'
import { courseRevisions, courses, kitItems } from './courses'

export const enrolments = mysqlTable(
  'enrolments',
  {
    id: id(),
    userId: reference('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    courseId: reference('course_id')
      .notNull()
      .references(() => courses.id),
    /** The revision the learner builds from. */
    revisionId: reference('revision_id')
      .notNull()
      .references(() => courseRevisions.id),
    createdAt: createdAt(),
  },
  (t) => [
    unique('enrolments_person_once').on(t.userId, t.courseId),
    index('enrolments_course').on(t.courseId),
  ],
)

/** What one enrolled person has watched of one lesson: a union of intervals, over all devices. */
export const lessonProgress = mysqlTable(
  'lesson_progress',
  {
    id: id(),
    userId: reference('user_id').notNull(),
    courseId: reference('course_id').notNull(),
    lessonKey: stableKey('lesson_key').notNull(),
    intervals: json('intervals').$type<Interval[]>().notNull(),
    watchedMs: int('watched_ms', { unsigned: true }).notNull().default(0),
    positionMs: int('position_ms', { unsigned: true }).notNull().default(0),
    state: mysqlEnum('state', ['not-started', 'under-way', 'done'])
      .notNull()
      .default('not-started'),
    doneAt: moment('done_at'),
    updatedAt: moment('updated_at')
      .notNull()
      .default(sql`CURRENT_TIMESTAMP(3)`),
  },
  (t) => [
    unique('lesson_progress_person_once').on(t.userId, t.courseId, t.lessonKey),
    foreignKey({
      name: 'lesson_progress_enrolled',
      columns: [t.userId, t.courseId],
      foreignColumns: [enrolments.userId, enrolments.courseId],
    }).onDelete('cascade'),
    check('lesson_progress_done_has_date', sql`${t.state} <> 'done' or ${t.doneAt} is not null`),
  ],
)

export const kitTicks = mysqlTable(
  'kit_ticks',
  {
    id: id(),
    userId: reference('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    kitItemId: reference('kit_item_id')
      .notNull()
      .references(() => kitItems.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
  },
  (t) => [unique('kit_ticks_person_once').on(t.userId, t.kitItemId)],
)
