import { eq, inArray, ne, sql } from 'drizzle-orm'
import { beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../../server/db/client'
import {
  attempts,
  courseRevisions,
  courses,
  exercises,
  kitItems,
  kitTicks,
  lessonProgress,
  lessons,
  stops,
  stopStates,
  users,
  videos,
} from '../../../../server/db/schema'
import { demoCourses, seedDatabase } from '../../../../server/db/seed'
import { findStopExercise } from '../../../../server/exercises/attempts.queries'
import { gradeExercise } from '../../../../shared/grading'
import { isWatchedThrough } from '../../../../shared/progress/intervals'

describe('the learners of the demo', () => {
  beforeAll(() => seedDatabase(db))

  it('calls a lesson done exactly when enough was watched and every required stop is solved', async () => {
    const rows = await db
      .select({ progress: lessonProgress, lessonId: lessons.id, durationMs: videos.durationMs })
      .from(lessonProgress)
      .innerJoin(courseRevisions, eq(courseRevisions.courseId, lessonProgress.courseId))
      .innerJoin(
        lessons,
        sql`${lessons.revisionId} = ${courseRevisions.id} and ${lessons.key} = ${lessonProgress.lessonKey}`,
      )
      .innerJoin(videos, eq(videos.id, lessons.videoId))
    expect(rows).toHaveLength(await db.$count(lessonProgress))
    for (const { progress, lessonId, durationMs } of rows) {
      const required = await db
        .select({ key: stops.key })
        .from(stops)
        .where(sql`${stops.lessonId} = ${lessonId} and ${stops.isRequired}`)
      const solved = await db
        .select({ key: stopStates.stopKey })
        .from(stopStates)
        .where(
          sql`${stopStates.userId} = ${progress.userId} and ${stopStates.courseId} = ${progress.courseId} and ${stopStates.lessonKey} = ${progress.lessonKey} and ${stopStates.solvedAt} is not null`,
        )
      const isSolved = required.every(({ key }) => solved.some((one) => one.key === key))
      const isDone = isSolved && isWatchedThrough(progress.intervals, durationMs ?? 0)
      expect({ key: progress.lessonKey, isDone: progress.state === 'done' }).toEqual({
        key: progress.lessonKey,
        isDone,
      })
      const kit = await db.select().from(kitItems).where(eq(kitItems.lessonId, lessonId))
      const ticked = kit.length
        ? await db.$count(
            kitTicks,
            sql`${kitTicks.userId} = ${progress.userId} and ${inArray(
              kitTicks.kitItemId,
              kit.map(({ id }) => id),
            )}`,
          )
        : 0
      expect(ticked).toBe(kit.length)
    }
  })

  it('has a learner held at a stop, one with two stages done, and one with everything done', async () => {
    const doneBy = async (email: string, slug: string) => {
      const rows = await db
        .select({ key: lessonProgress.lessonKey })
        .from(lessonProgress)
        .innerJoin(users, eq(users.id, lessonProgress.userId))
        .innerJoin(courses, eq(courses.id, lessonProgress.courseId))
        .where(
          sql`${users.email} = ${email} and ${courses.slug} = ${slug} and ${lessonProgress.state} = 'done'`,
        )
      return rows.map(({ key }) => key).sort()
    }
    const [logStore] = demoCourses
    const keys = (count: number) =>
      logStore?.stages
        .slice(0, count)
        .flatMap((stage) => stage.lessons.map(({ key }) => key))
        .sort()
    const slug = logStore?.slug ?? ''
    expect(await doneBy('ines@example.test', slug)).toEqual([])
    expect(await doneBy('callum@example.test', slug)).toEqual(keys(2))
    expect(await doneBy('anke@example.test', slug)).toEqual(keys(6))
    const wrong = await db
      .select({ outcome: attempts.outcome, slipId: attempts.slipId })
      .from(attempts)
      .innerJoin(users, eq(users.id, attempts.userId))
      .where(sql`${users.email} = 'jo@example.test' and ${ne(attempts.outcome, 'right')}`)
    expect(wrong).toEqual([
      { outcome: 'slip', slipId: 'round-the-corner' },
      { outcome: 'wrong', slipId: null },
    ])
  })

  it('keeps every attempt as the grader judges it, against the exercise that was answered', async () => {
    const rows = await db
      .select({
        attempt: attempts,
        lessonId: stops.lessonId,
        stopKey: stops.key,
        seed: stopStates.seed,
      })
      .from(attempts)
      .innerJoin(exercises, eq(exercises.id, attempts.exerciseId))
      .innerJoin(stops, eq(stops.id, exercises.stopId))
      .innerJoin(lessons, eq(lessons.id, stops.lessonId))
      .innerJoin(courseRevisions, eq(courseRevisions.id, lessons.revisionId))
      .innerJoin(
        stopStates,
        sql`${stopStates.userId} = ${attempts.userId} and ${stopStates.courseId} = ${courseRevisions.courseId} and ${stopStates.lessonKey} = ${lessons.key} and ${stopStates.stopKey} = ${stops.key}`,
      )
    expect(rows).toHaveLength(await db.$count(attempts))
    for (const { attempt, lessonId, stopKey, seed } of rows) {
      const found = await findStopExercise(lessonId, stopKey)
      expect(found && gradeExercise(found.exercise, attempt.answer, seed)).toEqual(attempt.verdict)
    }
  })
})
