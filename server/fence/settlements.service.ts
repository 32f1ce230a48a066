import type { Thread } from '../../shared/contracts/fence'
import type { Actor } from '../../shared/contracts/policies'
import { invalid } from '../errors'
import { findAnswer } from './answers.queries'
import { changeOnce, questionForChange, type PostAccess } from './posts.service'
import { updateQuestion } from './questions.queries'
import { readThread } from './questions.service'
import { changeRoom } from './roomChanges.service'

/** What a question without a settled answer holds. */
export const openAgain = { state: 'open', settledAnswerId: null, settledById: null } as const

/** Accepts one answer as the one that settles the question. */
export async function settleQuestion(
  access: PostAccess,
  actor: Actor,
  answerId: number,
): Promise<Thread> {
  const { questionId, roomId } = access
  if ((await readThread(access)).settledAnswerId === answerId) return readThread(access)
  return changeOnce(access, (tx) =>
    changeRoom(roomId, 'settled', tx, async () => {
      await questionForChange(questionId, tx)
      const answer = await findAnswer(answerId, tx)
      if (answer?.questionId !== questionId) {
        throw invalid([
          { field: 'answerId', message: 'Choose one of the answers to this question.' },
        ])
      }
      const values = { state: 'settled', settledAnswerId: answerId, settledById: actor.id } as const
      await updateQuestion(questionId, values, tx)
      return questionId
    }),
  )
}

/** Opens a settled question again. */
export async function unsettleQuestion(access: PostAccess): Promise<Thread> {
  const { questionId, roomId } = access
  const thread = await readThread(access)
  if (thread.state !== 'settled') return thread
  return changeOnce(access, (tx) =>
    changeRoom(roomId, 'unsettled', tx, async () => {
      await questionForChange(questionId, tx)
      await updateQuestion(questionId, openAgain, tx)
      return questionId
    }),
  )
}
