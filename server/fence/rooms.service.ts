import type { CatchUp } from '../../shared/contracts/fence'
import type { Actor, Thing } from '../../shared/contracts/policies'
import { findSignedIn, isSessionTooOld, type SignedIn } from '../accounts/accounts.service'
import { accessLesson } from '../courses/access.service'
import { inTransaction } from '../db/transaction'
import { findQuestions } from './questions.queries'
import { findRoom, insertRoom, listRoomEvents } from './rooms.queries'
import { presentThreads } from './threads.service'

/** As many missed changes as a reader is sent; who missed more reads the threads anew. */
const catchUpLimit = 200

/** A lesson's room as one person stands to it. */
export interface RoomAccess {
  courseId: number
  courseSlug: string
  lessonKey: string
  thing: Thing
}

/** How `actor` stands to the room of a lesson they can name; 404 when there is none. */
export async function accessRoom(
  which: { slug: string; lessonKey: string },
  actor: Actor | null,
): Promise<RoomAccess> {
  const { course, lesson, thing } = await accessLesson(which, actor)
  return { courseId: course.id, courseSlug: course.slug, lessonKey: lesson.key, thing }
}

/** The id of a lesson's room, which is opened when it is not there yet. */
export async function openRoom({ courseId, lessonKey }: RoomAccess): Promise<number> {
  const known = await findRoom(courseId, lessonKey)
  if (known) return known.id
  await insertRoom(courseId, lessonKey)
  const room = await findRoom(courseId, lessonKey)
  if (!room) throw new Error('the room was not opened')
  return room.id
}

/** What followed a number in a room, with the threads as they stand now. */
export async function catchUpRoom(
  { courseId, lessonKey }: RoomAccess,
  after: number,
): Promise<CatchUp> {
  return inTransaction(async (tx) => {
    const room = await findRoom(courseId, lessonKey, tx)
    const lastNumber = room?.lastNumber ?? 0
    const missed = lastNumber - after
    if (!room || missed === 0) return { lastNumber, isComplete: missed === 0, events: [] }
    if (missed < 0 || missed > catchUpLimit) return { lastNumber, isComplete: false, events: [] }
    const events = await listRoomEvents(room.id, after, catchUpLimit, tx)
    const ids = [...new Set(events.map((event) => event.questionId))]
    const threads = await presentThreads(await findQuestions(ids, tx), lastNumber, tx)
    const byId = new Map(threads.map((thread) => [thread.id, thread]))
    const sent = events.flatMap(({ number, kind, questionId }) => {
      const thread = byId.get(questionId)
      return thread ? [{ number, kind, thread }] : []
    })
    return { lastNumber, isComplete: sent.length === missed, events: sent }
  })
}

/** The person behind a live connection as the database knows them now; null once their session is over. */
export async function findReader(session: {
  userId?: number
  signedInAt?: number
}): Promise<SignedIn | null> {
  if (session.userId === undefined || isSessionTooOld(session.signedInAt)) return null
  return findSignedIn(session.userId)
}
