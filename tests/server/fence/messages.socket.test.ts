import { EventEmitter } from 'node:events'
import { setTimeout as wait } from 'node:timers/promises'
import type { Socket } from 'socket.io'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { answerMessages } from '../../../server/fence/messages.socket'

/** A visitor's line. */
const openLine = () =>
  Object.assign(new EventEmitter(), { request: { session: {} }, data: {} }) as unknown as Socket

const say = (socket: Socket, name: string) =>
  new Promise((resolve) => (socket as unknown as EventEmitter).emit(name, {}, resolve))

describe('the messages of a line', () => {
  it('are worked one after the other, in the order they came', async () => {
    const socket = openLine()
    const on = answerMessages(socket)
    const done: string[] = []
    on('leave', z.object({}), async () => {
      await wait(30)
      done.push('left')
    })
    on('join', z.object({}), async () => {
      done.push('joined')
      return Promise.resolve('here')
    })
    const [, joined] = await Promise.all([say(socket, 'leave'), say(socket, 'join')])
    expect(done).toEqual(['left', 'joined'])
    expect(joined).toEqual({ ok: true, data: 'here' })
  })

  it('go on after one that failed', async () => {
    const socket = openLine()
    const on = answerMessages(socket)
    on('fail', z.object({ missing: z.string() }), () => Promise.resolve())
    on('join', z.object({}), () => Promise.resolve('here'))
    const [failed, joined] = await Promise.all([say(socket, 'fail'), say(socket, 'join')])
    expect(failed).toMatchObject({ ok: false, error: { code: 'invalid' } })
    expect(joined).toEqual({ ok: true, data: 'here' })
  })
})
