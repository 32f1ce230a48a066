import type { Interval, LessonProgress, ReportProgress } from '../../shared/contracts/progress'
import { clampIntervals, isWatchedThrough, measureIntervals } from '../../shared/progress/intervals'
import type { Transaction } from '../db/client'
import { inTransaction } from '../db/transaction'
import { AppError, invalid } from '../errors'
import { areRequiredStopsSolved } from '../exercises/stopStates.service'
import {
  findDurationMs,
  findProgress,
  insertProgress,
  listProgress,
  lockProgress,
  updateProgress,
  type LessonOfPerson,
  type ProgressRow,
} from './lessonProgress.queries'

/** More separate stretches than an honest player leaves behind in a long lesson. */
const maxIntervals = 5000

interface LessonRows {
  course: { id: number }
  lesson: { id: number; key: string; videoId: number | null }
}

const present = (row: Omit<ProgressRow, 'id' | 'userId'> | null): LessonProgress => ({
  intervals: row?.intervals ?? [],
  watchedMs: row?.watchedMs ?? 0,
  positionMs: row?.positionMs ?? 0,
  state: row?.state ?? 'not-started',
})

/** What a person has watched of a lesson; nothing for whom no rows are kept. */
export async function describeProgress(
  userId: number | null,
  courseId: number,
  lessonKey: string,
): Promise<LessonProgress> {
  return present(userId === null ? null : await findProgress({ userId, courseId, lessonKey }))
}

/** State and position of each lesson of a course that a person has begun, by the lesson's key. */
export async function findLessonStates(userId: number, courseId: number) {
  const rows = await listProgress(userId, courseId)
  return new Map(rows.map((row) => [row.lessonKey, row]))
}

function checkIntervals(intervals: Interval[]) {
  const errors = intervals.flatMap(([start, end], index) =>
    end < start
      ? [{ field: `intervals.${index}`, message: 'A stretch ends before it begins.' }]
      : [],
  )
  if (errors.length) throw invalid(errors)
}

/** Makes the row that progress is written to, before the transaction that locks it. */
export async function openProgress(which: LessonOfPerson) {
  if (!(await findProgress(which))) await insertProgress(which)
}

async function writeProgress(
  row: ProgressRow,
  { course, lesson }: LessonRows,
  durationMs: number,
  changes: { intervals: Interval[]; positionMs: number },
  tx: Transaction,
): Promise<ProgressRow> {
  const isDone =
    row.state === 'done' ||
    (isWatchedThrough(changes.intervals, durationMs) &&
      (await areRequiredStopsSolved(
        { userId: row.userId, courseId: course.id, lessonKey: lesson.key, lessonId: lesson.id },
        tx,
      )))
  const now = new Date()
  const next: ProgressRow = {
    ...row,
    ...changes,
    watchedMs: measureIntervals(changes.intervals),
    state: isDone ? 'done' : 'under-way',
    doneAt: isDone ? (row.doneAt ?? now) : null,
    updatedAt: now,
  }
  await updateProgress(row.id, next, tx)
  return next
}

/** Adds watched stretches to what all devices have reported, and keeps where the person is. */
export async function reportProgress(
  rows: LessonRows,
  userId: number,
  report: ReportProgress,
): Promise<LessonProgress> {
  checkIntervals(report.intervals)
  const which = { userId, courseId: rows.course.id, lessonKey: rows.lesson.key }
  const durationMs = await findDurationMs(rows.lesson.videoId)
  await openProgress(which)
  return inTransaction(async (tx) => {
    const row = await lockProgress(which, tx)
    const intervals = clampIntervals([...row.intervals, ...report.intervals], durationMs)
    if (intervals.length > maxIntervals) {
      throw new AppError(
        400,
        'too-scattered',
        'These stretches are too many and too short to keep.',
      )
    }
    const positionMs = Math.min(report.positionMs, durationMs)
    return present(await writeProgress(row, rows, durationMs, { intervals, positionMs }, tx))
  })
}

/** Looks again whether a lesson is done, within the transaction that solved a stop of it. */
export async function settleLesson(
  rows: LessonRows & { durationMs: number },
  userId: number,
  tx: Transaction,
) {
  const row = await lockProgress(
    { userId, courseId: rows.course.id, lessonKey: rows.lesson.key },
    tx,
  )
  await writeProgress(row, rows, rows.durationMs, row, tx)
}

/** The length of a lesson's video in ms; 0 without one. */
export const findLessonDurationMs = ({ lesson }: LessonRows) => findDurationMs(lesson.videoId)
