import { computed } from 'vue'
import { useFenceStore } from '../stores/fence'
import { useLoad } from './useLoad'

/** One thread, live: read first, then heard in its lesson's room; null waits for a choice. */
export function useFenceThread(questionId: () => number | null) {
  const fence = useFenceStore()
  const { data, problem, again } = useLoad(questionId, async (id) =>
    id === null ? null : fence.openThread(id),
  )
  const latest = computed(() => {
    const id = questionId()
    return id === null ? null : (fence.threadOf(id) ?? data.value)
  })
  const isGone = computed(() => latest.value?.isDeleted === true)
  const thread = computed(() => (isGone.value ? null : latest.value))
  return { thread, isGone, problem, again }
}
