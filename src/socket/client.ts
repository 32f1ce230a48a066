import type { Socket } from 'socket.io-client'

interface OpenLine {
  /** Whose session the line was opened with; null for a visitor. */
  personId: number | null
  socket: Promise<Socket>
}

let open: OpenLine | null = null

async function connect(): Promise<Socket> {
  const { io } = await import('socket.io-client')
  return io({
    withCredentials: true,
    transports: ['websocket', 'polling'],
    reconnectionDelayMax: 10_000,
  })
}

/** Ends the line of this page, if there is one. */
export async function closeLine() {
  const ending = open
  open = null
  const socket = await ending?.socket.catch(() => null)
  socket?.close()
}

/**
 * The one line of this page to the server, opened when first asked for. It carries the session it
 * was opened with, so another person gets a new one.
 */
export async function openLine(personId: number | null): Promise<Socket> {
  if (open && open.personId !== personId) await closeLine()
  open ??= { personId, socket: connect() }
  const mine = open
  mine.socket.catch(() => {
    if (open === mine) open = null
  })
  return mine.socket
}
