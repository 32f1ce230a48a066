import loadHighs from 'highs'
import { describe, expect, it, vi } from 'vitest'
import { effectScope, reactive } from 'vue'
import type { CutRequest } from '../../../shared/cutlist/cutRequest'
import { highsSolver } from '../../../shared/cutlist/highsSolver'
import { solveCutList } from '../../../shared/cutlist/solveCutList'
import type { CutNews, CutQuestion } from '../../../src/composables/cutlist.worker'
import { useCutlist, type CutWorker } from '../../../src/composables/useCutlist'
import { patience } from '../../support/patience'

const section = '47 × 100'
const part = (lengthMm: number, count: number) => ({
  label: `${lengthMm}`,
  lengthMm,
  count,
  section,
})
const easy: CutRequest = {
  parts: [part(1000, 2)],
  stock: [{ lengthMm: 2010, section }],
  kerfMm: 3,
  endTrimMm: 0,
}
/** Twelve bars cut into three each with nothing left over; the first list does not find that again. */
const worthwhile: CutRequest = {
  parts: unevenThirds(12).map((lengthMm) => part(lengthMm, 1)),
  stock: [{ lengthMm: 1000, section }],
  kerfMm: 0,
  endTrimMm: 0,
}
/** Lengths that look like chance and are the same each time. */
function unevenThirds(bars: number): number[] {
  let seed = 3
  const next = (from: number, span: number) => {
    seed = (seed * 16_807) % 2_147_483_647
    return from + (seed % span)
  }
  return Array.from({ length: bars }, () => {
    const [one, other] = [next(380, 110), next(260, 100)]
    return [one, other, 1000 - one - other]
  }).flat()
}

/** A worker in this thread: `work` is called with what was posted and a way to answer. */
function fakeWorker(work: (question: CutQuestion, tell: (news: CutNews) => void) => void) {
  const target = new EventTarget()
  const terminate = vi.fn()
  const tell = (data: CutNews) => target.dispatchEvent(new MessageEvent('message', { data }))
  const worker = {
    postMessage: (question: CutQuestion) => work(structuredClone(question), tell),
    addEventListener: target.addEventListener.bind(target),
    removeEventListener: target.removeEventListener.bind(target),
    terminate,
  } as unknown as CutWorker
  return { worker, terminate, tell, fail: () => target.dispatchEvent(new Event('error')) }
}
const silent = () => fakeWorker(() => undefined)

describe('useCutlist', () => {
  it('answers at once, and needs no worker where that is already proved', () => {
    const start = vi.fn()
    const { solve, list, state } = useCutlist(start)
    solve(easy)
    expect(list.value).toMatchObject({ count: 1, proof: 'optimal' })
    expect(state.value).toBe('proved')
    expect(start).not.toHaveBeenCalled()
  })

  it('shows a list at once and the better one once it is found and proved', async () => {
    const highs = await loadHighs()
    const { worker, terminate } = fakeWorker(({ request, millisecondsLimit }, tell) => {
      const openSolver = (deadline: { millisecondsLeft: () => number }) =>
        highsSolver(highs, deadline)
      const onProgress = (progress: Extract<CutNews, { kind: 'progress' }>['progress']) =>
        tell({ kind: 'progress', progress })
      setTimeout(() => {
        const list = solveCutList(request, { openSolver, millisecondsLimit, onProgress })
        tell({ kind: 'list', list })
      })
    })
    const { solve, list, state } = useCutlist(() => worker)
    solve(reactive(worthwhile))
    expect(state.value).toBe('searching')
    const first = list.value!.count
    await vi.waitFor(() => expect(state.value).toBe('proved'), patience)
    expect(first).toBeGreaterThan(12)
    expect(list.value!.count).toBe(12)
    expect(list.value!.proof).toBe('optimal')
    expect(terminate).toHaveBeenCalled()
  })

  it('keeps the best so far when it is cancelled, and hears nothing more', () => {
    const { worker, terminate, tell } = silent()
    const { solve, cancel, list, state } = useCutlist(() => worker)
    solve(worthwhile)
    const first = list.value
    cancel()
    expect(state.value).toBe('stopped')
    expect(terminate).toHaveBeenCalledOnce()
    tell({ kind: 'failed' })
    expect([state.value, list.value]).toEqual(['stopped', first])
  })

  it('gives up a search for the next one', () => {
    const workers = [silent(), silent()]
    let started = 0
    const { solve, state, list } = useCutlist(() => workers[started++]!.worker)
    solve(worthwhile)
    solve({ ...worthwhile })
    const kept = list.value
    expect(workers[0]!.terminate).toHaveBeenCalledOnce()
    workers[0]!.tell({ kind: 'refused', input: 'stock', message: 'late' })
    expect([state.value, list.value]).toEqual(['searching', kept])
  })

  it('ends the worker with the page', () => {
    const { worker, terminate } = silent()
    const scope = effectScope()
    scope.run(() => useCutlist(() => worker).solve(worthwhile))
    scope.stop()
    expect(terminate).toHaveBeenCalledOnce()
  })

  it('shows how far it has come, by sections and by time', () => {
    vi.useFakeTimers()
    try {
      const { worker, tell } = silent()
      const { solve, share } = useCutlist(() => worker)
      solve(worthwhile, 10_000)
      expect(share.value).toBe(0)
      vi.advanceTimersByTime(1000)
      expect(share.value).toBeCloseTo(0.1)
      tell({ kind: 'progress', progress: { sectionsDone: 1, sections: 2, list: null } })
      expect(share.value).toBe(0.5)
      vi.advanceTimersByTime(60_000)
      expect(share.value).toBe(1)
    } finally {
      vi.useRealTimers()
    }
  })

  it('says which input cannot be cut, from the check and from the search', () => {
    const { worker, tell } = silent()
    const { solve, refusal, list, state } = useCutlist(() => worker)
    solve({ ...easy, parts: [part(3000, 1)] })
    expect(refusal.value).toMatchObject({
      input: 'parts',
      message: expect.stringContaining('longer'),
    })
    expect([list.value, state.value]).toEqual([null, 'idle'])
    solve(worthwhile)
    expect(refusal.value).toBeNull()
    tell({ kind: 'refused', input: 'stock', message: 'not enough' })
    expect(refusal.value).toEqual({ input: 'stock', message: 'not enough' })
  })

  it('keeps the list at hand where the solver does not run', () => {
    for (const breakIt of ['fail', 'news'] as const) {
      const { worker, tell, fail } = silent()
      const { solve, list, state } = useCutlist(() => worker)
      solve(worthwhile)
      if (breakIt === 'fail') fail()
      else tell({ kind: 'failed' })
      expect(state.value).toBe('failed')
      expect(list.value).not.toBeNull()
    }
  })
})
