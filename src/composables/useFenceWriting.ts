import { useThrottleFn, useTimeoutFn } from '@vueuse/core'
import { onBeforeUnmount } from 'vue'
import { useFenceStore } from '../stores/fence'

const renewEveryMs = 3000
const restsAfterMs = 5000

/** Tells the room that one writes here: call `typed` at each change; it takes itself back after a rest. */
export function useFenceWriting(questionId: () => number | null) {
  const fence = useFenceStore()
  let isSaid = false

  const say = useThrottleFn(() => {
    isSaid = true
    fence.sayWriting(questionId(), true)
  }, renewEveryMs)
  function rest() {
    if (isSaid) fence.sayWriting(questionId(), false)
    isSaid = false
  }
  const resting = useTimeoutFn(rest, restsAfterMs, { immediate: false })

  function typed() {
    void say()
    resting.start()
  }
  onBeforeUnmount(rest)
  return { typed, rest }
}
