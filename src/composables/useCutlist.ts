import { tryOnScopeDispose, useIntervalFn } from '@vueuse/core'
import { computed, ref, shallowRef } from 'vue'
import { CalculatorInputError } from '../../shared/calculators/calculator'
import type { CutList } from '../../shared/cutlist/cutList'
import type { CutRequest } from '../../shared/cutlist/cutRequest'
import { cutListAtOnce } from '../../shared/cutlist/solveCutList'
import type { CutNews, CutQuestion } from './cutlist.worker'

/**
 * How a list stands: being searched for a better one, proved to be the best, left with a gap at the time limit,
 * stopped by the person, or left unproved because the solver did not run.
 */
export type CutlistState = 'idle' | 'searching' | 'proved' | 'gap' | 'stopped' | 'failed'

/** The part of a Worker that is used; a test brings its own. */
export type CutWorker = Pick<
  Worker,
  'postMessage' | 'terminate' | 'addEventListener' | 'removeEventListener'
>

const usualMilliseconds = 20_000
const tickMs = 200

const startCutWorker = (): CutWorker =>
  new Worker(new URL('./cutlist.worker.ts', import.meta.url), { type: 'module' })

/** A copy that can be posted, whatever Vue has wrapped the original in. */
const plain = (request: CutRequest): CutRequest => ({
  ...request,
  parts: request.parts.map((part) => ({ ...part })),
  stock: request.stock.map((one) => ({ ...one })),
})

/**
 * A cut list: at once from the heuristics, then a better one, and proved, from a worker, which is fetched only when
 * there is something left to prove. `list` is always the best so far; `refusal` says which input cannot be cut.
 */
export function useCutlist(startWorker: () => CutWorker = startCutWorker) {
  const list = shallowRef<CutList | null>(null)
  const refusal = shallowRef<{ input: string; message: string } | null>(null)
  const state = ref<CutlistState>('idle')
  const doneShare = ref(0)
  const timeShare = ref(0)
  let worker: CutWorker | null = null
  let started = 0
  let limit = usualMilliseconds

  const clock = useIntervalFn(() => (timeShare.value = (Date.now() - started) / limit), tickMs, {
    immediate: false,
  })

  function end(as: CutlistState) {
    worker?.terminate()
    worker = null
    clock.pause()
    state.value = as
  }
  function refuse(input: string, message: string) {
    list.value = null
    refusal.value = { input, message }
    end('idle')
  }
  const endWith = (best: CutList) => {
    list.value = best
    end(best.proof === 'optimal' ? 'proved' : 'gap')
  }

  function hear(news: CutNews) {
    if (news.kind === 'list') endWith(news.list)
    else if (news.kind === 'refused') refuse(news.input, news.message)
    else if (news.kind === 'failed') end('failed')
    else {
      list.value = news.progress.list ?? list.value
      doneShare.value = news.progress.sectionsDone / news.progress.sections
    }
  }

  function search(question: CutQuestion) {
    const own = startWorker()
    worker = own
    own.addEventListener('message', ({ data }: MessageEvent<CutNews>) => {
      if (worker === own) hear(data)
    })
    own.addEventListener('error', () => {
      if (worker === own) end('failed')
    })
    own.postMessage(question)
    started = Date.now()
    clock.resume()
  }

  /** Shows a list at once and goes on to search; a search that is under way is given up for this one. */
  function solve(request: CutRequest, millisecondsLimit = usualMilliseconds) {
    end('searching')
    limit = millisecondsLimit
    doneShare.value = timeShare.value = 0
    refusal.value = null
    try {
      list.value = cutListAtOnce(request)
      if (list.value?.proof === 'optimal') end('proved')
      else search({ request: plain(request), millisecondsLimit })
    } catch (error) {
      if (!(error instanceof CalculatorInputError)) throw error
      refuse(error.input, error.message)
    }
  }
  /** Keeps the best list so far. */
  function cancel() {
    if (state.value === 'searching') end('stopped')
  }
  tryOnScopeDispose(cancel)

  /** From 0 to 1 of what may still take the time limit. */
  const share = computed(() => Math.min(1, Math.max(doneShare.value, timeShare.value)))
  return { list, refusal, state, share, solve, cancel }
}
