import { and, asc, eq, inArray, lte, sql, type SQL } from 'drizzle-orm'
import { db, type Executor, type Transaction } from '../db/client'
import { jobs } from '../db/schema'

export type JobRow = typeof jobs.$inferSelect

const now = sql`utc_timestamp(3)`
const later = (ms: number) => sql`utc_timestamp(3) + interval ${ms * 1000} microsecond`

/** Adds a job. */
export async function insertJob(kind: string, payload: Record<string, unknown>, on: Executor = db) {
  await on.insert(jobs).values({ kind, payload })
}

/** Adds a job that comes back by itself, unless it is there. */
export async function ensureRecurringJob(kind: string) {
  await db.execute(sql`
    insert into ${jobs} (kind, payload)
    select ${kind}, '{}' from dual
    where not exists (select 1 from ${jobs} where kind = ${kind} and state in ('waiting', 'running'))`)
}

async function lockNext(condition: SQL | undefined, kinds: string[], tx: Transaction) {
  const [row] = await tx
    .select()
    .from(jobs)
    .where(and(condition, inArray(jobs.kind, kinds)))
    .orderBy(asc(jobs.runAfter))
    .limit(1)
    .for('update', { skipLocked: true })
  return row ?? null
}

/**
 * Takes the next job of these kinds: one whose time has come, or one whose runner has not been heard
 * of for `deadAfterMs`. Several processes may ask at once; each job goes to one of them.
 */
export async function takeJob(kinds: string[], deadAfterMs: number): Promise<JobRow | null> {
  return db.transaction(async (tx) => {
    const isDue = and(eq(jobs.state, 'waiting'), lte(jobs.runAfter, now))
    const isDead = and(
      eq(jobs.state, 'running'),
      lte(jobs.beatAt, sql`utc_timestamp(3) - interval ${deadAfterMs * 1000} microsecond`),
    )
    const job = (await lockNext(isDue, kinds, tx)) ?? (await lockNext(isDead, kinds, tx))
    if (!job) return null
    const attempts = job.attempts + 1
    await tx
      .update(jobs)
      .set({ state: 'running', attempts, beatAt: now, failure: null })
      .where(eq(jobs.id, job.id))
    return { ...job, state: 'running', attempts }
  })
}

/** Only the runner that holds the job may say how it went: a later one has counted another attempt. */
const held = ({ id, attempts }: JobRow) =>
  and(eq(jobs.id, id), eq(jobs.state, 'running'), eq(jobs.attempts, attempts))

/** Says that a job's runner is alive. */
export async function beatJob(job: JobRow) {
  await db.update(jobs).set({ beatAt: now }).where(held(job))
}

/** The job is done. */
export async function finishJob(job: JobRow) {
  await db.update(jobs).set({ state: 'done', beatAt: null }).where(held(job))
}

/** The job runs again in `delayMs`; `attempts` counts from there. */
export async function postponeJob(
  job: JobRow,
  { delayMs, attempts, failure }: { delayMs: number; attempts: number; failure: string | null },
) {
  await db
    .update(jobs)
    .set({ state: 'waiting', runAfter: later(delayMs), beatAt: null, attempts, failure })
    .where(held(job))
}

/** The job has failed for good. */
export async function failJob(job: JobRow, failure: string) {
  await db.update(jobs).set({ state: 'failed', beatAt: null, failure }).where(held(job))
}

/** Forgets jobs that were done a week ago. */
export async function deleteOldJobs() {
  await db
    .delete(jobs)
    .where(and(eq(jobs.state, 'done'), lte(jobs.createdAt, sql`utc_timestamp(3) - interval 7 day`)))
}
