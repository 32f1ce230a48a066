import { computed, shallowRef, watchEffect } from 'vue'
import type { CalculatorRun } from '../../shared/calculators/runCalculator'
import { OWN_PREFIX, type OwnCalculatorDefinition } from '../../shared/contracts/ownCalculators'
import { convertInputs } from '../components/exercises/typedTexts'
import { useAccountsStore } from '../stores/accounts'
import { useCalculatorRun } from './useCalculatorRun'

type Texts = Record<string, string>

/** A calculator that is being written, tried out as a learner meets it; it is worked beside the page. */
export function useOwnTryout(key: string, definition: () => OwnCalculatorDefinition) {
  const accounts = useAccountsStore()
  const typed = shallowRef<{ texts: Texts; system: 'metric' | 'imperial' } | null>(null)
  const which = computed(() => ({
    calculator: `${OWN_PREFIX}${key}`,
    own: { key, version: 1, definition: definition() },
  }))
  const texts = computed<Texts>({
    get: () => {
      const { inputs } = definition()
      const initial = Object.fromEntries(
        inputs.map((input) => [input.name, input.initial[accounts.units]]),
      )
      if (!typed.value) return initial
      const { texts: written, system } = typed.value
      return { ...initial, ...convertInputs({ inputs }, written, system, accounts.units) }
    },
    set: (changed) => (typed.value = { texts: changed, system: accounts.units }),
  })
  const { face, run } = useCalculatorRun(
    () => which.value,
    () => texts.value,
    () => accounts.units,
  )
  const worked = shallowRef<Extract<CalculatorRun, { ok: true }> | null>(null)
  watchEffect(() => {
    if (run.value?.ok) worked.value = run.value
  })
  const errors = computed(() => (run.value && !run.value.ok ? run.value.errors : {}))
  return { face, texts, run, worked, errors }
}
