import { computed, onScopeDispose, ref, shallowRef, watchEffect } from 'vue'
import { runCalculator, type CalculatorRun } from '../../shared/calculators/runCalculator'
import type { UnitSystem } from '../../shared/contracts/exercises'
import { OWN_PREFIX, type LearnerOwnSnapshot } from '../../shared/contracts/ownCalculators'
import { describeOwnCalculator, type CalculatorFace } from '../../shared/ownCalculators/face'
import { endedRun, tookTooLong } from '../../shared/ownCalculators/ended'
import { fetchedCalculator } from './fetchedCalculators'
import { performAside } from './ownCalculatorAside'

/** A built-in calculator by its id, fetched before, or an own one with what an exercise or the bench holds of it. */
export interface WhichCalculator {
  calculator: string
  own?: LearnerOwnSnapshot | undefined
}

/** The words and fields of a calculator; undefined where there is none. */
export function findFace({ calculator: id, own }: WhichCalculator): CalculatorFace | undefined {
  if (!own) return fetchedCalculator(id)
  return id === `${OWN_PREFIX}${own.key}` ? describeOwnCalculator(own.definition, own) : undefined
}

/**
 * A calculator worked live. `face` has its words and fields; `run` is what the texts give, or null where there
 * is no such calculator or an own one is worked for the first time. Built-in ones are worked at once; own ones
 * aside, and until theirs is there `isPending` is true and `run` is the one before.
 */
export function useCalculatorRun(
  which: () => WhichCalculator,
  texts: () => Record<string, string>,
  system: () => UnitSystem,
) {
  const face = computed(() => findFace(which()))
  const builtInRun = computed(() => {
    const { calculator: id, own } = which()
    const calculator = own ? undefined : fetchedCalculator(id)
    return calculator ? runCalculator(calculator, texts(), system()) : null
  })
  const ownRun = shallowRef<CalculatorRun | null>(null)
  const isPending = ref(false)
  let last = 0

  watchEffect(() => {
    const { own } = which()
    const number = ++last
    isPending.value = own !== undefined && face.value !== undefined
    if (!own || !face.value) {
      ownRun.value = null
      return
    }
    const { definition } = own
    const given = { definition, texts: { ...texts() }, system: system() }
    void performAside('run', given)
      .catch(() => endedRun(definition, tookTooLong))
      .then((run) => {
        if (number !== last) return
        ownRun.value = run
        isPending.value = false
      })
  })
  onScopeDispose(() => last++)

  const run = computed(() => (which().own ? ownRun.value : builtInRun.value))
  return { face, run, isPending }
}
