/** What the rest of the client may do with the open layout. Reading goes through the layout store. */
import type { DroppedOperation } from '@shared/layout/apply-result'
import type { Operation } from '@shared/layout/operations'
import type { PresenceUpdate } from '@shared/protocol/realtime'

export type CommitResult =
  /** Visible at once, on its way to the server. */
  | { kind: 'pending'; editId: string; dropped: DroppedOperation[] }
  /** Nothing would change; `dropped` says why each operation does nothing. */
  | { kind: 'noEffect'; dropped: DroppedOperation[] }
  /** The layout is frozen, the role may not edit, or the layout is not loaded yet. */
  | { kind: 'readOnly'; message: string }
  /** More operations than one edit may hold. */
  | { kind: 'tooLarge'; message: string }

export type UndoResult =
  | { kind: 'done'; label: string; skipped: string[] }
  | { kind: 'refused'; label: string; message: string }
  | { kind: 'nothing' }

export interface LayoutSession {
  readonly layoutId: string
  /** One user action: one edit, one undo step. Clears the preview. */
  commit(label: string, operations: Operation[]): CommitResult
  /** What is under the pointer: drawn and calculated, neither recorded nor sent. */
  setPreview(label: string, operations: Operation[]): void
  clearPreview(): void
  /** The person's own last edit, computed against the present. Notices say what was skipped or refused. */
  undo(): UndoResult
  redo(): UndoResult
  updatePresence(partial: Partial<Omit<PresenceUpdate, 'layoutId'>>): void
  dismissNotice(id: string): void
  dismissRefused(editId: string): void
  close(): void
}
