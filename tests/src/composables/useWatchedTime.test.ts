import { beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope } from 'vue'
import type { LessonProgress, ReportProgress } from '../../../shared/contracts/progress'
import { useWatchedTime } from '../../../src/composables/useWatchedTime'
import { patience } from '../../support/patience'

const reportProgress = vi.hoisted(() => vi.fn())
vi.mock('../../../src/api/progress', () => ({
  reportProgress,
  beaconProgress: vi.fn(() => true),
}))

const place = { slug: 'a-fence', lessonKey: 'posts', isDraft: false }
const known: LessonProgress = {
  intervals: [],
  watchedMs: 0,
  positionMs: 0,
  state: 'not-started',
}
const takeAll = ({ intervals }: ReportProgress): Promise<LessonProgress> =>
  Promise.resolve({ ...known, intervals, state: 'under-way' })

function watch(personId: number | null = 7) {
  const take = vi.fn()
  const scope = effectScope()
  const watching = scope.run(() => useWatchedTime({ place, known, personId, take }))
  if (!watching) throw new Error('the scope has ended')
  /** Plays from one moment to another, with a reading of the clock each 100 ms. */
  const play = (from: number, to: number) => {
    watching.read(from, true, true)
    for (let atMs = from; atMs <= to; atMs += 100) watching.read(atMs, true, false)
    watching.read(to, false, false)
  }
  return { ...watching, play, take, scope }
}

describe('useWatchedTime', () => {
  beforeEach(() => {
    localStorage.clear()
    reportProgress
      .mockReset()
      .mockImplementation((_place: unknown, body: ReportProgress) => takeAll(body))
  })

  it('counts what was played, and nothing of what was jumped over', () => {
    const { play, watched, scope } = watch()
    play(1000, 3000)
    play(20_000, 22_000)
    expect(watched.value).toEqual([
      [1000, 3000],
      [20_000, 22_000],
    ])
    scope.stop()
  })

  it('leaves out the frames between two jumps', () => {
    const { read, watched, scope } = watch()
    read(5000, true, true)
    read(5040, true, false)
    read(10_000, true, true)
    read(10_000, false, false)
    expect(watched.value).toEqual([])
    scope.stop()
  })

  it('keeps on the device what could not be sent, and sends it with the next report', async () => {
    const { play, send, take, watched, scope } = watch()
    reportProgress.mockRejectedValueOnce(new Error('no signal'))
    play(0, 2000)
    await send()
    expect(take).not.toHaveBeenCalled()
    expect(watched.value).toEqual([[0, 2000]])
    play(2000, 4000)
    await send()
    expect(reportProgress).toHaveBeenLastCalledWith(place, {
      intervals: [[0, 4000]],
      positionMs: 4000,
    })
    expect(take).toHaveBeenCalledOnce()
    scope.stop()
  })

  it('sends what another lesson has kept, apart for each person', async () => {
    localStorage.setItem('gf-watched:7:a-fence/gate', '[[0,9000]]')
    localStorage.setItem('gf-watched:8:a-fence/gate', '[[0,5000]]')
    const { scope } = watch(7)
    await vi.waitFor(
      () => expect(localStorage.getItem('gf-watched:7:a-fence/gate')).toBeNull(),
      patience,
    )
    expect(reportProgress).toHaveBeenCalledWith(
      { ...place, lessonKey: 'gate' },
      { intervals: [[0, 9000]], positionMs: 9000 },
    )
    expect(localStorage.getItem('gf-watched:8:a-fence/gate')).toBe('[[0,5000]]')
    scope.stop()
  })

  it('sends nothing for those whose progress is not kept', async () => {
    const { play, send, scope } = watch(null)
    play(0, 2000)
    await send()
    expect(reportProgress).not.toHaveBeenCalled()
    scope.stop()
  })
})
