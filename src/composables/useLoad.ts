import { ref, shallowRef, watch, type WatchSource } from 'vue'
import { asProblem, type ApiProblem } from '../api/client'

/**
 * Fetches what a page shows and keeps its four states: loading, problem, and content or emptiness.
 * Runs again when `source` changes or `again` is called; an older answer never overtakes a newer one.
 */
export function useLoad<S, T>(source: WatchSource<S>, fetch: (from: S) => Promise<T>) {
  const data = shallowRef<T | null>(null)
  const problem = ref<ApiProblem | null>(null)
  const isLoading = ref(true)
  let run = 0

  async function load(from: S) {
    const mine = ++run
    isLoading.value = true
    problem.value = null
    try {
      const answer = await fetch(from)
      if (mine === run) data.value = answer
    } catch (error) {
      if (mine === run) problem.value = asProblem(error)
    } finally {
      if (mine === run) isLoading.value = false
    }
  }
  let latest: S
  watch(
    source,
    (from) => {
      latest = from
      data.value = null
      void load(from)
    },
    { immediate: true },
  )
  return { data, problem, isLoading, again: () => load(latest) }
}
