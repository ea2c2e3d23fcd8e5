import type { Role } from '@shared/protocol/roles'

/** Who is asking, resolved once per request and once per socket handshake. */
export interface Principal {
  userId: string
  name: string
  email: string
  sessionId: string
  /** Role by workspace id; a workspace that is not in it does not exist for this person. */
  roles: ReadonlyMap<string, Role>
}

export function roleIn(principal: Principal, workspaceId: string): Role | null {
  return principal.roles.get(workspaceId) ?? null
}
