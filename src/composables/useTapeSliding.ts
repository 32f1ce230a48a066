import { useDebounceFn, useMediaQuery } from '@vueuse/core'
import { computed, watch, type Ref } from 'vue'
import { settleOn } from '../components/courses/tapeScale'

interface Sliding {
  durationMs: () => number
  positionMs: () => number
  settleAt: () => readonly number[]
  seek: (atMs: number) => void
}

const pxPerMinute = 72
const leastWidth = 640
const settleReachMs = 800
/** Without a scroll for this long the tape has come to rest. */
const restMs = 150

/**
 * On a phone the tape slides under a fixed pointer at 72 px a minute (a short lesson is stretched to
 * 640 px): it follows the video, and a flick seeks to where it comes to rest, on the nearest caption.
 */
export function useTapeSliding(scroller: Ref<HTMLElement | null>, sliding: Sliding) {
  const isPhone = useMediaQuery('(max-width: 900px)')
  const runWidth = computed(() =>
    isPhone.value ? Math.max(leastWidth, (sliding.durationMs() / 60_000) * pxPerMinute) : 0,
  )
  /** Where the tape was put to follow the video. */
  let ownLeft = 0
  /** A finger or wheel has moved the tape; and the finger is still on it. */
  let isTouched = false
  let isHeld = false

  const toLeft = (atMs: number) => (atMs / sliding.durationMs()) * runWidth.value

  function follow() {
    const element = scroller.value
    if (!element || !runWidth.value || isTouched) return
    ownLeft = Math.round(toLeft(sliding.positionMs()))
    element.scrollLeft = ownLeft
  }
  watch([sliding.positionMs, runWidth, scroller], follow, { flush: 'post', immediate: true })

  const settle = useDebounceFn(() => {
    if (isHeld || !isTouched || !scroller.value) return
    isTouched = false
    const left = scroller.value.scrollLeft
    if (!runWidth.value || Math.abs(left - ownLeft) <= 2) return
    const atMs = (left / runWidth.value) * sliding.durationMs()
    sliding.seek(Math.round(settleOn(atMs, sliding.settleAt(), settleReachMs)))
  }, restMs)
  function onScroll() {
    if (isTouched) void settle()
  }
  function onHold() {
    isHeld = isTouched = true
  }
  function onRelease() {
    isHeld = false
    void settle()
  }
  function onWheel() {
    isTouched = true
    void settle()
  }
  return {
    runWidth,
    handlers: {
      scroll: onScroll,
      touchstart: onHold,
      touchend: onRelease,
      touchcancel: onRelease,
      wheel: onWheel,
    },
  }
}
