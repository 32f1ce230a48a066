import type { Server as HttpServer } from 'node:http'
import type { Request, RequestHandler } from 'express'
import { Server, type Socket } from 'socket.io'
import { serverEvents } from '../shared/contracts/socketEvents'
import { findSignedIn, isSessionTooOld, type SignedIn } from './accounts/accounts.service'
import { onSessionsEnded } from './accounts/sessions.service'
import { registerFence } from './fence/questions.socket'
import { logger } from './logger'
import { comesFromOwnPages } from './middleware/sameOrigin'
import { sessionMiddleware } from './middleware/session'

/** What a connection knows of itself. */
export interface SocketData {
  actor: SignedIn | null
}

const sessionRoom = (sid: string) => `session:${sid}`

async function identify(socket: Socket) {
  const { session, sessionID } = socket.request as Request
  const data = socket.data as SocketData
  data.actor =
    session.userId === undefined || isSessionTooOld(session.signedInAt)
      ? null
      : await findSignedIn(session.userId)
  if (data.actor) await socket.join(sessionRoom(sessionID))
}

/** Socket.IO over the same sessions and policies as the routes; one register call a domain. */
export function createSocketServer(httpServer: HttpServer): Server {
  const io = new Server(httpServer, {
    serveClient: false,
    maxHttpBufferSize: 32_768,
    allowRequest: (request, callback) => callback(null, comesFromOwnPages(request)),
  })
  const onlyAtHandshake: RequestHandler = (request, response, next) => {
    const query = (request as Request & { _query?: { sid?: string } })._query
    if (query?.sid) return next()
    void sessionMiddleware(request, response, next)
  }
  io.engine.use(onlyAtHandshake)
  io.use((socket, next) => {
    identify(socket).then(
      () => next(),
      (error: unknown) => {
        logger.error({ err: error }, 'socket sign-in')
        next(new Error('sign-in'))
      },
    )
  })
  onSessionsEnded((sids) => {
    for (const sid of sids) {
      io.in(sessionRoom(sid)).emit(serverEvents.sessionEnded)
      io.in(sessionRoom(sid)).disconnectSockets(true)
    }
  })
  registerFence(io)
  return io
}
