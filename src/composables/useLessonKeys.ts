import { useEventListener } from '@vueuse/core'

interface LessonKeys {
  playOrPause: () => void
  nextStop: () => void
  stopBefore: () => void
}

const fields = 'input, textarea, select, [contenteditable=true]'

/** K plays and pauses, S and Shift+S go from stop to stop; never while a field has the focus. */
export function useLessonKeys(keys: LessonKeys) {
  useEventListener(document, 'keydown', (event) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return
    if (event.target instanceof Element && event.target.closest(fields)) return
    if (event.key === 'k' || event.key === 'K') keys.playOrPause()
    else if (event.key === 's') keys.nextStop()
    else if (event.key === 'S') keys.stopBefore()
    else return
    event.preventDefault()
  })
}
