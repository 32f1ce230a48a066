import { useLocalStorage } from '@vueuse/core'
import { useAccountsStore } from '../stores/accounts'

/**
 * What is being typed, kept on the device for this person under `name` until it is sent: no reload
 * and no lost line takes it, and nobody else at the device sees it.
 */
export function useKeptDraft<T extends object>(name: string, initial: T) {
  const person = useAccountsStore().me?.id ?? 0
  return useLocalStorage<T>(`gf-draft:${person}:${name}`, initial, { mergeDefaults: true })
}
