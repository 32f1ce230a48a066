import { nextTick, ref, watch } from 'vue'
import { moveRow } from '../components/exercises/listOrder'

/** The focus stays with what was pressed; a button that cannot be pressed any more hands it to the next one. */
async function keepFocus(move: () => void) {
  const pressed = document.activeElement as HTMLElement | null
  move()
  await nextTick()
  const target = pressed?.matches(':disabled')
    ? pressed.parentElement?.querySelector<HTMLElement>('button:not(:disabled)')
    : pressed
  target?.focus()
}

/**
 * Rows that are moved and taken out by buttons, with keys for rows that have none of their own, so that one that is
 * moved or renamed stays the same on the page; `said` tells what happened to those who listen.
 */
export function useMovedRows<T>(rows: () => readonly T[], setAll: (rows: T[]) => void) {
  const count = () => rows().length
  let next = 0
  const keys = ref<number[]>([])
  const said = ref('')
  function fit() {
    const kept = keys.value.slice(0, count())
    while (kept.length < count()) kept.push(next++)
    keys.value = kept
  }
  watch(count, fit, { immediate: true, flush: 'sync' })

  function shift(index: number, by: -1 | 1) {
    const place = index + by
    if (place < 0 || place >= count()) return
    void keepFocus(() => {
      keys.value = moveRow(keys.value, index, by)
      setAll(moveRow(rows(), index, by))
    })
    said.value = `Now ${place + 1} of ${count()}.`
  }
  /** `takeOut` does it where more than the row goes with it. */
  function drop(index: number, takeOut = () => setAll(rows().toSpliced(index, 1))) {
    keys.value = keys.value.toSpliced(index, 1)
    takeOut()
    said.value = `Taken out; ${count()} left.`
  }
  return { keys, said, shift, drop }
}
