import { sql } from 'drizzle-orm'
import { check, index, int, mysqlEnum, mysqlTable, text, varchar } from 'drizzle-orm/mysql-core'
import { createdAt, id, moment, reference } from './columns'

export const users = mysqlTable(
  'users',
  {
    id: id(),
    email: varchar('email', { length: 254 }).notNull().unique(),
    displayName: varchar('display_name', { length: 60 }).notNull(),
    passwordHash: varchar('password_hash', { length: 255 }).notNull(),
    role: mysqlEnum('role', ['learner', 'instructor', 'admin']).notNull().default('learner'),
    units: mysqlEnum('units', ['metric', 'imperial']).notNull().default('metric'),
    theme: mysqlEnum('theme', ['paper', 'sun']).notNull().default('paper'),
    about: varchar('about', { length: 500 }).notNull().default(''),
    createdAt: createdAt(),
  },
  (t) => [
    check('users_email_has_at', sql`${t.email} like '%_@_%'`),
    check('users_display_name_not_blank', sql`char_length(trim(${t.displayName})) > 0`),
  ],
)

/** express-session's sessions; `userId` stands beside the data so that one person's can be ended together. */
export const sessions = mysqlTable(
  'sessions',
  {
    sid: varchar('sid', { length: 128 }).primaryKey(),
    userId: reference('user_id').references(() => users.id, { onDelete: 'cascade' }),
    data: text('data').notNull(),
    expiresAt: moment('expires_at').notNull(),
    createdAt: createdAt(),
  },
  (t) => [index('sessions_user_id').on(t.userId), index('sessions_expires_at').on(t.expiresAt)],
)

/** Counters of the rate limits, shared by all processes. */
export const rateLimits = mysqlTable(
  'rate_limits',
  {
    key: varchar('key', { length: 190 }).primaryKey(),
    hits: int('hits', { unsigned: true }).notNull(),
    resetsAt: moment('resets_at').notNull(),
  },
  (t) => [index('rate_limits_resets_at').on(t.resetsAt)],
)
