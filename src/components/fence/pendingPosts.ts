import type { FencePost } from '../../composables/useFencePosts'

/** As much of a published post as tells that one on its way has arrived. */
interface Published {
  writer: { id: number | null }
  markdown: string
  title?: string
}

/** Whether the live line brought a post back before its own request was answered: it must not stand there twice. */
export const isBack = (
  { state, body }: FencePost,
  published: readonly Published[],
  writerId: number | null,
): boolean =>
  state === 'sending' &&
  published.some(
    (post) =>
      post.writer.id === writerId &&
      post.markdown === body.markdown &&
      (!('title' in body) || post.title === body.title),
  )
