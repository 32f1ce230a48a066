import { useMediaQuery } from '@vueuse/core'
import { watch, type Ref } from 'vue'

const shrinkMs = 240

/**
 * Lets the picture glide from its old size and place to the new one when the page is laid out anew;
 * at once for those who ask for less motion, and on a phone, where it keeps its size.
 */
export function usePictureShrinking(picture: () => HTMLElement | null, isWaiting: Ref<boolean>) {
  const isStill = useMediaQuery('(prefers-reduced-motion: reduce), (max-width: 900px)')
  let before: DOMRect | undefined
  watch(isWaiting, () => (before = picture()?.getBoundingClientRect()), { flush: 'pre' })
  watch(
    isWaiting,
    () => {
      const element = picture()
      const after = element?.getBoundingClientRect()
      if (!element || !before?.width || !after?.width || isStill.value) return
      const [x, y] = [before.left - after.left, before.top - after.top]
      const scale = before.width / after.width
      element.animate(
        [
          { transform: `translate(${x}px, ${y}px) scale(${scale})`, transformOrigin: 'top left' },
          { transform: 'none', transformOrigin: 'top left' },
        ],
        { duration: shrinkMs, easing: 'ease-out' },
      )
    },
    { flush: 'post' },
  )
}
