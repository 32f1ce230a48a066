import { computed, watch, type Ref } from 'vue'
import { findCalculator, hideAnswer, runCalculator } from '../../shared/calculators'
import type { LearnerExercise, StopState } from '../../shared/contracts/exercises'
import { useAccountsStore } from '../stores/accounts'
import { useExercisesStore } from '../stores/exercises'
import { useLessonsStore } from '../stores/lessons'
import { useKeptDraft } from './useKeptDraft'

type CalculatorPart = Extract<LearnerExercise, { kind: 'calculator' }>

const valuesOf = (exercise: CalculatorPart) =>
  Object.fromEntries(Object.entries(exercise.inputs).map(([name, input]) => [name, input.value]))

/** A calculator exercise while it is being worked: own numbers and answer as typed, and the run they give. */
export function useWorkedExercise(state: Ref<StopState>, exercise: Ref<CalculatorPart>) {
  const accounts = useAccountsStore()
  const lessons = useLessonsStore()
  const exercises = useExercisesStore()
  const calculator = computed(() => findCalculator(exercise.value.calculator))
  const given = computed(() =>
    Object.entries(exercise.value.inputs)
      .filter(([, input]) => input.mode === 'given')
      .map(([name]) => name),
  )

  const last = state.value.lastAnswer?.kind === 'calculator' ? state.value.lastAnswer : null
  const place = lessons.place
  const draft = useKeptDraft(`${place.slug}/${place.lessonKey}/${state.value.stopKey}`, {
    inputs: { ...valuesOf(exercise.value), ...last?.inputs },
    answer: last?.answer ?? '',
  })
  /** Given numbers always come from the server, also when the units change. */
  const texts = computed({
    get: () => ({
      ...draft.value.inputs,
      ...Object.fromEntries(
        given.value.map((name) => [name, exercise.value.inputs[name]?.value ?? '']),
      ),
    }),
    set: (inputs: Record<string, string>) => (draft.value.inputs = inputs),
  })
  const run = computed(() =>
    calculator.value ? runCalculator(calculator.value, texts.value, accounts.units) : null,
  )
  const errors = computed(() => (run.value && !run.value.ok ? run.value.errors : {}))
  const asked = computed(() =>
    calculator.value?.outputs.find((output) => output.name === exercise.value.asked),
  )
  const isShown = computed(() => state.value.solved || state.value.shownAnswer !== null)

  watch(
    [run, isShown],
    () => {
      if (!run.value?.ok || !calculator.value) return
      const steps = isShown.value
        ? run.value.steps
        : hideAnswer(run.value.steps, exercise.value.asked)
      exercises.worked = {
        calculator: calculator.value.id,
        values: run.value.values,
        outputs: run.value.outputs,
        steps,
        asked: isShown.value ? undefined : exercise.value.asked,
      }
    },
    { immediate: true },
  )

  const check = () =>
    exercises.answer({
      kind: 'calculator',
      inputs: Object.fromEntries(
        Object.entries(texts.value).filter(([name]) => !given.value.includes(name)),
      ),
      answer: draft.value.answer,
      units: accounts.units,
    })
  const keep = () => exercises.keep(exercise.value.calculator, texts.value, accounts.units)

  return { calculator, given, draft, texts, errors, asked, isShown, check, keep }
}
