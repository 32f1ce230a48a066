import { useDebounceFn, useEventListener, useLocalStorage } from '@vueuse/core'
import { computed, reactive, ref, watch } from 'vue'
import { asProblem } from '../api/client'
import type { SaveState } from './useSavedField'

interface Autosave<T extends object> {
  /** Names the thing on this device, so that what was not sent yet survives a reload. */
  name: string
  /** What the server holds. */
  initial: T
  version: number
  /** Sends only what was changed; answers the version to send next time. */
  save: (changes: Partial<T>, version: number) => Promise<{ version: number; savedAt?: string }>
}

const pauseMs = 700
const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b)
const copy = <V>(value: V): V => JSON.parse(JSON.stringify(value)) as V

/**
 * A form that is saved as it is typed, field by field. What is refused stays in its field with the
 * reason beside it; what could not be sent is kept on the device and sent when the line is back;
 * what somebody else saved meanwhile is taken over except where it was changed here.
 */
export function useAutosave<T extends object>({ name, initial, version, save }: Autosave<T>) {
  const unsent = useLocalStorage<Partial<T>>(`gf-unsent:${name}`, {})
  const base = ref(copy(initial)) as { value: T }
  const form = reactive(copy({ ...initial, ...unsent.value })) as T
  const state = ref<SaveState>('idle')
  const savedAt = ref<Date | null>(null)
  const message = ref('')
  const errors = ref<Record<string, string>>({})
  let current = version
  let isSending = false
  let isWaiting = false

  const changes = computed(() => {
    const changed: Partial<T> = {}
    for (const key of Object.keys(form) as (keyof T)[]) {
      if (!same(form[key], base.value[key])) changed[key] = copy(form[key])
    }
    return changed
  })

  /** Takes over what the server holds now, except what was changed here. */
  function rebase(theirs: Partial<T>, theirVersion: number) {
    const mine = changes.value
    current = theirVersion
    for (const key of Object.keys(base.value) as (keyof T)[]) {
      const value = theirs[key]
      if (value === undefined) continue
      base.value[key] = copy(value)
      if (!(key in mine)) form[key] = copy(value)
    }
  }

  async function saveNow(): Promise<void> {
    if (isSending) {
      isWaiting = true
      return
    }
    const sent = changes.value
    if (Object.keys(sent).length === 0) return
    isSending = true
    state.value = 'saving'
    try {
      const saved = await save(sent, current)
      current = saved.version
      Object.assign(base.value, copy(sent))
      savedAt.value = saved.savedAt ? new Date(saved.savedAt) : new Date()
      errors.value = {}
      message.value = ''
      state.value = 'saved'
    } catch (error) {
      const problem = asProblem(error)
      const theirs = problem.problem.current as (Partial<T> & { version?: number }) | undefined
      if (problem.status === 409 && typeof theirs?.version === 'number') {
        rebase(theirs, theirs.version)
        isWaiting = true
      } else {
        state.value = problem.isOffline ? 'offline' : 'refused'
        message.value = problem.message
        errors.value = Object.fromEntries(
          problem.errors.map(({ field, message: text }) => [field, text]),
        )
      }
    } finally {
      isSending = false
      unsent.value = changes.value
    }
    if (isWaiting) {
      isWaiting = false
      await saveNow()
    }
  }
  const saveSoon = useDebounceFn(saveNow, pauseMs)
  watch(
    changes,
    (changed) => {
      unsent.value = changed
      if (Object.keys(changed).length > 0) void saveSoon()
    },
    { deep: true },
  )
  useEventListener(window, 'online', () => void saveNow())
  if (Object.keys(unsent.value).length > 0) void saveNow()

  /** The error of a field, or of anything inside it. */
  const errorOf = (field: string) =>
    errors.value[field] ??
    Object.entries(errors.value).find(([path]) => path.startsWith(`${field}.`))?.[1] ??
    ''
  return { form, state, savedAt, message, errorOf, saveNow, rebase }
}
