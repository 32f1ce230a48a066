import { onBeforeUnmount } from 'vue'
import type { BenchStop, ChangeStop } from '../../shared/contracts/benchCourses'
import type { FieldError } from '../../shared/contracts/errors'
import { ApiProblem, asProblem } from '../api/client'
import {
  findUnfinished,
  readDraft,
  type ExerciseDraft,
  type Typed,
} from '../components/exercises/exerciseDrafts'
import { momentHelp } from '../components/media/typedMoment'
import { useBenchLessonsStore } from '../stores/benchLessons'
import { useAutosave } from './useAutosave'

/** A stop while it is written; what cannot be read yet stands in it as it was typed. */
export interface StopForm {
  name: string
  atMs: Typed
  isRequired: boolean
  exercise: ExerciseDraft | null
}

function unreadable(errors: FieldError[]): ApiProblem {
  return new ApiProblem({
    type: 'about:blank',
    title: 'unread',
    status: 0,
    code: 'unread',
    detail: 'a marked field cannot be taken yet. All of it is kept on this device until it can.',
    errors,
  })
}

/** Changes as the server takes them; throws with the fields that cannot be read. */
function readChanges({ atMs, exercise, ...rest }: Partial<StopForm>): Omit<ChangeStop, 'version'> {
  const errors = [
    ...(typeof atMs === 'string' ? [{ field: 'atMs', message: momentHelp }] : []),
    ...(exercise ? findUnfinished(exercise) : []).map(({ field, message }) => ({
      field: `exercise.${field}`,
      message,
    })),
  ]
  if (errors.length > 0) throw unreadable(errors)
  return {
    ...rest,
    ...(typeof atMs === 'number' ? { atMs } : {}),
    ...(exercise === undefined ? {} : { exercise: exercise && readDraft(exercise) }),
  }
}

/** A refusal of the moment as a whole, put to its field. */
function placed(error: unknown): ApiProblem {
  const problem = asProblem(error)
  if (problem.code !== 'moment-taken') return problem
  return new ApiProblem({
    ...problem.problem,
    errors: [{ field: 'atMs', message: problem.message }],
  })
}

/** A stop and its exercise, saved as they are written, from the lesson's page and from the stop's own. */
export function useBenchStop(stop: BenchStop) {
  const lessons = useBenchLessonsStore()
  const initial: StopForm = {
    name: stop.name,
    atMs: stop.atMs,
    isRequired: stop.isRequired,
    exercise: stop.exercise,
  }
  const saving = useAutosave<StopForm>({
    name: `stop:${stop.id}`,
    initial,
    version: stop.version,
    save: async (changes, version) => {
      const body = { ...readChanges(changes), version }
      return lessons.changeStop(stop.id, body).catch((error: unknown) => {
        throw placed(error)
      })
    },
  })
  onBeforeUnmount(() => void saving.saveNow())
  return saving
}
