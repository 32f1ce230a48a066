import type { RouteLocationNormalized, RouteLocationRaw } from 'vue-router'
import { useAccountsStore } from '../stores/accounts'

/** Sends a visitor to sign in first where a page is somebody's own, and brings them back after. */
export function guardSignedIn(to: RouteLocationNormalized): RouteLocationRaw | true {
  if (!to.meta.needsSignIn || useAccountsStore().isSignedIn) return true
  return { name: 'sign-in', query: { back: to.fullPath } }
}

/** Where to go after signing in: a path of our own, never another site. */
export function wayBack(back: unknown): string {
  const isOwnPath = typeof back === 'string' && /^\/(?![/\\])/.test(back)
  return isOwnPath ? back : '/register'
}
