import { sql } from 'drizzle-orm'
import { int, timestamp, varchar } from 'drizzle-orm/mysql-core'

/** Surrogate primary key. */
export const id = () => int('id', { unsigned: true }).primaryKey().autoincrement()

/** Reference to another table's `id`; add `.references()` and `.notNull()` where it stands. */
export const reference = (name: string) => int(name, { unsigned: true })

/** UTC with milliseconds. */
export const moment = (name: string) => timestamp(name, { fsp: 3, mode: 'date' })

export const createdAt = () =>
  moment('created_at')
    .notNull()
    .default(sql`CURRENT_TIMESTAMP(3)`)

/** A key that names the same thing in every revision of a course. */
export const stableKey = (name = 'key') => varchar(name, { length: 40 })
