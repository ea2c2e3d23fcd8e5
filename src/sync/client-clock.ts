/** Time as the sync engine sees it, so that tests decide when it passes. */
export interface ClientClock {
  now(): number
  /** Returns a function that cancels. */
  after(delayMs: number, work: () => void): () => void
}

export const browserClock: ClientClock = {
  now: () => Date.now(),
  after(delayMs, work) {
    const timer = setTimeout(work, delayMs)
    return () => clearTimeout(timer)
  },
}
