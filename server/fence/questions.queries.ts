import {
  and,
  asc,
  desc,
  eq,
  exists,
  gt,
  inArray,
  isNull,
  like,
  lt,
  ne,
  not,
  or,
  sql,
  type SQL,
} from 'drizzle-orm'
import { alias } from 'drizzle-orm/mysql-core'
import type { QuestionsQuery } from '../../shared/contracts/fence'
import { db, type Executor, type Transaction } from '../db/client'
import { answers, courseStaff, courses, fenceRooms, questions, users } from '../db/schema'

const author = alias(users, 'author')
const settler = alias(users, 'settler')
const answerCount = sql<number>`(select count(*) from ${answers} where ${answers.questionId} = ${questions.id} and ${answers.deletedAt} is null)`

const selectQuestions = (on: Executor) =>
  on
    .select({
      question: questions,
      courseId: fenceRooms.courseId,
      courseSlug: courses.slug,
      lessonKey: fenceRooms.lessonKey,
      authorName: author.displayName,
      authorStaffRole: courseStaff.role,
      settlerName: settler.displayName,
      answerCount: answerCount.mapWith(Number),
    })
    .from(questions)
    .innerJoin(fenceRooms, eq(fenceRooms.id, questions.roomId))
    .innerJoin(courses, eq(courses.id, fenceRooms.courseId))
    .leftJoin(author, eq(author.id, questions.authorId))
    .leftJoin(
      courseStaff,
      and(
        eq(courseStaff.courseId, fenceRooms.courseId),
        eq(courseStaff.userId, questions.authorId),
      ),
    )
    .leftJoin(settler, eq(settler.id, questions.settledById))

export type QuestionRecord = Awaited<ReturnType<typeof findQuestions>>[number]

const isShown = and(isNull(questions.deletedAt), ne(questions.state, 'hidden'))

/** Questions by id, deleted ones among them, in no order. */
export async function findQuestions(ids: number[], on: Executor = db) {
  return ids.length ? selectQuestions(on).where(inArray(questions.id, ids)) : []
}

/** A question that may be shown, or null. */
export async function findShownQuestion(id: number, on: Executor = db) {
  const [row] = await selectQuestions(on).where(and(eq(questions.id, id), isShown))
  return row ?? null
}

/** The questions of a room by moment, those about the whole lesson last. */
export async function listRoomQuestions(
  roomId: number,
  after: { atMs: number | null; id: number } | null,
  limit: number,
  on: Executor,
) {
  return selectQuestions(on)
    .where(and(eq(questions.roomId, roomId), isShown, after ? afterMoment(after) : undefined))
    .orderBy(asc(isNull(questions.atMs)), asc(questions.atMs), asc(questions.id))
    .limit(limit)
}

function afterMoment({ atMs, id }: { atMs: number | null; id: number }): SQL | undefined {
  const laterWithoutMoment = and(isNull(questions.atMs), gt(questions.id, id))
  if (atMs === null) return laterWithoutMoment
  return or(
    gt(questions.atMs, atMs),
    and(eq(questions.atMs, atMs), gt(questions.id, id)),
    isNull(questions.atMs),
  )
}

const hasAnswer = exists(
  db
    .select({ one: sql`1` })
    .from(answers)
    .where(and(eq(answers.questionId, questions.id), isNull(answers.deletedAt))),
)

function inState(state: QuestionsQuery['state'], readerId: number | null): SQL | undefined {
  if (state === 'open') return eq(questions.state, 'open')
  if (state === 'unanswered') return and(eq(questions.state, 'open'), not(hasAnswer))
  if (state === 'settled') return eq(questions.state, 'settled')
  if (state === 'mine') return eq(questions.authorId, readerId ?? 0)
  return undefined
}

function withWords(words: string | undefined): SQL | undefined {
  if (!words) return undefined
  const pattern = `%${words.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`
  return or(like(questions.title, pattern), like(questions.markdown, pattern))
}

interface CourseList {
  courseId: number
  /** The lessons whose questions are listed, in the order of the course. */
  lessonKeys: string[]
  state: QuestionsQuery['state']
  order: QuestionsQuery['order']
  words: string | undefined
  readerId: number | null
  after: { lessonKey: string; atMs: number | null; id: number } | null
  limit: number
}

/** Questions over several lessons of a course, the newest first or by their place in the course. */
export async function listCourseQuestions(list: CourseList) {
  const { courseId, lessonKeys, order, after } = list
  if (!lessonKeys.length) return []
  const lessonPlace = sql`field(${fenceRooms.lessonKey}, ${sql.join(
    lessonKeys.map((key) => sql`${key}`),
    sql`, `,
  )})`
  const follows =
    after &&
    (order === 'newest'
      ? lt(questions.id, after.id)
      : or(
          sql`${lessonPlace} > ${lessonKeys.indexOf(after.lessonKey) + 1}`,
          and(eq(fenceRooms.lessonKey, after.lessonKey), afterMoment(after)),
        ))
  const inOrder =
    order === 'newest'
      ? [desc(questions.id)]
      : [asc(lessonPlace), asc(isNull(questions.atMs)), asc(questions.atMs), asc(questions.id)]
  return selectQuestions(db)
    .where(
      and(
        eq(fenceRooms.courseId, courseId),
        inArray(fenceRooms.lessonKey, lessonKeys),
        isShown,
        inState(list.state, list.readerId),
        withWords(list.words),
        follows ?? undefined,
      ),
    )
    .orderBy(...inOrder)
    .limit(list.limit)
}

/** Adds a question and returns its id. */
export async function insertQuestion(values: typeof questions.$inferInsert, tx: Transaction) {
  const [row] = await tx.insert(questions).values(values).$returningId()
  if (!row) throw new Error('insert returned no id')
  return row.id
}

/** Changes some columns of a question. */
export async function updateQuestion(
  id: number,
  values: Partial<typeof questions.$inferInsert>,
  tx: Transaction,
) {
  await tx.update(questions).set(values).where(eq(questions.id, id))
}
