import type { Actor } from '../../shared/contracts/policies'
import type { KitState, LessonProgress, ReportProgress } from '../../shared/contracts/progress'
import { recordKeeper, type LessonAccess } from '../courses/access.service'
import { notAllowed } from '../errors'
import { tickKit } from './kitChecks.service'
import { reportProgress } from './lessonProgress.service'

/** Other lessons whose ticks one session remembers; what it holds must fit its column. */
const maxRemembered = 20

/** Ticks rows of a lesson's kit check: kept for the enrolled, remembered by the session for all others. */
export async function tickLessonKit(
  access: LessonAccess,
  actor: Actor | null,
  ticked: string[],
  remembered: Record<string, string[]>,
): Promise<KitState> {
  const { id } = access.lesson
  const userId = recordKeeper(access, actor)
  const state = await tickKit(id, userId, remembered[id] ?? [], ticked)
  if (userId === null) {
    remembered[id] = state.ticked
    const others = Object.keys(remembered).filter((key) => key !== String(id))
    for (const other of others.slice(maxRemembered)) Reflect.deleteProperty(remembered, other)
  }
  return state
}

/** Adds what an enrolled person has watched; a preview of a draft keeps nothing. */
export async function reportLesson(
  access: LessonAccess,
  actor: Actor,
  report: ReportProgress,
): Promise<LessonProgress> {
  const userId = recordKeeper(access, actor)
  if (userId === null) throw notAllowed('A preview keeps no progress.')
  return reportProgress(access, userId, report)
}
