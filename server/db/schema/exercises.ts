import { sql } from 'drizzle-orm'
import {
  boolean,
  check,
  index,
  int,
  json,
  mysqlEnum,
  mysqlTable,
  smallint,
  tinyint,
  unique,
  varchar,
} from 'drizzle-orm/mysql-core'
import type {
  Answer,
  CalculatorDefinition,
  QuizQuestion,
  Verdict,
} from '../../../shared/contracts/exercises'
import type { OwnCalculatorDefinition } from '../../../shared/contracts/ownCalculators'
import { users } from './accounts'
import { createdAt, id, moment, reference, stableKey } from './columns'
import { courses, lessons } from './courses'

/** A moment at which the video stops for an exercise. */
export const stops = mysqlTable(
  'stops',
  {
    id: id(),
    lessonId: reference('lesson_id')
      .notNull()
      .references(() => lessons.id, { onDelete: 'cascade' }),
    key: stableKey().notNull(),
    name: varchar('name', { length: 40 }).notNull(),
    atMs: int('at_ms', { unsigned: true }).notNull(),
    /** The video waits; otherwise the stop may be skipped and comes back at the lesson's end. */
    isRequired: boolean('is_required').notNull().default(true),
    version: int('version', { unsigned: true }).notNull().default(1),
  },
  (t) => [
    unique('stops_key').on(t.lessonId, t.key),
    unique('stops_moment').on(t.lessonId, t.atMs),
    check('stops_name', sql`char_length(trim(${t.name})) > 0`),
  ],
)

export const exercises = mysqlTable(
  'exercises',
  {
    id: id(),
    stopId: reference('stop_id')
      .notNull()
      .unique()
      .references(() => stops.id, { onDelete: 'cascade' }),
    key: stableKey().notNull(),
    kind: mysqlEnum('kind', ['calculator', 'quiz']).notNull(),
    prompt: varchar('prompt', { length: 600 }).notNull().default(''),
    tries: tinyint('tries', { unsigned: true }),
    /** Of a calculator exercise. */
    definition: json('definition').$type<CalculatorDefinition>(),
    /** Of a quiz, in per cent. */
    passMark: tinyint('pass_mark', { unsigned: true }),
  },
  (t) => [
    check('exercises_tries', sql`${t.tries} is null or ${t.tries} between 1 and 20`),
    check(
      'exercises_kind',
      sql`(${t.kind} = 'calculator' and ${t.definition} is not null and ${t.passMark} is null) or (${t.kind} = 'quiz' and ${t.definition} is null and ${t.passMark} between 1 and 100)`,
    ),
  ],
)

export const quizQuestions = mysqlTable(
  'quiz_questions',
  {
    id: id(),
    exerciseId: reference('exercise_id')
      .notNull()
      .references(() => exercises.id, { onDelete: 'cascade' }),
    key: stableKey().notNull(),
    kind: mysqlEnum('kind', ['single', 'several', 'number', 'order']).notNull(),
    prompt: varchar('prompt', { length: 500 }).notNull().default(''),
    definition: json('definition').$type<QuizQuestion['definition']>().notNull(),
    position: smallint('position', { unsigned: true }).notNull(),
  },
  (t) => [
    unique('quiz_questions_key').on(t.exerciseId, t.key),
    unique('quiz_questions_position').on(t.exerciseId, t.position),
  ],
)

/** An instructor's own calculator: the draft that is written, and which of its versions can be attached. */
export const ownCalculators = mysqlTable(
  'own_calculators',
  {
    id: id(),
    courseId: reference('course_id')
      .notNull()
      .references(() => courses.id, { onDelete: 'cascade' }),
    key: stableKey().notNull(),
    title: varchar('title', { length: 60 }).notNull().default(''),
    definition: json('definition').$type<OwnCalculatorDefinition>().notNull(),
    /** The newest version that was kept, or null. */
    attachable: int('attachable', { unsigned: true }),
    version: int('version', { unsigned: true }).notNull().default(1),
    savedAt: moment('saved_at')
      .notNull()
      .default(sql`CURRENT_TIMESTAMP(3)`),
    createdAt: createdAt(),
  },
  (t) => [unique('own_calculators_key').on(t.courseId, t.key)],
)

/** A version as it was kept; rows are added and never changed. */
export const ownCalculatorVersions = mysqlTable(
  'own_calculator_versions',
  {
    id: id(),
    calculatorId: reference('calculator_id')
      .notNull()
      .references(() => ownCalculators.id, { onDelete: 'cascade' }),
    number: int('number', { unsigned: true }).notNull(),
    definition: json('definition').$type<OwnCalculatorDefinition>().notNull(),
    createdById: reference('created_by_id').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
  },
  (t) => [unique('own_calculator_versions_number').on(t.calculatorId, t.number)],
)

/** How one person stands at one stop; the seed gives them numbers of their own. */
export const stopStates = mysqlTable(
  'stop_states',
  {
    id: id(),
    userId: reference('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    courseId: reference('course_id')
      .notNull()
      .references(() => courses.id, { onDelete: 'cascade' }),
    lessonKey: stableKey('lesson_key').notNull(),
    stopKey: stableKey('stop_key').notNull(),
    seed: int('seed', { unsigned: true }).notNull(),
    triesUsed: int('tries_used', { unsigned: true }).notNull().default(0),
    solvedAt: moment('solved_at'),
  },
  (t) => [unique('stop_states_person_once').on(t.userId, t.courseId, t.lessonKey, t.stopKey)],
)

/** One answer handed in; points to the exercise as it stood. */
export const attempts = mysqlTable(
  'attempts',
  {
    id: id(),
    userId: reference('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    exerciseId: reference('exercise_id')
      .notNull()
      .references(() => exercises.id),
    tryNumber: int('try_number', { unsigned: true }).notNull(),
    answer: json('answer').$type<Answer>().notNull(),
    verdict: json('verdict').$type<Verdict>().notNull(),
    outcome: mysqlEnum('outcome', ['right', 'slip', 'wrong', 'unread']).notNull(),
    slipId: varchar('slip_id', { length: 40 }),
    createdAt: createdAt(),
  },
  (t) => [
    index('attempts_person').on(t.userId, t.exerciseId, t.id),
    check('attempts_slip_is_named', sql`${t.outcome} <> 'slip' or ${t.slipId} is not null`),
  ],
)
