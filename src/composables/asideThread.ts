/** What a worker of the browser is sent: a task with the number its answer carries. */
export interface AsideQuestion<Task> {
  id: number
  task: Task
}
/** What it tells. */
export type AsideNews = 'ready' | { taken: number } | { done: number; found: unknown }

/** How long one task may take, from when the worker has taken it. */
const taskMs = 50

interface Job {
  id: number
  task: unknown
  resolve: (found: unknown) => void
  reject: (error: Error) => void
}

/**
 * A worker of the browser that does one task after another. One that takes longer than it may is ended with the
 * worker, and the next gets a new one.
 */
export class AsideThread<Task> {
  private worker: Worker | null = null
  private isReady = false
  private current: Job | null = null
  private deadline: ReturnType<typeof setTimeout> | undefined
  private lastId = 0
  private readonly queue: Job[] = []

  constructor(private readonly start: () => Worker) {}

  /** Does a task; throws when it takes too long, or when there can be no worker. */
  perform(given: Task): Promise<unknown> {
    // What is reactive cannot be sent as it is.
    const task: unknown = JSON.parse(JSON.stringify(given))
    return new Promise((resolve, reject) => {
      this.queue.push({ id: ++this.lastId, task, resolve, reject })
      this.goOn()
    })
  }

  private goOn() {
    if (this.current || this.queue.length === 0) return
    this.worker ??= this.open()
    if (!this.isReady) return
    this.current = this.queue.shift() ?? null
    if (this.current) this.worker.postMessage({ id: this.current.id, task: this.current.task })
  }

  private open(): Worker {
    const opened = this.start()
    opened.addEventListener('message', ({ data }: MessageEvent<AsideNews>) => {
      if (opened === this.worker) this.hear(data)
    })
    opened.addEventListener('error', () => {
      if (opened === this.worker) this.giveUp(new Error('the worker has ended'))
    })
    return opened
  }

  private hear(news: AsideNews) {
    const job = this.current
    if (news === 'ready') {
      this.isReady = true
      this.goOn()
    } else if ('taken' in news) {
      this.watch(job)
    } else if (news.done === job?.id) {
      clearTimeout(this.deadline)
      this.current = null
      job.resolve(news.found)
      this.goOn()
    }
  }

  /** An answer that came while the page was busy is heard before its job is ended. */
  private watch(job: Job | null) {
    const end = () => {
      if (job && job === this.current) this.giveUp(new Error('the task took too long'))
    }
    this.deadline = setTimeout(() => (this.deadline = setTimeout(end)), taskMs)
  }

  /** What waits gets a new worker, unless this one never began. */
  private giveUp(error: Error) {
    clearTimeout(this.deadline)
    this.worker?.terminate()
    const refused = [
      ...(this.current ? [this.current] : []),
      ...(this.isReady ? [] : this.queue.splice(0)),
    ]
    this.worker = null
    this.isReady = false
    this.current = null
    for (const job of refused) job.reject(error)
    this.goOn()
  }
}
