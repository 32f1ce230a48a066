import { ref, type Ref } from 'vue'
import { asProblem } from '../api/client'

/** Something a button does: one at a time, with what went wrong put into `message`. */
export function useAction<A extends unknown[]>(
  message: Ref<string>,
  work: (...args: A) => Promise<void>,
) {
  const isRunning = ref(false)
  async function run(...args: A) {
    if (isRunning.value) return
    isRunning.value = true
    message.value = ''
    try {
      await work(...args)
    } catch (error) {
      message.value = asProblem(error).message
    } finally {
      isRunning.value = false
    }
  }
  return { run, isRunning }
}
