import type {
  BenchCourse,
  BenchCourseRow,
  ChangeCourse,
  CreateCourse,
} from '../../shared/contracts/benchCourses'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import { can, type Actor } from '../../shared/contracts/policies'
import { answerOnce } from '../accounts/idempotency.service'
import type { Transaction } from '../db/client'
import { inTransaction } from '../db/transaction'
import { conflict, invalid, notFound } from '../errors'
import { listCourseFiles, removeFiles } from '../media/courseMedia.service'
import { findCourse, findTies } from './access.queries'
import {
  deleteCourse,
  findNewestRevision,
  insertCourse,
  listBenchStaff,
  listSlugsLike,
  listStaffedCourses,
  takeSheetNumber,
  updateRevision,
} from './benchCourses.queries'
import { lockCourse } from './drafts.queries'
import { changeDraftOf, staleVersion, withCurrent } from './drafts.service'
import { loadOutline } from './outline.service'
import { nameRevision } from './sheets.service'
import { makeSlug } from './stableKeys.service'
import { beginStages } from './stages.service'

const longestSlug = 70

/** A course as its staff see it on the bench: the draft, or else what was issued last. */
export async function describeBenchCourse(courseId: number, actor: Actor): Promise<BenchCourse> {
  const course = await findCourse({ id: courseId })
  const revision = await findNewestRevision(courseId)
  if (!course || !revision) throw notFound('course')
  const { staffRole } = await findTies(courseId, actor.id)
  const isIssued = revision.issuedAt !== null
  const thing = { courseState: course.state, staffRole }
  return {
    id: course.id,
    slug: course.slug,
    sheetNumber: course.sheetNumber,
    state: course.state,
    revision: nameRevision(revision),
    isIssued,
    issuedAt: revision.issuedAt?.toISOString() ?? null,
    title: revision.title,
    outcome: revision.outcome,
    weekends: revision.weekends,
    tools: revision.tools,
    hazards: revision.hazards,
    coverDrawing: revision.coverDrawing,
    facts: revision.facts,
    notCovered: revision.notCovered,
    changeNote: revision.changeNote,
    version: revision.version,
    savedAt: revision.savedAt.toISOString(),
    ...(await loadOutline(revision)),
    staff: await listBenchStaff(courseId),
    can: {
      edit: !isIssued && can(actor, 'course:edit', thing),
      issue: !isIssued && can(actor, 'course:issue', thing),
      writeCalculators: can(actor, 'course:edit', thing),
    },
  }
}

/** A page of the courses on whose staff a person is, newest first. */
export async function listBenchCourses(
  actor: Actor,
  { cursor, limit }: PageQuery,
): Promise<Page<BenchCourseRow>> {
  if (cursor !== undefined && !/^\d{1,10}$/.test(cursor)) {
    throw invalid([{ field: 'cursor', message: 'Use the cursor of the page before.' }])
  }
  const before = cursor === undefined ? null : Number(cursor)
  const rows = await listStaffedCourses(actor.id, { before, limit: limit + 1 })
  const items = rows.slice(0, limit).map(({ course, revision, ...counts }) => ({
    id: course.id,
    slug: course.slug,
    sheetNumber: course.sheetNumber,
    title: revision.title,
    revision: nameRevision(revision),
    state: course.state,
    coverDrawing: revision.coverDrawing,
    savedAt: revision.savedAt.toISOString(),
    ...counts,
  }))
  return { items, nextCursor: rows.length > limit ? String(items.at(-1)?.id) : null }
}

async function takeSlug(title: string, tx: Transaction): Promise<string> {
  const wanted = makeSlug(title, longestSlug) || 'course'
  const taken = new Set(await listSlugsLike(wanted, tx))
  if (!taken.has(wanted)) return wanted
  for (let number = 2; ; number++) {
    const slug = `${wanted}-${number}`
    if (!taken.has(slug)) return slug
  }
}

async function insertNewCourse(ownerId: number, input: CreateCourse, tx: Transaction) {
  const { stages, ...values } = input
  const sheetNumber = await takeSheetNumber(tx)
  const slug = await takeSlug(values.title, tx)
  const { courseId, revisionId } = await insertCourse(
    { slug, sheetNumber, ownerId },
    { ...values, tools: [], hazards: [], facts: [] },
    tx,
  )
  await beginStages(revisionId, stages, tx)
  return courseId
}

/** Begins a course with its first draft; the same key never begins two. */
export async function createCourse(
  actor: Actor,
  input: CreateCourse,
  key: string | undefined,
): Promise<BenchCourse> {
  const { response } = await answerOnce(
    { userId: actor.id, route: 'POST bench/courses', key, payload: input },
    async (tx) => ({
      status: 201,
      response: { courseId: await insertNewCourse(actor.id, input, tx) },
    }),
  )
  return describeBenchCourse(response.courseId, actor)
}

/** Changes what a draft says of its course; 409 with the course as it is when someone else was first. */
export async function changeCourse(
  courseId: number,
  actor: Actor,
  { version, ...values }: ChangeCourse,
): Promise<BenchCourse> {
  const describe = () => describeBenchCourse(courseId, actor)
  const save = changeDraftOf(courseId, async (tx, revision) => {
    if (revision.version !== version) throw staleVersion('course')
    await updateRevision(revision.id, { ...values, version: version + 1 }, tx)
  })
  await withCurrent(save, describe)
  return describe()
}

/** Removes a course that was never issued, with its videos. */
export async function removeCourse(courseId: number) {
  const files = await listCourseFiles(courseId)
  await inTransaction(async (tx) => {
    const course = await lockCourse(courseId, tx)
    if (!course) throw notFound('course')
    if (course.state !== 'draft') {
      throw conflict('issued', 'Learners build from this course, so it stays.')
    }
    await deleteCourse(courseId, tx)
  })
  await removeFiles(files)
}
