import { flushPromises } from '@vue/test-utils'
import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { FenceEvent, Thread } from '../../../shared/contracts/fence'
import type { Presence } from '../../../shared/contracts/socketEvents'
import { ApiProblem } from '../../../src/api/client'
import * as api from '../../../src/api/fence'
import { joinRoom, type RoomListener } from '../../../src/socket/fence'
import { useAccountsStore } from '../../../src/stores/accounts'
import { useFenceStore } from '../../../src/stores/fence'

vi.mock('../../../src/api/fence')
vi.mock('../../../src/socket/fence')

const room = { courseSlug: 'a-log-store', lessonKey: 'squaring-the-form' }
const presence: Presence = { ...room, here: [{ id: 2, name: 'Anke' }], count: 1 }

function threadOf(id: number, asOf: number, change: Partial<Thread> = {}): Thread {
  return {
    ...{ ...room, id, asOf, atMs: id * 1000, title: `Question ${id}`, markdown: '', html: '' },
    writer: { id: 1, name: 'Jo', place: 'learner' },
    ...{ state: 'open', settledAnswerId: null, settledBy: null, answerCount: 0, answers: [] },
    ...{ createdAt: '2026-12-01T08:00:00.000Z', editedAt: null, isDeleted: false, version: 1 },
    ...change,
  }
}
const eventOf = (number: number, thread: Thread): FenceEvent => ({ number, kind: 'asked', thread })
const problem = (status: number, code: string) =>
  new ApiProblem({ type: 'about:blank', title: code, status, code, detail: `${code}.` })

let listener: RoomListener
const line = { sayWriting: vi.fn(), leave: vi.fn() }

beforeEach(() => {
  vi.resetAllMocks()
  localStorage.clear()
  setActivePinia(createPinia())
  vi.mocked(joinRoom).mockImplementation((_room, _person, heard) => {
    listener = heard
    return line
  })
  vi.mocked(api.fetchLessonThreads).mockResolvedValue({
    items: [threadOf(1, 5)],
    nextCursor: null,
    lastNumber: 5,
    can: { write: true, settleAny: false },
  })
})

async function openRoom() {
  const fence = useFenceStore()
  await fence.open(room)
  listener.onJoined({ lastNumber: 5, isComplete: true, events: [] }, presence)
  await flushPromises()
  return fence
}
const idsOf = (fence: ReturnType<typeof useFenceStore>) => fence.threads.map((thread) => thread.id)

describe('useFenceStore, what is heard', () => {
  it('reads all pages of a room, then is live with who is here', async () => {
    vi.mocked(api.fetchLessonThreads)
      .mockResolvedValueOnce({
        items: [threadOf(2, 5)],
        nextCursor: 'next',
        lastNumber: 5,
        can: { write: true, settleAny: false },
      })
      .mockResolvedValueOnce({
        items: [threadOf(3, 6, { atMs: null })],
        nextCursor: null,
        lastNumber: 6,
        can: { write: true, settleAny: false },
      })
    const fence = await openRoom()
    expect(idsOf(fence)).toEqual([2, 3])
    expect(fence.lastNumber).toBe(5)
    expect(fence.isLive).toBe(true)
    expect(fence.presence?.here[0]?.name).toBe('Anke')
  })

  it('takes each number once, in the order of moments', async () => {
    const fence = await openRoom()
    listener.onChanged(eventOf(6, threadOf(7, 6, { atMs: 500 })))
    listener.onChanged(eventOf(6, threadOf(7, 6, { title: 'again' })))
    expect(idsOf(fence)).toEqual([7, 1])
    expect(fence.threadOf(7)?.title).toBe('Question 7')
    expect(fence.lastNumber).toBe(6)
    expect(api.fetchMissed).not.toHaveBeenCalled()
  })

  it('asks over HTTP for what a gap hides, and misses nothing', async () => {
    const fence = await openRoom()
    vi.mocked(api.fetchMissed).mockResolvedValue({
      lastNumber: 8,
      isComplete: true,
      events: [6, 7, 8].map((number) => eventOf(number, threadOf(number, 8))),
    })
    listener.onChanged(eventOf(8, threadOf(8, 8)))
    await flushPromises()
    expect(api.fetchMissed).toHaveBeenCalledWith(room, 5)
    expect(idsOf(fence)).toEqual([1, 6, 7, 8])
    expect(fence.lastNumber).toBe(8)
  })

  it('reads the room anew when too much was missed', async () => {
    const fence = await openRoom()
    vi.mocked(api.fetchLessonThreads).mockResolvedValue({
      items: [threadOf(9, 400)],
      nextCursor: null,
      lastNumber: 400,
      can: { write: true, settleAny: false },
    })
    listener.onJoined({ lastNumber: 400, isComplete: false, events: [] }, presence)
    await flushPromises()
    expect(idsOf(fence)).toEqual([9])
    expect(fence.lastNumber).toBe(400)
  })

  it('joins again from the last number seen, and takes deleted questions away', async () => {
    const fence = await openRoom()
    listener.onDown()
    expect(fence.isLive).toBe(false)
    expect(listener.lastNumber()).toBe(5)
    const deleted = eventOf(6, threadOf(1, 6, { isDeleted: true, title: '' }))
    listener.onJoined({ lastNumber: 6, isComplete: true, events: [deleted] }, presence)
    await flushPromises()
    expect(fence.isLive).toBe(true)
    expect(idsOf(fence)).toEqual([])
  })

  it('asks every 15 seconds while the line is down, and no longer once it is back', async () => {
    vi.useFakeTimers()
    const fence = await openRoom()
    vi.mocked(api.fetchMissed).mockResolvedValue({
      lastNumber: 6,
      isComplete: true,
      events: [eventOf(6, threadOf(6, 6))],
    })
    listener.onDown()
    await vi.advanceTimersByTimeAsync(15_100)
    expect(idsOf(fence)).toEqual([1, 6])
    listener.onJoined({ lastNumber: 6, isComplete: true, events: [] }, presence)
    await vi.advanceTimersByTimeAsync(60_000)
    expect(api.fetchMissed).toHaveBeenCalledTimes(1)
    fence.close()
    vi.useRealTimers()
  })

  it('lets a word that somebody writes fade when its end is lost', async () => {
    vi.useFakeTimers()
    const fence = await openRoom()
    const person = { id: 2, name: 'Anke' }
    listener.onWrites({ ...room, questionId: 1, isWriting: true, person })
    expect(fence.writersAt(1)).toEqual([person])
    expect(fence.writersAt(null)).toEqual([])
    await vi.advanceTimersByTimeAsync(8000)
    expect(fence.writersAt(1)).toEqual([])
    vi.useRealTimers()
  })

  it('never lets an older answer replace a newer state', async () => {
    const fence = await openRoom()
    listener.onChanged(eventOf(6, threadOf(1, 6, { title: 'newer' })))
    vi.mocked(api.settleQuestion).mockResolvedValue(threadOf(1, 5, { title: 'older' }))
    await fence.settle(1, 3)
    expect(fence.threadOf(1)?.title).toBe('newer')
  })
})

