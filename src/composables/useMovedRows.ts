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

/** Keys for rows that have none of their own, so that a row that is moved or renamed stays the same on the page. */
export function useMovedRows(count: () => number) {
  let next = 0
  const keys = ref<number[]>([])
  const said = ref('')
  function fit() {
    const kept = keys.value.slice(0, count())
    while (kept.length < count()) kept.push(next++)
    keys.value = kept
  }
  watch(count, fit, { immediate: true, flush: 'sync' })

  function move(index: number, by: -1 | 1, apply: () => void) {
    const place = index + by
    if (place < 0 || place >= count()) return
    void keepFocus(() => {
      keys.value = moveRow(keys.value, index, by)
      apply()
    })
    said.value = `Now ${place + 1} of ${count()}.`
  }
  function takeOut(index: number, apply: () => void) {
    keys.value = keys.value.toSpliced(index, 1)
    apply()
    said.value = `Taken out; ${count()} left.`
  }
  return { keys, said, move, takeOut }
}
