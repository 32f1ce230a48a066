import {
  answersLimit,
  type ChangeAnswer,
  type CreateAnswer,
  type Thread,
} from '../../shared/contracts/fence'
import { conflict } from '../errors'
import { countAnswers, insertAnswer, updateAnswer } from './answers.queries'
import {
  answerForChange,
  assertVersion,
  changeOnce,
  postOnce,
  questionForChange,
  textsOf,
  type AnswerAccess,
  type PostAccess,
  type Repeatable,
} from './posts.service'
import { updateQuestion } from './questions.queries'
import { changeRoom } from './roomChanges.service'
import { openAgain } from './settlements.service'

/** Answers a question, once for the repeatable's key. */
export async function answerQuestion(
  access: PostAccess,
  repeatable: Repeatable,
  input: CreateAnswer,
): Promise<Thread> {
  const { questionId, roomId } = access
  const texts = textsOf(input.markdown)
  const route = `POST questions/${questionId}/answers`
  return postOnce(repeatable, { room: access, route, payload: input }, (tx) =>
    changeRoom(roomId, 'answered', tx, async () => {
      await questionForChange(questionId, tx)
      if ((await countAnswers(questionId, tx)) >= answersLimit) {
        throw conflict('thread-full', 'This question has all the answers it can take. Ask anew.')
      }
      await insertAnswer({ questionId, authorId: repeatable.actor.id, ...texts }, tx)
      return questionId
    }),
  )
}

/** Changes one's own answer; 409 with the thread when it was changed meanwhile. */
export async function changeAnswer(access: AnswerAccess, input: ChangeAnswer): Promise<Thread> {
  const { answerId, questionId, roomId } = access
  const texts = textsOf(input.markdown)
  return changeOnce(access, (tx) =>
    changeRoom(roomId, 'edited', tx, async (number) => {
      await questionForChange(questionId, tx)
      const answer = await answerForChange(answerId, tx)
      await assertVersion(answer, input.version, access, number - 1, tx)
      const values = { ...texts, version: answer.version + 1, editedAt: new Date() }
      await updateAnswer(answerId, values, tx)
      return questionId
    }),
  )
}

/** Takes an answer away; when it was the settled one, the question is open again. */
export async function deleteAnswer(access: AnswerAccess): Promise<Thread> {
  const { answerId, questionId, roomId } = access
  return changeOnce(access, (tx) =>
    changeRoom(roomId, 'deleted', tx, async () => {
      const question = await questionForChange(questionId, tx)
      const answer = await answerForChange(answerId, tx)
      if (question.settledAnswerId === answerId) await updateQuestion(questionId, openAgain, tx)
      const values = { deletedAt: new Date(), version: answer.version + 1 }
      await updateAnswer(answerId, values, tx)
      return questionId
    }),
  )
}
