/** Time as a room sees it, so that tests decide when it passes. */
export interface RoomClock {
  now(): Date
  /** Runs after what is happening now: edits that arrive in one turn share a transaction. */
  defer(work: () => void): void
  /** Returns a function that cancels. */
  after(delayMs: number, work: () => void): () => void
}

export const systemClock: RoomClock = {
  now: () => new Date(),
  defer: (work) => {
    setImmediate(work)
  },
  after(delayMs, work) {
    const timer = setTimeout(work, delayMs)
    // A cursor on its way is no reason to keep a stopping server alive.
    timer.unref()
    return () => clearTimeout(timer)
  },
}