describe('useFenceStore, what is posted', () => {
  const body = { title: 'Inside or outside?', markdown: '', atMs: 6000 }

  it('shows a post at once, and the thread once it is over', async () => {
    const fence = await openRoom()
    let answer: (thread: Thread) => void = () => undefined
    vi.mocked(api.postQuestion).mockReturnValue(new Promise((resolve) => (answer = resolve)))
    const asking = fence.ask(room, body)
    expect(fence.posts).toMatchObject([{ kind: 'question', state: 'sending', body }])
    answer(threadOf(6, 6))
    await asking
    expect(fence.posts).toEqual([])
    expect(idsOf(fence)).toEqual([1, 6])
  })

  it('keeps a failed post with its words, and tries again under the same key', async () => {
    const fence = await openRoom()
    vi.mocked(api.postAnswer).mockRejectedValueOnce(problem(0, 'offline'))
    expect(await fence.answer(room, 1, { markdown: 'Inside.' })).toBeNull()
    expect(fence.posts).toMatchObject([{ state: 'failed', message: 'offline.' }])
    expect(localStorage.getItem('gf-fence-posts:visitor')).toContain('Inside.')
    vi.mocked(api.postAnswer).mockResolvedValueOnce(threadOf(1, 6, { answerCount: 1 }))
    await fence.retryPost(fence.posts[0]!.key)
    expect(fence.posts).toEqual([])
    const [first, second] = vi.mocked(api.postAnswer).mock.calls
    expect(second).toEqual(first)
    expect(first?.[2]).toMatch(/^[\w-]{8,64}$/)
  })

  it('gives a post that cannot be taken back to its form', async () => {
    const fence = await openRoom()
    vi.mocked(api.postQuestion).mockRejectedValue(problem(400, 'invalid'))
    await expect(fence.ask(room, body)).rejects.toThrow('invalid.')
    expect(fence.posts).toEqual([])
  })

  it('shows what a reload interrupted as not known to be over', async () => {
    const post = {
      kind: 'question',
      key: 'key-of-before',
      room,
      body,
      state: 'sending',
      message: '',
    }
    localStorage.setItem('gf-fence-posts:visitor', JSON.stringify([post]))
    const fence = await openRoom()
    expect(fence.posts[0]).toMatchObject({ state: 'failed', body })
    expect(fence.posts[0]?.message).toContain('never posts it twice')
  })
})

describe('useFenceStore, what one may do', () => {
  it('lets one change and settle their own, and staff settle and delete any', async () => {
    const fence = await openRoom()
    const mine = { id: 1, name: 'Jo', place: 'learner' as const }
    expect(fence.mayEdit(mine)).toBe(false)
    useAccountsStore().me = { id: 1 } as never
    await flushPromises()
    await openRoom()
    expect(fence.mayEdit(mine)).toBe(true)
    expect(fence.maySettle(threadOf(1, 5))).toBe(true)
    expect(fence.mayDelete({ ...mine, id: 2 })).toBe(false)
    expect(fence.mayEdit({ ...mine, id: null })).toBe(false)
    expect(line.leave).toHaveBeenCalled()
  })
})
