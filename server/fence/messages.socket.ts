import type { Request } from 'express'
import type { Socket } from 'socket.io'
import { z } from 'zod'
import { serverEvents, type Acknowledgement } from '../../shared/contracts/socketEvents'
import { AppError } from '../errors'
import { logger } from '../logger'
import type { SocketData } from '../socket'
import { findReader } from './rooms.service'

/** What a line may send in one window; a reader who types, joins and leaves stays far below. */
const messagesPerWindow = 40
const windowMs = 10_000

type Reader = SocketData['actor']

/** Counts a line's messages; true while they are few enough. */
function createMeter() {
  let startedAt = 0
  let count = 0
  return () => {
    const now = Date.now()
    if (now - startedAt > windowMs) {
      startedAt = now
      count = 0
    }
    count++
    return count <= messagesPerWindow
  }
}

/** Who is behind a line now, by the session and the account as the database holds them; cuts the line of an ended session. */
async function readReader(socket: Socket): Promise<Reader> {
  const request = socket.request as Request
  if (request.session.userId === undefined) return null
  const isAlive = await new Promise<boolean>((resolve) => {
    request.session.reload((error: unknown) => resolve(!error))
  })
  const reader = isAlive ? await findReader(request.session) : null
  if (!reader) {
    socket.emit(serverEvents.sessionEnded)
    socket.disconnect(true)
    throw new AppError(401, 'session-ended', 'You are signed out. Sign in again.')
  }
  const data = socket.data as SocketData
  data.actor = reader
  return reader
}

const tooOften = () => new AppError(429, 'too-often', 'Too many messages. Wait a moment.')

function refusalOf(error: unknown): { code: string; detail: string } {
  if (error instanceof AppError) return { code: error.code, detail: error.message }
  if (error instanceof z.ZodError) {
    const [issue] = error.issues
    const field = issue?.path.map(String).join('.') ?? ''
    return { code: 'invalid', detail: `${field}: ${issue?.message ?? 'cannot be read'}` }
  }
  logger.error({ err: error }, 'socket message')
  return { code: 'unexpected', detail: 'Something went wrong here. Try again.' }
}

/**
 * Returns `on(name, contract, work)`, which answers one kind of message of a line. A line's messages are worked one
 * after the other: a room that is left and joined again in one breath must not be left last.
 */
export function answerMessages(socket: Socket) {
  const isSlowEnough = createMeter()
  let last: Promise<unknown> = Promise.resolve()

  async function answer<S extends z.ZodType, T>(
    schema: S,
    payload: unknown,
    work: (payload: z.output<S>, reader: Reader) => Promise<T>,
  ): Promise<Acknowledgement<T>> {
    try {
      const parsed = schema.parse(payload)
      return { ok: true, data: await work(parsed, await readReader(socket)) }
    } catch (error) {
      return { ok: false, error: refusalOf(error) }
    }
  }

  return function on<S extends z.ZodType, T>(
    name: string,
    schema: S,
    work: (payload: z.output<S>, reader: Reader) => Promise<T>,
  ) {
    socket.on(name, (payload: unknown, acknowledge: unknown) => {
      const tell = (reply: unknown) => {
        if (typeof acknowledge === 'function') (acknowledge as (reply: unknown) => void)(reply)
      }
      if (isSlowEnough()) last = last.then(() => answer(schema, payload, work)).then(tell)
      else tell({ ok: false, error: refusalOf(tooOften()) })
    })
  }
}
