/**
 * Guessing is slowed down, nobody is locked out. A wrong password counts against the address it
 * comes from, against that address for this one account, and (far later, so that a stranger cannot
 * keep the owner out) against the account from everywhere.
 */
import { ipKeyGenerator } from 'express-rate-limit'
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible'
import { TooManyRequests } from '../http/too-many-requests'

export interface SignInLimits {
  /** Throws TooManyRequests when this try must wait. */
  beforeTry(clientAddress: string, email: string): Promise<void>
  afterFailure(clientAddress: string, email: string): Promise<void>
  afterSuccess(clientAddress: string, email: string): Promise<void>
}

const FAILURES_PER_ADDRESS = { points: 50, duration: 10 * 60 }
const FAILURES_PER_ACCOUNT_AND_ADDRESS = { points: 5, duration: 60 }
const FAILURES_PER_ACCOUNT = { points: 200, duration: 60 * 60 }

export function createSignInLimits(): SignInLimits {
  const perAddress = new RateLimiterMemory(FAILURES_PER_ADDRESS)
  const perPair = new RateLimiterMemory(FAILURES_PER_ACCOUNT_AND_ADDRESS)
  const perAccount = new RateLimiterMemory(FAILURES_PER_ACCOUNT)

  function keys(clientAddress: string, email: string): [RateLimiterMemory, string][] {
    // One household of IPv6 addresses is one address.
    const network = ipKeyGenerator(clientAddress, 64)
    const account = email.trim().toLowerCase()
    return [
      [perAddress, network],
      [perPair, `${network} ${account}`],
      [perAccount, account],
    ]
  }

  return {
    async beforeTry(clientAddress, email) {
      for (const [limiter, key] of keys(clientAddress, email)) {
        const state = await limiter.get(key)
        if (state && state.consumedPoints >= limiter.points) throw new TooManyRequests(state.msBeforeNext)
      }
    },
    async afterFailure(clientAddress, email) {
      for (const [limiter, key] of keys(clientAddress, email)) {
        await limiter.consume(key).catch((full: unknown) => {
          // Tries that ran side by side may pass the mark together; the next one waits.
          if (!(full instanceof RateLimiterRes)) throw full
        })
      }
    },
    async afterSuccess(clientAddress, email) {
      const [, pair] = keys(clientAddress, email)
      if (pair) await pair[0].delete(pair[1])
    },
  }
}
