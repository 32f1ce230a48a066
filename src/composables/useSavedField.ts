import { tryOnScopeDispose, useDebounceFn } from '@vueuse/core'
import { ref, watch, type Ref } from 'vue'
import { asProblem } from '../api/client'

export type SaveState = 'idle' | 'saving' | 'saved' | 'refused' | 'offline'

/**
 * Saves a value as it is changed, 600 ms after the last key and one after the other. A refused or
 * unsent value stays where it was typed, with the reason beside it, and is sent again when the line
 * is back.
 */
export function useSavedField<T>(value: Ref<T>, save: (value: T) => Promise<void>) {
  const state = ref<SaveState>('idle')
  const savedAt = ref<Date | null>(null)
  const message = ref('')
  let isChanged = false
  let isSending = false

  async function send() {
    state.value = 'saving'
    message.value = ''
    try {
      await save(value.value)
      state.value = 'saved'
      savedAt.value = new Date()
    } catch (error) {
      const problem = asProblem(error)
      state.value = problem.isOffline ? 'offline' : 'refused'
      message.value = problem.errors[0]?.message ?? problem.message
      if (problem.isOffline) addEventListener('online', () => void saveNow(), { once: true })
    }
  }
  async function saveNow() {
    isChanged = true
    if (isSending) return
    isSending = true
    while (isChanged) {
      isChanged = false
      await send()
    }
    isSending = false
  }

  const saveSoon = useDebounceFn(() => (isChanged ? saveNow() : undefined), 600)
  watch(
    value,
    () => {
      isChanged = true
      void saveSoon()
    },
    { deep: true },
  )
  tryOnScopeDispose(() => (isChanged ? void saveNow() : undefined))
  return { state, savedAt, message, saveNow }
}
