import { onMounted } from 'vue'
import { useRouter } from 'vue-router'

/** Fetches a page that is likely opened next, and what it draws, once this one is at rest; for use without signal. */
export function usePrefetch(routeName: string, fetchers: readonly (() => Promise<unknown>)[]) {
  const router = useRouter()
  function fetchAll() {
    const page = router.getRoutes().find(({ name }) => name === routeName)?.components?.['default']
    const fetchPage = typeof page === 'function' ? [page as () => Promise<unknown>] : []
    for (const fetch of [...fetchPage, ...fetchers]) void Promise.resolve(fetch()).catch(() => null)
  }
  onMounted(() => {
    if ('requestIdleCallback' in window) requestIdleCallback(fetchAll)
    else setTimeout(fetchAll, 2000)
  })
}
