/** How fast one connection may go. Generous for people, narrow for scripts gone wrong. */
import { RateLimiterMemory } from 'rate-limiter-flexible'

export type LimitedWork = 'join' | 'edit' | 'operation' | 'presence'

const LIMITS: Record<LimitedWork, { points: number; duration: number }> = {
  join: { points: 30, duration: 10 },
  /** A long offline queue is sent in windows and waits when it is told to. */
  edit: { points: 400, duration: 2 },
  operation: { points: 8_000, duration: 2 },
  /** Twice what a client sends. */
  presence: { points: 80, duration: 2 },
}

export interface SocketLimits {
  /** False when this would be too much. Settles in the order of the calls. */
  allow(connectionId: string, work: LimitedWork, points?: number): Promise<boolean>
  forget(connectionId: string): void
}

export function createSocketLimits(): SocketLimits {
  const limiters = Object.entries(LIMITS).map(
    ([work, limit]) => [work as LimitedWork, new RateLimiterMemory(limit)] as const,
  )
  const limiterOf = new Map(limiters)
  return {
    async allow(connectionId, work, points = 1) {
      try {
        await limiterOf.get(work)?.consume(connectionId, points)
        return true
      } catch (refusal) {
        // The limiter rejects with its state when the limit is hit, and with an error when it broke.
        if (refusal instanceof Error) throw refusal
        return false
      }
    },
    forget(connectionId) {
      for (const [, limiter] of limiters) void limiter.delete(connectionId)
    },
  }
}
