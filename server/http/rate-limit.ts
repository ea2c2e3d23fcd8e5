import type { Request, RequestHandler } from 'express'
import { ipKeyGenerator, rateLimit, type RateLimitInfo } from 'express-rate-limit'
import { TooManyRequests } from './too-many-requests'

export interface Limit {
  max: number
  windowMs: number
  /** Refused requests do not count: somebody who mistypes a form has used nothing up. */
  countsOnlySuccess?: boolean
}

/** So many requests in a window for each key; by default the key is the address of the client. */
export function limitRequests(
  { max, windowMs, countsOnlySuccess = false }: Limit,
  keyOf: (request: Request) => string = byAddress,
): RequestHandler {
  return rateLimit({
    limit: max,
    windowMs,
    skipFailedRequests: countsOnlySuccess,
    keyGenerator: keyOf,
    standardHeaders: false,
    legacyHeaders: false,
    handler: (request, _response, next) => {
      const { rateLimit: state } = request as Request & { rateLimit?: RateLimitInfo }
      const resetTime = state?.resetTime
      next(new TooManyRequests(resetTime ? resetTime.getTime() - Date.now() : windowMs))
    },
  })
}

export function byAddress(request: Request): string {
  return ipKeyGenerator(request.ip ?? '', 64)
}
