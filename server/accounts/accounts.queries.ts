import { and, count, eq, gt } from 'drizzle-orm'
import { db, type Executor } from '../db/client'
import { courseStaff, sessions, users } from '../db/schema'

export type UserRow = typeof users.$inferSelect

/** The account with this id, or null. */
export async function findUserById(id: number, on: Executor = db): Promise<UserRow | null> {
  const [row] = await on.select().from(users).where(eq(users.id, id))
  return row ?? null
}

/** The account with this address (lower case), or null. */
export async function findUserByEmail(email: string): Promise<UserRow | null> {
  const [row] = await db.select().from(users).where(eq(users.email, email))
  return row ?? null
}

/** Adds an account and returns its id; throws a duplicate error when the address is taken. */
export async function insertUser(values: typeof users.$inferInsert, on: Executor = db) {
  const [row] = await on.insert(users).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Changes some columns of an account. */
export async function updateUser(id: number, values: Partial<typeof users.$inferInsert>) {
  if (Object.keys(values).length) await db.update(users).set(values).where(eq(users.id, id))
}

/** How many sessions of this person are alive. */
export async function countSessions(userId: number): Promise<number> {
  const [row] = await db
    .select({ n: count() })
    .from(sessions)
    .where(and(eq(sessions.userId, userId), gt(sessions.expiresAt, new Date())))
  return row?.n ?? 0
}

/** True when the person is on the staff of any course. */
export async function isOnAnyStaff(userId: number): Promise<boolean> {
  const rows = await db
    .select({ id: courseStaff.id })
    .from(courseStaff)
    .where(eq(courseStaff.userId, userId))
    .limit(1)
  return rows.length > 0
}
