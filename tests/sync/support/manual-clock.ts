import type { RoomClock } from '@server/realtime/room-clock'
import type { ClientClock } from '@/sync/client-clock'

/** Time that passes when a test says so. Serves rooms and clients alike. */
export class ManualClock {
  #nowMs = Date.UTC(2027, 0, 4, 8)
  #timers: { at: number; work: () => void }[] = []
  #deferred: (() => void)[] = []

  readonly forRooms: RoomClock = {
    now: () => new Date(this.#nowMs),
    defer: (work) => {
      this.#deferred.push(work)
    },
    after: (delayMs, work) => this.#after(delayMs, work),
  }
  readonly forClients: ClientClock = {
    now: () => (this.#nowMs += 1),
    after: (delayMs, work) => this.#after(delayMs, work),
  }

  get timerCount(): number {
    return this.#timers.length
  }

  /** Ends the turn: what was deferred runs now. */
  runDeferred(): void {
    const works = this.#deferred
    this.#deferred = []
    for (const work of works) work()
  }

  advance(ms: number): void {
    const until = this.#nowMs + ms
    for (;;) {
      const due = this.#timers.filter((timer) => timer.at <= until).sort((a, b) => a.at - b.at)[0]
      if (!due) break
      this.#timers = this.#timers.filter((timer) => timer !== due)
      this.#nowMs = Math.max(this.#nowMs, due.at)
      due.work()
    }
    this.#nowMs = until
  }

  #after(delayMs: number, work: () => void): () => void {
    const timer = { at: this.#nowMs + delayMs, work }
    this.#timers.push(timer)
    return () => {
      this.#timers = this.#timers.filter((other) => other !== timer)
    }
  }
}
