/** Shape of the layout store: what the server confirmed, what waits, what is under the pointer. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import type { EditNotice, LayoutAccess, Person, PresenceState, RejectReason } from '@shared/protocol/realtime'

export interface PendingEdit {
  editId: string
  /** The tab that made the edit: a new tab also sends what a closed one left behind. */
  clientId: string
  clientSeq: number
  baseRevision: number
  label: string
  operations: Operation[]
}

/** An edit the server refused. It stays on screen for its author until dismissed or exported. */
export interface RefusedEdit extends PendingEdit {
  reason: RejectReason
  message: string
}

/** Server notices, and what undo has to say about itself. */
export type NoticeKind = EditNotice['kind'] | 'undoSkipped' | 'undoRefused'

export interface Notice extends Omit<EditNotice, 'kind'> {
  id: string
  kind: NoticeKind
  /** The whole sentence to show. */
  message: string
  /** True when this person's own edit was affected. */
  isMine: boolean
  label: string
  at: string
}

/**
 * `connected` says nothing about saving: the chip says "Saved" only when also pending is empty.
 * `refused` is final (no access, signed out, wrong protocol version).
 */
export type ConnectionState = 'connecting' | 'connected' | 'reconnecting' | 'refused'

export interface Preview {
  label: string
  operations: Operation[]
}

export interface LayoutState {
  layoutId: string | null
  confirmed: LayoutDocument | null
  revision: number
  epoch: string | null
  pending: PendingEdit[]
  preview: Preview | null
  /** rebase(confirmed, pending) + preview. Everything draws and calculates from this. */
  visible: LayoutDocument | null
  access: LayoutAccess | null
  you: Person | null
  people: PresenceState[]
  connection: ConnectionState
  refusedReason: { reason: RejectReason; message: string } | null
  notices: Notice[]
  refusedEdits: RefusedEdit[]
  /** Words when this browser cannot keep unsaved edits over a reload; null when it can. */
  storageFailure: string | null
  canUndo: boolean
  canRedo: boolean
  undoLabel: string | null
  redoLabel: string | null
}
