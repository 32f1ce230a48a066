import type { FenceEvent, Thread } from '../../shared/contracts/fence'
import type { Actor } from '../../shared/contracts/policies'
import { answerOnce } from '../accounts/idempotency.service'
import type { Transaction } from '../db/client'
import { inTransaction } from '../db/transaction'
import { conflict, invalid, notFound } from '../errors'
import { findAnswer } from './answers.queries'
import { renderMarkdown } from './markdown'
import { findShownQuestion, type QuestionRecord } from './questions.queries'
import { tellRoomChanged } from './roomChanges.service'
import { accessRoom, type RoomAccess } from './rooms.service'
import { readThreadAsItStands } from './threads.service'

/** Bytes that a text column holds, with some to spare. */
const htmlLimitBytes = 60_000

/** A question or answer as one person stands to it; `thing.isAuthor` is of the post. */
export interface PostAccess extends RoomAccess {
  roomId: number
  questionId: number
}
export interface AnswerAccess extends PostAccess {
  answerId: number
}

const postAccess = (room: RoomAccess, { question }: QuestionRecord): PostAccess => ({
  ...room,
  roomId: question.roomId,
  questionId: question.id,
})

const isWriter = (actor: Actor | null, authorId: number | null) =>
  actor !== null && authorId === actor.id

/** How `actor` stands to a question; 404 when there is none that may be shown. */
export async function accessQuestion(questionId: number, actor: Actor | null): Promise<PostAccess> {
  const record = await findShownQuestion(questionId)
  if (!record) throw notFound('question')
  const room = await accessRoom({ slug: record.courseSlug, lessonKey: record.lessonKey }, actor)
  const isAuthor = isWriter(actor, record.question.authorId)
  return { ...postAccess(room, record), thing: { ...room.thing, isAuthor } }
}

/** How `actor` stands to an answer; 404 when it or its question may not be shown. */
export async function accessAnswer(answerId: number, actor: Actor | null): Promise<AnswerAccess> {
  const answer = await findAnswer(answerId)
  if (!answer) throw notFound('answer')
  const access = await accessQuestion(answer.questionId, actor)
  const isAuthor = isWriter(actor, answer.authorId)
  return { ...access, answerId, thing: { ...access.thing, isAuthor } }
}

/** The question inside a transaction that holds its room; 404 when it was deleted meanwhile. */
export async function questionForChange(questionId: number, tx: Transaction) {
  const record = await findShownQuestion(questionId, tx)
  if (!record) throw notFound('question')
  return record.question
}

/** The answer inside a transaction that holds its room; 404 when it was deleted meanwhile. */
export async function answerForChange(answerId: number, tx: Transaction) {
  const answer = await findAnswer(answerId, tx)
  if (!answer) throw notFound('answer')
  return answer
}

/** 409 with the thread as it stands when a change was made from an older version. */
export async function assertVersion(
  row: { version: number },
  version: number,
  { questionId }: PostAccess,
  asOf: number,
  tx: Transaction,
) {
  if (row.version === version) return
  throw conflict(
    'stale-version',
    'This was changed meanwhile. Compare, then save again.',
    await readThreadAsItStands(questionId, asOf, tx),
  )
}

/** A post's two texts: as written, and as readers see it; 400 when its formatting grows too large. */
export function textsOf(markdown: string) {
  const html = renderMarkdown(markdown)
  if (Buffer.byteLength(html) > htmlLimitBytes) {
    throw invalid([
      { field: 'markdown', message: 'So many links or signs do not fit. Write it in two parts.' },
    ])
  }
  return { markdown, html }
}

/** Does a change in a transaction of its own, then tells the room of it. */
export async function changeOnce(
  room: RoomAccess,
  work: (tx: Transaction) => Promise<FenceEvent>,
): Promise<Thread> {
  const event = await inTransaction(work)
  tellRoomChanged({ ...room, event })
  return event.thread
}

/** A write that a client may repeat. */
export interface Repeatable {
  actor: Actor
  /** The Idempotency-Key header. */
  key: string | undefined
}

/** Does a post once for its key, and tells the room of it when this request did it. */
export async function postOnce(
  { actor, key }: Repeatable,
  { room, route, payload }: { room: RoomAccess; route: string; payload: unknown },
  work: (tx: Transaction) => Promise<FenceEvent>,
): Promise<Thread> {
  const given = await answerOnce({ userId: actor.id, route, key, payload }, async (tx) => ({
    status: 201,
    response: await work(tx),
  }))
  if (given.isFirst) tellRoomChanged({ ...room, event: given.response })
  return given.response.thread
}
