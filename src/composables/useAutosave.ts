import {
  tryOnScopeDispose,
  useDebounceFn,
  useEventListener,
  useLocalStorage,
  useTimeoutFn,
} from '@vueuse/core'
import { computed, reactive, ref, watch } from 'vue'
import { asProblem, type ApiProblem } from '../api/client'
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

/** What was typed and not sent, beside what stood there before. */
interface Unsent<T> {
  changes: Partial<T>
  before: Partial<T>
}

const pauseMs = 700
/** A server that is away for a moment tells nobody when it is back. */
const againMs = 5000
const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b)
const copy = <V>(value: V): V => JSON.parse(JSON.stringify(value)) as V
const isEmpty = (value: object) => Object.keys(value).length === 0
const fieldOf = (path: string) => path.split('.')[0] ?? path

/**
 * A form that is saved as it is typed, field by field. What is refused stays in its field with the
 * reason beside it and does not hold up the rest; what could not be sent is kept on the device and
 * sent when the line is back; what somebody else saved meanwhile is taken over, except where it was
 * changed here too: then it is said what they wrote.
 */
export function useAutosave<T extends object>({ name, initial, version, save }: Autosave<T>) {
  const storageKey = `gf-unsent:${name}`
  const unsent = useLocalStorage<Unsent<T>>(
    storageKey,
    { changes: {}, before: {} },
    { listenToStorageChanges: false },
  )
  /** Fields this page has written there; another window of this device has its own. */
  let own = new Set(Object.keys(unsent.value.changes))
  const base = ref(copy(initial)) as { value: T }
  const form = reactive(copy({ ...initial, ...unsent.value.changes })) as T
  const keys = Object.keys(initial) as (keyof T)[]
  const state = ref<SaveState>('idle')
  const savedAt = ref<Date | null>(null)
  const message = ref('')
  const errors = ref<Record<string, string>>({})
  /** Refused values by field; the same is not sent twice. */
  const refused = new Map<keyof T, unknown>()
  let overtaken = ''
  let current = version
  let isSending = false
  let isWaiting = false
  let isGone = false

  const changes = computed(() => {
    const changed: Partial<T> = {}
    for (const key of keys) if (!same(form[key], base.value[key])) changed[key] = copy(form[key])
    return changed
  })

  function keep() {
    const kept = changes.value
    const before: Partial<T> = {}
    for (const key of Object.keys(kept) as (keyof T)[]) before[key] = base.value[key]
    const others = readOthers()
    unsent.value = copy({
      changes: { ...others.changes, ...kept },
      before: { ...others.before, ...before },
    })
    own = new Set(Object.keys(kept))
  }

  /** What other windows have left there. */
  function readOthers(): Unsent<T> {
    const text = localStorage.getItem(storageKey)
    const stored = text ? (JSON.parse(text) as Unsent<T>) : { changes: {}, before: {} }
    const without = (part: Partial<T>) =>
      Object.fromEntries(Object.entries(part).filter(([key]) => !own.has(key))) as Partial<T>
    return { changes: without(stored.changes), before: without(stored.before) }
  }

  /** Says what somebody else wrote where something was typed here as well. */
  function compare(theirs: Partial<T>, before: Partial<T>, mine: Partial<T>) {
    for (const key of Object.keys(mine) as (keyof T)[]) {
      const value = theirs[key]
      if (value === undefined || same(value, before[key]) || same(value, mine[key])) continue
      const words = typeof value === 'string' && value !== '' ? `: “${value}”` : ''
      overtaken = `This was changed elsewhere meanwhile${words}. What stands here was kept.`
    }
  }

  /** Takes over what the server holds now, except what was changed here. */
  function rebase(theirs: Partial<T>, theirVersion: number) {
    const mine = changes.value
    compare(theirs, base.value, mine)
    current = theirVersion
    for (const key of keys) {
      const value = theirs[key]
      if (value === undefined) continue
      base.value[key] = copy(value)
      if (!(key in mine)) form[key] = copy(value)
    }
  }

  function forgive(key: keyof T) {
    refused.delete(key)
    errors.value = Object.fromEntries(
      Object.entries(errors.value).filter(([path]) => fieldOf(path) !== key),
    )
  }

  function onSaved(sent: Partial<T>, saved: { version: number; savedAt?: string }) {
    current = saved.version
    Object.assign(base.value, copy(sent))
    for (const key of Object.keys(sent) as (keyof T)[]) forgive(key)
    savedAt.value = saved.savedAt ? new Date(saved.savedAt) : new Date()
    state.value = refused.size > 0 ? 'refused' : 'saved'
    if (refused.size > 0) return
    message.value = overtaken
    overtaken = ''
  }

  function onRefused(sent: Partial<T>, problem: ApiProblem) {
    const theirs = problem.problem.current as (Partial<T> & { version?: number }) | undefined
    if (problem.status === 409 && theirs?.version !== undefined && theirs.version !== current) {
      rebase(theirs, theirs.version)
      isWaiting = true
      return
    }
    state.value = problem.isOffline ? 'offline' : 'refused'
    message.value = problem.message
    for (const { field, message: text } of problem.errors) {
      const key = fieldOf(field) as keyof T
      errors.value = { ...errors.value, [field]: text }
      if (!(key in sent)) continue
      refused.set(key, sent[key])
      isWaiting = true
    }
  }

  async function send() {
    const sent = Object.fromEntries(
      Object.entries(changes.value).filter(([key]) => !refused.has(key as keyof T)),
    ) as Partial<T>
    if (isEmpty(sent)) return
    state.value = 'saving'
    try {
      onSaved(sent, await save(sent, current))
    } catch (error) {
      onRefused(sent, asProblem(error))
    }
  }

  async function saveNow(): Promise<void> {
    isWaiting = true
    if (isSending) return
    isSending = true
    while (isWaiting) {
      isWaiting = false
      await send()
    }
    isSending = false
    keep()
    if (state.value === 'offline' && !isGone) again.start()
  }

  const again = useTimeoutFn(() => void saveNow(), againMs, { immediate: false })
  const saveSoon = useDebounceFn(saveNow, pauseMs)
  watch(
    changes,
    (changed) => {
      for (const [key, value] of refused) if (!same(form[key], value)) forgive(key)
      keep()
      if (!isEmpty(changed)) void saveSoon()
      else if (state.value === 'refused' || state.value === 'offline') state.value = 'idle'
    },
    { deep: true },
  )
  useEventListener(window, 'online', () => void saveNow())
  tryOnScopeDispose(() => {
    isGone = true
    void saveNow()
  })
  if (!isEmpty(unsent.value.changes)) {
    compare(initial, unsent.value.before, unsent.value.changes)
    void saveNow()
  }

  /** The error of a field, or of anything inside it. */
  const errorOf = (field: string) =>
    errors.value[field] ??
    Object.entries(errors.value).find(([path]) => fieldOf(path) === field)?.[1] ??
    ''
  return { form, state, savedAt, message, errorOf, saveNow, rebase }
}
