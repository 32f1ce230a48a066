import { findCalculator } from '../../shared/calculators'
import type { Build, BuildRow, StageState } from '../../shared/contracts/builds'
import type { SheetLesson, SheetStage } from '../../shared/contracts/courses'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import { revisionFor, type CourseAccess } from '../courses/access.service'
import { describeStages, findDrawnBy, nameRevision } from '../courses/sheets.service'
import type { Transaction } from '../db/client'
import { nameOwnCalculators } from '../exercises/ownCalculatorAttaching.service'
import { notFound } from '../errors'
import { readCursor } from '../paging'
import { findLessonStates } from '../progress/lessonProgress.service'
import {
  countLessonsDone,
  findBuild,
  insertBuild,
  listBuilds,
  listRightAnswers,
} from './builds.queries'
import { listEntries } from './fieldBook.queries'

/** Events shown under "lately". */
const latelyLength = 8

/** Starts the build that an enrolment is for. */
export const startBuild = (enrolmentId: number, name: string, tx: Transaction) =>
  insertBuild({ enrolmentId, name: name.slice(0, 90) }, tx)

/** The build of whoever is enrolled; 404 otherwise. */
export async function findOwnBuild({ enrolment }: Pick<CourseAccess, 'enrolment'>) {
  const build = enrolment ? await findBuild(enrolment.id) : null
  if (!build) throw notFound('build')
  return build
}

/** A stage is drawn in ink once all its lessons are done. */
function stateOf(stage: SheetStage): StageState {
  const isInked = stage.lessons.length > 0 && stage.lessons.every(({ state }) => state === 'done')
  return isInked ? 'ink' : 'pencil'
}

interface Happening {
  at: Date
  text: string
  lessonKey: string | null
}

async function listLately(
  userId: number,
  courseId: number,
  buildId: number,
  done: Happening[],
): Promise<Build['lately']> {
  const [right, entries, own] = await Promise.all([
    listRightAnswers(userId, courseId, latelyLength),
    listEntries(buildId, null, latelyLength),
    nameOwnCalculators(courseId),
  ])
  const all: Happening[] = [
    ...done,
    ...right.map(({ at, stopName, lessonKey }) => ({
      at,
      text: `“${stopName}” worked out`,
      lessonKey,
    })),
    ...entries.map(({ createdAt, calculator, lessonKey }) => ({
      at: createdAt,
      text: `“${findCalculator(calculator)?.title ?? own.get(calculator) ?? calculator}” put in the field book`,
      lessonKey,
    })),
  ]
  return all
    .sort((a, b) => b.at.getTime() - a.at.getTime())
    .slice(0, latelyLength)
    .map(({ at, ...rest }) => ({ ...rest, at: at.toISOString() }))
}

/** One learner's build of a course: the stages as drawn, what comes next, and what happened lately. */
export async function describeBuild(
  access: Pick<CourseAccess, 'course' | 'enrolment' | 'thing' | 'mayReadDraft'>,
  userId: number,
): Promise<Build> {
  const { course } = access
  const [build, revision] = await Promise.all([findOwnBuild(access), revisionFor(access)])
  if (!revision) throw notFound('build')
  const [stages, drawnBy, states] = await Promise.all([
    describeStages(revision, userId),
    findDrawnBy(course.id),
    findLessonStates(userId, course.id),
  ])
  const lessons: SheetLesson[] = stages.flatMap((stage) => stage.lessons)
  const next = lessons.find(({ state }) => state !== 'done')
  const done = lessons.flatMap(({ key, title }) => {
    const doneAt = states.get(key)?.doneAt
    return doneAt ? [{ at: doneAt, text: `Lesson “${title}” done`, lessonKey: key }] : []
  })
  return {
    id: build.id,
    name: build.name,
    startedAt: build.createdAt.toISOString(),
    course: {
      slug: course.slug,
      title: revision.title,
      sheetNumber: course.sheetNumber,
      revision: nameRevision(revision),
      drawnBy,
      coverDrawing: revision.coverDrawing,
    },
    stages: stages.map((stage) => ({ ...stage, state: stateOf(stage) })),
    lessonsDone: lessons.filter(({ state }) => state === 'done').length,
    lessonsInAll: lessons.length,
    next: next
      ? {
          lessonKey: next.key,
          lessonTitle: next.title,
          positionMs: states.get(next.key)?.positionMs ?? 0,
        }
      : null,
    lately: await listLately(userId, course.id, build.id, done),
  }
}

/** A page of a person's builds, the newest first. */
export async function listOwnBuilds(
  userId: number,
  { cursor, limit }: PageQuery,
): Promise<Page<BuildRow>> {
  const found = await listBuilds(userId, readCursor(cursor), limit + 1)
  const rows = found.slice(0, limit)
  const counts = await countLessonsDone(userId, [...new Set(rows.map((row) => row.revisionId))])
  return {
    items: rows.map(({ revisionId, courseId: _courseId, ...row }) => {
      const counted = counts.find((of) => of.revisionId === revisionId)
      return { ...row, lessonsDone: counted?.done ?? 0, lessonsInAll: counted?.inAll ?? 0 }
    }),
    nextCursor: found.length > limit ? String(rows.at(-1)?.id) : null,
  }
}
