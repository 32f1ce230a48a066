import { useEventListener } from '@vueuse/core'
import { ref } from 'vue'
import { settleOn } from '../components/courses/tapeScale'

interface Dragging {
  msPerPx: () => number
  settleAt: () => readonly number[]
  clamp: (ms: number) => number
  moving: (key: string, atMs: number) => void
  moved: (key: string, atMs: number) => void
}
interface Stop {
  key: string
  atMs: number
}

/** A finger is not finer than this. */
const settlePx = 6
const leastMovePx = 3

/** Moves stops along the tape by pointer or by arrow keys; Escape puts a dragged one back. */
export function useStopDragging(dragging: Dragging) {
  const moving = ref<{ key: string; atMs: number; from: number } | null>(null)
  let startX = 0

  function onPointerDown(event: PointerEvent, stop: Stop) {
    if (event.button !== 0) return
    startX = event.clientX
    moving.value = { key: stop.key, atMs: stop.atMs, from: stop.atMs }
  }
  useEventListener(window, 'pointermove', (event) => {
    const held = moving.value
    if (!held || Math.abs(event.clientX - startX) < leastMovePx) return
    const wanted = held.from + (event.clientX - startX) * dragging.msPerPx()
    const atMs = settleOn(wanted, dragging.settleAt(), settlePx * dragging.msPerPx())
    moving.value = { ...held, atMs: dragging.clamp(atMs) }
    dragging.moving(held.key, moving.value.atMs)
  })
  useEventListener(window, 'pointerup', () => {
    const held = moving.value
    moving.value = null
    if (held && held.atMs !== held.from) dragging.moved(held.key, held.atMs)
  })
  useEventListener(window, ['pointercancel', 'blur'], () => {
    moving.value = null
  })
  useEventListener(window, 'keydown', (event) => {
    const held = moving.value
    if (event.key !== 'Escape' || !held) return
    moving.value = null
    dragging.moving(held.key, held.from)
  })

  function onKey(event: KeyboardEvent, stop: Stop) {
    const direction = { ArrowRight: 1, ArrowLeft: -1 }[event.key]
    if (direction === undefined) return
    event.preventDefault()
    const step = event.shiftKey ? 10_000 : 1000
    dragging.moved(stop.key, dragging.clamp(stop.atMs + direction * step))
  }
  return { moving, onPointerDown, onKey }
}
