import { parentPort, workerData } from 'node:worker_threads'
import loadHighs from 'highs'
import { CalculatorInputError } from '../../shared/calculators/calculator'
import type { CutList } from '../../shared/cutlist/cutList'
import type { CutRequest } from '../../shared/cutlist/cutRequest'
import { highsSolver } from '../../shared/cutlist/highsSolver'
import { solveCutList, type CutProgress } from '../../shared/cutlist/solveCutList'

/** What the thread is started with. */
export interface CutWork {
  request: CutRequest
  millisecondsLimit: number
  /** One number in shared memory, since a busy thread reads no messages: 1 once the list is not wanted any more. */
  cancelled: Int32Array<SharedArrayBuffer>
}
/** What the thread tells. */
export type CutNews =
  | { kind: 'progress'; progress: CutProgress }
  | { kind: 'list'; list: CutList }
  | { kind: 'refused'; input: string; message: string }

const { request, millisecondsLimit, cancelled } = workerData as CutWork
const tell = (news: CutNews) => parentPort?.postMessage(news)

const highs = await loadHighs()
try {
  const list = solveCutList(request, {
    openSolver: (deadline) => highsSolver(highs, deadline),
    millisecondsLimit,
    isCancelled: () => Atomics.load(cancelled, 0) === 1,
    onProgress: (progress) => tell({ kind: 'progress', progress }),
  })
  tell({ kind: 'list', list })
} catch (error) {
  if (!(error instanceof CalculatorInputError)) throw error
  tell({ kind: 'refused', input: error.input, message: error.message })
}
