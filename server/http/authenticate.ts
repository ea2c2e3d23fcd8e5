/** Resolves who is asking, once per request; routes ask for it with `signedIn`. */
import type { Request, RequestHandler } from 'express'
import { type Caller, callerOf } from '../accounts/caller'
import type { Principal } from '../accounts/principal'
import type { PrincipalResolver } from '../accounts/resolve-principal'
import { unauthenticated } from './http-error'

const principals = new WeakMap<Request, Principal>()

export const caller = (request: Request): Caller => callerOf(request.headers, request.ip)

export function authenticate(resolver: Pick<PrincipalResolver, 'resolve'>): RequestHandler {
  return async (request, response, next) => {
    const resolved = await resolver.resolve(caller(request))
    if (resolved) {
      principals.set(request, resolved.principal)
      for (const cookie of resolved.setCookies) response.append('Set-Cookie', cookie)
    }
    next()
  }
}

export function signedIn(request: Request): Principal {
  const principal = principals.get(request)
  if (!principal) throw unauthenticated()
  return principal
}
