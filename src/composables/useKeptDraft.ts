import { useLocalStorage } from '@vueuse/core'

/** What is being typed, kept on the device under `name` until it is sent: no reload and no lost line takes it. */
export const useKeptDraft = <T extends object>(name: string, initial: T) =>
  useLocalStorage<T>(`gf-draft:${name}`, initial, { mergeDefaults: true })
