import { onBeforeUnmount } from 'vue'
import type { BenchLesson } from '../../shared/contracts/benchCourses'
import type { Hazard } from '../../shared/contracts/courses'
import type { KitItem } from '../../shared/contracts/lessons'
import { useBenchLessonsStore } from '../stores/benchLessons'
import { useAutosave } from './useAutosave'

/** What of a lesson is written in fields. */
export interface LessonForm {
  title: string
  summary: string
  youWillWant: string
  hazards: Hazard[]
  isSample: boolean
  kit: KitItem[]
}

/** The fields and the kit check of a lesson, saved as they are written. */
export function useBenchLesson(lesson: BenchLesson) {
  const lessons = useBenchLessonsStore()
  const { title, summary, youWillWant, hazards, isSample, kit } = lesson
  const saving = useAutosave<LessonForm>({
    name: `lesson:${lesson.id}`,
    initial: { title, summary, youWillWant, hazards, isSample, kit },
    version: lesson.version,
    save: (changes, version) => lessons.change(lesson.id, { ...changes, version }),
  })
  onBeforeUnmount(() => void saving.saveNow())
  return saving
}
