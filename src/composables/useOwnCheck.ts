import { onScopeDispose, ref, shallowRef, watch } from 'vue'
import type { OwnCalculatorDefinition, OwnCheck } from '../../shared/contracts/ownCalculators'
import { endedCheck, tookTooLong } from '../../shared/ownCalculators/ended'
import { performAside } from './ownCalculatorAside'

/** Typing pauses this long before a definition is checked. */
const pauseMs = 250

/**
 * A definition checked as it is written, beside the page. `sound` is the last one whose fields and formulas
 * could be taken: what there is to try out while something is being mended.
 */
export function useOwnCheck(
  definition: () => OwnCalculatorDefinition,
  opened: { definition: OwnCalculatorDefinition; check: OwnCheck },
) {
  const check = shallowRef(opened.check)
  const isPending = ref(false)
  const sound = shallowRef<OwnCalculatorDefinition | null>(null)
  let last = 0
  let pause: ReturnType<typeof setTimeout> | undefined

  const copy = (): OwnCalculatorDefinition =>
    JSON.parse(JSON.stringify(definition())) as OwnCalculatorDefinition
  function take(checked: OwnCalculatorDefinition, found: OwnCheck) {
    check.value = found
    if (!found.problems.some(({ path }) => /^(inputs|outputs)(\.|$)/.test(path))) {
      sound.value = checked
    }
  }
  async function look(number: number) {
    const checked = copy()
    const found = await performAside('check', { definition: checked }).catch(() =>
      endedCheck(tookTooLong),
    )
    if (number !== last) return
    take(checked, found)
    isPending.value = false
  }
  function lookSoon() {
    const number = ++last
    isPending.value = true
    clearTimeout(pause)
    pause = setTimeout(() => void look(number), pauseMs)
  }
  watch(definition, lookSoon, { deep: true })
  take(opened.definition, opened.check)
  /** What was typed before a reload and not sent yet is on this device only. */
  if (JSON.stringify(copy()) !== JSON.stringify(opened.definition)) lookSoon()
  onScopeDispose(() => {
    last++
    clearTimeout(pause)
  })
  return { check, isPending, sound }
}
