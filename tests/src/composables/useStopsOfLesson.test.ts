import { describe, expect, it, vi } from 'vitest'
import { nextTick, ref } from 'vue'
import type { TapeStop } from '../../../shared/contracts/lessons'
import { useStopsOfLesson } from '../../../src/composables/useStopsOfLesson'

const durationMs = 60_000
const stop = (key: string, atMs: number, more: Partial<TapeStop> = {}): TapeStop => ({
  ...{ key, name: key, atMs, isRequired: true, isSolved: false, exerciseKind: 'calculator' },
  ...more,
})

function playLesson(stops: TapeStop[]) {
  const [positionMs, isPlaying, jumps] = [ref(0), ref(true), ref(0)]
  const hold = vi.fn((atMs: number) => {
    isPlaying.value = false
    positionMs.value = atMs
  })
  const known = ref(stops)
  const lesson = useStopsOfLesson({
    ...{ positionMs, isPlaying, jumps, hold },
    stops: () => known.value,
    durationMs: () => durationMs,
  })
  return {
    ...{ lesson, hold, known, positionMs },
    playTo: async (atMs: number) => {
      isPlaying.value = true
      await nextTick()
      positionMs.value = atMs
      await nextTick()
    },
    jumpTo: async (atMs: number) => {
      jumps.value++
      positionMs.value = atMs
      await nextTick()
    },
    end: async () => {
      positionMs.value = durationMs
      isPlaying.value = false
      await nextTick()
    },
  }
}

describe('useStopsOfLesson', () => {
  it('holds the video exactly at a required stop that is played over', async () => {
    const { lesson, hold, positionMs, playTo } = playLesson([stop('one', 1000)])
    await playTo(900)
    expect(hold).not.toHaveBeenCalled()
    await playTo(1040)
    expect(hold).toHaveBeenCalledWith(1000)
    expect(lesson.open.value?.key).toBe('one')
    expect(positionMs.value).toBe(1000)
  })

  it.each([
    ['one that is solved', { isSolved: true }],
    ['one by the way', { isRequired: false }],
  ])('plays on over %s', async (_which, more) => {
    const { lesson, hold, playTo } = playLesson([stop('one', 1000, more)])
    await playTo(900)
    await playTo(1040)
    expect(hold).not.toHaveBeenCalled()
    expect(lesson.open.value).toBeNull()
  })

  it('passes no stop when somebody jumps over it', async () => {
    const { hold, playTo, jumpTo } = playLesson([stop('one', 1000)])
    await playTo(500)
    await jumpTo(2000)
    expect(hold).not.toHaveBeenCalled()
  })

  it('holds again when it is played on from the stop itself, as after a reload', async () => {
    const { lesson, hold, jumpTo, playTo } = playLesson([stop('one', 1000)])
    await jumpTo(1000)
    lesson.openHere(1000)
    expect(lesson.open.value?.key).toBe('one')
    lesson.leave()
    await playTo(1016)
    expect(hold).toHaveBeenCalledWith(1000)
  })

  it('brings what was left back at the end, one after the other, and each once', async () => {
    const { lesson, end } = playLesson([
      stop('one', 1000, { isSolved: true }),
      stop('two', 2000, { isRequired: false }),
      stop('three', 3000, { isRequired: false }),
    ])
    await end()
    expect(lesson.open.value?.key).toBe('two')
    lesson.close()
    expect(lesson.open.value?.key).toBe('three')
    lesson.close()
    expect(lesson.open.value).toBeNull()
  })

  it('knows the stops before and after the clock', async () => {
    const { lesson, jumpTo } = playLesson([stop('two', 2000), stop('one', 1000)])
    await jumpTo(1500)
    expect(lesson.before.value?.key).toBe('one')
    expect(lesson.next.value?.key).toBe('two')
    expect(lesson.numberOf('two')).toBe(2)
  })
})
