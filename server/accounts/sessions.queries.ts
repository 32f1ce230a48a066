import { and, eq, gt, lt, ne } from 'drizzle-orm'
import { db } from '../db/client'
import { sessions } from '../db/schema'

/** A session's data while it is alive, or null. */
export async function findSession(sid: string) {
  const [row] = await db
    .select()
    .from(sessions)
    .where(and(eq(sessions.sid, sid), gt(sessions.expiresAt, new Date())))
  return row ?? null
}

/** Keeps a session, new or known. */
export async function upsertSession(row: {
  sid: string
  userId: number | null
  data: string
  expiresAt: Date
}) {
  const { sid, ...rest } = row
  await db
    .insert(sessions)
    .values(row)
    .onDuplicateKeyUpdate({ set: { ...rest, sid } })
}

/** Moves the moment at which an unused session ends. */
export async function updateSessionExpiry(sid: string, expiresAt: Date) {
  await db.update(sessions).set({ expiresAt }).where(eq(sessions.sid, sid))
}

/** Ends one session. */
export async function deleteSession(sid: string) {
  await db.delete(sessions).where(eq(sessions.sid, sid))
}

/** Ends all sessions of a person but, if given, one; returns the ids of those that ended. */
export async function deleteSessionsOf(userId: number, exceptSid = ''): Promise<string[]> {
  const which = and(eq(sessions.userId, userId), ne(sessions.sid, exceptSid))
  const rows = await db.select({ sid: sessions.sid }).from(sessions).where(which)
  await db.delete(sessions).where(which)
  return rows.map((row) => row.sid)
}

/** Forgets sessions that have ended. */
export async function deleteOldSessions() {
  await db.delete(sessions).where(lt(sessions.expiresAt, new Date()))
}
