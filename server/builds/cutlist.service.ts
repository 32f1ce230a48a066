import { CalculatorInputError } from '../../shared/calculators/calculator'
import { checkCutRequest } from '../../shared/cutlist/checkCutRequest'
import type { CutList } from '../../shared/cutlist/cutList'
import type { CutRequest } from '../../shared/cutlist/cutRequest'
import type { CutProgress } from '../../shared/cutlist/solveCutList'
import { invalid } from '../errors'
import { startThread } from '../workerThreads'
import type { CutNews, CutWork } from './cutlist.worker'

/** How long to search, and whom to tell. */
export interface CutSearch {
  millisecondsLimit?: number
  onProgress?: (progress: CutProgress) => void
  /** Aborted, it ends with the best list so far. */
  signal?: AbortSignal
}

const usualMilliseconds = 30_000
/** How much longer than asked a thread may take to come to its end before it is stopped. */
const graceMilliseconds = 3000
/** Threads at once; others wait, so that a few lists do not take the machine from everybody. */
const mostThreads = 2

let threads = 0
const waiting: (() => void)[] = []

async function takeThread() {
  if (threads < mostThreads) threads++
  else await new Promise<void>((resolve) => waiting.push(resolve))
}
function giveThread() {
  const next = waiting.shift()
  if (next) next()
  else threads--
}

const refusal = (input: string, message: string) => invalid([{ field: input, message }], message)

/**
 * The best cut list, searched for in a thread of its own; at the time limit or when aborted the best so far, with
 * its gap. 400 with the sentence and its field where the request cannot be cut.
 */
export async function findCutList(request: CutRequest, search: CutSearch = {}): Promise<CutList> {
  try {
    checkCutRequest(request)
  } catch (error) {
    if (error instanceof CalculatorInputError) throw refusal(error.input, error.message)
    throw error
  }
  await takeThread()
  try {
    return await searchInThread(request, search)
  } finally {
    giveThread()
  }
}

async function searchInThread(
  request: CutRequest,
  { millisecondsLimit = usualMilliseconds, onProgress, signal }: CutSearch,
): Promise<CutList> {
  const cancelled = new Int32Array(new SharedArrayBuffer(4))
  const work: CutWork = { request, millisecondsLimit, cancelled }
  const worker = startThread('builds', 'cutlist', { workerData: work })
  let best: CutList | null = null
  let ending: NodeJS.Timeout | undefined
  const endWithin = (milliseconds: number) => {
    clearTimeout(ending)
    ending = setTimeout(() => void worker.terminate(), milliseconds)
  }
  const cancel = () => {
    Atomics.store(cancelled, 0, 1)
    endWithin(graceMilliseconds)
  }
  if (signal?.aborted) cancel()
  else endWithin(millisecondsLimit + graceMilliseconds)
  signal?.addEventListener('abort', cancel)
  try {
    return await new Promise<CutList>((resolve, reject) => {
      worker.on('message', (news: CutNews) => {
        if (news.kind === 'list') return resolve(news.list)
        if (news.kind === 'refused') return reject(refusal(news.input, news.message))
        best = news.progress.list ?? best
        onProgress?.(news.progress)
      })
      worker.on('error', reject)
      worker.on('exit', () => {
        if (best) resolve(best)
        else reject(refusal('stock', 'No list was found in the time given.'))
      })
    })
  } finally {
    clearTimeout(ending)
    signal?.removeEventListener('abort', cancel)
    void worker.terminate()
  }
}
