import { eq, lt, sql } from 'drizzle-orm'
import { db } from '../db/client'
import { rateLimits } from '../db/schema'

/** Adds one hit and returns which of the running window it was; a window that is over starts anew. */
export async function addRateLimitHit(key: string, windowMs: number) {
  const resetsAt = new Date(Date.now() + windowMs)
  const isOver = sql`${rateLimits.resetsAt} <= utc_timestamp(3)`
  const [result] = await db
    .insert(rateLimits)
    .values({ key, hits: 1, resetsAt })
    .onDuplicateKeyUpdate({
      set: {
        hits: sql`last_insert_id(if(${isOver}, 1, ${rateLimits.hits} + 1))`,
        resetsAt: sql`if(${isOver}, ${resetsAt}, ${rateLimits.resetsAt})`,
      },
    })
  const [row] = await db.select().from(rateLimits).where(eq(rateLimits.key, key))
  return { totalHits: result.insertId || 1, resetTime: row?.resetsAt ?? resetsAt }
}

/** Forgets one counter. */
export async function deleteRateLimit(key: string) {
  await db.delete(rateLimits).where(eq(rateLimits.key, key))
}

/** Forgets counters whose window is over. */
export async function deleteOldRateLimits() {
  await db.delete(rateLimits).where(lt(rateLimits.resetsAt, new Date()))
}
