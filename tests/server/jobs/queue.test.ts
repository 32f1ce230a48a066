import { eq, sql } from 'drizzle-orm'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { db } from '../../../server/db/client'
import { jobs } from '../../../server/db/schema'
import { ringBell } from '../../../server/jobs/bell'
import { defineJob, type Job } from '../../../server/jobs/job'
import { beatJob, finishJob, insertJob, takeJob } from '../../../server/jobs/jobs.queries'
import { startJobs, stopJobs } from '../../../server/jobs/queue'
import { deadAfterMs } from '../../../server/jobs/runJob'

beforeEach(async () => {
  await db.delete(jobs)
})
afterEach(() => stopJobs())

const onlyJob = async () => (await db.select().from(jobs))[0]!
/** Lets what waits for its time be due. */
const hurry = () => db.update(jobs).set({ runAfter: sql`utc_timestamp(3)` })

const note = (ran: number[], n: number) => {
  ran.push(n)
  return Promise.resolve()
}
const counting = (
  run: (n: number, signal: AbortSignal) => Promise<void>,
  more: Pick<Job, 'giveUp'> = {},
) =>
  defineJob({
    kind: 'count',
    payload: z.object({ n: z.number() }),
    run: ({ n }, signal) => run(n, signal),
    ...more,
  })

describe('the queue', () => {
  it('runs what is waiting, each once, in turn', async () => {
    const ran: number[] = []
    for (const n of [1, 2, 3]) await insertJob('count', { n })
    startJobs([counting((n) => note(ran, n))])
    await expect.poll(() => ran.length, { timeout: 5000 }).toBe(3)
    await stopJobs()
    expect(ran.sort()).toEqual([1, 2, 3])
    expect((await db.select().from(jobs)).every(({ state }) => state === 'done')).toBe(true)
  })

  it('hears the bell', async () => {
    const ran: number[] = []
    startJobs([counting((n) => note(ran, n))])
    await insertJob('count', { n: 7 })
    ringBell()
    await expect.poll(() => ran, { timeout: 5000 }).toEqual([7])
  })

  it('leaves kinds alone that it does not know', async () => {
    await insertJob('other', {})
    expect(await takeJob(['count'], deadAfterMs)).toBeNull()
    expect(await takeJob(['other'], deadAfterMs)).toMatchObject({ kind: 'other', attempts: 1 })
  })

  it('gives each job to one of many that ask at once', async () => {
    for (let n = 0; n < 5; n++) await insertJob('count', { n })
    const taken = await Promise.all(
      Array.from({ length: 8 }, () => takeJob(['count'], deadAfterMs)),
    )
    const ids = taken.flatMap((job) => (job ? [job.id] : []))
    expect(new Set(ids).size).toBe(ids.length)
    for (let rest = ids.length; rest < 5; rest++) {
      ids.push((await takeJob(['count'], deadAfterMs))!.id)
    }
    expect(new Set(ids).size).toBe(5)
  })

  it('tries again after longer and longer pauses, then gives up', async () => {
    let given = 0
    const job = counting(() => Promise.reject(new Error('no luck')), {
      giveUp: () => {
        given++
        return Promise.resolve()
      },
    })
    await insertJob('count', { n: 1 })
    const pauses: number[] = []
    startJobs([job])
    for (let attempt = 1; attempt <= 4; attempt++) {
      await expect
        .poll(async () => [(await onlyJob()).state, (await onlyJob()).attempts], { timeout: 8000 })
        .toEqual(['waiting', attempt])
      pauses.push((await onlyJob()).runAfter.getTime() - Date.now())
      await hurry()
      ringBell()
    }
    await expect.poll(async () => (await onlyJob()).state, { timeout: 8000 }).toBe('failed')
    expect((await onlyJob()).failure).toBe('no luck')
    expect(given).toBe(1)
    expect(pauses.every((pause, index) => index === 0 || pause > pauses[index - 1]!)).toBe(true)
  })

  it('takes up what a killed process has left running, and not what is alive', async () => {
    await insertJob('count', { n: 1 })
    const held = await takeJob(['count'], deadAfterMs)
    expect(await takeJob(['count'], deadAfterMs)).toBeNull()
    await db.update(jobs).set({ beatAt: sql`utc_timestamp(3) - interval 1 minute` })
    await beatJob(held!)
    expect(await takeJob(['count'], deadAfterMs)).toBeNull()
    await db.update(jobs).set({ beatAt: sql`utc_timestamp(3) - interval 1 minute` })
    const again = await takeJob(['count'], deadAfterMs)
    expect(again).toMatchObject({ id: held!.id, attempts: 2 })
    await finishJob(held!)
    expect((await onlyJob()).state).toBe('running')
    await finishJob(again!)
    expect((await onlyJob()).state).toBe('done')
  })

  it('brings a job back by itself, and has it once', async () => {
    let runs = 0
    const sweep = defineJob({
      kind: 'sweep',
      payload: z.object({}),
      everyMs: 3600_000,
      run: () => {
        runs++
        return Promise.resolve()
      },
    })
    startJobs([sweep])
    await expect.poll(() => runs, { timeout: 5000 }).toBe(1)
    await stopJobs()
    startJobs([sweep])
    await stopJobs()
    const rows = await db.select().from(jobs).where(eq(jobs.kind, 'sweep'))
    expect(rows).toMatchObject([{ state: 'waiting', attempts: 0 }])
    expect(rows[0]!.runAfter.getTime()).toBeGreaterThan(Date.now() + 3000_000)
  })

  it('breaks off what takes long when the process stops, and keeps it for the next', async () => {
    let isUnderWay = false
    const job = counting((_n, signal) => {
      isUnderWay = true
      return new Promise((_resolve, reject) => {
        signal.addEventListener('abort', () => reject(new Error('stopped')))
      })
    })
    await insertJob('count', { n: 1 })
    startJobs([job])
    await expect.poll(() => isUnderWay, { timeout: 5000 }).toBe(true)
    await stopJobs()
    expect(await onlyJob()).toMatchObject({ state: 'waiting', attempts: 0 })
  })
})
