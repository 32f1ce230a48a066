import { logger } from '../logger'
import type { Job } from './job'
import { beatJob, failJob, finishJob, postponeJob, type JobRow } from './jobs.queries'

const mostAttempts = 5
const firstPauseMs = 2000
const beatEveryMs = 3000

/** A job whose runner was silent for so long is taken up again. */
export const deadAfterMs = 5 * beatEveryMs

const textOf = (error: unknown) =>
  (error instanceof Error ? error.message : String(error)).slice(0, 500)

async function settleFailure(job: Job, row: JobRow, error: unknown, isStopping: boolean) {
  if (isStopping) {
    return postponeJob(row, { delayMs: 0, attempts: row.attempts - 1, failure: null })
  }
  logger.error({ err: error, job: row.kind, attempts: row.attempts }, 'job failed')
  if (row.attempts < mostAttempts) {
    const delayMs = firstPauseMs * 2 ** (row.attempts - 1)
    return postponeJob(row, { delayMs, attempts: row.attempts, failure: textOf(error) })
  }
  await job.giveUp?.(job.payload.parse(row.payload))
  if (job.everyMs === undefined) return failJob(row, textOf(error))
  await postponeJob(row, { delayMs: job.everyMs, attempts: 0, failure: textOf(error) })
}

/** Runs one job that was taken, beating all the while, and writes down how it went. */
export async function runJob(job: Job, row: JobRow, signal: AbortSignal) {
  const beating = setInterval(() => {
    beatJob(row).catch((error: unknown) => logger.warn({ err: error }, 'job beat'))
  }, beatEveryMs)
  try {
    await job.run(job.payload.parse(row.payload), signal)
    if (job.everyMs === undefined) await finishJob(row)
    else await postponeJob(row, { delayMs: job.everyMs, attempts: 0, failure: null })
  } catch (error) {
    await settleFailure(job, row, error, signal.aborted)
  } finally {
    clearInterval(beating)
  }
}
