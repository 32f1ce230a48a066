import type { SheetStage } from '../../../shared/contracts/courses'
import type { LessonState } from '../../../shared/contracts/progress'

export interface PoleLesson {
  key: string
  number: number
  title: string
  state: LessonState
  isHere: boolean
}
export interface PoleStage {
  key: string
  title: string
  isHere: boolean
  lessons: PoleLesson[]
}

/** The lessons of a course along one pole, with the one that is open. */
export function markPole(stages: readonly SheetStage[], hereKey: string): PoleStage[] {
  return stages.map((stage) => {
    const lessons = stage.lessons.map((lesson) => ({
      key: lesson.key,
      number: lesson.number,
      title: lesson.title,
      state: lesson.state,
      isHere: lesson.key === hereKey,
    }))
    return {
      key: stage.key,
      title: stage.title,
      isHere: lessons.some((lesson) => lesson.isHere),
      lessons,
    }
  })
}
