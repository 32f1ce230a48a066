import { int, json, mysqlTable, index, varchar } from 'drizzle-orm/mysql-core'
import { createdAt, id, reference, stableKey } from './columns'
import { enrolments } from './progress'

/** One learner's own project within a course. */
export const builds = mysqlTable('builds', {
  id: id(),
  enrolmentId: reference('enrolment_id')
    .notNull()
    .unique()
    .references(() => enrolments.id, { onDelete: 'cascade' }),
  name: varchar('name', { length: 90 }).notNull(),
  createdAt: createdAt(),
})

/** A number in the field book: inputs as typed, outputs in SI, and the moment it came from. */
export const fieldBookEntries = mysqlTable(
  'field_book_entries',
  {
    id: id(),
    buildId: reference('build_id')
      .notNull()
      .references(() => builds.id, { onDelete: 'cascade' }),
    lessonKey: stableKey('lesson_key'),
    stopKey: stableKey('stop_key'),
    atMs: int('at_ms', { unsigned: true }),
    calculator: varchar('calculator', { length: 40 }).notNull(),
    calculatorVersion: int('calculator_version', { unsigned: true }).notNull(),
    inputs: json('inputs').$type<Record<string, string>>().notNull(),
    outputs: json('outputs')
      .$type<Record<string, number | string | boolean | readonly number[]>>()
      .notNull(),
    createdAt: createdAt(),
  },
  (t) => [index('field_book_entries_build').on(t.buildId, t.id)],
)
