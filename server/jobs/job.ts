import type { z } from 'zod'

/** One kind of background work; it may run again after a crash, so doing it twice must be fine. */
export interface Job<Schema extends z.ZodType = z.ZodType> {
  kind: string
  payload: Schema
  /** `signal` ends the work when the process stops; the job is then taken up again later. */
  run(payload: z.output<Schema>, signal: AbortSignal): Promise<void>
  /** Called once when the last try has failed. */
  giveUp?(payload: z.output<Schema>): Promise<void>
  /** Set for work that comes back by itself: the pause after each run. */
  everyMs?: number
}

/** Lets `run` know the type of its payload. */
export const defineJob = <Schema extends z.ZodType>(job: Job<Schema>): Job => job
