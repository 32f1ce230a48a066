import { ServerResponse, type IncomingMessage } from 'node:http'
import type { Request, RequestHandler, Response } from 'express'
import session from 'express-session'
import { findSignedIn, isSessionTooOld, type SignedIn } from '../accounts/accounts.service'
import { tellSessionsEnded } from '../accounts/sessions.service'
import { DatabaseSessionStore, idleLimitMs } from '../accounts/sessionStore'
import { config } from '../config'

/** Under TLS the prefix binds the cookie to this host. */
const cookieName = config.isBehindTls ? '__Host-gf' : 'gf'
const cookie = {
  httpOnly: true,
  sameSite: 'lax',
  secure: config.isBehindTls,
  path: '/',
} as const

/** express-session over MariaDB; an empty session is never stored. */
export const sessionMiddleware: RequestHandler = session({
  name: cookieName,
  secret: config.sessionSecret,
  store: new DatabaseSessionStore(),
  resave: false,
  saveUninitialized: false,
  proxy: config.trustedProxies > 0,
  cookie: { ...cookie, maxAge: idleLimitMs },
})

const settle = (run: (done: (error?: unknown) => void) => void) =>
  new Promise<void>((resolve, reject) => {
    run((error) => {
      if (error) reject(error instanceof Error ? error : new Error('session', { cause: error }))
      else resolve()
    })
  })

/** Signs a person in on this device, under a new session id. */
export async function startSession(request: Request, userId: number) {
  const before = request.sessionID
  await settle((done) => request.session.regenerate(done))
  request.session.userId = userId
  request.session.signedInAt = Date.now()
  await settle((done) => request.session.save(done))
  tellSessionsEnded([before])
}

/** Signs out on this device and clears the cookie. */
export async function endSession(request: Request, response: Response) {
  const sid = request.sessionID
  await settle((done) => request.session.destroy(done))
  response.clearCookie(cookieName, cookie)
  tellSessionsEnded([sid])
}

/**
 * The signed-in person behind a request whose response express-session must not touch, as with
 * tus, which takes it over: the session is read against a response of its own.
 */
export async function findSignedInBehind(request: IncomingMessage): Promise<SignedIn | null> {
  const aside = request as Request
  await settle((done) => {
    void sessionMiddleware(aside, new ServerResponse(request) as unknown as Response, done)
  })
  const { userId, signedInAt } = aside.session
  if (userId === undefined || isSessionTooOld(signedInAt)) return null
  return findSignedIn(userId)
}
