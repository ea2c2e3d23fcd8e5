/** What a person gets on entering a layout. */
import {
  MAX_CATCH_UP_EDITS,
  type JoinReply,
  type JoinRequest,
  type LayoutAccess,
} from '@shared/protocol/realtime'
import { can } from '../accounts/policy'
import { roleIn, type Principal } from '../accounts/principal'
import type { EditReads, StoredLayout } from '../edits/edit-storage'

/** The edits that were missed, or the whole document when the client's state cannot be continued. */
export function catchUp(
  storage: EditReads,
  layout: StoredLayout,
  { lastRevision, epoch }: JoinRequest,
): Extract<JoinReply, { ok: true }>['sync'] {
  const snapshot = { kind: 'snapshot', document: layout.document } as const
  // Ahead of the server or of another epoch: a backup was restored, and numbers mean other edits now.
  if (lastRevision === null || epoch !== layout.epoch || lastRevision > layout.revision) return snapshot
  const missed = layout.revision - lastRevision
  if (missed > MAX_CATCH_UP_EDITS) return snapshot
  const edits = missed === 0 ? [] : storage.readEntries(layout.layoutId, lastRevision)
  // The log may start later than the client's revision.
  return edits.length === missed ? { kind: 'edits', edits } : snapshot
}

export function accessOf(layout: StoredLayout, principal: Principal): LayoutAccess {
  const { workspaceId, status, revisionLetter } = layout
  return {
    // Whoever is in the room has a role: losing it ends the session.
    role: roleIn(principal, workspaceId) ?? 'viewer',
    canEdit: can(principal, 'layout:edit', { workspaceId, status }),
    status,
    revisionLetter,
  }
}
