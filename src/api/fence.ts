import type { z } from 'zod'
import {
  catchUpSchema,
  lessonThreadsSchema,
  questionRowSchema,
  threadSchema,
  type ChangeAnswer,
  type ChangeQuestion,
  type CreateAnswer,
  type CreateQuestion,
} from '../../shared/contracts/fence'
import { pageOf } from '../../shared/contracts/pagination'
import type { Room } from '../../shared/contracts/socketEvents'
import { queryString, request, requestNothing } from './client'

const roomPath = ({ courseSlug, lessonKey }: Room) => `/courses/${courseSlug}/lessons/${lessonKey}`
const questionPageSchema = pageOf(questionRowSchema)
export type QuestionPage = z.infer<typeof questionPageSchema>

/** How the questions of a course are chosen and ordered. */
export interface QuestionFilter {
  state: 'all' | 'open' | 'unanswered' | 'settled' | 'mine'
  order: 'newest' | 'moment'
  /** A stage's key, empty for any. */
  stage: string
  words: string
}

export const fetchLessonThreads = (room: Room, cursor: string | null = null) =>
  request(lessonThreadsSchema, `${roomPath(room)}/questions${queryString({ cursor, limit: 50 })}`)

export const fetchMissed = (room: Room, after: number) =>
  request(catchUpSchema, `${roomPath(room)}/events${queryString({ after })}`)

export const fetchThread = (questionId: number) => request(threadSchema, `/questions/${questionId}`)

export const fetchQuestions = (
  slug: string,
  filter: QuestionFilter,
  cursor: string | null = null,
) => request(questionPageSchema, `/courses/${slug}/questions${queryString({ ...filter, cursor })}`)

export const postQuestion = (room: Room, body: CreateQuestion, idempotencyKey: string) =>
  request(threadSchema, `${roomPath(room)}/questions`, { method: 'POST', body, idempotencyKey })

export const postAnswer = (questionId: number, body: CreateAnswer, idempotencyKey: string) =>
  request(threadSchema, `/questions/${questionId}/answers`, {
    method: 'POST',
    body,
    idempotencyKey,
  })

export const changeQuestion = (questionId: number, body: ChangeQuestion) =>
  request(threadSchema, `/questions/${questionId}`, { method: 'PATCH', body })
export const changeAnswer = (answerId: number, body: ChangeAnswer) =>
  request(threadSchema, `/answers/${answerId}`, { method: 'PATCH', body })
export const deleteQuestion = (questionId: number) =>
  requestNothing(`/questions/${questionId}`, { method: 'DELETE' })
export const deleteAnswer = (answerId: number) =>
  request(threadSchema, `/answers/${answerId}`, { method: 'DELETE' })
export const settleQuestion = (questionId: number, answerId: number) =>
  request(threadSchema, `/questions/${questionId}/settlement`, {
    method: 'PUT',
    body: { answerId },
  })
export const unsettleQuestion = (questionId: number) =>
  request(threadSchema, `/questions/${questionId}/settlement`, { method: 'DELETE' })
