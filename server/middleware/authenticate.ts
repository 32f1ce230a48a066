import type { Request, RequestHandler } from 'express'
import { findSignedIn, isSessionTooOld, type SignedIn } from '../accounts/accounts.service'
import { signInFirst } from '../errors'

/** Sets `request.actor` from the session alone. */
export const authenticate: RequestHandler = async (request, _response, next) => {
  request.actor = null
  const { userId, signedInAt } = request.session
  if (userId !== undefined) {
    if (isSessionTooOld(signedInAt)) {
      await new Promise<void>((resolve) => request.session.regenerate(() => resolve()))
    } else {
      request.actor = await findSignedIn(userId)
    }
  }
  next()
}

/** The signed-in person, or 401. */
export function requireActor(request: Request): SignedIn {
  if (!request.actor) throw signInFirst()
  return request.actor
}
