import type { Request, RequestHandler } from 'express'
import { can, type Action, type Actor, type Thing } from '../../shared/contracts/policies'
import { notAllowed, signInFirst } from '../errors'

/** Throws 401 for a visitor and 403 for a person when the policy table says no. */
export function assertCan(actor: Actor | null, action: Action, thing: Thing = {}) {
  if (can(actor, action, thing)) return
  throw actor ? notAllowed() : signInFirst()
}

/**
 * Lets a request through only when the policy table allows `action` on what `locate` finds.
 * `locate` throws 404 itself when there is nothing to find.
 */
export function authorize(
  action: Action,
  locate: (request: Request) => Promise<Thing> = async () => ({}),
): RequestHandler {
  return async (request, _response, next) => {
    assertCan(request.actor, action, await locate(request))
    next()
  }
}
