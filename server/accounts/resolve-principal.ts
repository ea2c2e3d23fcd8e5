/** From a request's cookie to who is asking. */
import type { IncomingHttpHeaders } from 'node:http'
import type { Queries } from '../database/open-database'
import { ABSOLUTE_LIFETIME_MS, type Auth } from './auth'
import { type Caller, callerOf } from './caller'
import { findSession, rolesOf } from './accounts.repository'
import type { Principal } from './principal'

export interface Resolved {
  principal: Principal
  /** Set when the session was prolonged: the browser needs the new lifetime. */
  setCookies: string[]
}

export interface PrincipalResolver {
  /** Once per request; prolongs the session when it is due. */
  resolve(caller: Caller): Promise<Resolved | null>
  /** Once per socket handshake, where no cookie can be set. */
  getPrincipal(headers: IncomingHttpHeaders): Promise<Principal | null>
  /** The same person as of now, or null when the session is over. Cheap: for open sockets. */
  recheck(principal: Principal): Principal | null
}

const isTooOld = (createdAt: Date) => Date.now() - createdAt.getTime() > ABSOLUTE_LIFETIME_MS

export function createPrincipalResolver(auth: Auth, queries: Queries): PrincipalResolver {
  async function resolve(caller: Caller, canSetCookies: boolean): Promise<Resolved | null> {
    if (!caller.has('cookie')) return null
    const { headers, response } = await auth.api.getSession({
      headers: caller,
      query: { disableRefresh: !canSetCookies },
      returnHeaders: true,
    })
    if (!response) return null
    const { session, user } = response
    if (isTooOld(session.createdAt)) {
      await auth.api.revokeSession({ headers: caller, body: { token: session.token } })
      return null
    }
    return {
      principal: {
        userId: user.id,
        name: user.name,
        email: user.email,
        sessionId: session.id,
        roles: rolesOf(queries, user.id),
      },
      setCookies: headers.getSetCookie(),
    }
  }

  return {
    resolve: (caller) => resolve(caller, true),
    async getPrincipal(headers) {
      return (await resolve(callerOf(headers, undefined), false))?.principal ?? null
    },
    recheck(principal) {
      const session = findSession(queries, principal.sessionId)
      if (!session || new Date(session.expiresAt) <= new Date() || isTooOld(new Date(session.createdAt)))
        return null
      return {
        userId: session.userId,
        name: session.name,
        email: session.email,
        sessionId: principal.sessionId,
        roles: rolesOf(queries, session.userId),
      }
    },
  }
}
