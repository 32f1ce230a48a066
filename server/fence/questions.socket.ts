import type { Server } from 'socket.io'

/** Rooms over the fence: joining, presence, who is writing, and what changed. */
export function registerFence(io: Server) {
  void io
}
