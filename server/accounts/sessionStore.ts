import type { Request } from 'express'
import session, { type Session, type SessionData } from 'express-session'
import {
  deleteSession,
  findSession,
  updateSession,
  updateSessionExpiry,
  upsertSession,
} from './sessions.queries'

/** A session that is not used for this long ends. */
export const idleLimitMs = 14 * 24 * 3600_000
/** How much of the idle limit passes before a visit writes the new expiry. */
const touchEveryMs = 10 * 60_000

type Callback = (error?: unknown) => void

/** The cookie counts down from the last visit; a session without a limit of its own takes the idle one. */
const expiryOf = (data: SessionData) =>
  new Date(Date.now() + (data.cookie.originalMaxAge ?? idleLimitMs))

async function readData(sid: string): Promise<SessionData | null> {
  const row = await findSession(sid)
  return row && (JSON.parse(row.data) as SessionData)
}

async function touchRow(sid: string, expiresAt: Date) {
  const row = await findSession(sid)
  const gained = row ? expiresAt.getTime() - row.expiresAt.getTime() : 0
  if (gained > touchEveryMs) await updateSessionExpiry(sid, expiresAt)
}

/** express-session's store over our own pool, with the person beside the data so that all of theirs can be ended. */
export class DatabaseSessionStore extends session.Store {
  /** Those that came out of the table: one that has ended meanwhile is not brought back by a late save. */
  private readonly known = new WeakSet<SessionData>()

  override createSession(request: Request, data: SessionData): Session & SessionData {
    const made = super.createSession(request, data)
    this.known.add(made)
    return made
  }

  override get(sid: string, callback: (error: unknown, data?: SessionData | null) => void) {
    void readData(sid).then(
      (data) => callback(null, data),
      (error: unknown) => callback(error),
    )
  }

  override set(sid: string, data: SessionData, callback?: Callback) {
    const { userId = null } = data as Partial<SessionData>
    const row = {
      sid,
      userId,
      data: JSON.stringify(data),
      expiresAt: expiryOf(data),
    }
    const saving = this.known.has(data) ? updateSession(row) : upsertSession(row)
    void saving.then(() => callback?.(), callback)
  }

  override touch(sid: string, data: SessionData, callback?: () => void) {
    void touchRow(sid, expiryOf(data)).then(
      () => callback?.(),
      () => callback?.(),
    )
  }

  override destroy(sid: string, callback?: Callback) {
    void deleteSession(sid).then(() => callback?.(), callback)
  }
}
