import { createHmac, randomBytes } from 'node:crypto'
import { createServer, type Server as HttpServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import type { Express } from 'express'
import type { Server as SocketServer } from 'socket.io'
import request from 'supertest'
import { createApp } from '../../server/app'
import { config } from '../../server/config'
import { db } from '../../server/db/client'
import { sessions } from '../../server/db/schema'
import { createSocketServer } from '../../server/socket'

export type Agent = ReturnType<typeof request.agent>

export interface TestApp {
  /** `http://127.0.0.1:` and a free port. */
  url: string
  app: Express
  io: SocketServer
  /** Keeps cookies and sends our own Origin; nobody is signed in. */
  asVisitor: () => Agent
  /** The same, signed in as this person on a device of their own. */
  asUser: (user: { id: number }) => Promise<Agent>
  close: () => Promise<void>
}

/** A signed-in session in the database and the cookie that goes with it, without the cost of a hash. */
export async function createSessionCookie(userId: number): Promise<string> {
  const sid = randomBytes(24).toString('base64url')
  const maxAge = 3600_000
  const expires = new Date(Date.now() + maxAge)
  const data = {
    cookie: { originalMaxAge: maxAge, expires, httpOnly: true, sameSite: 'lax', path: '/' },
    userId,
    signedInAt: Date.now(),
  }
  await db.insert(sessions).values({ sid, userId, data: JSON.stringify(data), expiresAt: expires })
  const signature = createHmac('sha256', config.sessionSecret)
    .update(sid)
    .digest('base64')
    .replace(/=+$/, '')
  return `gf=${encodeURIComponent(`s:${sid}.${signature}`)}`
}

/** The real application with its sockets on a free port, over the test file's own database. */
export async function startTestApp(): Promise<TestApp> {
  const app = createApp()
  const server: HttpServer = createServer(app)
  const io = createSocketServer(server)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`

  const asVisitor = () => request.agent(url).set('Origin', url)
  return {
    url,
    app,
    io,
    asVisitor,
    async asUser({ id }) {
      const agent = asVisitor()
      agent.jar.setCookie(await createSessionCookie(id), '127.0.0.1', '/')
      return agent
    },
    async close() {
      await io.close()
      server.closeAllConnections()
    },
  }
}
