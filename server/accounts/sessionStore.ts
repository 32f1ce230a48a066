import session, { type SessionData } from 'express-session'
import { deleteSession, findSession, updateSessionExpiry, upsertSession } from './sessions.queries'

/** A session that is not used for this long ends. */
export const idleLimitMs = 14 * 24 * 3600_000
/** How much of the idle limit passes before a visit writes the new expiry. */
const touchEveryMs = 10 * 60_000

type Callback = (error?: unknown) => void

/** The cookie counts down from the last visit; a session without a limit of its own takes the idle one. */
const expiryOf = (data: SessionData) =>
  new Date(Date.now() + (data.cookie.originalMaxAge || idleLimitMs))

/** express-session's store over our own pool, with the person beside the data so that all of theirs can be ended. */
export class DatabaseSessionStore extends session.Store {
  override get(sid: string, callback: (error: unknown, data?: SessionData | null) => void) {
    void findSession(sid).then(
      (row) => callback(null, row ? (JSON.parse(row.data) as SessionData) : null),
      (error: unknown) => callback(error),
    )
  }

  override set(sid: string, data: SessionData, callback?: Callback) {
    void upsertSession({
      sid,
      userId: data.userId ?? null,
      data: JSON.stringify(data),
      expiresAt: expiryOf(data),
    }).then(() => callback?.(), callback)
  }

  override touch(sid: string, data: SessionData, callback?: () => void) {
    const expiresAt = expiryOf(data)
    void findSession(sid)
      .then((row) => {
        const gained = row ? expiresAt.getTime() - row.expiresAt.getTime() : 0
        return gained > touchEveryMs ? updateSessionExpiry(sid, expiresAt) : undefined
      })
      .then(
        () => callback?.(),
        () => callback?.(),
      )
  }

  override destroy(sid: string, callback?: Callback) {
    void deleteSession(sid).then(() => callback?.(), callback)
  }
}
