import { and, eq, gt, inArray, lt, ne, or } from 'drizzle-orm'
import { db } from '../db/client'
import { sessions } from '../db/schema'

/** Ended sessions that one sweep clears away. */
const sweptAtOnce = 5000

/** A session's data while it is alive, or null. */
export async function findSession(sid: string) {
  const [row] = await db
    .select()
    .from(sessions)
    .where(and(eq(sessions.sid, sid), gt(sessions.expiresAt, new Date())))
  return row ?? null
}

interface SessionRow {
  sid: string
  userId: number | null
  data: string
  expiresAt: Date
}

/** Keeps a session that has just begun. */
export async function upsertSession(row: SessionRow) {
  const { sid, ...rest } = row
  await db
    .insert(sessions)
    .values(row)
    .onDuplicateKeyUpdate({ set: { ...rest, sid } })
}

/** Keeps what changed in a session that is still there. */
export async function updateSession({ sid, ...rest }: SessionRow) {
  await db.update(sessions).set(rest).where(eq(sessions.sid, sid))
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

/** Forgets sessions that were not used for too long or began before `begunBefore`; returns their ids. */
export async function deleteOldSessions(begunBefore: Date): Promise<string[]> {
  const isOver = or(lt(sessions.expiresAt, new Date()), lt(sessions.createdAt, begunBefore))
  const rows = await db
    .select({ sid: sessions.sid })
    .from(sessions)
    .where(isOver)
    .limit(sweptAtOnce)
  const sids = rows.map((row) => row.sid)
  if (sids.length > 0) await db.delete(sessions).where(and(inArray(sessions.sid, sids), isOver))
  return sids
}
