import { Router } from 'express'
import { changeAccountSchema, signInSchema, signUpSchema } from '../../shared/contracts/accounts'
import { audit } from '../middleware/audit'
import { authorize } from '../middleware/authorize'
import { requireActor } from '../middleware/authenticate'
import { byAccount, byAddress, limitRate } from '../middleware/rateLimit'
import { endSession, startSession } from '../middleware/session'
import { readBody } from '../middleware/validate'
import { changeAccount, describeMe, openBench, signIn, signUp } from './accounts.service'
import { endAllSessions } from './sessions.service'

export const accountsRouter = Router()

accountsRouter.get('/accounts/me', async (request, response) => {
  response.json({ user: request.actor ? await describeMe(request.actor.id) : null })
})

accountsRouter.post(
  '/accounts',
  audit('sign-up'),
  limitRate('sign-up', 10, 15, byAddress),
  async (request, response) => {
    const userId = await signUp(readBody(request, signUpSchema))
    await startSession(request, userId)
    response.status(201).json({ user: await describeMe(userId) })
  },
)

accountsRouter.patch('/accounts/me', authorize('account:change'), async (request, response) => {
  const { id } = requireActor(request)
  await changeAccount(id, readBody(request, changeAccountSchema))
  response.json({ user: await describeMe(id) })
})

accountsRouter.post(
  '/accounts/me/bench',
  authorize('account:open-bench'),
  async (request, response) => {
    const { id } = requireActor(request)
    await openBench(id)
    response.json({ user: await describeMe(id) })
  },
)

accountsRouter.post(
  '/sessions',
  audit('sign-in'),
  limitRate('sign-in', 20, 15, byAddress),
  limitRate('sign-in-account', 100, 60, byAccount),
  async (request, response) => {
    const userId = await signIn(readBody(request, signInSchema))
    await startSession(request, userId)
    response.status(201).json({ user: await describeMe(userId) })
  },
)

accountsRouter.delete('/sessions/current', audit('sign-out'), async (request, response) => {
  await endSession(request, response)
  response.status(204).end()
})

accountsRouter.delete(
  '/sessions',
  audit('sign-out-everywhere'),
  authorize('account:change'),
  async (request, response) => {
    await endAllSessions(requireActor(request).id)
    await endSession(request, response)
    response.status(204).end()
  },
)
