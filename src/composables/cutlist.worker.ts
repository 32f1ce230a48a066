import loadHighs from 'highs'
import solverUrl from 'highs/runtime?url'
import { CalculatorInputError } from '../../shared/calculators/calculator'
import type { CutList } from '../../shared/cutlist/cutList'
import type { CutRequest } from '../../shared/cutlist/cutRequest'
import { highsSolver } from '../../shared/cutlist/highsSolver'
import { solveCutList, type CutProgress } from '../../shared/cutlist/solveCutList'

/** What the worker is asked, once. */
export interface CutQuestion {
  request: CutRequest
  millisecondsLimit: number
}
/** What the worker tells. */
export type CutNews =
  | { kind: 'progress'; progress: CutProgress }
  | { kind: 'list'; list: CutList }
  | { kind: 'refused'; input: string; message: string }
  | { kind: 'failed' }

const tell = (news: CutNews) => self.postMessage(news)

async function answer({ request, millisecondsLimit }: CutQuestion) {
  try {
    const highs = await loadHighs({ locateFile: () => solverUrl })
    const list = solveCutList(request, {
      openSolver: (deadline) => highsSolver(highs, deadline),
      millisecondsLimit,
      onProgress: (progress) => tell({ kind: 'progress', progress }),
    })
    tell({ kind: 'list', list })
  } catch (error) {
    if (error instanceof CalculatorInputError) {
      tell({ kind: 'refused', input: error.input, message: error.message })
    } else tell({ kind: 'failed' })
  }
}

self.addEventListener('message', ({ data }: MessageEvent<CutQuestion>) => void answer(data))
