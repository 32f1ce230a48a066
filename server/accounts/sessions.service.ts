import { absoluteLimitMs } from './accounts.service'
import { deleteOldIdempotencyKeys } from './idempotency.queries'
import { deleteOldRateLimits } from './rateLimits.queries'
import { deleteOldSessions, deleteSessionsOf } from './sessions.queries'

type EndListener = (sids: string[]) => void
const listeners: EndListener[] = []

/** Calls `listener` with the ids of sessions whenever some end, so that their sockets can be cut. */
export function onSessionsEnded(listener: EndListener) {
  listeners.push(listener)
}

/** Tells the listeners that these sessions are over. */
export function tellSessionsEnded(sids: string[]) {
  for (const listener of listeners) listener(sids)
}

/** Ends every session of a person, on all devices. */
export async function endAllSessions(userId: number) {
  tellSessionsEnded(await deleteSessionsOf(userId))
}

/** Ends sessions that are past a limit, with their sockets, and forgets rate limits and keys that are over. */
export async function sweepSessions() {
  tellSessionsEnded(await deleteOldSessions(new Date(Date.now() - absoluteLimitMs)))
  await deleteOldRateLimits()
  await deleteOldIdempotencyKeys()
}
