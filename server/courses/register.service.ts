import type { RegisterQuery, SheetSummary } from '../../shared/contracts/courses'
import type { Page } from '../../shared/contracts/pagination'
import type { Actor } from '../../shared/contracts/policies'
import { readCursor } from '../paging'
import { listEnrolledIds, listIssuedCourses } from './register.queries'
import { countLessons, listStaff } from './sheets.queries'
import { nameOwner, summarizeSheet } from './sheets.service'

/** A page of the register: issued courses in the order of their sheets. */
export async function listRegister(
  { cursor, limit, weekends, cover }: RegisterQuery,
  actor: Actor | null,
): Promise<Page<SheetSummary>> {
  const afterSheet = readCursor(cursor) ?? 0
  const found = await listIssuedCourses({ afterSheet, limit: limit + 1, weekends, cover })
  const rows = found.slice(0, limit)
  const courseIds = rows.map((row) => row.course.id)
  const [lessons, staff, enrolled] = await Promise.all([
    countLessons(rows.map((row) => row.revision.id)),
    listStaff(courseIds),
    actor ? listEnrolledIds(actor.id, courseIds) : new Set<number>(),
  ])
  const last = rows.at(-1)
  return {
    items: rows.map(({ course, revision }) =>
      summarizeSheet(course, revision, {
        drawnBy: nameOwner(staff.filter((member) => member.courseId === course.id)),
        lessons: lessons.get(revision.id) ?? 0,
        isEnrolled: enrolled.has(course.id),
      }),
    ),
    nextCursor: found.length > limit && last ? String(last.course.sheetNumber) : null,
  }
}
