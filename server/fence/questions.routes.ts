import { Router, type Request } from 'express'
import { z } from 'zod'
import { stableKeySchema } from '../../shared/contracts/exercises'
import {
  changeAnswerSchema,
  changeQuestionSchema,
  createAnswerSchema,
  createQuestionSchema,
  eventsQuerySchema,
  questionsQuerySchema,
  settleQuestionSchema,
} from '../../shared/contracts/fence'
import { pageQuerySchema } from '../../shared/contracts/pagination'
import type { Action } from '../../shared/contracts/policies'
import { requireActor } from '../middleware/authenticate'
import { assertCan } from '../middleware/authorize'
import { limitRate } from '../middleware/rateLimit'
import { readBody, readParams, readQuery } from '../middleware/validate'
import { answerQuestion, changeAnswer, deleteAnswer } from './answers.service'
import { accessAnswer, accessQuestion } from './posts.service'
import {
  accessCourseQuestions,
  askQuestion,
  changeQuestion,
  deleteQuestion,
  listQuestions,
  listThreads,
  readThread,
} from './questions.service'
import { accessRoom, catchUpRoom } from './rooms.service'
import { settleQuestion, unsettleQuestion } from './settlements.service'

export const questionsRouter = Router()

const limitPosts = limitRate('fence-posts', 10, 1)
const limitChanges = limitRate('fence-changes', 30, 1)

const slugSchema = z.string().min(1).max(80)
const rowIdSchema = z.coerce.number().int().min(1).max(4_294_967_295)
const courseParams = z.object({ slug: slugSchema })
const lessonParams = z.object({ slug: slugSchema, lessonKey: stableKeySchema })
const questionParams = z.object({ questionId: rowIdSchema })
const answerParams = z.object({ answerId: rowIdSchema })

async function roomOf(request: Request, action: Action) {
  const room = await accessRoom(readParams(request, lessonParams), request.actor)
  assertCan(request.actor, action, room.thing)
  return room
}

async function questionOf(request: Request, action: Action) {
  const { questionId } = readParams(request, questionParams)
  const question = await accessQuestion(questionId, request.actor)
  assertCan(request.actor, action, question.thing)
  return question
}

async function answerOf(request: Request, action: Action) {
  const { answerId } = readParams(request, answerParams)
  const answer = await accessAnswer(answerId, request.actor)
  assertCan(request.actor, action, answer.thing)
  return answer
}

const repeatable = (request: Request) => ({
  actor: requireActor(request),
  key: request.get('Idempotency-Key'),
})

questionsRouter.get('/courses/:slug/questions', async (request, response) => {
  const { slug } = readParams(request, courseParams)
  const course = await accessCourseQuestions(slug, request.actor)
  assertCan(request.actor, 'course:see-sheet', course.thing)
  const query = readQuery(request, questionsQuerySchema)
  response.json(await listQuestions(course, request.actor, query))
})

questionsRouter
  .route('/courses/:slug/lessons/:lessonKey/questions')
  .get(async (request, response) => {
    const room = await roomOf(request, 'fence:read')
    response.json(await listThreads(room, request.actor, readQuery(request, pageQuerySchema)))
  })
  .post(limitPosts, async (request, response) => {
    const room = await roomOf(request, 'fence:write')
    const input = readBody(request, createQuestionSchema)
    response.status(201).json(await askQuestion(room, repeatable(request), input))
  })

questionsRouter.get('/courses/:slug/lessons/:lessonKey/events', async (request, response) => {
  const room = await roomOf(request, 'fence:read')
  const { after } = readQuery(request, eventsQuerySchema)
  response.json(await catchUpRoom(room, after))
})

questionsRouter
  .route('/questions/:questionId')
  .get(async (request, response) => {
    response.json(await readThread(await questionOf(request, 'fence:read')))
  })
  .patch(limitChanges, async (request, response) => {
    const question = await questionOf(request, 'fence:edit-post')
    response.json(await changeQuestion(question, readBody(request, changeQuestionSchema)))
  })
  .delete(limitChanges, async (request, response) => {
    await deleteQuestion(await questionOf(request, 'fence:delete-post'))
    response.status(204).end()
  })

questionsRouter.post('/questions/:questionId/answers', limitPosts, async (request, response) => {
  const question = await questionOf(request, 'fence:write')
  const input = readBody(request, createAnswerSchema)
  response.status(201).json(await answerQuestion(question, repeatable(request), input))
})

questionsRouter
  .route('/questions/:questionId/settlement')
  .put(limitChanges, async (request, response) => {
    const question = await questionOf(request, 'fence:settle')
    const { answerId } = readBody(request, settleQuestionSchema)
    response.json(await settleQuestion(question, requireActor(request), answerId))
  })
  .delete(limitChanges, async (request, response) => {
    response.json(await unsettleQuestion(await questionOf(request, 'fence:settle')))
  })

questionsRouter
  .route('/answers/:answerId')
  .patch(limitChanges, async (request, response) => {
    const answer = await answerOf(request, 'fence:edit-post')
    response.json(await changeAnswer(answer, readBody(request, changeAnswerSchema)))
  })
  .delete(limitChanges, async (request, response) => {
    response.json(await deleteAnswer(await answerOf(request, 'fence:delete-post')))
  })
