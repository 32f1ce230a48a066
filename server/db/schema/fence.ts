import { sql } from 'drizzle-orm'
import {
  char,
  check,
  foreignKey,
  index,
  int,
  json,
  mysqlEnum,
  mysqlTable,
  smallint,
  text,
  unique,
  varchar,
} from 'drizzle-orm/mysql-core'
import { users } from './accounts'
import { createdAt, id, moment, reference, stableKey } from './columns'
import { courses } from './courses'

/** The running number of one lesson's room; every visible change takes the next. */
export const fenceRooms = mysqlTable(
  'fence_rooms',
  {
    id: id(),
    courseId: reference('course_id')
      .notNull()
      .references(() => courses.id, { onDelete: 'cascade' }),
    lessonKey: stableKey('lesson_key').notNull(),
    lastNumber: int('last_number', { unsigned: true }).notNull().default(0),
  },
  (t) => [unique('fence_rooms_lesson').on(t.courseId, t.lessonKey)],
)

const post = {
  authorId: reference('author_id').references(() => users.id, { onDelete: 'set null' }),
  /** As written. */
  markdown: text('markdown').notNull(),
  /** Rendered and sanitised when written. */
  html: text('html').notNull(),
  createdAt: createdAt(),
  editedAt: moment('edited_at'),
  deletedAt: moment('deleted_at'),
  version: int('version', { unsigned: true }).notNull().default(1),
}

export const questions = mysqlTable(
  'questions',
  {
    id: id(),
    roomId: reference('room_id')
      .notNull()
      .references(() => fenceRooms.id, { onDelete: 'cascade' }),
    /** The moment of the video it was asked at; null when about the whole lesson. */
    atMs: int('at_ms', { unsigned: true }),
    title: varchar('title', { length: 160 }).notNull(),
    ...post,
    state: mysqlEnum('state', ['open', 'settled', 'hidden']).notNull().default('open'),
    settledAnswerId: reference('settled_answer_id'),
    settledById: reference('settled_by_id').references(() => users.id, { onDelete: 'set null' }),
  },
  (t) => [
    index('questions_room_moment').on(t.roomId, t.atMs, t.id),
    check('questions_title', sql`char_length(trim(${t.title})) > 0`),
    check(
      'questions_settled_by_an_answer',
      sql`(${t.state} = 'settled') = (${t.settledAnswerId} is not null) or ${t.state} = 'hidden'`,
    ),
  ],
)

export const answers = mysqlTable(
  'answers',
  {
    id: id(),
    questionId: reference('question_id')
      .notNull()
      .references(() => questions.id, { onDelete: 'cascade' }),
    ...post,
  },
  (t) => [
    index('answers_question').on(t.questionId, t.id),
    unique('answers_of_question').on(t.questionId, t.id),
  ],
)

/** One visible change in a room, for readers who lost the line. */
export const fenceEvents = mysqlTable(
  'fence_events',
  {
    id: id(),
    roomId: reference('room_id')
      .notNull()
      .references(() => fenceRooms.id, { onDelete: 'cascade' }),
    number: int('number', { unsigned: true }).notNull(),
    questionId: reference('question_id').notNull(),
    kind: mysqlEnum('kind', [
      'asked',
      'answered',
      'edited',
      'deleted',
      'settled',
      'unsettled',
    ]).notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    unique('fence_events_number').on(t.roomId, t.number),
    foreignKey({
      name: 'fence_events_question',
      columns: [t.questionId],
      foreignColumns: [questions.id],
    }).onDelete('cascade'),
  ],
)

/** Answers already given to writes that a client may repeat. */
export const idempotencyKeys = mysqlTable(
  'idempotency_keys',
  {
    id: id(),
    userId: reference('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    route: varchar('route', { length: 80 }).notNull(),
    key: varchar('key', { length: 64 }).notNull(),
    /** SHA-256 of the payload. */
    fingerprint: char('fingerprint', { length: 64 }).notNull(),
    status: smallint('status', { unsigned: true }),
    response: json('response').$type<unknown>(),
    createdAt: createdAt(),
  },
  (t) => [
    unique('idempotency_keys_once').on(t.userId, t.route, t.key),
    index('idempotency_keys_created_at').on(t.createdAt),
  ],
)
