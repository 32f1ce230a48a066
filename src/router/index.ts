import { nextTick } from 'vue'
import { createRouter, createWebHistory } from 'vue-router'
import { useAccountsStore } from '../stores/accounts'
import { guardSignedIn } from './guards'
import { routes } from './routes'

declare module 'vue-router' {
  interface RouteMeta {
    /** The page's name in the window's title. */
    title?: string
    needsSignIn?: boolean
  }
}

export const router = createRouter({
  history: createWebHistory(),
  routes,
  scrollBehavior(to, from, saved) {
    if (saved) return saved
    if (from.matched.length === 0) return to.hash ? { el: to.hash, top: 16 } : undefined
    if (to.hash) return { el: to.hash, top: 16 }
    return to.path === from.path ? undefined : { top: 0 }
  },
})

/** Who is signed in is asked while a page is fetched; a page of one's own waits for the answer. */
router.beforeEach(async (to) => {
  const asked = useAccountsStore().load()
  if (to.meta.needsSignIn) await asked
  return guardSignedIn(to)
})
router.beforeResolve(() => useAccountsStore().load())

router.afterEach(async (to, from, failure) => {
  const isFirst = from.matched.length === 0
  if (failure || (!isFirst && to.path === from.path)) return
  document.title = to.meta.title ? `${to.meta.title} · Good Footing` : 'Good Footing'
  if (isFirst) return
  await nextTick()
  document.querySelector<HTMLElement>('#main')?.focus({ preventScroll: true })
})
