import { computed, reactive, shallowRef, watchEffect } from 'vue'
import type { Calculator } from '../../shared/calculators/calculator'
import { runCalculator, type CalculatorRun } from '../../shared/calculators'
import { useAccountsStore } from '../stores/accounts'

type Worked = Extract<CalculatorRun, { ok: true }>

/**
 * A calculator worked live while typing, in the person's units. `worked` keeps the last good run,
 * so that a drawing never vanishes while a number is half typed.
 */
export function useCalculator(calculator: Calculator, initial: Record<string, string> = {}) {
  const accounts = useAccountsStore()
  const texts = reactive<Record<string, string>>(
    Object.fromEntries(
      calculator.inputs.map((input) => [
        input.name,
        initial[input.name] ?? input.initial[accounts.units],
      ]),
    ),
  )
  const run = computed(() => runCalculator(calculator, texts, accounts.units))
  const errors = computed(() => (run.value.ok ? {} : run.value.errors))
  const worked = shallowRef<Worked | null>(null)
  watchEffect(() => {
    if (run.value.ok) worked.value = run.value
  })
  return { texts, run, errors, worked }
}
