import { can, type Actor, type Thing } from '../../shared/contracts/policies'
import { notFound } from '../errors'
import {
  findCourse,
  findDraftRevision,
  findIssuedRevision,
  findLessonByKey,
  findOwnerOf,
  findRevision,
  findTies,
  type CourseRow,
  type LessonRow,
  type RevisionRow,
} from './access.queries'

/** A course as one person stands to it: what the policy table needs, and the rows it came from. */
export interface CourseAccess {
  course: CourseRow
  thing: Thing
  enrolment: { id: number; revisionId: number } | null
  /** Staff of the course, and admins. */
  mayReadDraft: boolean
}

/** How `actor` stands to a course; 404 when there is none. */
export async function accessCourse(
  which: { slug: string } | { id: number },
  actor: Actor | null,
): Promise<CourseAccess> {
  const course = await findCourse(which)
  if (!course) throw notFound('course')
  const ties = actor ? await findTies(course.id, actor.id) : { staffRole: null, enrolment: null }
  const thing: Thing = {
    courseState: course.state,
    staffRole: ties.staffRole,
    isEnrolled: ties.enrolment !== null,
  }
  return {
    course,
    enrolment: ties.enrolment,
    thing,
    mayReadDraft: can(actor, 'course:see-bench', thing),
  }
}

/** Which revision a person reads: the one they are enrolled with, else the newest issued, else (staff) the draft. */
export async function revisionFor(
  access: CourseAccess,
  wantsDraft = false,
): Promise<RevisionRow | null> {
  if (wantsDraft && access.mayReadDraft) {
    const draft = await findDraftRevision(access.course.id)
    if (draft) return draft
  }
  if (access.enrolment) return findRevision(access.enrolment.revisionId)
  const issued = await findIssuedRevision(access.course.id)
  return issued ?? (access.mayReadDraft ? findDraftRevision(access.course.id) : null)
}

export interface LessonAccess extends CourseAccess {
  revision: RevisionRow
  lesson: LessonRow
}

/** How `actor` stands to a lesson of the revision they read; 404 when there is none. */
export async function accessLesson(
  which: { slug: string; lessonKey: string; draft?: boolean },
  actor: Actor | null,
): Promise<LessonAccess> {
  const access = await accessCourse({ slug: which.slug }, actor)
  const revision = await revisionFor(access, which.draft)
  const lesson = revision ? await findLessonByKey(revision.id, which.lessonKey) : null
  if (!revision || !lesson) throw notFound('lesson')
  return {
    ...access,
    revision,
    lesson,
    thing: { ...access.thing, isSample: lesson.isSample, isIssued: revision.issuedAt !== null },
  }
}

/**
 * The person whose ticks, tries and progress in this lesson are kept as rows; null for everyone
 * else (visitors, staff, previews of a draft), whose ticks and tries live as long as their session.
 */
export function recordKeeper(access: LessonAccess, actor: Actor | null): number | null {
  const keeps = access.thing.isIssued && can(actor, 'lesson:keep-progress', access.thing)
  return keeps && actor ? actor.id : null
}

/** How `actor` stands to the course behind a row of the bench; 404 when there is no such row. */
export async function accessBenchRow(
  which: { stageId: number } | { lessonId: number } | { stopId: number } | { trackId: number },
  actor: Actor | null,
): Promise<CourseAccess & { revisionId: number }> {
  const owner = await findOwnerOf(which)
  if (!owner) throw notFound(Object.keys(which)[0]?.replace('Id', '') ?? 'row')
  return { ...(await accessCourse({ id: owner.courseId }, actor)), revisionId: owner.revisionId }
}
