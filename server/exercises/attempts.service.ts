import type {
  Answer,
  Exercise,
  GradedAttempt,
  StopState,
  UnitSystem,
  Verdict,
} from '../../shared/contracts/exercises'
import { toLearnerExercise } from '../../shared/grading'
import type { Actor } from '../../shared/contracts/policies'
import { answerOnce, checkKey } from '../accounts/idempotency.service'
import { recordKeeper, type LessonAccess } from '../courses/access.service'
import { notFound } from '../errors'
import {
  findLessonDurationMs,
  openProgress,
  settleLesson,
} from '../progress/lessonProgress.service'
import { findLastAttempt, findStopExercise, insertAttempt } from './attempts.queries'
import { checkAnswer } from './checkAnswer'
import { gradeAnswer, showAnswer } from './ownCalculatorTasks.service'
import { answerRemembered, openRemembered, type RememberedStops } from './rememberedStops'
import { openStopState, sessionNameOf } from './stopStates.service'
import { lockStopState, updateStopState } from './stopStates.queries'

/** Who stands at which stop, and how the server remembers it. */
export interface AtStop {
  access: LessonAccess
  stopKey: string
  actor: (Actor & { units: UnitSystem }) | null
  /** Units of the numbers in the answer; the person's own when left out. */
  units?: UnitSystem | undefined
  remembered: RememberedStops
}

interface Standing {
  seed: number
  triesUsed: number
  solved: boolean
}
interface LastAttempt {
  answer: Answer
  verdict: Verdict
}

async function findExercise({ access, stopKey }: AtStop) {
  const found = await findStopExercise(access.lesson.id, stopKey)
  if (!found) throw notFound('stop')
  return found
}

/** The right answer is in it only once the stop is solved or its tries are used. */
async function present(
  stopKey: string,
  exercise: Exercise,
  { seed, triesUsed, solved }: Standing,
  last: LastAttempt | null,
  units: UnitSystem,
): Promise<StopState> {
  const isOutOfTries = exercise.tries !== null && triesUsed >= exercise.tries
  return {
    stopKey,
    solved,
    triesUsed,
    exercise: toLearnerExercise(exercise, seed, triesUsed, solved, units),
    lastAnswer: last?.answer ?? null,
    lastVerdict: last?.verdict ?? null,
    shownAnswer:
      solved || isOutOfTries ? await showAnswer(exercise, seed, last?.answer ?? null) : null,
  }
}

const unitsOf = ({ units, actor }: AtStop): UnitSystem => units ?? actor?.units ?? 'metric'

const personAt = ({ access, stopKey }: AtStop, userId: number) => ({
  userId,
  courseId: access.course.id,
  lessonKey: access.lesson.key,
  stopKey,
})

/** How one person stands at a stop; their first look draws their numbers. */
export async function describeStop(at: AtStop): Promise<StopState> {
  const { exerciseId, exercise } = await findExercise(at)
  const userId = recordKeeper(at.access, at.actor)
  if (userId === null) {
    const state = openRemembered(at.remembered, sessionNameOf(at.access, at.stopKey))
    return present(at.stopKey, exercise, state, null, unitsOf(at))
  }
  const [row, last] = await Promise.all([
    openStopState(personAt(at, userId)),
    findLastAttempt(userId, exerciseId),
  ])
  return present(at.stopKey, exercise, { ...row, solved: row.solvedAt !== null }, last, unitsOf(at))
}

/** The standing after one more verdict: `unread` costs no try, and what is solved stays solved. */
function moveOn(before: Standing, { outcome }: Verdict, tries: number | null): Standing {
  if (outcome === 'unread' || before.solved) return before
  const used = before.triesUsed + 1
  return {
    ...before,
    triesUsed: tries === null ? used : Math.min(used, Math.max(tries, before.triesUsed)),
    solved: outcome === 'right',
  }
}

/**
 * Grades an answer and keeps it; the same key again gives the same verdict and costs nothing.
 * 400 for an answer of the other kind of exercise, or without a key.
 */
export async function answerStop(
  at: AtStop,
  answer: Answer,
  key: string | undefined,
): Promise<GradedAttempt> {
  const { exerciseId, exercise } = await findExercise(at)
  checkAnswer(exercise, answer)
  const units = answer.kind === 'calculator' ? answer.units : unitsOf(at)
  const grade = async (before: Standing, costsTry = true) => {
    const verdict = await gradeAnswer(exercise, answer, before.seed)
    const after = costsTry ? moveOn(before, verdict, exercise.tries) : before
    const state = await present(at.stopKey, exercise, after, { answer, verdict }, units)
    return { after, graded: { verdict, state } }
  }
  const userId = recordKeeper(at.access, at.actor)
  if (userId === null) {
    const name = sessionNameOf(at.access, at.stopKey)
    return answerRemembered(at.remembered, name, key === undefined ? key : checkKey(key), grade)
  }

  const person = personAt(at, userId)
  const durationMs = await findLessonDurationMs(at.access)
  await openStopState(person)
  await openProgress(person)
  const route = `POST stops/${person.courseId}/${person.lessonKey}/${at.stopKey}/attempts`
  const { response } = await answerOnce({ userId, route, key, payload: answer }, async (tx) => {
    const row = await lockStopState(person, tx)
    const { after, graded } = await grade({ ...row, solved: row.solvedAt !== null })
    const { verdict } = graded
    await insertAttempt(
      {
        userId,
        exerciseId,
        tryNumber: after.triesUsed,
        answer,
        verdict,
        outcome: verdict.outcome,
        slipId: verdict.slip?.id ?? null,
      },
      tx,
    )
    const solvedAt = after.solved ? (row.solvedAt ?? new Date()) : null
    await updateStopState(row.id, { triesUsed: after.triesUsed, solvedAt }, tx)
    if (after.solved && row.solvedAt === null) {
      await settleLesson({ ...at.access, durationMs }, userId, tx)
    }
    return { status: 201, response: graded }
  })
  return response
}
