import { describe, expect, it } from 'vitest'
import { isBack } from '../../../../src/components/fence/pendingPosts'
import type { FencePost } from '../../../../src/composables/useFencePosts'

const kept = {
  ...{ key: 'k', state: 'sending' as const, message: '' },
  room: { courseSlug: 'a-low-deck', lessonKey: 'digging-in' },
}
const answer: FencePost = { ...kept, kind: 'answer', questionId: 3, body: { markdown: 'Wait.' } }
const question: FencePost = {
  ...{ ...kept, kind: 'question' },
  body: { title: 'How wet?', markdown: '', atMs: null },
}
const by = (id: number, markdown: string, title?: string) => ({
  ...{ writer: { id }, markdown },
  ...(title === undefined ? {} : { title }),
})

describe('isBack', () => {
  it('knows an answer that the live line brought before the reply', () => {
    expect(isBack(answer, [by(7, 'Wait.')], 7)).toBe(true)
  })

  it('takes nobody else’s words for one’s own, nor other words of one’s own', () => {
    expect(isBack(answer, [by(8, 'Wait.'), by(7, 'Go on.')], 7)).toBe(false)
  })

  it('keeps what did not get over in sight', () => {
    expect(isBack({ ...answer, state: 'failed' }, [by(7, 'Wait.')], 7)).toBe(false)
  })

  it('tells questions apart by their sentence', () => {
    expect(isBack(question, [by(7, '', 'How dry?')], 7)).toBe(false)
    expect(isBack(question, [by(7, '', 'How wet?')], 7)).toBe(true)
  })
})
