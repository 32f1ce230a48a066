import { computed, shallowRef, watchEffect } from 'vue'
import type { Calculator } from '../../shared/calculators/calculator'
import { runCalculator, type CalculatorRun } from '../../shared/calculators/runCalculator'
import type { UnitSystem } from '../../shared/contracts/exercises'
import { convertInputs } from '../components/exercises/typedTexts'
import { useAccountsStore } from '../stores/accounts'

type Worked = Extract<CalculatorRun, { ok: true }>
type Texts = Record<string, string>

/** Inputs as they were typed, and the system a bare number of theirs belongs to. */
export interface TypedInputs {
  texts: Texts
  system: UnitSystem
}

/**
 * A calculator worked live while typing, in the person's units. What was typed is kept as typed and shown
 * converted in the other units until something is typed there. `worked` keeps the last good run,
 * so that a drawing never vanishes while a number is half typed.
 */
export function useCalculator(calculator: Calculator, given: TypedInputs | null = null) {
  const accounts = useAccountsStore()
  const typed = shallowRef(given)
  const usual = computed<Texts>(() =>
    Object.fromEntries(
      calculator.inputs.map((input) => [input.name, input.initial[accounts.units]]),
    ),
  )
  const texts = computed<Texts>({
    get: () =>
      typed.value
        ? {
            ...usual.value,
            ...convertInputs(calculator, typed.value.texts, typed.value.system, accounts.units),
          }
        : usual.value,
    set: (changed) => (typed.value = { texts: changed, system: accounts.units }),
  })
  /** One input as a field's own model. */
  const textOf = (name: string) =>
    computed({
      get: () => texts.value[name] ?? '',
      set: (text: string) => (texts.value = { ...texts.value, [name]: text }),
    })
  const run = computed(() => runCalculator(calculator, texts.value, accounts.units))
  const errors = computed(() => (run.value.ok ? {} : run.value.errors))
  const worked = shallowRef<Worked | null>(null)
  watchEffect(() => {
    if (run.value.ok) worked.value = run.value
  })
  return { texts, textOf, typed, run, errors, worked }
}
