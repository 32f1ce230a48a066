import type { FenceAnswer, Question, Thread, Writer } from '../../shared/contracts/fence'
import type { Executor } from '../db/client'
import { listAnswers, type AnswerRecord } from './answers.queries'
import { findQuestions, type QuestionRecord } from './questions.queries'

const formerMember = 'a former member'

function presentWriter(
  id: number | null,
  name: string | null,
  place: Writer['place'] | null,
): Writer {
  return { id, name: name ?? formerMember, place: place ?? 'learner' }
}

/** A question as readers see it; of a deleted or hidden one nothing is left but its id and place. */
export function presentQuestion(record: QuestionRecord): Question {
  const { question } = record
  const isDeleted = question.deletedAt !== null || question.state === 'hidden'
  const shown = {
    id: question.id,
    courseSlug: record.courseSlug,
    lessonKey: record.lessonKey,
    atMs: question.atMs,
    createdAt: question.createdAt.toISOString(),
    version: question.version,
    isDeleted,
  }
  if (isDeleted) {
    return {
      ...shown,
      ...{ title: '', markdown: '', html: '', answerCount: 0, editedAt: null },
      ...{ state: question.state, settledAnswerId: null, settledBy: null },
      writer: presentWriter(null, null, null),
    }
  }
  const isSettled = question.state === 'settled'
  return {
    ...shown,
    title: question.title,
    writer: presentWriter(question.authorId, record.authorName, record.authorStaffRole),
    markdown: question.markdown,
    html: question.html,
    state: question.state,
    settledAnswerId: question.settledAnswerId,
    settledBy: isSettled ? (record.settlerName ?? formerMember) : null,
    answerCount: record.answerCount,
    editedAt: question.editedAt?.toISOString() ?? null,
  }
}

function presentAnswer({ answer, authorName, authorStaffRole }: AnswerRecord): FenceAnswer {
  return {
    id: answer.id,
    questionId: answer.questionId,
    writer: presentWriter(answer.authorId, authorName, authorStaffRole),
    markdown: answer.markdown,
    html: answer.html,
    createdAt: answer.createdAt.toISOString(),
    editedAt: answer.editedAt?.toISOString() ?? null,
    version: answer.version,
  }
}

/**
 * The threads of these questions in their order, each with the settled answer first.
 * Read questions, answers and `asOf` in one transaction, so that they fit each other.
 */
export async function presentThreads(
  records: QuestionRecord[],
  asOf: number,
  on: Executor,
): Promise<Thread[]> {
  const shown = records.map(presentQuestion)
  const ids = shown.filter((question) => !question.isDeleted).map((question) => question.id)
  const answers = (await listAnswers(ids, on)).map(presentAnswer)
  return shown.map((question) => {
    const own = answers.filter((answer) => answer.questionId === question.id)
    const isSettledOne = (answer: FenceAnswer) => answer.id === question.settledAnswerId
    return {
      ...question,
      answers: [...own.filter(isSettledOne), ...own.filter((answer) => !isSettledOne(answer))],
      asOf,
    }
  })
}

/** One thread as it stands, deleted or not. */
export async function readThreadAsItStands(questionId: number, asOf: number, on: Executor) {
  const [thread] = await presentThreads(await findQuestions([questionId], on), asOf, on)
  if (!thread) throw new Error('the question is gone')
  return thread
}
