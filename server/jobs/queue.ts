import { logger } from '../logger'
import { onJobAdded } from './bell'
import type { Job } from './job'
import { ensureRecurringJob, takeJob } from './jobs.queries'
import { jobs as knownJobs } from './registry'
import { deadAfterMs, runJob } from './runJob'

const lookEveryMs = 1000
/** A job that has not ended so long after the stop began is broken off and taken up again later. */
const patienceMs = 4000

let loop: Promise<void> | null = null
let stopping = new AbortController()
let wake: () => void = () => undefined
/** A bell that rang while nobody slept is heard at the next lying down. */
let isAwake = false

onJobAdded(() => {
  isAwake = true
  wake()
})

function sleep(ms: number) {
  if (isAwake) {
    isAwake = false
    return Promise.resolve()
  }
  return new Promise<void>((resolve) => {
    const timer = setTimeout(resolve, ms)
    wake = () => {
      clearTimeout(timer)
      isAwake = false
      resolve()
    }
  })
}

async function takeAndRun(jobs: Map<string, Job>, signal: AbortSignal): Promise<boolean> {
  const row = await takeJob([...jobs.keys()], deadAfterMs)
  const job = row && jobs.get(row.kind)
  if (!row || !job) return false
  await runJob(job, row, signal)
  return true
}

async function work(list: Job[], isOver: () => boolean, signal: AbortSignal) {
  const jobs = new Map(list.map((job) => [job.kind, job]))
  let hasRecurring = false
  while (!isOver()) {
    try {
      if (!hasRecurring) {
        for (const { kind, everyMs } of list) if (everyMs) await ensureRecurringJob(kind)
        hasRecurring = true
      }
      if (await takeAndRun(jobs, signal)) continue
    } catch (error) {
      logger.error({ err: error }, 'job queue')
    }
    if (!isOver()) await sleep(lookEveryMs)
  }
}

let isStopping = false

/** Starts taking jobs from the table, one at a time. */
export function startJobs(list: Job[] = knownJobs) {
  if (loop) return
  isStopping = false
  stopping = new AbortController()
  loop = work(list, () => isStopping, stopping.signal)
}

/** Finishes the job in hand, or breaks it off when it takes long, and takes no more. */
export async function stopJobs() {
  if (!loop) return
  isStopping = true
  wake()
  const timer = setTimeout(() => stopping.abort(), patienceMs)
  await loop
  clearTimeout(timer)
  loop = null
}
