import type {
  ChangeQuestion,
  CreateQuestion,
  LessonThreads,
  QuestionRow,
  QuestionsQuery,
  Thread,
} from '../../shared/contracts/fence'
import type { Page, PageQuery } from '../../shared/contracts/pagination'
import { can, type Actor } from '../../shared/contracts/policies'
import { accessCourse, revisionFor, type CourseAccess } from '../courses/access.service'
import { inTransaction } from '../db/transaction'
import { notFound } from '../errors'
import { cutPage, decodeCursor } from './cursor'
import {
  assertVersion,
  changeOnce,
  postOnce,
  questionForChange,
  textsOf,
  type PostAccess,
  type Repeatable,
} from './posts.service'
import {
  findShownQuestion,
  insertQuestion,
  listCourseQuestions,
  listRoomQuestions,
  updateQuestion,
} from './questions.queries'
import { changeRoom } from './roomChanges.service'
import { findRoom, listLessonsInOrder } from './rooms.queries'
import { openRoom, type RoomAccess } from './rooms.service'
import { presentQuestion, presentThreads } from './threads.service'

/** A page of a lesson's threads by moment, those about the whole lesson last. */
export async function listThreads(
  access: RoomAccess,
  actor: Actor | null,
  { cursor, limit }: PageQuery,
): Promise<LessonThreads> {
  const place = decodeCursor(cursor)
  const hints = {
    write: can(actor, 'fence:write', access.thing),
    settleAny: can(actor, 'fence:settle', access.thing),
  }
  return inTransaction(async (tx) => {
    const room = await findRoom(access.courseId, access.lessonKey, tx)
    if (!room) return { items: [], nextCursor: null, lastNumber: 0, can: hints }
    const after = place && { atMs: place[1], id: place[2] }
    const records = await listRoomQuestions(room.id, after, limit + 1, tx)
    const page = cutPage(records, limit, ({ question }) => ['', question.atMs, question.id])
    return {
      items: await presentThreads(page.items, room.lastNumber, tx),
      nextCursor: page.nextCursor,
      lastNumber: room.lastNumber,
      can: hints,
    }
  })
}

/** How `actor` stands to the questions of a whole course; 404 when there is no such course. */
export const accessCourseQuestions = (slug: string, actor: Actor | null) =>
  accessCourse({ slug }, actor)

/** A page of the questions of a course that `actor` may read; a visitor gets those of the sample lessons. */
export async function listQuestions(
  access: CourseAccess,
  actor: Actor | null,
  query: QuestionsQuery,
): Promise<Page<QuestionRow>> {
  const place = decodeCursor(query.cursor)
  const revision = await revisionFor(access)
  const lessons = (revision ? await listLessonsInOrder(revision.id) : []).map((lesson, index) => ({
    ...lesson,
    number: index + 1,
  }))
  const read = lessons.filter(
    ({ isSample, stageKey }) =>
      (!query.stage || stageKey === query.stage) &&
      can(actor, 'fence:read', { ...access.thing, isSample }),
  )
  const records = await listCourseQuestions({
    courseId: access.course.id,
    lessonKeys: read.map((lesson) => lesson.key),
    state: query.state,
    order: query.order,
    words: query.words,
    readerId: actor?.id ?? null,
    after: place && { lessonKey: place[0], atMs: place[1], id: place[2] },
    limit: query.limit + 1,
  })
  const page = cutPage(records, query.limit, ({ lessonKey, question }) => [
    lessonKey,
    question.atMs,
    question.id,
  ])
  const byKey = new Map(lessons.map((lesson) => [lesson.key, lesson]))
  return {
    nextCursor: page.nextCursor,
    items: page.items.map((record) => {
      const lesson = byKey.get(record.lessonKey)
      return {
        ...presentQuestion(record),
        lessonTitle: lesson?.title ?? '',
        lessonNumber: lesson?.number ?? 0,
      }
    }),
  }
}

/** A question with its answers as they stand. */
export async function readThread({ courseId, lessonKey, questionId }: PostAccess): Promise<Thread> {
  return inTransaction(async (tx) => {
    const room = await findRoom(courseId, lessonKey, tx)
    const record = await findShownQuestion(questionId, tx)
    const [thread] = await presentThreads(record ? [record] : [], room?.lastNumber ?? 0, tx)
    if (!thread) throw notFound('question')
    return thread
  })
}

/** Asks a question in a lesson's room, once for the repeatable's key. */
export async function askQuestion(
  room: RoomAccess,
  repeatable: Repeatable,
  input: CreateQuestion,
): Promise<Thread> {
  const texts = textsOf(input.markdown)
  const roomId = await openRoom(room)
  const route = `POST rooms/${roomId}/questions`
  return postOnce(repeatable, { room, route, payload: input }, (tx) =>
    changeRoom(roomId, 'asked', tx, () =>
      insertQuestion(
        { roomId, authorId: repeatable.actor.id, atMs: input.atMs, title: input.title, ...texts },
        tx,
      ),
    ),
  )
}

/** Changes one's own question; 409 with the thread when it was changed meanwhile. */
export async function changeQuestion(access: PostAccess, input: ChangeQuestion): Promise<Thread> {
  const texts = textsOf(input.markdown)
  const { questionId, roomId } = access
  return changeOnce(access, (tx) =>
    changeRoom(roomId, 'edited', tx, async (number) => {
      const question = await questionForChange(questionId, tx)
      await assertVersion(question, input.version, access, number - 1, tx)
      const version = question.version + 1
      const values = { title: input.title, ...texts, version, editedAt: new Date() }
      await updateQuestion(questionId, values, tx)
      return questionId
    }),
  )
}

/** Takes a question and its answers away from every reader. */
export async function deleteQuestion(access: PostAccess) {
  const { questionId, roomId } = access
  await changeOnce(access, (tx) =>
    changeRoom(roomId, 'deleted', tx, async () => {
      const question = await questionForChange(questionId, tx)
      const values = { deletedAt: new Date(), version: question.version + 1 }
      await updateQuestion(questionId, values, tx)
      return questionId
    }),
  )
}
