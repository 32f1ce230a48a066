import { computed, watch, type Ref } from 'vue'
import { fieldUnit } from '../../shared/calculators/fields'
import { hideAnswer } from '../../shared/calculators/runCalculator'
import type { LearnerExercise, StopState } from '../../shared/contracts/exercises'
import { convertAnswer, convertInputs, withoutUnit } from '../components/exercises/typedTexts'
import { useAccountsStore } from '../stores/accounts'
import { useExercisesStore } from '../stores/exercises'
import { useLessonsStore } from '../stores/lessons'
import { findFace, useCalculatorRun } from './useCalculatorRun'
import { useKeptDraft } from './useKeptDraft'

type CalculatorPart = Extract<LearnerExercise, { kind: 'calculator' }>

/**
 * A calculator exercise while it is being worked: own numbers and answer, and the run they give.
 * Both are kept as typed with the units they were typed in; in the other units they are shown converted
 * until something is typed there.
 */
export function useWorkedExercise(state: Ref<StopState>, exercise: Ref<CalculatorPart>) {
  const accounts = useAccountsStore()
  const lessons = useLessonsStore()
  const exercises = useExercisesStore()
  const calculator = computed(() => findFace(exercise.value))
  const asked = computed(() =>
    calculator.value?.outputs.find((output) => output.name === exercise.value.asked),
  )
  const given = computed(() =>
    Object.entries(exercise.value.inputs)
      .filter(([, input]) => input.mode === 'given')
      .map(([name]) => name),
  )
  /** The server's numbers in the units of the person, without the unit the field shows. */
  function serverTexts() {
    const entries = Object.entries(exercise.value.inputs).map(([name, { value }]) => {
      const input = calculator.value?.inputs.find((one) => one.name === name)
      return [name, input ? withoutUnit(value, fieldUnit(input, accounts.units)) : value]
    })
    return Object.fromEntries(entries) as Record<string, string>
  }

  const last = state.value.lastAnswer?.kind === 'calculator' ? state.value.lastAnswer : null
  const place = lessons.place
  const fromServer = {
    inputs: { ...serverTexts(), ...last?.inputs },
    answer: last?.answer ?? '',
    units: last?.units ?? accounts.units,
    isSent: true,
  }
  const draft = useKeptDraft(
    `stop:${place.slug}/${place.lessonKey}/${state.value.stopKey}`,
    fromServer,
  )
  /** What was sent from here may have been answered anew elsewhere: the server knows better. */
  if (draft.value.isSent) draft.value = { ...fromServer }

  const texts = computed({
    get: () => {
      if (!calculator.value) return draft.value.inputs
      const { inputs, units } = draft.value
      const own = convertInputs(calculator.value, inputs, units, accounts.units)
      const fixed = serverTexts()
      return { ...own, ...Object.fromEntries(given.value.map((name) => [name, fixed[name] ?? ''])) }
    },
    set: (inputs: Record<string, string>) => type({ inputs }),
  })
  const answer = computed({
    get: () => {
      const { answer: typed, units } = draft.value
      return asked.value ? convertAnswer(asked.value, typed, units, accounts.units) : typed
    },
    set: (typed: string) => type({ answer: typed }),
  })
  /** Typing fixes the units that are shown for all that was typed. */
  function type(changed: { inputs?: Record<string, string>; answer?: string }) {
    const shown = { inputs: texts.value, answer: answer.value }
    draft.value = { ...shown, ...changed, units: accounts.units, isSent: false }
  }

  const { run } = useCalculatorRun(
    () => exercise.value,
    () => texts.value,
    () => accounts.units,
  )
  const errors = computed(() => (run.value && !run.value.ok ? run.value.errors : {}))
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

  async function check() {
    const own = Object.entries(texts.value).filter(([name]) => !given.value.includes(name))
    const sent = { inputs: texts.value, answer: answer.value, units: accounts.units }
    await exercises.answer({ kind: 'calculator', ...sent, inputs: Object.fromEntries(own) })
    draft.value = { ...sent, isSent: answer.value === sent.answer }
  }
  const keep = () => exercises.keep(exercise.value.calculator, texts.value, accounts.units)
  /** An answer that could not be read is wrong only as long as it stands there. */
  const isAnswerUnread = computed(() => {
    const { lastVerdict, lastAnswer } = state.value
    return (
      lastVerdict?.field === 'answer' &&
      lastAnswer?.kind === 'calculator' &&
      lastAnswer.answer === draft.value.answer
    )
  })

  return { calculator, given, texts, answer, errors, asked, isShown, isAnswerUnread, check, keep }
}
