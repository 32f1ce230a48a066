import type { FormulaTaskName, FormulaTasks } from '../../shared/ownCalculators/tasks'
import type { FormulaNews } from './ownCalculator.worker'

/** How long one task may take, from when the worker has taken it. */
const taskMs = 50

interface Job {
  id: number
  task: object
  resolve: (found: unknown) => void
  reject: (error: Error) => void
}

let worker: Worker | null = null
let isReady = false
let current: Job | null = null
let deadline: ReturnType<typeof setTimeout> | undefined
let lastId = 0
const queue: Job[] = []

/**
 * Works with formulas in a worker of the browser, one task after another. Throws when a task takes longer
 * than it may, which ends the worker with it, or when there can be no worker.
 */
export function performAside<Name extends FormulaTaskName>(
  name: Name,
  given: FormulaTasks[Name]['given'],
): Promise<FormulaTasks[Name]['found']> {
  // What is reactive cannot be sent as it is.
  const task = JSON.parse(JSON.stringify({ name, given })) as object
  return new Promise((resolve, reject) => {
    const take = (found: unknown) => resolve(found as FormulaTasks[Name]['found'])
    queue.push({ id: ++lastId, task, resolve: take, reject })
    goOn()
  })
}

function goOn() {
  if (current || queue.length === 0) return
  worker ??= open()
  if (!isReady) return
  current = queue.shift() ?? null
  if (current) worker.postMessage({ id: current.id, task: current.task })
}

function open(): Worker {
  const opened = new Worker(new URL('./ownCalculator.worker.ts', import.meta.url), {
    type: 'module',
  })
  opened.addEventListener('message', ({ data }: MessageEvent<FormulaNews>) => {
    if (opened === worker) hear(data)
  })
  opened.addEventListener('error', () => {
    if (opened === worker) giveUp(new Error('the worker has ended'))
  })
  return opened
}

function hear(news: FormulaNews) {
  if (news === 'ready') {
    isReady = true
    goOn()
  } else if ('taken' in news) {
    const job = current
    const end = () => {
      if (job && job === current) giveUp(new Error('the task took too long'))
    }
    // An answer that came while the page was busy is heard first.
    deadline = setTimeout(() => (deadline = setTimeout(end)), taskMs)
  } else if (news.done === current?.id) {
    clearTimeout(deadline)
    const job = current
    current = null
    job.resolve(news.found)
    goOn()
  }
}

/** Ends the worker with what it does; what waits gets a new one, unless this one never began. */
function giveUp(error: Error) {
  clearTimeout(deadline)
  worker?.terminate()
  const refused = [...(current ? [current] : []), ...(isReady ? [] : queue.splice(0))]
  worker = null
  isReady = false
  current = null
  for (const job of refused) job.reject(error)
  goOn()
}
