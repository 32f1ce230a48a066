import { computed } from 'vue'
import { useFenceStore } from '../stores/fence'
import { useLoad } from './useLoad'

/** One thread, live: read first, then heard in its lesson's room; null waits for a choice. */
export function useFenceThread(questionId: () => number | null) {
  const fence = useFenceStore()
  const { data, problem, again } = useLoad(questionId, async (id) =>
    id === null ? null : fence.openThread(id),
  )
  const thread = computed(() => {
    const latest = data.value && (fence.threadOf(data.value.id) ?? data.value)
    return latest?.isDeleted ? null : latest
  })
  const isGone = computed(() => data.value !== null && thread.value === null)
  return { thread, isGone, problem, again }
}
