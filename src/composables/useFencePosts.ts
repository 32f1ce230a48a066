import { useLocalStorage } from '@vueuse/core'
import { computed, type MaybeRefOrGetter } from 'vue'
import type { CreateAnswer, CreateQuestion, Thread } from '../../shared/contracts/fence'
import type { Room } from '../../shared/contracts/socketEvents'
import { asProblem } from '../api/client'
import { postAnswer, postQuestion } from '../api/fence'

interface KeptPost {
  /** The Idempotency-Key of every try. */
  key: string
  room: Room
  state: 'sending' | 'failed'
  /** Why it did not go over. */
  message: string
}
/** A question on its way over the fence. */
export interface KeptQuestion extends KeptPost {
  kind: 'question'
  body: CreateQuestion
}
/** An answer on its way over the fence. */
export interface KeptAnswer extends KeptPost {
  kind: 'answer'
  questionId: number
  body: CreateAnswer
}
export type FencePost = KeptQuestion | KeptAnswer

const interrupted = 'It is not known whether this went over. Trying again never posts it twice.'

/**
 * Posts that are shown at once and kept on the device until the server has them. `storageName`
 * holds the person, so that nobody sends what somebody else wrote here.
 */
export function useFencePosts(
  storageName: MaybeRefOrGetter<string>,
  onPosted: (thread: Thread) => void,
) {
  const posts = useLocalStorage<FencePost[]>(storageName, [])
  const running = new Set<string>()

  const send = (post: FencePost) =>
    post.kind === 'question'
      ? postQuestion(post.room, post.body, post.key)
      : postAnswer(post.questionId, post.body, post.key)

  function mark(key: string, change: Pick<KeptPost, 'state' | 'message'>) {
    posts.value = posts.value.map((post) => (post.key === key ? { ...post, ...change } : post))
  }
  function drop(key: string) {
    posts.value = posts.value.filter((post) => post.key !== key)
  }

  /** Sends a kept post. Refused at the first try it goes back to the form it came from, otherwise it stays with Try again. */
  async function attempt(post: FencePost, isFirst: boolean): Promise<Thread | null> {
    if (running.has(post.key)) return null
    running.add(post.key)
    mark(post.key, { state: 'sending', message: '' })
    try {
      const thread = await send(post)
      onPosted(thread)
      drop(post.key)
      return thread
    } catch (error) {
      const problem = asProblem(error)
      if (problem.status !== 400 || !isFirst) {
        mark(post.key, { state: 'failed', message: problem.message })
        return null
      }
      drop(post.key)
      throw problem
    } finally {
      running.delete(post.key)
    }
  }

  const begin = { state: 'sending', message: '' } as const
  /** Unlike randomUUID this is there on plain http too, as on a phone in the same house. */
  const newKey = () =>
    Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) =>
      byte.toString(16).padStart(2, '0'),
    ).join('')

  function put(post: FencePost) {
    posts.value = [...posts.value, post]
    return attempt(post, true)
  }
  const ask = (room: Room, body: CreateQuestion) =>
    put({ kind: 'question', key: newKey(), room: { ...room }, body, ...begin })
  const answer = (room: Room, questionId: number, body: CreateAnswer) =>
    put({ kind: 'answer', key: newKey(), room: { ...room }, questionId, body, ...begin })

  async function retry(key: string) {
    const post = posts.value.find((kept) => kept.key === key)
    if (post) await attempt(post, false)
  }

  /** What is kept, with posts that a reload interrupted shown as failed. */
  const kept = computed(() =>
    posts.value.map((post) =>
      post.state === 'sending' && !running.has(post.key)
        ? { ...post, state: 'failed' as const, message: interrupted }
        : post,
    ),
  )
  return { kept, ask, answer, retry, drop }
}
