import type { BenchStop, ChangeStop, CreateStop } from '../../shared/contracts/benchCourses'
import type { Exercise } from '../../shared/contracts/exercises'
import type { Actor } from '../../shared/contracts/policies'
import { accessBenchRow } from '../courses/access.service'
import { changeDraft, staleVersion, withCurrent } from '../courses/drafts.service'
import { makeStableKey } from '../courses/stableKeys.service'
import type { Executor, Transaction } from '../db/client'
import { isDuplicate } from '../db/transaction'
import { conflict, invalid, notFound } from '../errors'
import { attachOwn } from './ownCalculatorAttaching.service'
import {
  deleteExercise,
  deleteStop,
  findStop,
  findVideoDuration,
  insertStop,
  listStops,
  saveExercise,
  updateStop,
} from './benchStops.queries'

const mostStops = 60

/** How a person stands to the course behind a lesson or a stop of the bench. */
export const accessStops = (
  which: { lessonId: number } | { stopId: number },
  actor: Actor | null,
) => accessBenchRow(which, actor)

/** The stops of each of these lessons by time, with their exercises as staff see them. */
export const listStopsOf = (
  lessonIds: number[],
  on?: Executor,
): Promise<Map<number, BenchStop[]>> => listStops(lessonIds, on)

/** A moment as `2:05.5`. */
function showMoment(ms: number): string {
  const seconds = (ms % 60_000) / 1000
  const text = Number.isInteger(seconds) ? String(seconds) : seconds.toFixed(1)
  return `${Math.floor(ms / 60_000)}:${seconds < 10 ? '0' : ''}${text}`
}

async function checkMoment(lessonId: number, atMs: number, tx: Transaction) {
  const durationMs = await findVideoDuration(lessonId, tx)
  if (durationMs === null || atMs <= durationMs) return
  throw invalid([
    {
      field: 'atMs',
      message: `The video ends at ${showMoment(durationMs)}. Put the stop before that.`,
    },
  ])
}

const momentTaken = (atMs: number) =>
  conflict(
    'moment-taken',
    `There is a stop at ${showMoment(atMs)} already. Put this one a second earlier or later.`,
  )

async function onFreeMoment<T>(atMs: number, write: Promise<T>): Promise<T> {
  try {
    return await write
  } catch (error) {
    throw isDuplicate(error) ? momentTaken(atMs) : error
  }
}

async function describeStop(stopId: number, on?: Executor): Promise<BenchStop> {
  const row = await findStop(stopId, on)
  const all = row && (await listStops([row.lessonId], on)).get(row.lessonId)
  const stop = all?.find(({ id }) => id === stopId)
  if (!stop) throw notFound('stop')
  return stop
}

/** Sets a stop on the tape of a draft lesson; 409 when its moment is taken. */
export const addStop = (
  lessonId: number,
  revisionId: number,
  input: CreateStop,
): Promise<BenchStop> =>
  changeDraft(revisionId, async (tx) => {
    const others = (await listStops([lessonId], tx)).get(lessonId) ?? []
    if (others.length >= mostStops) {
      throw conflict('too-many', `A lesson has at most ${mostStops} stops.`)
    }
    await checkMoment(lessonId, input.atMs, tx)
    const values = { ...input, lessonId, key: makeStableKey(input.name) }
    return describeStop(await onFreeMoment(input.atMs, insertStop(values, tx)), tx)
  })

function checkQuestionKeys(exercise: Exercise) {
  if (exercise.kind !== 'quiz') return
  const keys = exercise.questions.map(({ key }) => key)
  const repeated = keys.findIndex((key, index) => keys.indexOf(key) < index)
  if (repeated < 0) return
  throw invalid([
    {
      field: `exercise.questions.${repeated}.key`,
      message: 'Another question of this quiz has this key. Each needs one of its own.',
    },
  ])
}

async function changeExercise(
  stop: { id: number; name: string },
  courseId: number,
  exercise: Exercise | null | undefined,
  tx: Transaction,
) {
  if (exercise === undefined) return
  if (exercise === null) return deleteExercise(stop.id, tx)
  checkQuestionKeys(exercise)
  const whole = await attachOwn(exercise, courseId, tx)
  await saveExercise(stop.id, whole, makeStableKey(stop.name), tx)
}

/** Changes a stop or its exercise; 409 with the stop as it is now when someone else was first. */
export const changeStop = (
  stopId: number,
  revisionId: number,
  { version, exercise, ...values }: ChangeStop,
): Promise<BenchStop> => {
  const save = changeDraft(revisionId, async (tx, { courseId }) => {
    const stop = await findStop(stopId, tx)
    if (!stop) throw notFound('stop')
    if (stop.version !== version) throw staleVersion('stop')
    const atMs = values.atMs ?? stop.atMs
    if (atMs !== stop.atMs) await checkMoment(stop.lessonId, atMs, tx)
    await onFreeMoment(atMs, updateStop(stopId, { ...values, version: version + 1 }, tx))
    await changeExercise(stop, courseId, exercise, tx)
    return describeStop(stopId, tx)
  })
  return withCurrent(save, () => describeStop(stopId))
}

/** Takes a stop off the tape. */
export const removeStop = (stopId: number, revisionId: number) =>
  changeDraft(revisionId, (tx) => deleteStop(stopId, tx))
