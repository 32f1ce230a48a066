import type { Answer, UnitSystem } from '../../../shared/contracts/exercises'
import { gradeExercise } from '../../../shared/grading'
import {
  clampIntervals,
  isWatchedThrough,
  measureIntervals,
} from '../../../shared/progress/intervals'
import type { attempts, fieldBookEntries, kitTicks, lessonProgress, stopStates } from '../schema'
import { rightAnswer, seedOf, textsOf, workedOut, wrongAnswer } from './answers'
import type { InsertedLesson } from './insertCourse'
import type { InsertedStop } from './insertStop'
import type { AnsweredStop, WatchedLessonSeed } from './shapes'

/** Answers were handed in one after another, the first so long before the lesson was left. */
const firstAnswerBeforeMs = 15 * 60_000
const answerEveryMs = 50_000

/** What a learner leaves behind in the database. */
export interface ProgressRows {
  kitTicks: (typeof kitTicks.$inferInsert)[]
  attempts: (typeof attempts.$inferInsert & { createdAt: Date })[]
  stopStates: (typeof stopStates.$inferInsert)[]
  lessonProgress: (typeof lessonProgress.$inferInsert)[]
  fieldBookEntries: (typeof fieldBookEntries.$inferInsert & { createdAt: Date })[]
}

export interface Learner {
  userId: number
  units: UnitSystem
  /** Gives them numbers of their own that are the same at every seeding. */
  name: string
  courseId: number
  buildId: number
}

/** Adds the rows of one lesson that a learner has watched. */
export function addWatched(
  rows: ProgressRows,
  watched: WatchedLessonSeed,
  lesson: InsertedLesson,
  learner: Learner,
) {
  const on = new Date(watched.on)
  const { userId, courseId } = learner
  const createdAt = new Date(on.getTime() - 2 * firstAnswerBeforeMs)
  rows.kitTicks.push(...lesson.kitItemIds.map((kitItemId) => ({ userId, kitItemId, createdAt })))
  const solved = addAnswers(rows, watched, lesson, learner)
  const durationMs = lesson.video?.durationMs ?? 0
  const intervals = clampIntervals(
    watched.watched === 'whole' ? [[0, durationMs]] : watched.watched,
    durationMs,
  )
  const isDone =
    isWatchedThrough(intervals, durationMs) &&
    [...lesson.stops].every(([key, { isRequired }]) => !isRequired || solved.has(key))
  rows.lessonProgress.push({
    userId,
    courseId,
    lessonKey: watched.lesson,
    intervals,
    watchedMs: measureIntervals(intervals),
    positionMs: intervals.at(-1)?.[1] ?? 0,
    state: isDone ? 'done' : 'under-way',
    doneAt: isDone ? on : null,
    updatedAt: on,
  })
}

/** Adds the attempts at the stops of a lesson; answers with the keys of those that are solved. */
function addAnswers(
  rows: ProgressRows,
  watched: WatchedLessonSeed,
  lesson: InsertedLesson,
  learner: Learner,
): Set<string> {
  const answered: AnsweredStop[] =
    watched.stops === 'all'
      ? [...lesson.stops.keys()].map((stop) => ({ stop, solved: true }))
      : watched.stops
  let at = new Date(watched.on).getTime() - firstAnswerBeforeMs
  for (const one of answered) {
    const stop = lesson.stops.get(one.stop)
    if (!stop) throw new Error(`${watched.lesson} has no stop ${one.stop}`)
    at = addAnsweredStop(rows, one, stop, { watched, learner, at })
  }
  return new Set(answered.filter(({ solved }) => solved).map(({ stop }) => stop))
}

interface Answering {
  watched: WatchedLessonSeed
  learner: Learner
  /** When the first answer was handed in. */
  at: number
}

/** Returns when the next stop may be answered. */
function addAnsweredStop(
  rows: ProgressRows,
  { stop: stopKey, wrong = [], solved }: AnsweredStop,
  stop: InsertedStop,
  { watched, learner, at }: Answering,
): number {
  const { exercise, exerciseId } = stop
  if (!exercise || exerciseId === null) throw new Error(`${stopKey} has no exercise`)
  const { userId, courseId, units } = learner
  const lessonKey = watched.lesson
  const seed = seedOf(learner.name, lessonKey, stopKey)
  const answers: Answer[] = wrong.map((way) => wrongAnswer(exercise, seed, units, way))
  if (solved) answers.push(rightAnswer(exercise, seed, units))
  const timeOf = (index: number) => new Date(at + index * answerEveryMs)
  rows.attempts.push(
    ...answers.map((answer, index) => {
      const verdict = gradeExercise(exercise, answer, seed)
      const { outcome, slip } = verdict
      const slipId = slip?.id ?? null
      const place = { userId, exerciseId, tryNumber: index + 1, createdAt: timeOf(index) }
      return { ...place, answer, verdict, outcome, slipId }
    }),
  )
  rows.stopStates.push({
    userId,
    courseId,
    lessonKey,
    stopKey,
    seed,
    triesUsed: answers.length,
    solvedAt: solved ? timeOf(answers.length - 1) : null,
  })
  if (watched.inFieldBook && solved && exercise.kind === 'calculator') {
    const { calculator, outputs } = workedOut(exercise, seed, units)
    rows.fieldBookEntries.push({
      buildId: learner.buildId,
      lessonKey,
      stopKey,
      atMs: stop.atMs,
      calculator: calculator.id,
      calculatorVersion: calculator.version,
      inputs: textsOf(exercise, seed, units),
      outputs: onlyKnown(outputs),
      createdAt: timeOf(answers.length - 0.5),
    })
  }
  return timeOf(answers.length).getTime()
}

const onlyKnown = (outputs: ReturnType<typeof workedOut>['outputs']) =>
  Object.fromEntries(
    Object.entries(outputs).flatMap(([name, value]) =>
      value === undefined ? [] : [[name, value] as const],
    ),
  )
