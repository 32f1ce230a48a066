import { io as connect, type Socket } from 'socket.io-client'
import type { FenceEvent } from '../../../shared/contracts/fence'
import {
  clientEvents,
  serverEvents,
  type Acknowledgement,
  type Joined,
  type Presence,
  type Room,
  type RoomChanged,
  type SomeoneWrites,
} from '../../../shared/contracts/socketEvents'
import { createSessionCookie } from '../../support/app'

/** A reader's line to the real server, with all it heard. */
export class Line {
  readonly events: FenceEvent[] = []
  readonly presences: Presence[] = []
  readonly writings: SomeoneWrites[] = []
  isSessionEnded = false

  private constructor(readonly socket: Socket) {
    socket.on(serverEvents.roomChanged, (changed: RoomChanged) => this.events.push(changed.event))
    socket.on(serverEvents.presence, (presence: Presence) => this.presences.push(presence))
    socket.on(serverEvents.someoneWrites, (said: SomeoneWrites) => this.writings.push(said))
    socket.on(serverEvents.sessionEnded, () => (this.isSessionEnded = true))
  }

  /** Opens a line with these headers; rejects when the server refuses it. */
  static async open(url: string, headers: Record<string, string> = {}, reconnection = false) {
    const socket = connect(url, {
      transports: ['websocket'],
      extraHeaders: { Origin: url, ...headers },
      forceNew: true,
      reconnection,
      reconnectionDelay: 10,
      reconnectionDelayMax: 20,
    })
    const line = new Line(socket)
    await new Promise<void>((resolve, reject) => {
      socket.once('connect', resolve)
      socket.once('connect_error', reject)
    }).catch((error: unknown) => {
      socket.close()
      throw error
    })
    return line
  }

  static async openAs(url: string, user: { id: number }) {
    return Line.open(url, { Cookie: await createSessionCookie(user.id) })
  }

  async send<T = unknown>(name: string, payload: unknown): Promise<Acknowledgement<T>> {
    return (await this.socket.timeout(4000).emitWithAck(name, payload)) as Acknowledgement<T>
  }

  /** Joins a room and returns what the server acknowledged. */
  async join(room: Room, after = 0): Promise<Joined> {
    const reply = await this.send<Joined>(clientEvents.joinRoom, { ...room, after })
    if (!reply.ok) throw new Error(reply.error.code)
    return reply.data
  }

  close() {
    this.socket.close()
  }
}
