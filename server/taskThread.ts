import type { Worker } from 'node:worker_threads'

/** A task that was ended because it took more time or memory than it may have. */
export class TaskEnded extends Error {
  constructor(readonly reason: 'time' | 'memory') {
    super(reason === 'time' ? 'the task took too long' : 'the task took too much memory')
    this.name = 'TaskEnded'
  }
}

export interface ThreadLimits {
  /** Milliseconds of computing that a task may have, from when the thread takes it. */
  computeMs: number
  /** The same by the clock, however little of the machine the thread gets. */
  clockMs: number
}

interface Job {
  id: number
  task: unknown
  resolve: (found: unknown) => void
  reject: (error: Error) => void
}
type Message =
  'ready' | { taken: number } | { done: number; found: unknown } | { done: number; failed: string }

/**
 * One thread that does one task after another and is used again and again. A task that goes over its limits
 * is ended with the thread, and the next gets a new one. `start` opens a thread that says `ready`, then
 * `taken` and `done` for every task it is sent.
 *
 * The time is counted in what this process computes, because on a busy machine the clock also runs while
 * other programs do. A thread that spins in an idle process uses up both at the same pace.
 */
export class TaskThread {
  private readonly queue: Job[] = []
  private worker: Worker | null = null
  private isReady = false
  private current: Job | null = null
  private deadline: NodeJS.Timeout | undefined
  private lastId = 0

  constructor(
    private readonly start: () => Worker,
    private readonly limits: ThreadLimits,
  ) {}

  /** Does a task; throws TaskEnded when it goes over the limits. */
  perform(task: unknown): Promise<unknown> {
    return new Promise((resolve, reject) => {
      this.queue.push({ id: ++this.lastId, task, resolve, reject })
      this.goOn()
    })
  }

  /** Ends the thread; what waits is refused. */
  async close() {
    const worker = this.drop()
    for (const job of this.queue.splice(0)) job.reject(new TaskEnded('time'))
    await worker?.terminate()
  }

  private goOn() {
    if (this.current) return
    if (this.queue.length === 0) {
      this.worker?.unref()
      return
    }
    const worker = (this.worker ??= this.open())
    worker.ref()
    if (!this.isReady) return
    this.current = this.queue.shift() ?? null
    if (this.current) worker.postMessage({ id: this.current.id, task: this.current.task })
  }

  private open(): Worker {
    const worker = this.start()
    const isThis = () => this.worker === worker
    worker.on('message', (message: Message) => {
      if (isThis()) this.hear(message)
    })
    worker.on('error', (error: NodeJS.ErrnoException) => {
      if (isThis()) this.lose(error)
    })
    worker.on('exit', () => {
      if (isThis()) this.lose(new Error('the thread has ended'))
    })
    return worker
  }

  private hear(message: Message) {
    if (message === 'ready') {
      this.isReady = true
      this.goOn()
      return
    }
    const job = this.current
    if (!job) return
    if ('taken' in message) {
      this.watch(job)
      return
    }
    clearTimeout(this.deadline)
    this.current = null
    if ('failed' in message) job.reject(new Error(message.failed))
    else job.resolve(message.found)
    this.goOn()
  }

  /** Ends the job when its time is used up; an answer that has come meanwhile is heard first. */
  private watch(job: Job) {
    const { computeMs, clockMs } = this.limits
    const begun = { cpu: process.cpuUsage(), at: performance.now() }
    const look = () => {
      if (this.current !== job) return
      const { user, system } = process.cpuUsage(begun.cpu)
      const left = computeMs - (user + system) / 1000
      if (left > 0 && performance.now() - begun.at < clockMs) {
        this.deadline = setTimeout(() => setImmediate(look), Math.ceil(left))
        return
      }
      void this.drop()?.terminate()
      job.reject(new TaskEnded('time'))
      this.goOn()
    }
    this.deadline = setTimeout(() => setImmediate(look), computeMs)
  }

  /** The thread is gone. One that never got ready takes all that waits with it, for the next would fare no better. */
  private lose(error: NodeJS.ErrnoException) {
    const job = this.current
    const wasReady = this.isReady
    this.drop()
    const ended = error.code === 'ERR_WORKER_OUT_OF_MEMORY' ? new TaskEnded('memory') : error
    job?.reject(ended)
    if (!wasReady) for (const waiting of this.queue.splice(0)) waiting.reject(ended)
    this.goOn()
  }

  private drop(): Worker | null {
    const { worker } = this
    clearTimeout(this.deadline)
    this.worker = null
    this.isReady = false
    this.current = null
    return worker
  }
}
