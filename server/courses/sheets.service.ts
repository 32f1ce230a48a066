import type { Sheet, SheetStage, SheetSummary } from '../../shared/contracts/courses'
import { can, type Actor } from '../../shared/contracts/policies'
import { notFound } from '../errors'
import { findLessonStates } from '../progress/lessonProgress.service'
import type { CourseRow, RevisionRow } from './access.queries'
import { revisionFor, type CourseAccess } from './access.service'
import {
  countStops,
  listIssuedRevisions,
  listLessons,
  listStaff,
  listStages,
} from './sheets.queries'

/** `A` for 0, `B` for 1, … `Z`, `AA`; what follows "Rev" on a sheet. */
export function letterOfRevision(number: number): string {
  const last = String.fromCharCode(65 + (number % 26))
  return number < 26 ? last : letterOfRevision(Math.floor(number / 26) - 1) + last
}

/** The revision's letter, or `draft`. */
export const nameRevision = (revision: { number: number; issuedAt: Date | null }) =>
  revision.issuedAt ? letterOfRevision(revision.number) : 'draft'

/** Who drew a course: its owner, or what is said of one who left. */
export const nameOwner = (staff: { role: string; name: string }[]) =>
  staff.find(({ role }) => role === 'owner')?.name ?? 'a former member'

/** The name of a course's owner. */
export const findDrawnBy = async (courseId: number) => nameOwner(await listStaff([courseId]))

/** The stages and lessons of a revision, numbered through, as one person has got on with them. */
export async function describeStages(
  revision: { id: number; courseId: number },
  userId: number | null,
): Promise<SheetStage[]> {
  const [stages, lessons, stops, states] = await Promise.all([
    listStages(revision.id),
    listLessons(revision.id),
    countStops(revision.id),
    userId === null ? null : findLessonStates(userId, revision.courseId),
  ])
  let number = 0
  return stages.map(({ id, ...stage }) => ({
    ...stage,
    lessons: lessons
      .filter((lesson) => lesson.stageId === id)
      .map((lesson) => ({
        key: lesson.key,
        number: ++number,
        title: lesson.title,
        summary: lesson.summary,
        durationMs: lesson.durationMs ?? 0,
        stops: stops.get(lesson.id) ?? 0,
        hazards: lesson.hazards,
        isSample: lesson.isSample,
        state: states?.get(lesson.key)?.state ?? 'not-started',
      })),
  }))
}

/** A course's line in the register from its rows. */
export function summarizeSheet(
  course: CourseRow,
  revision: RevisionRow,
  more: { drawnBy: string; lessons: number; isEnrolled: boolean },
): SheetSummary {
  return {
    slug: course.slug,
    sheetNumber: course.sheetNumber,
    title: revision.title,
    outcome: revision.outcome,
    drawnBy: more.drawnBy,
    revision: nameRevision(revision),
    issuedAt: revision.issuedAt?.toISOString() ?? null,
    changeNote: revision.changeNote,
    weekends: revision.weekends,
    lessons: more.lessons,
    tools: revision.tools,
    hazards: revision.hazards,
    coverDrawing: revision.coverDrawing,
    priceCents: course.priceCents,
    currency: course.currency,
    state: course.state,
    isEnrolled: more.isEnrolled,
  }
}

/** One course's sheet in the revision that the person reads. */
export async function describeSheet(access: CourseAccess, actor: Actor | null): Promise<Sheet> {
  const { course, thing } = access
  const revision = await revisionFor(access)
  if (!revision) throw notFound('course')
  const [stages, staff, issued] = await Promise.all([
    describeStages(revision, actor?.id ?? null),
    listStaff([course.id]),
    listIssuedRevisions(course.id),
  ])
  return {
    ...summarizeSheet(course, revision, {
      drawnBy: nameOwner(staff),
      lessons: stages.reduce((sum, stage) => sum + stage.lessons.length, 0),
      isEnrolled: thing.isEnrolled === true,
    }),
    id: course.id,
    facts: revision.facts,
    notCovered: revision.notCovered,
    stages,
    staff: staff.map(({ name, role, about }) => ({ name, role, about })),
    revisions: issued.map(({ number, issuedAt, changeNote }) => ({
      revision: letterOfRevision(number),
      issuedAt: (issuedAt ?? new Date(0)).toISOString(),
      changeNote,
    })),
    can: {
      enrol: mayEnrol(course, can(actor, 'course:enrol', thing)),
      seeBench: can(actor, 'course:see-bench', thing),
      writeFence: can(actor, 'fence:write', thing),
    },
  }
}

/** Enrolling by one button is for free courses. */
export const mayEnrol = (course: { priceCents: number }, isAllowed: boolean) =>
  isAllowed && course.priceCents === 0
