/** Tells open sockets at once that somebody may no longer do what they are doing. */
import type { Role } from '@shared/protocol/roles'

export type Revocation =
  | { kind: 'session'; userId: string; sessionId: string }
  | { kind: 'membership'; userId: string; workspaceId: string }
  | { kind: 'role'; userId: string; workspaceId: string; role: Role }
  /** Joined a workspace or was renamed: what was resolved before is out of date. */
  | { kind: 'joined'; userId: string; workspaceId: string; role: Role }

export type RevocationListener = (revocation: Revocation) => void

export interface RevocationHub {
  onRevoked(listener: RevocationListener): () => void
  announce(revocation: Revocation): void
}

export function createRevocationHub(): RevocationHub {
  const listeners = new Set<RevocationListener>()
  return {
    onRevoked(listener) {
      listeners.add(listener)
      return () => listeners.delete(listener)
    },
    announce(revocation) {
      for (const listener of listeners) listener(revocation)
    },
  }
}
