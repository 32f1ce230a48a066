import { computed, ref, watchEffect, type Ref } from 'vue'
import type { Exercise } from '../../shared/contracts/exercises'
import {
  findUnfinished,
  readDraft,
  type ExerciseDraft,
} from '../components/exercises/exerciseDrafts'
import { notesOf } from '../components/exercises/fieldNotes'
import { newCalculatorExercise, newQuizExercise } from '../components/exercises/newExercises'
import { useAccountsStore } from '../stores/accounts'
import { useExerciseProblems } from './useExerciseProblems'
import { useKeptDraft } from './useKeptDraft'

/** The exercise of a stop while it is written: what is wrong with it, where, and the other kind it was before. */
export function useBenchExercise(
  stopId: number,
  exercise: Ref<ExerciseDraft | null>,
  serverError: (path: string) => string,
) {
  const accounts = useAccountsStore()
  const laidAside = useKeptDraft<Record<ExerciseDraft['kind'], ExerciseDraft | null>>(
    `stop-kinds:${stopId}`,
    { calculator: null, quiz: null },
  )
  /** The last state of it that could be read, for everything that is worked out from it. */
  const read = ref<Exercise | null>(null)
  watchEffect(() => {
    const now = exercise.value && readDraft(exercise.value)
    if (now || !exercise.value || exercise.value.kind !== read.value?.kind) read.value = now
  })
  const found = useExerciseProblems(() =>
    exercise.value && readDraft(exercise.value) !== null ? read.value : null,
  )
  const problems = computed(() => {
    if (!exercise.value) return []
    const unfinished = findUnfinished(exercise.value).map(({ field, message }) => ({
      path: field,
      message,
      blocking: true,
    }))
    /** A row that is unfinished says so itself. */
    const isSaid = (path: string) =>
      unfinished.some((note) => note.path === path || note.path === `${path}.text`)
    return [...unfinished, ...found.value.filter(({ path }) => !isSaid(path))]
  })
  const notes = computed(() => {
    const own = notesOf(problems.value)
    /** What stands deeper is said there, not at the whole as well. */
    const isDeeper = (path: string) =>
      problems.value.some((note) => note.blocking && note.path.startsWith(`${path}.`))
    return {
      error: (path: string) =>
        own.error(path) || (isDeeper(path) ? '' : serverError(`exercise.${path}`)),
      hint: own.hint,
    }
  })

  /** Begins with the other kind, or goes back to what was written of it before. */
  function setKind(kind: ExerciseDraft['kind']) {
    const now = exercise.value
    if (now?.kind === kind) return
    if (now) laidAside.value[now.kind] = now
    exercise.value =
      laidAside.value[kind] ??
      (kind === 'quiz' ? newQuizExercise() : newCalculatorExercise(accounts.units))
  }
  return { read, problems, notes, setKind }
}
