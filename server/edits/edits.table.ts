import type { LogEntryKind, SubmitOutcome } from '@shared/protocol/realtime'

export interface LayoutEditBaseTable {
  layout_id: string
  revision: number
  document: string
}

export interface LayoutEditTable {
  layout_id: string
  revision: number
  kind: LogEntryKind
  edit_id: string
  client_id: string
  client_seq: number
  user_id: string
  user_name: string
  label: string
  operations: string
  notices: string
  accepted_at: string
}

export interface LayoutEditReceiptTable {
  layout_id: string
  client_id: string
  client_seq: number
  edit_id: string
  user_id: string
  outcome: SubmitOutcome['outcome']
  /** Of an accepted edit; its answer is the log entry. */
  revision: number | null
  answer: string | null
  answered_at: string
}
