import { useElementSize, useMediaQuery } from '@vueuse/core'
import { computed, type ComputedRef, type Ref } from 'vue'

/**
 * Picks the layout of a drawing by the width it is given, so that figures keep their size.
 * `steps` go from the widest down, each with the least width in pixels that it needs.
 */
export function useDrawingSize<Size extends string>(
  element: Ref<HTMLElement | null>,
  steps: readonly { size: Size; from: number }[],
  narrowest: Size,
): ComputedRef<Size> {
  const { width } = useElementSize(element)
  const isPhone = useMediaQuery('(max-width: 700px)')
  return computed(() => {
    const room = width.value || (isPhone.value ? 0 : 1000)
    return steps.find(({ from }) => room >= from)?.size ?? narrowest
  })
}
