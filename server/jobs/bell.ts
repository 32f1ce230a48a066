const listeners = new Set<() => void>()

/** Calls `listener` whenever this process has added a job. */
export function onJobAdded(listener: () => void) {
  listeners.add(listener)
}

/** Says that a job was added, once its transaction is over; without it the queue finds it a little later. */
export function ringBell() {
  for (const listener of listeners) listener()
}
