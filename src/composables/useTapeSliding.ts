import { useMediaQuery } from '@vueuse/core'
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

/**
 * On a phone the tape slides under a fixed pointer at 72 px a minute (a short lesson is stretched to
 * 640 px): it follows the video, and a flick seeks to where it comes to rest, on the nearest caption.
 */
export function useTapeSliding(scroller: Ref<HTMLElement | null>, sliding: Sliding) {
  const isPhone = useMediaQuery('(max-width: 900px)')
  const runWidth = computed(() =>
    isPhone.value ? Math.max(leastWidth, (sliding.durationMs() / 60_000) * pxPerMinute) : 0,
  )
  /** Where we put the tape ourselves; anything else is a finger. */
  let ownLeft = 0
  let isTouched = false

  const toLeft = (atMs: number) => (atMs / sliding.durationMs()) * runWidth.value

  function follow() {
    const element = scroller.value
    if (!element || !runWidth.value || isTouched) return
    ownLeft = Math.round(toLeft(sliding.positionMs()))
    element.scrollLeft = ownLeft
  }
  watch([sliding.positionMs, runWidth, scroller], follow, { flush: 'post', immediate: true })

  function onScroll() {
    const left = scroller.value?.scrollLeft ?? 0
    if (runWidth.value && Math.abs(left - ownLeft) > 2) isTouched = true
  }
  function onScrollEnd() {
    if (!isTouched || !scroller.value) return
    isTouched = false
    const atMs = (scroller.value.scrollLeft / runWidth.value) * sliding.durationMs()
    sliding.seek(Math.round(settleOn(atMs, sliding.settleAt(), settleReachMs)))
  }
  return { runWidth, onScroll, onScrollEnd }
}
